package slantfall.store;

import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonLocation;
import com.fasterxml.jackson.core.JsonParser;
import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.core.JsonToken;
import com.fasterxml.jackson.core.StreamReadConstraints;
import com.fasterxml.jackson.core.exc.StreamConstraintsException;
import com.fasterxml.jackson.core.io.JsonEOFException;
import java.io.IOException;

/** Reads one JSON text into nodes that know their place. Repeated keys, deep nesting and a second value are refused. */
final class NodeReader {

    /** Objects and lists within each other. */
    static final int DEEPEST = 100;

    private static final int LONGEST_NUMBER = 400;
    private static final JsonFactory FACTORY = JsonFactory.builder()
            .streamReadConstraints(StreamReadConstraints.builder()
                    .maxNestingDepth(DEEPEST)
                    .maxNumberLength(LONGEST_NUMBER)
                    .build())
            .build();

    private final String file;
    private final JsonParser parser;

    private NodeReader(String file, JsonParser parser) {
        this.file = file;
        this.parser = parser;
    }

    /**
     * Reads a text.
     *
     * @param file name for messages
     * @throws StoreProblem where it is no JSON
     */
    static Node read(String text, String file) {
        if (text.isBlank()) {
            throw new StoreProblem(Place.of(file), "the file is empty", "Open its backup " + file + "~ or start anew");
        }
        try (JsonParser parser = FACTORY.createParser(text)) {
            return read(new NodeReader(file, parser));
        } catch (IOException e) {
            throw new StoreProblem(Place.of(file), "could not be read: " + e.getMessage(), "Try again", e);
        }
    }

    private static Node read(NodeReader reader) throws IOException {
        try {
            return reader.whole();
        } catch (JsonProcessingException e) {
            throw reader.problem(e);
        }
    }

    private Node whole() throws IOException {
        parser.nextToken();
        Node node = value("");
        if (parser.nextToken() != null) {
            throw new StoreProblem(here(""), "something follows after the end", "Delete what stands after the last }");
        }
        return node;
    }

    private Node value(String pointer) throws IOException {
        JsonToken token = parser.currentToken();
        Place place = here(pointer);
        return switch (token) {
            case START_OBJECT -> object(new Node(Node.Sort.OBJECT, "", place));
            case START_ARRAY -> list(new Node(Node.Sort.LIST, "", place));
            case VALUE_STRING -> new Node(Node.Sort.TEXT, parser.getText(), place);
            case VALUE_NUMBER_INT, VALUE_NUMBER_FLOAT -> new Node(Node.Sort.NUMBER, parser.getText(), place);
            case VALUE_TRUE, VALUE_FALSE -> new Node(Node.Sort.WORD, parser.getText(), place);
            case VALUE_NULL -> new Node(Node.Sort.NOTHING, "null", place);
            default -> throw new IllegalStateException("unexpected token " + token);
        };
    }

    private Node object(Node object) throws IOException {
        while (parser.nextToken() != JsonToken.END_OBJECT) {
            String name = parser.currentName();
            Place place = here(Pointers.child(object.place().pointer(), name));
            Node former = object.get(name);
            if (former != null) {
                throw new StoreProblem(place, "the key stands twice, first in line " + former.keyPlace().line(),
                        "Delete or rename one of the two");
            }
            parser.nextToken();
            object.put(name, value(place.pointer()).keyedAt(place));
        }
        return object;
    }

    private Node list(Node list) throws IOException {
        while (parser.nextToken() != JsonToken.END_ARRAY) {
            list.add(value(Pointers.child(list.place().pointer(), Integer.toString(list.items().size()))));
        }
        return list;
    }

    private Place here(String pointer) {
        JsonLocation at = parser.currentTokenLocation();
        return new Place(file, at.getLineNr(), at.getColumnNr(), pointer);
    }

    private StoreProblem problem(JsonProcessingException e) {
        JsonLocation at = e.getLocation() == null ? parser.currentLocation() : e.getLocation();
        Place place = new Place(file, at.getLineNr(), at.getColumnNr(), "");
        if (e instanceof JsonEOFException) {
            return new StoreProblem(place, "the file ends in the middle: it was cut off",
                    "Open its backup " + Place.shortened(file) + "~ or complete it", e);
        }
        if (e instanceof StreamConstraintsException) {
            boolean deep = e.getOriginalMessage().contains("depth");
            return deep
                    ? new StoreProblem(place, "objects and lists are nested more than " + DEEPEST + " deep",
                            "A set-up needs five; check what wrote this file", e)
                    : new StoreProblem(place, "a number has more than " + LONGEST_NUMBER + " digits", "Shorten it", e);
        }
        return malformed(place, e);
    }

    private static StoreProblem malformed(Place place, JsonProcessingException e) {
        String said = e.getOriginalMessage().lines().findFirst().orElse("");
        if (said.contains("NON_NUMERIC")) {
            return new StoreProblem(place, "JSON has no NaN or Infinity", "Leave the value out where it is unknown", e);
        }
        if (said.contains("unquoted character")) {
            return new StoreProblem(place, "a line break or control character stands inside a text",
                    "Close the quote before it, or write it as \\n", e);
        }
        return new StoreProblem(place, "is no valid JSON: " + Place.shortened(said.replaceAll(" \\(code \\d+\\)", "")),
                "Look for a missing comma, quote or bracket just before", e);
    }
}
