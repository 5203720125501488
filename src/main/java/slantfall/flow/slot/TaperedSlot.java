package slantfall.flow.slot;

import slantfall.flow.duct.RectangularDuct;

/**
 * A slot whose gap changes evenly from b₁ to b₂ (Reynolds's lubrication equation, O. Reynolds, Phil. Trans. 177 (1886)
 * 157; integrated here): dp/dx = ρg_s + 6μU/b² − 12μq/b³, the upper wall sliding in its own plane.
 */
public final class TaperedSlot {

    /** Gauss–Legendre nodes and weights on (0, 1) with 12 points, for the side-wall integrals. */
    private static final double[][] GAUSS = slantfall.numerics.Quadrature.unitGauss(12);

    private TaperedSlot() {}

    /**
     * Flow per width without side walls [m²/s].
     *
     * @param driving Δp + ρ g L sin β [Pa]
     * @param viscosity dynamic viscosity [Pa s]
     * @param shape gaps and length
     * @param wallSpeed speed of the upper wall, positive downhill [m/s]
     */
    public static double flow(double driving, double viscosity, Shape shape, double wallSpeed) {
        double b1 = shape.inlet();
        double b2 = shape.outlet();
        double wall = 6 * viscosity * wallSpeed * shape.length() / (b1 * b2);
        return (driving + wall) * b1 * b1 * b2 * b2 / (6 * viscosity * shape.length() * (b1 + b2));
    }

    /** Uniform gap with the same pressure- and gravity-driven flow, (2b₁²b₂²/(b₁ + b₂))^⅓ [m]. */
    public static double equivalentGap(double inlet, double outlet) {
        return Math.cbrt(2 * inlet * inlet * outlet * outlet / (inlet + outlet));
    }

    /** Pressure above that at the inlet, at a distance x from it [Pa]. */
    public static double pressure(double flow, double viscosity, Shape shape, Drive drive, double x) {
        double b1 = shape.inlet();
        double b = shape.gap(x);
        double wall = 6 * viscosity * drive.wallSpeed() * x / (b1 * b);
        double viscous = 6 * viscosity * flow * x * (b1 + b) / (b1 * b1 * b * b);
        return drive.weight() * x + wall - viscous;
    }

    /**
     * Lowest pressure above that at the inlet, ends included [Pa].
     *
     * <p>dp/dx b³ = ρg_s b³ + 6μUb − 12μq is a cubic in b without a square term. It is monotone on either side of b =
     * √(−2μU/(ρg_s)), if that lies inside the slot, so that each side has at most one place where the pressure turns,
     * which bisection finds.
     */
    public static double lowestPressure(double flow, double viscosity, Shape shape, Drive drive) {
        double length = shape.length();
        double lowest = Math.min(0, pressure(flow, viscosity, shape, drive, length));
        if (shape.inlet() == shape.outlet()) {
            return lowest;
        }
        double split = split(viscosity, shape, drive);
        double first = turn(flow, viscosity, shape, drive, 0, split);
        double second = turn(flow, viscosity, shape, drive, split, length);
        return Math.min(lowest, Math.min(
                pressure(flow, viscosity, shape, drive, first), pressure(flow, viscosity, shape, drive, second)));
    }

    /** Where the cubic is stationary, the outlet if it is monotone along the slot [m]. */
    private static double split(double viscosity, Shape shape, Drive drive) {
        double gap = Math.sqrt(-2 * viscosity * drive.wallSpeed() / drive.weight());
        double x = (gap - shape.inlet()) / (shape.outlet() - shape.inlet()) * shape.length();
        return x > 0 && x < shape.length() ? x : shape.length();
    }

    /** Where the pressure turns from falling to rising between two places, else an end [m]. */
    private static double turn(double flow, double viscosity, Shape shape, Drive drive, double from, double to) {
        if (slope(flow, viscosity, shape, drive, from) >= 0 || slope(flow, viscosity, shape, drive, to) < 0) {
            return to;
        }
        double low = from;
        double high = to;
        for (int i = 0; i < 40; i++) {
            double x = (low + high) / 2;
            if (slope(flow, viscosity, shape, drive, x) < 0) {
                low = x;
            } else {
                high = x;
            }
        }
        return (low + high) / 2;
    }

    private static double slope(double flow, double viscosity, Shape shape, Drive drive, double x) {
        double b = shape.gap(x);
        return drive.weight() * b * b * b + 6 * viscosity * drive.wallSpeed() * b - 12 * viscosity * flow;
    }

    /** ⟨1/(b³F(b/W))⟩ along the slot [1/m³]: resistance to pressure and gravity with side walls. */
    public static double resistance(Shape shape, double width) {
        double sum = 0;
        for (int i = 0; i < GAUSS[0].length; i++) {
            double b = shape.gap(shape.length() * GAUSS[0][i]);
            sum += GAUSS[1][i] / (b * b * b * RectangularDuct.flowFactor(b / width));
        }
        return sum;
    }

    /** ⟨F_d(b/W)/(b²F(b/W))⟩ along the slot [1/m²]: the moving wall's share with side walls. */
    public static double drag(Shape shape, double width) {
        double sum = 0;
        for (int i = 0; i < GAUSS[0].length; i++) {
            double b = shape.gap(shape.length() * GAUSS[0][i]);
            double aspect = b / width;
            sum += GAUSS[1][i] * RectangularDuct.dragFactor(aspect) / (b * b * RectangularDuct.flowFactor(aspect));
        }
        return sum;
    }

    /**
     * The slot's shape.
     *
     * @param inlet gap at the inlet [m]
     * @param outlet gap at the outlet [m]
     * @param length length [m]
     */
    public record Shape(double inlet, double outlet, double length) {

        /** Gap at a distance from the inlet [m]. */
        public double gap(double x) {
            return inlet + (outlet - inlet) * x / length;
        }

        /** Mean gap [m]. */
        public double mean() {
            return (inlet + outlet) / 2;
        }
    }

    /**
     * What drives besides pressure.
     *
     * @param weight ρ g sin β [N/m³]
     * @param wallSpeed speed of the upper wall, positive downhill [m/s]
     */
    public record Drive(double weight, double wallSpeed) {}
}
