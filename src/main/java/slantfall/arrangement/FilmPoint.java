package slantfall.arrangement;

import slantfall.flow.film.ThicknessLaw;

/**
 * A solved film.
 *
 * @param inputs what was set
 * @param law law that gave the thickness
 * @param gradient ρ g sin β [N/m³]
 * @param density [kg/m³]
 * @param viscosity [Pa s]
 * @param reynolds Γ/μ
 * @param thickness [m], NaN where there is no steady film
 */
record FilmPoint(
        Inputs inputs,
        ThicknessLaw law,
        double gradient,
        double density,
        double viscosity,
        double reynolds,
        double thickness) {

    /** Whether the velocity profile is known: only the laminar film has one. */
    boolean laminar() {
        return law == slantfall.flow.film.ThicknessLaws.NUSSELT;
    }

    boolean flowing() {
        return thickness > 0;
    }

    double flow() {
        return inputs.feed() / density;
    }

    /**
     * What was set.
     *
     * @param angle [rad]
     * @param feed [kg/(m s)]
     * @param width [m]
     * @param length [m]
     * @param shear stress on the surface [Pa]
     */
    record Inputs(double angle, double feed, double width, double length, double shear) {}
}
