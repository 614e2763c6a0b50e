package org.pofk.formula;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.stream.Collectors;
import net.jqwik.api.Arbitrary;
import net.jqwik.api.EdgeCasesMode;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.Provide;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.pofk.exact.Rational;
import org.pofk.formula.Formula.Negation;
import org.pofk.formula.Formula.Number;
import org.pofk.formula.Formula.Power;
import org.pofk.formula.Formula.Product;
import org.pofk.formula.Formula.RootSum;
import org.pofk.formula.Formula.Sum;
import org.pofk.formula.Formula.Symbol;
import org.pofk.formula.Formula.WrittenDecimal;
import org.pofk.text.Columns;
import org.pofk.text.Position;
import org.pofk.text.RefusedException;

class PlainTextTest {
    private static final Position START = new Position("claims.yaml", 1, 1);

    private static Formula parsed(String text) throws RefusedException {
        return FormulaParser.parse(text, START).formula();
    }

    @Provide
    static Arbitrary<Formula> trees() {
        return FormulaTrees.upTo(3);
    }

    @Property(tries = 600, edgeCases = EdgeCasesMode.NONE, seed = "20261")
    void whatIsPrintedIsReadAsTheSameTree(@ForAll("trees") Formula tree) throws RefusedException {
        assertEquals(FormulaTrees.asRead(tree), parsed(PlainText.UNICODE.write(tree)),
                () -> PlainText.UNICODE.write(tree));
    }

    @Property(tries = 300, edgeCases = EdgeCasesMode.NONE, seed = "20262")
    void whatIsPrintedInAsciiIsReadAsTheSameTreeExceptForGreekLetters(@ForAll("trees") Formula tree)
            throws RefusedException {
        String ascii = PlainText.ASCII.write(tree);
        assertEquals(parsed(PlainText.UNICODE.write(tree).replace("θ", "theta")), parsed(ascii), ascii);
    }

    @Property(tries = 300, edgeCases = EdgeCasesMode.NONE, seed = "20263")
    void noPairOfParenthesesCanBeLeftOut(@ForAll("trees") Formula tree) throws RefusedException {
        String text = PlainText.ASCII.write(FormulaTrees.asRead(tree));
        Formula whole = parsed(text);
        for (int open = text.indexOf('('); open >= 0; open = text.indexOf('(', open + 1)) {
            int close = closing(text, open);
            boolean isCall = open > 0 && Character.isLetter(text.charAt(open - 1));
            boolean isKept = isCall || text.substring(0, open).contains("'") || text.substring(open).contains("'");
            if (!isKept) {
                String without = text.substring(0, open) + text.substring(open + 1, close) + text.substring(close + 1);
                assertTrue(isForReaders(text, open, close) || !readsAs(without, whole), () -> text + " as " + without);
            }
        }
    }

    /** Parentheses that the rules of reading don't need, and people do: (a/b)/c, a^(b^c), a*(-b), (7e-4)^k. */
    private static boolean isForReaders(String text, int open, int close) {
        char before = open == 0 ? ' ' : text.charAt(open - 1);
        return before == '^' || text.charAt(open + 1) == '-' || text.startsWith("/", close + 1)
                || Character.isDigit(text.charAt(close - 1)) && text.startsWith("^", close + 1);
    }

    private static int closing(String text, int open) {
        int depth = 0;
        for (int i = open; ; i++) {
            depth += text.charAt(i) == '(' ? 1 : text.charAt(i) == ')' ? -1 : 0;
            if (depth == 0) {
                return i;
            }
        }
    }

    private static boolean readsAs(String text, Formula expected) {
        try {
            return parsed(text).equals(expected);
        } catch (RefusedException refused) {
            return false;
        }
    }

    @ParameterizedTest
    @CsvSource(quoteCharacter = '"', delimiter = ';', value = {
        "1.8 z^2; 1.8·z^2; 1.8*z^2",
        "2 k; 2k; 2*k",
        "-1/4*(-1/4)^k; −1/4·(−1/4)^k; -1/4*(-1/4)^k",
        "(1/2)^k; (1/2)^k; (1/2)^k",
        "2*0.52^k*cos(39.7 deg*k - 119 deg); 2·0.52^k·cos(39.7°·k − 119°); 2*0.52^k*cos(39.7 deg*k - 119 deg)",
        "cos(2 pi k/3); cos(2π·k/3); cos(2*pi*k/3)",
        "sqrt(2)^k/sqrt(k+1); (√2)^k/√(k + 1); sqrt(2)^k/sqrt(k + 1)",
        "binomial(k,2) delta(k-1); binomial(k, 2)·delta(k − 1); binomial(k, 2)*delta(k - 1)",
        "acos(1/3)/atan(θ); arccos(1/3)/arctan(θ); arccos(1/3)/arctan(theta)",
        "1 - 'both down'; 1 − 'both down'; 1 - 'both down'",
        "a - (b - c) - -d; a − (b − c) − (−d); a - (b - c) - (-d)",
        "a*(b*c)/(d/e); a·(b·c)/(d/e); a*(b*c)/(d/e)",
        "7.281e-4^k + 7.281e-4*k; (7.281e-4)^k + 7.281e-4·k; (7.281e-4)^k + 7.281e-4*k"
    })
    void formulasReadAsOnPaper(String text, String unicode, String ascii) throws RefusedException {
        assertEquals(unicode, PlainText.UNICODE.write(parsed(text)));
        assertEquals(ascii, PlainText.ASCII.write(parsed(text)));
    }

    @Test
    void negativeNumbersPrintAsDifferences() {
        Formula k = new Symbol("k");
        assertEquals("1 − 2 − 0.5 − 3/4·k − k", PlainText.UNICODE.write(new Sum(List.of(number(1, 1), number(-2, 1),
                new WrittenDecimal("-0.5"), new Negation(new Product(List.of(number(3, 4), k))), new Negation(k)))));
        assertEquals("(-3/4)^k*(-2)", PlainText.ASCII.write(new Product(List.of(new Power(number(-3, 4), k),
                number(-2, 1)))));
    }

    @Test
    void aSumOverRootsNamesItsPolynomial() throws RefusedException {
        Formula sum = new RootSum(new Symbol("λ"), parsed("λ^3 - λ + 1/7"), parsed("(1 - λ)*λ^k"));
        assertEquals("Σ[λ: λ^3 − λ + 1/7 = 0] (1 − λ)·λ^k", PlainText.UNICODE.write(sum));
        assertEquals("1 - sum[lambda: lambda^3 - lambda + 1/7 = 0] (1 - lambda)*lambda^k",
                PlainText.ASCII.write(new Sum(List.of(number(1, 1), new Negation(sum)))));
        assertEquals("1 + Σ[λ: λ^3 − λ + 1/7 = 0] (1 − λ)·λ^k",
                PlainText.UNICODE.write(new Sum(List.of(number(1, 1), sum))));
    }

    @Test
    void longFormulasBreakBeforeTheirOuterSigns() throws RefusedException {
        Formula formula = parsed("20/2447 - 0.01726*(0.4508 + 0.1)^k + 0.009084*0.2317^k - 1/3");
        assertEquals(List.of("20/2447 − 0.01726·(0.4508 + 0.1)^k",
                "    + 0.009084·0.2317^k − 1/3"), PlainText.UNICODE.lines(formula, 40, 4));
        assertEquals(List.of(PlainText.UNICODE.write(formula)), PlainText.UNICODE.lines(formula, 80, 4));
    }

    @Test
    void longTermsBreakInsideOnlyWhereTheyMustAndFurtherIn() throws RefusedException {
        assertEquals(List.of(
                "z*(z^3 - 2.125*z^2 + 1.5*z - 1)",
                "   /((z - 1)",
                "     *(z^2 - 0.2317*z + 0.4508))",
                " - 1"), PlainText.ASCII.lines(
                        parsed("z*(z^3 - 2.125 z^2 + 1.5z - 1)/((z-1)*(z^2 - 0.2317z + 0.4508)) - 1"), 33, 1));
    }

    @Test
    void aLongSumIsBrokenWithoutLoss() throws RefusedException {
        String sum = "0.25*(1 - a)^k + ".repeat(1_500) + "1";
        List<String> lines = PlainText.ASCII.lines(parsed(sum), 80, 4);
        assertEquals(sum, String.join("", lines).replaceAll(" +", " ").replaceAll("(?<! )[+]", " +"));
        assertTrue(lines.stream().allMatch(line -> line.length() <= 80));
    }

    @Property(tries = 200, edgeCases = EdgeCasesMode.NONE, seed = "20264")
    void brokenLinesFitAndLoseNothing(@ForAll("trees") Formula tree) {
        String text = PlainText.UNICODE.write(tree);
        List<String> lines = PlainText.UNICODE.lines(tree, 50, 6);
        assertEquals(text.replace(" ", ""), lines.stream().collect(Collectors.joining()).replace(" ", ""));
        for (String line : lines.subList(1, lines.size())) {
            assertTrue(line.startsWith("      "), line);
        }
        assertTrue(lines.stream().allMatch(line -> Columns.width(line) <= 50 || isWithoutBreak(line)), lines::toString);
    }

    private static boolean isWithoutBreak(String line) {
        String operators = line.strip().substring(1).replaceAll("'[^']*'", "");
        return !operators.contains(" + ") && !operators.contains(" − ") && !operators.contains("·");
    }

    private static Number number(long numerator, long denominator) {
        return new Number(Rational.of(numerator, denominator));
    }
}
