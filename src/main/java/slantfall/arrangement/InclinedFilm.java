package slantfall.arrangement;

import java.util.List;
import java.util.Set;
import slantfall.check.Cautions;
import slantfall.check.FilmPanels;
import slantfall.declare.Arrangement;
import slantfall.declare.Assessment;
import slantfall.declare.Assessor;
import slantfall.declare.Choice;
import slantfall.declare.Declaration;
import slantfall.declare.Evaluator;
import slantfall.declare.Interval;
import slantfall.declare.Profile;
import slantfall.declare.Reading;
import slantfall.declare.SetUp;
import slantfall.declare.Setting;
import slantfall.declare.Setting.Range;
import slantfall.declare.Structure;
import slantfall.liquid.Property;
import slantfall.quantity.Kind;

/** Liquid running as a film under air down a plate between edges that do not drag. The model for other arrangements. */
public final class InclinedFilm implements Arrangement {

    /** Key in files. */
    public static final String KEY = "inclined-film";

    static final Choice LAW = FilmLaws.choice();

    private static final List<Setting> SETTINGS = List.of(
            Setting.of("angle", "Incline", "β", Kind.ANGLE,
                    Range.linear(Math.toRadians(60), Interval.closed(0, Math.PI / 2), 0, Math.PI / 2),
                    "Angle of the plate from the horizontal; 90° is vertical."),
            Setting.of("feed", "Feed", "Γ", Kind.MASS_FLOW_PER_WIDTH,
                    Range.log(0.1, Interval.closed(0, 1e4), 1e-4, 10), "Mass flow per width of film."),
            Setting.of("width", "Width", "W", Kind.LENGTH,
                    Range.log(1, Interval.above(0, 1000), 0.01, 10), "Width of the film, between edges."),
            Setting.of("length", "Length", "L", Kind.LENGTH,
                    Range.log(1, Interval.above(0, 1000), 0.01, 20), "Length of the plate along the flow."),
            Setting.of("interfacialShear", "Gas drag", "τ_i", Kind.STRESS,
                    Range.linear(0, Interval.closed(-1e4, 1e4), -5, 5),
                    "Stress that gas puts on the surface; positive drags downhill."),
            Setting.of("inletDisturbance", "Inlet disturbance", "ε_0", Kind.RATIO,
                    Range.log(1e-3, Interval.above(0, 1), 1e-6, 0.1),
                    "Relative ripple of the thickness at the inlet.").forQuestion("ripple"),
            Setting.of("inletFrequency", "Inlet frequency", "f", Kind.FREQUENCY,
                    Range.log(5, Interval.above(0, 1e5), 0.1, 100),
                    "Frequency of the ripple at the inlet.").forQuestion("ripple"),
            Setting.of("visibleGrowth", "Visible growth", "A_v", Kind.RATIO,
                    Range.log(10, Interval.above(1, 1e9), 1.5, 1e4),
                    "Growth over the length from which ripple counts as visible.").forQuestion("ripple"));

    private static final List<Reading> READINGS = List.of(
            Reading.positive("thickness", "Film thickness", "h", Kind.LENGTH, "Mean thickness of the settled film."),
            Reading.positive("meanVelocity", "Mean velocity", "u_m", Kind.VELOCITY, "Flow over thickness."),
            Reading.signed("surfaceVelocity", "Surface velocity", "u_s", Kind.VELOCITY, 1,
                    "Velocity at the surface, positive downhill."),
            Reading.signed("wallShear", "Wall shear stress", "τ_w", Kind.STRESS, 10, "Stress of the liquid on the plate."),
            Reading.signed("waveVelocity", "Wave velocity", "c", Kind.VELOCITY, 1,
                    "Speed of small long waves and of small changes of feed, dq/dh."),
            Reading.positive("filmReynolds", "Film Reynolds number Γ/μ", "Re", Kind.REYNOLDS_FILM, "Γ/μ."),
            Reading.positive("filmReynolds4", "Film Reynolds number 4Γ/μ", "Re_4", Kind.REYNOLDS_FILM_4, "4Γ/μ."),
            Reading.positive("filmReynoldsSurface", "Film Reynolds number uₛh/ν", "Re_s", Kind.REYNOLDS_SURFACE,
                    "On surface velocity and thickness."),
            Reading.positive("kapitza", "Kapitza number", "Ka", Kind.KAPITZA, "σ/(ρ g^⅓ ν^(4/3)) with full g, without sin β."),
            Reading.positive("residenceMean", "Mean residence time", "t_m", Kind.TIME, "Length over mean velocity."),
            Reading.positive("residenceMin", "Shortest residence time", "t_min", Kind.TIME, "Length over largest velocity."),
            Reading.positive("holdUp", "Liquid on the plate", "V", Kind.VOLUME, "Thickness times width times length."),
            Reading.positive("entryLength", "Entry length", "L_e", Kind.LENGTH,
                    "Length over which the film settles to 1 % of its thickness."));

    static final Declaration.Face FACE = new Declaration.Face(
            KEY,
            "Inclined film",
            "Liquid running as a film under air down a plate.",
            SETTINGS,
            List.of(LAW),
            READINGS,
            FilmPanels.PANELS,
            FilmPanels.CHECKS.stream().map(c -> c.info()).toList(),
            List.of("liquid.temperature", "angle", "feed", "length"),
            Set.of(Property.DENSITY, Property.VISCOSITY, Property.SURFACE_TENSION, Property.CONDUCTIVITY,
                    Property.HEAT_CAPACITY));

    @Override
    public String key() {
        return KEY;
    }

    @Override
    public Declaration declare(Structure structure) {
        return Declaration.of(FACE, structure.liquid());
    }

    @Override
    public Evaluator evaluator(Structure structure) {
        return new FilmEvaluator(structure);
    }

    @Override
    public Assessment assess(SetUp setUp) {
        Structure structure = setUp.structure();
        FilmEvaluator evaluator = new FilmEvaluator(structure);
        Assessor assessor = new Assessor(setUp, structure, declare(structure), evaluator);
        FilmPoint point = evaluator.point();
        FilmNotes.add(assessor, point);
        return assessor.checks(FilmPanels.CHECKS, evaluator.filmCase())
                .profiles(FilmProfiles.across(point), Profile.none())
                .workings(FilmWorkings.of(point, evaluator.state()))
                .cautions(Cautions.ofLiquid(evaluator.state().temperature, setUp.base().preset()))
                .finish(evaluator.state());
    }
}
