package slantfall.liquid;

/**
 * Viscosity of water at any density, IAPWS R12-08, without the critical enhancement (μ₂ = 1): μ = μ₀ μ₁ 10⁻⁶ Pa s, μ₀ = 100√T̄/Σ
 * H_i/T̄^i (eq. 11), μ₁ = exp[ρ̄ Σ H_ij (1/T̄ − 1)^i (ρ̄ − 1)^j] (eq. 12), T̄ = T/647.096 K, ρ̄ = ρ/322 kg/m³. Coefficients as
 * quoted in a public library; the release's table 4 is reproduced. Carried to show that it is another state than that of
 * {@link Water}: at 998 kg/m³ and 25 °C the water is compressed.
 */
public final class WaterViscosity2008 {

    private static final double[] H0 = {1.67752, 2.20462, 0.6366564, -0.241605};
    private static final int[] I = {0, 1, 2, 3, 0, 1, 2, 3, 5, 0, 1, 2, 3, 4, 0, 1, 0, 3, 4, 3, 5};
    private static final int[] J = {0, 0, 0, 0, 1, 1, 1, 1, 1, 2, 2, 2, 2, 2, 3, 3, 4, 4, 5, 6, 6};
    private static final double[] H = {
        0.520094, 0.850895e-1, -0.108374e1, -0.289555, 0.222531, 0.999115, 0.188797e1, 0.126613e1, 0.120573, -0.281378,
        -0.906851, -0.772479, -0.489837, -0.257040, 0.161913, 0.257399, -0.325372e-1, 0.698452e-1, 0.872102e-2,
        -0.435673e-2, -0.593264e-3
    };

    private WaterViscosity2008() {}

    /**
     * Dynamic viscosity [Pa s].
     *
     * @param temperature [K]
     * @param density [kg/m³]
     */
    public static double at(double temperature, double density) {
        double t = temperature / 647.096;
        double rho = density / 322;
        double zero = 0;
        for (int i = 0; i < H0.length; i++) {
            zero += H0[i] / Math.pow(t, i);
        }
        double sum = 0;
        for (int k = 0; k < H.length; k++) {
            sum += H[k] * Math.pow(1 / t - 1, I[k]) * Math.pow(rho - 1, J[k]);
        }
        return 1e-4 * Math.sqrt(t) / zero * Math.exp(rho * sum);
    }
}
