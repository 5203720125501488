package slantfall.store;

import java.util.List;
import java.util.Map;
import java.util.Set;

/** Puts what a file held and was not understood back where it stood. */
final class Replanted {

    /** Where it goes if its place is gone. */
    static final String HOMELESS = "unplaced";

    private static final Set<String> BLOCKS = Set.of("liquid", "settings", "houseRules");

    private Replanted() {}

    /**
     * Adds kept values to the nodes of a file.
     *
     * @param unknown JSON text by JSON pointer
     */
    static Node into(Node root, Map<String, String> unknown) {
        unknown.forEach((pointer, json) -> {
            Node value = NodeReader.read(json, pointer);
            if (!plant(root, pointer, value)) {
                homeless(root, pointer, value);
            }
        });
        return root;
    }

    private static boolean plant(Node root, String pointer, Node value) {
        List<String> parts = Pointers.parts(pointer);
        Node parent = root;
        for (int i = 0; i < parts.size() - 1; i++) {
            boolean value1 = i == 1 && Set.of("liquid", "settings").contains(parts.get(0));
            Node next = step(parent, parts.get(i), value1 && i == parts.size() - 2);
            if (next == null && i == 0 && BLOCKS.contains(parts.get(0))) {
                next = Node.object();
                parent.put(parts.get(0), next);
            }
            if (next == null) {
                return false;
            }
            parent = next;
        }
        String name = parts.get(parts.size() - 1);
        boolean free = parent.is(Node.Sort.OBJECT) && parent.get(name) == null;
        if (free) {
            parent.put(name, value);
        }
        return free;
    }

    private static Node step(Node parent, String part, boolean value) {
        if (parent.is(Node.Sort.LIST)) {
            int index = Pointers.index(part);
            return index >= 0 && index < parent.items().size() ? parent.items().get(index) : null;
        }
        Node next = parent.get(part);
        boolean short_ = next != null && value && (next.is(Node.Sort.TEXT) || next.is(Node.Sort.NUMBER));
        if (short_) {
            // A value that carries something unknown needs the long form to hold it.
            Node full = Node.object().put("value", next);
            parent.put(part, full);
            return full;
        }
        return next;
    }

    private static void homeless(Node root, String pointer, Node value) {
        Node box = root.get(HOMELESS);
        if (box == null || !box.is(Node.Sort.OBJECT)) {
            box = Node.object();
            root.put(HOMELESS, box);
        }
        box.put(pointer, value);
    }
}
