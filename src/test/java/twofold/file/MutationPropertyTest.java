package twofold.file;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.fail;

import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import java.util.regex.MatchResult;
import java.util.regex.Pattern;
import org.junit.jupiter.api.Test;
import twofold.layout.Layout;

/** Whatever a file holds, it comes to a design that can be laid out, or to problems with places: never to a failure. */
class MutationPropertyTest {
    private static final int COPIES = 20_000;
    private static final Pattern TOKEN = Pattern.compile("\"(?:[^\"\\\\]|\\\\.)*\"|[-+.0-9eE]+|[a-z]+|[\\[\\]{},:]");
    private static final Pattern NUMBER = Pattern.compile("(?<![\"\\w])-?[0-9][-+.0-9eE]*");
    private static final String[] VALUES = {
        "0",
        "-1",
        "1e308",
        "1e999",
        "-1e-999",
        "NaN",
        "Infinity",
        "1e12",
        "88.9999",
        "89",
        "0.1",
        "null",
        "true",
        "[]",
        "{}",
        "\"\"",
        "\"middle\"",
        "\"mirror\"",
        "[1, 0, 0, 1]",
        "[[\"a\", \"b\"]]",
        "\"\\ud800\"",
        "\"\\u0000\""
    };

    private final Random random = new Random(20261201);

    @Test
    void mutatedFilesGiveADesignOrProblems() {
        List<String> texts = Texts.all();
        int designs = 0;
        for (int i = 0; i < COPIES; i++) {
            byte[] copy = texts.get(i % texts.size()).getBytes(StandardCharsets.UTF_8);
            for (int n = 1 + random.nextInt(3); n > 0 && copy.length > 0; n--) {
                copy = mutated(copy);
            }
            designs += check(copy) ? 1 : 0;
        }
        // Enough that both outcomes are tried.
        assertThat(designs).isBetween(COPIES / 10, COPIES * 9 / 10);
    }

    private static boolean check(byte[] bytes) {
        String text = new String(bytes, StandardCharsets.UTF_8);
        ReadDesign read;
        try {
            read = DesignReader.read(bytes);
        } catch (RuntimeException e) {
            throw new AssertionError("fails on " + text, e);
        }
        assertThat(read.design().isPresent()).as(text).isEqualTo(read.problems().isEmpty());
        long ends = text.split("\r\n|\r|\n", -1).length;
        for (Located problem : read.problems()) {
            String line = problem.line("f");
            boolean isOneLine = line.chars().noneMatch(Character::isISOControl);
            if (problem.line() < 1
                    || problem.line() > ends
                    || problem.column() < 1
                    || !isOneLine
                    || line.contains("@@@")) {
                fail("reports %s of %s", line, text);
            }
        }
        read.design().ifPresent(design -> {
            assertThat(Layout.of(design).problems()).as(text).isEmpty();
            assertThat(DesignReader.read(DesignWriter.bytes(design)).design())
                    .as(text)
                    .contains(design);
        });
        return read.design().isPresent();
    }

    private byte[] mutated(byte[] bytes) {
        int kind = random.nextInt(10);
        if (kind < 3) {
            return bytewise(bytes, kind);
        }
        String text = new String(bytes, StandardCharsets.UTF_8);
        List<MatchResult> tokens = new ArrayList<>(
                (kind < 5 ? TOKEN : NUMBER).matcher(text).results().toList());
        if (tokens.size() < 2) {
            return bytewise(bytes, kind % 3);
        }
        MatchResult one = tokens.get(random.nextInt(tokens.size()));
        MatchResult other = tokens.get(random.nextInt(tokens.size()));
        if (kind > 6 && Character.isDigit(text.charAt(one.end() - 1))) {
            // Another last digit: mostly a design still.
            return (text.substring(0, one.end() - 1) + random.nextInt(10) + text.substring(one.end()))
                    .getBytes(StandardCharsets.UTF_8);
        }
        if (kind == 4 || kind == 6) {
            String value = VALUES[random.nextInt(VALUES.length)];
            return (text.substring(0, one.start()) + value + text.substring(one.end()))
                    .getBytes(StandardCharsets.UTF_8);
        }
        if (one.start() > other.start()) {
            MatchResult swap = one;
            one = other;
            other = swap;
        }
        return (one == other
                        ? text.substring(0, one.start()) + text.substring(one.end())
                        : text.substring(0, one.start())
                                + other.group()
                                + text.substring(one.end(), other.start())
                                + one.group()
                                + text.substring(other.end()))
                .getBytes(StandardCharsets.UTF_8);
    }

    /** Flips a bit, cuts a slice out, or doubles one. */
    private byte[] bytewise(byte[] bytes, int kind) {
        int at = random.nextInt(bytes.length);
        int end = Math.min(bytes.length, at + 1 + random.nextInt(random.nextBoolean() ? 3 : 60));
        if (kind == 0) {
            byte[] copy = bytes.clone();
            copy[at] ^= (byte) (1 << random.nextInt(8));
            return copy;
        }
        byte[] copy = new byte[kind == 1 ? bytes.length - (end - at) : bytes.length + (end - at)];
        System.arraycopy(bytes, 0, copy, 0, kind == 1 ? at : end);
        System.arraycopy(
                bytes, kind == 1 ? end : at, copy, kind == 1 ? at : end, bytes.length - (kind == 1 ? end : at));
        return copy;
    }
}
