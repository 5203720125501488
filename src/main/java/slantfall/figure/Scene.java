package slantfall.figure;

import slantfall.declare.Assessment;
import slantfall.declare.Notice;
import slantfall.quantity.Kind;
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

    /** Which way the net flow runs: 1 downhill, −1 uphill; 1 where nothing flows on the whole. */
    double forward() {
        boolean signed = assessment.declaration().reading("flow").isPresent();
        return signed && assessment.value("flow") < 0 ? -1 : 1;
    }

    /** Why a kind of quantity is unknown: the notice of an unknown reading of that kind, else of any unknown reading. */
    String reason(Kind kind) {
        String any = "";
        for (Assessment.ReadingValue r : assessment.readings()) {
            if (Double.isNaN(r.value())) {
                for (Notice n : assessment.notices()) {
                    if (n.about().equals(r.reading().key())) {
                        if (r.reading().kind() == kind) {
                            return n.text();
                        }
                        any = any.isEmpty() ? n.text() : any;
                    }
                }
            }
        }
        return any;
    }

    /** Why the arrangement's first reading is unknown, empty if it is known. */
    String reasonOfFirst() {
        Assessment.ReadingValue first = assessment.readings().get(0);
        return Double.isNaN(first.value()) ? reason(first.reading().kind()) : "";
    }

    /** The value of a setting [SI], initial if untouched. */
    double setting(String key) {
        return assessment.declaration().setting(key).map(assessment.setUp()::value).orElse(Double.NaN);
    }
}
