package slantfall.liquid;

import java.util.EnumMap;
import java.util.List;
import java.util.Map;

/**
 * A liquid as its preset file describes it.
 *
 * @param key stable key
 * @param name words for people
 * @param solute what the strength is the mass fraction of, empty for a pure liquid
 * @param properties how each known property is obtained
 * @param temperature temperatures it is meant for [K]
 * @param strength strengths it is meant for
 * @param words cautions where somebody could be hurt, and a note
 */
public record Preset(
        String key,
        String name,
        String solute,
        Map<Property, Provision> properties,
        Range temperature,
        Range strength,
        Words words) {

    public Preset {
        properties = java.util.Collections.unmodifiableMap(new EnumMap<>(properties));
    }

    /** Where somebody could be hurt. */
    public List<String> cautions() {
        return words.cautions();
    }

    /**
     * Words that go with a preset.
     *
     * @param cautions where somebody could be hurt
     * @param note anything else
     */
    public record Words(List<String> cautions, String note) {

        public Words {
            cautions = List.copyOf(cautions);
        }
    }
}
