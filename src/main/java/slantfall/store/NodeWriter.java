package slantfall.store;

import java.util.Iterator;
import java.util.Map;

/** Writes nodes as JSON text: on one line, or indented with short objects and lists kept on theirs. */
final class NodeWriter {

    private static final int WIDTH = 110;

    private NodeWriter() {}

    /** On one line, without spaces to spare. */
    static String compact(Node node) {
        StringBuilder out = new StringBuilder();
        flat(node, out);
        return out.toString();
    }

    /** Indented, for people. */
    static String pretty(Node node) {
        StringBuilder out = new StringBuilder();
        tall(node, out, 0);
        return out.append('\n').toString();
    }

    private static void tall(Node node, StringBuilder out, int indent) {
        boolean open = node.is(Node.Sort.OBJECT) || node.is(Node.Sort.LIST);
        String flat = open && (indent > 0 || node.members().isEmpty() && node.items().isEmpty()) ? compact(node) : "";
        if (!open || !flat.isEmpty() && indent + flat.length() <= WIDTH) {
            flat(node, out);
            return;
        }
        boolean object = node.is(Node.Sort.OBJECT);
        out.append(object ? '{' : '[');
        String separator = "";
        for (Map.Entry<String, Node> member : node.members().entrySet()) {
            line(out.append(separator), indent + 1);
            quote(member.getKey(), out);
            tall(member.getValue(), out.append(": "), indent + 1);
            separator = ",";
        }
        for (Node item : node.items()) {
            line(out.append(separator), indent + 1);
            tall(item, out, indent + 1);
            separator = ",";
        }
        line(out, indent);
        out.append(object ? '}' : ']');
    }

    private static void line(StringBuilder out, int indent) {
        out.append('\n').append("  ".repeat(indent));
    }

    private static void flat(Node node, StringBuilder out) {
        switch (node.sort()) {
            case OBJECT -> flatObject(node, out);
            case LIST -> flatList(node, out);
            case TEXT -> quote(node.text(), out);
            default -> out.append(node.text());
        }
    }

    private static void flatObject(Node node, StringBuilder out) {
        out.append('{');
        Iterator<Map.Entry<String, Node>> members = node.members().entrySet().iterator();
        while (members.hasNext()) {
            Map.Entry<String, Node> member = members.next();
            quote(member.getKey(), out);
            flat(member.getValue(), out.append(": "));
            out.append(members.hasNext() ? ", " : "");
        }
        out.append('}');
    }

    private static void flatList(Node node, StringBuilder out) {
        out.append('[');
        Iterator<Node> items = node.items().iterator();
        while (items.hasNext()) {
            flat(items.next(), out);
            out.append(items.hasNext() ? ", " : "");
        }
        out.append(']');
    }

    private static void quote(String text, StringBuilder out) {
        out.append('"');
        for (int i = 0; i < text.length(); i++) {
            char c = text.charAt(i);
            switch (c) {
                case '"' -> out.append("\\\"");
                case '\\' -> out.append("\\\\");
                case '\n' -> out.append("\\n");
                case '\t' -> out.append("\\t");
                default -> character(text, i, out);
            }
        }
        out.append('"');
    }

    // Half of a surrogate pair has no bytes in UTF-8; line separators would break one-line journals in some readers.
    private static void character(String text, int i, StringBuilder out) {
        char c = text.charAt(i);
        boolean half = Character.isHighSurrogate(c) && (i + 1 == text.length() || !Character.isLowSurrogate(text.charAt(i + 1)))
                || Character.isLowSurrogate(c) && (i == 0 || !Character.isHighSurrogate(text.charAt(i - 1)));
        if (c < ' ' || half || c == '\u007f' || c == '\u0085' || c == '\u2028' || c == '\u2029') {
            out.append(String.format("\\u%04x", (int) c));
        } else {
            out.append(c);
        }
    }
}
