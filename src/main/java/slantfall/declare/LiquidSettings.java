package slantfall.declare;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import slantfall.quantity.Kind;

/** The liquid's own numbers as settings, the same for every arrangement. */
public final class LiquidSettings {

    private static final Map<String, Setting> ALL = all();

    private LiquidSettings() {}

    /**
     * The setting of a coordinate of the liquid.
     *
     * @param coordinate key without prefix, such as {@code temperature}
     */
    public static Setting of(String coordinate) {
        Setting setting = ALL.get(coordinate);
        if (setting == null) {
            throw new IllegalArgumentException("no setting for the liquid's " + coordinate);
        }
        return setting;
    }

    /** Every number that a liquid may have. */
    public static List<Setting> list() {
        return List.copyOf(ALL.values());
    }

    private static Map<String, Setting> all() {
        Map<String, Setting> map = new LinkedHashMap<>();
        put(map, Setting.of(Declaration.LIQUID + "temperature", "Temperature", "T", Kind.TEMPERATURE,
                Setting.Range.linear(293.15, Interval.above(0, 5000), 273.15, 373.15), "Temperature of the liquid."));
        put(map, Setting.of(Declaration.LIQUID + "strength", "Strength", "w", Kind.FRACTION,
                Setting.Range.linear(0.5, Interval.closed(0, 1), 0, 1), "Mass fraction of the dissolved substance."));
        put(map, Setting.of(Declaration.LIQUID + "density", "Density", "ρ", Kind.DENSITY,
                Setting.Range.linear(1000, Interval.above(0, 30000), 600, 2000), "Density of the liquid."));
        put(map, Setting.of(Declaration.LIQUID + "viscosity", "Viscosity", "μ", Kind.VISCOSITY,
                Setting.Range.log(1e-3, Interval.above(0, 1e9), 1e-4, 100), "Dynamic viscosity."));
        put(map, Setting.of(Declaration.LIQUID + "surfaceTension", "Surface tension", "σ", Kind.SURFACE_TENSION,
                Setting.Range.linear(0.05, Interval.closed(0, 10), 0.01, 0.08), "Surface tension against air."));
        put(map, Setting.of(Declaration.LIQUID + "contactAngle", "Contact angle", "θ", Kind.CONTACT_ANGLE,
                Setting.Range.linear(Math.toRadians(60), Interval.closed(0, Math.PI), 0, Math.toRadians(120)),
                "Angle at which the liquid meets the wall, through the liquid."));
        put(map, Setting.of(Declaration.LIQUID + "conductivity", "Thermal conductivity", "k", Kind.CONDUCTIVITY,
                Setting.Range.log(0.5, Interval.above(0, 1000), 0.05, 1), "Thermal conductivity."));
        put(map, Setting.of(Declaration.LIQUID + "heatCapacity", "Heat capacity", "c_p", Kind.HEAT_CAPACITY,
                Setting.Range.linear(4000, Interval.above(0, 1e5), 1000, 5000), "Heat capacity at constant pressure."));
        put(map, Setting.of(Declaration.LIQUID + "vapourPressure", "Vapour pressure", "p_v", Kind.PRESSURE_ABSOLUTE,
                Setting.Range.linear(2300, Interval.closed(0, 1e8), 0, 101325), "Absolute pressure at which it boils."));
        return map;
    }

    private static void put(Map<String, Setting> map, Setting setting) {
        map.put(setting.key().substring(Declaration.LIQUID.length()), setting);
    }
}
