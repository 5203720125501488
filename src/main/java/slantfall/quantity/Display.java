package slantfall.quantity;

import java.util.ArrayList;
import java.util.EnumMap;
import java.util.EnumSet;
import java.util.List;
import java.util.Map;
import java.util.Set;

/**
 * Which unit a quantity is shown in. Each kind has, per system, a short ladder of units from large to small; the
 * largest in which the number is at least one (a tenth for some metric ones) is taken.
 */
public final class Display {

    private static final Map<Kind, List<List<Unit>>> LADDERS = new EnumMap<>(Kind.class);

    /** Kinds whose metric units are used down to a tenth: 0.8 mm of film and 0.4 m of width, not 800 µm and 400 mm. */
    private static final Set<Kind> IN_TENTHS = EnumSet.of(Kind.LENGTH, Kind.HEAD, Kind.AREA, Kind.VOLUME, Kind.VELOCITY,
            Kind.VOLUME_FLOW, Kind.VOLUME_FLOW_PER_WIDTH);

    static {
        put(Kind.ANGLE, "deg", "deg", "deg");
        put(Kind.CONTACT_ANGLE, "deg", "deg", "deg");
        put(Kind.LENGTH, "m|mm|um", "m|mm|um", "ft|in|mil");
        put(Kind.AREA, "m2|cm2|mm2", "m2|cm2|mm2", "ft2|in2");
        put(Kind.VOLUME, "m3|L|mL", "m3|L|mL", "ft3|gal|in3");
        put(Kind.MASS, "kg|g|mg", "t|kg|g", "lb");
        put(Kind.TIME, "s|ms", "h|min|s|ms", "h|min|s|ms");
        put(Kind.FREQUENCY, "Hz", "Hz", "Hz");
        put(Kind.VELOCITY, "m/s|mm/s", "m/s|mm/s", "ft/s|in/s");
        put(Kind.GROWTH_RATE, "1/m", "1/m", "1/ft");
        put(Kind.MASS_FLOW, "kg/s|g/s", "t/h|kg/h", "lb/h");
        put(Kind.VOLUME_FLOW, "m3/s|L/s|cm3/s", "m3/h|L/h|cm3/min", "gal/min|gal/h");
        put(Kind.MASS_FLOW_PER_WIDTH, "kg/(m s)", "kg/(m h)", "lb/(h ft)");
        put(Kind.VOLUME_FLOW_PER_WIDTH, "m2/s|cm2/s|mm2/s", "L/(h cm)|L/(h m)", "gal/(min ft)|gal/(h ft)");
        put(Kind.PRESSURE_DIFFERENCE, "MPa|kPa|Pa", "bar|mbar|Pa", "psi|in of water");
        put(Kind.PRESSURE_ABSOLUTE, "MPa(a)|kPa(a)|Pa", "bar(a)|mbar(a)|Pa", "psi(a)");
        put(Kind.ACCELERATION, "m/s2", "m/s2", "ft/s2");
        put(Kind.PRESSURE_GRADIENT, "kPa/m|Pa/m", "bar/m|kPa/m|Pa/m", "psi/ft");
        put(Kind.HEAD, "m|mm", "m|mm", "ft|in");
        put(Kind.STRESS, "kPa|Pa|mPa", "kPa|Pa|mPa", "psi|lbf/ft2");
        put(Kind.SHEAR_RATE, "1/s", "1/s", "1/s");
        put(Kind.VISCOSITY, "Pa s|mPa s|uPa s", "cP", "cP");
        put(Kind.KINEMATIC_VISCOSITY, "m2/s|mm2/s", "cSt", "cSt");
        put(Kind.CONSISTENCY, "Pa s^n|mPa s^n", "Pa s^n|mPa s^n", "lbf s^n/ft2");
        put(Kind.DENSITY, "kg/m3", "kg/m3", "lb/ft3");
        put(Kind.SURFACE_TENSION, "mN/m", "mN/m", "dyn/cm");
        put(Kind.TEMPERATURE, "degC", "degC", "degF");
        put(Kind.TEMPERATURE_DIFFERENCE, "K", "K", "degF");
        put(Kind.FRACTION, "%", "%", "%");
        put(Kind.CONDUCTIVITY, "W/(m K)|mW/(m K)", "W/(m K)|mW/(m K)", "Btu/(h ft degF)");
        put(Kind.HEAT_CAPACITY, "kJ/(kg K)|J/(kg K)", "kJ/(kg K)|J/(kg K)", "Btu/(lb degF)");
        put(Kind.LATENT_HEAT, "kJ/kg|J/kg", "kJ/kg|J/kg", "Btu/lb");
        put(Kind.HEAT_FLUX, "kW/m2|W/m2", "kW/m2|W/m2", "Btu/(h ft2)");
        put(Kind.HEAT_TRANSFER_COEFFICIENT, "kW/(m2 K)|W/(m2 K)", "kW/(m2 K)|W/(m2 K)", "Btu/(h ft2 degF)");
        put(Kind.POWER, "MW|kW|W", "MW|kW|W", "hp|Btu/h");
        put(Kind.COATING_MASS, "kg/m2|g/m2", "g/m2", "lb/3000 ft2");
    }

    private Display() {
    }

    /** The largest unit of a kind in a system; for a number of no known size. */
    public static Unit unit(Kind kind, UnitSystem system) {
        return ladder(kind, system).get(0);
    }

    /**
     * The unit of a kind in a system that suits a value.
     *
     * @param kind the kind
     * @param system the system
     * @param si the value in the coherent SI unit
     */
    public static Unit unit(Kind kind, UnitSystem system, double si) {
        List<Unit> ladder = ladder(kind, system);
        if (si == 0) {
            return ladder.stream().filter(u -> u.scale() == 1 && u.offset() == 0).findFirst().orElse(ladder.get(ladder.size() - 1));
        }
        if (Double.isNaN(si)) {
            return ladder.get(0);
        }
        double from = system != UnitSystem.US && IN_TENTHS.contains(kind) ? 0.1 : 1;
        for (Unit unit : ladder) {
            if (Math.abs(unit.fromSi(si)) >= from) {
                return unit;
            }
        }
        return ladder.get(ladder.size() - 1);
    }

    /** The ladder of units of a kind in a system, from large to small. */
    static List<Unit> ladder(Kind kind, UnitSystem system) {
        List<List<Unit>> perSystem = LADDERS.get(kind);
        return perSystem == null ? List.of(kind.si()) : perSystem.get(system.ordinal());
    }

    private static void put(Kind kind, String si, String trade, String us) {
        LADDERS.put(kind, List.of(units(kind, si), units(kind, trade), units(kind, us)));
    }

    private static List<Unit> units(Kind kind, String symbols) {
        List<Unit> units = new ArrayList<>();
        for (String symbol : symbols.split("\\|")) {
            units.add(kind.unit(symbol));
        }
        return List.copyOf(units);
    }
}
