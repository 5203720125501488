package slantfall.store;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import slantfall.declare.Entries;

/** Gathers what a file holds and is not understood, and what the reader of the file should be told. */
final class Kept {

    private static final int MOST_REPORTS = 20;
    private static final String SUGGESTION = "; did you mean";

    private final Map<String, String> unknown = new LinkedHashMap<>();
    private final List<String> reports = new ArrayList<>();
    private int unreported;

    /** Keeps a value and tells about it. */
    void unknown(Node node, List<String> known) {
        keep(node);
        List<String> parts = Pointers.parts(node.place().pointer());
        String near = Entries.nearest(known, parts.get(parts.size() - 1));
        Place place = node.keyPlace();
        report("unknown key " + place.key() + " was kept (line " + place.line() + ", column " + place.column() + ")" + (near.startsWith(SUGGESTION) ? near : ""));
    }

    /** Keeps a value without a word. */
    void keep(Node node) {
        unknown.put(node.place().pointer(), NodeWriter.compact(node));
    }

    /** Tells something. */
    void report(String text) {
        if (reports.size() < MOST_REPORTS) {
            reports.add(text);
        } else {
            unreported++;
        }
    }

    /** Kept values as JSON text by JSON pointer. */
    Map<String, String> values() {
        return unknown;
    }

    /** What to tell, in the order found. */
    List<String> reports() {
        List<String> all = new ArrayList<>(reports);
        if (unreported > 0) {
            all.add("and " + unreported + " more of this sort");
        }
        return all;
    }
}
