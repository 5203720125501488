package slantfall.arrangement;

import java.util.ArrayList;
import java.util.List;
import slantfall.declare.Choice;
import slantfall.flow.film.ThicknessLaw;
import slantfall.flow.film.ThicknessLaws;

/** The choice of a thickness law. */
final class FilmLaws {

    static final String AUTO = "auto";

    private FilmLaws() {}

    static Choice choice() {
        List<Choice.Option> options = new ArrayList<>();
        options.add(new Choice.Option(AUTO, "Nusselt, beyond Γ/μ = 398 Brauer"));
        for (ThicknessLaw law : ThicknessLaws.all()) {
            options.add(new Choice.Option(law.key(), law.name()));
        }
        return new Choice("thicknessLaw", "Thickness law", options, AUTO,
                "Which author's law gives the thickness; with gas drag the film is always taken as laminar.");
    }

    /** The chosen law, null for the automatic choice. */
    static ThicknessLaw chosen(String key) {
        return AUTO.equals(key) ? null : ThicknessLaws.named(key);
    }
}
