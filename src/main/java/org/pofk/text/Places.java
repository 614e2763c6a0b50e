package org.pofk.text;

/** Where each character of a text stands in the source it was taken from. */
@FunctionalInterface
public interface Places {

    /** The place of the character at a UTF-16 offset, 0 … length of the text. */
    Position at(int offset);

    /**
     * The places of a text that stands in its source as it is, beginning at {@code start}: columns count code points,
     * a line feed begins the next line at column 1. Linear once, then constant time per place.
     */
    static Places from(Position start, String text) {
        if (start.isWhole()) {
            return offset -> start;
        }
        int[] lines = new int[text.length() + 1];
        int[] columns = new int[text.length() + 1];
        int line = start.line();
        int column = start.column();
        for (int i = 0; i < text.length(); i++) {
            lines[i] = line;
            columns[i] = column;
            if (text.charAt(i) == '\n') {
                line++;
                column = 1;
            } else if (!isFirstOfPair(text, i)) {
                column++;
            }
        }
        lines[text.length()] = line;
        columns[text.length()] = column;
        return offset -> new Position(start.source(), lines[offset], columns[offset]);
    }

    private static boolean isFirstOfPair(String text, int i) {
        return i + 1 < text.length() && Character.isSurrogatePair(text.charAt(i), text.charAt(i + 1));
    }
}
