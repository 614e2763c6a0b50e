package org.pofk.formula;

import java.util.ArrayList;
import java.util.IdentityHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import org.pofk.formula.Formula.Call;
import org.pofk.formula.Formula.Constant;
import org.pofk.formula.Formula.Function;
import org.pofk.formula.Formula.Negation;
import org.pofk.formula.Formula.Power;
import org.pofk.formula.Formula.Product;
import org.pofk.formula.Formula.Quotient;
import org.pofk.formula.Formula.Sum;
import org.pofk.formula.Formula.Symbol;
import org.pofk.formula.Token.Kind;
import org.pofk.text.Fault;
import org.pofk.text.Places;
import org.pofk.text.Position;
import org.pofk.text.RefusedException;
import org.pofk.text.Span;
import org.pofk.text.Suggestion;

/**
 * Reads a formula in ordinary notation by precedence: sums below signs below products and quotients (from the left)
 * below powers (from the right). The tree is faithful: nothing is computed, fractions stay quotients, decimals keep
 * their text, and parentheses show only as nesting. What could be read in two ways ({@code 1/2k}) is refused with
 * the ways out. Linear in the length; length, nesting and number of parts are bounded, so hostile text ends at once.
 */
public final class FormulaParser {
    /** Longest text, in UTF-16 units. */
    public static final int LONGEST = 65_536;
    /** Deepest nesting of signs, parentheses, functions and powers. */
    public static final int DEEPEST = 200;
    /** Most nodes of the tree. */
    public static final int MOST_NODES = 20_000;

    private final String text;
    private final Places places;
    private final List<Token> tokens;
    private int next;
    private int depth;
    /** The height of every tree built so far: a long chain of divisions nests without nesting its text. */
    private final Map<ParsedFormula, Integer> heights = new IdentityHashMap<>();
    /** How the factor read last ends: decides what may stand behind it without a sign. */
    private Ending ending = Ending.CLOSED;

    private FormulaParser(String text, Places places, Set<String> names) throws RefusedException {
        this.text = text;
        this.places = places;
        this.tokens = Lexer.read(text, places, names);
    }

    /** Reads a text that stands in its source as it is, beginning at {@code start}. */
    public static ParsedFormula parse(String text, Position start) throws RefusedException {
        requireLength(text, start);
        return parse(text, Places.from(start, text), Set.of());
    }

    /**
     * Reads a text whose characters stand at {@code places}.
     *
     * @param names known names; only those that begin with a digit matter, which would otherwise be read as products
     */
    public static ParsedFormula parse(String text, Places places, Set<String> names) throws RefusedException {
        requireLength(text, places.at(0));
        FormulaParser parser = new FormulaParser(text, places, names);
        if (parser.peek().is(Kind.END)) {
            throw parser.refused(0, "formula-empty", "a formula is missing here");
        }
        ParsedFormula whole = parser.sum();
        parser.requireEnd();
        return whole;
    }

    private static void requireLength(String text, Position start) throws RefusedException {
        if (text.length() > LONGEST) {
            throw new RefusedException(List.of(new Fault(start, "formula-too-long",
                    "the formula has " + text.length() + " characters, more than " + LONGEST)));
        }
    }

    private ParsedFormula sum() throws RefusedException {
        List<ParsedFormula> terms = new ArrayList<>();
        if (peek().is(Kind.PLUS)) {
            take();
        }
        terms.add(term());
        while (peek().is(Kind.PLUS) || peek().is(Kind.MINUS)) {
            Token sign = take();
            ParsedFormula term = term();
            terms.add(sign.is(Kind.PLUS) ? term : negation(sign, term));
        }
        return terms.size() == 1 ? terms.get(0) : node(new Sum(formulas(terms)), terms);
    }

    private ParsedFormula term() throws RefusedException {
        if (!peek().is(Kind.MINUS)) {
            return product();
        }
        enter();
        Token sign = take();
        ParsedFormula negation = negation(sign, term());
        depth--;
        return negation;
    }

    private ParsedFormula product() throws RefusedException {
        Token first = peek();
        List<ParsedFormula> factors = new ArrayList<>(List.of(factor()));
        Optional<Token> division = Optional.empty();
        while (true) {
            if (peek().is(Kind.TIMES)) {
                take();
                factors.add(signedFactor());
                division = Optional.empty();
            } else if (peek().is(Kind.DIVIDE)) {
                division = Optional.of(take());
                List<ParsedFormula> operands = List.of(joined(factors), signedFactor());
                factors = new ArrayList<>(List.of(node(
                        new Quotient(operands.get(0).formula(), operands.get(1).formula()), operands)));
            } else if (peek().beginsOperand()) {
                requireProductWithoutSign();
                int behindDenominator = end();
                factors.add(factor());
                if (division.isPresent()) {
                    throw ambiguousDivision(first, division.get(), behindDenominator);
                }
            } else {
                return joined(factors);
            }
        }
    }

    private ParsedFormula joined(List<ParsedFormula> factors) throws RefusedException {
        return factors.size() == 1 ? factors.get(0) : node(new Product(formulas(factors)), factors);
    }

    private ParsedFormula signedFactor() throws RefusedException {
        if (!peek().is(Kind.MINUS)) {
            return factor();
        }
        enter();
        Token sign = take();
        ParsedFormula negation = negation(sign, signedFactor());
        depth--;
        return negation;
    }

    private ParsedFormula factor() throws RefusedException {
        ParsedFormula base = atom();
        if (peek().is(Kind.POWER) || peek().is(Kind.SUPERSCRIPT)) {
            if (ending == Ending.ROOT) {
                throw refused(peek().start(), "ambiguous-root", "a power right behind a root can be read in two ways:"
                        + " write (√x)^k or √(x^k), with parentheses");
            }
            ParsedFormula exponent = exponent();
            return node(new Power(base.formula(), exponent.formula()), List.of(base, exponent));
        }
        return base;
    }

    private ParsedFormula exponent() throws RefusedException {
        if (peek().is(Kind.SUPERSCRIPT)) {
            Token raised = take();
            ending = Ending.CLOSED;
            if (peek().is(Kind.POWER) || peek().is(Kind.SUPERSCRIPT)) {
                throw refused(peek().start(), "ambiguous-power", "a power of a power needs parentheses");
            }
            return leaf(WrittenNumbers.integer(raised.text()), raised);
        }
        take();
        enter();
        ParsedFormula exponent = signedFactor();
        ending = ending.asExponent();
        depth--;
        return exponent;
    }

    private ParsedFormula atom() throws RefusedException {
        Token token = take();
        return switch (token.kind()) {
            case NUMBER -> atom(WrittenNumbers.read(token.text()), token, Ending.NUMBER);
            case QUOTED -> atom(new Symbol(token.text()), token, Ending.NAME);
            case DEGREE -> atom(Constant.DEGREE, token, Ending.CONSTANT);
            case NAME -> nameOrCall(token);
            case OPEN -> parenthesis(token);
            case ROOT -> root(token);
            default -> throw missingOperand(token);
        };
    }

    private ParsedFormula atom(Formula formula, Token token, Ending itsEnding) throws RefusedException {
        ending = itsEnding;
        return leaf(formula, token);
    }

    private ParsedFormula nameOrCall(Token name) throws RefusedException {
        Optional<Function> function = Words.function(name.text());
        if (function.isPresent() && peek().is(Kind.OPEN)) {
            return call(name, function.get());
        }
        if (function.isPresent() && peek().beginsOperand()) {
            throw refused(name.start(), "function-arguments",
                    "the argument of " + name.text() + " goes in parentheses: " + name.text() + "(…)");
        }
        Optional<Constant> constant = Words.constant(name.text());
        if (constant.isPresent()) {
            return atom(constant.get(), name, Ending.CONSTANT);
        }
        boolean isLetter = name.text().codePointCount(0, name.text().length()) == 1;
        return atom(new Symbol(name.text()), name, isLetter ? Ending.LETTER : Ending.NAME);
    }

    private ParsedFormula call(Token name, Function function) throws RefusedException {
        enter();
        Token open = take();
        List<ParsedFormula> arguments = new ArrayList<>(List.of(sum()));
        while (peek().is(Kind.COMMA)) {
            take();
            arguments.add(sum());
        }
        requireClose(open);
        depth--;
        ending = Ending.CLOSED;
        if (arguments.size() != function.arity()) {
            throw refused(name.start(), "function-arguments", name.text() + " takes "
                    + (function.arity() == 1 ? "one argument" : "two arguments") + ", not " + arguments.size());
        }
        return node(new Call(function, formulas(arguments)), arguments, span(name.start(), end()));
    }

    private ParsedFormula parenthesis(Token open) throws RefusedException {
        enter();
        ParsedFormula inner = sum();
        requireClose(open);
        depth--;
        ending = Ending.CLOSED;
        ParsedFormula enclosed = new ParsedFormula(inner.formula(), span(open.start(), end()), inner.parts());
        heights.put(enclosed, heights.get(inner));
        return enclosed;
    }

    private ParsedFormula root(Token sign) throws RefusedException {
        enter();
        Ending itsEnding = peek().is(Kind.OPEN) ? Ending.CLOSED : Ending.ROOT;
        ParsedFormula radicand = atom();
        depth--;
        ending = itsEnding;
        return node(new Call(Function.SQRT, List.of(radicand.formula())), List.of(radicand),
                span(sign.start(), end()));
    }

    /** Refuses what stands behind the last factor without a sign, unless that can only be a product. */
    private void requireProductWithoutSign() throws RefusedException {
        Token token = peek();
        boolean beginsCall = token.is(Kind.NAME) && Words.function(token.text()).isPresent()
                && tokens.get(next + 1).is(Kind.OPEN);
        boolean isConstant = token.is(Kind.DEGREE)
                || token.is(Kind.NAME) && Words.constant(token.text()).isPresent();
        Token before = tokens.get(next - 1);
        if (token.is(Kind.NUMBER)) {
            throw refused(token.start(), "operator-missing",
                    "between '" + before.text() + "' and '" + Words.shortened(token.text()) + "' a sign is missing");
        }
        if (beginsCall || ending == Ending.CLOSED || ending == Ending.NUMBER || ending == Ending.CONSTANT) {
            return;
        }
        if (ending == Ending.NUMBER_EXPONENT && token.is(Kind.OPEN)) {
            return;
        }
        if (ending.isExponent()) {
            throw refused(token.start(), "ambiguous-power", "what stands behind the exponent " + before.text()
                    + " can be read in two ways: write * for a product, or the whole exponent in parentheses");
        }
        if (ending == Ending.ROOT) {
            throw refused(token.start(), "ambiguous-root", "what stands behind √" + before.text()
                    + " can be read in two ways: write * for a product, or all under the root in parentheses");
        }
        if (isConstant || ending == Ending.LETTER && token.is(Kind.OPEN)) {
            return;
        }
        throw token.is(Kind.OPEN) ? unknownFunction(before) : namesSideBySide(before, token);
    }

    private RefusedException unknownFunction(Token name) {
        String suggestion = Suggestion.didYouMean(Words.FUNCTION_NAMES, name.text());
        return refused(name.start(), "function-unknown", "no function is called '" + Words.shortened(name.text()) + "'"
                + suggestion + (suggestion.isEmpty() ? "; a product is written with *" : ""));
    }

    private RefusedException namesSideBySide(Token first, Token second) {
        String names = text.substring(first.start(), second.end());
        return refused(second.start(), "operator-missing", "between '" + Words.shortened(first.text()) + "' and '"
                + Words.shortened(second.text()) + "' a sign is missing"
                + (names.contains("'") ? "" : "; a name with spaces is written in quotes: '"
                        + Words.shortened(names) + "'"));
    }

    private RefusedException ambiguousDivision(Token first, Token division, int behindDenominator) {
        String numerator = Words.shortened(text.substring(first.start(), division.start()).strip());
        String denominator = Words.shortened(text.substring(division.end(), behindDenominator).strip());
        String factor = Words.shortened(text.substring(behindDenominator, end()).strip());
        return refused(division.start(), "ambiguous-division", "'"
                + Words.shortened(text.substring(first.start(), end())) + "' can be read in two ways: write ("
                + numerator + "/" + denominator + ")*" + factor + " or " + numerator + "/(" + denominator + "*" + factor
                + ")");
    }

    private RefusedException missingOperand(Token found) {
        next--;
        if (found.is(Kind.END) && next > 0) {
            Token before = tokens.get(next - 1);
            return refused(before.start(), "operand-missing", "the formula ends after '" + before.text() + "'");
        }
        return refused(found.start(), "operand-missing",
                "a number, a name or a parenthesis is missing before '" + found.text() + "'");
    }

    private void requireClose(Token open) throws RefusedException {
        if (peek().is(Kind.CLOSE)) {
            take();
        } else if (peek().is(Kind.END)) {
            throw refused(open.start(), "parenthesis-open", "the parenthesis that opens here isn't closed");
        } else {
            throw unexpected();
        }
    }

    private void requireEnd() throws RefusedException {
        if (!peek().is(Kind.END)) {
            throw unexpected();
        }
    }

    private RefusedException unexpected() {
        Token token = peek();
        if (!token.is(Kind.COMMA)) {
            return refused(token.start(), "parenthesis-extra", "nothing is open that '" + token.text() + "' closes");
        }
        Token before = tokens.get(next - 1);
        Token after = tokens.get(next + 1);
        boolean isDecimal = before.is(Kind.NUMBER) && after.is(Kind.NUMBER)
                && before.end() == token.start() && token.end() == after.start();
        return isDecimal
                ? refused(token.start(), "decimal-comma", "a decimal comma: write "
                        + Words.shortened(before.text() + "." + after.text()))
                : refused(token.start(), "comma", "a comma stands only between the arguments of a function");
    }

    private Token peek() {
        return tokens.get(next);
    }

    private Token take() {
        return tokens.get(next++);
    }

    /** Offset after the token taken last. */
    private int end() {
        return tokens.get(next - 1).end();
    }

    private void enter() throws RefusedException {
        if (++depth > DEEPEST) {
            throw tooDeep();
        }
    }

    private ParsedFormula negation(Token minus, ParsedFormula operand) throws RefusedException {
        return node(new Negation(operand.formula()), List.of(operand),
                span(minus.start(), minus.end()).to(operand.span()));
    }

    private ParsedFormula leaf(Formula formula, Token token) throws RefusedException {
        return node(formula, List.of(), span(token.start(), token.end()));
    }

    private ParsedFormula node(Formula formula, List<ParsedFormula> parts) throws RefusedException {
        return node(formula, parts, parts.get(0).span().to(parts.get(parts.size() - 1).span()));
    }

    private ParsedFormula node(Formula formula, List<ParsedFormula> parts, Span span) throws RefusedException {
        ParsedFormula node = new ParsedFormula(formula, span, parts);
        int height = 1 + parts.stream().mapToInt(heights::get).max().orElse(0);
        if (height > DEEPEST) {
            throw tooDeep();
        }
        heights.put(node, height);
        if (heights.size() > MOST_NODES) {
            throw refused(peek().start(), "formula-too-large", "the formula has more than " + MOST_NODES + " parts");
        }
        return node;
    }

    private RefusedException tooDeep() {
        return refused(peek().start(), "formula-too-deep", "the formula is nested more than " + DEEPEST + " deep");
    }

    private static List<Formula> formulas(List<ParsedFormula> parts) {
        return parts.stream().map(ParsedFormula::formula).toList();
    }

    private Span span(int start, int end) {
        return new Span(places.at(start), places.at(end));
    }

    private RefusedException refused(int offset, String code, String message) {
        return new RefusedException(List.of(new Fault(places.at(offset), code, message)));
    }
}
