package slantfall.arrangement;

import java.util.ArrayList;
import java.util.List;
import slantfall.arrangement.Steps.Names;
import slantfall.declare.Working;
import slantfall.flow.Physics;
import slantfall.flow.film.FilmEntry;
import slantfall.flow.film.FilmNumbers;
import slantfall.flow.film.NewtonianFilm;
import slantfall.flow.film.ThicknessLaws;
import slantfall.liquid.LiquidState;
import slantfall.quantity.Kind;
import slantfall.quantity.Show;
import slantfall.source.Mark;
import slantfall.source.Source;

/** The steps behind the readings of a film. Readings that are unknown have none. */
final class FilmWorkings {

    private static final Source NUSSELT = ThicknessLaws.NUSSELT.source();
    private static final Source DEFINITION = Source.of("definition", "definition", Mark.COMPUTED);
    private static final Source BALANCE = Source.of("force-balance", "force balance on the film", Mark.COMPUTED);
    private static final Source KINEMATIC =
            Source.of("kinematic-wave", "kinematic wave, Lighthill and Whitham 1955", Mark.COMPUTED);
    private static final Source ENTRY =
            Source.of("momentum-integral", "integral momentum balance, docs/theory/inclined-film.md", Mark.COMPUTED);
    private static final String LAMINAR = "smooth laminar film";

    private final FilmPoint p;
    private final FilmPoint.Inputs in;
    private final LiquidState state;

    private FilmWorkings(FilmPoint p, LiquidState state) {
        this.p = p;
        this.in = p.inputs();
        this.state = state;
    }

    static List<Working> of(FilmPoint p, LiquidState state) {
        if (!p.flowing()) {
            return List.of();
        }
        FilmWorkings w = new FilmWorkings(p, state);
        List<Working> all = new ArrayList<>();
        all.add(w.thickness().of("thickness"));
        all.add(w.meanVelocity().of("meanVelocity"));
        all.add(w.wallShear());
        all.add(w.waveVelocity());
        all.add(w.reynolds("filmReynolds", Kind.REYNOLDS_FILM, "Re", "Γ/μ", p.reynolds()));
        all.add(w.reynolds("filmReynolds4", Kind.REYNOLDS_FILM_4, "Re_4", "4Γ/μ", 4 * p.reynolds()));
        all.add(w.holdUp());
        all.add(w.entryLength());
        if (!Double.isNaN(state.surfaceTension)) {
            all.add(w.kapitza());
        }
        boolean downhill = !NewtonianFilm.uphillSurface(p.gradient(), p.inputs().shear(), p.thickness());
        if (downhill) {
            all.add(w.residenceMean());
        }
        if (p.laminar()) {
            all.add(w.surfaceVelocity().of("surfaceVelocity"));
            all.add(w.surfaceReynolds());
            if (downhill) {
                all.add(w.residenceMin());
            }
        }
        return all;
    }

    private Steps flow() {
        return new Steps()
                .with("Γ", in.feed(), Kind.MASS_FLOW_PER_WIDTH)
                .with("ρ", p.density(), Kind.DENSITY)
                .gives(new Names("Flow per width", "q", Kind.VOLUME_FLOW_PER_WIDTH), "Γ/ρ", p.flow(), DEFINITION, "any");
    }

    private Steps thickness() {
        Steps steps = flow();
        if (!p.laminar()) {
            return steps.with("Re", p.reynolds(), Kind.REYNOLDS_FILM)
                    .with("μ", p.viscosity(), Kind.VISCOSITY)
                    .with("ρ", p.density(), Kind.DENSITY)
                    .with("g", Physics.G, Kind.ACCELERATION)
                    .with("β", in.angle(), Kind.ANGLE)
                    .gives(new Names("Film thickness", "h", Kind.LENGTH),
                            p.law().formula() + " · ((μ/ρ)²/(g sin β))^⅓", p.thickness(), p.law().source(), range());
        }
        steps.with("ρ", p.density(), Kind.DENSITY)
                .with("g", Physics.G, Kind.ACCELERATION)
                .with("β", in.angle(), Kind.ANGLE)
                .gives(new Names("Body force along the plate", "G", Kind.PRESSURE_GRADIENT), "ρ g sin β", p.gradient(),
                        BALANCE, "any");
        steps.with("q", p.flow(), Kind.VOLUME_FLOW_PER_WIDTH)
                .with("μ", p.viscosity(), Kind.VISCOSITY)
                .with("G", p.gradient(), Kind.PRESSURE_GRADIENT);
        Names h = new Names("Film thickness", "h", Kind.LENGTH);
        return in.shear() == 0
                ? steps.gives(h, "(3μq/G)^⅓", p.thickness(), NUSSELT, LAMINAR)
                : steps.with("τ_i", in.shear(), Kind.STRESS)
                        .gives(h, "positive root of G h³/(3μ) + τ_i h²/(2μ) = q", p.thickness(), NUSSELT, LAMINAR);
    }

    private String range() {
        String from = "tested for Γ/μ from " + Show.number(p.law().from(), 3);
        return Double.isInfinite(p.law().to()) ? from + " upward" : from + " to " + Show.number(p.law().to(), 3);
    }

    private Steps meanVelocity() {
        return thickness()
                .with("q", p.flow(), Kind.VOLUME_FLOW_PER_WIDTH)
                .with("h", p.thickness(), Kind.LENGTH)
                .gives(new Names("Mean velocity", "u_m", Kind.VELOCITY), "q/h", p.flow() / p.thickness(), DEFINITION, "any");
    }

    private double surface() {
        double h = p.thickness();
        return NewtonianFilm.velocity(p.gradient(), p.viscosity(), in.shear(), h, h);
    }

    private Steps surfaceVelocity() {
        return thickness()
                .with("G", p.gradient(), Kind.PRESSURE_GRADIENT)
                .with("h", p.thickness(), Kind.LENGTH)
                .with("τ_i", in.shear(), Kind.STRESS)
                .with("μ", p.viscosity(), Kind.VISCOSITY)
                .gives(new Names("Surface velocity", "u_s", Kind.VELOCITY), "(G h/2 + τ_i) h/μ", surface(), NUSSELT, LAMINAR);
    }

    private Working wallShear() {
        return thickness()
                .with("ρ", p.density(), Kind.DENSITY)
                .with("g", Physics.G, Kind.ACCELERATION)
                .with("β", in.angle(), Kind.ANGLE)
                .with("h", p.thickness(), Kind.LENGTH)
                .with("τ_i", in.shear(), Kind.STRESS)
                .gives(new Names("Wall shear stress", "τ_w", Kind.STRESS), "ρ g sin β h + τ_i",
                        p.gradient() * p.thickness() + in.shear(), BALANCE, "any settled film")
                .of("wallShear");
    }

    private Working waveVelocity() {
        Names c = new Names("Wave velocity", "c", Kind.VELOCITY);
        if (!p.laminar()) {
            return meanVelocity()
                    .with("u_m", p.flow() / p.thickness(), Kind.VELOCITY)
                    .with("m", p.law().exponent(), Kind.RATIO)
                    .gives(c, "dq/dh = u_m/m for h ∝ q^m", p.flow() / p.thickness() / p.law().exponent(), KINEMATIC, range())
                    .of("waveVelocity");
        }
        double wave = NewtonianFilm.waveVelocity(p.gradient(), p.viscosity(), in.shear(), p.thickness());
        return thickness()
                .with("G", p.gradient(), Kind.PRESSURE_GRADIENT)
                .with("h", p.thickness(), Kind.LENGTH)
                .with("τ_i", in.shear(), Kind.STRESS)
                .with("μ", p.viscosity(), Kind.VISCOSITY)
                .gives(c, "dq/dh = (G h + τ_i) h/μ", wave, KINEMATIC, LAMINAR)
                .of("waveVelocity");
    }

    private Working reynolds(String reading, Kind kind, String symbol, String formula, double value) {
        return new Steps()
                .with("Γ", in.feed(), Kind.MASS_FLOW_PER_WIDTH)
                .with("μ", p.viscosity(), Kind.VISCOSITY)
                .gives(new Names("Film Reynolds number", symbol, kind), formula, value, DEFINITION, "any")
                .of(reading);
    }

    private Working surfaceReynolds() {
        double value = Math.max(0, surface() * p.thickness() * p.density() / p.viscosity());
        return surfaceVelocity()
                .with("u_s", surface(), Kind.VELOCITY)
                .with("h", p.thickness(), Kind.LENGTH)
                .with("ρ", p.density(), Kind.DENSITY)
                .with("μ", p.viscosity(), Kind.VISCOSITY)
                .gives(new Names("Film Reynolds number on the surface", "Re_s", Kind.REYNOLDS_SURFACE),
                        "u_s h ρ/μ, 0 where the surface runs uphill", value, DEFINITION, LAMINAR)
                .of("filmReynoldsSurface");
    }

    private Working kapitza() {
        double value = FilmNumbers.kapitza(p.density(), p.viscosity(), state.surfaceTension, Physics.G);
        return new Steps()
                .with("σ", state.surfaceTension, Kind.SURFACE_TENSION)
                .with("ρ", p.density(), Kind.DENSITY)
                .with("μ", p.viscosity(), Kind.VISCOSITY)
                .with("g", Physics.G, Kind.ACCELERATION)
                .gives(new Names("Kapitza number", "Ka", Kind.KAPITZA), "σ/(ρ g^⅓ (μ/ρ)^(4/3))", value, DEFINITION, "any")
                .of("kapitza");
    }

    private Working residenceMean() {
        double mean = p.flow() / p.thickness();
        return meanVelocity()
                .with("L", in.length(), Kind.LENGTH)
                .with("u_m", mean, Kind.VELOCITY)
                .gives(new Names("Mean residence time", "t_m", Kind.TIME), "L/u_m", in.length() / mean, DEFINITION, "any")
                .of("residenceMean");
    }

    private Working residenceMin() {
        double largest = NewtonianFilm.largestVelocity(p.gradient(), p.viscosity(), in.shear(), p.thickness());
        return thickness()
                .with("L", in.length(), Kind.LENGTH)
                .with("u_max", largest, Kind.VELOCITY)
                .gives(new Names("Shortest residence time", "t_min", Kind.TIME), "L/u_max", in.length() / largest,
                        DEFINITION, LAMINAR)
                .of("residenceMin");
    }

    private Working holdUp() {
        return thickness()
                .with("h", p.thickness(), Kind.LENGTH)
                .with("W", in.width(), Kind.LENGTH)
                .with("L", in.length(), Kind.LENGTH)
                .gives(new Names("Liquid on the plate", "V", Kind.VOLUME), "h W L",
                        p.thickness() * in.width() * in.length(), DEFINITION, "any")
                .of("holdUp");
    }

    private Working entryLength() {
        return thickness()
                .with("h", p.thickness(), Kind.LENGTH)
                .with("Re", p.reynolds(), Kind.REYNOLDS_FILM)
                .gives(new Names("Entry length", "L_e", Kind.LENGTH), "h [1.262^1.6 + (0.614 Re)^1.6]^(1/1.6)",
                        FilmEntry.length(p.reynolds(), p.thickness()), ENTRY, "laminar, flat profile at the feed")
                .of("entryLength");
    }
}
