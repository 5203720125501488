package slantfall.proof;

import java.util.List;
import slantfall.flow.film.FeedChange;
import slantfall.flow.film.FilmNumbers;
import slantfall.flow.film.NewtonianFilm;
import slantfall.flow.film.TubeFilm;

/** Section 1: the laminar film and how a change of feed runs down it. */
final class FilmFamilies {

    static final List<Family> ALL = List.of(
            Family.one("1.N.h", "thickness of the laminar film", in -> Film.of(in).thickness()),
            Family.one("1.N.um", "mean velocity", in -> Film.of(in).mean()),
            Family.one("1.N.us", "surface velocity", in -> Film.of(in).velocityAt(1)),
            Family.one("1.N.u_half", "velocity at half depth", in -> Film.of(in).velocityAt(0.5)),
            Family.one("1.N.tw", "stress at the plate", in -> Film.of(in).wallStress()),
            Family.list("1.N.Re", "Γ/μ, 4Γ/μ, u_s h/ν", FilmFamilies::reynolds),
            Family.one("1.N.tube_in", "film inside a tube", in -> TubeFilm.flowInside(
                    in.positive("rho") * in.number("g"), in.positive("mu"), in.positive("R"), in.number("h"))),
            Family.one("1.N.tube_out", "film outside a tube", in -> TubeFilm.flowOutside(
                    in.positive("rho") * in.number("g"), in.positive("mu"), in.positive("R"), in.number("h"))),
            Family.one("1.shock", "front between two thicknesses", in -> FeedChange.front(
                    gravity(in), in.positive("nu"), in.number("h1"), in.number("h2"))),
            Family.list("1.fan", "edges of the fan", in -> new double[] {
                FeedChange.edge(gravity(in), in.positive("nu"), in.number("h1")),
                FeedChange.edge(gravity(in), in.positive("nu"), in.number("h2"))
            }));

    private FilmFamilies() {}

    private static double gravity(Inputs in) {
        return in.positive("g") * Math.sin(in.angle());
    }

    private static double[] reynolds(Inputs in) {
        Film film = Film.of(in);
        double reynolds = FilmNumbers.reynolds(film.feed, film.viscosity);
        double surface = film.velocityAt(1) * film.thickness() * film.density / film.viscosity;
        return new double[] {reynolds, 4 * reynolds, surface};
    }

    /** A film without gas drag, solved on demand. */
    private static final class Film {

        private final double density;
        private final double viscosity;
        private final double gradient;
        private final double feed;

        private Film(Inputs in) {
            density = in.positive("rho");
            viscosity = in.positive("mu");
            gradient = density * gravity(in);
            feed = in.number("Gamma");
        }

        static Film of(Inputs in) {
            return new Film(in);
        }

        double thickness() {
            return NewtonianFilm.thickness(gradient, viscosity, 0, feed / density);
        }

        double mean() {
            return NewtonianFilm.flow(gradient, viscosity, 0, thickness()) / thickness();
        }

        double velocityAt(double share) {
            double h = thickness();
            return NewtonianFilm.velocity(gradient, viscosity, 0, h, share * h);
        }

        double wallStress() {
            return NewtonianFilm.stress(gradient, 0, thickness(), 0);
        }
    }
}
