package slantfall.check;

import java.util.List;
import slantfall.declare.Check;
import slantfall.declare.CheckInfo;
import slantfall.declare.Margin;
import slantfall.declare.Panel;
import slantfall.declare.Side;
import slantfall.quantity.Kind;
import slantfall.source.Mark;
import slantfall.source.Source;

/** Where authors see a film turn turbulent, each on his own Reynolds number. */
final class TurbulencePanel {

    static final Panel PANEL =
            new Panel("regime", "Is the film laminar or turbulent?", "laminar", "turbulent", Panel.Sort.REGIME);

    static final List<Check<FilmCase>> CHECKS = List.of(
            limit("brauer-1956-turbulent", "Brauer 1956", Kind.REYNOLDS_FILM, 400, "Γ/μ ≤ 400",
                    Source.of("brauer-1956", "Brauer 1956, VDI-Forschungsheft 457", Mark.FROM_MEMORY)),
            limit("ishigai-1972-turbulent", "Ishigai et al. 1972", Kind.REYNOLDS_FILM, 400, "Γ/μ ≤ 400",
                    Source.of("ishigai-1972", "Ishigai et al. 1972, Bull. JSME 15", Mark.FROM_MEMORY)),
            limit("fulford-1964-turbulent", "Fulford 1964, lower end of 250 to 500", Kind.REYNOLDS_FILM, 250,
                    "Γ/μ ≤ 250", Source.of("fulford-1964", "Fulford 1964, Adv. Chem. Eng. 5", Mark.FROM_MEMORY)),
            limit("bird-stewart-lightfoot-1960-turbulent", "Bird, Stewart and Lightfoot 1960", Kind.REYNOLDS_FILM_4, 1500,
                    "4Γ/μ ≤ 1500",
                    new Source("bird-stewart-lightfoot-1960", "Bird, Stewart and Lightfoot 1960, Transport Phenomena",
                            "section 2.2", Mark.SECOND_HAND)),
            new ChunSeban(),
            FilmNumberLimit.of(
                    new CheckInfo.Criterion("regime", "al-sibai-2004-turbulent", "Al-Sibai 2004", "Γ/μ ≤ 192 Ka_f^0.06",
                            "silicone oils under still air; not for water"),
                    Kind.REYNOLDS_FILM,
                    new FilmNumberLimit.Law(192, 0.06),
                    c -> c.stillAir() && c.filmNumber() < WavinessPanel.OILS,
                    Source.of("al-sibai-2004", "Al-Sibai 2004", Mark.FROM_MEMORY)));

    private TurbulencePanel() {}

    private static FilmNumberLimit limit(
            String author, String name, Kind kind, double number, String formula, Source source) {
        return FilmNumberLimit.of(
                new CheckInfo.Criterion("regime", author, name, formula, "films under still air"),
                kind,
                new FilmNumberLimit.Law(number, 0),
                FilmCase::stillAir,
                source);
    }

    /** 4Γ/μ = 5800 Pr^−1.06, where the wavy and the turbulent heat-transfer laws of the authors cross. */
    private static final class ChunSeban implements Check<FilmCase> {

        private static final CheckInfo INFO = CheckInfo.log(
                new CheckInfo.Criterion("regime", "chun-seban-1971-turbulent", "Chun and Seban 1971, evaporating",
                        "4Γ/μ ≤ 5800 Pr^−1.06", "evaporating films of water under still air, Pr about 1.7 to 5.8"),
                Kind.REYNOLDS_FILM_4,
                Side.AT_MOST,
                new Source("chun-seban-1971", "Chun and Seban 1971, J. Heat Transfer 93, 391",
                        "5840 is printed elsewhere, 0.7 % more", Mark.FROM_MEMORY));

        private static final double LOG_OF_LIMIT = Math.log(5800.0 / 4);

        @Override
        public CheckInfo info() {
            return INFO;
        }

        @Override
        public double value(FilmCase c) {
            return 4 * c.reynolds();
        }

        @Override
        public double limit(FilmCase c) {
            return 5800 * Math.pow(c.prandtl(), -1.06);
        }

        @Override
        public double margin(FilmCase c) {
            return c.reynolds() <= 0 && !Double.isNaN(c.prandtl())
                    ? Margin.CLAMP
                    : Margin.clamp(LOG_OF_LIMIT - 1.06 * Math.log(c.prandtl()) - c.logs().reynolds());
        }

        @Override
        public boolean inRange(FilmCase c) {
            return c.stillAir() && c.prandtl() >= 1.7 && c.prandtl() <= 5.8;
        }
    }
}
