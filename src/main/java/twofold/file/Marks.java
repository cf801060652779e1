package twofold.file;

/** Turns character offsets of one text into places, fastest when asked in ascending order. */
final class Marks {
    private final String text;
    private int offset;
    private int line = 1;
    private int column = 1;

    Marks(String text) {
        this.text = text;
    }

    /** The place of an offset; of one beyond the text, its end. */
    Mark at(long wanted) {
        int target = (int) Math.max(0, Math.min(wanted, text.length()));
        if (target < offset) {
            offset = 0;
            line = 1;
            column = 1;
        }
        while (offset < target) {
            char c = text.charAt(offset++);
            boolean pairGoesOn =
                    Character.isLowSurrogate(c) && offset >= 2 && Character.isHighSurrogate(text.charAt(offset - 2));
            boolean isCrOfCrLf = c == '\r' && offset < text.length() && text.charAt(offset) == '\n';
            if (c == '\n' || (c == '\r' && !isCrOfCrLf)) {
                line++;
                column = 1;
            } else if (!pairGoesOn) {
                column++;
            }
        }
        return new Mark(line, column);
    }
}
