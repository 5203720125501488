package slantfall.store;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.catchThrowableOfType;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;

/** Every bad file gets one message that names file, place and remedy. */
class HostileFilesTest {

    private static final String FILM = "{\"slantfall\": 1, \"arrangement\": \"inclined-film\", ";

    @TempDir
    Path folder;

    /** Content, then what the message must say: place, what is wrong, what to do. */
    static Stream<Arguments> texts() {
        return Stream.of(
                row("empty", "", "bad.json", "empty", "backup"),
                row("blank", " \n ", "bad.json", "empty", "backup"),
                row("cut off", "{\"slantfall\": 1,\n \"title\": \"x", "line 2", "cut off", "backup"),
                row("cut off after a member", "{\"slantfall\": 1", "line 1", "cut off", "backup"),
                row("comma too many", "{\"slantfall\": 1,}", "line 1, column 17", "no valid JSON", "comma"),
                row("two values", "{\"slantfall\": 1} {}", "column 18", "follows after the end", "Delete"),
                row("comment", "{\"slantfall\": 1} // x", "column 18", "no valid JSON", "Look for"),
                row("single quotes", "{'slantfall': 1}", "column 2", "no valid JSON", "quote"),
                row("not a number", "{\"slantfall\": 1, \"x\": NaN}", "column 26", "NaN", "Leave the value out"),
                row("infinite", "{\"slantfall\": 1, \"x\": -Infinity}", "column 32", "Infinity", "Leave the value out"),
                row("deep lists", "[".repeat(101) + "]".repeat(101), "column 102", "nested more than 100", "check what wrote"),
                row("deep objects", "{\"a\":".repeat(5000), "line 1", "nested more than 100", "check what wrote"),
                row("long number", "{\"x\": " + "9".repeat(5000) + "}", "line 1", "400 digits", "Shorten"),
                row("zero byte", "{\"slantfall\": 1, \"title\": \"a\0b\"}", "line 1", "control character", "quote"),
                row("a list", "[1]", "line 1, column 1", "must be an object", "key"),
                row("a text", "\"slantfall\"", "line 1, column 1", "must be an object", "key"),
                row("no version", "{\"arrangement\": \"inclined-film\"}", "line 1", "\"slantfall\" is missing", "Add"),
                row("newer version", "{\"slantfall\": 2}", "slantfall", "newer Slantfall", "nothing was changed"),
                row("version 0", "{\"slantfall\": 0}", "slantfall", "no format 0", "Write 1"),
                row("version as text", "{\"slantfall\": \"1\"}", "slantfall", "whole number", "Write 1"),
                row("version with decimals", "{\"slantfall\": 1.5}", "slantfall", "whole number", "Write 1"),
                row("no arrangement", "{\"slantfall\": 1}", "line 1", "\"arrangement\" is missing", "closed-slot"),
                row("no such arrangement", "{\"slantfall\": 1,\n\"arrangement\": \"slot\"}", "line 2", "\"slot\"", "closed-slot"),
                row("title is a number", FILM + "\"title\": 3}", "title", "must be a text", "quotes"),
                row("notes are null", FILM + "\"notes\": null}", "notes", "must be a text", "quotes"),
                row("no such liquid", film("", "\"preset\": \"watr\""), "liquid.preset", "\"watr\"", "glycerol-water"),
                row("liquid is a text", FILM + "\"liquid\": \"water\"}", "liquid", "must be an object", "key"),
                row("strength above 1", film("", "\"preset\": \"sucrose-water\", \"strength\": \"120 %\""),
                        "liquid.strength", "120", "."),
                row("cSt without density", film("", "\"viscosity\": \"45 cSt\""), "liquid.viscosity", "density", "."),
                row("one point", film("", "\"viscosityPoints\": [[\"20 degC\", \"1 Pa s\"]]"),
                        "viscosityPoints", "2 to 10", "pairs"),
                row("eleven points", film("", "\"viscosityPoints\": [" + "[\"20 degC\", \"1 Pa s\"],".repeat(10)
                        + "[\"20 degC\", \"1 Pa s\"]]"), "viscosityPoints", "11", "pairs"),
                row("a point of three", film("", "\"viscosityPoints\": [[\"20 degC\", \"1 Pa s\", 3]]"),
                        "viscosityPoints[0]", "a temperature and a viscosity", "pairs"),
                row("no such fit", film("", "\"viscosityPoints\": [[\"20 degC\", \"1 Pa s\"], [\"40 degC\", \"1 Pa s\"]], "
                        + "\"viscosityFit\": \"line\""), "viscosityFit", "\"line\"", "andrade or vft"),
                row("fit without points", film("", "\"viscosityFit\": \"vft\""), "viscosityFit", "needs", "Add the points"),
                row("rheology to come", film("", "\"rheology\": {\"model\": \"cross\", \"exponent\": 1}"),
                        "liquid.rheology.model", "\"cross\" is not computed yet", "newtonian"),
                row("settings are a list", FILM + "\"settings\": []}", "settings", "must be an object", "key"),
                row("no unit", settings("\"width\": 3"), "settings.width", "no unit", "3 m"),
                row("wrong unit", settings("\"width\": \"3 kg\""), "settings.width", "kg", "m"),
                row("nonsense", settings("\"width\": \"wide\""), "settings.width", "wide", "."),
                row("empty text", settings("\"width\": \"\""), "settings.width", "", "."),
                row("null", settings("\"width\": null"), "settings.width", "null", "NUMBER UNIT"),
                row("true", settings("\"width\": true"), "settings.width", "true or false", "NUMBER UNIT"),
                row("bare list", settings("\"width\": [1]"), "settings.width", "a list", "NUMBER UNIT"),
                row("negative", settings("\"width\": \"-1 m\""), "settings.width", "must be more than 0 m", "Change"),
                row("zero", settings("\"width\": \"0 m\""), "settings.width", "must be more than 0 m", "Change"),
                row("too steep", settings("\"angle\": \"120 deg\""), "settings.angle", "must be at most 90", "Change"),
                row("infinite number", settings("\"width\": \"1e400 m\""), "settings.width", "too large", "exponent"),
                row("infinite bare number", settings("\"visibleGrowth\": 1e400"), "settings.visibleGrowth", "large", "."),
                row("ambiguous", settings("\"width\": \"1,234 m\""), "settings.width", "could mean", "."),
                row("endless text", settings("\"width\": \"" + "9".repeat(100_000) + "\""), "settings.width", "longer", "Type"),
                row("no such option", settings("\"thicknessLaw\": \"brauwer\""), "settings.thicknessLaw", "brauwer", "brauer"),
                row("option as number", settings("\"thicknessLaw\": 1"), "settings.thicknessLaw", "text", "quotes"),
                row("liquid among settings", settings("\"liquid.viscosity\": \"1 cP\""), "settings.liquid.viscosity",
                        "belongs to the liquid", "Move it"),
                row("repeated key", settings("\"width\": \"1 m\",\n\"width\": \"2 m\""), "line 2", "twice, first in line 1", "Delete"),
                row("repeated unknown key", FILM + "\"a\": 1, \"a\": 1}", "a", "twice", "Delete"),
                row("neither value nor range", settings("\"width\": {\"shape\": \"uniform\"}"), "settings.width", "neither", "range"),
                row("both spreads", settings("\"width\": {\"value\": \"1 m\", \"plusMinus\": \"1 mm\", \"range\": [\"1 m\", \"2 m\"]}"),
                        "settings.width.range", "both", "Keep one"),
                row("range of three", settings("\"width\": {\"range\": [\"1 m\", \"2 m\", \"3 m\"]}"), "width.range", "not 3", "[from, to]"),
                row("range upside down", settings("\"width\": {\"range\": [\"2 m\", \"1 m\"]}"), "width.range", "above its end", "Swap"),
                row("value outside its range", settings("\"width\": {\"value\": \"3 m\", \"range\": [\"1 m\", \"2 m\"]}"),
                        "settings.width.value", "outside its range", "Widen"),
                row("range beyond the possible", settings("\"angle\": {\"range\": [\"20 deg\", \"100 deg\"]}"),
                        "settings.angle.range[1]", "at most 90", "Change"),
                row("negative plus-or-minus", settings("\"width\": {\"value\": \"1 m\", \"plusMinus\": \"-1 mm\"}"),
                        "settings.width.plusMinus", "negative", "zero or more"),
                row("no such shape", settings("\"width\": {\"value\": \"1 m\", \"plusMinus\": \"1 mm\", \"shape\": \"round\"}"),
                        "settings.width.shape", "round", "uniform"),
                row("shape of nothing", settings("\"width\": {\"value\": \"1 m\", \"shape\": \"normal\"}"),
                        "settings.width.shape", "needs", "leave the shape out"),
                row("requirements are an object", FILM + "\"requirements\": {}}", "requirements", "must be a list", "reading"),
                row("requirement without reading", requirement("\"atMost\": \"1 m\""), "requirements[0]", "missing", "Name the reading"),
                row("requirement on nothing known", requirement("\"reading\": \"thicknes\", \"atMost\": \"1 m\""),
                        "requirements[0].reading", "thicknes", "did you mean \"thickness\""),
                row("requirement without bound", requirement("\"reading\": \"thickness\""), "requirements[0]", "atLeast", "Change"),
                row("bounds upside down", requirement("\"reading\": \"thickness\", \"atLeast\": \"2 mm\", \"atMost\": \"1 mm\""),
                        "requirements[0]", "greater than", "Change"),
                row("bound of another kind", requirement("\"reading\": \"thickness\", \"atMost\": \"2 s\""),
                        "requirements[0].atMost", "time", "."),
                row("negative margin", requirement("\"reading\": \"thickness\", \"atMost\": \"2 mm\", \"margin\": \"-5 %\""),
                        "requirements[0]", "margin", "Change"),
                row("requirement twice", FILM + "\"requirements\": [{\"reading\": \"thickness\", \"atMost\": \"2 mm\"},\n"
                        + "{\"reading\": \"thickness\", \"atLeast\": \"1 mm\"}]}", "line 2", "second requirement", "into one"),
                row("no such panel", FILM + "\"houseRules\": {\"regimes\": {\"rule\": \"x\"}}}", "houseRules.regimes",
                        "regimes", "did you mean \"regime\""),
                row("no such rule", FILM + "\"houseRules\": {\"regime\": {\"rule\": \"regime.nobody\"}}}",
                        "houseRules.regime.rule", "regime.nobody", "brauer"),
                row("rule of another panel", FILM + "\"houseRules\": {\"regime\": {\"rule\": \"onset.benjamin-1957-yih-1963\"}}}",
                        "houseRules.regime.rule", "onset", "regime."),
                row("correlation of two", FILM + "\"correlations\": [[\"feed\", 0.5]]}", "correlations[0]", "two keys", "0.7"),
                row("correlation with itself", FILM + "\"correlations\": [[\"feed\", \"feed\", 0.5]]}", "correlations[0]", "different", "0.7"),
                row("correlation above 1", FILM + "\"correlations\": [[\"feed\", \"width\", 1.5]]}", "correlations[0][2]",
                        "between -1 and 1", "Change"),
                row("correlation of nothing", FILM + "\"correlations\": [[\"feed\", \"wdth\", 0.5]]}", "correlations[0][1]", "wdth",
                        "did you mean \"width\""));
    }

    private static Arguments row(String name, String text, String place, String what, String remedy) {
        return Arguments.of(name, text, place, what, remedy);
    }

    private static String film(String more, String liquid) {
        return FILM + more + "\"liquid\": {" + liquid + "}}";
    }

    private static String settings(String settings) {
        return FILM + "\"settings\": {" + settings + "}}";
    }

    private static String requirement(String requirement) {
        return FILM + "\"requirements\": [{" + requirement + "}]}";
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("texts")
    void isRefusedWithPlaceAndRemedy(String name, String text, String place, String what, String remedy) throws IOException {
        Path file = Files.writeString(folder.resolve("bad.json"), text);
        says(file, place, what, remedy);
    }

    private static void says(Path file, String place, String what, String remedy) {
        StoreProblem problem = catchThrowableOfType(StoreProblem.class, () -> ProjectFile.read(file));
        assertThat(problem).isNotNull();
        assertThat(problem.getMessage())
                .startsWith(file.getFileName().toString())
                .contains(place, what, remedy)
                .hasSizeLessThan(900)
                .doesNotContain("\n", "com.fasterxml", "Exception");
        assertThat(problem.place().file()).isEqualTo(file.getFileName().toString());
    }

    @Test
    void otherEncodingsAreRefusedWithTheRemedy() throws IOException {
        Path wide = Files.write(folder.resolve("wide.json"), "\uFEFF{\"slantfall\": 1}".getBytes(StandardCharsets.UTF_16LE));
        says(wide, "wide.json", "UTF-16", "UTF-8");
        Path bare = Files.write(folder.resolve("bare.json"), "{\"slantfall\": 1}".getBytes(StandardCharsets.UTF_16BE));
        says(bare, "bare.json", "UTF-16", "UTF-8");
        Path latin = Files.write(folder.resolve("latin.json"),
                "{\"slantfall\": 1,\n \"title\": \"é\"}".getBytes(StandardCharsets.ISO_8859_1));
        says(latin, "line 2, column 12", "0xE9", "UTF-8");
    }

    @Test
    void theByteOrderMarkOfUtf8IsDropped() throws IOException {
        Path file = Files.writeString(folder.resolve("marked.json"), "\uFEFF" + FILM + "\"title\": \"é\"}");
        assertThat(ProjectFile.read(file).setUp().title()).isEqualTo("é");
    }

    @Test
    void aFileThatIsTooLargeIsNotReadIn() throws IOException {
        Path file = Files.write(folder.resolve("large.json"), new byte[50 * 1024 * 1024]);
        says(file, "large.json", "larger than 4 MB", "check what wrote");
    }

    @Test
    void whatIsNoFileIsRefused() throws IOException {
        says(Files.createDirectory(folder.resolve("folder.json")), "folder.json", "is a folder", "Name a file");
        says(folder.resolve("missing.json"), "missing.json", "no such file", folder.toString());
        Path file = Files.writeString(folder.resolve("file"), "x");
        says(file.resolve("below.json"), "below.json", "could not be read", "Check the name");
    }

    @Test
    void aLongNameOrKeyIsShortened() throws IOException {
        Path file = Files.writeString(folder.resolve("bad.json"), FILM + "\"settings\": {\"" + "k".repeat(2000) + "\": 1}}");
        assertThat(ProjectFile.read(file).reports()).allSatisfy(r -> assertThat(r).hasSizeLessThan(300));
    }
}
