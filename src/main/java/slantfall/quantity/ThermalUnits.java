package slantfall.quantity;

import static slantfall.quantity.Factors.BTU;
import static slantfall.quantity.Factors.CALORIE;
import static slantfall.quantity.Factors.FAHRENHEIT;
import static slantfall.quantity.Factors.FOOT;
import static slantfall.quantity.Factors.HOUR;
import static slantfall.quantity.Factors.POUND;
import static slantfall.quantity.Factors.POUND_FORCE;
import static slantfall.quantity.Sources.NIST;
import static slantfall.quantity.Sources.SI;

import java.util.List;

/** Units of heat and power; Btu and calorie are those of the International Table. The SI unit stands first. */
final class ThermalUnits {

    private static final String TABLE = "International Table";

    private ThermalUnits() {
    }

    static List<Unit> conductivity() {
        return List.of(Unit.of("W/(m K)", 1, SI), Unit.of("mW/(m K)", 1e-3, SI),
                Unit.of("Btu/(h ft degF)", BTU / (HOUR * FOOT * FAHRENHEIT), NIST).noted(TABLE),
                Unit.of("kcal/(h m K)", 1000 * CALORIE / HOUR, NIST).noted(TABLE));
    }

    static List<Unit> heatCapacity() {
        return List.of(Unit.of("J/(kg K)", 1, SI), Unit.of("kJ/(kg K)", 1e3, SI, "J/(g K)"),
                Unit.of("Btu/(lb degF)", BTU / (POUND * FAHRENHEIT), NIST).noted(TABLE),
                Unit.of("kcal/(kg K)", 1000 * CALORIE, NIST, "cal/(g K)").noted(TABLE));
    }

    static List<Unit> latentHeat() {
        return List.of(Unit.of("J/kg", 1, SI), Unit.of("kJ/kg", 1e3, SI),
                Unit.of("Btu/lb", BTU / POUND, NIST).noted(TABLE),
                Unit.of("kcal/kg", 1000 * CALORIE, NIST).noted(TABLE));
    }

    static List<Unit> heatFlux() {
        return List.of(Unit.of("W/m2", 1, SI), Unit.of("kW/m2", 1e3, SI), Unit.of("W/cm2", 1e4, SI),
                Unit.of("Btu/(h ft2)", BTU / (HOUR * FOOT * FOOT), NIST).noted(TABLE),
                Unit.of("kcal/(h m2)", 1000 * CALORIE / HOUR, NIST).noted(TABLE));
    }

    static List<Unit> heatTransferCoefficient() {
        return List.of(Unit.of("W/(m2 K)", 1, SI), Unit.of("kW/(m2 K)", 1e3, SI),
                Unit.of("Btu/(h ft2 degF)", BTU / (HOUR * FOOT * FOOT * FAHRENHEIT), NIST).noted(TABLE),
                Unit.of("kcal/(h m2 K)", 1000 * CALORIE / HOUR, NIST).noted(TABLE));
    }

    static List<Unit> power() {
        return List.of(Unit.of("W", 1, SI, "J/s"), Unit.of("kW", 1e3, SI), Unit.of("MW", 1e6, SI),
                Unit.of("Btu/h", BTU / HOUR, NIST).noted(TABLE),
                Unit.of("kcal/h", 1000 * CALORIE / HOUR, NIST).noted(TABLE),
                Unit.of("hp", 550 * FOOT * POUND_FORCE, NIST).noted("mechanical horsepower"));
    }
}
