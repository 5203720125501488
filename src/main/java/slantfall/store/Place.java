package slantfall.store;

/**
 * A place in a file.
 *
 * @param file name of the file, for people
 * @param line line, from 1; 0 where the whole file is meant
 * @param column column, from 1; 0 where the whole line is meant
 * @param pointer JSON pointer of the value; empty for the whole
 */
public record Place(String file, int line, int column, String pointer) {

    private static final int LONGEST = 80;

    /** The whole of a file. */
    public static Place of(String file) {
        return new Place(file, 0, 0, "");
    }

    /** The key as people write it: {@code settings.angle}, {@code requirements[0].atLeast}. */
    public String key() {
        StringBuilder key = new StringBuilder();
        for (String part : Pointers.parts(pointer)) {
            if (!key.isEmpty() && Pointers.index(part) >= 0) {
                key.append('[').append(part).append(']');
            } else {
                key.append(key.isEmpty() ? "" : ".").append(part);
            }
        }
        return shortened(key.toString());
    }

    /** The place in words. */
    public String text() {
        StringBuilder text = new StringBuilder(shortened(file));
        if (line > 0) {
            text.append(", line ").append(line);
        }
        if (column > 0) {
            text.append(", column ").append(column);
        }
        return text + (pointer.isEmpty() ? "" : ", " + key());
    }

    /** Control characters shown as spaces, the middle of a long text left out. */
    static String shortened(String text) {
        String clean = text.replaceAll("\\p{Cntrl}", " ");
        int half = LONGEST / 2 - 2;
        return clean.length() <= LONGEST
                ? clean
                : clean.substring(0, half) + "..." + clean.substring(clean.length() - half);
    }
}
