package slantfall.figure;

import slantfall.declare.Assessment;
import slantfall.quantity.UnitSystem;

/**
 * What a figure shows.
 *
 * @param assessment the set-up with everything computed
 * @param units units of the labels
 * @param holds axes kept still between frames
 * @param cursor distance from the lower wall that is read off [m], NaN for none
 */
public record Scene(Assessment assessment, UnitSystem units, Holds holds, double cursor) {

    /** A scene at rest. */
    public static Scene still(Assessment assessment, UnitSystem units) {
        return new Scene(assessment, units, new Holds(), Double.NaN);
    }

    /** The value of a setting [SI], initial if untouched. */
    double setting(String key) {
        return assessment.declaration().setting(key).map(assessment.setUp()::value).orElse(Double.NaN);
    }
}
