package slantfall.flow.slot;

/**
 * Turbulent friction in smooth rectangular ducts: Prandtl and von Kármán's law, 1/√f = 2 log₁₀(Re √f) − 0.8 (Darcy),
 * on the laminar-equivalent Reynolds number φ Re of O. C. Jones, J. Fluids Eng. 98 (1976) 173 (factor from memory).
 */
public final class TurbulentSlot {

    private TurbulentSlot() {}

    /** φ = ⅔ + (11/24) a (2 − a), a the shorter over the longer side. */
    public static double laminarEquivalent(double aspect) {
        return 2.0 / 3 + 11.0 / 24 * aspect * (2 - aspect);
    }

    /** φ from the exact laminar solution, 64/(f Re) Darcy, of which Jones's is a fit. */
    public static double laminarEquivalentExact(double fanningReynolds) {
        return 64 / (4 * fanningReynolds);
    }

    /** Darcy friction factor of Prandtl and von Kármán's law at a Reynolds number, by fixed-point iteration. */
    public static double darcy(double reynolds) {
        double inverseRoot = 8;
        for (int i = 0; i < 100; i++) {
            double next = 2 * Math.log10(reynolds / inverseRoot) - 0.8;
            if (Math.abs(next - inverseRoot) < 1e-15 * next) {
                break;
            }
            inverseRoot = next;
        }
        return 1 / (inverseRoot * inverseRoot);
    }
}
