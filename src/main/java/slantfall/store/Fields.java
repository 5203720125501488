package slantfall.store;

import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;

/** The members of one object, taken by name; those that nobody takes are kept as unknown. */
final class Fields {

    private final Node object;
    private final Set<String> asked = new LinkedHashSet<>();

    /**
     * Begins with an object.
     *
     * @param what what it is, for the message if it is none
     * @throws StoreProblem if it is no object
     */
    Fields(Node node, String what) {
        if (!node.is(Node.Sort.OBJECT)) {
            throw node.problem(what + " must be an object {…}, was " + node.sort().words(), "Write { \"key\": value, … }");
        }
        object = node;
    }

    /** The object itself, for its place. */
    Node node() {
        return object;
    }

    /** A member, null if there is none. */
    Node take(String name) {
        asked.add(name);
        return object.get(name);
    }

    /** A member that must be there. */
    Node need(String name, String remedy) {
        Node node = take(name);
        if (node == null) {
            throw object.problem("\"" + name + "\" is missing", remedy);
        }
        return node;
    }

    /** A member that is a text, or the text given if there is none. */
    String text(String name, String otherwise) {
        Node node = take(name);
        return node == null ? otherwise : text(node);
    }

    /** A value that must be a text. */
    static String text(Node node) {
        if (!node.is(Node.Sort.TEXT)) {
            throw node.problem("must be a text, was " + node.sort().words(), "Put it in double quotes");
        }
        return node.text();
    }

    /** The items of a member that is a list; none if it is missing. */
    List<Node> list(String name, String remedy) {
        Node node = take(name);
        return node == null ? List.of() : list(node, remedy);
    }

    /** The items of a value that must be a list. */
    static List<Node> list(Node node, String remedy) {
        if (!node.is(Node.Sort.LIST)) {
            throw node.problem("must be a list […], was " + node.sort().words(), remedy);
        }
        return node.items();
    }

    /** Keeps and reports what nobody asked for. */
    void keepRest(Kept kept) {
        object.members().forEach((name, node) -> {
            if (!asked.contains(name)) {
                kept.unknown(node, List.copyOf(asked));
            }
        });
    }
}
