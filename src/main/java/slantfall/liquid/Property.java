package slantfall.liquid;

import java.util.Arrays;
import java.util.Optional;

/** A property of a liquid. */
public enum Property {
    DENSITY("density", "density"),
    VISCOSITY("viscosity", "viscosity"),
    SURFACE_TENSION("surfaceTension", "surface tension"),
    CONTACT_ANGLE("contactAngle", "contact angle"),
    CONDUCTIVITY("conductivity", "thermal conductivity"),
    HEAT_CAPACITY("heatCapacity", "heat capacity"),
    VAPOUR_PRESSURE("vapourPressure", "vapour pressure");

    private final String key;
    private final String words;

    Property(String key, String words) {
        this.key = key;
        this.words = words;
    }

    /** Stable key, as in files. */
    public String key() {
        return key;
    }

    /** Words for people. */
    public String words() {
        return words;
    }

    /** The property of a key, if there is one. */
    public static Optional<Property> find(String key) {
        return Arrays.stream(values()).filter(p -> p.key.equals(key)).findFirst();
    }
}
