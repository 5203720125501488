package slantfall.liquid;

import slantfall.source.Mark;
import slantfall.source.Source;

/**
 * Liquid water at 0.1 MPa by IAPWS SR6-08(2011), Revised Supplementary Release on Properties of Liquid Water at 0.1 MPa,
 * valid from 253.15 to 383.15 K (metastable below freezing and above boiling). With α = 10 K/(593 K − T), β = 10 K/(T − 232
 * K), T* = T/300 K: v = (R·10 K/p₀)[a₅ + Σ a_i α^{n_i} + Σ b_i β^{m_i}] (eq. 2), c_p = −R[c₃ + τΣ n(n+1)aα^{n+2} + τΣ
 * m(m+1)bβ^{m+2}], τ = T/10 K (table 4), μ = 10⁻⁶ Σ a_i T*^{b_i} (eq. 7), k = Σ c_i T*^{d_i} (eq. 8). Coefficients as quoted
 * in two public libraries; the values of the release's table 8 are reproduced.
 *
 * <p>Surface tension by IAPWS R1-76(2014): σ = 235.8 mN/m (1 − T/T_c)^1.256 [1 − 0.625(1 − T/T_c)], 0.01 °C to T_c. Vapour
 * pressure by IAPWS SR1-86(1992), W. Wagner and A. Pruss, J. Phys. Chem. Ref. Data 22 (1993) 783, eq. 1; coefficients as
 * quoted in several public files that agree, within 0.025 % of IAPWS R7-97 eq. 30.
 */
public final class Water {

    private static final double R = 461.51805;
    private static final double P0 = 1e5;
    private static final double CRITICAL_T = 647.096;
    private static final double CRITICAL_P = 22.064e6;

    /** a₅ and a₆…a₁₀ with n₆…n₁₀, table 1. */
    private static final double A5 = 1.93763157e-2;

    private static final double[] B_VOLUME = {
        5.78545292e-3, -1.53195665e-2, 3.11337859e-2, -4.23546241e-2, 3.38713507e-2, -1.19946761e-2
    };

    /** Exponents of the vapour-pressure equation are 1, 1.5, 3, 3.5, 4, 7.5. */
    private static final double[] VAPOUR = {
        -7.85951783, 1.84408259, -11.7866497, 22.6807411, -15.9618719, 1.80122502
    };

    private Water() {}

    static final Source SR6 = new Source(
            "iapws-sr6-08", "IAPWS SR6-08(2011), liquid water at 0.1 MPa", "equations 2, 7, 8, table 4", Mark.SECOND_HAND);
    static final Source R1 = new Source(
            "iapws-r1-76", "IAPWS R1-76(2014), surface tension of ordinary water", "equation 1", Mark.SECOND_HAND);
    static final Source SR1 = new Source(
            "iapws-sr1-86", "IAPWS SR1-86(1992), Wagner and Pruss 1993, J. Phys. Chem. Ref. Data 22, 783", "equation 1",
            Mark.SECOND_HAND);

    /**
     * Density [kg/m³].
     *
     * @param t temperature [K]
     */
    public static double density(double t) {
        double alpha = 10 / (593 - t);
        double beta = 10 / (t - 232);
        double a4 = alpha * alpha * alpha * alpha;
        double sum = A5 + a4 * (6.74458446e3
                + alpha * (-2.22521604e5 + alpha * alpha * (1.00231247e8 + alpha * (-1.63552118e9 + alpha * 8.32299658e9))));
        double b = 0;
        for (int i = B_VOLUME.length - 1; i >= 0; i--) {
            b = (b + B_VOLUME[i]) * beta;
        }
        return P0 / (R * 10 * (sum + b));
    }

    /** Heat capacity at constant pressure [J/(kg K)]. */
    public static double heatCapacity(double t) {
        double alpha = 10 / (593 - t);
        double beta = 10 / (t - 232);
        double a3 = alpha * alpha * alpha;
        double a6 = a3 * a3;
        double ofAlpha = a6 * (20 * -1.661470539e5 + alpha * (30 * 2.708781640e6 + alpha * alpha * 56 * -1.557191544e8));
        double b2 = beta * beta;
        double ofBeta = b2 * b2
                * (6 * -8.237426256e-1
                        + beta * (12 * 1.908956353 + beta * (20 * -2.017597384 + beta * 30 * 8.546361348e-1)));
        return -R * (-8.983025854 + t / 10 * (ofAlpha + ofBeta));
    }

    /** Dynamic viscosity [Pa s]. */
    public static double viscosity(double t) {
        double ln = Math.log(t / 300);
        return 1e-6
                * (280.68 * Math.exp(-1.9 * ln)
                        + 511.45 * Math.exp(-7.7 * ln)
                        + 61.131 * Math.exp(-19.6 * ln)
                        + 0.45903 * Math.exp(-40 * ln));
    }

    /** Thermal conductivity [W/(m K)]. */
    public static double conductivity(double t) {
        double ln = Math.log(t / 300);
        return 1.6630 * Math.exp(-1.15 * ln)
                - 1.7781 * Math.exp(-3.4 * ln)
                + 1.1567 * Math.exp(-6.0 * ln)
                - 0.432115 * Math.exp(-7.6 * ln);
    }

    /** Surface tension against its vapour or air [N/m]; 0 at and beyond the critical temperature. */
    public static double surfaceTension(double t) {
        double tau = 1 - t / CRITICAL_T;
        return tau <= 0 ? 0 : 0.2358 * Math.pow(tau, 1.256) * (1 - 0.625 * tau);
    }

    /** Vapour pressure, absolute [Pa]. */
    public static double vapourPressure(double t) {
        double theta = 1 - t / CRITICAL_T;
        double root = Math.sqrt(Math.max(0, theta));
        double theta3 = theta * theta * theta;
        double sum = theta * (VAPOUR[0] + VAPOUR[1] * root)
                + theta3 * (VAPOUR[2] + VAPOUR[3] * root + VAPOUR[4] * theta)
                + theta3 * theta3 * theta * root * VAPOUR[5];
        return CRITICAL_P * Math.exp(CRITICAL_T / t * sum);
    }
}
