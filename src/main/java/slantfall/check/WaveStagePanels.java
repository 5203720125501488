package slantfall.check;

import java.util.List;
import slantfall.declare.Check;
import slantfall.declare.CheckInfo;
import slantfall.declare.Panel;
import slantfall.quantity.Kind;
import slantfall.source.Mark;
import slantfall.source.Source;

/** The stages between first waves and turbulence, which only some authors tell apart. */
final class WaveStagePanels {

    static final Panel FULL = new Panel(
            "full-waves", "Are the waves fully grown?", "smooth or small waves", "fully wavy", Panel.Sort.REGIME);

    static final Panel TRANSITION = new Panel("transition", "Does turbulence show between the waves?",
            "wavy laminar at most", "transition or turbulent", Panel.Sort.REGIME);

    private static final Source ISHIGAI =
            Source.of("ishigai-1972", "Ishigai et al. 1972, Bull. JSME 15", Mark.FROM_MEMORY);
    private static final Source AL_SIBAI = Source.of("al-sibai-2004", "Al-Sibai 2004", Mark.FROM_MEMORY);

    private static final String VERTICAL = "vertical films under still air";
    private static final String OILS = "vertical films of silicone oils; not for water";

    static final List<Check<FilmCase>> CHECKS = List.of(
            FilmNumberLimit.of(
                    new CheckInfo.Criterion("full-waves", "ishigai-1972-stable-wavy", "Ishigai et al. 1972, stable wavy",
                            "Γ/μ ≤ 2.2 Ka_f^(1/10)", VERTICAL),
                    Kind.REYNOLDS_FILM,
                    new FilmNumberLimit.Law(2.2, 0.1),
                    WavinessPanel::vertical,
                    ISHIGAI),
            FilmNumberLimit.of(
                    new CheckInfo.Criterion("full-waves", "al-sibai-2004-sinusoidal", "Al-Sibai 2004, end of sine waves",
                            "Γ/μ ≤ 1.2 Ka_f^(1/10)", OILS),
                    Kind.REYNOLDS_FILM,
                    new FilmNumberLimit.Law(1.2, 0.1),
                    WavinessPanel::oil,
                    AL_SIBAI),
            FilmNumberLimit.of(
                    new CheckInfo.Criterion("transition", "ishigai-1972-second", "Ishigai et al. 1972, second transition",
                            "Γ/μ ≤ 75", VERTICAL),
                    Kind.REYNOLDS_FILM,
                    new FilmNumberLimit.Law(75, 0),
                    WavinessPanel::vertical,
                    ISHIGAI),
            FilmNumberLimit.of(
                    new CheckInfo.Criterion("transition", "al-sibai-2004-wavy-laminar",
                            "Al-Sibai 2004, end of wavy laminar", "Γ/μ ≤ 25 Ka_f^0.09", OILS),
                    Kind.REYNOLDS_FILM,
                    new FilmNumberLimit.Law(25, 0.09),
                    WavinessPanel::oil,
                    AL_SIBAI));

    private WaveStagePanels() {}
}
