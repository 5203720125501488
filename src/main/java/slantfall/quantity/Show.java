package slantfall.quantity;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;

/** Numbers and quantities as text: for people with the digits they deserve, for files with every digit. */
public final class Show {

    private static final double PLAIN_FROM = 1e-3;
    private static final double PLAIN_BELOW = 1e5;
    private static final String RAISED = "⁰¹²³⁴⁵⁶⁷⁸⁹";

    private Show() {
    }

    /**
     * A number with so many significant digits; plain between 0.001 and 100 000, as a power of ten outside.
     *
     * @param v the number; one that is not a number is shown as "unknown"
     * @param significant significant digits, at least 1
     */
    public static String number(double v, int significant) {
        if (significant < 1) {
            throw new IllegalArgumentException("significant digits are " + significant + ", must be at least 1");
        }
        if (Double.isNaN(v)) {
            return "unknown";
        }
        if (Double.isInfinite(v)) {
            return v > 0 ? "∞" : "−∞";
        }
        if (v == 0) {
            return "0";
        }
        BigDecimal rounded = BigDecimal.valueOf(v).round(new MathContext(significant, RoundingMode.HALF_UP));
        String text = plain(rounded) ? padded(rounded, significant) : power(rounded, significant);
        return text.replace('-', '−');
    }

    private static boolean plain(BigDecimal v) {
        double size = v.abs().doubleValue();
        return size >= PLAIN_FROM && size < PLAIN_BELOW;
    }

    // A double prints its shortest digits; the missing zeros are as significant as the others.
    private static String padded(BigDecimal v, int significant) {
        int decimals = Math.max(0, significant - (v.precision() - v.scale()));
        return v.setScale(decimals, RoundingMode.HALF_UP).toPlainString();
    }

    private static String power(BigDecimal v, int significant) {
        int exponent = v.precision() - v.scale() - 1;
        String mantissa = padded(v.movePointLeft(exponent), significant);
        StringBuilder raised = new StringBuilder(exponent < 0 ? "⁻" : "");
        for (char digit : String.valueOf(Math.abs(exponent)).toCharArray()) {
            raised.append(RAISED.charAt(digit - '0'));
        }
        return mantissa + "×10" + raised;
    }

    /** A number with at most so many significant digits, closing zeros left off: for echoes of what was typed. */
    static String trimmed(double v, int significant) {
        String text = number(v, significant);
        int power = text.indexOf('×');
        String digits = power < 0 ? text : text.substring(0, power);
        String shorter = digits.indexOf('.') < 0 ? digits : digits.replaceAll("\\.?0+$", "");
        return shorter + (power < 0 ? "" : text.substring(power));
    }

    /**
     * A quantity in a unit.
     *
     * @param si the value in the coherent SI unit of the kind
     * @param kind its kind
     * @param unit a unit of the kind that needs nothing else
     * @param significant significant digits, at least 1
     */
    public static String value(double si, Kind kind, Unit unit, int significant) {
        if (Double.isNaN(si) || Double.isInfinite(si)) {
            return number(si, significant);
        }
        if (kind.count()) {
            return number(si, Math.max(significant, digits(si)));
        }
        return joined(number(unit.fromSi(si), significant), unit);
    }

    /** A quantity in the unit that a system shows it in; its size decides the prefix. */
    public static String value(double si, Kind kind, UnitSystem system, int significant) {
        return value(si, kind, Display.unit(kind, system, si), significant);
    }

    /**
     * A quantity with every digit, in the SI unit; the reader gives the same double back, bit for bit.
     *
     * @param si a finite value in the coherent SI unit of the kind
     * @param kind its kind
     * @throws IllegalArgumentException where the value is not finite
     */
    public static String exact(double si, Kind kind) {
        if (Double.isNaN(si) || Double.isInfinite(si)) {
            throw new IllegalArgumentException("no exact text for " + si + " as " + kind.words());
        }
        if (kind == Kind.FRACTION && Math.abs(si) > 1) {
            return si + " fraction";
        }
        return kind.dimensionless() ? Double.toString(si) : si + " " + kind.si().symbol();
    }

    /** Number and label as they are set: the degree sign stands close, all others after a space. */
    static String joined(String number, Unit unit) {
        if (unit.label().isEmpty()) {
            return number;
        }
        return number + (unit.label().equals("°") ? "" : " ") + unit.label();
    }

    private static int digits(double si) {
        return (int) Math.max(1, Math.floor(Math.log10(Math.max(1, Math.abs(si)))) + 1);
    }
}
