package slantfall.numerics;

import java.util.function.DoubleUnaryOperator;

/** Smallest value of a function of one variable on an interval, by golden-section search (Kiefer 1953). */
public final class Minimum {

    private static final double GOLDEN = (Math.sqrt(5) - 1) / 2;

    private Minimum() {}

    /** The place of the minimum of a function with one valley between low and high. */
    public static double golden(DoubleUnaryOperator f, double low, double high, double tolerance) {
        double a = low;
        double b = high;
        double left = b - GOLDEN * (b - a);
        double right = a + GOLDEN * (b - a);
        double fLeft = f.applyAsDouble(left);
        double fRight = f.applyAsDouble(right);
        while (b - a > tolerance) {
            if (fLeft < fRight) {
                b = right;
                right = left;
                fRight = fLeft;
                left = b - GOLDEN * (b - a);
                fLeft = f.applyAsDouble(left);
            } else {
                a = left;
                left = right;
                fLeft = fRight;
                right = a + GOLDEN * (b - a);
                fRight = f.applyAsDouble(right);
            }
        }
        return (a + b) / 2;
    }
}
