package slantfall.proof;

import java.util.LinkedHashMap;
import java.util.Map;
import java.util.TreeSet;

/**
 * The inputs of a published value, in SI but for temperatures named {@code T_C} and angles named {@code beta_deg}.
 *
 * @param numbers numbers by name; a list is kept whole
 * @param others what stands where no number stands, by name
 */
public record Inputs(Map<String, double[]> numbers, Map<String, String> others) {

    private static final double CELSIUS = 273.15;

    public Inputs {
        numbers = Map.copyOf(numbers);
        others = Map.copyOf(others);
    }

    /** Inputs that are all plain numbers, name and value in turn. */
    public static Inputs of(Map<String, Double> plain) {
        Map<String, double[]> numbers = new LinkedHashMap<>();
        plain.forEach((name, value) -> numbers.put(name, new double[] {value}));
        return new Inputs(numbers, Map.of());
    }

    boolean has(String name) {
        return numbers.containsKey(name) || others.containsKey(name);
    }

    /** A single finite number. */
    double number(String name) {
        double[] list = list(name);
        if (list.length != 1) {
            throw new IllegalArgumentException("input " + name + " is a list of " + list.length + "; one number is needed");
        }
        return list[0];
    }

    /** A single finite number above zero. */
    double positive(String name) {
        double value = number(name);
        if (!(value > 0)) {
            throw new IllegalArgumentException("input " + name + " is " + value + "; it must be above 0");
        }
        return value;
    }

    /** One or more finite numbers. */
    double[] list(String name) {
        if (others.containsKey(name)) {
            throw new IllegalArgumentException("input " + name + " is " + others.get(name) + "; a number is needed");
        }
        double[] list = numbers.get(name);
        if (list == null) {
            throw new IllegalArgumentException("input " + name + " is missing; given are " + names());
        }
        for (double value : list) {
            if (!Double.isFinite(value)) {
                throw new IllegalArgumentException("input " + name + " is " + value + "; a finite number is needed");
            }
        }
        return list;
    }

    /** Angle from the horizontal [rad], whichever of its two names it goes by. */
    double angle() {
        return Math.toRadians(number(has("beta_deg_from_horizontal") ? "beta_deg_from_horizontal" : "beta_deg"));
    }

    /** Temperature [K], given in kelvin or degrees Celsius. */
    double temperature() {
        return has("T") ? positive("T") : number("T_C") + CELSIUS;
    }

    private String names() {
        TreeSet<String> names = new TreeSet<>(numbers.keySet());
        names.addAll(others.keySet());
        return names.isEmpty() ? "none" : String.join(", ", names);
    }
}
