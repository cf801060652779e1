package twofold.session;

import java.io.IOException;
import java.util.Optional;
import twofold.cavity.Cavity;
import twofold.file.DesignReader;
import twofold.file.Fingerprint;
import twofold.file.ReadDesign;
import twofold.file.SafeFile;
import twofold.study.WorstOver;

/**
 * What reading a source came to.
 *
 * @param print of the bytes that were read
 * @param read the design, or what is wrong with it
 * @param cavity the design solved and wholly judged
 */
record Opened(Fingerprint print, ReadDesign read, Optional<Cavity> cavity) {
    /** Reads a file, or a sample; slow. */
    static Opened of(Source source) throws IOException {
        byte[] bytes = source.file().isPresent()
                ? SafeFile.read(source.file().get(), DesignReader.MOST_BYTES + 1)
                : Samples.bytes(source.name());
        ReadDesign read = DesignReader.read(bytes);
        return new Opened(Fingerprint.of(bytes), read, read.design().map(d -> judged(Cavity.solve(Document.lay(d)))));
    }

    /** An answer with its requirements over a lever's range judged too; slow. */
    static Cavity judged(Cavity cavity) {
        return cavity.judgedOver(new WorstOver(cavity.laid()));
    }
}
