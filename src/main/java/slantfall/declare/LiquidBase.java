package slantfall.declare;

import java.util.List;
import slantfall.liquid.Preset;
import slantfall.liquid.ViscosityFit;

/**
 * A liquid before any measured number is put over it.
 *
 * @param preset the preset, null for a liquid of measured values alone
 * @param points fit through measured viscosity points, null if none were given
 * @param typedPoints the points as typed, temperature and viscosity, for the file
 * @param fitKind law of the fit as the user asked for it, empty for the automatic choice
 */
public record LiquidBase(Preset preset, ViscosityFit points, List<List<String>> typedPoints, String fitKind) {

    public LiquidBase {
        typedPoints = typedPoints.stream().map(List::copyOf).toList();
    }

    /** A preset alone. */
    public static LiquidBase of(Preset preset) {
        return new LiquidBase(preset, null, List.of(), "");
    }

    /** Measured values alone. */
    public static LiquidBase measured() {
        return new LiquidBase(null, null, List.of(), "");
    }
}
