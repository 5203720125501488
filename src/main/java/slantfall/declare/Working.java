package slantfall.declare;

import java.util.List;
import slantfall.quantity.Kind;
import slantfall.source.Source;

/**
 * The steps behind a number. The last step's result is the reading.
 *
 * @param about key of the reading or check
 * @param steps formulas in order
 */
public record Working(String about, List<Step> steps) {

    public Working {
        steps = List.copyOf(steps);
        if (steps.isEmpty()) {
            throw new IllegalArgumentException("working of " + about + " has no step");
        }
    }

    /** The last step. */
    public Step last() {
        return steps.get(steps.size() - 1);
    }

    /**
     * One formula with the values put in.
     *
     * @param name what is computed
     * @param symbol its symbol
     * @param formula the formula, right-hand side
     * @param terms the values put in
     * @param result what came out [SI]
     * @param kind kind of the result
     * @param source where the formula is published
     * @param range where it holds
     */
    public record Step(
            String name,
            String symbol,
            String formula,
            List<Term> terms,
            double result,
            Kind kind,
            Source source,
            String range) {

        public Step {
            terms = List.copyOf(terms);
        }
    }

    /** A value put into a formula [SI]. */
    public record Term(String symbol, double value, Kind kind) {}
}
