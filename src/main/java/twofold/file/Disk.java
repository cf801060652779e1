package twofold.file;

import java.io.IOException;
import java.nio.ByteBuffer;
import java.nio.channels.FileChannel;
import java.nio.file.AccessDeniedException;
import java.nio.file.DirectoryStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.nio.file.StandardOpenOption;
import java.nio.file.attribute.PosixFileAttributeView;
import java.util.ArrayList;
import java.util.List;

/** What safe writing asks of a disk, each of which may fail; a test puts one here that does. */
interface Disk {
    /** The disk of this machine. */
    Disk REAL = new Disk() {};

    /** Where a symbolic link leads to. */
    default Path linked(Path link) throws IOException {
        return Files.readSymbolicLink(link);
    }

    /** What a folder holds. */
    default List<Path> list(Path folder) throws IOException {
        List<Path> all = new ArrayList<>();
        try (DirectoryStream<Path> files = Files.newDirectoryStream(folder)) {
            files.forEach(all::add);
        }
        return all;
    }

    /** Makes an empty file where there is none. */
    default void create(Path file) throws IOException {
        Files.createFile(file);
    }

    /** Puts bytes into a file that is there, from a place on, and flushes them to the disk. */
    default void write(Path file, long place, byte[] bytes) throws IOException {
        try (FileChannel channel = FileChannel.open(file, StandardOpenOption.WRITE)) {
            ByteBuffer left = ByteBuffer.wrap(bytes);
            channel.position(place);
            while (left.hasRemaining()) {
                channel.write(left);
            }
            channel.force(true);
        }
    }

    /** Gives a file the permissions of another, where there are such. */
    default void permit(Path like, Path file) throws IOException {
        PosixFileAttributeView now = Files.getFileAttributeView(like, PosixFileAttributeView.class);
        PosixFileAttributeView next = Files.getFileAttributeView(file, PosixFileAttributeView.class);
        if (now != null && next != null) {
            next.setPermissions(now.readAttributes().permissions());
        }
    }

    /** Moves a file over another at one stroke. */
    default void move(Path from, Path to) throws IOException {
        Files.move(from, to, StandardCopyOption.ATOMIC_MOVE, StandardCopyOption.REPLACE_EXISTING);
    }

    /** Flushes the names in a folder to the disk, where a folder can be opened: so on POSIX. */
    default void flush(Path folder) throws IOException {
        if (!folder.getFileSystem().supportedFileAttributeViews().contains("posix")) {
            return;
        }
        try (FileChannel channel = openFolder(folder)) {
            if (channel != null) {
                channel.force(true);
            }
        }
    }

    private static @org.jspecify.annotations.Nullable FileChannel openFolder(Path folder) throws IOException {
        try {
            return FileChannel.open(folder, StandardOpenOption.READ);
        } catch (AccessDeniedException e) {
            // A folder that may be written but not read cannot be flushed; its file systems do so before long.
            return null;
        }
    }

    /** Deletes a file if it is there. */
    default void delete(Path file) throws IOException {
        Files.deleteIfExists(file);
    }
}
