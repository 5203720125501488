package slantfall.proof;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import slantfall.flow.film.ThicknessLaw;
import slantfall.flow.film.ThicknessLaws;

/** Section 2: the thickness laws by author. */
final class ThicknessFamilies {

    /** Names in the ids and the keys of the laws. */
    private static final Map<String, String> LAWS = Map.of(
            "Nusselt", "nusselt",
            "Kapitza_wavy", "kapitza",
            "Brauer", "brauer",
            "Feind", "feind",
            "Zhivaikin", "zhivaikin",
            "Takahama_Kato", "takahama-kato",
            "Karapantsios", "karapantsios",
            "Gimbutis", "gimbutis",
            "Kosky", "kosky");

    static final List<Family> ALL = all();

    private ThicknessFamilies() {}

    private static List<Family> all() {
        List<Family> all = new ArrayList<>();
        LAWS.forEach((name, key) -> {
            ThicknessLaw law = ThicknessLaws.named(key);
            all.add(Family.one("2.d." + name, "h/(ν²/g_s)^⅓, " + law.name(),
                    in -> law.dimensionless(in.positive("Re_Gamma_over_mu"))));
        });
        return List.copyOf(all);
    }
}
