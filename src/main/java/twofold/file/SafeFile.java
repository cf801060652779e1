package twofold.file;

import java.io.IOException;
import java.io.InputStream;
import java.nio.file.AccessDeniedException;
import java.nio.file.FileAlreadyExistsException;
import java.nio.file.FileSystemException;
import java.nio.file.FileSystemLoopException;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.time.Instant;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * Reading and replacing files so that nothing is lost: a file is written beside the old one, flushed to the disk and
 * moved over it, so that at every moment the old or the new one is there, whole. Messages of exceptions say why, for
 * a person, and leave it to the caller to name the file.
 */
public final class SafeFile {
    /** Names for the file beside that are tried before giving up. */
    private static final int MOST_TRIES = 100;

    /** Links that are followed before they count as a circle. */
    private static final int MOST_LINKS = 40;

    private static final String FOLDER = "it is a folder";
    private static final String END = ".part";

    private final Disk disk;

    private SafeFile(Disk disk) {
        this.disk = disk;
    }

    /**
     * The bytes of a file.
     *
     * @param most so many are read, of a longer file the first
     * @throws IOException with a message for a person
     */
    public static byte[] read(Path file, int most) throws IOException {
        try {
            if (Files.isDirectory(file)) {
                throw refusal(file, FOLDER);
            }
            try (InputStream in = Files.newInputStream(file)) {
                return in.readNBytes(most);
            }
        } catch (IOException e) {
            throw new IOException(reason(e), e);
        }
    }

    /**
     * Puts bytes into a file, in place of what it held; through a symbolic link, into the file that it leads to. On
     * failure the file holds what it held.
     *
     * @throws IOException with a message for a person
     */
    public static void write(Path file, byte[] bytes) throws IOException {
        write(Disk.REAL, file, bytes);
    }

    static void write(Disk disk, Path file, byte[] bytes) throws IOException {
        try {
            new SafeFile(disk).put(file, bytes);
        } catch (IOException e) {
            throw new IOException(reason(e), e);
        }
    }

    private void put(Path file, byte[] bytes) throws IOException {
        Path target = followed(file.toAbsolutePath());
        if (Files.isDirectory(target)) {
            throw refusal(target, FOLDER);
        }
        if (Files.exists(target) && !Files.isRegularFile(target)) {
            // A pipe or a device cannot be replaced, nor does it hold anything that could be lost.
            Files.write(file, bytes);
            return;
        }
        if (Files.exists(target) && !Files.isWritable(target)) {
            throw refusal(target, "it is write-protected");
        }
        Path folder = target.getParent();
        if (folder == null || !Files.isDirectory(folder)) {
            throw refusal(target, "there is no folder " + folder);
        }
        replace(target, folder, bytes);
    }

    private static FileSystemException refusal(Path file, String reason) {
        return new FileSystemException(file.toString(), null, reason);
    }

    private Path followed(Path file) throws IOException {
        Path here = file;
        for (int i = 0; Files.isSymbolicLink(here); i++) {
            if (i == MOST_LINKS) {
                throw new FileSystemLoopException(file.toString());
            }
            if (Files.exists(here) && !Files.isRegularFile(here)) {
                return here;
            }
            here = here.resolveSibling(disk.linked(here)).normalize();
        }
        return here;
    }

    private void replace(Path target, Path folder, byte[] bytes) throws IOException {
        tidy(folder, target.getFileName().toString());
        Path beside = beside(folder, target.getFileName().toString());
        try {
            disk.write(beside, 0, bytes);
            if (Files.exists(target)) {
                disk.permit(target, beside);
            }
            disk.move(beside, target);
        } catch (IOException e) {
            try {
                disk.delete(beside);
            } catch (IOException left) {
                // Harmless, and tidied away by a later program; why it was not written matters more.
                e.addSuppressed(left);
            }
            throw e;
        }
        try {
            disk.flush(folder);
        } catch (IOException e) {
            throw new IOException("it was written, but the disk does not confirm it: " + reason(e), e);
        }
    }

    /** A new, empty file in a folder. Its name says which process makes it. */
    private Path beside(Path folder, String name) throws IOException {
        for (int i = 0; i < MOST_TRIES; i++) {
            Path beside = folder.resolve(prefix(name) + ProcessHandle.current().pid() + "-" + i + END);
            if (!Files.exists(beside)) {
                disk.create(beside);
                return beside;
            }
        }
        throw refusal(folder, "there are " + MOST_TRIES + " unfinished copies of it in its folder");
    }

    private static String prefix(String name) {
        return "." + name + ".";
    }

    /** Deletes what processes left beside a file when they were killed while they wrote it. */
    private void tidy(Path folder, String name) {
        Pattern unfinished = Pattern.compile(Pattern.quote(prefix(name)) + "(\\d{1,18})-\\d+" + Pattern.quote(END));
        try {
            for (Path file : disk.list(folder)) {
                Matcher matcher = unfinished.matcher(file.getFileName().toString());
                if (matcher.matches() && isAbandoned(file, Long.parseLong(matcher.group(1)))) {
                    disk.delete(file);
                }
            }
        } catch (IOException e) {
            // What is left there does no harm, and a file can be saved in a folder that cannot be listed.
            System.getLogger(SafeFile.class.getName())
                    .log(System.Logger.Level.DEBUG, "unfinished copies cannot be tidied away: " + folder, e);
        }
    }

    /** Whether the process that began a file is gone; another one may have its number. */
    private static boolean isAbandoned(Path file, long process) throws IOException {
        Optional<ProcessHandle> handle = ProcessHandle.of(process).filter(ProcessHandle::isAlive);
        if (handle.isEmpty()) {
            return true;
        }
        Optional<Instant> start = handle.get().info().startInstant();
        return start.isPresent() && Files.getLastModifiedTime(file).toInstant().isBefore(start.get());
    }

    /** Why an operation on a file failed, for a person. */
    static String reason(IOException e) {
        if (e instanceof NoSuchFileException) {
            return "there is no such file";
        }
        if (e instanceof AccessDeniedException) {
            return "permission denied";
        }
        if (e instanceof FileAlreadyExistsException f) {
            return "there is a file in the way: " + f.getFile();
        }
        if (e instanceof FileSystemLoopException) {
            return "its symbolic links go in a circle";
        }
        String reason = e instanceof FileSystemException f && f.getReason() != null ? f.getReason() : e.getMessage();
        return reason == null ? e.getClass().getSimpleName() : reason;
    }
}
