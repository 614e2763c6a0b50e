package org.pofk.formula;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Set;
import net.jqwik.api.Arbitrary;
import net.jqwik.api.EdgeCasesMode;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.Provide;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.pofk.formula.Formula.Constant;
import org.pofk.formula.Formula.Symbol;
import org.pofk.formula.FormulaReading.ImaginaryUnit;
import org.pofk.formula.FormulaReading.PlusMinus;
import org.pofk.formula.FormulaReading.Subject;
import org.pofk.text.Fault;
import org.pofk.text.Places;
import org.pofk.text.Position;
import org.pofk.text.RefusedException;
import org.pofk.text.Span;

class LatexReaderTest {
    private static final Position START = new Position("claims.yaml", 4, 1);

    private static ParsedFormula read(String latex, FormulaReading reading) throws RefusedException {
        return LatexReader.parse(latex, Places.from(START, latex), reading);
    }

    private static Formula read(String latex) throws RefusedException {
        return read(latex, FormulaReading.of(Subject.OF_K)).formula();
    }

    private static Formula plain(String text) throws RefusedException {
        return FormulaParser.parse(text, START).formula();
    }

    private static Fault refused(String latex) {
        List<Fault> faults = assertThrows(RefusedException.class, () -> read(latex), latex).faults();
        assertEquals(1, faults.size());
        return faults.get(0);
    }

    @ParameterizedTest
    @CsvSource(quoteCharacter = '`', delimiter = '#', value = {
        "0.5^k # 0.5^k",
        "0.4508^{k} # 0.4508^k",
        "0.5^{k-1} # 0.5^(k-1)",
        "(1/2)^{k} # (1/2)^k",
        "1/2^k # 1/2^k",
        "2^{-k} # 2^(-k)",
        "\\frac{1}{2} # 1/2",
        "\\tfrac{1}{2} # 1/2",
        "\\dfrac{k}{k+1} # k/(k+1)",
        "\\frac12 # 1/2",
        "\\frac1{12} # 1/12",
        "\\frac{1}2 k # (1/2)*k",
        "\\frac 3 4 # 3/4",
        "\\frac\\pi3 k # (pi/3)*k",
        "\\frac{1}{2}^k # (1/2)^k",
        "\\left(\\frac{9}{20}\\right)^k # (9/20)^k",
        "\\left[\\frac{9}{20}\\right]^k # (9/20)^k",
        "\\left\\{ 1 + 2 \\right\\} k # (1+2)*k",
        "\\bigl( 1 - \\tfrac14 \\bigr)^{k} # (1 - 1/4)^k",
        "\\Big[ 1 - 0.2 \\Big] # 1 - 0.2",
        "\\{1 - k\\} k # (1-k)*k",
        "2k # 2*k",
        "2 \\cdot 3 # 2*3",
        "2 \\times 3 * k # 2*3*k",
        "6 \\div 3 # 6/3",
        "2\\,k # 2*k",
        "0.1\\;k \\! + \\quad 2~k # 0.1*k + 2*k",
        "-0.01726 \\cdot 0.4508^{k} + 0.009084\\cdot 0.2317^k # -0.01726*0.4508^k + 0.009084*0.2317^k",
        "0.5^{k}(1 + k) # 0.5^k*(1 + k)",
        "0.5^k k # 0.5^k*k",
        "k 0.5^{k} # k*0.5^k",
        "z(z-1) # z*(z-1)",
        "(z-1)(z-0.45) # (z-1)*(z-0.45)",
        "\\frac{z(0.0025 z + 0.00095)}{(z-1)(z-0.2317)} # (z*(0.0025*z + 0.00095))/((z-1)*(z-0.2317))",
        "\\cos(0.3k) # cos(0.3*k)",
        "\\cos\\left(\\frac{2\\pi k}{3}\\right) # cos(2*pi*k/3)",
        "\\cos{0.3k} # cos(0.3*k)",
        "\\cos 0.3k # cos(0.3*k)",
        "\\cos 0.3 k - 1 # cos(0.3*k) - 1",
        "\\cos\\frac{\\pi k}{3} + 1 # cos(pi*k/3) + 1",
        "\\cos\\theta k # cos(θ*k)",
        "2 \\sin k # 2*sin(k)",
        "0.52^k \\cos(39.7^\\circ k - 119^{\\circ}) # 0.52^k*cos(39.7 deg*k - 119 deg)",
        "39.7^\\circ k # 39.7*deg*k",
        "39.7° k # 39.7*deg*k",
        "30\\degree # 30*deg",
        "\\cos\\bigl(k\\bigr)\\sin(k) # cos(k)*sin(k)",
        "\\arctan\\frac{1}{2} # arctan(1/2)",
        "\\arccos(1/3) k # arccos(1/3)*k",
        "\\operatorname{arctan}(2) # arctan(2)",
        "\\exp(-0.1k) # exp(-0.1*k)",
        "e^{-0.1k} # exp(-0.1*k)",
        "2e^{-k} # 2*exp(-k)",
        "\\mathrm{e}^{-0.1 k} # exp(-0.1*k)",
        "\\mathrm e^{-0.1 k} # exp(-0.1*k)",
        "e^k # exp(k)",
        "\\mathrm{e} # exp(1)",
        "0.4 + 0.33i # 0.4 + 0.33*i",
        "0.4 - 0.33\\,\\mathrm{i} # 0.4 - 0.33*i",
        "(0.4+0.33i)^k # (0.4+0.33*i)^k",
        "e^{i\\pi k/3} # exp(i*pi*k/3)",
        "\\sqrt{2} # sqrt(2)",
        "\\sqrt2 k # sqrt(2)*k",
        "\\sqrt{k}^2 # sqrt(k)^2",
        "\\sqrt[3]{2} # 2^(1/3)",
        "\\sqrt[2]{2} # 2^(1/2)",
        "\\delta[k-1] # delta(k-1)",
        "\\delta(k) # delta(k)",
        "3\\delta_{k,0} # 3*delta(k)",
        "3\\,\\delta_{k0} # 3*delta(k)",
        "\\delta_{k,2} # delta(k-2)",
        "\\delta_{1k} # delta(k-1)",
        "\\binom{k}{2} 0.5^{k-2} # binomial(k, 2)*0.5^(k-2)",
        "\\tbinom k2 # binomial(k, 2)",
        "\\dbinom{k+1}{1} # binomial(k+1, 1)",
        "\\begin{cases} 1 & k = 0 \\\\ 0.5^k & k \\ge 1 \\end{cases} # {1 for k = 0; 0.5^k for k >= 1}",
        "\\begin{cases} 1, & \\text{for } k = 0, \\\\[2pt] 0.5^k, & \\text{if } k\\geq 1. \\\\ \\end{cases} # {1 for k = 0; 0.5^k for k >= 1}",
        "\\begin{dcases} 1 & k<1 \\\\ 2 & \\text{otherwise} \\end{dcases} # {1 for k < 1; 2 otherwise}",
        "2 \\begin{cases} 1 & 0 \\le k \\leq 3 \\\\ 3 & k > 3 \\end{cases} # 2*{1 for 0<=k<=3; 3 for k > 3}",
        "p_{B}(k) = 0.5^k # 0.5^k",
        "p_k = 0.5^k # 0.5^k",
        "p_{k} = 0.5^k # 0.5^k",
        "p_{\\text{lost}}[k]=0.5^k # 0.5^k",
        "\\text{lost}(k) \\approx 0.5^k # 0.5^k",
        "0{,}25 # 0.25",
        "0{,}4508^k # 0.4508^k",
        "12{,}5 # 12.5",
        "1\\,000 # 1000",
        "12\\,345\\,678 k # 12345678*k",
        "0.123\\,456 # 0.123456",
        "1~000.5 # 1000.5",
        "30\\% # 30%",
        "2.5\\% k # 2.5%*k",
        "7.281 \\cdot 10^{-4} # 7.281e-4",
        "7.281\\times10^{-4} k # 7.281e-4*k",
        "-9\\cdot 10^5 # -9e5",
        "10^{-4} # 10^(-4)",
        "2 \\cdot 10^{k} # 2*10^k",
        "\\lambda_{1}^k # 'λ_1'^k",
        "\\lambda_1 k # 'λ_1'*k",
        "\\varphi + \\phi # φ + φ",
        "\\mathrm{both} + \\text{both down} # 'both' + 'both down'",
        "\\text{p\\_1} k # 'p_1'*k",
        "a b + b a # a*b + b*a",
        "{0.45}^{k} # 0.45^k",
        "{} 2 {k} # 2*k",
        "0.5^{k}. # 0.5^k",
        "0.5^{k} + 3. # 0.5^k + 3",
        "1 − k # 1 - k",
        "\\displaystyle\\frac{1}{k} # 1/k",
        "+\\pi # pi"
    })
    void latexReadsAsTheSameFormulaInOrdinaryNotation(String latex, String text) throws RefusedException {
        assertEquals(plain(text), read(latex), latex);
    }

    @Provide
    static Arbitrary<Formula> trees() {
        return FormulaTrees.upTo(3);
    }

    /** Degrees standing alone come back as 1°, e and its exponents in plain form; the value is what counts. */
    @Property(tries = 1500, edgeCases = EdgeCasesMode.NONE, seed = "20267")
    void whatIsPrintedIsReadAsTheSameValue(@ForAll("trees") Formula tree) throws RefusedException {
        String latex = Latex.write(tree);
        assertEquals(SameValue.of(FormulaTrees.asRead(tree)), SameValue.of(read(latex)), () -> latex);
    }

    @Test
    void everyPartKnowsItsPlace() throws RefusedException {
        String latex = "p(k) = \\frac{1}{2} -\n 0.25^{k}";
        ParsedFormula sum = read(latex, FormulaReading.of(Subject.OF_K));
        assertEquals(new Span(new Position("claims.yaml", 4, 8), new Position("claims.yaml", 5, 10)), sum.span());
        ParsedFormula half = sum.parts().get(0);
        assertEquals(new Span(new Position("claims.yaml", 4, 8), new Position("claims.yaml", 4, 19)), half.span());
        ParsedFormula power = sum.parts().get(1).parts().get(0);
        assertEquals(new Position("claims.yaml", 5, 2), power.position());
        assertEquals(new Span(new Position("claims.yaml", 5, 7), new Position("claims.yaml", 5, 10)),
                power.parts().get(1).span());
        assertEquals(new Position("claims.yaml", 4, 5),
                read("𝛼".replace("𝛼", "\\pi+k"), FormulaReading.of(Subject.OF_K)).parts().get(1).position());
    }

    @Test
    void leftSidesAreDroppedWhereTheySayWhatIsExpected() throws RefusedException {
        record Expected(Subject subject, String left) {
        }
        for (Expected each : List.of(new Expected(Subject.OF_Z, "Y(z)"), new Expected(Subject.OF_Z, "P_{B}(z)"),
                new Expected(Subject.OF_Z_OVER_Z, "\\frac{Y(z)}{z}"), new Expected(Subject.OF_Z_OVER_Z, "Y(z)/z"),
                new Expected(Subject.OF_Z_OVER_Z, "\\dfrac{P_B(z)}{z}"), new Expected(Subject.OF_K, "P_{B,k}"))) {
            assertEquals(new Symbol("z"), read(each.left + " = z", FormulaReading.of(each.subject)).formula());
            for (Subject other : Subject.values()) {
                if (other != each.subject) {
                    Fault fault = assertThrows(RefusedException.class,
                            () -> read(each.left + " = z", FormulaReading.of(other))).faults().get(0);
                    assertEquals("left-side", fault.code());
                    assertEquals(START, fault.position());
                }
            }
        }
    }

    @Test
    void plainClaimsDropTheirLeftSidesToo() throws RefusedException {
        for (String text : List.of("p(k) = 0.5^k", "lost(k) = 0.5^k", "p_k = 0.5^k", "'both down'(k) ≈ 0.5^k", "0.5^k")) {
            assertEquals(plain("0.5^k"), plainClaim(text, Set.of(), FormulaReading.of(Subject.OF_K)), text);
        }
        assertEquals(plain("1/(z-1)"), plainClaim("Y(z)/z = 1/(z-1)", Set.of(), FormulaReading.of(Subject.OF_Z_OVER_Z)));
        assertEquals("claims.yaml:4:1: left of the equals sign stands 'p(k+1)', expected is a name at step k, as in"
                + " p(k) = …", assertThrows(RefusedException.class, () -> plainClaim("p(k+1) = 0.5^k", Set.of(),
                        FormulaReading.of(Subject.OF_K))).getMessage());
    }

    private static Formula plainClaim(String text, Set<String> names, FormulaReading reading) throws RefusedException {
        return FormulaParser.parse(text, Places.from(START, text), names, reading).formula();
    }

    @Test
    void plusMinusIsReadOnlyAsTheSignAskedFor() throws RefusedException {
        FormulaReading number = FormulaReading.of(Subject.NUMBER);
        assertEquals(plain("0.4 + 0.33 i"), read("0.4 \\pm 0.33i", number.with(PlusMinus.PLUS)).formula());
        assertEquals(plain("0.4 - 0.33 i"), read("0.4 ± 0.33i", number.with(PlusMinus.MINUS)).formula());
        assertEquals(plain("-1"), read("\\mp 1", number.with(PlusMinus.PLUS)).formula());
        assertEquals(plain("1 + 2"), plainClaim("1 ∓ 2", Set.of(), number.with(PlusMinus.MINUS)));
        assertEquals("plus-minus", refused("0.4 \\pm 0.33i").code());
    }

    @Test
    void jIsTheImaginaryUnitOnlyWhereThatIsSaid() throws RefusedException {
        FormulaReading withJ = FormulaReading.of(Subject.NUMBER).with(ImaginaryUnit.I_OR_J);
        assertEquals(Constant.I, read("j", withJ).formula());
        assertEquals(Constant.I, read("\\mathrm{j}", withJ).formula());
        assertEquals(Constant.I, plainClaim("j", Set.of(), withJ));
        assertEquals(new Symbol("j"), read("j"));
        assertEquals("unit-j", refused("\\mathrm{j}").code());
    }

    @ParameterizedTest
    @CsvSource(quoteCharacter = '`', delimiter = '#', value = {
        "1/2k # 2 # '1/2k' can be read in two ways: write (1/2)*k or 1/(2*k)",
        "\\tan^{-1}(k) # 1 # "
            + "'\\tan' isn't among the functions here: there are \\cos, \\sin, \\exp, \\arctan and \\arccos",
        "\\tan(k) # 1 # '\\tan' isn't among the functions here: there are \\cos, \\sin, \\exp, \\arctan and \\arccos",
        "\\cos^{2}(k) # 5 # "
            + "an exponent between a function and its argument has more than one meaning: write"
            + " \\left(\\cos(…)\\right)^{2}, or \\arccos and \\arctan",
        "\\cos^{-1}(k) # 5 # "
            + "an exponent between a function and its argument has more than one meaning: write"
            + " \\left(\\cos(…)\\right)^{2}, or \\arccos and \\arctan",
        "\\cos(k)^2 # 8 # "
            + "an exponent behind a function's argument has two readings: write"
            + " \\left(\\cos(…)\\right)^{2}, or the power within the argument",
        "\\cos 0.3k \\cdot 2 # 1 # where the argument of \\cos ends can be read in two ways: put it in parentheses",
        "\\cos 0.3k(k+1) # 1 # where the argument of \\cos ends can be read in two ways: put it in parentheses",
        "\\cos -k # 1 # the argument of \\cos goes in parentheses",
        "\\cos # 1 # the argument of \\cos goes in parentheses",
        "k! # 2 # a factorial has no place in these formulas; a binomial coefficient is \\binom{k}{2}",
        "\\log k # 1 # '\\log' isn't among the functions here: there are \\cos, \\sin, \\exp, \\arctan and \\arccos",
        "\\ln(2) # 1 # '\\ln' isn't among the functions here: there are \\cos, \\sin, \\exp, \\arctan and \\arccos",
        "\\sum_{k} 0.5^k # 1 # "
            + "'\\sum' has no meaning here: formulas are made of numbers, names, \\frac, \\sqrt, powers,"
            + " \\cos, \\sin, \\exp, \\arctan, \\arccos, \\binom, \\delta, \\pi and cases",
        "\\int k # 1 # "
            + "'\\int' has no meaning here: formulas are made of numbers, names, \\frac, \\sqrt, powers,"
            + " \\cos, \\sin, \\exp, \\arctan, \\arccos, \\binom, \\delta, \\pi and cases",
        "\\infty # 1 # "
            + "'\\infty' has no meaning here: formulas are made of numbers, names, \\frac, \\sqrt, powers,"
            + " \\cos, \\sin, \\exp, \\arctan, \\arccos, \\binom, \\delta, \\pi and cases",
        "\\frca{1}{2} # 1 # '\\frca' has no meaning here; did you mean '\\frac'?",
        "\\lamda^k # 1 # '\\lamda' has no meaning here; did you mean '\\lambda'?",
        "p(k+1) = 0.5^k # 1 # left of the equals sign stands 'p(k+1)', expected is a name at step k, as in p(k) = …",
        "p_{k+1} = 0.5^k # 5 # an index that is worked out has no meaning here: the formula is for step k itself",
        "Y(z) = z # 1 # left of the equals sign stands 'Y(z)', expected is a name at step k, as in p(k) = …",
        "p(k) = q(k) = 1 # 13 # only one equals sign can stand here: state what comes between as a claim of its own",
        "1 000 # 3 # between '1' and '000' a sign is missing",
        "2\\,3 # 2 # "
            + "'2\\,3' has a blank within a number: digits stand in groups of three, and a product is"
            + " written with \\cdot",
        "1\\,00 # 2 # "
            + "'1\\,00' has a blank within a number: digits stand in groups of three, and a product is"
            + " written with \\cdot",
        "1\\,0000 # 2 # "
            + "'1\\,0000' has a blank within a number: digits stand in groups of three, and a product is"
            + " written with \\cdot",
        "0.12\\,345 # 5 # "
            + "'0.12\\,345' has a blank within a number: digits stand in groups of three, and a product is"
            + " written with \\cdot",
        "1{,}234 # 2 # '1{,}234' can be read as 1234 or as 1.234: write one of these",
        "0,25 # 2 # a decimal comma is written in braces, as in 0{,}25",
        "1.2.3 # 1 # '1.2.' is no number: it has a point too many",
        "7.3e-4 # 4 # a power of ten is written as in 7.3 \\cdot 10^{-4}",
        "2e # 2 # a lone e can be a number or a name: write \\mathrm{e} or \\mathit{e}",
        "2^12 # 4 # ^ takes only the digit before this: use braces",
        "2^-1 # 3 # what is raised goes in braces: ^{…}",
        "0.5^{k}^{2} # 8 # "
            + "what is raised already can't carry this too: use parentheses, and an index before the"
            + " exponent",
        "a^b_c # 4 # what is raised already can't carry this too: use parentheses, and an index before the exponent",
        "2_1 # 2 # an index stands behind a name",
        "p_{} # 3 # the index is empty",
        "p_12 # 3 # only the first digit is set as index: write _{…}",
        "2\\frac{1}{2} # 2 # a fraction right behind a number can be read as added or as multiplied: write + or \\cdot",
        "\\frac123 # 8 # \\frac takes only the digit before this: use braces",
        "\\frac{1} # 1 # what \\frac works on goes in braces: \\frac{…}",
        "\\frac{1}{} # 10 # a number, a name or a parenthesis is missing before '}'",
        "\\sqrt12 # 7 # \\sqrt takes only the digit before this: use braces",
        "\\sqrt[k]{2} # 7 # the degree of a root is a whole number from 2 to 999",
        "\\sqrt[3]{-8} # 1 # a root of a negative number has more than one meaning",
        "{a+b}c # 1 # braces print nothing, so this has two readings: write ( and ) where they are meant",
        "{2k}^2 # 1 # braces print nothing, so this has two readings: write ( and ) where they are meant",
        "\\left( 1 + k ) # 14 # the parenthesis opened with \\left( is closed by \\right)",
        "\\left( 1 + k # 1 # the parenthesis that opens here isn't closed",
        "(1 + k] # 7 # the parenthesis opened with ( is closed by )",
        "(1 + k # 1 # the parenthesis that opens here isn't closed",
        "1 + k) # 6 # ')' closes or parts nothing that is open",
        "{1 + k # 1 # the brace that opens here isn't closed",
        "k} # 2 # '}' closes or parts nothing that is open",
        "1 &  2 # 3 # '&' closes or parts nothing that is open",
        "1 \\\\ 2 # 3 # '\\\\' closes or parts nothing that is open",
        "\\begin{array}{l} 1 \\end{array} # 1 # \\begin stands only before {cases} here",
        "\\begin{cases} 1 & k = 0 # 1 # the cases that begin here aren't ended: \\end{cases}",
        "\\begin{cases} 1 & k = 0 \\\\ 2 & k \\ge 0 \\end{cases} # 30 # two branches are for step k = 0",
        "\\begin{cases} 1 \\\\ 2 & k > 0 \\end{cases} # 17 # "
            + "behind a formula in cases & and its steps are missing, as in 0.5^k & k \\ge 1",
        "\\begin{cases} 1 & k \\in M \\end{cases} # 21 # "
            + "'\\in' has no meaning here: formulas are made of numbers, names, \\frac, \\sqrt, powers,"
            + " \\cos, \\sin, \\exp, \\arctan, \\arccos, \\binom, \\delta, \\pi and cases",
        "\\begin{cases} 1 & k = 0 & 2 \\end{cases} # 25 # a row has one & between formula and steps",
        "\\begin{cases} 1 & k = 0 \\\\[foo] 2 & k > 0 \\end{cases} # 25 # "
            + "behind \\\\ in brackets stands a length, as in \\\\[2pt]",
        "0.4 \\pm 0.33i # 5 # '\\pm' stands for two formulas: write the one that is meant",
        "\\mathrm{j} k # 1 # '\\mathrm{j}' isn't the imaginary unit here: that is \\mathrm{i}",
        "lost # 1 # 'lost' is printed as a product of letters: write \\text{lost} for a name",
        "cos(k) # 1 # 'cos' is printed as a product of letters: write \\cos",
        "pi k # 1 # 'pi' is printed as a product of letters: write \\pi",
        "\\text{lost}(k) # 1 # no function is called 'lost'; a product is written with *",
        "\\text{} # 1 # '\\text{}' holds no name",
        "\\text{a # 1 # the brace behind this command isn't closed",
        "\\text{a$b$} # 8 # '$' can't stand in a name as it is: write \\$",
        "\\mathrm # 1 # '\\mathrm' needs its word in braces: \\mathrm{…}",
        "\\operatorname{erf}(k) # 1 # "
            + "no function of this name is known here: there are \\cos, \\sin, \\exp, \\arctan and \\arccos",
        "50% # 3 # % begins a comment: a percent sign is \\%",
        "$k$ # 1 # take the dollar signs out",
        "k' # 2 # a prime says nothing here; a name is written as \\text{…}",
        "|k| # 1 # an absolute value has no place in these formulas",
        "0.5^{k}, k \\ge 1 # 8 # a comma stands only between the arguments of a function",
        "0.5^k \\text{ for } k \\ge 1 # 7 # 'for' has no meaning in a formula",
        "\\delta_{k}^2 \\tau_{k-1} # 21 # "
            + "an index that is worked out has no meaning here: the formula is for step k itself",
        "2 + # 3 # the formula ends after '+'",
        "2 \\cdot # 3 # the formula ends after '\\cdot'",
        "^2 # 1 # a number, a name or a parenthesis is missing before '^'",
        "а^k # 1 # 'а' (U+0430) has no meaning in a formula: it only looks like a, write a",
        "0.5^к # 5 # 'к' (U+043A) has no meaning in a formula: it only looks like k, write k",
        "２ + k # 1 # '２' (U+FF12) has no meaning in a formula: it only looks like 2, write 2",
        "k + \u200b 1 # 5 # the character U+200B has no meaning in a formula: it shows nothing and can be taken out",
        "k × ⅽ # 5 # 'ⅽ' (U+217D) has no meaning in a formula: it only looks like c, write c",
        "k‐1 # 2 # '‐' (U+2010) has no meaning in a formula: it only looks like -, write -",
        "2^{200000} # 3 # an exponent is at most 100000 here",
        "\\binom{k} # 1 # what \\binom works on goes in braces: \\binom{…}",
        "\\left. k \\right| # 1 # behind \\left stands one of ( [ \\{",
        "a:b # 2 # a quotient is written with / or \\frac"
    })
    void whatHasTwoReadingsOrNoneIsRefusedInItsPlace(String latex, int column, String message) {
        Fault fault = refused(latex);
        assertEquals(new Position("claims.yaml", 4, column) + ": " + message, fault.toString());
    }
}
