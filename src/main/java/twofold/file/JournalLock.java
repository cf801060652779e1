package twofold.file;

import java.io.IOException;
import java.nio.channels.FileChannel;
import java.nio.channels.FileLock;
import java.nio.channels.OverlappingFileLockException;
import java.nio.file.FileAlreadyExistsException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardOpenOption;
import java.time.Instant;
import java.util.Optional;

/**
 * The right to a journal: a locked file beside it, which the system unlocks when the process ends, however it ends. The
 * journal itself can so be replaced.
 *
 * <p>On POSIX a process loses its locks on a file once it closes any of its channels to it; so the file of a journal of this
 * process is never opened a second time ({@link #isOwn}).
 */
final class JournalLock implements AutoCloseable {
    static final String LOCK = ".lock";
    static final String JOURNAL = ".journal";
    private static final int MOST_TRIES = 100;

    private final Path folder;
    private final String name;
    private final FileChannel channel;

    private JournalLock(Path folder, String name, FileChannel channel) {
        this.folder = folder;
        this.name = name;
        this.channel = channel;
    }

    /** Begins the names of this process's journals: another process with the same number began at another time. */
    private static String own() {
        ProcessHandle process = ProcessHandle.current();
        long start = process.info().startInstant().map(Instant::toEpochMilli).orElse(0L);
        return process.pid() + "-" + start + "-";
    }

    static boolean isOwn(String name) {
        return name.startsWith(own());
    }

    /** A new journal's. */
    static JournalLock create(Path folder) throws IOException {
        for (int i = 0; i < MOST_TRIES; i++) {
            String name = own() + i;
            if (!Files.exists(folder.resolve(name + JOURNAL))) {
                Optional<JournalLock> lock = lock(folder, name, StandardOpenOption.CREATE_NEW);
                // Between making and locking it, another program may have taken it for one left behind, and deleted it.
                if (lock.isPresent() && Files.exists(lock.get().lockFile())) {
                    return lock.get();
                }
            }
        }
        throw new IOException("there are " + MOST_TRIES + " journals of this process in " + folder);
    }

    /** That of a journal that is there; empty where its program runs. */
    static Optional<JournalLock> claim(Path folder, String name) throws IOException {
        return lock(folder, name, StandardOpenOption.CREATE);
    }

    private static Optional<JournalLock> lock(Path folder, String name, StandardOpenOption how) throws IOException {
        FileChannel channel;
        try {
            channel = FileChannel.open(folder.resolve(name + LOCK), how, StandardOpenOption.WRITE);
        } catch (FileAlreadyExistsException e) {
            return Optional.empty();
        }
        boolean isMine = false;
        try {
            FileLock lock = channel.tryLock();
            isMine = lock != null;
        } catch (OverlappingFileLockException e) {
            // Claimed by this process already.
            isMine = false;
        } finally {
            if (!isMine) {
                channel.close();
            }
        }
        return isMine ? Optional.of(new JournalLock(folder, name, channel)) : Optional.empty();
    }

    private Path lockFile() {
        return folder.resolve(name + LOCK);
    }

    /** The file of the journal, which may not be there. */
    Path journal() {
        return folder.resolve(name + JOURNAL);
    }

    /** Deletes the journal, gives the right up and deletes its file. */
    void remove() throws IOException {
        Files.deleteIfExists(journal());
        channel.close();
        Files.deleteIfExists(lockFile());
    }

    /** Gives the right up; the journal stays. */
    @Override
    public void close() throws IOException {
        channel.close();
    }
}
