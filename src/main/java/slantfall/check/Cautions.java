package slantfall.check;

import java.util.ArrayList;
import java.util.List;
import slantfall.liquid.Preset;

/** Warnings where somebody could be hurt. Each defers to local codes and licensed practice; none is a verdict. */
public final class Cautions {

    /** From this temperature on a liquid is called hot here [K]; common practice, not a limit of any code. */
    private static final double HOT = 273.15 + 60;

    /** From this difference on the pressure is called out [Pa]; common practice, not a limit of any code. */
    private static final double PRESSURE = 50e3;

    private Cautions() {}

    /**
     * Warnings that follow from the liquid alone.
     *
     * @param temperature temperature of the liquid [K], NaN if it plays no part
     * @param preset the preset, null for measured values alone
     */
    public static List<String> ofLiquid(double temperature, Preset preset) {
        List<String> cautions = new ArrayList<>();
        if (temperature >= HOT) {
            cautions.add("Hot liquid: burns and scalds. Work on open or live equipment needs the site's permit and"
                    + " lock-out; local codes and licensed practice decide.");
        }
        if (preset != null) {
            cautions.addAll(preset.cautions());
        }
        return cautions;
    }

    /**
     * Warnings that follow from a pressure difference.
     *
     * @param difference pressure difference [Pa]
     */
    public static List<String> ofPressure(double difference) {
        return Math.abs(difference) < PRESSURE
                ? List.of()
                : List.of("Pressure: this is not a strength calculation. A blocked slot takes the full supply pressure;"
                        + " pressure-equipment codes and a licensed engineer decide.");
    }

    /** The sentence that every result carries. */
    public static String general() {
        return "Supports, does not replace, the judgement of a competent engineer; a margin is not a guarantee.";
    }
}
