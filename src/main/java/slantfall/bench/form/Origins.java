package slantfall.bench.form;

import java.util.Locale;

/** Tells from the words of a property's origin how it came about. */
final class Origins {

    private Origins() {}

    /** The standing that the words describe. */
    static Standing standing(String origin) {
        String words = origin.toLowerCase(Locale.ROOT);
        if (words.startsWith("measured") || words.startsWith("fit")) {
            return Standing.MEASURED;
        }
        return words.startsWith("assumed") || words.startsWith("constant") ? Standing.ASSUMED : Standing.CORRELATED;
    }
}
