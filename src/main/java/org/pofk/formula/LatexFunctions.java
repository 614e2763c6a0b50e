package org.pofk.formula;

import java.util.List;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.pofk.formula.Token.Kind;
import org.pofk.text.RefusedException;

/** Fractions, roots, functions and their arguments in LaTeX. */
final class LatexFunctions {
    private static final Pattern KRONECKER = Pattern.compile("k,?([0-9]+)|([0-9]+),?k");

    private final LatexScanner scanner;
    private final LatexGroups groups;
    private final LatexTokens items;

    LatexFunctions(LatexScanner scanner, LatexGroups groups, LatexTokens items) {
        this.scanner = scanner;
        this.groups = groups;
        this.items = items;
    }

    /** A quotient in parentheses of its own; behind a number it may not look like a mixed one. */
    void fraction(int start) throws RefusedException {
        boolean isBehindNumber = scanner.lastIs(Kind.NUMBER);
        int first = scanner.tokens().size();
        scanner.add(Kind.OPEN, start);
        groups.argument("\\frac", start);
        scanner.add(Kind.DIVIDE, scanner.offset());
        groups.argument("\\frac", start);
        groups.requireNoDigit("\\frac");
        scanner.add(Kind.CLOSE, "}", scanner.offset());
        List<Token> tokens = scanner.tokens().subList(first, scanner.tokens().size());
        boolean isNumber = tokens.size() == 9 && tokens.get(2).is(Kind.NUMBER) && tokens.get(6).is(Kind.NUMBER);
        if (isBehindNumber && isNumber) {
            throw scanner.refused(start, "mixed-number", "a fraction right behind a number can be read as added or as"
                    + " multiplied: write + or \\cdot");
        }
    }

    void binomial(int start) throws RefusedException {
        scanner.add(Kind.NAME, "binomial", start);
        scanner.add(Kind.OPEN, scanner.offset());
        groups.argument("\\binom", start);
        scanner.add(Kind.COMMA, scanner.offset());
        groups.argument("\\binom", start);
        groups.requireNoDigit("\\binom");
        scanner.add(Kind.CLOSE, "}", scanner.offset());
    }

    /** A square root, or with {@code [n]} the power 1/n. */
    void root(int start) throws RefusedException {
        scanner.skipBlanks();
        if (!scanner.sees("[")) {
            scanner.add(Kind.NAME, "sqrt", start);
            groups.argument("\\sqrt", start);
            groups.requireNoDigit("\\sqrt");
            return;
        }
        int degreeAt = scanner.offset() + 1;
        scanner.takes("[");
        while (scanner.isDigitAt(scanner.offset())) {
            scanner.skip();
        }
        String degree = scanner.since(degreeAt);
        if (!degree.matches("[2-9]|[1-9][0-9]{1,2}") || !scanner.takes("]")) {
            throw scanner.refused(degreeAt, "root-degree", "the degree of a root is a whole number from 2 to 999");
        }
        scanner.add(Kind.OPEN, start);
        int radicandAt = scanner.tokens().size();
        groups.argument("\\sqrt", start);
        groups.requireNoDigit("\\sqrt");
        if (scanner.tokens().get(radicandAt + 1).is(Kind.MINUS)) {
            throw scanner.refused(start, "root-negative", "a root of a negative number has more than one meaning");
        }
        scanner.add(Kind.POWER, scanner.offset());
        scanner.add(Kind.OPEN, scanner.offset());
        scanner.add(Kind.NUMBER, "1", scanner.offset());
        scanner.add(Kind.DIVIDE, scanner.offset());
        scanner.tokens().add(new Token(Kind.NUMBER, degree, degreeAt, degreeAt + degree.length()));
        scanner.add(Kind.CLOSE, scanner.offset());
        scanner.add(Kind.CLOSE, scanner.offset());
    }

    /** {@code e^{…}} is the exponential function; an upright e alone its value at 1. */
    void euler(int start, boolean isUpright) throws RefusedException {
        int end = scanner.offset();
        scanner.skipBlanks();
        if (scanner.next() == '^') {
            scanner.takes("^");
            scanner.add(Kind.NAME, "exp", start);
            groups.exponent(start);
            groups.requireNoScript();
            return;
        }
        scanner.backTo(end);
        if (!isUpright) {
            throw scanner.refused(start, "letter-e", "a lone e can be a number or a name: write \\mathrm{e} or"
                    + " \\mathit{e}");
        }
        scanner.add(Kind.NAME, "exp", start);
        scanner.add(Kind.OPEN, end);
        scanner.add(Kind.NUMBER, "1", end);
        scanner.add(Kind.CLOSE, end);
    }

    /** {@code \operatorname{arctan}}. */
    void operator(int start) throws RefusedException {
        scanner.skipBlanks();
        int from = scanner.offset() + 1;
        scanner.takes("{");
        while (LatexScanner.isAsciiLetter(scanner.next())) {
            scanner.skip();
        }
        String word = scanner.since(Math.min(from, scanner.offset()));
        Optional<Formula.Function> function = Words.function(word);
        if (function.isEmpty() || function.get().arity() != 1 || !scanner.takes("}")) {
            throw scanner.refused(start, "command-unknown", "no function of this name is known here: there are"
                    + " \\cos, \\sin, \\exp, \\arctan and \\arccos");
        }
        call(word, start);
    }

    /** A function with its argument: in parentheses or braces, or all up to the next plus, minus or end. */
    void call(String function, int start) throws RefusedException {
        scanner.skipSpaces();
        int from = scanner.offset();
        if (scanner.next() == '^' || scanner.next() == '_') {
            throw scanner.refused(from, "function-power", "an exponent between a function and its argument has more than"
                    + " one meaning: write \\left(\\" + function + "(…)\\right)^{2}, or \\arccos and \\arctan");
        }
        scanner.add(Kind.NAME, function, start);
        if (groups.seesParenthesis()) {
            groups.parenthesis();
        } else if (scanner.sees("{")) {
            groups.argument("\\" + function, start);
        } else {
            bareArgument(function, start);
        }
        int end = scanner.offset();
        scanner.skipBlanks();
        if (scanner.next() == '^') {
            throw scanner.refused(scanner.offset(), "function-power", "an exponent behind a function's argument has two"
                    + " readings: write \\left(\\" + function + "(…)\\right)^{2}, or the power within the argument");
        }
        scanner.backTo(end);
    }

    private void bareArgument(String function, int start) throws RefusedException {
        scanner.tokens().add(new Token(Kind.OPEN, "(", scanner.offset(), scanner.offset()));
        int first = scanner.tokens().size();
        int end = scanner.offset();
        while (!items.seesCloser() && "+-−–±∓=<>≤≥≠≈,;".indexOf(scanner.next()) < 0 && !endsArgument()) {
            int before = scanner.tokens().size();
            requireClear(!groups.seesParenthesis() && !seesFunction(), function, start);
            items.item();
            requireClear(scanner.tokens().stream().skip(before).limit(1).noneMatch(LatexFunctions::isSign), function,
                    start);
            end = scanner.offset();
            scanner.skipSpaces();
        }
        if (scanner.tokens().size() == first) {
            throw scanner.refused(start, "function-arguments", "the argument of \\" + function + " goes in parentheses");
        }
        scanner.backTo(end);
        scanner.tokens().add(new Token(Kind.CLOSE, ")", end, end));
    }

    private boolean seesFunction() {
        return LatexWords.function(scanner.command()).isPresent() || scanner.command().equals("operatorname");
    }

    private static boolean isSign(Token token) {
        return token.is(Kind.TIMES) || token.is(Kind.DIVIDE) || token.is(Kind.FOR)
                || token.is(Kind.NUMBER) && token.text().contains("e");
    }

    private void requireClear(boolean isClear, String function, int start) throws RefusedException {
        if (!isClear) {
            throw scanner.refused(start, "function-arguments", "where the argument of \\" + function
                    + " ends can be read in two ways: put it in parentheses");
        }
    }

    private boolean endsArgument() {
        String command = scanner.command();
        return command.equals("pm") || command.equals("mp") || LatexWords.relation(command).isPresent();
    }

    /** {@code \delta[k-1]}, {@code \delta(k)}, Kronecker's {@code \delta_{k,0}}; alone a name. */
    void delta(int start, LatexLetters letters) throws RefusedException {
        int end = scanner.offset();
        scanner.skipSpaces();
        if (groups.seesParenthesis()) {
            scanner.add(Kind.NAME, "delta", start);
            groups.parenthesis();
            groups.requireNoScript();
            return;
        }
        scanner.backTo(end);
        int before = scanner.tokens().size();
        letters.letter("δ", start);
        Token name = scanner.tokens().get(before);
        Matcher kronecker = KRONECKER.matcher(name.text().replaceFirst("^δ_", ""));
        if (name.is(Kind.QUOTED) && kronecker.matches()) {
            scanner.tokens().remove(before);
            kronecker(start, kronecker.group(1) == null ? kronecker.group(2) : kronecker.group(1));
        }
    }

    private void kronecker(int start, String step) {
        scanner.add(Kind.NAME, "delta", start);
        scanner.add(Kind.OPEN, scanner.offset());
        scanner.add(Kind.NAME, "k", start);
        if (!step.matches("0+")) {
            scanner.add(Kind.MINUS, start);
            scanner.add(Kind.NUMBER, step, start);
        }
        scanner.add(Kind.CLOSE, scanner.offset());
    }
}
