package slantfall.bench.shell;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Optional;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import slantfall.bench.MemoryDisk;
import slantfall.bench.model.Desk;
import slantfall.bench.model.Pulse;
import slantfall.declare.SetUp;
import slantfall.declare.Value;
import slantfall.session.DirectScheduler;
import slantfall.session.Session;
import slantfall.store.Journal;

/** The life of a set-up on disk, with real files and no window. */
class FileLifeTest {

    @TempDir
    private Path folder;

    private StoreDesk disk;
    private Desk desk;
    private Notices notices;
    private FileLife files;
    private Path chosen;

    private final Chooser chooser = new Chooser() {
        @Override
        public Optional<Path> open() {
            return Optional.ofNullable(chosen);
        }

        @Override
        public Optional<Path> save(String suggestedName) {
            return Optional.ofNullable(chosen);
        }
    };

    @BeforeEach
    void start() {
        disk = new StoreDesk(folder.resolve("home"));
        files = life(disk);
    }

    private FileLife life(FileDesk on) {
        desk = new Desk(new Session(MemoryDisk.film()), Pulse.atOnce());
        notices = new Notices();
        return new FileLife(desk, on, chooser, notices, new DirectScheduler());
    }

    private void edit() {
        desk.session().set("feed", Value.typed(0.25, "0.25 kg/(m s)"), null);
    }

    private void answer(String words) {
        notices.currentProperty().get().answers().stream()
                .filter(a -> a.words().equals(words))
                .findFirst()
                .orElseThrow()
                .action()
                .run();
    }

    @Test
    void savedAndOpenedAgainItIsTheSame() {
        edit();
        chosen = folder.resolve("a.slantfall.json");
        assertThat(files.save()).isTrue();
        SetUp saved = desk.session().current();
        assertThat(desk.dirtyProperty().get()).isFalse();
        files.example(disk.examples().get(1));
        files.open(chosen);
        assertThat(desk.setUp().values()).isEqualTo(saved.values());
        assertThat(desk.setUp().requirements()).isEqualTo(saved.requirements());
        assertThat(disk.preferences().recent()).containsExactly(chosen.toAbsolutePath().toString());
    }

    @Test
    void theTitleShowsWhatIsNotSaved() {
        assertThat(desk.titleProperty().get()).isEqualTo("Rinse wall – Slantfall");
        edit();
        assertThat(desk.titleProperty().get()).startsWith("● ");
    }

    @Test
    void unsavedWorkIsNotLeftWithoutAWord() {
        edit();
        files.blank("closed-slot");
        assertThat(desk.setUp().arrangement()).isEqualTo("inclined-film");
        assertThat(notices.currentProperty().get().text()).contains("not saved");
        answer("Stay here");
        assertThat(desk.setUp().values().get("feed").si()).isEqualTo(0.25);
        files.blank("closed-slot");
        answer("Leave them");
        assertThat(desk.setUp().arrangement()).isEqualTo("closed-slot");
        assertThat(notices.currentProperty().get()).isNull();
    }

    @Test
    void saveFirstThenGoOn() {
        edit();
        chosen = folder.resolve("kept.slantfall.json");
        files.blank("closed-slot");
        answer("Save first");
        assertThat(chosen).exists();
        assertThat(desk.setUp().arrangement()).isEqualTo("closed-slot");
    }

    @Test
    void aChangeOnDiskIsNoticedAndNotOverwritten() throws Exception {
        chosen = folder.resolve("b.slantfall.json");
        files.saveAs();
        String theirs = Files.readString(chosen).replace("Rinse wall", "Their wall");
        Files.writeString(chosen, theirs);
        files.look();
        assertThat(notices.currentProperty().get().text()).contains("changed on disk");
        edit();
        assertThat(files.save()).isFalse();
        assertThat(Files.readString(chosen)).isEqualTo(theirs);
        answer("Open what is on disk");
        assertThat(desk.setUp().title()).isEqualTo("Their wall");
    }

    @Test
    void savingOverItIsPossibleWhenSaid() throws Exception {
        chosen = folder.resolve("c.slantfall.json");
        files.saveAs();
        Files.writeString(chosen, Files.readString(chosen).replace("Rinse wall", "Their wall"));
        edit();
        files.save();
        answer("Save over it");
        assertThat(Files.readString(chosen)).contains("Rinse wall").contains("0.25 kg/(m s)");
        assertThat(desk.dirtyProperty().get()).isFalse();
    }

    @Test
    void aFileThatCannotBeReadLeavesEverythingAsItWas() throws Exception {
        Path broken = Files.writeString(folder.resolve("broken.slantfall.json"), "{\"slantfall\": 1, ");
        SetUp before = desk.session().current();
        files.open(broken);
        assertThat(desk.session().current()).isEqualTo(before);
        assertThat(notices.currentProperty().get().problem()).isTrue();
        assertThat(notices.currentProperty().get().text()).contains("broken.slantfall.json");
    }

    @Test
    void aSaveThatFailsSaysSoAndOffersAnotherPlace() {
        chosen = folder.resolve("no/such/folder/x.slantfall.json");
        edit();
        assertThat(files.save()).isFalse();
        assertThat(notices.currentProperty().get().problem()).isTrue();
        assertThat(desk.dirtyProperty().get()).isTrue();
        chosen = folder.resolve("d.slantfall.json");
        answer("Save as …");
        assertThat(chosen).exists();
    }

    @Test
    void editsAreInTheJournalAtOnceAndGoneAfterSaving() throws Exception {
        edit();
        Path journal = onlyJournal();
        assertThat(Journal.last(journal).orElseThrow().setUp().values().get("feed").si()).isEqualTo(0.25);
        chosen = folder.resolve("e.slantfall.json");
        files.save();
        assertThat(journal).doesNotExist();
    }

    @Test
    void whatAKillLeftBehindComesBackUnsaved() throws Exception {
        chosen = folder.resolve("f.slantfall.json");
        files.saveAs();
        edit();
        Path left = Files.copy(onlyJournal(), folder.resolve("home/journal/1-dead.slantfall-journal"));
        disk.forget();
        FileLife next = life(new StoreDesk(folder.resolve("home")));
        next.start();
        assertThat(desk.setUp().values().get("feed").si()).isEqualTo(0.25);
        assertThat(desk.session().file()).isEqualTo(chosen);
        assertThat(desk.dirtyProperty().get()).isTrue();
        assertThat(notices.currentProperty().get().text()).contains("back");
        desk.session().undo();
        assertThat(desk.setUp().values().get("feed").si()).isEqualTo(0.1);
        assertThat(left).doesNotExist();
    }

    @Test
    void theLastFileOpensAgain() {
        chosen = folder.resolve("g.slantfall.json");
        files.saveAs();
        files.end();
        life(new StoreDesk(folder.resolve("home"))).start();
        assertThat(desk.session().file()).isEqualTo(chosen);
    }

    @Test
    void theFirstStartOpensAnExample() {
        files.start();
        assertThat(desk.session().file()).isNull();
        assertThat(desk.setUp().title()).isNotBlank();
        assertThat(desk.dirtyProperty().get()).isFalse();
    }

    @Test
    void theEndKeepsUnsavedWorkForTheNextStart() {
        edit();
        files.end();
        assertThat(folder.resolve("home/journal")).isDirectoryContaining("glob:**.slantfall-journal");
        assertThat(folder.resolve("home/preferences.json")).exists();
    }

    private Path onlyJournal() throws Exception {
        try (var all = Files.list(folder.resolve("home/journal"))) {
            return all.findFirst().orElseThrow();
        }
    }
}
