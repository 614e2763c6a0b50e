package org.pofk.formula;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalInt;
import java.util.Set;
import org.pofk.formula.FormulaReading.PlusMinus;
import org.pofk.formula.Token.Kind;
import org.pofk.text.Fault;
import org.pofk.text.Places;
import org.pofk.text.RefusedException;

/** Splits a formula's text into tokens; linear in its length. */
final class Lexer {
    private static final int LARGEST_EXPONENT = 400;
    private static final String SUPERSCRIPTS = "⁰¹²³⁴⁵⁶⁷⁸⁹";

    private final String text;
    private final Places places;
    private final Set<String> names;
    private final Limits limits;
    private final PlusMinus plusMinus;
    private final List<Token> tokens = new ArrayList<>();
    private int at;
    /** How many braces of formulas in cases are open. */
    private int braces;

    private Lexer(String text, Places places, Set<String> names, Limits limits, PlusMinus plusMinus) {
        this.text = text;
        this.places = places;
        this.names = names;
        this.limits = limits;
        this.plusMinus = plusMinus;
    }

    /** The tokens, ending with one {@link Kind#END}; {@code names} are known names that may begin with a digit. */
    static List<Token> read(String text, Places places, Set<String> names) throws RefusedException {
        return new Lexer(text, places, names, Limits.MODEL, PlusMinus.REFUSED).all();
    }

    /** The same for a claim: a name that isn't known is refused where a letter of it only looks like another. */
    static List<Token> readClaim(String text, Places places, Set<String> names, PlusMinus plusMinus)
            throws RefusedException {
        return new Lexer(text, places, names, Limits.CLAIM, plusMinus).all();
    }

    private List<Token> all() throws RefusedException {
        while (at < text.length()) {
            readOne();
        }
        add(Kind.END, "", at);
        return tokens;
    }

    private void readOne() throws RefusedException {
        int start = at;
        int c = text.codePointAt(at);
        if (Character.isWhitespace(c) || Character.isSpaceChar(c)) {
            at += Character.charCount(c);
        } else if (isDigit(at) || c == '.' && isDigit(at + 1)) {
            numberOrName(start);
        } else if (Words.beginsName(c)) {
            skipName();
            String word = Words.normalized(text.substring(start, at));
            requireRealLetters(word, start);
            add(braces > 0 && Words.OF_CASES.contains(word) ? Kind.FOR : Kind.NAME, word, start);
        } else if (c == '\'') {
            quoted(start);
        } else if (c == '⁻' || SUPERSCRIPTS.indexOf(c) >= 0) {
            superscript(start);
        } else if ("=<>≤≥≠≈!".indexOf(c) >= 0) {
            relation(c, start);
        } else {
            at += Character.charCount(c);
            add(sign(c, start), text.substring(start, at), start);
        }
    }

    /** Refuses a letter of a claim that only looks like one of ASCII. */
    private void requireRealLetters(String word, int start) throws RefusedException {
        OptionalInt disguised = limits == Limits.CLAIM && !names.contains(word)
                ? LookAlikes.disguised(text.substring(start, at)) : OptionalInt.empty();
        if (disguised.isPresent()) {
            int c = disguised.getAsInt();
            throw refused(text.indexOf(c, start), "look-alike",
                    LookAlikes.described(c) + " isn't known here" + LookAlikes.wayOut(c));
        }
    }

    private Kind sign(int c, int start) throws RefusedException {
        return switch (c) {
            case '+' -> Kind.PLUS;
            case '-', '−', '–' -> Kind.MINUS;
            case '*' -> {
                if (at < text.length() && text.charAt(at) == '*') {
                    throw refused(start, "power-sign", "'**' has no meaning here: a power is written with ^");
                }
                yield Kind.TIMES;
            }
            case '·', '×', '⋅', '∙' -> Kind.TIMES;
            case '/', '÷', '∕', '⁄' -> Kind.DIVIDE;
            case '^' -> Kind.POWER;
            case '(' -> Kind.OPEN;
            case ')' -> Kind.CLOSE;
            case ',' -> Kind.COMMA;
            case ';' -> Kind.SEMICOLON;
            case '{' -> {
                braces++;
                yield Kind.BRACE_OPEN;
            }
            case '}' -> {
                braces--;
                yield Kind.BRACE_CLOSE;
            }
            case '√' -> Kind.ROOT;
            case '°' -> Kind.DEGREE;
            case '±', '∓' -> plusMinus(c, start);
            case '%' -> throw refused(start, "percent-sign",
                    "a percent sign belongs right behind a number, as in 30%");
            default -> throw refused(start, "character", LookAlikes.described(c) + " has no meaning in a formula" + hint(c));
        };
    }

    /** One of {@code = < <= > >= !=}, or the single character for it. */
    private void relation(int c, int start) throws RefusedException {
        at++;
        boolean hasEqual = "<>!".indexOf(c) >= 0 && at < text.length() && text.charAt(at) == '=';
        at += hasEqual ? 1 : 0;
        if (c == '!' && !hasEqual) {
            throw refused(start, "character", "'!' has no meaning in a formula");
        }
        add(Kind.RELATION, switch (c) {
            case '≤' -> "<=";
            case '≥' -> ">=";
            case '≠' -> "!=";
            default -> text.substring(start, at);
        }, start);
    }

    private Kind plusMinus(int c, int start) throws RefusedException {
        if (plusMinus == PlusMinus.REFUSED) {
            throw refused(start, "character", LookAlikes.described(c) + " has no meaning in a formula");
        }
        return (c == '±') == (plusMinus == PlusMinus.PLUS) ? Kind.PLUS : Kind.MINUS;
    }

    private static String hint(int c) {
        return switch (c) {
            case '[', ']' -> ": parentheses are ( and )";
            case '"', '‘', '’', '“', '”', '`' -> ": names are quoted with '";
            case '\\' -> ": this is ordinary notation, not LaTeX";
            default -> LookAlikes.wayOut(c);
        };
    }

    private boolean isDigit(int offset) {
        return offset < text.length() && text.charAt(offset) >= '0' && text.charAt(offset) <= '9';
    }

    private void skipDigits() {
        while (isDigit(at)) {
            at++;
        }
    }

    private void skipName() {
        while (at < text.length() && Words.continuesName(text.codePointAt(at))) {
            at += Character.charCount(text.codePointAt(at));
        }
    }

    /** A number, or a name that begins with a digit when it is one of the known names. */
    private void numberOrName(int start) throws RefusedException {
        skipName();
        String word = Words.normalized(text.substring(start, at));
        if (names.contains(word) && !word.matches("[0-9]+([eE][0-9]+)?")) {
            String rest = word.replaceFirst("^[0-9]+", "");
            if (names.contains(rest)) {
                throw refused(start, "name-or-product", "'" + word + "' is a name, and " + rest + " is one too: write '"
                        + word + "' in quotes for the name, or " + word.substring(0, word.length() - rest.length())
                        + "*" + rest + " for the product");
            }
            add(Kind.NAME, word, start);
        } else {
            at = start;
            number(start);
        }
    }

    private void number(int start) throws RefusedException {
        skipDigits();
        if (at < text.length() && text.charAt(at) == '.') {
            at++;
            skipDigits();
        }
        int exponentAt = at;
        skipExponent();
        String exponent = text.substring(exponentAt, at);
        if (at < text.length() && text.charAt(at) == '.') {
            throw refused(start, "number-unreadable",
                    "'" + Words.shortened(text.substring(start, at + 1)) + "' is no number: it has a point too many");
        }
        if (!exponent.isEmpty() && exceedsLimit(exponent)) {
            throw refused(exponentAt, "exponent-out-of-range", "the exponent '" + Words.shortened(exponent)
                    + "' lies outside -" + LARGEST_EXPONENT + " to " + LARGEST_EXPONENT);
        }
        if (at < text.length() && text.charAt(at) == '%') {
            if (!exponent.isEmpty()) {
                throw refused(at, "percent-sign", "a number has either an exponent or a percent sign, not both");
            }
            at++;
        }
        add(Kind.NUMBER, text.substring(start, at).replaceAll("[−–]", "-"), start);
    }

    /** An e counts as exponent only when digits follow, with or without a sign: {@code 2e} is 2 times e. */
    private void skipExponent() {
        if (at < text.length() && (text.charAt(at) == 'e' || text.charAt(at) == 'E')) {
            int digitsAt = at + 1 < text.length() && "+-−–".indexOf(text.charAt(at + 1)) >= 0 ? at + 2 : at + 1;
            if (isDigit(digitsAt)) {
                at = digitsAt;
                skipDigits();
            }
        }
    }

    private static boolean exceedsLimit(String exponent) {
        String digits = exponent.replaceFirst("^[^0-9]+0*", "");
        return digits.length() > 3 || !digits.isEmpty() && Integer.parseInt(digits) > LARGEST_EXPONENT;
    }

    private void superscript(int start) throws RefusedException {
        StringBuilder digits = new StringBuilder();
        if (text.charAt(at) == '⁻') {
            digits.append('-');
            at++;
        }
        while (at < text.length() && SUPERSCRIPTS.indexOf(text.charAt(at)) >= 0) {
            digits.append(SUPERSCRIPTS.indexOf(text.charAt(at)));
            at++;
        }
        if (digits.toString().equals("-")) {
            throw refused(start, "character", "a raised minus sign needs raised digits behind it");
        }
        add(Kind.SUPERSCRIPT, digits.toString(), start);
    }

    /** A name in single quotes; two of them inside stand for one. */
    private void quoted(int start) throws RefusedException {
        StringBuilder name = new StringBuilder();
        at++;
        while (true) {
            if (at >= text.length()) {
                throw refused(start, "quote-open", "the quote that begins here isn't closed");
            }
            char c = text.charAt(at++);
            if (c == '\'') {
                if (at >= text.length() || text.charAt(at) != '\'') {
                    break;
                }
                at++;
            } else if (Character.isISOControl(c)) {
                throw refused(at - 1, "character", LookAlikes.described(c) + " can't be part of a name");
            }
            name.append(c);
        }
        if (name.toString().isBlank()) {
            throw refused(start, "name-empty", "a name in quotes can't be empty");
        }
        add(Kind.QUOTED, Words.normalized(name.toString().strip()), start);
    }

    private void add(Kind kind, String content, int start) {
        tokens.add(new Token(kind, content, start, at));
    }

    private RefusedException refused(int offset, String code, String message) {
        return new RefusedException(List.of(new Fault(places.at(offset), code, message)));
    }
}
