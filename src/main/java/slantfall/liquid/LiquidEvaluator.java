package slantfall.liquid;

import java.util.List;
import java.util.Map;

/** Fills states; keeps the laws' results while temperature and strength stay the same. */
final class LiquidEvaluator implements Liquid.Evaluator {

    private final boolean hasTemperature;
    private final boolean hasStrength;
    private final Property[] measured;
    private final Property[] correlated;
    private final Correlation[] laws;
    private final double[] results;
    private final Property[] constants;
    private final double[] constantValues;
    private final ViscosityFit fit;
    private double fitted = Double.NaN;
    private double lastTemperature = Double.NaN;
    private double lastStrength = Double.NaN;

    LiquidEvaluator(List<String> coordinates, List<Property> used, Map<Property, Provision> provisions) {
        hasTemperature = coordinates.contains(Liquid.TEMPERATURE);
        hasStrength = coordinates.contains(Liquid.STRENGTH);
        measured = used.stream().filter(p -> provisions.get(p) instanceof Provision.Measured).toArray(Property[]::new);
        correlated = used.stream().filter(p -> provisions.get(p) instanceof Provision.Correlated).toArray(Property[]::new);
        laws = new Correlation[correlated.length];
        for (int i = 0; i < laws.length; i++) {
            laws[i] = ((Provision.Correlated) provisions.get(correlated[i])).law();
        }
        results = new double[laws.length];
        constants = used.stream().filter(p -> provisions.get(p) instanceof Provision.Constant).toArray(Property[]::new);
        constantValues = new double[constants.length];
        for (int i = 0; i < constants.length; i++) {
            constantValues[i] = ((Provision.Constant) provisions.get(constants[i])).value();
        }
        Provision viscosity = used.contains(Property.VISCOSITY) ? provisions.get(Property.VISCOSITY) : null;
        fit = viscosity instanceof Provision.Fitted ? ((Provision.Fitted) viscosity).fit() : null;
    }

    @Override
    public void at(double[] in, int offset, LiquidState out) {
        int next = offset;
        double temperature = hasTemperature ? in[next++] : Double.NaN;
        double strength = hasStrength ? in[next++] : Double.NaN;
        if (hasTemperature && (temperature != lastTemperature || hasStrength && strength != lastStrength)) {
            apply(temperature, strength);
        }
        out.temperature = temperature;
        out.strength = strength;
        for (int i = 0; i < correlated.length; i++) {
            out.set(correlated[i], results[i]);
        }
        for (int i = 0; i < constants.length; i++) {
            out.set(constants[i], constantValues[i]);
        }
        if (fit != null) {
            out.viscosity = fitted;
        }
        for (Property property : measured) {
            out.set(property, in[next++]);
        }
    }

    private void apply(double temperature, double strength) {
        for (int i = 0; i < laws.length; i++) {
            results[i] = possible(laws[i].at(temperature, strength));
        }
        if (fit != null) {
            fitted = fit.at(temperature);
        }
        lastTemperature = temperature;
        lastStrength = strength;
    }

    /** A law far outside its range may give what no liquid has; that is unknown. */
    private static double possible(double value) {
        return value >= 0 && value < Double.POSITIVE_INFINITY ? value : Double.NaN;
    }
}
