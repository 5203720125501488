package slantfall.quantity;

/** What a conversion needs besides the number and the unit. */
public enum Need {
    /** Nothing. */
    NONE(0, 0),
    /** Multiplies by the density: a volume where a mass is wanted, a column of product where a pressure is. */
    DENSITY(1, 0),
    /** Divides by the density: a mass where a volume is wanted. */
    PER_DENSITY(-1, 0),
    /** Divides by the width: a total where a flow per width is wanted. */
    PER_WIDTH(0, -1),
    /** Multiplies by the density and divides by the width. */
    DENSITY_PER_WIDTH(1, -1),
    /** Divides by the density and by the width. */
    PER_DENSITY_PER_WIDTH(-1, -1),
    /** Multiplies by the width: a flow per width where a total is wanted. */
    WIDTH(0, 1),
    /** Multiplies by the density and by the width. */
    DENSITY_WIDTH(1, 1),
    /** Divides by the density and multiplies by the width. */
    PER_DENSITY_WIDTH(-1, 1);

    private final int densityPower;
    private final int widthPower;

    Need(int densityPower, int widthPower) {
        this.densityPower = densityPower;
        this.widthPower = widthPower;
    }

    /** Whether the density of the product is needed. */
    public boolean density() {
        return densityPower != 0;
    }

    /** Whether the width is needed. */
    public boolean width() {
        return widthPower != 0;
    }

    /**
     * The factor that the context gives.
     *
     * @param context density [kg/m3] and width [m]
     * @return density and width to their powers; not a number where one that is needed is unknown or not positive
     */
    double factor(EntryContext context) {
        return power(context.density(), densityPower) * power(context.width(), widthPower);
    }

    private static double power(double base, int power) {
        if (power == 0) {
            return 1;
        }
        if (!(base > 0) || Double.isInfinite(base)) {
            return Double.NaN;
        }
        return power > 0 ? base : 1 / base;
    }
}
