package slantfall.check;

import java.util.List;
import slantfall.declare.Check;
import slantfall.declare.CheckInfo;
import slantfall.declare.Panel;
import slantfall.quantity.Kind;
import slantfall.source.Mark;
import slantfall.source.Source;

/**
 * Where authors first see waves on a vertical film. On an incline these limits do not hold: there the linear onset
 * decides whether waves grow at all.
 */
final class WavinessPanel {

    static final Panel PANEL =
            new Panel("waviness", "Is the film smooth or wavy?", "smooth", "wavy", Panel.Sort.REGIME);

    /**
     * Film number Ka_f between silicone oils and water (3.9e10 at 20 °C). No bound is published; this one only keeps
     * watery liquids out.
     */
    static final double OILS = 1e9;

    /** Inclines steeper than this count as vertical for criteria that were seen on vertical walls (ours) [rad]. */
    private static final double VERTICAL = Math.toRadians(80);

    static final List<Check<FilmCase>> CHECKS = List.of(
            limit("kapitza-1948-onset", "Kapitza 1948", Kind.REYNOLDS_FILM_4, new FilmNumberLimit.Law(2.44, 1.0 / 11),
                    "4Γ/μ ≤ 2.44 Ka_f^(1/11)", memory("kapitza-1948", "Kapitza 1948")),
            limit("chun-seban-1971-onset", "Chun and Seban 1971", Kind.REYNOLDS_FILM_4,
                    new FilmNumberLimit.Law(2.43, 1.0 / 11), "4Γ/μ ≤ 2.43 Ka_f^(1/11)",
                    memory("chun-seban-1971", "Chun and Seban 1971, J. Heat Transfer 93, 391")),
            limit("brauer-1956-onset", "Brauer 1956", Kind.REYNOLDS_FILM, new FilmNumberLimit.Law(0.306, 0.1),
                    "Γ/μ ≤ 0.306 Ka_f^(1/10)", memory("brauer-1956", "Brauer 1956, VDI-Forschungsheft 457")),
            limit("ishigai-1972-laminar", "Ishigai et al. 1972, purely laminar", Kind.REYNOLDS_FILM,
                    new FilmNumberLimit.Law(0.47, 0.1), "Γ/μ ≤ 0.47 Ka_f^(1/10)",
                    memory("ishigai-1972", "Ishigai et al. 1972, Bull. JSME 15")),
            limit("bird-stewart-lightfoot-1960-rippling", "Bird, Stewart and Lightfoot 1960", Kind.REYNOLDS_FILM_4,
                    new FilmNumberLimit.Law(20, 0), "4Γ/μ ≤ 20",
                    new Source("bird-stewart-lightfoot-1960", "Bird, Stewart and Lightfoot 1960, Transport Phenomena",
                            "section 2.2", Mark.SECOND_HAND)),
            FilmNumberLimit.of(
                    new CheckInfo.Criterion("waviness", "al-sibai-2004-laminar", "Al-Sibai 2004", "Γ/μ ≤ 0.6 Ka_f^(1/10)",
                            "vertical films of silicone oils; not for water"),
                    Kind.REYNOLDS_FILM,
                    new FilmNumberLimit.Law(0.6, 0.1),
                    WavinessPanel::oil,
                    memory("al-sibai-2004", "Al-Sibai 2004")));

    private WavinessPanel() {}

    private static FilmNumberLimit limit(
            String author, String name, Kind kind, FilmNumberLimit.Law law, String formula, Source source) {
        return FilmNumberLimit.of(
                new CheckInfo.Criterion("waviness", author, name, formula, "vertical films under still air"),
                kind,
                law,
                WavinessPanel::vertical,
                source);
    }

    static boolean vertical(FilmCase c) {
        return c.angle() >= VERTICAL && c.stillAir();
    }

    static boolean oil(FilmCase c) {
        return vertical(c) && c.filmNumber() < OILS;
    }

    private static Source memory(String key, String citation) {
        return Source.of(key, citation, Mark.FROM_MEMORY);
    }
}
