package slantfall.store;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import slantfall.quantity.UnitSystem;

/** Preferences are remembered; a broken file costs nothing but them. */
class PreferencesTest {

    @TempDir
    Path folder;

    @Test
    void theyComeBack() {
        Preferences preferences = Preferences.initial()
                .opened(folder.resolve("a.json"))
                .opened(folder.resolve("b.json"))
                .in(UnitSystem.US)
                .with("theme", "dark");
        Path file = folder.resolve("preferences.json");
        preferences.write(file);
        Preferences back = Preferences.read(file).preferences();
        assertThat(back).isEqualTo(preferences);
        assertThat(back.recent()).containsExactly(folder.resolve("b.json").toString(), folder.resolve("a.json").toString());
        assertThat(back.last()).isEqualTo(folder.resolve("b.json").toString());
        assertThat(back.theme()).isEqualTo("dark");
    }

    @Test
    void aFileOpenedAgainMovesToTheFrontAndTheListStaysShort() {
        Preferences preferences = Preferences.initial();
        for (int i = 0; i < 30; i++) {
            preferences = preferences.opened(folder.resolve("f" + i % 20));
        }
        assertThat(preferences.recent()).hasSize(Preferences.MOST_RECENT).doesNotHaveDuplicates();
        assertThat(preferences.recent().get(0)).endsWith("f9");
    }

    @Test
    void aMissingFileIsAFirstStartAndABrokenOneIsTold() throws IOException {
        Path file = folder.resolve("preferences.json");
        assertThat(Preferences.read(file)).isEqualTo(new Preferences.Opened(Preferences.initial(), java.util.List.of()));
        for (String broken : java.util.List.of("", "{", "[]", "{\"recent\": 3}", "{\"units\": \"CGS\"}", "{\"words\": {\"theme\": 1}}")) {
            Files.writeString(file, broken);
            Preferences.Opened opened = Preferences.read(file);
            assertThat(opened.preferences()).isEqualTo(Preferences.initial());
            assertThat(opened.reports()).singleElement().asString().contains("set back", "preferences.json");
        }
    }

    @Test
    void aFolderThatIsMissingIsTold() {
        assertThatThrownBy(() -> Preferences.initial().write(folder.resolve("none/preferences.json")))
                .isInstanceOf(StoreProblem.class)
                .hasMessageContaining("is missing");
    }
}
