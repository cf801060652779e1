package twofold.file;

import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.HexFormat;

/**
 * What tells the bytes of one file from those of another.
 *
 * @param sha256 the SHA-256 of the bytes (FIPS 180-4), in hexadecimal
 */
public record Fingerprint(String sha256) {
    /** The fingerprint of some bytes. */
    public static Fingerprint of(byte[] bytes) {
        try {
            return new Fingerprint(HexFormat.of()
                    .formatHex(MessageDigest.getInstance("SHA-256").digest(bytes)));
        } catch (NoSuchAlgorithmException e) {
            throw new IllegalStateException("every Java platform has SHA-256", e);
        }
    }
}
