package slantfall.bench.shell;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import slantfall.bench.model.Desk;
import slantfall.declare.Declaration;
import slantfall.declare.LiquidSettings;

/** Finds settings, readings and checks by any part of their words, keys or symbols. */
public final class FinderModel {

    private static final int MOST = 12;

    private final Desk desk;

    /** Looks in a desk. */
    public FinderModel(Desk desk) {
        this.desk = desk;
    }

    /** What a hit is. */
    public enum Sort {
        SETTING("setting"),
        READING("reading"),
        CHECK("check");

        private final String word;

        Sort(String word) {
            this.word = word;
        }

        /** The word beside the name. */
        public String word() {
            return word;
        }
    }

    /**
     * Something found.
     *
     * @param key key of the setting, reading, check or panel
     */
    public record Hit(Sort sort, String key, String name, String symbol) {}

    /** What matches all words of the text, best first. */
    public List<Hit> find(String text) {
        String[] words = text.strip().toLowerCase(Locale.ROOT).split("\\s+");
        List<Hit> hits = new ArrayList<>();
        for (Hit hit : all()) {
            String where = (hit.name() + " " + hit.key() + " " + hit.symbol() + " " + hit.sort().word())
                    .toLowerCase(Locale.ROOT);
            if (java.util.Arrays.stream(words).allMatch(where::contains)) {
                hits.add(hit);
            }
        }
        hits.sort(java.util.Comparator.comparingInt(h -> h.name().toLowerCase(Locale.ROOT).startsWith(words[0]) ? 0 : 1));
        return hits.size() > MOST ? hits.subList(0, MOST) : hits;
    }

    private List<Hit> all() {
        Declaration d = desk.declaration();
        List<Hit> all = new ArrayList<>();
        d.settings().forEach(s -> all.add(new Hit(Sort.SETTING, s.key(), s.name(), s.symbol())));
        LiquidSettings.list().forEach(s -> all.add(new Hit(Sort.SETTING, s.key(), s.name(), s.symbol())));
        d.readings().forEach(r -> all.add(new Hit(Sort.READING, r.key(), r.name(), r.symbol())));
        d.panels().forEach(p -> all.add(new Hit(Sort.CHECK, p.key(), p.question(), "")));
        desk.assessment().checks().forEach(c -> all.add(new Hit(Sort.CHECK, c.info().key(), c.info().name(), "")));
        return all;
    }
}
