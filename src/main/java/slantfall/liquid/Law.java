package slantfall.liquid;

import java.util.function.DoubleBinaryOperator;
import slantfall.source.Source;

/** A correlation written as a function of temperature and strength. */
record Law(
        String key,
        Property property,
        DoubleBinaryOperator function,
        Range temperatureRange,
        Range strengthRange,
        Source source,
        String formula,
        double relativeUncertainty)
        implements Correlation {

    /** A law of temperature alone. */
    static Law pure(String key, Property property, DoubleBinaryOperator function, Range range, Source source, String formula) {
        return new Law(key, property, function, range, Range.ANY, source, formula, Double.NaN);
    }

    Law within(double relative) {
        return new Law(key, property, function, temperatureRange, strengthRange, source, formula, relative);
    }

    Law strengths(double low, double high) {
        return new Law(
                key, property, function, temperatureRange, new Range(low, high), source, formula, relativeUncertainty);
    }

    @Override
    public double at(double temperature, double strength) {
        return function.applyAsDouble(temperature, strength);
    }

    @Override
    public boolean needsStrength() {
        return strengthRange != Range.ANY;
    }
}
