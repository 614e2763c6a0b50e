package org.pofk.formula;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Random;
import java.util.Set;
import java.util.stream.Stream;
import org.apache.commons.math3.complex.Complex;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.pofk.formula.FormulaReading.Subject;
import org.pofk.text.Fault;
import org.pofk.text.Places;
import org.pofk.text.Position;
import org.pofk.text.RefusedException;

/** LaTeX with random edits, and LaTeX made to do harm: read as what it prints, or refused in a place of the text. */
class LatexMutationTest {
    private static final Position START = new Position("claims.yaml", 1, 1);
    private static final List<String> FORMULAS = List.of(
            "p(k) = 0.008176 - 0.01726 \\cdot 0.4508^{k} + 0.009084 \\cdot 0.2317^{k}",
            "\\frac{1}{2}\\left(\\frac{9}{20}\\right)^{k} - \\tfrac12 (-1)^k",
            "2 \\cdot 0.52^{k} \\cos\\left(39.7^{\\circ} k - 119^\\circ\\right)",
            "0.3^k \\cos 0.3k + e^{-0.1k}\\sin(k)",
            "\\binom{k}{2} 0.5^{k-2} + k 0.5^{k-1}",
            "\\frac{z(0.0025 z + 0.00095)}{(z-1)(z-0.2317)}",
            "0{,}25 + 12\\,345 k + 30\\%\\,k",
            "7.281 \\cdot 10^{-4} k - \\sqrt{2}^{k}/\\sqrt3",
            "(0.4 + 0.33i)^{k}(1 - \\mathrm{i}) + [a b]\\{k\\}",
            "\\text{lost}(k) \\approx \\bigl(1 - \\frac{k}{k+1}\\bigr)^2 \\pi \\theta");
    private static final List<String> PIECES = List.of("0", "1", "2", "3", ".", "k", "z", "e", "i", "+", "-", "*", "/",
            "^", "_", "{", "}", "(", ")", "[", "]", "\\", " ", ",", "\\,", "\\frac", "\\cos", "\\sqrt", "\\left",
            "\\right", "\\cdot ", "^{k}", "\\pi ", "10^{-4}", "{,}", "~", "\\%", "^\\circ ", "000", "\\tfrac12", "%",
            "\u0430", "\u200b", "\\text{a}", "&", "'", "\ud835");

    private static String edited(String text, Random random) {
        StringBuilder edited = new StringBuilder(text);
        for (int i = random.nextInt(3); i >= 0; i--) {
            int from = random.nextInt(edited.length() + 1);
            int to = Math.min(edited.length(), from + 1 + random.nextInt(4));
            switch (random.nextInt(4)) {
                case 0 -> edited.insert(from, PIECES.get(random.nextInt(PIECES.size())));
                case 1 -> edited.delete(from, to);
                case 2 -> edited.replace(from, Math.min(edited.length(), from + 1),
                        PIECES.get(random.nextInt(PIECES.size())));
                default -> edited.insert(random.nextInt(edited.length() + 1), edited.substring(from, to));
            }
        }
        return edited.toString();
    }

    private static Formula read(String latex) throws RefusedException {
        Subject subject = latex.contains("z") ? Subject.OF_Z : Subject.OF_K;
        return LatexReader.parse(latex, Places.from(START, latex), FormulaReading.of(subject)).formula();
    }

    @Test
    void editedTextIsReadAsItPrintsOrRefusedInsideIt() {
        Random random = new Random(20268);
        int compared = 0;
        int named = 0;
        for (int i = 0; i < 60_000; i++) {
            String latex = edited(FORMULAS.get(i % FORMULAS.size()), random);
            try {
                Formula formula = read(latex);
                if (new ParsedNames(formula).hasWords()) {
                    named++;
                } else {
                    assertSame(PrintedLatex.value(latex), TreeValue.of(formula), latex);
                    compared++;
                }
            } catch (RefusedException refused) {
                Fault fault = refused.faults().get(0);
                assertEquals(1, fault.position().line());
                assertTrue(fault.position().column() >= 1 && fault.position().column() <= latex.length() + 1,
                        fault::toString);
            }
        }
        assertTrue(compared > 5_000, "compared: " + compared);
        assertTrue(named < 200, "not compared for their names: " + named);
    }

    private static void assertSame(Complex printed, Complex tree, String latex) {
        boolean bothUndefined = isUndefined(printed) && isUndefined(tree);
        assertTrue(bothUndefined || printed.subtract(tree).abs() <= 1e-9 * Math.max(1, printed.abs()),
                () -> latex + ": printed " + printed + ", read " + tree);
    }

    private static boolean isUndefined(Complex value) {
        return value.isNaN() || value.isInfinite() || value.abs() > 1e100;
    }

    /** Whether a formula holds a name of more than a letter, or cases, which the second reading doesn't know. */
    private record ParsedNames(Formula formula) {
        boolean hasWords() {
            try {
                TreeValue.of(formula);
                return false;
            } catch (PrintedLatex.Unclear unclear) {
                return true;
            }
        }
    }

    @ParameterizedTest
    @ValueSource(strings = {"-", "(", "{", "\\left(", "\\frac{", "\\frac1{", "\\sqrt{", "2^{", "\\cos(", "\\cos ", "e^{",
            "\\cos\\sqrt{", "\\begin{cases}", "\\delta[", "\\binom{k}{", "\\{", "-(", "a*-", "2/", "+(", "\\text{",
            "\\text", "\\operatorname{cos}", "k_{", "k^", "\\", "~", "1\\,000", "1{,}", "\u200b", "\ufeff", "\0", "\ud835",
            "\uff11", "\u0430", "9^{9", "1.", "{}", "k ", "\\,", "kk ", "1+", "\\%", "$", "&", "\\\\", "\u202e"})
    void hostileTextIsReadOrRefusedInsideItWithTokensWithinItsLength(String piece) {
        String text = piece.repeat(10_000 / piece.length());
        for (String latex : List.of(text, text + "1", "1" + text, text + "1" + ")}".repeat(200))) {
            if (latex.length() > 10_000) {
                assertEquals("formula-too-long", fault(latex).code());
                continue;
            }
            try {
                int tokens = LatexTokens.read(latex, offset -> START, FormulaReading.of(Subject.OF_K)).size();
                assertTrue(tokens <= 2 * latex.length() + 1, piece + ": " + tokens + " tokens");
                ParsedFormula formula = LatexReader.parse(latex, offset -> START, FormulaReading.of(Subject.OF_K));
                assertTrue(formula.nodes().count() <= latex.length(), piece);
            } catch (RefusedException refused) {
                Position position = fault(latex).position();
                assertTrue(position.column() <= latex.length() + 1, refused.getMessage());
                assertTrue(refused.getMessage().length() < 400, refused.getMessage());
            }
        }
    }

    private static Fault fault(String latex) {
        return assertThrows(RefusedException.class, () -> read(latex)).faults().get(0);
    }

    @Test
    void nestingEndsAtOneHundred() throws RefusedException {
        for (String open : List.of("(", "\\left(", "\\{", "\\sqrt{")) {
            String close = open.endsWith("{") && !open.startsWith("\\{") ? "}" : open.equals("\\{") ? "\\}"
                    : open.startsWith("\\left") ? "\\right)" : ")";
            read(open.repeat(90) + "1" + close.repeat(90));
            assertEquals("formula-too-deep", fault(open.repeat(101) + "1" + close.repeat(101)).code());
        }
    }

    @Test
    void plainClaimsAreBoundedAndTheirLookAlikesNamed() {
        record Case(String text, String fault) {
        }
        String letters = "isn't known here: it only looks like ";
        Stream.of(new Case("0.5^\u043a", "claims.yaml:1:5: '\u043a' (U+043A) " + letters + "k, write k"),
                new Case("l\u043est + 1", "claims.yaml:1:2: '\u043e' (U+043E) " + letters + "o, write o"),
                new Case("\uff10.5", "claims.yaml:1:1: '\uff10' (U+FF10) has no meaning in a formula: it only looks"
                        + " like 0, write 0"),
                new Case("k\u200b + 1", "claims.yaml:1:2: the character U+200B has no meaning in a formula: it shows"
                        + " nothing and can be taken out"),
                new Case("k \u2014 1", "claims.yaml:1:3: '\u2014' (U+2014) has no meaning in a formula: it only looks"
                        + " like -, write -"),
                new Case("2^100001", "claims.yaml:1:3: an exponent is at most 100000 here"),
                new Case("z^-100001", "claims.yaml:1:3: an exponent is at most 100000 here"),
                new Case("-".repeat(101) + "1", "claims.yaml:1:101: the formula is nested more than 100 deep"),
                new Case("k".repeat(10_001), "claims.yaml:1:1: the formula has 10001 characters, more than 10000"))
                .forEach(each -> assertEquals(each.fault, assertThrows(RefusedException.class, () ->
                        FormulaParser.parse(each.text, Places.from(START, each.text), Set.of("\u0441\u0442\u0430\u043d"),
                                FormulaReading.of(Subject.OF_K)), each.text).getMessage()));
    }

    @Test
    void namesOfTheModelMayHoldAnyLetters() throws RefusedException {
        String name = "\u043a";
        assertEquals(new Formula.Symbol(name), FormulaParser.parse(name, offset -> START, Set.of(name),
                FormulaReading.of(Subject.NUMBER)).formula());
        assertEquals(new Formula.Symbol("\u043d\u0430\u0441\u043e\u0441"), FormulaParser.parse("\u043d\u0430\u0441\u043e\u0441",
                offset -> START, Set.of(), FormulaReading.of(Subject.NUMBER)).formula());
    }
}
