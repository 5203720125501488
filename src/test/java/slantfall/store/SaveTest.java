package slantfall.store;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.IOException;
import java.nio.file.AccessDeniedException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.attribute.PosixFilePermissions;
import java.util.Arrays;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import slantfall.declare.SetUp;
import slantfall.declare.Value;

/** A save leaves the old or the new file, whole, and tells when somebody else has been at it. */
class SaveTest {

    /** A disk that takes half of the content and then is full. */
    private static final Disk FULL = (fresh, content) -> {
        Files.write(fresh, Arrays.copyOf(content, content.length / 2));
        throw new IOException("No space left on device");
    };

    @TempDir
    Path folder;

    private Path file;
    private SetUp first;
    private SetUp second;

    @BeforeEach
    void prepare() {
        file = folder.resolve("plant.slantfall.json");
        first = SetUp.blank("inclined-film", Presets.load().initial()).titled("first");
        second = first.titled("second").with("feed", Value.typed(0.25, "0.25 kg/(m s)"));
    }

    private List<String> names() throws IOException {
        try (Stream<Path> list = Files.list(folder)) {
            return list.map(p -> p.getFileName().toString()).sorted().toList();
        }
    }

    @Test
    void theFormerContentIsKeptOnce() throws IOException {
        ProjectFile.save(file, first);
        assertThat(names()).containsExactly("plant.slantfall.json");
        ProjectFile.save(file, second);
        ProjectFile.save(file, second.titled("third"));
        assertThat(names()).containsExactly("plant.slantfall.json", "plant.slantfall.json~");
        assertThat(ProjectFile.read(file).setUp().title()).isEqualTo("third");
        assertThat(ProjectFile.read(folder.resolve("plant.slantfall.json~")).setUp()).isEqualTo(second);
    }

    @Test
    void aFullDiskChangesNothing() throws IOException {
        ProjectFile.save(file, first);
        String before = Files.readString(file);
        assertThatThrownBy(() -> ProjectFile.saveThrough(file, second, new AtomicFile(FULL)))
                .isInstanceOf(StoreProblem.class)
                .hasMessageContaining("plant.slantfall.json")
                .hasMessageContaining("No space left on device; the former file is unchanged")
                .hasMessageContaining("Make room");
        assertThat(Files.readString(file)).isEqualTo(before);
        assertThat(names()).containsExactly("plant.slantfall.json");
    }

    @Test
    void aDiskThatFillsUpAfterTheBackupChangesNothing() throws IOException {
        ProjectFile.save(file, first);
        String before = Files.readString(file);
        Disk secondTime = new Disk() {
            private int writes;

            @Override
            public void write(Path fresh, byte[] content) throws IOException {
                writes++;
                (writes < 2 ? Disk.real() : FULL).write(fresh, content);
            }
        };
        assertThatThrownBy(() -> ProjectFile.saveThrough(file, second, new AtomicFile(secondTime))).isInstanceOf(StoreProblem.class);
        assertThat(Files.readString(file)).isEqualTo(before);
        assertThat(names()).containsExactly("plant.slantfall.json", "plant.slantfall.json~");
    }

    @Test
    void withoutPermissionNothingIsWritten() throws IOException {
        Disk closed = (fresh, content) -> {
            throw new AccessDeniedException(fresh.toString());
        };
        assertThatThrownBy(() -> ProjectFile.saveThrough(file, first, new AtomicFile(closed)))
                .isInstanceOf(StoreProblem.class)
                .hasMessageContaining("may not be written here")
                .hasMessageContaining("another folder");
        assertThat(names()).isEmpty();
    }

    @Test
    void aTargetThatIsNoFileIsRefused() throws IOException {
        assertThatThrownBy(() -> ProjectFile.save(folder, first))
                .isInstanceOf(StoreProblem.class)
                .hasMessageContaining("is a folder");
        assertThatThrownBy(() -> ProjectFile.save(folder.resolve("none/plant.json"), first))
                .isInstanceOf(StoreProblem.class)
                .hasMessageContaining("is missing");
        Path plain = Files.writeString(folder.resolve("plain"), "x");
        assertThatThrownBy(() -> ProjectFile.save(plain.resolve("plant.json"), first))
                .isInstanceOf(StoreProblem.class)
                .hasMessageContaining("is a file, not a folder");
    }

    @Test
    void aChangeBySomebodyElseIsNoticed() throws IOException {
        FileStamp written = ProjectFile.save(file, first);
        ProjectFile.Opened opened = ProjectFile.read(file);
        assertThat(opened.stamp()).isEqualTo(written);
        Files.writeString(file, ProjectFile.write(first.titled("theirs")));
        assertThatThrownBy(() -> ProjectFile.save(file, second, opened.stamp()))
                .isInstanceOf(StoreProblem.class)
                .hasMessageContaining("somebody else has changed the file")
                .hasMessageContaining("overwrite");
        assertThat(ProjectFile.read(file).setUp().title()).isEqualTo("theirs");
        ProjectFile.save(file, second);
        assertThat(ProjectFile.read(file).setUp()).isEqualTo(second);
        assertThat(ProjectFile.read(folder.resolve("plant.slantfall.json~")).setUp().title()).isEqualTo("theirs");
    }

    @Test
    void aFileMerelyTouchedOrGoneIsNoObstacle() throws IOException {
        FileStamp stamp = ProjectFile.save(file, first);
        Files.setLastModifiedTime(file, java.nio.file.attribute.FileTime.fromMillis(1));
        FileStamp next = ProjectFile.save(file, second, stamp);
        Files.delete(file);
        ProjectFile.save(file, first, next);
        assertThat(ProjectFile.read(file).setUp()).isEqualTo(first);
    }

    @Test
    void aNewNameDoesNotOverwriteByAccident() {
        ProjectFile.save(file, first, null);
        assertThatThrownBy(() -> ProjectFile.save(file, second, null))
                .isInstanceOf(StoreProblem.class)
                .hasMessageContaining("exists already");
        assertThat(ProjectFile.read(file).setUp()).isEqualTo(first);
    }

    @Test
    void aLinkStaysALinkAndPermissionsStay() throws IOException {
        ProjectFile.save(file, first);
        Files.setPosixFilePermissions(file, PosixFilePermissions.fromString("rw-r-----"));
        Path link = Files.createSymbolicLink(folder.resolve("link.json"), file);
        ProjectFile.save(link, second);
        assertThat(link).isSymbolicLink();
        assertThat(ProjectFile.read(file).setUp()).isEqualTo(second);
        assertThat(PosixFilePermissions.toString(Files.getPosixFilePermissions(file))).isEqualTo("rw-r-----");
    }

    @Test
    void theStampIsTheContents() {
        FileStamp stamp = ProjectFile.save(file, first);
        assertThat(stamp).isEqualTo(FileStamp.of(file));
        assertThat(stamp.size()).isEqualTo(ProjectFile.write(first).length());
        assertThat(stamp.sha256()).matches("[0-9a-f]{64}");
    }

    @Test
    void whatAKilledProgramLeftIsSweptAway() throws IOException {
        Path old = Files.writeString(folder.resolve(".plant.slantfall.json.1a2b.tmp"), "half");
        Path oldBackup = Files.writeString(folder.resolve(".plant.slantfall.json~.1a2b.tmp"), "half");
        Path young = Files.writeString(folder.resolve(".plant.slantfall.json.3c4d.tmp"), "half");
        Path other = Files.writeString(folder.resolve(".other.slantfall.json.1a2b.tmp"), "half");
        for (Path p : List.of(old, oldBackup, other)) {
            Files.setLastModifiedTime(p, java.nio.file.attribute.FileTime.fromMillis(1));
        }
        ProjectFile.save(file, first);
        assertThat(old).doesNotExist();
        assertThat(oldBackup).doesNotExist();
        assertThat(young).exists();
        assertThat(other).exists();
    }
}
