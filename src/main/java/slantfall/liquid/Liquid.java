package slantfall.liquid;

import java.util.ArrayList;
import java.util.Collections;
import java.util.EnumMap;
import java.util.EnumSet;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.Set;

/**
 * How each property of a liquid is obtained, without the numbers of a state: what is measured is a coordinate, what is
 * correlated or fitted depends on temperature and strength. Two liquids obtained alike are equal.
 */
public final class Liquid {

    /** Coordinate of the temperature. */
    public static final String TEMPERATURE = "temperature";

    /** Coordinate of the mass fraction of the solute. */
    public static final String STRENGTH = "strength";

    private final String name;
    private final Map<Property, Provision> provisions;

    private Liquid(String name, Map<Property, Provision> provisions) {
        this.name = name;
        this.provisions = Collections.unmodifiableMap(provisions);
    }

    /**
     * Puts a liquid together: a measured value wins over a fit, a fit over the preset.
     *
     * @param preset null for measured values alone
     * @param measured properties that the user measured
     * @param points fit through the user's viscosities, null if none
     */
    public static Liquid of(Preset preset, Set<Property> measured, ViscosityFit points) {
        Map<Property, Provision> provisions = new EnumMap<>(Property.class);
        if (preset != null) {
            provisions.putAll(preset.properties());
        }
        if (points != null) {
            provisions.put(Property.VISCOSITY, new Provision.Fitted(points));
        }
        measured.forEach(p -> provisions.put(p, new Provision.Measured()));
        return new Liquid(preset == null ? "measured liquid" : preset.name(), provisions);
    }

    /** Words for people. */
    public String name() {
        return name;
    }

    /** How a property is obtained, if it is known. */
    public Optional<Provision> provision(Property property) {
        return Optional.ofNullable(provisions.get(property));
    }

    /**
     * The numbers that the used properties depend on, in the order in which an evaluator reads them: temperature, strength,
     * then each measured property.
     */
    public List<String> coordinates(Set<Property> used) {
        List<String> keys = new ArrayList<>();
        List<Provision> needed = known(used).stream().map(provisions::get).toList();
        if (needed.stream().anyMatch(Liquid::needsTemperature)) {
            keys.add(TEMPERATURE);
        }
        if (needed.stream().anyMatch(Liquid::needsStrength)) {
            keys.add(STRENGTH);
        }
        for (Property property : known(used)) {
            if (provisions.get(property) instanceof Provision.Measured) {
                keys.add(property.key());
            }
        }
        return keys;
    }

    private List<Property> known(Set<Property> used) {
        return EnumSet.allOf(Property.class).stream()
                .filter(p -> used.contains(p) && provisions.containsKey(p))
                .toList();
    }

    private static boolean needsTemperature(Provision provision) {
        return provision instanceof Provision.Correlated || provision instanceof Provision.Fitted;
    }

    private static boolean needsStrength(Provision provision) {
        return provision instanceof Provision.Correlated
                && ((Provision.Correlated) provision).law().needsStrength();
    }

    /** An evaluator of the used properties, for one thread. */
    public Evaluator evaluator(Set<Property> used) {
        return new LiquidEvaluator(coordinates(used), known(used), provisions);
    }

    /** Fills a state from coordinates. */
    public interface Evaluator {

        /**
         * Evaluates the used properties; the others are left as they are, NaN in a fresh state.
         *
         * @param in numbers in the order of {@link Liquid#coordinates} from {@code offset} on [SI]
         * @param out receives the state
         */
        void at(double[] in, int offset, LiquidState out);
    }

    /** How a property was obtained, in words. */
    public String origin(Property property) {
        Provision provision = provisions.get(property);
        if (provision instanceof Provision.Measured) {
            return "measured";
        }
        if (provision instanceof Provision.Fitted) {
            return ((Provision.Fitted) provision).fit().words();
        }
        if (provision instanceof Provision.Correlated) {
            return ((Provision.Correlated) provision).law().source().text();
        }
        if (provision instanceof Provision.Constant) {
            Provision.Constant constant = (Provision.Constant) provision;
            return "assumed" + (constant.at().isEmpty() ? "" : " at " + constant.at()) + ", " + constant.source().text();
        }
        return "not known";
    }

    /** What is worth knowing at a state: laws outside their range, fits beyond their points. Never an exception. */
    public List<String> notices(LiquidState state) {
        List<String> notices = new ArrayList<>();
        for (Map.Entry<Property, Provision> entry : provisions.entrySet()) {
            boolean known = !Double.isNaN(state.get(entry.getKey()));
            if (known && entry.getValue() instanceof Provision.Correlated) {
                outside(notices, entry.getKey(), ((Provision.Correlated) entry.getValue()).law(), state);
            }
            if (entry.getValue() instanceof Provision.Fitted && !Double.isNaN(state.temperature)) {
                beyond(notices, ((Provision.Fitted) entry.getValue()).fit(), state.temperature);
            }
        }
        return notices;
    }

    private static void outside(List<String> notices, Property property, Correlation law, LiquidState state) {
        Range t = law.temperatureRange();
        if (!t.contains(state.temperature)) {
            notices.add(String.format(Locale.ROOT,
                    "The %s at %.1f °C is outside the range of %s (%.1f to %.1f °C); it was computed all the same.",
                    property.words(), state.temperature - 273.15, law.source().citation(), t.low() - 273.15, t.high() - 273.15));
        }
        if (law.needsStrength() && !law.strengthRange().contains(state.strength)) {
            notices.add(String.format(Locale.ROOT,
                    "The %s at %.1f %% is outside the range of %s (%.1f to %.1f %%); it was computed all the same.",
                    property.words(), 100 * state.strength, law.source().citation(), 100 * law.strengthRange().low(),
                    100 * law.strengthRange().high()));
        }
    }

    private static void beyond(List<String> notices, ViscosityFit fit, double temperature) {
        if (Double.isNaN(fit.at(temperature))) {
            notices.add(String.format(Locale.ROOT,
                    "The viscosity at %.1f °C is unknown: the law through the points ends at its T₀ of %.1f °C. Measure a point there.",
                    temperature - 273.15, fit.t0() - 273.15));
            return;
        }
        double factor = fit.bandFactor(temperature);
        String band = Double.isNaN(factor)
                ? " The points leave no band of its error."
                : String.format(Locale.ROOT, " A new measurement may lie a factor of %.3g off (95 %%).", factor);
        if (fit.extrapolated(temperature)) {
            notices.add(String.format(Locale.ROOT,
                    "The viscosity at %.1f °C is extrapolated: measured from %.1f to %.1f °C only.%s Measure a point there.",
                    temperature - 273.15, fit.range().low() - 273.15, fit.range().high() - 273.15, band));
        } else {
            notices.add("The viscosity comes from a " + fit.words() + "." + band);
        }
        if (fit.rising()) {
            notices.add("The measured viscosity rises with temperature: check the points.");
        }
    }

    @Override
    public boolean equals(Object other) {
        return other instanceof Liquid
                && name.equals(((Liquid) other).name)
                && provisions.equals(((Liquid) other).provisions);
    }

    @Override
    public int hashCode() {
        return 31 * name.hashCode() + provisions.hashCode();
    }
}
