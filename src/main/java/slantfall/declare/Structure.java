package slantfall.declare;

import java.util.Map;
import slantfall.liquid.Liquid;

/**
 * Everything about a set-up that is no number: the words chosen and how each property of the liquid is obtained. Two
 * set-ups with equal structure share an evaluator, so questions rebuild it only when this changes.
 *
 * @param choices option taken for each choice the user made; a choice left out takes its declared option
 * @param liquid how each property is obtained
 */
public record Structure(Map<String, String> choices, Liquid liquid) {

    public Structure {
        choices = Map.copyOf(choices);
    }

    /** The option taken for a choice. */
    public String choice(Choice choice) {
        return choices.getOrDefault(choice.key(), choice.initial());
    }
}
