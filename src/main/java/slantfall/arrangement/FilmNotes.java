package slantfall.arrangement;

import slantfall.declare.Assessor;
import slantfall.flow.film.NewtonianFilm;
import slantfall.flow.film.ThicknessLaw;
import slantfall.flow.film.ThicknessLaws;
import slantfall.quantity.Kind;
import slantfall.quantity.Show;
import slantfall.quantity.UnitSystem;

/** Sentences that go with a film. */
final class FilmNotes {

    /** From this thickness over width on, side walls would matter (physics: exact series of the duct). */
    private static final double EDGES = 0.02;

    /** A dispute that changes the thickness by less is said not to change the number. */
    private static final double SMALL = 0.05;

    private FilmNotes() {}

    static void add(Assessor assessor, FilmPoint p) {
        FilmPoint.Inputs in = p.inputs();
        if (Double.isNaN(p.thickness())) {
            assessor.notice("thickness", noFilm(p));
            return;
        }
        if (in.feed() == 0) {
            assessor.notice("residenceMean", "Without feed there is no residence time.");
            assessor.notice("residenceMin", "Without feed there is no residence time.");
            assessor.notice("entryLength", "Without feed there is no entry length.");
            return;
        }
        if (NewtonianFilm.uphillSurface(p.gradient(), in.shear(), p.thickness())) {
            String text = "The gas drags the surface uphill; residence has no meaning for liquid that runs both ways.";
            assessor.notice("residenceMean", text);
            assessor.notice("residenceMin", text);
        }
        if (!p.laminar()) {
            String text = "Only the smooth laminar film has a published velocity profile here; " + p.law().name()
                    + " gives the thickness alone.";
            assessor.notice("surfaceVelocity", text);
            assessor.notice("filmReynoldsSurface", text);
            assessor.notice("residenceMin", text);
        }
        if (p.thickness() / in.width() > EDGES) {
            assessor.notice("thickness", "The film is thicker than 2 % of its width: side walls, if there are any, would"
                    + " hold it back; they are not counted here.");
        }
        assessor.notice("thicknessLaw", lawSentence(p));
    }

    private static String noFilm(FilmPoint p) {
        return p.gradient() == 0
                ? "No steady film: on a horizontal plate only gas that drags along the flow can drive one. Tilt the plate"
                        + " or give a positive gas drag."
                : "The thickness is unknown: density or viscosity is missing.";
    }

    /** Which law was used and whether the choice matters for this case. */
    private static String lawSentence(FilmPoint p) {
        String used = "Thickness by " + p.law().name() + ", at Γ/μ = " + Show.number(p.reynolds(), 3) + ".";
        if (p.inputs().shear() != 0) {
            return used + (p.reynolds() > ThicknessLaws.CROSSING
                    ? " With gas drag the film is taken as laminar although Γ/μ is beyond 398: doubtful."
                    : " With gas drag the film is taken as laminar.");
        }
        double nu = p.viscosity() / p.density();
        double gravity = p.gradient() / p.density();
        ThicknessLaw low = p.law();
        ThicknessLaw high = p.law();
        for (ThicknessLaw law : ThicknessLaws.all()) {
            if (law.covers(p.reynolds())) {
                low = law.dimensionless(p.reynolds()) < low.dimensionless(p.reynolds()) ? law : low;
                high = law.dimensionless(p.reynolds()) > high.dimensionless(p.reynolds()) ? law : high;
            }
        }
        double down = low.thickness(p.reynolds(), nu, gravity) / p.thickness() - 1;
        double up = high.thickness(p.reynolds(), nu, gravity) / p.thickness() - 1;
        String outside = p.law().covers(p.reynolds()) ? "" : " This law was not tested at that flow.";
        if (low == high) {
            return used + outside;
        }
        String range = " Laws tested at this flow run from " + millimetres(low, p, nu, gravity) + " (" + low.name() + ", "
                + percent(down) + ") to " + millimetres(high, p, nu, gravity) + " (" + high.name() + ", " + percent(up)
                + "): the choice of law ";
        boolean matters = Math.max(Math.abs(down), Math.abs(up)) > SMALL;
        return used + outside + range + (matters ? "changes the number." : "hardly changes the number.");
    }

    private static String millimetres(ThicknessLaw law, FilmPoint p, double nu, double gravity) {
        return Show.value(law.thickness(p.reynolds(), nu, gravity), Kind.LENGTH, UnitSystem.TRADE, 3);
    }

    private static String percent(double part) {
        return String.format(java.util.Locale.ROOT, "%+.1f %%", 100 * part);
    }
}
