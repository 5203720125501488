package slantfall.source;

import java.util.Objects;

/**
 * Where a formula, constant or value comes from.
 *
 * @param key short stable key such as {@code nusselt-1916}
 * @param citation authors, year, title or journal, as printed
 * @param locator table, equation or section, empty where none is known
 * @param mark how well it is vouched for
 */
public record Source(String key, String citation, String locator, Mark mark) {

    public Source {
        Objects.requireNonNull(key, "key");
        Objects.requireNonNull(citation, "citation");
        Objects.requireNonNull(locator, "locator");
        Objects.requireNonNull(mark, "mark");
    }

    /** A source without a locator. */
    public static Source of(String key, String citation, Mark mark) {
        return new Source(key, citation, "", mark);
    }

    /** This source at another place in it. */
    public Source at(String newLocator) {
        return new Source(key, citation, newLocator, mark);
    }

    /** The source in one line, with its mark in words. */
    public String text() {
        String place = locator.isEmpty() ? "" : ", " + locator;
        return citation + place + " (" + mark.words() + ")";
    }
}
