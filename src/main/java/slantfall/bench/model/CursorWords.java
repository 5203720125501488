package slantfall.bench.model;

import java.util.ArrayList;
import java.util.List;
import slantfall.declare.Profile;
import slantfall.quantity.Show;
import slantfall.quantity.UnitSystem;

/** What the traverses say at the cursor. */
public final class CursorWords {

    private static final int DIGITS = 3;

    private CursorWords() {}

    /** Distance and every traverse there in one line, empty where the cursor reads nothing. */
    public static String of(Desk desk) {
        Profile profile = desk.assessment().profiles().traverses();
        double at = desk.cursorProperty().get();
        double[] y = profile.axis().values();
        if (profile.columns().isEmpty() || !(at >= y[0] && at <= y[y.length - 1])) {
            return "";
        }
        UnitSystem units = desk.unitsProperty().get();
        List<String> parts = new ArrayList<>();
        for (Profile.Column column : profile.columns()) {
            parts.add(column.name().toLowerCase(java.util.Locale.ROOT) + " "
                    + Show.value(between(y, column.values(), at), column.kind(), units, DIGITS));
        }
        return Show.value(at, profile.axis().kind(), units, DIGITS) + " from the wall: " + String.join(", ", parts);
    }

    /** Linear between the points of a traverse. */
    static double between(double[] axis, double[] values, double at) {
        int i = 1;
        while (i < axis.length - 1 && axis[i] < at) {
            i++;
        }
        double part = (at - axis[i - 1]) / (axis[i] - axis[i - 1]);
        return values[i - 1] + part * (values[i] - values[i - 1]);
    }
}
