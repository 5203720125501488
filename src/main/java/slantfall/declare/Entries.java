package slantfall.declare;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import slantfall.quantity.Entry;
import slantfall.quantity.EntryContext;
import slantfall.quantity.EntryReader;

/** Puts what a user typed into a set-up: the one way for files, {@code --set} and fields. */
public final class Entries {

    private static final String WIDTH = "width";

    private Entries() {}

    /** What an entry may lean on: the density of the liquid as it stands, the width if there is one. */
    public static EntryContext context(SetUp setUp, Declaration declaration) {
        double width = declaration.setting(WIDTH).map(setUp::value).orElse(Double.NaN);
        return new EntryContext(setUp.liquidState().density, width);
    }

    /**
     * The set-up with one setting, property of the liquid or choice set from text.
     *
     * @throws IllegalArgumentException for an unknown key, a word that is no option, a value outside the possible range;
     *     what the text itself may be refused for is raised by {@link EntryReader}
     */
    public static SetUp set(SetUp setUp, Declaration declaration, String key, String text) {
        Choice choice = declaration.choice(key).orElse(null);
        if (choice != null) {
            if (!choice.allows(text.trim())) {
                List<String> words = choice.options().stream().map(Choice.Option::key).toList();
                throw new IllegalArgumentException(key + ": no option \"" + shorten(text) + "\"; one of " + words);
            }
            return setUp.withChoice(key, text.trim());
        }
        Setting setting = setting(declaration, key);
        Entry entry = EntryReader.read(text, setting.kind(), context(setUp, declaration));
        if (!setting.possible().contains(entry.si())) {
            throw new IllegalArgumentException(Limits.refusal(setting, entry.si()));
        }
        return setUp.with(key, Value.typed(entry.si(), text.trim()));
    }

    /** The setting of a key, the liquid's own included even where this set-up does not use it yet. */
    public static Setting setting(Declaration declaration, String key) {
        return Stream.concat(declaration.allSettings().stream(), LiquidSettings.list().stream())
                .filter(s -> s.key().equals(key))
                .findFirst()
                .orElseThrow(() -> new IllegalArgumentException(unknown(declaration, key)));
    }

    /** "unknown setting ..." with the nearest known keys. */
    public static String unknown(Declaration declaration, String key) {
        List<String> known = new ArrayList<>();
        declaration.allSettings().forEach(s -> known.add(s.key()));
        declaration.choices().forEach(c -> known.add(c.key()));
        LiquidSettings.list().stream().map(Setting::key).filter(k -> !known.contains(k)).forEach(known::add);
        return "unknown setting \"" + shorten(key) + "\" of " + declaration.key() + nearest(known, key);
    }

    /** ", did you mean ..." where something is close, else the whole list. */
    public static String nearest(List<String> known, String key) {
        Map.Entry<String, Integer> best = known.stream()
                .map(k -> Map.entry(k, distance(k.toLowerCase(java.util.Locale.ROOT), key.toLowerCase(java.util.Locale.ROOT))))
                .min(Comparator.comparingInt(Map.Entry::getValue))
                .orElse(Map.entry("", 99));
        return best.getValue() <= Math.max(2, key.length() / 3)
                ? "; did you mean \"" + best.getKey() + "\"?"
                : "; one of " + String.join(", ", known) + ".";
    }

    private static String shorten(String text) {
        return text.length() <= 40 ? text : text.substring(0, 37) + "...";
    }

    /** Levenshtein's distance (Soviet Physics Doklady 10 (1966) 707), cut short for long texts. */
    private static int distance(String a, String b) {
        if (b.length() > 60) {
            return 99;
        }
        int[] row = new int[b.length() + 1];
        for (int j = 0; j <= b.length(); j++) {
            row[j] = j;
        }
        for (int i = 1; i <= a.length(); i++) {
            int diagonal = row[0];
            row[0] = i;
            for (int j = 1; j <= b.length(); j++) {
                int change = a.charAt(i - 1) == b.charAt(j - 1) ? diagonal : diagonal + 1;
                diagonal = row[j];
                row[j] = Math.min(change, Math.min(row[j], row[j - 1]) + 1);
            }
        }
        return row[b.length()];
    }
}
