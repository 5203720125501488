package slantfall.quantity;

import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.regex.Pattern;

/** Entries of the trade that cannot be converted as they stand, with what to give instead. */
final class MiscellanyReader {

    private static final Pattern SECONDS = Pattern.compile("(?:s|secs?|seconds?)\\.?(?![A-Za-z^/*]| ?[/*^]).*",
            Pattern.CASE_INSENSITIVE | Pattern.DOTALL);

    private MiscellanyReader() {
    }

    /** Refuses pounds per ream: the ream has several sizes. */
    static Optional<Entry> ream(Typed typed) {
        String clean = typed.clean().toLowerCase(Locale.ROOT);
        if (clean.contains("ream")) {
            String number = NumberText.first(typed.clean()).shown();
            throw typed.ambiguous("does not say how large the ream is",
                    List.of(number + " lb/3000 ft2", number + " lb/3300 ft2", number + " lb/1300 ft2"),
                    "Type the area of the ream in the unit");
        }
        return Optional.empty();
    }

    /** Refuses the flow time of a cup, which is no viscosity. */
    static Optional<Entry> cupTime(Typed typed) {
        if (SECONDS.matcher(NumberText.first(typed.clean()).rest()).matches()) {
            throw typed.refused("is the flow time of a cup, not a viscosity",
                    "Give the viscosity in mPa s or cSt; the cup's own table converts its seconds");
        }
        return Optional.empty();
    }
}
