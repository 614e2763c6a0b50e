package org.pofk.formula;

import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import org.pofk.formula.Token.Kind;
import org.pofk.text.Fault;
import org.pofk.text.Places;
import org.pofk.text.RefusedException;

/** LaTeX text character by character, and the tokens read from it so far. Mutable; lives for one reading. */
final class LatexScanner {
    /** Commands that leave a blank or only choose a size, with what may follow them in the same place. */
    private static final Set<String> INVISIBLE = Set.of(",", ";", ":", "!", " ", "quad", "qquad", "thinspace",
            "medspace", "thickspace", "negthinspace", "enspace", "displaystyle", "textstyle", "big", "bigl", "bigr",
            "Big", "Bigl", "Bigr", "bigg", "biggl", "biggr", "Bigg", "Biggl", "Biggr");

    private final String text;
    private final Places places;
    private final List<Token> tokens = new ArrayList<>();
    private int at;

    LatexScanner(String text, Places places) {
        this.text = text;
        this.places = places;
    }

    List<Token> tokens() {
        return tokens;
    }

    int offset() {
        return at;
    }

    void backTo(int offset) {
        at = offset;
    }

    boolean atEnd() {
        return at >= text.length();
    }

    /** The next character, or −1 at the end. */
    int next() {
        return atEnd() ? -1 : text.codePointAt(at);
    }

    /** The character at an offset, or −1 outside the text. */
    int charAt(int offset) {
        return offset < text.length() ? text.charAt(offset) : -1;
    }

    boolean isDigitAt(int offset) {
        return charAt(offset) >= '0' && charAt(offset) <= '9';
    }

    void skip() {
        at += Character.charCount(next());
    }

    boolean sees(String expected) {
        return text.startsWith(expected, at);
    }

    boolean takes(String expected) {
        boolean isThere = sees(expected);
        at += isThere ? expected.length() : 0;
        return isThere;
    }

    void skipBlanks() {
        while (!atEnd() && (Character.isWhitespace(next()) || Character.isSpaceChar(next()))) {
            skip();
        }
    }

    /** Skips all that leaves only a blank in print. */
    void skipSpaces() {
        skipBlanks();
        while (next() == '~' || INVISIBLE.contains(command())) {
            at += next() == '~' ? 1 : 1 + command().length();
            skipBlanks();
        }
    }

    /** The name of the command that begins here, without its backslash; empty where none does. */
    String command() {
        if (next() != '\\') {
            return "";
        }
        int end = at + 1;
        while (isAsciiLetter(charAt(end))) {
            end++;
        }
        return end > at + 1 || end >= text.length() ? text.substring(at + 1, end)
                : Character.toString(text.codePointAt(end));
    }

    static boolean isAsciiLetter(int c) {
        return c >= 'a' && c <= 'z' || c >= 'A' && c <= 'Z';
    }

    /** Skips the command that begins here, of a known name. */
    void skipCommand(String name) {
        at += 1 + name.length();
    }

    String since(int start) {
        return text.substring(start, at);
    }

    /** The token read last, or the first one to come where none has been. */
    boolean lastIs(Kind kind) {
        return !tokens.isEmpty() && tokens.get(tokens.size() - 1).is(kind);
    }

    /** True when the token read last ends right here and is of this kind. */
    boolean isRightBehind(Kind kind) {
        return lastIs(kind) && tokens.get(tokens.size() - 1).end() == at;
    }

    /** Adds a token for what has been read since an offset. */
    void add(Kind kind, int start) {
        add(kind, since(start), start);
    }

    void add(Kind kind, String content, int start) {
        tokens.add(new Token(kind, content, start, at));
    }

    RefusedException refused(int offset, String code, String message) {
        return new RefusedException(List.of(new Fault(places.at(offset), code, message)));
    }

    /** A fault about what stands at an offset, up to where reading has come. */
    RefusedException refusedShowing(int start, String code, String message) {
        return refused(start, code, "'" + Words.shortened(since(start)) + "' " + message);
    }
}
