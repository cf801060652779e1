package twofold.picture;

import java.io.ByteArrayOutputStream;
import java.nio.ByteBuffer;
import java.nio.charset.StandardCharsets;
import java.util.Arrays;
import java.util.zip.Adler32;
import java.util.zip.CRC32;

/**
 * Cells as a PNG file (ISO/IEC 15948), with the same bytes on every machine: nothing is compressed, as what a compressor
 * writes depends on its version. Up to 256 colours take a byte a cell, more take four.
 */
final class Png {
    private static final byte[] SIGNATURE = {(byte) 0x89, 'P', 'N', 'G', '\r', '\n', 0x1a, '\n'};
    private static final int PALETTE = 3;
    private static final int TRUE_COLOUR_WITH_ALPHA = 6;

    /** The most that a stored block of RFC 1951 holds. */
    private static final int BLOCK = 0xffff;

    private Png() {}

    /**
     * The file.
     *
     * @param argb 0xAARRGGBB, row by row from the top
     */
    static byte[] of(int columns, int rows, int[] argb) {
        int[] palette = Arrays.stream(argb).distinct().sorted().toArray();
        boolean indexed = palette.length <= 256;
        ByteArrayOutputStream file = new ByteArrayOutputStream();
        file.writeBytes(SIGNATURE);
        ByteBuffer head = ByteBuffer.allocate(13).putInt(columns).putInt(rows).put((byte) 8);
        chunk(
                file,
                "IHDR",
                head.put((byte) (indexed ? PALETTE : TRUE_COLOUR_WITH_ALPHA)).array());
        if (indexed) {
            ByteBuffer colours = ByteBuffer.allocate(3 * palette.length);
            ByteBuffer alphas = ByteBuffer.allocate(palette.length);
            for (int colour : palette) {
                colours.put((byte) (colour >> 16)).put((byte) (colour >> 8)).put((byte) colour);
                alphas.put((byte) (colour >>> 24));
            }
            chunk(file, "PLTE", colours.array());
            chunk(file, "tRNS", alphas.array());
        }
        ByteBuffer lines = ByteBuffer.allocate(rows * (1 + columns * (indexed ? 1 : 4)));
        for (int row = 0; row < rows; row++) {
            lines.put((byte) 0);
            for (int column = 0; column < columns; column++) {
                int colour = argb[row * columns + column];
                if (indexed) {
                    lines.put((byte) Arrays.binarySearch(palette, colour));
                } else {
                    lines.putInt(colour << 8 | colour >>> 24);
                }
            }
        }
        chunk(file, "IDAT", stored(lines.array()));
        chunk(file, "IEND", new byte[0]);
        return file.toByteArray();
    }

    private static void chunk(ByteArrayOutputStream file, String type, byte[] content) {
        byte[] name = type.getBytes(StandardCharsets.US_ASCII);
        CRC32 sum = new CRC32();
        sum.update(name);
        sum.update(content);
        file.writeBytes(number(content.length));
        file.writeBytes(name);
        file.writeBytes(content);
        file.writeBytes(number((int) sum.getValue()));
    }

    private static byte[] number(int value) {
        return ByteBuffer.allocate(4).putInt(value).array();
    }

    /** A zlib stream (RFC 1950) of stored blocks. */
    private static byte[] stored(byte[] bytes) {
        ByteArrayOutputStream out = new ByteArrayOutputStream(bytes.length + 64);
        out.write(0x78);
        out.write(0x01);
        int at = 0;
        do {
            int length = Math.min(BLOCK, bytes.length - at);
            out.write(at + length == bytes.length ? 1 : 0);
            out.write(length);
            out.write(length >> 8);
            out.write(~length);
            out.write(~length >> 8);
            out.writeBytes(Arrays.copyOfRange(bytes, at, at + length));
            at += length;
        } while (at < bytes.length);
        Adler32 sum = new Adler32();
        sum.update(bytes);
        out.writeBytes(number((int) sum.getValue()));
        return out.toByteArray();
    }
}
