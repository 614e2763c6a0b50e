package org.pofk.formula;

import java.util.ArrayList;
import java.util.List;
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
import org.pofk.text.Places;
import org.pofk.text.Position;
import org.pofk.text.RefusedException;

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

    private final Cursor cursor;
    private final NodeBuilder nodes;
    /** How the factor read last ends: decides what may stand behind it without a sign. */
    private Ending ending = Ending.CLOSED;

    private FormulaParser(Cursor cursor) {
        this.cursor = cursor;
        this.nodes = new NodeBuilder(cursor);
    }

    /** Reads a text that stands in its source as it is, beginning at {@code start}. */
    public static ParsedFormula parse(String text, Position start) throws RefusedException {
        Limits.MODEL.require(text, offset -> start);
        return parse(text, Places.from(start, text), Set.of());
    }

    /**
     * Reads a text whose characters stand at {@code places}.
     *
     * @param names known names; only those that begin with a digit matter, which would otherwise be read as products
     */
    public static ParsedFormula parse(String text, Places places, Set<String> names) throws RefusedException {
        Limits.MODEL.require(text, places);
        return whole(new Cursor(text, places, Lexer.read(text, places, names), Rules.OF_MODELS));
    }

    /**
     * Reads a formula of a claim: a left side that says what {@code reading} expects is dropped, characters that only
     * look like others are refused.
     *
     * @param names the model's names, which may hold any letters
     */
    public static ParsedFormula parse(String text, Places places, Set<String> names, FormulaReading reading)
            throws RefusedException {
        Limits.CLAIM.require(text, places);
        Cursor cursor = new Cursor(text, places, Lexer.readClaim(text, places, names, reading.plusMinus()),
                new Rules(Notation.PLAIN, Limits.CLAIM, reading.unit()));
        LeftSide.drop(cursor, reading.subject());
        return whole(cursor);
    }

    /** Reads all tokens as one formula. */
    static ParsedFormula whole(Cursor cursor) throws RefusedException {
        if (cursor.sees(Kind.END)) {
            throw cursor.refused(cursor.peek(), "formula-empty", "a formula is missing here");
        }
        FormulaParser parser = new FormulaParser(cursor);
        ParsedFormula whole = parser.sum();
        if (!cursor.sees(Kind.END)) {
            throw parser.unexpected();
        }
        return whole;
    }

    private ParsedFormula sum() throws RefusedException {
        List<ParsedFormula> terms = new ArrayList<>();
        if (cursor.sees(Kind.PLUS)) {
            cursor.take();
        }
        terms.add(term());
        while (cursor.sees(Kind.PLUS) || cursor.sees(Kind.MINUS)) {
            Token sign = cursor.take();
            ParsedFormula term = term();
            terms.add(sign.is(Kind.PLUS) ? term : negation(sign, term));
        }
        return terms.size() == 1 ? terms.get(0) : nodes.node(new Sum(formulas(terms)), terms);
    }

    private ParsedFormula term() throws RefusedException {
        if (!cursor.sees(Kind.MINUS)) {
            return product();
        }
        nodes.enter();
        Token sign = cursor.take();
        ParsedFormula negation = negation(sign, term());
        nodes.leave();
        return negation;
    }

    private ParsedFormula product() throws RefusedException {
        Token first = cursor.peek();
        List<ParsedFormula> factors = new ArrayList<>(List.of(factor()));
        Optional<Token> division = Optional.empty();
        while (true) {
            if (cursor.sees(Kind.TIMES)) {
                cursor.take();
                factors.add(signedFactor());
                division = Optional.empty();
            } else if (cursor.sees(Kind.DIVIDE)) {
                division = Optional.of(cursor.take());
                List<ParsedFormula> operands = List.of(joined(factors), signedFactor());
                factors = new ArrayList<>(List.of(nodes.node(
                        new Quotient(operands.get(0).formula(), operands.get(1).formula()), operands)));
            } else if (cursor.peek().beginsOperand()) {
                Juxtaposition.require(cursor, ending);
                int behindDenominator = cursor.before().end();
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
        return factors.size() == 1 ? factors.get(0) : nodes.node(new Product(formulas(factors)), factors);
    }

    private ParsedFormula signedFactor() throws RefusedException {
        if (!cursor.sees(Kind.MINUS)) {
            return factor();
        }
        nodes.enter();
        Token sign = cursor.take();
        ParsedFormula negation = negation(sign, signedFactor());
        nodes.leave();
        return negation;
    }

    private ParsedFormula factor() throws RefusedException {
        ParsedFormula base = atom();
        if (cursor.sees(Kind.POWER) || cursor.sees(Kind.SUPERSCRIPT)) {
            if (ending == Ending.ROOT) {
                throw cursor.refused(cursor.peek(), "ambiguous-root", "a power right behind a root can be read in"
                        + " two ways: write (√x)^k or √(x^k), with parentheses");
            }
            ParsedFormula exponent = exponent();
            return nodes.node(new Power(base.formula(), exponent.formula()), List.of(base, exponent));
        }
        return base;
    }

    private ParsedFormula exponent() throws RefusedException {
        if (cursor.sees(Kind.SUPERSCRIPT)) {
            Token raised = cursor.take();
            ending = Ending.CLOSED;
            if (cursor.sees(Kind.POWER) || cursor.sees(Kind.SUPERSCRIPT)) {
                throw cursor.refused(cursor.peek(), "ambiguous-power", "a power of a power needs parentheses");
            }
            ParsedFormula exponent = nodes.leaf(WrittenNumbers.integer(raised.text()), raised);
            requireBounded(exponent);
            return exponent;
        }
        cursor.take();
        nodes.enter();
        ParsedFormula exponent = signedFactor();
        ending = ending.asExponent();
        nodes.leave();
        requireBounded(exponent);
        return exponent;
    }

    private void requireBounded(ParsedFormula exponent) throws RefusedException {
        Formula formula = exponent.formula() instanceof Negation negation ? negation.operand() : exponent.formula();
        if (formula instanceof Formula.Number number && !cursor.rules().limits().allowsPower(number.value())) {
            throw cursor.refused(exponent.position(), "power-too-large",
                    "an exponent is at most " + Limits.LARGEST_POWER + " here");
        }
    }

    private ParsedFormula atom() throws RefusedException {
        Token token = cursor.take();
        return switch (token.kind()) {
            case NUMBER -> atom(WrittenNumbers.read(token.text()), token, Ending.NUMBER);
            case QUOTED -> atom(new Symbol(token.text()), token, Ending.NAME);
            case DEGREE -> atom(Constant.DEGREE, token, Ending.CONSTANT);
            case NAME -> nameOrCall(token);
            case OPEN -> parenthesis(token);
            case ROOT -> root(token);
            case BRACE_OPEN -> cases(token);
            default -> throw missingOperand(token);
        };
    }

    private ParsedFormula atom(Formula formula, Token token, Ending itsEnding) throws RefusedException {
        ending = itsEnding;
        return nodes.leaf(formula, token);
    }

    private ParsedFormula nameOrCall(Token name) throws RefusedException {
        Optional<Function> function = Words.function(name.text());
        if (function.isPresent() && cursor.sees(Kind.OPEN)) {
            return call(name, function.get());
        }
        if (function.isPresent() && cursor.peek().beginsOperand()) {
            throw cursor.refused(name, "function-arguments",
                    "the argument of " + name.text() + " goes in parentheses: " + name.text() + "(…)");
        }
        Optional<Constant> constant = cursor.rules().constant(name.text());
        if (constant.isPresent()) {
            return atom(constant.get(), name, Ending.CONSTANT);
        }
        boolean isLetter = name.text().codePointCount(0, name.text().length()) == 1;
        return atom(new Symbol(name.text()), name, isLetter ? Ending.LETTER : Ending.NAME);
    }

    private ParsedFormula call(Token name, Function function) throws RefusedException {
        nodes.enter();
        Token open = cursor.take();
        List<ParsedFormula> arguments = new ArrayList<>(List.of(sum()));
        while (cursor.sees(Kind.COMMA)) {
            cursor.take();
            arguments.add(sum());
        }
        requireClose(open, Kind.CLOSE);
        nodes.leave();
        ending = Ending.CLOSED;
        if (arguments.size() != function.arity()) {
            throw cursor.refused(name, "function-arguments", name.text() + " takes "
                    + (function.arity() == 1 ? "one argument" : "two arguments") + ", not " + arguments.size());
        }
        return nodes.node(new Call(function, formulas(arguments)), arguments, cursor.spanFrom(name));
    }

    private ParsedFormula parenthesis(Token open) throws RefusedException {
        nodes.enter();
        ParsedFormula inner = sum();
        requireClose(open, Kind.CLOSE);
        nodes.leave();
        ending = Ending.CLOSED;
        return nodes.enclosed(inner, cursor.spanFrom(open));
    }

    private ParsedFormula cases(Token open) throws RefusedException {
        nodes.enter();
        BranchList branches = new BranchList(cursor);
        branches.add(sum());
        while (cursor.sees(Kind.SEMICOLON)) {
            cursor.take();
            branches.add(sum());
        }
        requireClose(open, Kind.BRACE_CLOSE);
        nodes.leave();
        ending = Ending.CLOSED;
        return branches.whole(nodes, open);
    }

    private ParsedFormula root(Token sign) throws RefusedException {
        nodes.enter();
        Ending itsEnding = cursor.sees(Kind.OPEN) ? Ending.CLOSED : Ending.ROOT;
        ParsedFormula radicand = atom();
        nodes.leave();
        ending = itsEnding;
        return nodes.node(new Call(Function.SQRT, List.of(radicand.formula())), List.of(radicand),
                cursor.spanFrom(sign));
    }

    private RefusedException ambiguousDivision(Token first, Token division, int behindDenominator) {
        String numerator = cursor.shown(first.start(), division.start());
        String denominator = cursor.shown(division.end(), behindDenominator);
        int end = cursor.before().end();
        String factor = cursor.shown(behindDenominator, end);
        return cursor.refused(division, "ambiguous-division", "'" + cursor.shown(first.start(), end)
                + "' can be read in two ways: write (" + numerator + "/" + denominator + ")*" + factor
                + " or " + numerator + "/(" + denominator + "*" + factor + ")");
    }

    private RefusedException missingOperand(Token found) {
        if (found.is(Kind.END) && !cursor.atStart()) {
            return cursor.refused(cursor.before(), "operand-missing",
                    "the formula ends after '" + cursor.before().text() + "'");
        }
        return cursor.refused(found, "operand-missing",
                "a number, a name or a parenthesis is missing before '" + found.text() + "'");
    }

    private void requireClose(Token open, Kind close) throws RefusedException {
        if (cursor.sees(Kind.END)) {
            throw cursor.refused(open, "parenthesis-open", "the "
                    + (close == Kind.CLOSE ? "parenthesis" : "brace") + " that opens here isn't closed");
        }
        if (!cursor.sees(close)) {
            throw unexpected();
        }
        cursor.take();
    }

    /** Behind a whole sum stands a comma, a parenthesis too many or a sign of another place. */
    private RefusedException unexpected() {
        Token token = cursor.peek();
        return switch (token.kind()) {
            case CLOSE, BRACE_CLOSE -> cursor.refused(token, "parenthesis-extra",
                    "nothing is open that '" + token.text() + "' closes");
            case COMMA -> unexpectedComma(token);
            default -> cursor.refused(token, "character", "'" + token.text() + "' has no meaning in a formula");
        };
    }

    private RefusedException unexpectedComma(Token token) {
        Token before = cursor.before();
        Token behind = cursor.peekBehind();
        boolean isDecimal = before.is(Kind.NUMBER) && behind.is(Kind.NUMBER)
                && before.end() == token.start() && token.end() == behind.start();
        return isDecimal
                ? cursor.refused(token, "decimal-comma", "a decimal comma: write "
                        + Words.shortened(before.text() + "." + behind.text()))
                : cursor.refused(token, "comma", "a comma stands only between the arguments of a function");
    }

    private ParsedFormula negation(Token minus, ParsedFormula operand) throws RefusedException {
        return nodes.node(new Negation(operand.formula()), List.of(operand),
                cursor.spanOf(minus).to(operand.span()));
    }

    private static List<Formula> formulas(List<ParsedFormula> parts) {
        return parts.stream().map(ParsedFormula::formula).toList();
    }
}
