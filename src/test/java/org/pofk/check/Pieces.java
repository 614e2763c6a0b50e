package org.pofk.check;

import java.util.ArrayList;
import java.util.List;
import org.pofk.check.Token.Role;

/** Puts the text of a formula together piece by piece. */
final class Pieces {
    private final List<Token> tokens = new ArrayList<>();
    private final Style style;
    private int term = -1;

    Pieces(Style style) {
        this.style = style;
    }

    /** Begins a term with its sign. */
    Pieces term(int sign) {
        term++;
        tokens.add(Token.of(Role.SIGN, term, sign < 0 ? " - " : " + "));
        return this;
    }

    Pieces text(Role role, String text) {
        tokens.add(Token.of(role, term, text));
        return this;
    }

    Pieces text(Role role, String plain, String latex) {
        tokens.add(Token.of(role, term, plain, latex));
        return this;
    }

    Pieces times() {
        return text(Role.TIMES, "*", " \\cdot ");
    }

    Pieces number(Role role, Real value) {
        tokens.add(Token.number(role, term, value, style));
        return this;
    }

    Pieces number(Role role, Real value, Style own) {
        tokens.add(Token.number(role, term, value, own));
        return this;
    }

    List<Token> tokens() {
        return List.copyOf(tokens);
    }

    /** The text, without a plus in front. */
    static String plain(List<Token> tokens) {
        StringBuilder text = new StringBuilder();
        tokens.forEach(token -> text.append(token.plain()));
        return withoutPlus(text.toString());
    }

    static String latex(List<Token> tokens) {
        StringBuilder text = new StringBuilder();
        tokens.forEach(token -> text.append(token.latex()));
        return withoutPlus(text.toString());
    }

    private static String withoutPlus(String text) {
        String tidy = text.replace("( + ", "(").replace("( - ", "(-")
                .replace("\\left( + ", "\\left(").replace("\\left( - ", "\\left(-");
        return tidy.startsWith(" + ") ? tidy.substring(3) : tidy.startsWith(" - ") ? "-" + tidy.substring(3) : tidy;
    }
}
