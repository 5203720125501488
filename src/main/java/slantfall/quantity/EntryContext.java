package slantfall.quantity;

/**
 * What the surroundings of an entry tell its reading.
 *
 * @param density density of the product at its state, not a number where unknown [kg/m3]
 * @param width wetted width that a total feed is spread over, not a number where unknown [m]
 */
public record EntryContext(double density, double width) {

    private static final EntryContext NONE = new EntryContext(Double.NaN, Double.NaN);

    /** Nothing is known. */
    public static EntryContext none() {
        return NONE;
    }

    /** This context with the density of the product [kg/m3]. */
    public EntryContext withDensity(double newDensity) {
        return new EntryContext(newDensity, width);
    }

    /** This context with the wetted width [m]. */
    public EntryContext withWidth(double newWidth) {
        return new EntryContext(density, newWidth);
    }
}
