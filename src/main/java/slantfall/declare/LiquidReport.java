package slantfall.declare;

import java.util.ArrayList;
import java.util.List;
import slantfall.liquid.Liquid;
import slantfall.liquid.LiquidState;
import slantfall.liquid.Property;

/**
 * The liquid at the set-up's state.
 *
 * @param name words for people
 * @param temperature temperature [K], NaN if no property depends on it
 * @param strength mass fraction of the solute, NaN if there is none
 * @param properties one row per property that is known
 */
public record LiquidReport(String name, double temperature, double strength, List<Row> properties) {

    public LiquidReport {
        properties = List.copyOf(properties);
    }

    /**
     * One property.
     *
     * @param property which
     * @param value value [SI]
     * @param origin how it was obtained, in words
     */
    public record Row(Property property, double value, String origin) {}

    /** Reads the liquid of a set-up into rows. */
    static LiquidReport of(SetUp setUp) {
        Liquid liquid = setUp.liquid();
        LiquidState state = setUp.liquidState();
        List<Row> rows = new ArrayList<>();
        for (Property property : Property.values()) {
            double value = state.get(property);
            if (!Double.isNaN(value)) {
                rows.add(new Row(property, value, origin(setUp, liquid, property)));
            }
        }
        return new LiquidReport(liquid.name(), state.temperature, state.strength, rows);
    }

    private static String origin(SetUp setUp, Liquid liquid, Property property) {
        Value given = setUp.values().get(Declaration.LIQUID + property.key());
        boolean open = given != null
                && given.tolerance().filter(t -> t.shape() == Tolerance.Shape.UNKNOWN).isPresent();
        return open ? "unknown, taken within " + String.join(" to ", given.known().typed()) : liquid.origin(property);
    }
}
