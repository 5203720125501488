package slantfall.figure;

import java.util.Locale;
import slantfall.quantity.Show;

/**
 * Places of ticks on a linear axis: steps of 1, 2 or 5 times a power of ten, labels with as many decimals as the step
 * has and no more.
 *
 * @param first first tick, a multiple of the step
 * @param step distance between ticks
 * @param count number of ticks
 * @param decimals decimals of the labels
 */
public record Ticks(double first, double step, int count, int decimals) {

    private static final double[] STEPS = {1, 2, 5, 10};

    /**
     * Ticks between two numbers.
     *
     * @param low lower end
     * @param high upper end, above low
     * @param most largest number of ticks, 2 or more
     */
    public static Ticks of(double low, double high, int most) {
        double rough = (high - low) / Math.max(1, most - 1);
        double power = Math.pow(10, Math.floor(Math.log10(rough)));
        double step = power * 10;
        for (double s : STEPS) {
            if (s * power >= rough * (1 - 1e-9)) {
                step = s * power;
                break;
            }
        }
        for (int i = STEPS.length - 2; i >= 0 && inside(low, high, step) < 2; i--) {
            step = Math.min(step, STEPS[i] * power);
        }
        double first = Math.ceil(low / step - 1e-9) * step;
        int count = Math.max(0, (int) Math.floor((high - first) / step + 1e-9) + 1);
        int decimals = Math.max(0, (int) -Math.floor(Math.log10(step) + 1e-9));
        return new Ticks(first, step, count, decimals);
    }

    private static int inside(double low, double high, double step) {
        return (int) (Math.floor(high / step + 1e-9) - Math.ceil(low / step - 1e-9)) + 1;
    }

    /** The i-th tick. */
    public double at(int i) {
        double value = first + i * step;
        return Math.abs(value) < step * 1e-9 ? 0 : value;
    }

    /** Its label, with the digits that the step has; in powers of ten where the step is beyond 99999 or below 0.0001. */
    public String label(int i) {
        double value = at(i);
        if (value == 0) {
            return "0";
        }
        if (step >= 1e5 || decimals > 4) {
            int digits = (int) Math.floor(Math.log10(Math.abs(value)) + 1e-9) - (int) Math.floor(Math.log10(step) + 1e-9) + 1;
            return Show.number(value, Math.max(1, digits));
        }
        return String.format(Locale.ROOT, "%." + decimals + "f", value).replace('-', '−');
    }
}
