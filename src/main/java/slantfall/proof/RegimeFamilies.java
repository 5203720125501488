package slantfall.proof;

import java.util.List;
import java.util.Map;
import slantfall.check.FilmCase;
import slantfall.check.FilmPanels;
import slantfall.declare.Check;
import slantfall.flow.film.EvaporatingFilm;
import slantfall.flow.film.FilmNumbers;

/** Section 2: numbers of a film and the limits of the check panels, taken from the very checks that judge a set-up. */
final class RegimeFamilies {

    /** Names in the published table and the check that holds the limit. */
    private static final Map<String, String> CHECKS = Map.ofEntries(
            Map.entry("Kapitza_wave_onset_4G", "waviness.kapitza-1948-onset"),
            Map.entry("ChunSeban_wave_onset_4G", "waviness.chun-seban-1971-onset"),
            Map.entry("Brauer_wave_onset_G", "waviness.brauer-1956-onset"),
            Map.entry("Ishigai_pure_laminar_G", "waviness.ishigai-1972-laminar"),
            Map.entry("Ishigai_stable_wavy_from_G", "full-waves.ishigai-1972-stable-wavy"),
            Map.entry("Ishigai_2nd_transition_G", "transition.ishigai-1972-second"),
            Map.entry("Ishigai_turbulent_G", "regime.ishigai-1972-turbulent"),
            Map.entry("AlSibai_laminar_G", "waviness.al-sibai-2004-laminar"),
            Map.entry("AlSibai_sinus_G", "full-waves.al-sibai-2004-sinusoidal"),
            Map.entry("AlSibai_wavy_lam_G", "transition.al-sibai-2004-wavy-laminar"),
            Map.entry("AlSibai_turb_G", "regime.al-sibai-2004-turbulent"),
            Map.entry("Brauer_turb_G", "regime.brauer-1956-turbulent"));

    static final List<Family> ALL = List.of(
            Family.list("2.Rec", "linear onset in Γ/μ, 4Γ/μ, u_s h/ν", RegimeFamilies::onset),
            Family.list("2.Ka", "Ka, Ka_f, 1/Ka_f", RegimeFamilies::kapitza),
            new Family("2.reg", "limits of the film panels", RegimeFamilies::limits),
            Family.list("2.reg.BSL", "limits on 4Γ/μ", in -> new double[] {
                limit("waviness.bird-stewart-lightfoot-1960-rippling", filmCase(Double.NaN, Double.NaN)),
                limit("regime.bird-stewart-lightfoot-1960-turbulent", filmCase(Double.NaN, Double.NaN))
            }),
            Family.list("2.reg.CS_turb", "turbulent limit on 4Γ/μ, and where the two laws cross", in -> new double[] {
                limit("regime.chun-seban-1971-turbulent", filmCase(Double.NaN, in.positive("Pr"))),
                EvaporatingFilm.crossing(in.positive("Pr"))
            }));

    private RegimeFamilies() {}

    private static double[] onset(Inputs in) {
        double angle = in.angle();
        if (!(angle > 0 && angle <= Math.PI / 2)) {
            throw new IllegalArgumentException("input beta_deg is " + Math.toDegrees(angle)
                    + "; the onset is known above 0 and up to 90 degrees");
        }
        FilmCase still = new FilmCase(angle, Double.NaN, Double.NaN, Double.NaN, Double.NaN, 0, Double.NaN, Double.NaN,
                Double.NaN, FilmCase.Logs.of(Double.NaN, Double.NaN));
        double onset = limit("onset.benjamin-1957-yih-1963", still);
        return new double[] {onset, 4 * onset, 1.5 * onset};
    }

    private static double[] kapitza(Inputs in) {
        double filmNumber = filmNumber(in);
        double kapitza = FilmNumbers.kapitza(
                in.positive("rho"), in.positive("mu"), in.positive("sigma"), in.positive("g"));
        return new double[] {kapitza, filmNumber, 1 / filmNumber};
    }

    private static double[] limits(PublishedRow row) {
        FilmCase film = filmCase(filmNumber(row.inputs()), Double.NaN);
        return row.expected().stream().mapToDouble(e -> limit(checkOf(e.place()), film)).toArray();
    }

    private static String checkOf(String name) {
        String key = CHECKS.get(name);
        if (key == null) {
            throw new IllegalArgumentException("no check holds the limit \"" + name + "\"");
        }
        return key;
    }

    private static double filmNumber(Inputs in) {
        return FilmNumbers.filmNumber(in.positive("rho"), in.positive("mu"), in.positive("sigma"), in.positive("g"));
    }

    private static FilmCase filmCase(double filmNumber, double prandtl) {
        return new FilmCase(
                Math.PI / 2, Double.NaN, filmNumber, prandtl, Double.NaN, 0, Double.NaN, Double.NaN, Double.NaN,
                FilmCase.Logs.of(Double.NaN, filmNumber));
    }

    private static double limit(String key, FilmCase film) {
        for (Check<FilmCase> check : FilmPanels.CHECKS) {
            if (check.info().key().equals(key)) {
                return check.limit(film);
            }
        }
        throw new IllegalStateException("no check " + key + " among the panels of a film");
    }
}
