package slantfall.catalogue;

import java.util.List;
import java.util.Optional;
import slantfall.arrangement.ClosedSlot;
import slantfall.arrangement.InclinedFilm;
import slantfall.declare.Arrangement;

/** Every arrangement, one line each. */
public final class Catalogue {

    private static final List<Arrangement> ALL = List.of(
            new InclinedFilm(),
            new ClosedSlot());

    private Catalogue() {}

    /** All of them, in the order shown. */
    public static List<Arrangement> all() {
        return ALL;
    }

    /** The arrangement of a key, if there is one. */
    public static Optional<Arrangement> find(String key) {
        return ALL.stream().filter(a -> a.key().equals(key)).findFirst();
    }

    /** The arrangement of a key that is known to exist. */
    public static Arrangement named(String key) {
        return find(key).orElseThrow(() -> new IllegalArgumentException("no arrangement " + key));
    }
}
