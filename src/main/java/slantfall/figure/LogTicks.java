package slantfall.figure;

import java.util.ArrayList;
import java.util.List;
import slantfall.quantity.Show;

/** Places of ticks on a logarithmic axis: every decade; 1, 2 and 5 where there are few decades; every n-th where many. */
final class LogTicks {

    private static final double[] FEW = {1, 2, 5};
    private static final double[] ONE = {1};
    private static final double FEW_DECADES = 2.5;
    private static final double ROUNDING = 1e-9;

    private LogTicks() {}

    /**
     * Ticks between two positive numbers.
     *
     * @param most largest number of ticks where only decades are shown, 2 or more
     */
    static List<Double> of(double low, double high, int most) {
        if (!(low > 0 && high >= low) || Double.isInfinite(high)) {
            throw new IllegalArgumentException("logarithmic axis from " + low + " to " + high + " must be positive and rise");
        }
        double decades = Math.log10(high / low);
        double[] parts = decades <= FEW_DECADES ? FEW : ONE;
        int every = Math.max(1, (int) Math.ceil((decades + 1) / most));
        List<Double> ticks = new ArrayList<>();
        int first = (int) Math.floor(Math.log10(low) + ROUNDING);
        int last = (int) Math.ceil(Math.log10(high) - ROUNDING);
        for (int power = first; power <= last; power++) {
            for (double part : parts) {
                double tick = part * Math.pow(10, power);
                if (Math.floorMod(power, every) == 0 && tick >= low * (1 - ROUNDING) && tick <= high * (1 + ROUNDING)) {
                    ticks.add(tick);
                }
            }
        }
        return ticks;
    }

    /** Its label: one digit is all it has. */
    static String label(double tick) {
        return Show.number(tick, 1);
    }
}
