package twofold.file;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.attribute.PosixFilePermissions;
import java.util.Optional;

/**
 * The unsaved work of a running program, kept on the disk so that a crash loses nothing: entries, each with a checksum and
 * flushed to the disk before {@link #keep} returns, one after another in a file that is begun anew when it grows large. What
 * a program leaves there when it ends without {@link #close} is found by {@link UnsavedWork}.
 *
 * <p>Confined to a thread, or used by one after another.
 */
public final class Journal implements AutoCloseable {
    /** A journal that would become larger is begun anew, bytes. */
    static final long MOST_BYTES = 1_000_000;

    private final Disk disk;
    private final Path folder;
    private Optional<JournalLock> lock = Optional.empty();
    private long size;

    /**
     * A journal of which nothing is on the disk yet.
     *
     * @param folder shared by all running programs; made where it lacks, for the person alone
     */
    public Journal(Path folder) {
        this(Disk.REAL, folder);
    }

    Journal(Disk disk, Path folder) {
        this.disk = disk;
        this.folder = folder;
    }

    /**
     * Keeps unsaved work, in place of what was kept before.
     *
     * @throws IOException with a message for a person; what was kept before is still kept
     */
    public void keep(JournalEntry entry) throws IOException {
        try {
            Path file = held().journal();
            byte[] next = entry.next();
            if (size == 0 || size + next.length > MOST_BYTES) {
                byte[] first = entry.first();
                SafeFile.write(disk, file, first);
                size = first.length;
            } else {
                disk.write(file, size, next);
                size += next.length;
            }
        } catch (IOException e) {
            // Whatever the file holds now, the next entry begins it anew.
            size = 0;
            throw new IOException(SafeFile.reason(e), e);
        }
    }

    private JournalLock held() throws IOException {
        if (lock.isEmpty()) {
            if (folder.getFileSystem().supportedFileAttributeViews().contains("posix")) {
                Files.createDirectories(
                        folder, PosixFilePermissions.asFileAttribute(PosixFilePermissions.fromString("rwx------")));
            } else {
                Files.createDirectories(folder);
            }
            lock = Optional.of(JournalLock.create(folder));
        }
        return lock.get();
    }

    /** Forgets what was kept: there is no unsaved work. */
    public void clear() throws IOException {
        size = 0;
        if (lock.isPresent()) {
            disk.delete(lock.get().journal());
        }
    }

    /** Forgets what was kept and ends the journal: the program ends as the person asked. */
    @Override
    public void close() throws IOException {
        size = 0;
        if (lock.isPresent()) {
            JournalLock held = lock.get();
            lock = Optional.empty();
            held.remove();
        }
    }
}
