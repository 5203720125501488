package slantfall.arrangement;

import java.util.ArrayList;
import java.util.List;
import slantfall.declare.Reading;
import slantfall.declare.Working;
import slantfall.declare.Working.Step;
import slantfall.declare.Working.Term;
import slantfall.quantity.Kind;
import slantfall.source.Source;

/** Builds the steps of a working in the order they are computed. */
final class Steps {

    private final List<Step> steps = new ArrayList<>();
    private final List<Term> terms = new ArrayList<>();

    /** Puts a value into the next formula. */
    Steps with(String symbol, double value, Kind kind) {
        terms.add(new Term(symbol, value, kind));
        return this;
    }

    /** Closes the formula with its result. */
    Steps gives(Names names, String formula, double result, Source source, String range) {
        steps.add(new Step(names.name(), names.symbol(), formula, List.copyOf(terms), result, names.kind(), source, range));
        terms.clear();
        return this;
    }

    /** The working of a reading. */
    Working of(String reading) {
        return new Working(reading, steps);
    }

    /** Name, symbol and kind of a result. */
    record Names(String name, String symbol, Kind kind) {

        static Names of(Reading reading) {
            return new Names(reading.name(), reading.symbol(), reading.kind());
        }
    }
}
