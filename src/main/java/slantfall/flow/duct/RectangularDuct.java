package slantfall.flow.duct;

/**
 * Laminar flow in a duct of gap b and width W: what the side walls take away from the wide slot. All arguments are the
 * aspect a = b/W, above 0 and without upper bound.
 *
 * <p>Pressure or gravity: Q = W b³ G F/(12μ), F = 1 − (192a/π⁵) Σ_odd tanh(nπ/2a)/n⁵. Wall that slides in its own plane:
 * Q = W b U F_d/2, F_d = 1 − (16a/π³) Σ_odd tanh(nπ/2a)/n³, the same function as (16/π³a) Σ_odd tanh(nπa/2)/n³ (series of
 * the two directions; derived here, ½ at a = 1). Exact series as in Shah and London 1978, Laminar Flow Forced Convection
 * in Ducts. The sums are split into the complete zeta sum and a remainder that falls off as exp(−nπ/a), so a few terms
 * give full accuracy; for a > 1 gap and width change places.
 */
public final class RectangularDuct {

    private static final double PI3 = Math.pow(Math.PI, 3);
    private static final double PI5 = Math.pow(Math.PI, 5);

    /** Σ_odd 1/n⁵ = (31/32) ζ(5). */
    private static final double SUM5 = 31.0 / 32 * 1.036927755143369926;

    /** Σ_odd 1/n³ = (7/8) ζ(3). */
    private static final double SUM3 = 7.0 / 8 * 1.202056903159594285;

    private static final double NEGLIGIBLE = 45;

    private RectangularDuct() {}

    /** Factor on pressure- and gravity-driven flow, 1 for a wide slot, 0.4217 for a square. */
    public static double flowFactor(double aspect) {
        if (aspect > 1) {
            return flowFactor(1 / aspect) / (aspect * aspect);
        }
        double sum = SUM5;
        for (int n = 1; n * Math.PI / aspect < NEGLIGIBLE; n += 2) {
            double n2 = (double) n * n;
            sum -= 2 / (Math.expm1(n * Math.PI / aspect) + 2) / (n2 * n2 * n);
        }
        return 1 - 192 * aspect / PI5 * sum;
    }

    /** Factor on wall-driven flow, 1 for a wide slot, ½ for a square. */
    public static double dragFactor(double aspect) {
        if (aspect > 1) {
            return 1 - dragFactor(1 / aspect);
        }
        double sum = SUM3;
        for (int n = 1; n * Math.PI / aspect < NEGLIGIBLE; n += 2) {
            sum -= 2 / (Math.expm1(n * Math.PI / aspect) + 2) / ((double) n * n * n);
        }
        return 1 - 16 * aspect / PI3 * sum;
    }

    /** Fanning friction factor times Reynolds number, both on D_h = 2bW/(b + W): 24 wide, 14.227 square. */
    public static double fanningReynolds(double aspect) {
        double onePlus = 1 + aspect;
        return 24 / (onePlus * onePlus * flowFactor(aspect));
    }

    /**
     * Shah and London's polynomial for the same product (1978, as quoted in a public condenser code).
     *
     * @param aspect shorter over longer side, 0 to 1
     */
    public static double fanningReynoldsFit(double aspect) {
        double a = aspect;
        return 24 * (1 + a * (-1.3553 + a * (1.9467 + a * (-1.7012 + a * (0.9564 - a * 0.2537)))));
    }

    /**
     * Incremental pressure-drop number K_∞ of the developing flow, on ρu_m²/2.
     *
     * <p>By aspect ratio Shah and London 1978, polynomial as quoted in a public condenser code (0.680 wide, 1.529 square);
     * for plates 24/35 by Lundgren, Sparrow and Starr's 1964 method. The two differ by 0.9 % for a wide slot; the larger
     * is taken so that the loss is not understated.
     *
     * @param aspect gap over width; above 1 gap and width change places
     */
    public static double entryLossNumber(double aspect) {
        double a = aspect > 1 ? 1 / aspect : aspect;
        double fit = 0.6796 + a * (1.2197 + a * (3.3089 + a * (-9.5921 + a * (8.9089 - a * 2.9959))));
        return Math.max(24.0 / 35, fit);
    }
}
