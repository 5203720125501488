package slantfall.quantity;

import static slantfall.quantity.Factors.DAY;
import static slantfall.quantity.Factors.FAHRENHEIT;
import static slantfall.quantity.Factors.FOOT;
import static slantfall.quantity.Factors.GALLON;
import static slantfall.quantity.Factors.HOUR;
import static slantfall.quantity.Factors.IMPERIAL_GALLON;
import static slantfall.quantity.Factors.INCH;
import static slantfall.quantity.Factors.MIL;
import static slantfall.quantity.Factors.MINUTE;
import static slantfall.quantity.Factors.POUND;
import static slantfall.quantity.Sources.BRIX;
import static slantfall.quantity.Sources.DEFINITION;
import static slantfall.quantity.Sources.NIST;
import static slantfall.quantity.Sources.SI;

import java.util.List;

/** Units of geometry, time, amount and composition. The coherent SI unit stands first in every list. */
final class BasicUnits {

    private BasicUnits() {
    }

    static List<Unit> number() {
        return List.of(Unit.of("1", 1, SI));
    }

    static List<Unit> ratio() {
        return List.of(Unit.of("1", 1, SI), Unit.of("%", 0.01, SI));
    }

    static List<Unit> fraction() {
        return List.of(Unit.of("1", 1, SI, "fraction", "kg/kg", "g/g"),
                Unit.of("%", 0.01, SI),
                Unit.of("degBx", 0.01, BRIX, "Bx", "Brix", "deg Brix").noted("mass per cent of sucrose"),
                Unit.of("ppm", 1e-6, DEFINITION, "mg/kg").noted("by mass"),
                Unit.of("g/L", 1, SI, "kg/m3", "mg/mL").needing(Need.PER_DENSITY, 1));
    }

    static List<Unit> angle() {
        return List.of(Unit.of("rad", 1, SI), Unit.of("deg", Math.PI / 180, SI), Unit.of("mrad", 1e-3, SI));
    }

    static List<Unit> contactAngle() {
        return List.of(Unit.of("rad", 1, SI), Unit.of("deg", Math.PI / 180, SI));
    }

    static List<Unit> length() {
        return List.of(Unit.of("m", 1, SI), Unit.of("mm", 1e-3, SI), Unit.of("um", 1e-6, SI), Unit.of("cm", 1e-2, SI),
                Unit.of("in", INCH, NIST), Unit.of("mil", MIL, NIST), Unit.of("ft", FOOT, NIST),
                Unit.of("nm", 1e-9, SI), Unit.of("km", 1e3, SI), Unit.of("yd", 3 * FOOT, NIST),
                Unit.of("cm3/m2", 1e-6, SI, "mL/m2").noted("volume over area"),
                Unit.of("L/m2", 1e-3, SI).noted("volume over area"));
    }

    static List<Unit> area() {
        return List.of(Unit.of("m2", 1, SI), Unit.of("cm2", 1e-4, SI), Unit.of("mm2", 1e-6, SI),
                Unit.of("ft2", FOOT * FOOT, NIST), Unit.of("in2", INCH * INCH, NIST));
    }

    static List<Unit> volume() {
        return List.of(Unit.of("m3", 1, SI), Unit.of("L", 1e-3, SI), Unit.of("mL", 1e-6, SI),
                Unit.of("cm3", 1e-6, SI), Unit.of("hL", 0.1, SI),
                Unit.of("gal", GALLON, NIST).noted("US gallon"),
                Unit.of("impgal", IMPERIAL_GALLON, NIST).noted("imperial gallon"),
                Unit.of("ft3", FOOT * FOOT * FOOT, NIST), Unit.of("in3", INCH * INCH * INCH, NIST));
    }

    static List<Unit> mass() {
        return List.of(Unit.of("kg", 1, SI), Unit.of("g", 1e-3, SI), Unit.of("mg", 1e-6, SI),
                Unit.of("t", 1000, SI).noted("metric tonne"), Unit.of("lb", POUND, NIST));
    }

    static List<Unit> time() {
        return List.of(Unit.of("s", 1, SI), Unit.of("ms", 1e-3, SI), Unit.of("min", MINUTE, SI),
                Unit.of("h", HOUR, SI), Unit.of("d", DAY, SI));
    }

    static List<Unit> frequency() {
        return List.of(Unit.of("Hz", 1, SI, "1/s"), Unit.of("kHz", 1e3, SI),
                Unit.of("1/min", 1 / MINUTE, SI), Unit.of("rpm", 1 / MINUTE, NIST, "r/min").noted("turns per minute"));
    }

    static List<Unit> shearRate() {
        return List.of(Unit.of("1/s", 1, SI), Unit.of("1/min", 1 / MINUTE, SI));
    }

    static List<Unit> growthRate() {
        return List.of(Unit.of("1/m", 1, SI), Unit.of("1/cm", 100, SI), Unit.of("1/mm", 1000, SI),
                Unit.of("1/in", 1 / INCH, NIST), Unit.of("1/ft", 1 / FOOT, NIST));
    }

    static List<Unit> velocity() {
        return List.of(Unit.of("m/s", 1, SI), Unit.of("mm/s", 1e-3, SI), Unit.of("cm/s", 1e-2, SI),
                Unit.of("m/min", 1 / MINUTE, SI), Unit.of("m/h", 1 / HOUR, SI), Unit.of("km/h", 1000 / HOUR, SI),
                Unit.of("mm/min", 1e-3 / MINUTE, SI), Unit.of("ft/s", FOOT, NIST),
                Unit.of("ft/min", FOOT / MINUTE, NIST), Unit.of("in/s", INCH, NIST),
                Unit.of("in/min", INCH / MINUTE, NIST));
    }

    static List<Unit> acceleration() {
        return List.of(Unit.of("m/s2", 1, SI), Unit.of("ft/s2", FOOT, NIST));
    }

    static List<Unit> temperature() {
        return List.of(Unit.of("K", 1, SI), Unit.of("degC", 1, SI).from(273.15),
                Unit.of("degF", FAHRENHEIT, NIST).from(459.67 * 5 / 9));
    }

    static List<Unit> temperatureDifference() {
        return List.of(Unit.of("K", 1, SI), Unit.of("degC", 1, SI), Unit.of("degF", FAHRENHEIT, NIST));
    }
}
