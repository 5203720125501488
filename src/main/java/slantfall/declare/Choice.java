package slantfall.declare;

import java.util.List;

/**
 * A setting that is a word: a law, an author, a rheology.
 *
 * @param key stable key
 * @param name words for people
 * @param options what can be chosen
 * @param initial key of the option taken where the user chose none
 * @param help one sentence
 */
public record Choice(String key, String name, List<Option> options, String initial, String help) {

    public Choice {
        options = List.copyOf(options);
        String wanted = initial;
        if (options.stream().noneMatch(o -> o.key().equals(wanted))) {
            throw new IllegalArgumentException(key + ": no option " + initial);
        }
    }

    /** One thing that can be chosen. */
    public record Option(String key, String name) {}

    /** Whether the word is one of the options. */
    public boolean allows(String word) {
        return options.stream().anyMatch(o -> o.key().equals(word));
    }
}
