package slantfall.quantity;

import java.util.List;
import java.util.regex.Pattern;

/** Reads the half width of a plus-or-minus. */
final class PlusMinusReader {

    private static final Pattern SIGN = Pattern.compile("^(?:±|\\+ ?/ ?-|\\+-|plus ?(?:or)? ?-?minus) ?",
            Pattern.CASE_INSENSITIVE);
    private static final Pattern RELATIVE = Pattern.compile(
            "(?:%|per ?cent) ?(?:of (?:the )?value|relative|rel\\.?)", Pattern.CASE_INSENSITIVE);
    private static final Pattern POINTS = Pattern.compile("(?:%|percentage)? ?(?:points?|absolute|abs\\.?)",
            Pattern.CASE_INSENSITIVE);
    private static final Pattern PER_CENT = Pattern.compile("%|per ?cent", Pattern.CASE_INSENSITIVE);

    private PlusMinusReader() {
    }

    static Entry read(Typed given, double centreSi) {
        String unsigned = Cleaned.trimmed(SIGN.matcher(given.clean()).replaceFirst(""));
        Typed typed = given.as(unsigned);
        NumberText number = NumberText.first(unsigned);
        if (number.value() < 0) {
            throw typed.refused("is negative", "A plus-or-minus is zero or more");
        }
        boolean share = typed.kind() == Kind.FRACTION || typed.kind() == Kind.RATIO;
        if (share && POINTS.matcher(number.rest()).matches()) {
            double si = number.value() / 100;
            return typed.entry(si, typed.kind().unit("%"), "± " + number.shown() + " percentage points");
        }
        if (RELATIVE.matcher(number.rest()).matches()) {
            return relative(typed, number, centreSi);
        }
        if (PER_CENT.matcher(number.rest()).matches()) {
            refuseUnclearPerCent(typed, number, share);
            return relative(typed, number, centreSi);
        }
        return absolute(typed);
    }

    private static void refuseUnclearPerCent(Typed typed, NumberText number, boolean share) {
        if (share) {
            throw typed.ambiguous("may be points or a share of the value",
                    List.of(number.shown() + " points", number.shown() + " % of value"), "Say points or of value");
        }
        if (typed.kind() == Kind.ANGLE || typed.kind() == Kind.CONTACT_ANGLE) {
            throw typed.ambiguous("may be slope or a share of the angle",
                    List.of(number.shown() + " % of value", "an angle in deg"), "Type deg, or say of value");
        }
    }

    private static Entry relative(Typed typed, NumberText number, double centreSi) {
        if (typed.kind() == Kind.TEMPERATURE) {
            throw typed.refused("is a share of a temperature, whose zero is arbitrary", "Give it in K or °F");
        }
        if (Double.isNaN(centreSi) || Double.isInfinite(centreSi) || centreSi == 0) {
            throw typed.refused("is a share of a value that is zero or unknown", "Give it in "
                    + UnitIndex.likely(typed.kind()));
        }
        double si = Math.abs(centreSi) * number.value() / 100;
        return typed.entry(si, typed.kind().si(), "± " + number.shown() + " % of the value = ± "
                + Show.joined(Show.trimmed(si, LinearReader.ECHO_DIGITS), typed.kind().si()));
    }

    private static Entry absolute(Typed typed) {
        Kind kind = differenceKind(typed.kind());
        Typed asDifference = new Typed(typed.text(), typed.clean(), kind, typed.context());
        return switch (kind) {
            // No difference can be told in slopes, degrees Baumé or tube gauges: they are not proportional.
            case ANGLE, DENSITY -> widened(typed, LinearReader.read(asDifference));
            case LENGTH -> widened(typed, TubeReader.plain(asDifference));
            default -> widened(typed, EntryReader.read(typed.clean(), kind, typed.context()));
        };
    }

    private static Entry widened(Typed typed, Entry half) {
        return typed.entry(half.si(), half.unit(), "± " + half.echo());
    }

    private static Kind differenceKind(Kind kind) {
        return switch (kind) {
            case TEMPERATURE -> Kind.TEMPERATURE_DIFFERENCE;
            case PRESSURE_ABSOLUTE -> Kind.PRESSURE_DIFFERENCE;
            default -> kind;
        };
    }
}
