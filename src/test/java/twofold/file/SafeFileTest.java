package twofold.file;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.junit.jupiter.api.Assumptions.assumeTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.attribute.FileTime;
import java.nio.file.attribute.PosixFilePermissions;
import java.time.Instant;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

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
        assumeTrue(isPosix(), "permissions of owner, group and others are of POSIX file systems");
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
            Files.createFile(
                    folder.resolve(".design.json." + ProcessHandle.current().pid() + "-" + i + ".part"));
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
        assumeTrue(
                file.toFile().setReadOnly() && !Files.isWritable(file),
                "an administrator can write a write-protected file, so that nothing is refused");
        assertThatThrownBy(() -> SafeFile.write(file, NEW)).hasMessage("it is write-protected");
        assertThat(file).hasBinaryContent(OLD);
    }

    @Test
    void aFullDiskIsSaid() throws IOException {
        // The one device that is always full; elsewhere there is none to try with.
        Path full = Path.of("/dev/full");
        assumeTrue(Files.exists(full), "a device that is always full is found on Linux alone");
        assertThatThrownBy(() -> SafeFile.write(full, NEW))
                .isInstanceOf(IOException.class)
                .hasMessage("No space left on device");
    }

    @Test
    void whatAKilledProgramLeftBesideIsTidiedAway() throws IOException {
        Path file = folder.resolve("design.json");
        // No process has the number, for none has one so large.
        Path dead = Files.createFile(folder.resolve(".design.json.999999999999-0.part"));
        // Older than this process, which has the number now.
        Path old = Files.createFile(
                folder.resolve(".design.json." + ProcessHandle.current().pid() + "-0.part"));
        Files.setLastModifiedTime(old, FileTime.from(Instant.parse("2001-01-01T00:00:00Z")));
        Path live = Files.createFile(
                folder.resolve(".design.json." + ProcessHandle.current().pid() + "-1.part"));
        Path other = Files.createFile(folder.resolve(".other.json.999999999999-0.part"));
        SafeFile.write(file, NEW);
        assertThat(dead).doesNotExist();
        assertThat(old).doesNotExist();
        assertThat(inFolder()).containsExactlyInAnyOrder(file, live, other);
    }

    @ParameterizedTest
    @EnumSource
    void whicheverOperationFailsAFileIsWhole(FaultyDisk.Fault fault) throws IOException {
        Path file = folder.resolve("design.json");
        Path link = Files.createSymbolicLink(folder.resolve("link"), file);
        int failed = 0;
        for (boolean isThere : List.of(true, false)) {
            for (int operation = 0; ; operation++) {
                for (Path each : inFolder()) {
                    if (!each.equals(link)) {
                        Files.delete(each);
                    }
                }
                if (isThere) {
                    Files.write(file, OLD);
                }
                FaultyDisk disk = new FaultyDisk(operation, fault);
                Optional<String> said = Optional.empty();
                try {
                    SafeFile.write(disk, link, NEW);
                } catch (IOException e) {
                    said = Optional.of(String.valueOf(e.getMessage()));
                }
                if (!disk.hasFailed()) {
                    assertThat(file).hasBinaryContent(NEW);
                    break;
                }
                String what = fault + " at operation " + operation;
                boolean isNew = Files.exists(file) && Arrays.equals(Files.readAllBytes(file), NEW);
                if (said.isEmpty()) {
                    assertThat(isNew).as(what + ", which does not matter").isTrue();
                } else {
                    failed++;
                    assertThat(said.get()).as(what).contains(FaultyDisk.WORDS);
                    if (!isNew && isThere) {
                        assertThat(file).as(what).hasBinaryContent(OLD);
                    } else if (!isNew) {
                        assertThat(file).as(what).doesNotExist();
                    } else {
                        assertThat(fault == FaultyDisk.Fault.AFTER || said.get().startsWith("it was written"))
                                .as("%s: only what failed once it was in its place may leave it new", what)
                                .isTrue();
                    }
                }
                if (fault != FaultyDisk.Fault.FROM_HERE_ON && fault != FaultyDisk.Fault.AFTER) {
                    assertThat(inFolder()).as(what + ": nothing is left beside").isSubsetOf(file, link);
                }
                // A disk that works again has the file.
                SafeFile.write(link, NEW);
                assertThat(file).hasBinaryContent(NEW);
            }
        }
        assertThat(failed).as("operations that failed the writing").isGreaterThanOrEqualTo(9);
    }
}
