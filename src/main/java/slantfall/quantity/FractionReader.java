package slantfall.quantity;

import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/** Reads per cent with the words that say of what: by mass, total solids; by volume is another quantity. */
final class FractionReader {

    private static final String BY_MASS = "wt\\.?|w/w|m/m|w|mass|weight|by mass|by weight";
    private static final String SOLIDS = "ts|tds|ds|dm|solids|total solids|dry solids|dry matter";
    private static final Pattern MASS = Pattern.compile("\\(?(?:" + BY_MASS + ")\\)?[ -]?%|% ?\\(?("
            + BY_MASS + "|" + SOLIDS + ")\\)?", Pattern.CASE_INSENSITIVE);
    private static final Pattern VOLUME = Pattern.compile(
            "(?:vol\\.?|v/v|v)[ -]?%|% ?\\(?(?:vol\\.?|v/v|by volume|volume|w/v|m/v|abv)\\)?",
            Pattern.CASE_INSENSITIVE);

    private FractionReader() {
    }

    static Optional<Entry> read(Typed typed) {
        NumberText number = NumberText.first(typed.clean());
        if (VOLUME.matcher(number.rest()).matches()) {
            throw typed.refused("is counted by volume; a fraction by mass is wanted here",
                    "Type it by mass (65 wt%), or as g/L with the density given");
        }
        Matcher m = MASS.matcher(number.rest());
        if (!m.matches()) {
            return Optional.empty();
        }
        boolean solids = m.group(1) != null && m.group(1).toLowerCase(java.util.Locale.ROOT).matches(SOLIDS);
        Entry entry = LinearReader.inUnit(typed, number, typed.kind().unit("%"));
        String echo = entry.echo() + (solids ? ", total solids by mass" : ", by mass");
        return Optional.of(typed.entry(entry.si(), entry.unit(), echo));
    }
}
