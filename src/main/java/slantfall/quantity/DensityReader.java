package slantfall.quantity;

import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/** Reads densities given as specific gravity or degrees Baumé. */
final class DensityReader {

    private static final Pattern GRAVITY_FIRST = Pattern.compile("(?:sg|sp\\.? ?gr\\.?)[ =]*(.*)",
            Pattern.CASE_INSENSITIVE);
    private static final Pattern BAUME = Pattern.compile(
            "(?:°|deg\\.?)? ?(?:be|baume)(?: ?\\(?heavy\\)?)?", Pattern.CASE_INSENSITIVE);
    /** Modulus of the scale for liquids heavier than water. */
    private static final double MODULUS = 145;

    private DensityReader() {
    }

    static Optional<Entry> read(Typed typed) {
        Matcher gravity = GRAVITY_FIRST.matcher(typed.clean());
        if (gravity.matches()) {
            NumberText number = NumberText.first(gravity.group(1));
            if (!number.rest().isEmpty()) {
                throw typed.refused("has a unit beside its specific gravity", "Type SG 1.04, or the density in kg/m³");
            }
            return Optional.of(LinearReader.inUnit(typed, number, typed.kind().unit("SG")));
        }
        NumberText number = NumberText.first(typed.clean());
        return BAUME.matcher(number.rest()).matches() ? Optional.of(baume(typed, number)) : Optional.empty();
    }

    private static Entry baume(Typed typed, NumberText number) {
        if (number.value() < 0 || number.value() >= MODULUS) {
            throw typed.refused("is outside the Baumé scale for liquids heavier than water, 0 to below 145",
                    "Give the density in kg/m³");
        }
        double si = MODULUS / (MODULUS - number.value()) * Factors.WATER_60F;
        return typed.entry(si, typed.kind().si(), Show.trimmed(si, LinearReader.ECHO_DIGITS) + " kg/m³, from "
                + number.shown() + " °Bé heavy: 145/(145 − °Bé) relative to water at 60 °F, 999.016 kg/m³");
    }
}
