package slantfall.quantity;

import java.math.BigDecimal;
import java.util.List;
import java.util.Objects;
import slantfall.source.Source;

/**
 * A unit of some kind of quantity: SI value = number x scale x what it needs + offset.
 *
 * @param symbol the canonical symbol in ASCII, as files use it
 * @param label the symbol as shown on screen
 * @param scale SI units in one of this
 * @param offset SI value of its zero
 * @param aliases other spellings; order, separators and exponents are forgiven anyway
 * @param basis source, need and note
 */
public record Unit(String symbol, String label, double scale, double offset, List<String> aliases, Basis basis) {

    public Unit {
        Objects.requireNonNull(symbol, "symbol");
        Objects.requireNonNull(label, "label");
        Objects.requireNonNull(basis, "basis");
        aliases = List.copyOf(aliases);
        if (!(scale > 0) || Double.isInfinite(scale)) {
            throw new IllegalArgumentException("scale of " + symbol + " is " + scale + ", must be positive");
        }
    }

    /** A unit without offset or need. */
    static Unit of(String symbol, double scale, Source source, String... aliases) {
        return new Unit(symbol, Labels.of(symbol), scale, 0, List.of(aliases), new Basis(source, Need.NONE, ""));
    }

    /** This unit with the word that keeps it apart from its namesakes. */
    Unit noted(String note) {
        return new Unit(symbol, label, scale, offset, aliases, new Basis(basis.source(), basis.need(), note));
    }

    /** This unit with its zero at an SI value. */
    Unit from(double newOffset) {
        return new Unit(symbol, label, scale, newOffset, aliases, basis);
    }

    /** This unit for another kind, by a need and a constant factor. */
    Unit needing(Need need, double factor) {
        return new Unit(symbol, label, scale * factor, offset, aliases,
                new Basis(basis.source(), need, basis.note()));
    }

    /** Where the factor comes from. */
    public Source source() {
        return basis.source();
    }

    /** What a conversion needs besides the number. */
    public Need need() {
        return basis.need();
    }

    /** The word that keeps it apart from its namesakes, or empty. */
    public String note() {
        return basis.note();
    }

    /**
     * The SI value of a number in this unit.
     *
     * @param v the number, in this unit
     * @return its value in the coherent SI unit
     * @throws IllegalStateException where the unit needs a density or a width
     */
    public double toSi(double v) {
        needNothing();
        return plusOffset(scaled(v));
    }

    /**
     * The number in this unit of an SI value.
     *
     * @param si the value in the coherent SI unit
     * @return the number, in this unit
     * @throws IllegalStateException where the unit needs a density or a width
     */
    public double fromSi(double si) {
        needNothing();
        return unscaled(minusOffset(si));
    }

    /** {@link #toSi(double)} with what the surroundings tell; not a number where something needed is unknown. */
    public double toSi(double v, EntryContext context) {
        return plusOffset(need() == Need.NONE ? scaled(v) : scaled(v) * need().factor(context));
    }

    /** {@link #fromSi(double)} with what the surroundings tell; not a number where something needed is unknown. */
    public double fromSi(double si, EntryContext context) {
        double own = minusOffset(si);
        return unscaled(need() == Need.NONE ? own : own / need().factor(context));
    }

    /** The SI size of a difference in this unit: the offset plays no part. */
    double differenceToSi(double v, EntryContext context) {
        return need() == Need.NONE ? scaled(v) : scaled(v) * need().factor(context);
    }

    private void needNothing() {
        if (need() != Need.NONE) {
            throw new IllegalStateException(symbol + " needs a density or a width, ask with a context");
        }
    }

    // 0.57 mm is 5.7E-4 m and 32 mil 8.128E-4 m to the last bit: dividing by a whole number, or multiplying the
    // decimals that were written down, rounds once where a product of two doubles rounds twice.
    private double scaled(double v) {
        double inverse = Math.rint(1 / scale);
        if (scale == 1 || !Double.isFinite(v) || v == 0) {
            return v;
        }
        if (scale < 1 && scale == 1 / inverse) {
            return v / inverse;
        }
        return BigDecimal.valueOf(v).multiply(BigDecimal.valueOf(scale)).doubleValue();
    }

    private double unscaled(double own) {
        double inverse = Math.rint(1 / scale);
        return scale < 1 && scale == 1 / inverse ? own * inverse : own / scale;
    }

    // Adding a zero would turn -0.0 into 0.0, and a value must come back bit for bit.
    private double plusOffset(double own) {
        return offset == 0 ? own : own + offset;
    }

    private double minusOffset(double si) {
        return offset == 0 ? si : si - offset;
    }
}
