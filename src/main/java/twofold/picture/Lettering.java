package twofold.picture;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.ByteBuffer;

/**
 * How wide text is: the one answer for every painter, read from the shipped font's own tables (OpenType 1.9: head, hhea,
 * hmtx, cmap format 4), so that neither a toolkit nor java.awt has to start. Kerning is left out: in labels and numbers
 * it stays below a pixel.
 */
public final class Lettering {
    /** The family's name, for style sheets and SVG. */
    public static final String FAMILY = "DejaVu Sans";

    /** Height of a capital letter over the font's size; the font's own table OS/2 says 1493 of 2048. */
    private static final double CAPITAL = 0.729;

    private static final Lettering REGULAR = new Lettering("DejaVuSans.ttf");
    private static final Lettering BOLD = new Lettering("DejaVuSans-Bold.ttf");

    /** Advance over the font's size, by UTF-16 unit. */
    private final float[] advances = new float[0x10000];

    private Lettering(String file) {
        try (InputStream in = Lettering.class.getResourceAsStream(file)) {
            if (in == null) {
                throw new IllegalStateException("the font " + file + " is not in the program's jar");
            }
            read(ByteBuffer.wrap(in.readAllBytes()));
        } catch (IOException e) {
            throw new UncheckedIOException("cannot read the font " + file, e);
        }
    }

    /** The width of a text, px. */
    public static double width(String text, Type type) {
        Lettering font = type.isBold() ? BOLD : REGULAR;
        double width = 0;
        for (int i = 0; i < text.length(); i++) {
            width += font.advances[text.charAt(i)];
        }
        return width * type.size();
    }

    /** The height of a capital letter, px: what text takes above its baseline. */
    public static double capital(Type type) {
        return CAPITAL * type.size();
    }

    /** The shipped font file, for a toolkit to load; the caller closes it. */
    public static InputStream file(boolean bold) {
        InputStream in = Lettering.class.getResourceAsStream(bold ? "DejaVuSans-Bold.ttf" : "DejaVuSans.ttf");
        if (in == null) {
            throw new IllegalStateException("the font is not in the program's jar");
        }
        return in;
    }

    /** The text, cut at its end with an ellipsis until it is no wider than a limit, px. */
    public static String cut(String text, Type type, double limit) {
        if (width(text, type) <= limit) {
            return text;
        }
        int end = text.length();
        while (end > 0 && width(text.substring(0, end), type) + width("…", type) > limit) {
            end = text.offsetByCodePoints(end, -1);
        }
        return text.substring(0, end).stripTrailing() + "…";
    }

    private void read(ByteBuffer font) {
        double unitsPerEm = font.getShort(table(font, "head") + 18) & 0xffff;
        int metrics = font.getShort(table(font, "hhea") + 34) & 0xffff;
        int hmtx = table(font, "hmtx");
        int cmap = unicode(font, table(font, "cmap"));
        int twice = font.getShort(cmap + 6) & 0xffff;
        for (int segment = 0; segment < twice; segment += 2) {
            int end = font.getShort(cmap + 14 + segment) & 0xffff;
            int start = font.getShort(cmap + 16 + twice + segment) & 0xffff;
            int delta = font.getShort(cmap + 16 + 2 * twice + segment);
            int place = cmap + 16 + 3 * twice + segment;
            int offset = font.getShort(place) & 0xffff;
            for (int c = start; c <= end; c++) {
                int glyph = offset == 0 ? c : font.getShort(place + offset + 2 * (c - start)) & 0xffff;
                if (offset == 0 || glyph != 0) {
                    glyph = glyph + delta & 0xffff;
                }
                int row = Math.min(glyph, metrics - 1);
                advances[c] = (float) ((font.getShort(hmtx + 4 * row) & 0xffff) / unitsPerEm);
            }
        }
    }

    private static int table(ByteBuffer font, String tag) {
        int tables = font.getShort(4);
        for (int i = 0; i < tables; i++) {
            int at = 12 + 16 * i;
            int word = tag.charAt(0) << 24 | tag.charAt(1) << 16 | tag.charAt(2) << 8 | tag.charAt(3);
            if (font.getInt(at) == word) {
                return font.getInt(at + 8);
            }
        }
        throw new IllegalStateException("the font has no table " + tag);
    }

    /** Where the table of the Basic Multilingual Plane begins: format 4, platform 3, encoding 1. */
    private static int unicode(ByteBuffer font, int cmap) {
        int count = font.getShort(cmap + 2);
        for (int i = 0; i < count; i++) {
            int at = cmap + 4 + 8 * i;
            int start = cmap + font.getInt(at + 4);
            if (font.getShort(at) == 3 && font.getShort(at + 2) == 1 && font.getShort(start) == 4) {
                return start;
            }
        }
        throw new IllegalStateException("the font has no Unicode table");
    }
}
