package slantfall.declare;

import slantfall.quantity.Show;

/** A margin in words: how much of the value is in hand. */
public final class MarginWords {

    private MarginWords() {}

    /**
     * Such as "12 % in hand" or "over by 8 %": how far the value may still move, or has moved beyond the limit, as a part
     * of the value itself; for linear checks as a part of the span.
     */
    public static String of(CheckResult result) {
        double margin = result.margin();
        if (Double.isNaN(margin)) {
            return "unknown";
        }
        if (margin <= -Margin.CLAMP) {
            return "nothing in hand";
        }
        if (margin >= Margin.CLAMP) {
            return "far away";
        }
        boolean clear = margin >= 0;
        if (result.info().scale() == Scale.LINEAR) {
            return percent(Math.abs(margin)) + (clear ? " of its span in hand" : " of its span beyond");
        }
        double factor = Math.exp(Math.abs(margin));
        if (factor >= 3) {
            return "factor " + number(factor) + (clear ? " in hand" : " beyond");
        }
        boolean atMost = result.info().side() == Side.AT_MOST;
        double part = clear == atMost ? factor - 1 : 1 - 1 / factor;
        return clear ? percent(part) + " in hand" : (atMost ? "over by " : "short by ") + percent(atMost ? factor - 1 : 1 - 1 / factor);
    }

    private static String percent(double part) {
        return number(100 * part) + " %";
    }

    private static String number(double value) {
        return Show.number(value, 2);
    }
}
