package slantfall.check;

import java.util.ArrayList;
import java.util.List;
import slantfall.declare.Check;
import slantfall.declare.CheckInfo;
import slantfall.declare.Panel;
import slantfall.declare.Side;
import slantfall.flow.film.FilmNumbers;
import slantfall.quantity.Kind;
import slantfall.source.Mark;
import slantfall.source.Source;

/** The panels of a film: add a check with one line in its panel, a panel with one line here. */
public final class FilmPanels {

    private static final Panel ONSET =
            new Panel("onset", "Do long waves grow on this film?", "waves die out", "waves grow", Panel.Sort.REGIME);
    private static final Panel SURFACE =
            new Panel("surface", "Does the surface run downhill?", "runs downhill", "runs uphill", Panel.Sort.LIMIT);
    private static final Panel ENTRY =
            new Panel("entry", "Is the film settled before it ends?", "settles", "not settled", Panel.Sort.VALIDITY);

    private static final Source ENTRY_SOURCE = new Source(
            "momentum-integral", "integral momentum balance with the parabolic profile", "docs/theory/inclined-film.md",
            Mark.COMPUTED);

    private static final List<Check<FilmCase>> OTHERS = List.of(
            new Criterion<>(
                    CheckInfo.log(
                            new CheckInfo.Criterion("onset", "benjamin-1957-yih-1963", "Benjamin 1957, Yih 1963",
                                    "Γ/μ ≤ (5/6) cot β", "long waves on a clean laminar film under still air"),
                            Kind.REYNOLDS_FILM,
                            Side.AT_MOST,
                            new Source("benjamin-1957", "Benjamin 1957, J. Fluid Mech. 2, 554; Yih 1963, Phys. Fluids 6, 321",
                                    "long-wave limit, re-derived", Mark.COMPUTED)),
                    FilmCase::reynolds,
                    c -> FilmNumbers.onset(c.angle()),
                    FilmCase::stillAir),
            new Criterion<>(
                    CheckInfo.log(
                            new CheckInfo.Criterion("surface", "uphill-gas-drag", "Gas drag against the film",
                                    "ρ g sin β h ≥ −2τ_i", "any laminar film"),
                            Kind.STRESS,
                            Side.AT_LEAST,
                            Source.of("nusselt-1916", "from the velocity profile of the laminar film", Mark.COMPUTED)),
                    c -> c.gradient() * c.thickness(),
                    c -> Math.max(0, -2 * c.shear()),
                    c -> true),
            new Criterion<>(
                    CheckInfo.log(
                            new CheckInfo.Criterion("entry", "momentum-integral", "Entry length against length",
                                    "L_e ≤ L", "laminar film, feed with a flat profile"),
                            Kind.LENGTH,
                            Side.AT_MOST,
                            ENTRY_SOURCE),
                    FilmCase::entryLength,
                    FilmCase::length,
                    c -> true));

    /** Every panel of a film. */
    public static final List<Panel> PANELS = List.of(
            ONSET,
            WavinessPanel.PANEL,
            WaveStagePanels.FULL,
            WaveStagePanels.TRANSITION,
            TurbulencePanel.PANEL,
            SURFACE,
            ENTRY);

    /** Every check of a film. */
    public static final List<Check<FilmCase>> CHECKS = checks();

    private FilmPanels() {}

    private static List<Check<FilmCase>> checks() {
        List<Check<FilmCase>> all = new ArrayList<>(OTHERS);
        all.addAll(WavinessPanel.CHECKS);
        all.addAll(WaveStagePanels.CHECKS);
        all.addAll(TurbulencePanel.CHECKS);
        return List.copyOf(all);
    }
}
