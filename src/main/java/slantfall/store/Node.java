package slantfall.store;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/**
 * A value of a JSON text with the place it stood at. Numbers keep the characters they were written with, so that what is
 * not understood goes back as it came. Objects and lists can be added to while a text is built.
 */
final class Node {

    /** What a value is. */
    enum Sort {
        OBJECT("an object {…}"),
        LIST("a list […]"),
        TEXT("a text"),
        NUMBER("a number"),
        WORD("true or false"),
        NOTHING("null");

        private final String words;

        Sort(String words) {
            this.words = words;
        }

        /** For messages. */
        String words() {
            return words;
        }
    }

    private static final Place NOWHERE = Place.of("");

    private final Sort sort;
    private final String text;
    private final Place place;
    private final Map<String, Node> members = new LinkedHashMap<>();
    private final List<Node> items = new ArrayList<>();
    private Place keyPlace;

    Node(Sort sort, String text, Place place) {
        this.sort = sort;
        this.text = text;
        this.place = place;
        this.keyPlace = place;
    }

    /** Notes where the key of this member stands. */
    Node keyedAt(Place at) {
        keyPlace = at;
        return this;
    }

    /** Where the key of this member stands; the place of the value itself if it has none. */
    Place keyPlace() {
        return keyPlace;
    }

    /** An empty object. */
    static Node object() {
        return new Node(Sort.OBJECT, "", NOWHERE);
    }

    /** An empty list. */
    static Node list() {
        return new Node(Sort.LIST, "", NOWHERE);
    }

    /** A text. */
    static Node text(String text) {
        return new Node(Sort.TEXT, text, NOWHERE);
    }

    /** A number with every digit; null where it is not finite, since JSON has no such number. */
    static Node number(double value) {
        return Double.isFinite(value) ? literal(Double.toString(value)) : nothing();
    }

    /** A whole number. */
    static Node whole(long value) {
        return literal(Long.toString(value));
    }

    /** A number written with these characters. */
    static Node literal(String characters) {
        return new Node(Sort.NUMBER, characters, NOWHERE);
    }

    /** True or false. */
    static Node word(boolean value) {
        return new Node(Sort.WORD, Boolean.toString(value), NOWHERE);
    }

    /** Null. */
    static Node nothing() {
        return new Node(Sort.NOTHING, "null", NOWHERE);
    }

    /** A list of texts. */
    static Node texts(List<String> texts) {
        Node list = list();
        texts.forEach(t -> list.add(text(t)));
        return list;
    }

    Sort sort() {
        return sort;
    }

    boolean is(Sort other) {
        return sort == other;
    }

    /** The text, or the characters of a number or word. */
    String text() {
        return text;
    }

    Place place() {
        return place;
    }

    Map<String, Node> members() {
        return members;
    }

    List<Node> items() {
        return items;
    }

    /** The member of a name, null if there is none. */
    Node get(String name) {
        return members.get(name);
    }

    /** Adds or replaces a member. */
    Node put(String name, Node value) {
        members.put(name, value);
        return this;
    }

    /** Adds or replaces a member that is a text. */
    Node put(String name, String value) {
        return put(name, text(value));
    }

    /** Adds or replaces a member that is a number; null where it is not finite. */
    Node put(String name, double value) {
        return put(name, number(value));
    }

    /** Adds an item. */
    Node add(Node value) {
        items.add(value);
        return this;
    }

    /** A problem with this value. */
    StoreProblem problem(String what, String remedy) {
        return new StoreProblem(place, what, remedy);
    }
}
