package twofold.file;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.TreeSet;

/**
 * Work that a program left unsaved when it ended without being asked to, from its {@link Journal}. While one is held, no
 * other program finds it.
 */
public final class UnsavedWork implements AutoCloseable {
    private static final System.Logger LOG = System.getLogger(UnsavedWork.class.getName());

    /** More than a journal and its largest entry. */
    private static final int MOST_BYTES = (int) Journal.MOST_BYTES + 2 * DesignReader.MOST_BYTES;

    private final JournalLock lock;
    private final JournalEntry entry;

    private UnsavedWork(JournalLock lock, JournalEntry entry) {
        this.lock = lock;
        this.entry = entry;
    }

    /** The work up to the last edit. */
    public JournalEntry entry() {
        return entry;
    }

    /** What to call it: the design's title, else the document's name. */
    public String title() {
        String title = entry.design().title();
        return title.isEmpty() ? entry.name() : title;
    }

    /** Deletes it for good. */
    public void discard() throws IOException {
        lock.remove();
    }

    /** Leaves it for another time. */
    @Override
    public void close() throws IOException {
        lock.close();
    }

    /**
     * All that was left in a folder, the newest first; each is to be discarded or closed. To be asked once a process.
     *
     * @param folder of journals; may not be there
     * @throws IOException if the folder cannot be read
     */
    public static List<UnsavedWork> in(Path folder) throws IOException {
        List<UnsavedWork> all = new ArrayList<>();
        if (Files.isDirectory(folder)) {
            TreeSet<String> names = new TreeSet<>();
            for (Path file : Disk.REAL.list(folder)) {
                String name = file.getFileName().toString();
                if (name.endsWith(JournalLock.LOCK) || name.endsWith(JournalLock.JOURNAL)) {
                    names.add(name.substring(0, name.lastIndexOf('.')));
                }
            }
            names.removeIf(JournalLock::isOwn);
            for (String name : names) {
                in(folder, name).ifPresent(all::add);
            }
        }
        all.sort(Comparator.comparing((UnsavedWork w) -> w.entry.time()).reversed());
        return List.copyOf(all);
    }

    private static Optional<UnsavedWork> in(Path folder, String name) {
        try {
            Optional<JournalLock> lock = JournalLock.claim(folder, name);
            return lock.isEmpty() ? Optional.empty() : read(lock.get());
        } catch (IOException e) {
            // It stays where it is, for a program that understands it.
            LOG.log(
                    System.Logger.Level.WARNING,
                    "{0} cannot be read: {1}",
                    folder.resolve(name + JournalLock.JOURNAL),
                    SafeFile.reason(e));
            return Optional.empty();
        }
    }

    private static Optional<UnsavedWork> read(JournalLock lock) throws IOException {
        boolean isKept = false;
        try {
            byte[] bytes = Files.exists(lock.journal()) ? SafeFile.read(lock.journal(), MOST_BYTES) : new byte[0];
            Optional<JournalEntry> entry = JournalEntry.last(bytes);
            if (entry.isEmpty()) {
                // Nothing was ever written whole.
                lock.remove();
                return Optional.empty();
            }
            isKept = true;
            return Optional.of(new UnsavedWork(lock, entry.get()));
        } finally {
            if (!isKept) {
                lock.close();
            }
        }
    }
}
