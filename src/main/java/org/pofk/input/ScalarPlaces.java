package org.pofk.input;

import org.pofk.text.Places;
import org.pofk.text.Position;

/**
 * Where the characters of a value stand that YAML folds or strips: of several lines, in a block, or with a quote
 * written twice. YAML changes only blanks and line breaks there, so that the other characters are found one after
 * the other. Linear in the length of what is written.
 */
final class ScalarPlaces {
    private final String written;
    private final int[] offsets;

    private ScalarPlaces(String written, String text) {
        this.written = written;
        this.offsets = new int[text.length() + 1];
        boolean inSingleQuotes = written.startsWith("'");
        int at = firstOfText();
        for (int i = 0; i < text.length(); i++) {
            char c = text.charAt(i);
            while (!isBlank(c) && at < written.length() && written.charAt(at) != c) {
                at++;
            }
            offsets[i] = Math.min(at, written.length());
            at += isBlank(c) && (at >= written.length() || !isBlank(written.charAt(at))) ? 0 : 1;
            at += inSingleQuotes && c == '\'' ? 1 : 0;
        }
        offsets[text.length()] = Math.min(at, written.length());
    }

    /** The places of a text's characters, for a value that is written as {@code written} from {@code start} on. */
    static Places of(Position start, String written, String text) {
        Places source = Places.from(start, written);
        int[] offsets = new ScalarPlaces(written, text).offsets;
        return offset -> source.at(offsets[offset]);
    }

    /** Behind the quote, or behind the line that opens a block. */
    private int firstOfText() {
        if (written.startsWith("|") || written.startsWith(">")) {
            return Math.max(0, written.indexOf('\n'));
        }
        return written.startsWith("'") || written.startsWith("\"") ? 1 : 0;
    }

    private static boolean isBlank(char c) {
        return Character.isWhitespace(c);
    }
}
