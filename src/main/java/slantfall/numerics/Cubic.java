package slantfall.numerics;

/** The positive root of a cubic, without allocation. */
public final class Cubic {

    private static final int STEPS = 60;

    private Cubic() {}

    /**
     * The positive root of a x³ + b x² + c x + d = 0 with a above 0, d below 0 and one positive root only.
     *
     * <p>Newton's method from the right of the root and of the inflection point, where it falls monotonically; about eight
     * steps. The start is the sum of the root without the lower terms and what they can add.
     *
     * @param a coefficient of x³, above 0
     * @param b coefficient of x²
     * @param c coefficient of x
     * @param d constant, below 0
     * @return the root, NaN if an argument is NaN
     */
    public static double positiveRoot(double a, double b, double c, double d) {
        double x = Math.cbrt(-d / a) + Math.max(0, -b / a) + Math.sqrt(Math.max(0, -c / a));
        for (int i = 0; i < STEPS; i++) {
            double value = ((a * x + b) * x + c) * x + d;
            double slope = (3 * a * x + 2 * b) * x + c;
            double next = x - value / slope;
            if (!(next < x)) {
                return x;
            }
            x = next;
        }
        return x;
    }
}
