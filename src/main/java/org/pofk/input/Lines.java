package org.pofk.input;

import org.pofk.text.Position;

/** Turns offsets of a text into lines and columns. Lines end with LF, CR LF or CR. */
final class Lines {
    private Lines() {
    }

    /** The place just behind {@code text}. */
    static Position after(String name, String text) {
        return at(name, text, text.length());
    }

    /** The place of the character at {@code offset}. Linear in the offset. */
    static Position at(String name, String text, int offset) {
        int line = 1;
        int lineStart = 0;
        for (int i = 0; i < offset; i++) {
            if (endsLine(text, i)) {
                line++;
                lineStart = i + 1;
            }
        }
        return new Position(name, line, text.codePointCount(lineStart, offset) + 1);
    }

    private static boolean endsLine(String text, int i) {
        char c = text.charAt(i);
        return c == '\n' || c == '\r' && (i + 1 == text.length() || text.charAt(i + 1) != '\n');
    }
}
