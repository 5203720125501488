package slantfall.proof;

import java.util.ArrayList;
import java.util.List;
import slantfall.source.Mark;

/** Marks of check values in words. A value may carry several: constants from memory, value computed. */
final class MarkWords {

    private MarkWords() {}

    /** {@code M/C} as "from memory; derived and computed here", {@code S form} as "read in the source (form)". */
    static String of(String mark) {
        List<String> words = new ArrayList<>();
        for (String part : mark.split("[/+]")) {
            String text = part.trim();
            if (!text.isEmpty()) {
                words.add(one(text));
            }
        }
        return words.isEmpty() ? "no mark" : String.join("; ", words);
    }

    private static String one(String text) {
        int space = text.indexOf(' ');
        String letter = space < 0 ? text : text.substring(0, space);
        for (Mark mark : Mark.values()) {
            if (mark.letter().equals(letter)) {
                return mark.words() + (space < 0 ? "" : " (" + text.substring(space + 1).trim() + ")");
            }
        }
        return "unknown mark " + text;
    }
}
