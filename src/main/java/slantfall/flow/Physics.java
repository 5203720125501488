package slantfall.flow;

/** Constants that every model uses. */
public final class Physics {

    /** Standard acceleration of free fall g_n [m/s²], exact (CGPM 1901; SI Brochure 9th ed. 2019). */
    public static final double G = 9.80665;

    /** Standard atmosphere [Pa], exact (CGPM 1954). */
    public static final double ATMOSPHERE = 101325;

    private Physics() {}
}
