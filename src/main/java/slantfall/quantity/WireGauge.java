package slantfall.quantity;

import slantfall.source.Source;

/** The Birmingham wire gauge, by which walls of tubes are ordered. */
public final class WireGauge {

    /** The highest gauge of the table. */
    public static final int LAST = 36;

    // Thousandths of an inch, gauge 0 first.
    private static final int[] THOUSANDTHS = {
        340, 300, 284, 259, 238, 220, 203, 180, 165, 148, 134, 120, 109, 95, 83, 72, 65, 58, 49, 42, 35, 32, 28, 25, 22,
        20, 18, 16, 14, 13, 12, 10, 9, 8, 7, 5, 4
    };

    private WireGauge() {
    }

    /**
     * Wall thickness of a gauge.
     *
     * @param gauge the gauge, 0 to {@link #LAST}
     * @return the thickness, not a number outside the table [m]
     */
    public static double wall(int gauge) {
        return gauge < 0 || gauge > LAST ? Double.NaN : THOUSANDTHS[gauge] * Factors.MIL;
    }

    /** Where the table comes from. */
    public static Source source() {
        return Sources.BWG;
    }
}
