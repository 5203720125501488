package slantfall.liquid;

import java.util.List;

/** Every published law of a property: one line each. */
public final class Correlations {

    private static final Range SR6 = new Range(253.15, 383.15);
    private static final Range CHENG = Range.celsius(0, 100);

    private static final List<Correlation> ALL = List.of(
            Law.pure("iapws-sr6-08-density", Property.DENSITY, (t, w) -> Water.density(t), SR6, Water.SR6,
                    "p₀/(R·10 K [a₅ + Σaα^n + Σbβ^m])").within(1e-6),
            Law.pure("iapws-sr6-08-viscosity", Property.VISCOSITY, (t, w) -> Water.viscosity(t), SR6, Water.SR6,
                    "10⁻⁶ Σ a (T/300 K)^b").within(0.01),
            Law.pure("iapws-sr6-08-conductivity", Property.CONDUCTIVITY, (t, w) -> Water.conductivity(t), SR6, Water.SR6,
                    "Σ c (T/300 K)^d").within(0.015),
            Law.pure("iapws-sr6-08-heat-capacity", Property.HEAT_CAPACITY, (t, w) -> Water.heatCapacity(t), SR6, Water.SR6,
                    "−R[c₃ + τΣn(n+1)aα^(n+2) + τΣm(m+1)bβ^(m+2)]").within(1e-3),
            Law.pure("iapws-r1-76-surface-tension", Property.SURFACE_TENSION, (t, w) -> Water.surfaceTension(t),
                    new Range(273.15, 647.096), Water.R1, "0.2358(1 − T/T_c)^1.256[1 − 0.625(1 − T/T_c)]").within(0.005),
            Law.pure("iapws-sr1-86-vapour-pressure", Property.VAPOUR_PRESSURE, (t, w) -> Water.vapourPressure(t),
                    new Range(273.15, 647.096), Water.SR1, "p_c exp[(T_c/T) Σ a θ^n], θ = 1 − T/T_c").within(0.001),
            Law.pure("cheng-2008-viscosity", Property.VISCOSITY, GlycerolWater::viscosity, CHENG, GlycerolWater.CHENG,
                    "μ_g exp[α ln(μ_w/μ_g)]").strengths(0, 1).within(0.035),
            Law.pure("volk-kaehler-2018-density", Property.DENSITY, GlycerolWater::density, Range.celsius(15, 30),
                    GlycerolWater.VOLK, "ideal mixing × [1 + A sin(w^1.31 π)^0.81]").strengths(0, 1).within(0.0007),
            viscosity(Laliberte.SODIUM_CHLORIDE),
            density(Laliberte.SODIUM_CHLORIDE),
            Law.pure("mao-duan-2009-sodium-chloride-viscosity", Property.VISCOSITY, MaoDuan::viscosity, SR6, MaoDuan.SOURCE,
                    "μ_w exp(Am + Bm² + Cm³)").strengths(0, 0.259),
            viscosity(Laliberte.SODIUM_HYDROXIDE),
            density(Laliberte.SODIUM_HYDROXIDE),
            viscosity(Laliberte.SUCROSE),
            density(Laliberte.SUCROSE),
            Law.pure("genotelle-1978-viscosity", Property.VISCOSITY, Sucrose::viscosity, Range.celsius(0, 80), Sucrose.SOURCE,
                    "10^[22.46N − 0.114 + φ(1.1 + 43.1N^1.25)] mPa s").strengths(0.2, 0.86));

    private Correlations() {}

    /** All of them. */
    public static List<Correlation> all() {
        return ALL;
    }

    /** The correlation of a key. */
    public static Correlation named(String key) {
        return ALL.stream()
                .filter(c -> c.key().equals(key))
                .findFirst()
                .orElseThrow(() -> new IllegalArgumentException("no correlation \"" + key + "\"; one of "
                        + ALL.stream().map(Correlation::key).toList()));
    }

    private static Correlation viscosity(Laliberte law) {
        return Law.pure("laliberte-2009-" + law.name() + "-viscosity", Property.VISCOSITY, law::viscosity,
                        law.viscosityRange(), Laliberte.SOURCE, "μ_w^{w_w} μ_i^{w_i}")
                .strengths(0, law.strongest());
    }

    private static Correlation density(Laliberte law) {
        return Law.pure("laliberte-2009-" + law.name() + "-density", Property.DENSITY, law::density, law.densityRange(),
                        Laliberte.SOURCE, "1/(w_w/ρ_w + w_i/ρ_i)")
                .strengths(0, law.strongest());
    }
}
