package slantfall.quantity;

import static slantfall.quantity.Factors.ATMOSPHERE;
import static slantfall.quantity.Factors.FOOT;
import static slantfall.quantity.Factors.GALLON;
import static slantfall.quantity.Factors.GRAVITY;
import static slantfall.quantity.Factors.HOUR;
import static slantfall.quantity.Factors.IMPERIAL_GALLON;
import static slantfall.quantity.Factors.INCH;
import static slantfall.quantity.Factors.METRE_OF_MERCURY;
import static slantfall.quantity.Factors.METRE_OF_WATER;
import static slantfall.quantity.Factors.POUND;
import static slantfall.quantity.Factors.POUND_FORCE;
import static slantfall.quantity.Sources.NIST;
import static slantfall.quantity.Sources.SI;

import java.util.ArrayList;
import java.util.List;

/** Units of pressure, stress, viscosity, density and surface tension. The coherent SI unit stands first. */
final class MechanicalUnits {

    private static final String WATER = "conventional water of 1000 kg/m3";

    private MechanicalUnits() {
    }

    static List<Unit> pressureDifference() {
        return List.of(Unit.of("Pa", 1, SI, "N/m2"), Unit.of("kPa", 1e3, SI), Unit.of("mbar", 100, SI),
                Unit.of("bar", 1e5, SI), Unit.of("psi", POUND_FORCE / (INCH * INCH), NIST, "lbf/in2", "lb/in2"),
                Unit.of("in of water", INCH * METRE_OF_WATER, NIST).noted(WATER),
                Unit.of("mm of water", METRE_OF_WATER / 1000, NIST).noted(WATER),
                Unit.of("cm of water", METRE_OF_WATER / 100, NIST).noted(WATER),
                Unit.of("m of water", METRE_OF_WATER, NIST).noted(WATER),
                Unit.of("ft of water", FOOT * METRE_OF_WATER, NIST).noted(WATER),
                Unit.of("hPa", 100, SI), Unit.of("MPa", 1e6, SI),
                Unit.of("mmHg", METRE_OF_MERCURY / 1000, NIST, "mm of mercury").noted("conventional mercury"),
                Unit.of("inHg", INCH * METRE_OF_MERCURY, NIST, "in of mercury").noted("conventional mercury"),
                Unit.of("Torr", ATMOSPHERE / 760, NIST), Unit.of("atm", ATMOSPHERE, NIST).noted("standard atmosphere"),
                Unit.of("kgf/cm2", GRAVITY * 1e4, NIST, "kp/cm2").noted("technical atmosphere"),
                Unit.of("lbf/ft2", POUND_FORCE / (FOOT * FOOT), NIST), Unit.of("dyn/cm2", 0.1, NIST));
    }

    /** Each unit of pressure twice, absolute and gauge; plain Pa is the coherent unit and absolute. */
    static List<Unit> pressureAbsolute() {
        List<Unit> all = new ArrayList<>();
        all.add(Unit.of("Pa", 1, SI).noted("absolute"));
        for (Unit unit : pressureDifference()) {
            all.add(withZero(unit, "(a)", 0, "absolute"));
            all.add(withZero(unit, "(g)", ATMOSPHERE, "gauge against the standard atmosphere of 101325 Pa"));
        }
        return all;
    }

    private static Unit withZero(Unit unit, String suffix, double zero, String words) {
        String note = unit.note().isEmpty() ? words : words + ", " + unit.note();
        Basis basis = new Basis(unit.source(), Need.NONE, note);
        return new Unit(unit.symbol() + suffix, unit.label() + suffix, unit.scale(), zero, List.of(), basis);
    }

    /** Lengths of a column of the product itself. */
    static List<Unit> head() {
        return List.of(product("m", 1), product("mm", 1e-3), product("cm", 1e-2), product("in", INCH),
                product("ft", FOOT));
    }

    private static Unit product(String symbol, double scale) {
        return Unit.of(symbol, scale, symbol.endsWith("m") ? SI : NIST, symbol + " of product").noted("of product");
    }

    static List<Unit> pressureGradient() {
        return List.of(Unit.of("Pa/m", 1, SI, "N/m3"), Unit.of("kPa/m", 1e3, SI), Unit.of("bar/m", 1e5, SI),
                Unit.of("psi/ft", POUND_FORCE / (INCH * INCH) / FOOT, NIST));
    }

    static List<Unit> stress() {
        return List.of(Unit.of("Pa", 1, SI, "N/m2"), Unit.of("mPa", 1e-3, SI), Unit.of("kPa", 1e3, SI),
                Unit.of("dyn/cm2", 0.1, NIST), Unit.of("psi", POUND_FORCE / (INCH * INCH), NIST, "lbf/in2"),
                Unit.of("lbf/ft2", POUND_FORCE / (FOOT * FOOT), NIST));
    }

    static List<Unit> viscosity() {
        return List.of(Unit.of("Pa s", 1, SI, "kg/(m s)", "N s/m2"), Unit.of("mPa s", 1e-3, SI),
                Unit.of("cP", 1e-3, NIST), Unit.of("P", 0.1, NIST, "g/(cm s)"), Unit.of("uPa s", 1e-6, SI),
                Unit.of("lb/(ft s)", POUND / FOOT, NIST), Unit.of("lb/(ft h)", POUND / (FOOT * HOUR), NIST),
                Unit.of("lbf s/ft2", POUND_FORCE / (FOOT * FOOT), NIST));
    }

    static List<Unit> kinematicViscosity() {
        return List.of(Unit.of("m2/s", 1, SI), Unit.of("mm2/s", 1e-6, SI), Unit.of("cSt", 1e-6, NIST),
                Unit.of("St", 1e-4, NIST), Unit.of("cm2/s", 1e-4, SI), Unit.of("ft2/s", FOOT * FOOT, NIST));
    }

    static List<Unit> consistency() {
        return List.of(Unit.of("Pa s^n", 1, SI), Unit.of("mPa s^n", 1e-3, SI),
                Unit.of("dyn s^n/cm2", 0.1, NIST), Unit.of("lbf s^n/ft2", POUND_FORCE / (FOOT * FOOT), NIST));
    }

    static List<Unit> density() {
        return List.of(Unit.of("kg/m3", 1, SI), Unit.of("g/cm3", 1000, SI), Unit.of("kg/L", 1000, SI, "kg/dm3"),
                Unit.of("g/mL", 1000, SI), Unit.of("g/L", 1, SI), Unit.of("t/m3", 1000, SI),
                Unit.of("lb/ft3", POUND / (FOOT * FOOT * FOOT), NIST),
                Unit.of("lb/gal", POUND / GALLON, NIST).noted("US gallon"),
                Unit.of("lb/impgal", POUND / IMPERIAL_GALLON, NIST).noted("imperial gallon"),
                Unit.of("SG", Factors.WATER_4C, Sources.WATER_4C, "sp gr")
                        .noted("relative to water at 4 °C, 999.975 kg/m3"));
    }

    static List<Unit> surfaceTension() {
        return List.of(Unit.of("N/m", 1, SI), Unit.of("mN/m", 1e-3, SI), Unit.of("dyn/cm", 1e-3, NIST),
                Unit.of("lbf/ft", POUND_FORCE / FOOT, NIST));
    }
}
