package twofold.file;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.junit.jupiter.api.Assumptions.assumeTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.attribute.PosixFilePermissions;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class SafeFileTest {
    private static final byte[] OLD = "old".getBytes(StandardCharsets.UTF_8);
    private static final byte[] NEW = "new, and longer".getBytes(StandardCharsets.UTF_8);

    @TempDir
    private Path folder;

    private List<Path> inFolder() throws IOException {
        try (Stream<Path> files = Files.list(folder)) {
            return files.sorted().toList();
        }
    }

    private boolean isPosix() {
        return folder.getFileSystem().supportedFileAttributeViews().contains("posix");
    }

    @Test
    void aFileIsMadeAndReplacedAndNothingIsLeftBeside() throws IOException {
        Path file = folder.resolve("design.json");
        SafeFile.write(file, OLD);
        assertThat(file).hasBinaryContent(OLD);
        SafeFile.write(file, NEW);
        assertThat(file).hasBinaryContent(NEW);
        assertThat(inFolder()).containsExactly(file);
        assertThat(SafeFile.read(file, 3)).isEqualTo("new".getBytes(StandardCharsets.UTF_8));
    }

    @Test
    void aFileWithoutAFolderInItsNameIsWrittenWhereTheProgramRuns() throws IOException {
        Path file = Path.of("safe-file-test-" + ProcessHandle.current().pid() + ".json");
        try {
            SafeFile.write(file, NEW);
            assertThat(file).hasBinaryContent(NEW);
        } finally {
            Files.deleteIfExists(file);
        }
    }

    @Test
    void linksStayAndTheirTargetIsReplaced() throws IOException {
        Path file = folder.resolve("design.json");
        Path link = folder.resolve("link");
        Path linkToLink = folder.resolve("link to link");
        Files.write(file, OLD);
        Files.createSymbolicLink(link, Path.of("design.json"));
        Files.createSymbolicLink(linkToLink, link);
        SafeFile.write(linkToLink, NEW);
        assertThat(file).hasBinaryContent(NEW);
        assertThat(link).isSymbolicLink();
        assertThat(linkToLink).isSymbolicLink();
        assertThat(Files.isSymbolicLink(file)).isFalse();
        assertThat(inFolder()).containsExactlyInAnyOrder(file, link, linkToLink);
    }

    @Test
    void aLinkToNothingMakesItsTarget() throws IOException {
        Path link = Files.createSymbolicLink(folder.resolve("link"), Path.of("design.json"));
        SafeFile.write(link, NEW);
        assertThat(link).isSymbolicLink();
        assertThat(folder.resolve("design.json")).hasBinaryContent(NEW);
    }

    @Test
    void linksInACircleAreRefused() throws IOException {
        Path one = folder.resolve("one");
        Files.createSymbolicLink(one, Path.of("two"));
        Files.createSymbolicLink(folder.resolve("two"), Path.of("one"));
        assertThatThrownBy(() -> SafeFile.write(one, NEW))
                .isInstanceOf(IOException.class)
                .hasMessage("its symbolic links go in a circle");
    }

    @Test
    void permissionsStay() throws IOException {
        assumeTrue(isPosix());
        Path file = folder.resolve("design.json");
        Files.write(file, OLD);
        Files.setPosixFilePermissions(file, PosixFilePermissions.fromString("rw-rw----"));
        SafeFile.write(file, NEW);
        assertThat(PosixFilePermissions.toString(Files.getPosixFilePermissions(file)))
                .isEqualTo("rw-rw----");
        Path usual = Files.createFile(folder.resolve("usual"));
        Path fresh = folder.resolve("fresh");
        SafeFile.write(fresh, NEW);
        assertThat(Files.getPosixFilePermissions(fresh)).isEqualTo(Files.getPosixFilePermissions(usual));
    }

    @Test
    void whatCannotBeWrittenIsSaidAndTheOldFileStays() throws IOException {
        assertThatThrownBy(() -> SafeFile.write(folder, NEW)).hasMessage("it is a folder");
        Path nowhere = folder.resolve("none").resolve("design.json");
        assertThatThrownBy(() -> SafeFile.write(nowhere, NEW))
                .isInstanceOf(IOException.class)
                .hasMessage("there is no folder " + nowhere.getParent());
        // Writing beside fails where all names are taken.
        Path file = folder.resolve("design.json");
        Files.write(file, OLD);
        for (int i = 0; i < 100; i++) {
            Files.createFile(folder.resolve(".design.json." + i + ".part"));
        }
        assertThatThrownBy(() -> SafeFile.write(file, NEW))
                .isInstanceOf(IOException.class)
                .hasMessage("there are 100 unfinished copies of it in its folder");
        assertThat(file).hasBinaryContent(OLD);
    }

    @Test
    void aWriteProtectedFileIsRefused() throws IOException {
        Path file = folder.resolve("design.json");
        Files.write(file, OLD);
        assumeTrue(file.toFile().setReadOnly() && !Files.isWritable(file), "not for an administrator");
        assertThatThrownBy(() -> SafeFile.write(file, NEW)).hasMessage("it is write-protected");
        assertThat(file).hasBinaryContent(OLD);
    }

    @Test
    void aFullDiskIsSaid() throws IOException {
        // The one device that is always full; elsewhere there is none to try with.
        Path full = Path.of("/dev/full");
        assumeTrue(Files.exists(full));
        assertThatThrownBy(() -> SafeFile.write(full, NEW))
                .isInstanceOf(IOException.class)
                .hasMessage("No space left on device");
    }
}
