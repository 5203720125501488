package slantfall.quantity;

import java.util.List;
import java.util.Optional;
import java.util.function.Function;

/**
 * Reads what people type for a quantity. What can be meant in more than one way is refused, never guessed; the package
 * comment says how numbers are written.
 */
public final class EntryReader {

    private EntryReader() {
    }

    /**
     * Reads an entry.
     *
     * @param text what was typed
     * @param kind the kind of quantity that is wanted
     * @param context what the surroundings tell, such as the density of the product
     * @return the entry understood, its value in the coherent SI unit of the kind
     * @throws QuantityProblem where it is not one clear quantity of the kind
     */
    public static Entry read(String text, Kind kind, EntryContext context) {
        Typed typed = Typed.of(text, kind, context);
        for (Function<Typed, Optional<Entry>> special : specials(kind)) {
            Optional<Entry> entry = special.apply(typed);
            if (entry.isPresent()) {
                return entry.get();
            }
        }
        return LinearReader.read(typed);
    }

    private static List<Function<Typed, Optional<Entry>>> specials(Kind kind) {
        return switch (kind) {
            case ANGLE -> List.of(SlopeReader::read);
            case PRESSURE_DIFFERENCE, PRESSURE_ABSOLUTE, HEAD -> List.of(PressureReader::read);
            case LENGTH -> List.of(TubeReader::read);
            case DENSITY -> List.of(DensityReader::read);
            case FRACTION -> List.of(FractionReader::read);
            case COATING_MASS -> List.of(MiscellanyReader::ream);
            case VISCOSITY, KINEMATIC_VISCOSITY -> List.of(MiscellanyReader::cupTime);
            default -> List.of();
        };
    }

    /**
     * Reads a plus-or-minus: relative ("± 20 %") or in a unit of the kind ("+/- 0.5 mm"). A share of a fraction or
     * ratio says "of value" or "points"; a temperature takes a difference.
     *
     * @param text what was typed
     * @param kind the kind of the value itself
     * @param centreSi the value itself, in the coherent SI unit of the kind
     * @param context what the surroundings tell
     * @return the half width in the coherent SI unit of the kind, zero or more
     * @throws QuantityProblem where it is not one clear half width
     */
    public static double plusMinus(String text, Kind kind, double centreSi, EntryContext context) {
        return plusMinusEntry(text, kind, centreSi, context).si();
    }

    /** {@link #plusMinus} with its echo. */
    public static Entry plusMinusEntry(String text, Kind kind, double centreSi, EntryContext context) {
        return PlusMinusReader.read(Typed.of(text, kind, context), centreSi);
    }
}
