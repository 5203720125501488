package slantfall.liquid;

import slantfall.source.Source;

/** One published law of one property in temperature and strength. */
public interface Correlation {

    /** Stable key, as preset files name it. */
    String key();

    /** What it gives. */
    Property property();

    /**
     * The property [SI]. Outside its range it is computed all the same; the liquid gives the notice.
     *
     * @param temperature [K]
     * @param strength mass fraction of the solute; ignored where {@link #needsStrength} is false
     */
    double at(double temperature, double strength);

    /** Temperatures for which it was published [K]. */
    Range temperatureRange();

    /** Mass fractions for which it was published. */
    default Range strengthRange() {
        return Range.ANY;
    }

    /** Whether it depends on the strength. */
    default boolean needsStrength() {
        return false;
    }

    /** Where it is published. */
    Source source();

    /** The formula in one line. */
    String formula();

    /** Relative half-width that the author states, NaN if none is known. */
    default double relativeUncertainty() {
        return Double.NaN;
    }
}
