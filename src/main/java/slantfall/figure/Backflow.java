package slantfall.figure;

import java.util.function.DoubleUnaryOperator;

/**
 * The parts of a velocity profile that run against the net flow.
 *
 * @param y distances from the wall, increasing [m]
 * @param u velocities [m/s]
 * @param forward 1 where the net flow runs downhill, −1 where it runs uphill
 */
record Backflow(double[] y, double[] u, double forward) {

    /** Part of the largest speed below which a motion back is rounding and not drawn. */
    private static final double LEAST = 1e-9;

    static Backflow of(double[] y, double[] u, double forward) {
        return new Backflow(y, u, forward);
    }

    private double floor() {
        double largest = 0;
        for (double v : u) {
            largest = Math.max(largest, Math.abs(v));
        }
        return LEAST * largest;
    }

    boolean against(double velocity) {
        return velocity * forward < -floor();
    }

    boolean any() {
        for (double v : u) {
            if (against(v)) {
                return true;
            }
        }
        return false;
    }

    /** The distance from the wall where it runs back fastest [m]. */
    double middle() {
        return y[worst()];
    }

    private int worst() {
        int worst = 0;
        for (int i = 1; i < u.length; i++) {
            if (u[i] * forward < u[worst] * forward) {
                worst = i;
            }
        }
        return worst;
    }

    /** Fills the parts between the curve and the line of no motion. */
    void fill(Pen pen, DoubleUnaryOperator across, DoubleUnaryOperator up) {
        if (!any()) {
            return;
        }
        double[] px = new double[2 * u.length];
        double[] py = new double[2 * u.length];
        for (int i = 0; i < u.length; i++) {
            boolean back = against(u[i]);
            px[i] = across.applyAsDouble(back ? u[i] : 0);
            py[i] = up.applyAsDouble(y[i]);
            px[2 * u.length - 1 - i] = across.applyAsDouble(0);
            py[2 * u.length - 1 - i] = py[i];
        }
        pen.area(Ink.REVERSED, 0.28, px, py, px.length);
    }
}
