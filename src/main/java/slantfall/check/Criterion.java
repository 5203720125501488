package slantfall.check;

import java.util.function.Predicate;
import java.util.function.ToDoubleFunction;
import slantfall.declare.Check;
import slantfall.declare.CheckInfo;

/**
 * A criterion written as three small functions of the case.
 *
 * @param info words, side, scale and source
 * @param of value compared
 * @param bound limit
 * @param range whether the case lies where the criterion was tested
 */
record Criterion<C>(CheckInfo info, ToDoubleFunction<C> of, ToDoubleFunction<C> bound, Predicate<C> range)
        implements Check<C> {

    @Override
    public double value(C c) {
        return of.applyAsDouble(c);
    }

    @Override
    public double limit(C c) {
        return bound.applyAsDouble(c);
    }

    @Override
    public boolean inRange(C c) {
        return range.test(c);
    }
}
