package slantfall.arrangement;

import java.util.List;
import slantfall.check.FilmCase;
import slantfall.check.FilmPanels;
import slantfall.declare.Check;
import slantfall.declare.Evaluator;
import slantfall.declare.Structure;
import slantfall.flow.Physics;
import slantfall.flow.film.FilmEntry;
import slantfall.flow.film.FilmNumbers;
import slantfall.flow.film.NewtonianFilm;
import slantfall.flow.film.ThicknessLaw;
import slantfall.flow.film.ThicknessLaws;
import slantfall.liquid.Liquid;
import slantfall.liquid.LiquidState;

/** Readings and margins of an inclined film. */
final class FilmEvaluator implements Evaluator {

    private static final List<Check<FilmCase>> CHECKS = FilmPanels.CHECKS;
    private static final int READINGS = 13;
    private static final int SETTINGS = 5;

    private final ThicknessLaw chosen;
    private final Liquid.Evaluator liquid;
    private final LiquidState state = new LiquidState();
    private FilmPoint point;
    private FilmCase filmCase;

    FilmEvaluator(Structure structure) {
        chosen = FilmLaws.chosen(structure.choice(InclinedFilm.LAW));
        liquid = structure.liquid().evaluator(InclinedFilm.FACE.uses());
    }

    FilmPoint point() {
        return point;
    }

    FilmCase filmCase() {
        return filmCase;
    }

    LiquidState state() {
        return state;
    }

    @Override
    public void at(double[] in, double[] out) {
        liquid.at(in, SETTINGS, state);
        point = solve(new FilmPoint.Inputs(in[0], in[1], in[2], in[3], in[4]), state, chosen);
        readings(out);
        for (int i = 0; i < CHECKS.size(); i++) {
            out[READINGS + i] = CHECKS.get(i).margin(filmCase);
        }
    }

    /** Thickness by the law that applies. */
    static FilmPoint solve(FilmPoint.Inputs in, LiquidState state, ThicknessLaw chosen) {
        double rho = state.density;
        double mu = state.viscosity;
        double gravity = Physics.G * Math.sin(in.angle());
        double gradient = rho * gravity;
        double reynolds = FilmNumbers.reynolds(in.feed(), mu);
        ThicknessLaw law = in.shear() != 0
                ? ThicknessLaws.NUSSELT
                : chosen == null ? ThicknessLaws.automatic(reynolds) : chosen;
        double thickness = law == ThicknessLaws.NUSSELT
                ? NewtonianFilm.thickness(gradient, mu, in.shear(), in.feed() / rho)
                : beyondLaminar(law, reynolds, mu / rho, gravity);
        return new FilmPoint(in, law, gradient, rho, mu, reynolds, thickness);
    }

    private static double beyondLaminar(ThicknessLaw law, double reynolds, double nu, double gravity) {
        if (reynolds == 0) {
            return 0;
        }
        return gravity > 0 ? law.thickness(reynolds, nu, gravity) : Double.NaN;
    }

    private void readings(double[] out) {
        FilmPoint p = point;
        FilmPoint.Inputs in = p.inputs();
        double h = p.thickness();
        double shear = in.shear();
        double mean = in.feed() == 0 ? 0 : p.flow() / h;
        double surface = p.laminar() ? NewtonianFilm.velocity(p.gradient(), p.viscosity(), shear, h, h) : Double.NaN;
        double entry = p.flowing() ? FilmEntry.length(p.reynolds(), h) : Double.NaN;
        boolean downhill = p.flowing() && !NewtonianFilm.uphillSurface(p.gradient(), shear, h);
        out[0] = h;
        out[1] = mean;
        out[2] = surface;
        out[3] = in.feed() == 0 ? 0 : p.gradient() * h + shear;
        out[4] = p.laminar()
                ? NewtonianFilm.waveVelocity(p.gradient(), p.viscosity(), shear, h)
                : mean / p.law().exponent();
        out[5] = p.reynolds();
        out[6] = 4 * p.reynolds();
        out[7] = p.laminar() ? Math.max(0, surface * h * p.density() / p.viscosity()) : Double.NaN;
        out[9] = downhill ? in.length() / mean : Double.NaN;
        out[10] = downhill && p.laminar() ? in.length() / largest(p) : Double.NaN;
        out[11] = h * in.width() * in.length();
        out[12] = entry;
        filmCase = filmCase(entry);
        // Ka is the cube root of Ka_f.
        out[8] = Math.cbrt(filmCase.filmNumber());
    }

    private FilmCase filmCase(double entry) {
        FilmPoint p = point;
        FilmPoint.Inputs in = p.inputs();
        double reynolds = Double.isNaN(p.thickness()) ? Double.NaN : p.reynolds();
        double filmNumber = FilmNumbers.filmNumber(p.density(), p.viscosity(), state.surfaceTension, Physics.G);
        return new FilmCase(
                in.angle(),
                reynolds,
                filmNumber,
                FilmNumbers.prandtl(p.viscosity(), state.heatCapacity, state.conductivity),
                p.gradient(),
                in.shear(),
                p.thickness(),
                in.length(),
                p.flowing() ? entry : p.thickness(),
                FilmCase.Logs.of(reynolds, filmNumber));
    }

    private static double largest(FilmPoint p) {
        return NewtonianFilm.largestVelocity(p.gradient(), p.viscosity(), p.inputs().shear(), p.thickness());
    }
}
