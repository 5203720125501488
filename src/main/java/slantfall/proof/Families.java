package slantfall.proof;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;

/** The list of families: add one with one line in the class of its section. */
final class Families {

    static final List<Family> ALL = all();

    private Families() {}

    /** The family of an id, the one with the longest prefix; empty if none covers it. */
    static Optional<Family> of(String id) {
        return ALL.stream().filter(f -> f.covers(id)).max(Comparator.comparingInt(f -> f.prefix().length()));
    }

    private static List<Family> all() {
        List<Family> all = new ArrayList<>();
        all.addAll(FilmFamilies.ALL);
        all.addAll(RegimeFamilies.ALL);
        all.addAll(ThicknessFamilies.ALL);
        all.addAll(SlotFamilies.ALL);
        all.addAll(LiquidFamilies.ALL);
        return List.copyOf(all);
    }
}
