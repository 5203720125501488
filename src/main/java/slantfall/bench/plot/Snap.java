package slantfall.bench.plot;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
import slantfall.declare.Setting;
import slantfall.quantity.Unit;

/** Rounds a dragged value to what a person would type: four significant digits in the unit shown. */
final class Snap {

    private static final MathContext DIGITS = new MathContext(4, RoundingMode.HALF_EVEN);

    private Snap() {}

    /** The rounded value [SI], kept possible. */
    static double of(Setting setting, Unit unit, double value) {
        double shown = unit.fromSi(value);
        double rounded = unit.toSi(new BigDecimal(shown).round(DIGITS).doubleValue());
        return setting.possible().contains(rounded) ? rounded : value;
    }
}
