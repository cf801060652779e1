package twofold.file;

import java.io.IOException;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.List;

/** A disk that fails at one operation, or from one on. */
final class FaultyDisk implements Disk {
    /** How an operation fails. */
    enum Fault {
        /** Nothing of it is done. */
        BEFORE,
        /** Of a writing, half the bytes are on the disk; of all else nothing. */
        HALFWAY,
        /** It is done, and yet a failure is told. */
        AFTER,
        /** Nothing of it is done, nor of any later operation. */
        FROM_HERE_ON
    }

    static final String WORDS = "the disk is on fire";

    private final int faulty;
    private final Fault fault;
    private int operations;

    /** Fails at an operation, counted from 0. */
    FaultyDisk(int faulty, Fault fault) {
        this.faulty = faulty;
        this.fault = fault;
    }

    /** Whether the faulty operation was asked for. */
    boolean hasFailed() {
        return operations > faulty;
    }

    /** An operation. */
    private interface Operation<T> {
        T run() throws IOException;
    }

    private <T> T run(Operation<T> whole) throws IOException {
        return run(whole, () -> {});
    }

    /** What is done by half. */
    private interface Half {
        void run() throws IOException;
    }

    private <T> T run(Operation<T> whole, Half half) throws IOException {
        int now = operations++;
        boolean fails = now == faulty || (fault == Fault.FROM_HERE_ON && now > faulty);
        if (!fails) {
            return whole.run();
        }
        if (fault == Fault.AFTER) {
            whole.run();
        } else if (fault == Fault.HALFWAY) {
            half.run();
        }
        throw new IOException(WORDS);
    }

    @Override
    public Path linked(Path link) throws IOException {
        return run(() -> REAL.linked(link));
    }

    @Override
    public List<Path> list(Path folder) throws IOException {
        return run(() -> REAL.list(folder));
    }

    @Override
    public void create(Path file) throws IOException {
        run(() -> {
            REAL.create(file);
            return true;
        });
    }

    @Override
    public void write(Path file, long place, byte[] bytes) throws IOException {
        run(
                () -> {
                    REAL.write(file, place, bytes);
                    return true;
                },
                () -> REAL.write(file, place, Arrays.copyOf(bytes, bytes.length / 2)));
    }

    @Override
    public void permit(Path like, Path file) throws IOException {
        run(() -> {
            REAL.permit(like, file);
            return true;
        });
    }

    @Override
    public void move(Path from, Path to) throws IOException {
        run(() -> {
            REAL.move(from, to);
            return true;
        });
    }

    @Override
    public void flush(Path folder) throws IOException {
        run(() -> {
            REAL.flush(folder);
            return true;
        });
    }

    @Override
    public void delete(Path file) throws IOException {
        run(() -> {
            REAL.delete(file);
            return true;
        });
    }
}
