package slantfall.quantity;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.TreeMap;
import java.util.TreeSet;

/** The words that unit expressions are made of, with the spellings each goes by. */
final class Atoms {

    /** One line per word: what it stands for, then its spellings. */
    private static final String[] TABLE = {
        "m: m metre metres meter meters", "mm: mm millimetre millimetres millimeter millimeters",
        "um: um micron microns micrometre micrometres micrometer micrometers", "cm: cm centimetre centimeter",
        "dm: dm", "km: km", "nm: nm", "in: in inch inches \" ''", "mil: mil mils thou thous", "ft: ft foot feet '",
        "yd: yd yard yards",
        "s: s sec secs second seconds", "ms: ms msec", "min: min mins minute minutes", "h: h hr hrs hour hours",
        "d: d day days",
        "kg: kg kgs kilogram kilograms", "g: g gram grams gm", "mg: mg", "t: t tonne tonnes Mg", "lb: lb lbs lbm pound "
            + "pounds", "msf: msf",
        "L: L l litre litres liter liters", "mL: mL ml millilitre milliliter", "hL: hL hl", "dL: dL dl", "ML: ML",
        "gal: gal gals gallon gallons usgal", "impgal: impgal ukgal",
        "cm^3: cc ccm ccs", "gal min^-1: gpm usgpm", "impgal min^-1: igpm impgpm ukgpm", "gal h^-1: gph",
        "ft min^-1: fpm", "ft s^-1: fps", "ft^3 min^-1: cfm", "ft^3 s^-1: cfs", "L min^-1: lpm", "L h^-1: lph",
        "g m^-2: gsm", "lb ft^-3: pcf", "lb gal^-1: ppg", "km h^-1: kph kmh",
        "N: N newton newtons", "mN: mN", "MN: MN", "kN: kN", "dyn: dyn dyne dynes", "lbf: lbf", "kgf: kgf", "kp: kp",
        "Pa: Pa pascal pascals", "mPa: mPa", "uPa: uPa", "kPa: kPa", "hPa: hPa", "MPa: MPa", "bar: bar bars",
        "mbar: mbar millibar", "psi: psi", "psf: psf", "atm: atm", "Torr: Torr torr",
        "mPa s: mPas", "Pa s: Pas", "uPa s: uPas", "MPa s: MPas", "mPa sn: mPasn", "P: P poise",
        "cP: cP cps cp centipoise",
        "St: St stokes stoke", "cSt: cSt cst centistokes centistoke",
        "J: J joule joules", "kJ: kJ", "MJ: MJ", "Btu: Btu btu BTU", "cal: cal", "kcal: kcal", "W: W watt watts",
        "kW: kW", "mW: mW", "MW: MW", "hp: hp horsepower", "Btu h^-1: Btuh",
        "K: K kelvin kelvins", "degC: °C degC C celsius", "degF: °F degF F fahrenheit",
        "rad: rad radian radians", "mrad: mrad", "deg: ° deg degs degree degrees",
        "Hz: Hz", "kHz: kHz", "r: r rev revs turn turns", "r min^-1: rpm",
        "%: % percent pct", "ppm: ppm", "Bx: Bx °Bx degBx brix °brix", "fraction: fraction", "SG: SG sg",
        "sp: sp", "gr: gr", "sn: sn", "water: water aq", "product: product", "Hg: Hg mercury"
    };

    private static final Map<String, Map<String, Integer>> EXACT = new HashMap<>();
    private static final Map<String, TreeSet<String>> ANY_CASE = new HashMap<>();

    static {
        for (String line : TABLE) {
            int colon = line.indexOf(": ");
            String meaning = line.substring(0, colon);
            for (String spelling : line.substring(colon + 2).trim().split(" ")) {
                EXACT.put(spelling, powers(meaning));
                ANY_CASE.computeIfAbsent(spelling.toLowerCase(Locale.ROOT), k -> new TreeSet<>()).add(meaning);
            }
        }
    }

    private Atoms() {
    }

    /** Meanings of a word as powers of the plain words: several where its case does not decide, none if unknown. */
    static List<Map<String, Integer>> of(String word) {
        Map<String, Integer> exact = EXACT.get(word);
        if (exact != null) {
            return List.of(exact);
        }
        List<Map<String, Integer>> found = new ArrayList<>();
        for (String meaning : ANY_CASE.getOrDefault(word.toLowerCase(Locale.ROOT), new TreeSet<>())) {
            found.add(powers(meaning));
        }
        return found;
    }

    private static Map<String, Integer> powers(String meaning) {
        Map<String, Integer> powers = new TreeMap<>();
        for (String part : meaning.split(" ")) {
            String[] nameAndPower = part.split("\\^");
            powers.put(nameAndPower[0], nameAndPower.length > 1 ? Integer.parseInt(nameAndPower[1]) : 1);
        }
        return powers;
    }
}
