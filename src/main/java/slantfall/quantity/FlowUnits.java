package slantfall.quantity;

import static slantfall.quantity.Factors.DAY;
import static slantfall.quantity.Factors.FOOT;
import static slantfall.quantity.Factors.GALLON;
import static slantfall.quantity.Factors.HOUR;
import static slantfall.quantity.Factors.IMPERIAL_GALLON;
import static slantfall.quantity.Factors.INCH;
import static slantfall.quantity.Factors.MINUTE;
import static slantfall.quantity.Factors.POUND;
import static slantfall.quantity.Sources.NIST;
import static slantfall.quantity.Sources.SI;

import java.util.List;

/** Units of feed and of wet coating. The coherent SI unit stands first in every list. */
final class FlowUnits {

    private static final String US = "US gallon";
    private static final String IMPERIAL = "imperial gallon";

    private FlowUnits() {
    }

    static List<Unit> massPerWidth() {
        return List.of(Unit.of("kg/(m s)", 1, SI), Unit.of("kg/(m h)", 1 / HOUR, SI),
                Unit.of("kg/(m min)", 1 / MINUTE, SI), Unit.of("g/(cm s)", 0.1, SI), Unit.of("g/(m s)", 1e-3, SI),
                Unit.of("t/(m h)", 1000 / HOUR, SI).noted("metric tonne"),
                Unit.of("lb/(h ft)", POUND / (HOUR * FOOT), NIST),
                Unit.of("lb/(min ft)", POUND / (MINUTE * FOOT), NIST));
    }

    static List<Unit> volumePerWidth() {
        return List.of(Unit.of("m2/s", 1, SI), Unit.of("cm2/s", 1e-4, SI), Unit.of("mm2/s", 1e-6, SI),
                Unit.of("m3/(m h)", 1 / HOUR, SI), Unit.of("L/(h cm)", 0.1 / HOUR, SI),
                Unit.of("L/(h m)", 1e-3 / HOUR, SI), Unit.of("L/(min m)", 1e-3 / MINUTE, SI),
                Unit.of("L/(s m)", 1e-3, SI), Unit.of("cm3/(min cm)", 1e-4 / MINUTE, SI, "mL/(min cm)"),
                Unit.of("gal/(min ft)", GALLON / (MINUTE * FOOT), NIST).noted(US),
                Unit.of("gal/(h ft)", GALLON / (HOUR * FOOT), NIST).noted(US),
                Unit.of("impgal/(min ft)", IMPERIAL_GALLON / (MINUTE * FOOT), NIST).noted(IMPERIAL),
                Unit.of("ft2/s", FOOT * FOOT, NIST), Unit.of("ft2/min", FOOT * FOOT / MINUTE, NIST));
    }

    static List<Unit> mass() {
        return List.of(Unit.of("kg/s", 1, SI), Unit.of("kg/h", 1 / HOUR, SI), Unit.of("kg/min", 1 / MINUTE, SI),
                Unit.of("g/s", 1e-3, SI), Unit.of("g/min", 1e-3 / MINUTE, SI),
                Unit.of("t/h", 1000 / HOUR, SI).noted("metric tonne"),
                Unit.of("t/d", 1000 / DAY, SI).noted("metric tonne"), Unit.of("lb/h", POUND / HOUR, NIST),
                Unit.of("lb/min", POUND / MINUTE, NIST), Unit.of("lb/s", POUND, NIST));
    }

    static List<Unit> volume() {
        return List.of(Unit.of("m3/s", 1, SI), Unit.of("m3/h", 1 / HOUR, SI), Unit.of("L/h", 1e-3 / HOUR, SI),
                Unit.of("L/min", 1e-3 / MINUTE, SI), Unit.of("L/s", 1e-3, SI), Unit.of("m3/min", 1 / MINUTE, SI),
                Unit.of("mL/min", 1e-6 / MINUTE, SI), Unit.of("cm3/min", 1e-6 / MINUTE, SI),
                Unit.of("cm3/s", 1e-6, SI, "mL/s"), Unit.of("m3/d", 1 / DAY, SI),
                Unit.of("gal/min", GALLON / MINUTE, NIST).noted(US), Unit.of("gal/h", GALLON / HOUR, NIST).noted(US),
                Unit.of("impgal/min", IMPERIAL_GALLON / MINUTE, NIST).noted(IMPERIAL),
                Unit.of("ft3/s", FOOT * FOOT * FOOT, NIST), Unit.of("ft3/min", FOOT * FOOT * FOOT / MINUTE, NIST),
                Unit.of("in3/s", INCH * INCH * INCH, NIST));
    }

    static List<Unit> coatingMass() {
        return List.of(Unit.of("kg/m2", 1, SI), Unit.of("g/m2", 1e-3, SI),
                Unit.of("lb/3000 ft2", POUND / (3000 * FOOT * FOOT), NIST).noted("ream of 3000 ft2"),
                Unit.of("lb/1000 ft2", POUND / (1000 * FOOT * FOOT), NIST, "lb/msf"),
                Unit.of("lb/1300 ft2", POUND / (1300 * FOOT * FOOT), NIST),
                Unit.of("lb/3300 ft2", POUND / (3300 * FOOT * FOOT), NIST).noted("ream of 3300 ft2"));
    }
}
