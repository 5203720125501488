package slantfall.quantity;

import java.util.ArrayList;
import java.util.List;

/** Reads a number and a unit of the kind, or of a kind that the surroundings convert from. */
final class LinearReader {

    /** Digits of a converted value in an echo; the value itself keeps all. */
    static final int ECHO_DIGITS = 5;
    private static final double LARGEST_COUNT = 9.0e15;

    private LinearReader() {
    }

    static Entry read(Typed typed) {
        NumberText number = NumberText.first(typed.clean());
        if (number.rest().isEmpty()) {
            return bare(typed, number);
        }
        refuseSecondNumber(typed, number);
        return inUnit(typed, number, UnitIndex.find(typed, number.rest()));
    }

    /** The entry of a number in a unit, with its echo. */
    static Entry inUnit(Typed typed, NumberText number, Unit unit) {
        refuseMissing(typed, unit);
        double si = unit.toSi(number.value(), typed.context());
        if (typed.kind().count()) {
            refuseBrokenCount(typed, si);
        }
        return typed.entry(si, unit, echo(typed, number, unit, si));
    }

    private static void refuseSecondNumber(Typed typed, NumberText number) {
        if (number.rest().matches("(?s)[0-9].*") && !number.rest().matches("(?s)1 ?/ ?[A-Za-z(].*")) {
            throw typed.refused("holds more than one number", "Type one number and its unit, "
                    + "with a decimal point and without separators");
        }
    }

    private static Entry bare(Typed typed, NumberText number) {
        Kind kind = typed.kind();
        if (!kind.dimensionless()) {
            throw typed.refused("has no unit", "Type the unit of the " + kind.words() + ", such as "
                    + UnitIndex.likely(kind));
        }
        if (kind == Kind.FRACTION && Math.abs(number.value()) > 1) {
            throw typed.ambiguous("is more than the whole", List.of(number.shown() + " %", number.shown()
                    + " times the whole (type " + number.shown() + " fraction)"), "Type the per cent sign if meant");
        }
        return inUnit(typed, number, kind.si());
    }

    private static void refuseBrokenCount(Typed typed, double si) {
        if (si != Math.rint(si) || Math.abs(si) > LARGEST_COUNT) {
            throw typed.refused("is no whole number", "Type a whole number");
        }
    }

    /** Refuses a unit whose conversion needs something that is not known. */
    static void refuseMissing(Typed typed, Unit unit) {
        if (!Double.isNaN(unit.need().factor(typed.context()))) {
            return;
        }
        List<String> missing = new ArrayList<>();
        if (unit.need().density() && !(typed.context().density() > 0)) {
            missing.add("the density of the product");
        }
        if (unit.need().width() && !(typed.context().width() > 0)) {
            missing.add("the width");
        }
        String needs = missing.isEmpty() ? "a finite density and width" : String.join(" and ", missing);
        throw typed.refused("gives " + UnitIndex.withArticle(typed.kind().words()) + " only with " + needs,
                "Give " + needs + " first, or use " + UnitIndex.likely(typed.kind()));
    }

    private static String echo(Typed typed, NumberText number, Unit unit, double si) {
        Unit own = typed.kind().si();
        String asTyped = Show.joined(number.shown(), unit);
        String noted = asTyped + (unit.note().isEmpty() ? "" : " (" + unit.note() + ")");
        String inSi = Show.joined(Show.trimmed(si, ECHO_DIGITS), own);
        if (unit.need() != Need.NONE) {
            return inSi + ", from " + noted + with(typed, unit.need());
        }
        return unit.symbol().equals(own.symbol()) ? noted : noted + " = " + inSi;
    }

    /** The density and width that a conversion used, in words. */
    static String with(Typed typed, Need need) {
        String kinematic = typed.kind() == Kind.VISCOSITY ? " kinematic, with " : " at ";
        String width = need.width() ? " over " + Show.trimmed(typed.context().width(), ECHO_DIGITS) + " m" : "";
        return width + (need.density() ? kinematic + Show.trimmed(typed.context().density(), ECHO_DIGITS) + " kg/m³"
                : "");
    }
}
