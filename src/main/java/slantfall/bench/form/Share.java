package slantfall.bench.form;

import java.util.List;
import slantfall.quantity.EntryContext;
import slantfall.quantity.EntryReader;
import slantfall.quantity.Kind;
import slantfall.quantity.QuantityProblem;

/** A margin that a rule keeps, typed as a percentage. */
final class Share {

    private Share() {}

    /** The share, 0 where nothing was typed. A bare number is a percentage: the field says so. */
    static double read(String typed) {
        String text = typed.strip();
        if (text.isEmpty()) {
            return 0;
        }
        String full = text.endsWith("%") ? text : text + " %";
        double share = EntryReader.read(full, Kind.RATIO, EntryContext.none()).si();
        if (!(share >= 0)) {
            throw new QuantityProblem("a margin of " + text + " is negative", List.of(), "give 0 % or more");
        }
        return share;
    }
}
