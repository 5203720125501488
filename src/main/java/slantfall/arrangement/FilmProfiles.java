package slantfall.arrangement;

import java.util.Arrays;
import java.util.List;
import slantfall.declare.Profile;
import slantfall.declare.Profile.Column;
import slantfall.flow.film.NewtonianFilm;
import slantfall.quantity.Kind;

/** Traverses across a film. */
final class FilmProfiles {

    private static final int POINTS = 41;

    private FilmProfiles() {}

    /** Velocity, shear stress and shear rate from the plate to the surface, in the middle of the length. */
    static Profile across(FilmPoint p) {
        if (!p.flowing()) {
            return Profile.none();
        }
        double[] y = new double[POINTS];
        double[] velocity = new double[POINTS];
        double[] stress = new double[POINTS];
        double[] rate = new double[POINTS];
        double shear = p.inputs().shear();
        for (int i = 0; i < POINTS; i++) {
            y[i] = p.thickness() * i / (POINTS - 1);
            velocity[i] = NewtonianFilm.velocity(p.gradient(), p.viscosity(), shear, p.thickness(), y[i]);
            stress[i] = NewtonianFilm.stress(p.gradient(), shear, p.thickness(), y[i]);
            rate[i] = stress[i] / p.viscosity();
        }
        if (!p.laminar()) {
            Arrays.fill(velocity, Double.NaN);
            Arrays.fill(rate, Double.NaN);
        }
        return new Profile(
                new Column("y", "Distance from the plate", Kind.LENGTH, y),
                p.inputs().length() / 2,
                List.of(
                        new Column("velocity", "Velocity", Kind.VELOCITY, velocity),
                        new Column("shearStress", "Shear stress", Kind.STRESS, stress),
                        new Column("shearRate", "Shear rate", Kind.SHEAR_RATE, rate)));
    }
}
