package slantfall.bench.model;

import slantfall.declare.CheckResult;
import slantfall.declare.Margin;
import slantfall.declare.Scale;
import slantfall.declare.Side;
import slantfall.quantity.Display;
import slantfall.quantity.Show;
import slantfall.quantity.UnitSystem;

/** A margin in words: what is in hand, or by how much the limit is passed. */
public final class MarginWords {

    /** From this factor on a percentage is harder to read than a factor. */
    private static final double FACTOR = 3;

    private MarginWords() {}

    /** The margin of a result, as "12 % in hand", "a factor of 8 over" or "far in hand". */
    public static String of(CheckResult result, UnitSystem units) {
        double margin = result.margin();
        if (Double.isNaN(margin)) {
            return "not known";
        }
        if (Math.abs(margin) >= Margin.CLAMP) {
            return margin > 0 ? "far in hand" : "far " + passed(result);
        }
        return amount(result, units) + " " + (margin < 0 ? passed(result) : "in hand");
    }

    private static String amount(CheckResult result, UnitSystem units) {
        if (result.info().scale() == Scale.LINEAR) {
            double distance = Math.abs(result.value() - result.limit());
            return Show.number(difference(result, units, distance), 2) + " "
                    + Display.unit(result.info().kind(), units).label();
        }
        double ratio = Math.exp(Math.abs(result.margin()));
        return ratio < FACTOR ? percent(ratio - 1) + " %" : "a factor of " + Show.number(ratio, 2);
    }

    private static double difference(CheckResult result, UnitSystem units, double distance) {
        double scale = Display.unit(result.info().kind(), units).scale();
        return distance / scale;
    }

    private static String percent(double share) {
        double percent = 100 * share;
        return percent < 1 ? Show.number(percent, 1) : Show.number(percent, 2);
    }

    private static String passed(CheckResult result) {
        return result.info().side() == Side.AT_MOST ? "over" : "short";
    }
}
