package slantfall.store;

import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.core.StreamReadFeature;
import com.fasterxml.jackson.databind.DeserializationFeature;
import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.json.JsonMapper;
import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import slantfall.proof.Inputs;
import slantfall.proof.ProofResult;
import slantfall.proof.PublishedRow;
import slantfall.proof.PublishedRow.Expected;

/**
 * Published values in and out of JSON.
 *
 * <p>A rows file is a list of objects with {@code id, quantity, inputs, expected, rel_tol, abs_tol, source, mark, note,
 * outOfRange}; {@code expected} is a number, a list or a table. A file that is no such list is refused as a whole; a row
 * that is not understood is kept with what is wrong with it, so that the others are still proved.
 */
public final class ProofRows {

    /** The files that the program carries, one per section of the theory pages. */
    private static final List<String> SHIPPED = List.of("film.json", "regimes.json", "slot.json", "liquids.json");

    /** Far above any table of check values; keeps a wrong file from filling the memory [byte]. */
    private static final long LARGEST = 16L << 20;

    private static final JsonMapper JSON = JsonMapper.builder()
            .enable(StreamReadFeature.STRICT_DUPLICATE_DETECTION)
            .enable(DeserializationFeature.FAIL_ON_TRAILING_TOKENS)
            .build();

    private ProofRows() {}

    /** The published values that the program carries. */
    public static List<PublishedRow> shipped() {
        List<PublishedRow> rows = new ArrayList<>();
        for (String name : SHIPPED) {
            rows.addAll(shipped(name));
        }
        return rows;
    }

    private static List<PublishedRow> shipped(String name) {
        try (InputStream in = ProofRows.class.getResourceAsStream("/proof/" + name)) {
            if (in == null) {
                throw new IllegalStateException("the program's file proof/" + name + " is missing");
            }
            return parse(in.readAllBytes(), "proof/" + name);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    /**
     * The rows of a file.
     *
     * @param file path
     * @throws IllegalArgumentException with file, place and remedy, if it cannot be read as a list of rows
     */
    public static List<PublishedRow> read(Path file) {
        if (Files.isDirectory(file)) {
            throw new IllegalArgumentException(file + " is a directory; name a rows file in it.");
        }
        if (!Files.exists(file)) {
            throw new IllegalArgumentException(file + " does not exist; check the path.");
        }
        try {
            long size = Files.size(file);
            if (size > LARGEST) {
                throw new IllegalArgumentException(file + " has " + (size >> 20) + " MB; a rows file may have at most "
                        + (LARGEST >> 20) + " MB. Split it.");
            }
            return parse(Files.readAllBytes(file), file.toString());
        } catch (IOException e) {
            throw new UncheckedIOException(file + " cannot be read: " + e.getMessage(), e);
        }
    }

    private static List<PublishedRow> parse(byte[] bytes, String name) {
        JsonNode root;
        try {
            root = JSON.readTree(bytes);
        } catch (JsonProcessingException e) {
            String where = e.getLocation() == null ? "" : ", line " + e.getLocation().getLineNr();
            throw new IllegalArgumentException(
                    name + where + " is not JSON: " + e.getOriginalMessage() + ". Correct it there.", e);
        } catch (IOException e) {
            throw new IllegalArgumentException(name + " is not UTF-8 text: " + e.getMessage() + ". Save it as UTF-8.", e);
        }
        if (!root.isArray()) {
            throw new IllegalArgumentException(name + " holds " + what(root) + "; a rows file is a list [ {...}, ... ].");
        }
        List<PublishedRow> rows = new ArrayList<>();
        for (int i = 0; i < root.size(); i++) {
            rows.add(row(root.get(i), i + 1));
        }
        return rows;
    }

    private static PublishedRow row(JsonNode node, int position) {
        List<String> problems = new ArrayList<>();
        if (!node.isObject()) {
            problems.add("row " + position + " is " + what(node) + "; a row is an object");
        } else if (!node.path("id").isTextual() || node.path("id").textValue().isBlank()) {
            problems.add("row " + position + " has no id; give it its family and place as text");
        }
        List<Expected> expected = expected(node.path("expected"), problems);
        return new PublishedRow(
                node.path("id").asText("").trim(),
                node.path("quantity").asText(""),
                inputs(node.path("inputs"), problems),
                expected,
                tolerance(node, problems),
                new PublishedRow.Origin(
                        node.path("source").asText(""),
                        node.path("mark").asText(""),
                        node.path("note").asText(""),
                        node.path("outOfRange").asBoolean(false)),
                String.join("; ", problems));
    }

    private static Inputs inputs(JsonNode node, List<String> problems) {
        Map<String, double[]> numbers = new LinkedHashMap<>();
        Map<String, String> others = new LinkedHashMap<>();
        if (!node.isObject() && !node.isMissingNode() && problems.isEmpty()) {
            problems.add("inputs is " + what(node) + "; inputs are an object of names and numbers");
        }
        for (Map.Entry<String, JsonNode> field : node.properties()) {
            JsonNode value = field.getValue();
            if (value.isNumber()) {
                numbers.put(field.getKey(), new double[] {value.doubleValue()});
            } else if (value.isArray() && !value.isEmpty() && allNumbers(value)) {
                double[] list = new double[value.size()];
                for (int i = 0; i < list.length; i++) {
                    list[i] = value.get(i).doubleValue();
                }
                numbers.put(field.getKey(), list);
            } else {
                others.put(field.getKey(), what(value));
            }
        }
        return new Inputs(numbers, others);
    }

    private static boolean allNumbers(JsonNode list) {
        for (JsonNode value : list) {
            if (!value.isNumber()) {
                return false;
            }
        }
        return true;
    }

    private static List<Expected> expected(JsonNode node, List<String> problems) {
        List<Expected> expected = new ArrayList<>();
        if (node.isArray()) {
            for (int i = 0; i < node.size(); i++) {
                add(expected, Integer.toString(i), node.get(i), problems);
            }
        } else if (node.isObject()) {
            node.properties().forEach(e -> add(expected, e.getKey(), e.getValue(), problems));
        } else {
            add(expected, "", node, problems);
        }
        if (expected.isEmpty() && problems.isEmpty()) {
            problems.add("expected holds no number; give a number, a list or a table of numbers");
        }
        return expected;
    }

    private static void add(List<Expected> expected, String place, JsonNode value, List<String> problems) {
        String name = place.isEmpty() ? "expected" : "expected[" + place + "]";
        if (!value.isNumber()) {
            if (problems.isEmpty()) {
                problems.add(name + " is " + what(value) + "; a number is needed");
            }
        } else if (!Double.isFinite(value.doubleValue())) {
            problems.add(name + " is too large for a number");
        }
        expected.add(new Expected(place, value.doubleValue()));
    }

    private static PublishedRow.Tolerance tolerance(JsonNode row, List<String> problems) {
        double relative = bound(row, "rel_tol", problems);
        double absolute = bound(row, "abs_tol", problems);
        if (Double.isNaN(relative) && Double.isNaN(absolute) && problems.isEmpty()) {
            problems.add("no tolerance; give rel_tol or abs_tol");
        }
        return new PublishedRow.Tolerance(relative, absolute);
    }

    private static double bound(JsonNode row, String name, List<String> problems) {
        JsonNode node = row.path(name);
        if (node.isMissingNode() || node.isNull()) {
            return Double.NaN;
        }
        double value = node.isNumber() ? node.doubleValue() : Double.NaN;
        if (!(value >= 0 && Double.isFinite(value)) && problems.isEmpty()) {
            problems.add(name + " is " + (node.isNumber() ? node.asText() : what(node)) + "; a number of 0 or more is needed");
        }
        return value;
    }

    private static String what(JsonNode node) {
        switch (node.getNodeType()) {
            case MISSING:
                return "missing";
            case NULL:
                return "null";
            case STRING:
                return "text";
            case BOOLEAN:
                return "true or false";
            case ARRAY:
                return node.isEmpty() ? "an empty list" : "a list";
            case OBJECT:
                return "a table";
            default:
                return "a number";
        }
    }

    /** The result as JSON; numbers that do not exist are null. */
    public static String json(ProofResult result) {
        ObjectNode root = JSON.createObjectNode();
        ArrayNode rows = root.putArray("rows");
        for (ProofResult.Row row : result.rows()) {
            ObjectNode node = rows.addObject();
            node.put("id", row.id());
            node.put("quantity", row.quantity());
            node.put("source", row.source());
            node.put("mark", row.mark());
            put(node, "expected", row.expected());
            put(node, "obtained", row.obtained());
            put(node, "deviation", row.deviation());
            put(node, "tolerance", row.tolerance());
            node.put("absolute", row.absolute());
            node.put("ok", row.ok());
            if (!row.reason().isEmpty()) {
                node.put("reason", row.reason());
            }
        }
        result.unknown().forEach(root.putArray("unknown")::add);
        try {
            return JSON.writerWithDefaultPrettyPrinter().writeValueAsString(root);
        } catch (JsonProcessingException e) {
            throw new UncheckedIOException(e);
        }
    }

    private static void put(ObjectNode node, String name, double value) {
        if (Double.isFinite(value)) {
            node.put(name, value);
        } else {
            node.putNull(name);
        }
    }
}
