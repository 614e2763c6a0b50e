package org.pofk.formula;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
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
import org.pofk.formula.Formula.RootSum;
import org.pofk.formula.Formula.Sum;
import org.pofk.formula.Formula.Symbol;
import org.pofk.text.Position;
import org.pofk.text.RefusedException;

class LatexTest {

    private static Formula parsed(String text) throws RefusedException {
        return FormulaParser.parse(text, new Position("claims.yaml", 1, 1)).formula();
    }

    @ParameterizedTest
    @CsvSource(quoteCharacter = '"', delimiter = ';', value = {
        "(1/2)^k; \\left(\\frac{1}{2}\\right)^{k}",
        "(-1/4)^k; \\left(-\\frac{1}{4}\\right)^{k}",
        "2^(k-1); 2^{k - 1}",
        "0.008176 - 0.01726*0.4508^k; 0.008176 - 0.01726 \\cdot 0.4508^{k}",
        "20/2447 - 7/10*(9/20)^k; \\frac{20}{2447} - \\frac{7}{10} \\left(\\frac{9}{20}\\right)^{k}",
        "binomial(k, 2)*(1/3)^(k-2); \\binom{k}{2} \\left(\\frac{1}{3}\\right)^{k - 2}",
        "binomial(k, 2)^2; \\left(\\binom{k}{2}\\right)^{2}",
        "delta(k) + 3delta(k-1); \\delta[k] + 3 \\delta[k - 1]",
        "(1 + 1/(1 + 1/z))/2; \\frac{1 + \\frac{1}{1 + \\frac{1}{z}}}{2}",
        "2*(1/2)^k*cos(2 pi k/3 - pi/6); 2 \\cdot \\left(\\frac{1}{2}\\right)^{k}"
            + " \\cos\\left(\\frac{2 \\pi k}{3} - \\frac{\\pi}{6}\\right)",
        "sqrt(2)*sqrt(k); \\sqrt{2} \\sqrt{k}",
        "sqrt(2)^k; \\left(\\sqrt{2}\\right)^{k}",
        "cos(k)^2 + exp(-λ); \\left(\\cos\\left(k\\right)\\right)^{2} + \\exp\\left(-\\lambda\\right)",
        "39.7 deg k - 119 deg; 39.7^{\\circ} k - 119^{\\circ}",
        "7.281e-4^k; \\left(7.281 \\cdot 10^{-4}\\right)^{k}",
        "7.281e-4*k; 7.281 \\cdot 10^{-4} k",
        "2*3*k; 2 \\cdot 3 k",
        "3*(1/2); 3 \\cdot \\frac{1}{2}",
        "k*(k-1)/2; \\frac{k \\cdot \\left(k - 1\\right)}{2}",
        "(z-1)*(z-2); \\left(z - 1\\right) \\left(z - 2\\right)",
        "-(a + b) - (-c); -\\left(a + b\\right) - \\left(-c\\right)",
        "-(a - 1)/2; -\\frac{a - 1}{2}",
        "a*(-b); a \\cdot \\left(-b\\right)",
        "(2^k)^j; \\left(2^{k}\\right)^{j}",
        "0.4 + 0.33 i; 0.4 + 0.33 \\mathrm{i}",
        "both + p_1 + 'both down' + Θ; \\mathrm{both} + \\text{p\\_1} + \\text{both down} + \\Theta",
        "'50% & #1 {x} \\~^$'; "
            + "\\text{50\\% \\& \\#1 \\{x\\} \\textbackslash{}\\textasciitilde{}\\textasciicircum{}\\$}",
        "arctan(x)*arccos(1/3); \\arctan\\left(x\\right) \\arccos\\left(\\frac{1}{3}\\right)"
    })
    void formulasAreSetAsInATextbook(String text, String latex) throws RefusedException {
        assertEquals(latex, Latex.write(parsed(text)));
    }

    @Test
    void negativeNumbersAreSetAsDifferencesAndInParenthesesUnderPowers() {
        Formula quarter = new Number(Rational.of(-1, 4));
        assertEquals("\\left(-\\frac{1}{4}\\right)^{k}", Latex.write(new Power(quarter, new Symbol("k"))));
        assertEquals("k - \\frac{1}{4}", Latex.write(new Sum(List.of(new Symbol("k"), quarter))));
    }

    @Test
    void aSumOverRootsNamesItsPolynomial() throws RefusedException {
        RootSum sum = new RootSum(new Symbol("λ"), parsed("λ^3 - λ + 1/7"), parsed("λ^k + λ"));
        assertEquals("1 - \\sum_{\\lambda:\\, \\lambda^{3} - \\lambda + \\frac{1}{7} = 0}"
                + " \\left(\\lambda^{k} + \\lambda\\right)", Latex.write(new Sum(List.of(new Number(Rational.ONE),
                new Negation(sum)))));
    }

    @Provide
    static Arbitrary<Formula> trees() {
        return FormulaTrees.upTo(3);
    }

    @Property(tries = 500, edgeCases = EdgeCasesMode.NONE, seed = "20266")
    void bracesAndParenthesesAlwaysMatch(@ForAll("trees") Formula tree) {
        String latex = Latex.write(tree).replace("\\{", "").replace("\\}", "");
        assertEquals(count(latex, "{"), count(latex, "}"), latex);
        assertEquals(count(latex, "\\left("), count(latex, "\\right)"), latex);
    }

    private static int count(String text, String part) {
        return (text.length() - text.replace(part, "").length()) / part.length();
    }
}
