package twofold.file;

import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.io.DataInputStream;
import java.io.DataOutputStream;
import java.io.IOException;
import java.nio.ByteBuffer;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.time.Instant;
import java.util.Arrays;
import java.util.HashSet;
import java.util.Optional;
import java.util.Set;
import java.util.zip.CRC32C;
import twofold.design.Design;

/**
 * Unsaved work at one moment.
 *
 * @param time when it was kept, to a millisecond
 * @param name of the document, as titles show it
 * @param file the document's file; empty for a sample and for a new document
 * @param known what that file may hold without another program having changed it
 * @param design the work
 */
public record JournalEntry(Instant time, String name, Optional<Path> file, Set<Fingerprint> known, Design design) {
    /** What a journal begins with. */
    private static final byte[] HEAD = "twofold-journal/1\n".getBytes(StandardCharsets.US_ASCII);

    /** Length and checksum before each entry, in bytes. */
    private static final int FRAME = 8;

    /** Copies the set. */
    public JournalEntry {
        known = Set.copyOf(known);
    }

    /** This entry as the first of a journal. */
    byte[] first() throws IOException {
        byte[] record = next();
        return ByteBuffer.allocate(HEAD.length + record.length)
                .put(HEAD)
                .put(record)
                .array();
    }

    /** This entry as a further one of a journal: its length, its CRC-32C (RFC 3720, B.4) and its content. */
    byte[] next() throws IOException {
        ByteArrayOutputStream bytes = new ByteArrayOutputStream();
        DataOutputStream out = new DataOutputStream(bytes);
        out.writeLong(time.toEpochMilli());
        out.writeUTF(name);
        out.writeUTF(file.map(Path::toString).orElse(""));
        out.writeInt(known.size());
        for (Fingerprint print : known) {
            out.writeUTF(print.sha256());
        }
        out.write(DesignWriter.bytes(design));
        byte[] content = bytes.toByteArray();
        return ByteBuffer.allocate(FRAME + content.length)
                .putInt(content.length)
                .putInt(checksum(content))
                .put(content)
                .array();
    }

    private static int checksum(byte[] content) {
        CRC32C checksum = new CRC32C();
        checksum.update(content);
        return (int) checksum.getValue();
    }

    /**
     * The last entry of a journal that was written whole; empty where there is none.
     *
     * @throws IOException if that entry cannot be understood, as one of a later version of the program
     */
    static Optional<JournalEntry> last(byte[] journal) throws IOException {
        ByteBuffer rest = ByteBuffer.wrap(journal);
        byte[] head = new byte[Math.min(HEAD.length, journal.length)];
        rest.get(head);
        if (!Arrays.equals(head, HEAD)) {
            return Optional.empty();
        }
        byte[] last = new byte[0];
        while (rest.remaining() >= FRAME) {
            int length = rest.getInt();
            int checksum = rest.getInt();
            if (length < 0 || length > rest.remaining()) {
                break;
            }
            byte[] content = new byte[length];
            rest.get(content);
            if (checksum(content) != checksum) {
                break;
            }
            last = content;
        }
        return last.length == 0 ? Optional.empty() : Optional.of(parse(last));
    }

    private static JournalEntry parse(byte[] content) throws IOException {
        DataInputStream in = new DataInputStream(new ByteArrayInputStream(content));
        Instant time = Instant.ofEpochMilli(in.readLong());
        String name = in.readUTF();
        String path = in.readUTF();
        Set<Fingerprint> known = new HashSet<>();
        for (int left = in.readInt(); left > 0; left--) {
            known.add(new Fingerprint(in.readUTF()));
        }
        ReadDesign read = DesignReader.read(in.readAllBytes());
        if (read.design().isEmpty()) {
            throw new IOException(
                    "its design has problems: " + read.problems().get(0).line(name));
        }
        return new JournalEntry(
                time,
                name,
                path.isEmpty() ? Optional.empty() : Optional.of(Path.of(path)),
                known,
                read.design().get());
    }
}
