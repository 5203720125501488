package slantfall.bench.model;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
import slantfall.declare.Scale;
import slantfall.declare.Setting;
import slantfall.quantity.Unit;

/**
 * Sensible steps of a setting in the unit it is shown in: 1, 2 or 5 times a power of ten, so that a slider and an arrow
 * key give numbers that a person would type.
 */
public final class Nudge {

    /** A linear setting has about this many steps over its usual range. */
    private static final double STEPS = 200;

    /** A logarithmic setting changes by about this share per step. */
    private static final double SHARE = 0.015;

    private Nudge() {}

    /**
     * The step at a number.
     *
     * @param setting what is stepped
     * @param unit unit of the number
     * @param number where [in the unit]
     * @return 1, 2 or 5 times a power of ten [in the unit]
     */
    public static BigDecimal step(Setting setting, Unit unit, double number) {
        double linear = setting.usual().span() / unit.scale() / STEPS;
        double wanted = setting.scale() == Scale.LOG && number > 0 ? number * SHARE : linear;
        return nice(wanted);
    }

    /** The nearest of 1, 2 and 5 times a power of ten. */
    public static BigDecimal nice(double wanted) {
        int power = (int) Math.floor(Math.log10(wanted));
        double mantissa = wanted / Math.pow(10, power);
        int digit = mantissa < 1.5 ? 1 : mantissa < 3.5 ? 2 : mantissa < 7.5 ? 5 : 10;
        return new BigDecimal(digit).scaleByPowerOfTen(power);
    }

    /** The number moved to the nearest multiple of a step. */
    public static BigDecimal snap(double number, BigDecimal step) {
        return new BigDecimal(number, MathContext.DECIMAL64)
                .divide(step, 0, RoundingMode.HALF_EVEN)
                .multiply(step);
    }

    /** The number moved by whole steps; one between two multiples goes to the next one first. */
    public static BigDecimal moved(double number, BigDecimal step, int direction) {
        BigDecimal exact = new BigDecimal(number, MathContext.DECIMAL64);
        RoundingMode mode = direction > 0 ? RoundingMode.FLOOR : RoundingMode.CEILING;
        BigDecimal multiples = exact.divide(step, 9, RoundingMode.HALF_EVEN).setScale(0, mode);
        return multiples.add(BigDecimal.valueOf(direction)).multiply(step);
    }

    /** The number as a person would type it. */
    public static String text(BigDecimal number) {
        BigDecimal plain = number.signum() == 0 ? BigDecimal.ZERO : number.stripTrailingZeros();
        boolean odd = plain.precision() - plain.scale() > 7 || plain.scale() > 8;
        return odd ? plain.toString() : plain.toPlainString();
    }
}
