package slantfall.build;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;

/** Size limits of the build: file 400 lines, method 60, parameters 6. */
class SizeTest {

    private static final int FILE = 400;
    private static final int METHOD = 60;
    private static final int PARAMETERS = 6;

    /** Exceptions, each with its reason. */
    private static final Map<String, String> LONGER = Map.of();

    /** A method head as we write them: four or more spaces, modifiers or type, name, parameters, brace. */
    private static final Pattern HEAD =
            Pattern.compile("^ {4,12}(?:[\\w<>\\[\\],.?@]+ )+(\\w+)\\(([^;{}]*)\\)(?: throws [\\w., ]+)? \\{$", Pattern.MULTILINE);

    @Test
    void filesAreShort() throws IOException {
        List<String> long_ = new ArrayList<>();
        for (Path file : sources()) {
            long lines = Files.readString(file).lines().count();
            if (lines > FILE && !LONGER.containsKey(file.getFileName().toString())) {
                long_.add(file.getFileName() + ": " + lines);
            }
        }
        assertThat(long_).isEmpty();
    }

    @Test
    void methodsAreShortAndTakeFewParameters() throws IOException {
        List<String> offending = new ArrayList<>();
        for (Path file : sources()) {
            String text = Files.readString(file);
            Matcher head = HEAD.matcher(text);
            while (head.find()) {
                String where = file.getFileName() + " " + head.group(1);
                if (head.group().trim().startsWith("record ") || head.group().contains(" record ")) {
                    continue;
                }
                int parameters = count(head.group(2));
                int lines = lines(text, head.end());
                if (parameters > PARAMETERS) {
                    offending.add(where + ": " + parameters + " parameters");
                }
                if (lines > METHOD) {
                    offending.add(where + ": " + lines + " lines");
                }
            }
        }
        assertThat(offending).isEmpty();
    }

    @Test
    void everyPackageSaysWhatItIsFor() throws IOException {
        List<Path> missing = new ArrayList<>();
        for (Path file : sources()) {
            Path folder = file.getParent();
            boolean root = folder.endsWith("slantfall");
            if (!root && !Files.exists(folder.resolve("package-info.java")) && !missing.contains(folder)) {
                missing.add(folder);
            }
        }
        assertThat(missing).isEmpty();
    }

    private static int count(String parameters) {
        if (parameters.isBlank()) {
            return 0;
        }
        int depth = 0;
        int commas = 0;
        for (char c : parameters.toCharArray()) {
            depth += c == '<' ? 1 : c == '>' ? -1 : 0;
            commas += c == ',' && depth == 0 ? 1 : 0;
        }
        return commas + 1;
    }

    private static int lines(String text, int from) {
        int depth = 1;
        int lines = 0;
        for (int i = from; i < text.length() && depth > 0; i++) {
            char c = text.charAt(i);
            depth += c == '{' ? 1 : c == '}' ? -1 : 0;
            lines += c == '\n' ? 1 : 0;
        }
        return lines;
    }

    private static List<Path> sources() throws IOException {
        try (Stream<Path> walk = Files.walk(Path.of("src/main/java"))) {
            return walk.filter(p -> p.toString().endsWith(".java")).toList();
        }
    }
}
