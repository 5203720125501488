package slantfall.declare;

import java.util.ArrayList;
import java.util.List;
import slantfall.quantity.Show;
import slantfall.quantity.UnitSystem;

/** What is refused: values outside the possible range. */
public final class Limits {

    private Limits() {}

    /** Why a value is refused, with the bound and what to change. */
    public static String refusal(Setting setting, double value) {
        Interval possible = setting.possible();
        boolean low = !(value > possible.low()) || possible.lowOpen() && value == possible.low();
        double bound = low ? possible.low() : possible.high();
        String words = low ? (possible.lowOpen() ? "must be more than " : "must be at least ")
                : (possible.highOpen() ? "must be less than " : "must be at most ");
        return setting.name() + " (" + setting.key() + ") " + words
                + Show.value(bound, setting.kind(), UnitSystem.SI, 4) + ", was "
                + Show.value(value, setting.kind(), UnitSystem.SI, 4) + ".";
    }

    /** One sentence for each value of a set-up that is impossible; empty if all is well. */
    public static List<String> refusals(SetUp setUp, Declaration declaration) {
        List<String> refusals = new ArrayList<>();
        for (Setting setting : declaration.allSettings()) {
            Value value = setUp.values().get(setting.key());
            if (value != null && !setting.possible().contains(value.si())) {
                refusals.add(refusal(setting, value.si()));
            }
        }
        return refusals;
    }
}
