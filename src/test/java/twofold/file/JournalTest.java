package twofold.file;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.junit.jupiter.api.Assumptions.assumeTrue;

import java.io.IOException;
import java.nio.ByteBuffer;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.attribute.PosixFilePermissions;
import java.time.Instant;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.stream.Stream;
import java.util.zip.CRC32C;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import twofold.RandomDesigns;
import twofold.design.Design;

class JournalTest {
    @TempDir
    private Path root;

    @SuppressWarnings("NullAway.Init") // set before each test
    private Path folder;

    @BeforeEach
    void choose() {
        folder = root.resolve("state").resolve("twofold");
    }

    private static JournalEntry entry(long seed) {
        return new JournalEntry(
                Instant.ofEpochMilli(1_700_000_000_000L + seed),
                "mine " + seed + ".json",
                seed % 2 == 0 ? Optional.empty() : Optional.of(Path.of("a folder", "mine\n" + seed + ".json")),
                Set.of(Fingerprint.of(new byte[] {99}), Fingerprint.of(new byte[] {(byte) seed})),
                RandomDesigns.of(seed));
    }

    private List<Path> files(String end) throws IOException {
        if (!Files.isDirectory(folder)) {
            return List.of();
        }
        try (Stream<Path> all = Files.list(folder)) {
            return all.filter(f -> f.toString().endsWith(end)).sorted().toList();
        }
    }

    /** The file of the journal that this process keeps. */
    private Path file() throws IOException {
        return files(".journal").stream()
                .filter(f -> !f.getFileName().toString().startsWith("1-1-"))
                .findFirst()
                .orElseThrow();
    }

    /** A journal's bytes as those of a program that is gone. */
    private void leave(String name, byte[] bytes) throws IOException {
        Files.createDirectories(folder);
        Files.write(folder.resolve(name + ".journal"), bytes);
    }

    private List<JournalEntry> found() throws IOException {
        List<JournalEntry> entries = new ArrayList<>();
        for (UnsavedWork work : UnsavedWork.in(folder)) {
            entries.add(work.entry());
            work.close();
        }
        return entries;
    }

    @Test
    void theLastEntryIsFound() throws IOException {
        try (Journal journal = new Journal(folder)) {
            for (long seed = 1; seed <= 9; seed++) {
                journal.keep(entry(seed));
            }
            assertThat(found())
                    .as("a program's own journal is not offered to itself")
                    .isEmpty();
            leave("1-1-0", Files.readAllBytes(file()));
            assertThat(found()).containsExactly(entry(9));
            assertThat(DesignWriter.bytes(found().get(0).design())).isEqualTo(DesignWriter.bytes(RandomDesigns.of(9)));
        }
    }

    @Test
    void whatWasFoundIsDiscardedOrStays() throws IOException {
        try (Journal journal = new Journal(folder)) {
            journal.keep(entry(1));
            leave("1-1-0", Files.readAllBytes(file()));
            journal.keep(entry(2));
            leave("1-1-1", Files.readAllBytes(file()));
        }
        List<UnsavedWork> works = UnsavedWork.in(folder);
        assertThat(works).extracting(UnsavedWork::entry).as("the newest first").containsExactly(entry(2), entry(1));
        assertThat(works.get(0).title()).isEqualTo(RandomDesigns.of(2).title());
        assertThat(UnsavedWork.in(folder)).as("held already").isEmpty();
        works.get(0).discard();
        works.get(1).close();
        assertThat(found()).containsExactly(entry(1));
        assertThat(files(".journal")).hasSize(1);
    }

    @Test
    void aCleanEndLeavesNothing() throws IOException {
        Journal journal = new Journal(folder);
        journal.clear();
        journal.close();
        assertThat(files("")).as("nothing was kept").isEmpty();
        journal.keep(entry(1));
        journal.clear();
        assertThat(files(".journal")).isEmpty();
        journal.keep(entry(2));
        leave("1-1-0", Files.readAllBytes(file()));
        assertThat(found()).containsExactly(entry(2));
        Files.delete(folder.resolve("1-1-0.journal"));
        journal.close();
        assertThat(files(".journal")).isEmpty();
        assertThat(found()).isEmpty();
        assertThat(files("")).as("locks that nobody holds are tidied away").isEmpty();
    }

    @Test
    void aTornEntryIsIgnoredWhereverItIsTorn() throws IOException {
        byte[] whole;
        int first;
        try (Journal journal = new Journal(folder)) {
            journal.keep(entry(4));
            first = (int) Files.size(file());
            journal.keep(entry(3));
            whole = Files.readAllBytes(file());
        }
        for (int length = first; length < whole.length; length += length < first + 20 ? 1 : 7) {
            assertThat(JournalEntry.last(Arrays.copyOf(whole, length)).map(JournalEntry::name))
                    .as("%d of %d bytes", length, whole.length)
                    .contains("mine 4.json");
        }
        for (int at = first; at < whole.length; at += at < first + 20 ? 1 : 7) {
            byte[] spoiled = whole.clone();
            spoiled[at] ^= 0x10;
            assertThat(JournalEntry.last(spoiled).map(JournalEntry::name))
                    .as("byte %d is another", at)
                    .contains("mine 4.json");
        }
        assertThat(JournalEntry.last(whole).map(JournalEntry::name)).contains("mine 3.json");
        leave("1-1-0", Arrays.copyOf(whole, whole.length - 1));
        leave("1-1-1", Arrays.copyOf(whole, first - 1));
        leave("1-1-2", new byte[0]);
        assertThat(found()).containsExactly(entry(4));
        assertThat(files(".journal"))
                .as("of which nothing is whole, it is deleted")
                .hasSize(1);
    }

    @Test
    void aJournalStaysSmall() throws IOException {
        try (Journal journal = new Journal(folder)) {
            long largest = 0;
            long total = 0;
            for (int i = 0; total < 4 * Journal.MOST_BYTES; i++) {
                JournalEntry entry = entry(i % 40);
                journal.keep(entry);
                total += entry.next().length;
                largest = Math.max(largest, Files.size(file()));
                if (i % 50 == 0) {
                    assertThat(JournalEntry.last(Files.readAllBytes(file()))).contains(entry);
                }
            }
            assertThat(largest).isLessThanOrEqualTo(Journal.MOST_BYTES);
            assertThat(files("")).as("the journal and its lock").hasSize(2);
        }
    }

    @ParameterizedTest
    @EnumSource(mode = EnumSource.Mode.EXCLUDE, names = "FROM_HERE_ON")
    void whicheverOperationFailsSomethingIsStillKept(FaultyDisk.Fault fault) throws IOException {
        for (int operation = 0; ; operation++) {
            FaultyDisk disk = new FaultyDisk(operation, fault);
            try (Journal journal = new Journal(disk, folder)) {
                Optional<JournalEntry> kept = Optional.empty();
                for (long seed = 1; seed <= 3; seed++) {
                    try {
                        journal.keep(entry(seed));
                        kept = Optional.of(entry(seed));
                    } catch (IOException e) {
                        assertThat(e).hasMessageContaining(FaultyDisk.WORDS);
                        Optional<JournalEntry> left = files(".journal").isEmpty()
                                ? Optional.empty()
                                : JournalEntry.last(Files.readAllBytes(file()));
                        // Told as failed, it may yet have been written.
                        assertThat(left).isIn(kept, Optional.of(entry(seed)));
                    }
                }
                if (disk.hasFailed()) {
                    // One failure is mended by the next entry.
                    journal.keep(entry(4));
                    assertThat(JournalEntry.last(Files.readAllBytes(file()))).contains(entry(4));
                }
            }
            if (!disk.hasFailed()) {
                assertThat(operation).as("operations").isGreaterThan(5);
                return;
            }
        }
    }

    @Test
    void aJournalThatCannotBeWrittenSaysWhy() throws IOException {
        Files.createDirectories(root.resolve("state"));
        Files.writeString(folder, "a file where the folder should be");
        Journal journal = new Journal(folder);
        assertThatThrownBy(() -> journal.keep(entry(1)))
                .isInstanceOf(IOException.class)
                .hasMessage("there is a file in the way: " + folder);
        journal.clear();
        journal.close();
    }

    @Test
    void whatALaterVersionLeftStaysForIt() throws IOException {
        try (Journal journal = new Journal(folder)) {
            journal.keep(entry(1));
            byte[] bytes = Files.readAllBytes(file());
            byte[] text = DesignWriter.bytes(RandomDesigns.of(1));
            // The same frame and checksum around a design that this version refuses.
            JournalEntry later = entry(1);
            byte[] spoiled = later.next();
            int at = spoiled.length - text.length;
            String words =
                    new String(spoiled, at, text.length, StandardCharsets.UTF_8).replace("twofold/1", "twofold/9");
            System.arraycopy(words.getBytes(StandardCharsets.UTF_8), 0, spoiled, at, text.length);
            CRC32C checksum = new CRC32C();
            checksum.update(spoiled, 8, spoiled.length - 8);
            ByteBuffer.wrap(spoiled).putInt(4, (int) checksum.getValue());
            byte[] all = Arrays.copyOf(bytes, bytes.length + spoiled.length);
            System.arraycopy(spoiled, 0, all, bytes.length, spoiled.length);
            leave("1-1-0", all);
            assertThat(found()).isEmpty();
            assertThat(folder.resolve("1-1-0.journal")).hasBinaryContent(all);
        }
    }

    @Test
    void theFolderIsThePersonsAlone() throws IOException {
        assumeTrue(
                root.getFileSystem().supportedFileAttributeViews().contains("posix"),
                "permissions of owner, group and others are of POSIX file systems");
        try (Journal journal = new Journal(folder)) {
            journal.keep(entry(1));
            assertThat(PosixFilePermissions.toString(Files.getPosixFilePermissions(folder)))
                    .isEqualTo("rwx------");
        }
    }

    @Test
    void stateLiesWhereThePlatformHasIt() {
        assertThat(Folders.state(Map.of(), "/home/eve", "Linux")).isEqualTo(Path.of("/home/eve/.local/state/twofold"));
        assertThat(Folders.state(Map.of("XDG_STATE_HOME", "/var/eve"), "/home/eve", "Linux"))
                .isEqualTo(Path.of("/var/eve/twofold"));
        assertThat(Folders.state(Map.of("XDG_STATE_HOME", "here"), "/home/eve", "Linux"))
                .as("a relative folder is ignored")
                .isEqualTo(Path.of("/home/eve/.local/state/twofold"));
        assertThat(Folders.state(Map.of(), "/Users/eve", "Mac OS X"))
                .isEqualTo(Path.of("/Users/eve/Library/Application Support/twofold"));
        assertThat(Folders.state(Map.of(), "/eve", "Windows 11")).isEqualTo(Path.of("/eve/AppData/Local/twofold"));
        assertThat(Folders.state(Map.of("LOCALAPPDATA", "/local"), "/eve", "Windows 11"))
                .isEqualTo(Path.of("/local/twofold"));
    }

    @Test
    void fingerprintsTellBytesApart() {
        // FIPS 180-4's own example: "abc".
        assertThat(Fingerprint.of(new byte[] {'a', 'b', 'c'}).sha256())
                .isEqualTo("ba7816bf8f01cfea414140de5dae2223b00361a396177a9cb410ff61f20015ad");
        Design design = RandomDesigns.of(1);
        assertThat(Fingerprint.of(DesignWriter.bytes(design)))
                .isNotEqualTo(Fingerprint.of(DesignWriter.bytes(RandomDesigns.of(2))));
    }
}
