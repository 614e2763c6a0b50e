package org.pofk.formula;

import java.util.List;
import org.pofk.formula.Token.Kind;
import org.pofk.text.Fault;
import org.pofk.text.Places;
import org.pofk.text.Position;
import org.pofk.text.RefusedException;
import org.pofk.text.Span;

/** A formula's tokens and the one that is read next. Mutable; lives for one reading. */
final class Cursor {
    private final String text;
    private final Places places;
    private final List<Token> tokens;
    private final Rules rules;
    private int first;
    private int next;

    Cursor(String text, Places places, List<Token> tokens, Rules rules) {
        this.text = text;
        this.places = places;
        this.tokens = tokens;
        this.rules = rules;
    }

    Rules rules() {
        return rules;
    }

    /** All tokens, ending with one {@link Kind#END}. */
    List<Token> tokens() {
        return tokens;
    }

    /** Leaves out the tokens before the one of this index. */
    void beginAt(int index) {
        first = index;
        next = index;
    }

    /** The token that is read next. */
    Token peek() {
        return tokens.get(next);
    }

    boolean sees(Kind kind) {
        return peek().is(kind);
    }

    /** The token behind the next one; the last one stands behind itself. */
    Token peekBehind() {
        return tokens.get(Math.min(next + 1, tokens.size() - 1));
    }

    /** Reads the next token; the last one can be read again and again. */
    Token take() {
        Token token = peek();
        if (!token.is(Kind.END)) {
            next++;
        }
        return token;
    }

    /** The token read last. */
    Token before() {
        return tokens.get(next - 1);
    }

    /** True while nothing has been read. */
    boolean atStart() {
        return next == first;
    }

    /** What stands in the text from one offset to another, short enough to be shown. */
    String shown(int start, int end) {
        return Words.shortened(text.substring(start, end).strip());
    }

    Span span(int start, int end) {
        return new Span(places.at(start), places.at(end));
    }

    Span spanOf(Token token) {
        return span(token.start(), token.end());
    }

    /** From the beginning of a token to the end of the token read last. */
    Span spanFrom(Token first) {
        return span(first.start(), before().end());
    }

    RefusedException refused(Token at, String code, String message) {
        return refused(places.at(at.start()), code, message);
    }

    RefusedException refused(Position at, String code, String message) {
        return new RefusedException(List.of(new Fault(at, code, message)));
    }
}
