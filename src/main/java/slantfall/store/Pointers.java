package slantfall.store;

import java.util.ArrayList;
import java.util.List;

/** JSON pointers (RFC 6901): the address of a value in a file. */
final class Pointers {

    private Pointers() {}

    /** The address of a member or item. */
    static String child(String pointer, String name) {
        return pointer + "/" + name.replace("~", "~0").replace("/", "~1");
    }

    /** The names on the way, from the outside in. */
    static List<String> parts(String pointer) {
        List<String> parts = new ArrayList<>();
        if (!pointer.isEmpty()) {
            for (String part : pointer.substring(1).split("/", -1)) {
                parts.add(part.replace("~1", "/").replace("~0", "~"));
            }
        }
        return parts;
    }

    /** The place in a list that a name stands for, -1 if it is no such number. */
    static int index(String part) {
        return part.matches("0|[1-9]\\d{0,6}") ? Integer.parseInt(part) : -1;
    }
}
