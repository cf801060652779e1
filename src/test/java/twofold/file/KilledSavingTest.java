package twofold.file;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.SplittableRandom;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import twofold.Child;

/**
 * A program that saves is killed at any moment: the file is one design or the other, whole. So many times as
 * {@code -Dtwofold.kills} says, else 30.
 */
class KilledSavingTest {
    private static final int KILLS = Integer.getInteger("twofold.kills", 30);

    /** How long it saves before it is killed, ms: several savings on a slow disk. */
    private static final double LONGEST = 30;

    @TempDir
    private Path folder;

    /** Saves one file and the other in a third, again and again. */
    static final class Saving {
        private Saving() {}

        @SuppressWarnings("InfiniteLoopStatement")
        public static void main(String[] arguments) throws IOException {
            Path file = Path.of(arguments[0]);
            byte[] one = Files.readAllBytes(Path.of(arguments[1]));
            byte[] other = Files.readAllBytes(Path.of(arguments[2]));
            SafeFile.write(file, one);
            System.out.println("saving");
            while (true) {
                SafeFile.write(file, other);
                SafeFile.write(file, one);
            }
        }
    }

    @Test
    void theFileIsWholeWheneverASavingProgramIsKilled() throws Exception {
        Path one = Path.of("samples/z-fold-rod.json");
        Path other = Path.of("samples/bow-tie-doubler.json");
        List<String> wholes = List.of(Files.readString(one), Files.readString(other));
        Path saved = Files.createDirectory(folder.resolve("saved"));
        Path file = saved.resolve("design.json");
        SplittableRandom random = new SplittableRandom(5);
        int[] seen = new int[wholes.size()];
        int inTheMiddle = 0;
        for (int kill = 0; kill < KILLS; kill++) {
            try (Child child = Child.start(Saving.class, file.toString(), one.toString(), other.toString())) {
                assertThat(child.line()).isEqualTo("saving");
                Thread.sleep(0, (int) random.nextDouble(999_999));
                Thread.sleep((long) random.nextDouble(LONGEST));
                child.kill();
            }
            assertThat(Files.readString(file)).as("after kill %d", kill).isIn(wholes);
            seen[wholes.indexOf(Files.readString(file))]++;
            try (Stream<Path> all = Files.list(saved)) {
                long left = all.count() - 1;
                assertThat(left)
                        .as("the next program tidies away what was left beside")
                        .isLessThanOrEqualTo(1);
                inTheMiddle += (int) left;
            }
        }
        System.getLogger(KilledSavingTest.class.getName())
                .log(
                        System.Logger.Level.INFO,
                        "{0} kills, {1} in the middle of a saving; left with one design {2} times, with the other {3}",
                        KILLS,
                        inTheMiddle,
                        seen[0],
                        seen[1]);
        if (KILLS >= 30) {
            // Most of a saving passes between the first byte beside and the move, so that hardly any run of 30 has
            // none.
            assertThat(inTheMiddle).as("kills in the middle of a saving").isPositive();
        }
    }
}
