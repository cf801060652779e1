package twofold.file;

import java.io.IOException;
import java.io.InputStream;
import java.nio.ByteBuffer;
import java.nio.channels.FileChannel;
import java.nio.file.AccessDeniedException;
import java.nio.file.FileSystemException;
import java.nio.file.FileSystemLoopException;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.nio.file.StandardOpenOption;
import java.nio.file.attribute.PosixFileAttributeView;

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

    private SafeFile() {}

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
        try {
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
        } catch (IOException e) {
            throw new IOException(reason(e), e);
        }
    }

    private static FileSystemException refusal(Path file, String reason) {
        return new FileSystemException(file.toString(), null, reason);
    }

    private static Path followed(Path file) throws IOException {
        Path here = file;
        for (int i = 0; Files.isSymbolicLink(here); i++) {
            if (i == MOST_LINKS) {
                throw new FileSystemLoopException(file.toString());
            }
            if (Files.exists(here) && !Files.isRegularFile(here)) {
                return here;
            }
            here = here.resolveSibling(Files.readSymbolicLink(here)).normalize();
        }
        return here;
    }

    private static void replace(Path target, Path folder, byte[] bytes) throws IOException {
        Path beside = beside(folder, target.getFileName().toString());
        boolean moved = false;
        try {
            try (FileChannel channel = FileChannel.open(beside, StandardOpenOption.WRITE)) {
                ByteBuffer left = ByteBuffer.wrap(bytes);
                while (left.hasRemaining()) {
                    channel.write(left);
                }
                channel.force(true);
            }
            PosixFileAttributeView now = Files.getFileAttributeView(target, PosixFileAttributeView.class);
            PosixFileAttributeView next = Files.getFileAttributeView(beside, PosixFileAttributeView.class);
            if (now != null && next != null && Files.exists(target)) {
                next.setPermissions(now.readAttributes().permissions());
            }
            Files.move(beside, target, StandardCopyOption.ATOMIC_MOVE, StandardCopyOption.REPLACE_EXISTING);
            moved = true;
        } finally {
            if (!moved) {
                Files.deleteIfExists(beside);
            }
        }
    }

    /** A new, empty file in a folder. */
    private static Path beside(Path folder, String name) throws IOException {
        for (int i = 0; i < MOST_TRIES; i++) {
            Path beside = folder.resolve("." + name + "." + i + ".part");
            if (!Files.exists(beside)) {
                return Files.createFile(beside);
            }
        }
        throw refusal(folder, "there are " + MOST_TRIES + " unfinished copies of it in its folder");
    }

    private static String reason(IOException e) {
        if (e instanceof NoSuchFileException) {
            return "there is no such file";
        }
        if (e instanceof AccessDeniedException) {
            return "permission denied";
        }
        if (e instanceof FileSystemLoopException) {
            return "its symbolic links go in a circle";
        }
        String reason = e instanceof FileSystemException f && f.getReason() != null ? f.getReason() : e.getMessage();
        return reason == null ? e.getClass().getSimpleName() : reason;
    }
}
