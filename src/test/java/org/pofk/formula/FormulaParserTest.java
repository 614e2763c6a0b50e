package org.pofk.formula;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Objects;
import java.util.Random;
import java.util.Set;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.pofk.exact.Rational;
import org.pofk.formula.Formula.Constant;
import org.pofk.formula.Formula.Number;
import org.pofk.formula.Formula.Product;
import org.pofk.formula.Formula.Symbol;
import org.pofk.formula.Formula.WrittenDecimal;
import org.pofk.text.Fault;
import org.pofk.text.Position;
import org.pofk.text.RefusedException;
import org.pofk.text.Span;

class FormulaParserTest {
    private static final Position START = new Position("claims.yaml", 4, 21);

    private static Formula parsed(String text) throws RefusedException {
        return FormulaParser.parse(text, START).formula();
    }

    private static Fault refused(String text) {
        List<Fault> faults = assertThrows(RefusedException.class, () -> parsed(text), text).faults();
        assertEquals(1, faults.size());
        return faults.get(0);
    }

    /** Each pair is read as the same tree; the second has all its parentheses. */
    @ParameterizedTest
    @CsvSource(quoteCharacter = '"', delimiter = ';', value = {
        "a + b*c; a + (b*c)", "a*b + c; (a*b) + c", "a - b/c; a - (b/c)", "a*b/c; (a*b)/c", "a/b*c; (a/b)*c",
        "a/b/c; (a/b)/c", "a*b^c; a*(b^c)", "a^b^c; a^(b^c)", "a/b^c; a/(b^c)", "-a*b; -(a*b)", "-a^b; -(a^b)",
        "-a/b; -(a/b)", "a*-b^c; a*(-(b^c))", "a*-b*c; a*(-b)*c", "a^-b; a^(-b)", "a^-b^c; a^(-(b^c))",
        "a^-b*c; (a^(-b))*c", "--a; -(-a)", "a - -b; a - (-b)", "-a + b; (-a) + b", "2a^3; 2*(a^3)", "2a/b; (2*a)/b",
        "-2a; -(2*a)", "2a*b; 2*a*b", "a^2(b); (a^2)*(b)", "√2*a; sqrt(2)*a", "√2/a; sqrt(2)/a", "(√2)^a; sqrt(2)^a",
        "√(a + b)*c; sqrt(a + b)*c", "a²; a^2", "a⁻¹⁰; a^(-10)", "a²b; (a^2)*b", "2√3; 2*sqrt(3)", "+a - b; a - b",
        "30°*k; 30*deg*k", "30 deg k; 30*deg*k", "2 pi k/3; (2*pi*k)/3", "0.5^k cos(k); (0.5^k)*cos(k)",
        "(a)(b)(c); a*b*c", "a(b + c); a*(b + c)", "2(b); 2*b", "2(-b); 2*(-b)", "k i; k*i",
        "3'both down'; 3*'both down'",
        "a − b · c × d ÷ e; a - ((b*c*d)/e)", "atan(a) + acos(b); arctan(a) + arccos(b)", "2e; 2*e", "2ea; 2*ea"
    })
    void precedenceIsThatOfOrdinaryNotation(String text, String withParentheses) throws RefusedException {
        assertEquals(parsed(withParentheses), parsed(text));
    }

    @Test
    void numbersKeepWhatIsExactExactAndWhatIsWrittenAsWritten() throws RefusedException {
        assertEquals(new Number(Rational.of(12)), parsed("12"));
        assertEquals(new Number(Rational.of(3, 10)), parsed("30%"));
        assertEquals(new WrittenDecimal("0.025"), parsed("2.5%"));
        assertEquals(new WrittenDecimal("0.0250"), parsed("2.50%"));
        for (String decimal : List.of("0.70", ".5", "3.", "2.3e-6", "1e3", "1E+400", "1e-400", "2e000400")) {
            assertEquals(new WrittenDecimal(decimal), parsed(decimal));
        }
        assertEquals(new WrittenDecimal("2.3e-6"), parsed("2.3e−6"), "a typographic minus sign");
    }

    @Test
    void namesAreComparedInOneNormalForm() throws RefusedException {
        assertEquals(new Symbol("caf\u00e9"), parsed("cafe\u0301"));
        assertEquals(new Symbol("caf\u00e9"), parsed("' cafe\u0301 '"));
        assertEquals(new Symbol("it's"), parsed("'it''s'"));
        assertEquals(new Symbol("泵_1"), parsed("泵_1"));
        assertEquals(Constant.I, parsed("i"));
        assertEquals(new Symbol("i"), parsed("'i'"));
        assertEquals(new Symbol("delta"), parsed("delta"), "a function's name without parentheses is a name");
    }

    @Test
    void knownNamesMayBeginWithADigit() throws RefusedException {
        Set<String> names = Set.of("2a", "2k", "k", "2", "1e5");
        assertEquals(new Symbol("2a"), FormulaParser.parse("2a", offset -> START, names).formula());
        assertEquals(new Number(Rational.TWO), FormulaParser.parse("2", offset -> START, names).formula());
        assertEquals(new WrittenDecimal("1e5"), FormulaParser.parse("1e5", offset -> START, names).formula());
        assertEquals(new Product(List.of(new Number(Rational.of(3)), new Symbol("a"))),
                FormulaParser.parse("3a", offset -> START, names).formula());
        assertEquals("name-or-product", assertThrows(RefusedException.class,
                () -> FormulaParser.parse("1 + 2k", offset -> START, names)).faults().get(0).code());
    }

    @Test
    void everyPartKnowsItsPlace() throws RefusedException {
        ParsedFormula sum = FormulaParser.parse("π - 2*(k +\n  π)^2", START);
        assertEquals(new Span(START, new Position("claims.yaml", 5, 7)), sum.span());
        ParsedFormula subtracted = sum.parts().get(1);
        assertEquals(new Position("claims.yaml", 4, 23), subtracted.position(), "the minus sign");
        ParsedFormula power = subtracted.parts().get(0).parts().get(1);
        assertEquals(new Position("claims.yaml", 4, 27), power.position(), "the parenthesis");
        ParsedFormula secondPi = power.parts().get(0).parts().get(1);
        assertEquals(new Span(new Position("claims.yaml", 5, 3), new Position("claims.yaml", 5, 4)), secondPi.span());
        assertEquals(List.of(new Symbol("k")), sum.symbols().stream().map(ParsedFormula::formula).toList());
    }

    @Test
    void columnsCountCodePoints() {
        assertEquals(new Position("claims.yaml", 4, 28), refused("'𝛼𝛽' + ?").position());
    }

    @Test
    void placesOfTextTakenFromElsewhereAreTheCallers() {
        Fault fault = assertThrows(RefusedException.class, () -> FormulaParser.parse("1 + * 2",
                offset -> new Position("a", 7, 2 * offset), Set.of())).faults().get(0);
        assertEquals(new Position("a", 7, 8), fault.position());
        Position whole = Position.ofWhole("--set");
        assertEquals(whole, assertThrows(RefusedException.class, () -> FormulaParser.parse("1 +", whole))
                .faults().get(0).position());
    }

    @ParameterizedTest
    @CsvSource(quoteCharacter = '"', delimiter = ';', value = {
        "1/2k; ambiguous-division; 2", "1/2 k; ambiguous-division; 2", "a/b(c); ambiguous-division; 2",
        "1/(2)k; ambiguous-division; 2", "1/3 pi; ambiguous-division; 2", "2*k/3z + 1; ambiguous-division; 4",
        "1/2°; ambiguous-division; 2", "0.5^2k; ambiguous-power; 6", "0.5^k z; ambiguous-power; 7",
        "0.5^k(1 + k); ambiguous-power; 6", "z²^3; ambiguous-power; 3", "√2k; ambiguous-root; 3",
        "√2^k; ambiguous-root; 3", "√z(k); ambiguous-root; 3", "2 3; operator-missing; 3",
        "(z-1)2; operator-missing; 6",
        "both down; operator-missing; 6", "k z; operator-missing; 3", "'a'(b); function-unknown; 1",
        "sgrt(2); function-unknown; 1", "1 + down(2); function-unknown; 5", "cos 2; function-arguments; 1",
        "cos(1, 2); function-arguments; 1", "binomial(k); function-arguments; 1", "; formula-empty; 1",
        "1 +; operand-missing; 3", "* 2; operand-missing; 1", "a + * b; operand-missing; 5",
        "a ++ b; operand-missing; 4",
        "(); operand-missing; 2", "cos(); operand-missing; 5", "2^; operand-missing; 2", "a//b; operand-missing; 3",
        "((1); parenthesis-open; 1", "cos(1; parenthesis-open; 4", "(1)); parenthesis-extra; 4",
        "0,5; decimal-comma; 2",
        "cos(a), b; comma; 7", "[1]; character; 1", "x = 3; character; 3", "2 ± 3; character; 3", "a**b; power-sign; 2",
        "1.2.3; number-unreadable; 1", "1e5.2; number-unreadable; 1", "1e401; exponent-out-of-range; 2",
        "1e-1000000; exponent-out-of-range; 2", "1e99999999999999999999; exponent-out-of-range; 2",
        "50%%; percent-sign; 4", "x%; percent-sign; 2", "1e-3%; percent-sign; 5", "(1/3)%; percent-sign; 6",
        "{1 for k = 0; parenthesis-open; 1", "{1}; cases-condition; 3", "{1 for}; cases-condition; 7",
        "{1 for z = 0}; cases-condition; 8", "{1 for k}; cases-condition; 9", "{1 for k = z}; cases-condition; 12",
        "{1 for k = 0.5}; cases-condition; 12", "{1 for k < 0}; cases-no-step; 8",
        "{1 for 3 < k < 3}; cases-no-step; 8", "{1 for k != 2}; cases-no-step; 8",
        "{1 for k = 1234567890}; cases-step-too-large; 12", "1}; parenthesis-extra; 2", "1 for k = 0; operator-missing; 7",
        "1 <= 2; character; 3", "{1 for k = 0, 1}; comma; 13", "3!; character; 2",
        "1 + 'a; quote-open; 5", "''; name-empty; 1", "'  '; name-empty; 1", "2⁻; character; 2", "\\frac; character; 1"
    })
    void whatCannotBeReadIsRefusedInItsPlace(String text, String code, int column) {
        Fault fault = refused(Objects.requireNonNullElse(text, ""));
        assertEquals(code, fault.code(), fault::message);
        assertEquals(new Position("claims.yaml", 4, 20 + column), fault.position(), fault::message);
    }

    @Test
    void casesAreReadInAnyOrderAndWithARest() throws RefusedException {
        String canonical = "{1 for k = 0; 2 for 1 <= k <= 3; 3 for k >= 4}";
        for (String text : List.of(canonical, "{3 for k>3; 2 for 0 < k < 4; 1 for k = 0}",
                "{1 for 0 = k; 2 for 4 > k >= 1; 3 otherwise}", "{2 for 1≤k≤3; 3 for 4 ≤ k; 1 for k ≤ 0}",
                "{1 for k < 1; 3 for k >= 4; 2 for otherwise}")) {
            assertEquals(parsed(canonical), parsed(text), text);
        }
        assertEquals(parsed("{2 for k = 0; 1 for k = 1; 2 for k >= 2}"), parsed("{1 for k = 1; 2 otherwise}"));
        assertEquals(parsed("2*{1 for k >= 1}^2"), parsed("2{1 for k != 0}^2"));
        assertEquals(List.of("cases-overlap 4:37", "cases-order 4:50", "cases-no-step 4:51"), Stream.of(
                "{1 for k = 0; 2 for k <= 3}", "{1 for k = 0; 2 otherwise; 2 for k = 3}",
                "{1 for k = 0; 2 for k >= 1; 3 otherwise}").map(FormulaParserTest::refused).map(fault -> fault.code() + " "
                        + fault.position().line() + ":" + fault.position().column()).toList());
    }

    @Test
    void partsOfCasesAreTheFormulasOfTheBranches() throws RefusedException {
        ParsedFormula cases = FormulaParser.parse("{k for k >= 1; 2 for k = 0}", START);
        assertEquals(List.of(new Number(Rational.TWO), new Symbol("k")),
                cases.parts().stream().map(ParsedFormula::formula).toList());
        assertEquals(new Position("claims.yaml", 4, 36), cases.parts().get(0).position());
        assertEquals(new Span(START, new Position("claims.yaml", 4, 48)), cases.span());
    }

    @Test
    void refusalsSayWhatWouldBeRight() {
        assertEquals("'1/2k' can be read in two ways: write (1/2)*k or 1/(2*k)", refused("1 - 1/2k").message());
        assertEquals("no function is called 'sgrt'; did you mean 'sqrt'?", refused("sgrt(2)").message());
        assertEquals("no function is called 'down'; a product is written with *", refused("down(2)").message());
        assertEquals("a decimal comma: write 0.5", refused("0,5").message());
        assertEquals("between 'both' and 'down' a sign is missing; a name with spaces is written in quotes:"
                + " 'both down'", refused("both down").message());
        assertEquals("the exponent 'e401' lies outside -400 to 400", refused("1e401").message());
        assertEquals("'“' has no meaning in a formula: names are quoted with '", refused("“a”").message());
        assertEquals("the formula ends after '+'", refused("1 +").message());
        assertTrue(refused("x".repeat(5_000) + "/2k").message().length() < 200);
    }

    @ParameterizedTest
    @ValueSource(strings = {"-", "(", "√", "2^", "cos(", "1/", "-(", "2^-", "+(", "((1)+", "a^(-"})
    void endlessNestingEndsAtOnce(String opening) {
        Fault fault = refused(opening.repeat(60_000 / opening.length()) + "1");
        assertEquals("formula-too-deep", fault.code());
        assertTrue(fault.position().column() < 1_300, fault::toString);
    }

    @Test
    void lengthAndNumberOfPartsAreBounded() throws RefusedException {
        assertEquals("formula-too-long", refused("x".repeat(1_000_000)).code());
        assertEquals("formula-too-long", refused("\0".repeat(FormulaParser.LONGEST + 1)).code());
        assertEquals("formula-too-large", refused("a*-".repeat(20_000) + "1").code());
        assertEquals("formula-too-large", refused("1+".repeat(FormulaParser.MOST_NODES) + "1").code());
        assertEquals(FormulaParser.LONGEST, ((Symbol) parsed("x".repeat(FormulaParser.LONGEST))).name().length());
        assertEquals(19_000, FormulaParser.parse("1+".repeat(18_998) + "1", START).nodes().count());
        assertEquals(new Symbol("x"), parsed("(".repeat(200) + "x" + ")".repeat(200)));
    }

    @Test
    void characterThatShowsNothingIsNamedByItsNumber() {
        assertEquals("the character U+0000 has no meaning in a formula", refused("\0").message());
        assertEquals("the character U+202E has no meaning in a formula: it shows nothing and can be taken out", refused("1 + \u202e2").message());
        assertEquals("the character U+D800 has no meaning in a formula", refused("\ud800").message());
        assertEquals("the character U+0007 can't be part of a name", refused("'a\u0007'").message());
    }

    @Test
    void randomTextIsReadOrRefusedWithAPlaceInside() {
        String alphabet = "12.e+-*/^()√°'%, ,kzπcosbinomial²\0\ud835x";
        Random random = new Random(20265);
        int read = 0;
        for (int i = 0; i < 8_000; i++) {
            StringBuilder text = new StringBuilder();
            for (int j = random.nextInt(12); j >= 0; j--) {
                text.append(alphabet.charAt(random.nextInt(alphabet.length())));
            }
            try {
                assertEquals(FormulaTrees.asRead(parsed(text.toString())),
                        parsed(PlainText.UNICODE.write(parsed(text.toString()))), text::toString);
                read++;
            } catch (RefusedException refused) {
                Position position = refused.faults().get(0).position();
                assertTrue(position.column() >= 21 && position.column() <= 21 + text.length(), refused.getMessage());
            }
        }
        assertTrue(read > 200, "texts read: " + read);
    }
}
