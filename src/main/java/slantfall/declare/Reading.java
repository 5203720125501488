package slantfall.declare;

import slantfall.quantity.Kind;

/**
 * A computed quantity.
 *
 * @param key stable key
 * @param name words for people
 * @param symbol symbol used in formulas
 * @param kind kind of quantity
 * @param scale how distances from a requirement are measured
 * @param span where a bound is zero or negative, the difference that counts as one margin [SI]
 * @param help one sentence: meaning, sign, place
 */
public record Reading(String key, String name, String symbol, Kind kind, Scale scale, double span, String help) {

    /** A quantity that is positive where it has a meaning. */
    public static Reading positive(String key, String name, String symbol, Kind kind, String help) {
        return new Reading(key, name, symbol, kind, Scale.LOG, 1, help);
    }

    /** A quantity that may have either sign: a positive bound counts by ratio, any other by difference over the span. */
    public static Reading signed(String key, String name, String symbol, Kind kind, double span, String help) {
        return new Reading(key, name, symbol, kind, Scale.LOG, span, help);
    }
}
