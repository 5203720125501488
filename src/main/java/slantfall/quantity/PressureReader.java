package slantfall.quantity;

import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/** Keeps apart what pressures are confused by: gauge and absolute, a column of water and one of the product. */
final class PressureReader {

    private static final Pattern QUALIFIED = Pattern.compile(
            "(.*?[^ ]) ?(?:\\( ?(g|a|gauge|gage|abs|abs\\.|absolute) ?\\)|(?<= )(g|a|gauge|gage|abs|abs\\.|absolute)"
            + "|(?<=psi|bar|Pa|pa|PSI|BAR)(g|a|G|A))", Pattern.CASE_INSENSITIVE);

    private PressureReader() {
    }

    static Optional<Entry> read(Typed typed) {
        NumberText number = NumberText.first(typed.clean());
        Matcher m = QUALIFIED.matcher(number.rest());
        boolean qualified = m.matches();
        String unitText = qualified ? m.group(1) : number.rest();
        if (unitText.isEmpty()) {
            return Optional.empty();
        }
        if (typed.kind() != Kind.PRESSURE_ABSOLUTE) {
            if (qualified && isPressure(unitText)) {
                throw neither(typed, number, unitText);
            }
            refuseUnstatedLiquid(typed, number, unitText);
            return Optional.empty();
        }
        refuseUnstatedLiquid(typed, number, unitText);
        return Optional.of(absolute(typed, number, unitText, qualified ? first(m) : ""));
    }

    private static String first(Matcher m) {
        String word = m.group(2) != null ? m.group(2) : m.group(3) != null ? m.group(3) : m.group(4);
        return word.toLowerCase(Locale.ROOT).substring(0, 1);
    }

    private static boolean isPressure(String unitText) {
        return UnitIndex.isOf(Kind.PRESSURE_DIFFERENCE, unitText) || UnitIndex.isOf(Kind.HEAD, unitText);
    }

    private static QuantityProblem neither(Typed typed, NumberText number, String unitText) {
        return typed.refused("says gauge or absolute, but " + UnitIndex.withArticle(typed.kind().words())
                + " is a difference and neither", "Type " + number.shown() + " " + unitText.trim()
                + " if that is the difference");
    }

    private static void refuseUnstatedLiquid(Typed typed, NumberText number, String unitText) {
        if (typed.kind() != Kind.HEAD && UnitIndex.isOf(Kind.LENGTH, unitText)) {
            String column = number.shown() + " " + unitText.trim();
            throw typed.ambiguous("is a column of an unstated liquid",
                    List.of(column + " of product", column + " of water"), "Say of which liquid");
        }
    }

    private static Entry absolute(Typed typed, NumberText number, String unitText, String qualifier) {
        Unit base = UnitIndex.find(typed, unitText, Kind.PRESSURE_DIFFERENCE);
        if (qualifier.isEmpty() && !base.symbol().equals("Pa")) {
            throw unstated(typed, number, base);
        }
        if (qualifier.isEmpty()) {
            return LinearReader.inUnit(typed, number, typed.kind().si());
        }
        return LinearReader.inUnit(typed, number, zeroed(typed.kind(), base, qualifier));
    }

    private static Unit zeroed(Kind kind, Unit base, String qualifier) {
        String suffix = "(" + qualifier + ")";
        if (base.need() == Need.NONE) {
            return kind.unit(base.symbol() + suffix);
        }
        boolean gauge = qualifier.equals("g");
        Basis basis = new Basis(base.source(), base.need(), "of product, " + (gauge ? "gauge" : "absolute"));
        return new Unit(base.symbol() + suffix, base.label() + suffix, base.scale(),
                gauge ? Factors.ATMOSPHERE : 0, List.of(), basis);
    }

    private static QuantityProblem unstated(Typed typed, NumberText number, Unit base) {
        double size = base.toSi(number.value(), typed.context());
        return typed.ambiguous("does not say gauge or absolute",
                List.of(reading(number, base, "(g)", size + Factors.ATMOSPHERE), reading(number, base, "(a)", size)),
                "Add (g) or (a)");
    }

    private static String reading(NumberText number, Unit base, String suffix, double si) {
        String worth = Double.isNaN(si) ? "" : ", which is " + Show.trimmed(si / 1000, LinearReader.ECHO_DIGITS)
                + " kPa absolute";
        return number.shown() + " " + base.label() + suffix + worth;
    }
}
