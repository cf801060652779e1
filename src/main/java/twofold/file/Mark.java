package twofold.file;

/**
 * A place in a text.
 *
 * @param line from 1; lines end with LF, CRLF or CR
 * @param column from 1, counted in characters (code points)
 */
record Mark(int line, int column) {
    /** Where a text begins. */
    static final Mark START = new Mark(1, 1);
}
