package twofold.command;

import java.io.PrintStream;
import java.util.concurrent.CountDownLatch;
import java.util.concurrent.TimeUnit;
import twofold.study.Progress;

/**
 * How far long work has come, on the error stream: in a terminal one line that is written over and wiped at the end, else a
 * line each ten per cent. When the program is told to end, the work stops at a whole row, and what stood half said is wiped.
 */
final class ProgressLine implements Progress, AutoCloseable {
    private static final long PAUSE = TimeUnit.MILLISECONDS.toNanos(200);
    private static final long PATIENCE_SECONDS = 3;
    private static final String WIPE = "\r\u001b[K";

    private final PrintStream err;
    private final PrintStream out;
    private final String what;
    private final boolean isShown;
    private final boolean isTerminal;
    private final CountDownLatch ended = new CountDownLatch(1);
    private final Thread onEnd = new Thread(this::end, "end of survey");

    private volatile boolean isStopped;
    private long last = System.nanoTime();
    private int tenths;
    private boolean isOpen;

    /**
     * @param what is going on, in a word
     * @param isWanted whether to show it even where no person watches
     */
    ProgressLine(Streams streams, String what, boolean isWanted) {
        this.err = streams.err();
        this.out = streams.out();
        this.what = what;
        this.isTerminal = streams.isTerminal();
        this.isShown = isWanted || isTerminal;
        Runtime.getRuntime().addShutdownHook(onEnd);
    }

    @Override
    public boolean at(double share) {
        if (isShown && !isStopped) {
            show(share);
        }
        return !isStopped && !out.checkError();
    }

    private void show(double share) {
        if (!isTerminal) {
            if ((int) (share * 10) > tenths) {
                tenths = (int) (share * 10);
                err.println("twofold: " + what + " " + 10 * tenths + " %");
            }
        } else if (System.nanoTime() - last > PAUSE) {
            last = System.nanoTime();
            isOpen = true;
            err.print(WIPE + "twofold: " + what + " " + (int) (share * 100) + " %");
            err.flush();
        }
    }

    /** On another thread, when the program is told to end: waits until the work has stopped at a whole row. */
    private void end() {
        isStopped = true;
        try {
            ended.await(PATIENCE_SECONDS, TimeUnit.SECONDS);
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
        }
    }

    /** Whether the work was told to end before its end. */
    boolean isStopped() {
        return isStopped;
    }

    @Override
    public void close() {
        if (isOpen) {
            err.print(WIPE);
            err.flush();
        }
        ended.countDown();
        if (!isStopped) {
            try {
                Runtime.getRuntime().removeShutdownHook(onEnd);
            } catch (IllegalStateException e) {
                // The program is ending this very moment; the hook finds nothing left to do.
                isStopped = true;
            }
        }
    }
}
