package twofold.file;

import java.io.IOException;
import java.nio.ByteBuffer;
import java.nio.CharBuffer;
import java.nio.charset.CharsetDecoder;
import java.nio.charset.CoderResult;
import java.nio.charset.CodingErrorAction;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import twofold.design.Design;
import twofold.design.Problem;
import twofold.design.Subject;
import twofold.layout.Outcome;

/**
 * Reads design files: strictly, and with every problem of a file at once, each with its place. A byte order mark is
 * skipped. What cannot be read has a legal value stand in for it, so that all else is still checked.
 */
public final class DesignReader {
    /** The largest file that is read, in bytes: 4 MB. */
    public static final int MOST_BYTES = 4_000_000;

    private static final char BYTE_ORDER_MARK = '\uFEFF';

    private DesignReader() {}

    /**
     * Reads a file.
     *
     * @throws IOException with a message for a person if the file cannot be read
     */
    public static ReadDesign read(Path file) throws IOException {
        return read(SafeFile.read(file, MOST_BYTES + 1));
    }

    /** Reads a file's bytes. */
    public static ReadDesign read(byte[] bytes) {
        Faults faults = new Faults();
        Optional<Design> design = decode(bytes, faults)
                .flatMap(text -> JsonText.parse(text, faults))
                .flatMap(root -> design(root, faults));
        return new ReadDesign(faults.isEmpty() ? design : Optional.empty(), faults.sorted());
    }

    private static Optional<String> decode(byte[] bytes, Faults faults) {
        if (bytes.length > MOST_BYTES) {
            faults.add(Subject.DOCUMENT, Mark.START, "found more than 4 MB", "at most " + MOST_BYTES + " bytes");
            return Optional.empty();
        }
        CharsetDecoder decoder = StandardCharsets.UTF_8
                .newDecoder()
                .onMalformedInput(CodingErrorAction.REPORT)
                .onUnmappableCharacter(CodingErrorAction.REPORT);
        ByteBuffer in = ByteBuffer.wrap(bytes);
        CharBuffer out = CharBuffer.allocate(bytes.length);
        CoderResult result = decoder.decode(in, out, true);
        String all = out.flip().toString();
        String text = !all.isEmpty() && all.charAt(0) == BYTE_ORDER_MARK ? all.substring(1) : all;
        if (result.isUnderflow()) {
            return Optional.of(text);
        }
        int bad = Byte.toUnsignedInt(bytes[in.position()]);
        faults.add(
                Subject.DOCUMENT,
                new Marks(text).at(text.length()),
                "found the byte 0x" + Integer.toHexString(bad) + ", which is not UTF-8 here",
                "a text in UTF-8");
        return Optional.empty();
    }

    private static Optional<Design> design(Json root, Faults faults) {
        Optional<DocumentReader.Draft> read = DocumentReader.read(root, faults);
        if (read.isEmpty()) {
            return Optional.empty();
        }
        DocumentReader.Draft draft = read.get();
        Places places = new Places(root);
        Sieve sieve = new Sieve(draft, faults);
        List<Problem> stated =
                draft.design().problems().stream().filter(sieve::keeps).toList();
        for (Problem problem : stated) {
            faults.add(problem, places.of(problem.where()));
            faults.markBroken(field(problem.where()));
        }
        boolean plan = sieve.knowsAllKinds()
                && !faults.isBroken(Subject.DOCUMENT.at("shape"))
                && stated.stream().noneMatch(DesignReader::isAboutCounts);
        if (!plan) {
            return Optional.empty();
        }
        Outcome<Design> laid = PlanReader.read(draft, faults);
        laid.problems().stream().map(places::asWritten).forEach(p -> faults.add(p, places.of(p.where())));
        return laid.value();
    }

    /** The field that a place lies in: {@code parts[2].at_mm} of {@code parts[2].at_mm[0]}. */
    private static Subject field(Subject where) {
        return where.steps().size() > 3 ? new Subject(where.steps().subList(0, 3)) : where;
    }

    /** Whether there are too few mirrors, or others where mirrors must be: then there is no plan. */
    private static boolean isAboutCounts(Problem problem) {
        List<String> steps = problem.where().steps();
        return steps.get(0).equals("parts")
                && (steps.size() == 1 || (steps.size() == 3 && steps.get(2).equals("kind")));
    }
}
