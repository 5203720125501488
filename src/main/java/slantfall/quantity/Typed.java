package slantfall.quantity;

import java.util.List;

/**
 * An entry on its way through the readers.
 *
 * @param text what was typed, untouched
 * @param clean the same in plain characters
 * @param kind the kind that is wanted
 * @param context what the surroundings tell
 */
record Typed(String text, String clean, Kind kind, EntryContext context) {

    static Typed of(String text, Kind kind, EntryContext context) {
        return new Typed(text, Cleaned.entry(text), kind, context);
    }

    /** The same entry with its text put another way, for the readers further down. */
    Typed as(String newClean) {
        return new Typed(text, newClean, kind, context);
    }

    /** The entry quoted for a message. */
    String quoted() {
        return Cleaned.quote(text.strip());
    }

    /** The entry understood. */
    Entry entry(double si, Unit unit, String echo) {
        if (Double.isNaN(si) || Double.isInfinite(si)) {
            throw refused("is too large a number", "Check the exponent");
        }
        return new Entry(text, si, kind, unit, echo);
    }

    /** A refusal that starts with the quoted entry. */
    QuantityProblem refused(String what, String remedy) {
        return QuantityProblem.plain(quoted() + " " + what, remedy);
    }

    /** A refusal of an ambiguous entry. */
    QuantityProblem ambiguous(String what, List<String> readings, String remedy) {
        return new QuantityProblem(quoted() + " " + what, readings, remedy);
    }
}
