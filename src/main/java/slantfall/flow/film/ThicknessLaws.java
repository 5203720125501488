package slantfall.flow.film;

import java.util.List;
import slantfall.source.Mark;
import slantfall.source.Source;

/** The thickness laws by author. Re = Γ/μ throughout; where an author wrote 4Γ/μ the factor is converted here. */
public final class ThicknessLaws {

    private static final double CUBE_ROOT_3 = Math.cbrt(3);
    private static final double ANY = Double.POSITIVE_INFINITY;

    /** Smooth laminar film, exact. */
    public static final ThicknessLaw NUSSELT = law("nusselt", "Nusselt 1916, smooth laminar", new Power(CUBE_ROOT_3, 1.0 / 3),
            new Span(0, 400), "(3 Re)^⅓",
            Source.of("nusselt-1916", "Nusselt 1916, Z. VDI 60, 541", Mark.COMPUTED));

    /** Wavy laminar film, 7 % thinner. */
    public static final ThicknessLaw KAPITZA = law("kapitza", "Kapitza 1948, wavy laminar", new Power(Math.cbrt(2.4), 1.0 / 3),
            new Span(5, 400), "(2.4 Re)^⅓",
            Source.of("kapitza-1948", "Kapitza 1948", Mark.FROM_MEMORY));

    /** Turbulent film. */
    public static final ThicknessLaw BRAUER = law("brauer", "Brauer 1956, turbulent", new Power(0.302 * CUBE_ROOT_3, 8.0 / 15),
            new Span(400, ANY), "0.302·3^⅓ Re^(8/15)",
            new Source("brauer-1956", "Brauer 1956, VDI-Forschungsheft 457", "as quoted from the VDI Heat Atlas, section M3", Mark.SECOND_HAND));

    /** Where Nusselt's and Brauer's thickness are equal: Re = 0.302^(−5), about 398. */
    public static final double CROSSING = Math.pow(0.302, -5);

    private static final List<ThicknessLaw> ALL = List.of(
            NUSSELT,
            KAPITZA,
            BRAUER,
            law("feind", "Feind 1960, turbulent", new Power(0.369 * CUBE_ROOT_3, 0.5),
                    new Span(400, ANY), "0.369·3^⅓ Re^½",
                    Source.of("feind-1960", "Feind 1960, VDI-Forschungsheft 481", Mark.FROM_MEMORY)),
            law("zhivaikin", "Zhivaikin 1962, turbulent", new Power(0.141 * Math.pow(4, 7.0 / 12), 7.0 / 12),
                    new Span(400, ANY), "0.141 (4Re)^(7/12)",
                    Source.of("zhivaikin-1962", "Zhivaikin 1962", Mark.FROM_MEMORY)),
            law("takahama-kato", "Takahama and Kato 1980, turbulent", new Power(0.473, 0.526),
                    new Span(400, ANY), "0.473 Re^0.526",
                    Source.of("takahama-kato-1980", "Takahama and Kato 1980, Int. J. Multiphase Flow 6", Mark.FROM_MEMORY)),
            law("karapantsios", "Karapantsios et al. 1989, wavy to turbulent", new Power(0.214 * Math.pow(4, 0.538), 0.538),
                    new Span(250, 3250), "0.214 (4Re)^0.538",
                    new Source("karapantsios-1989", "Karapantsios, Paras and Karabelas 1989", "as quoted in a public film model", Mark.SECOND_HAND)),
            law("gimbutis", "Gimbutis 1974, turbulent", new Power(0.136 * Math.pow(4, 0.583), 0.583),
                    new Span(400, ANY), "0.136 (4Re)^0.583",
                    Source.of("gimbutis-1974", "Gimbutis 1974", Mark.FROM_MEMORY)),
            law("kosky", "Kosky 1971, turbulent", new Power(Math.pow(0.0504, 2.0 / 3) * Math.pow(4, 7.0 / 12), 7.0 / 12),
                    new Span(250, ANY), "[0.0504 (4Re)^(7/8)]^⅔",
                    Source.of("kosky-1971", "Kosky 1971", Mark.FROM_MEMORY)));

    private ThicknessLaws() {}

    /** Every law, laminar first. */
    public static List<ThicknessLaw> all() {
        return ALL;
    }

    /** The law of an author. */
    public static ThicknessLaw named(String key) {
        return ALL.stream()
                .filter(l -> l.key().equals(key))
                .findFirst()
                .orElseThrow(() -> new IllegalArgumentException("no thickness law " + key));
    }

    /** Nusselt up to the crossing, Brauer beyond, so that the thickness stays continuous. */
    public static ThicknessLaw automatic(double reynolds) {
        return reynolds <= CROSSING ? NUSSELT : BRAUER;
    }

    private static ThicknessLaw law(String key, String name, Power power, Span span, String formula, Source source) {
        return new ThicknessLaw(key, name, power.factor(), power.exponent(), span.from(), span.to(), formula, source);
    }

    /** d* = factor Re^exponent. */
    private record Power(double factor, double exponent) {}

    /** Γ/μ for which a law was tested. */
    private record Span(double from, double to) {}
}
