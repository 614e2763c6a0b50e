package org.pofk.formula;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Random;
import net.jqwik.api.Arbitraries;
import net.jqwik.api.Arbitrary;
import net.jqwik.api.EdgeCasesMode;
import net.jqwik.api.Example;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.Provide;
import net.jqwik.api.Shrinkable;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.pofk.exact.Factorization;
import org.pofk.exact.Factorization.Factor;
import org.pofk.exact.Factorization.Irreducible;
import org.pofk.exact.Polynomial;
import org.pofk.exact.Rational;
import org.pofk.formula.Formula.Symbol;
import org.pofk.text.Position;
import org.pofk.text.RefusedException;

class FormulasTest {
    private static final Formula Z = new Symbol("z");
    private static final Map<String, Rational> VALUES = Map.of("k", Rational.of(3), "z", Rational.of(2, 7));

    private static Formula parsed(String text) throws RefusedException {
        return FormulaParser.parse(text, new Position("claims.yaml", 1, 1)).formula();
    }

    @ParameterizedTest
    @CsvSource(quoteCharacter = '"', delimiter = ';', value = {
        "1*x; x", "x*0; 0", "x + 0; x", "0 - x; −x", "a + (b - c); a + b − c", "a*(b*2); 2a·b", "3*x*(1/6); 1/2·x",
        "x*(-2); −2x", "(-x)*(-y); x·y", "1 + x + 2; 3 + x", "x - (-3); x + 3", "x/1; x", "-x/(-2); x/2",
        "(-1)/x; −1/x", "4/6; 2/3", "1/0; 1/0", "x^1; x", "x^0; 1", "1^k; 1", "(1/2)^3; 1/8", "0^(0-1); 0^(−1)",
        "2^100000; 2^100000", "sqrt(9/4)*x; 3/2·x", "sqrt(2); √2", "cos(0); 1", "binomial(5, 2); 10", "1 - 1; 0",
        "0.5*2*x; 2·0.5·x", "a - (b + c); a − (b + c)", "--x; x", "2(0.5 + 0.5)^k; 2·(0.5 + 0.5)^k"
    })
    void tidyingDoesWhatIsObviousAndNothingElse(String text, String tidied) throws RefusedException {
        assertEquals(tidied, PlainText.UNICODE.write(Tidying.tidy(parsed(text))));
    }

    @Provide
    static Arbitrary<Formula> trees() {
        return FormulaTrees.upTo(3);
    }

    @Property(tries = 400, edgeCases = EdgeCasesMode.NONE, seed = "20267")
    void tidyingTwiceChangesNothing(@ForAll("trees") Formula tree) {
        Formula tidied = Tidying.tidy(tree);
        assertEquals(tidied, Tidying.tidy(tidied));
        assertEquals(tidied, Tidying.tidy(FormulaTrees.asRead(tree)), "and how numbers were written doesn't matter");
    }

    @Example
    void tidyingKeepsTheValue() {
        Arbitrary<Formula> leaves = Arbitraries.oneOf(FormulaTrees.numbers(),
                Arbitraries.of("k", "z").map(Symbol::new));
        int compared = 0;
        for (Formula tree : FormulaTrees.upTo(2, leaves).generator(1000).stream(new Random(20268)).limit(1000)
                .map(Shrinkable::value).toList()) {
            Optional<Rational> value = value(tree);
            if (value.isPresent()) {
                compared++;
                assertEquals(value, value(Tidying.tidy(tree)), () -> PlainText.UNICODE.write(tree));
            }
        }
        assertTrue(compared > 500, "values compared: " + compared);
    }

    private static Optional<Rational> value(Formula formula) {
        try {
            return Optional.of(LinearForm.value(FormulaParser.parse(PlainText.UNICODE.write(formula),
                    new Position("tree", 1, 1)), VALUES));
        } catch (RefusedException withoutValue) {
            return Optional.empty();
        }
    }

    @Test
    void polynomialsAreWrittenFromTheHighestPowerDown() {
        assertEquals("z^3 − 19/20·z^2 + z − 1/400", PlainText.UNICODE.write(Formulas.polynomial(Polynomial.ofRationals(
                List.of(Rational.of(-1, 400), Rational.ONE, Rational.of(-19, 20), Rational.ONE)), Z)));
        assertEquals("30z^3 − 10z − 3", PlainText.UNICODE.write(
                Formulas.polynomial(Polynomial.ofIntegers(-3, -10, 0, 30), Z)));
        assertEquals("−2z", PlainText.UNICODE.write(Formulas.polynomial(Polynomial.ofIntegers(0, -2), Z)));
        assertEquals("0", PlainText.UNICODE.write(Formulas.polynomial(Polynomial.ofIntegers(), Z)));
    }

    @Test
    void factorizationsAreWrittenAsProducts() {
        Factorization<Rational> factorization = new Factorization<>(Rational.of(1, 3), List.of(
                new Factor<>(Polynomial.ofIntegers(0, 1), 2, Irreducible.PROVED),
                new Factor<>(Polynomial.ofIntegers(-1, 1), 1, Irreducible.PROVED),
                new Factor<>(Polynomial.ofIntegers(1, 1, 1), 3, Irreducible.PROVED)));
        assertEquals("1/3·z^2·(z − 1)·(z^2 + z + 1)^3", PlainText.UNICODE.write(Formulas.factored(factorization, Z)));
        assertEquals("1", PlainText.UNICODE.write(Formulas.factored(new Factorization<>(Rational.ONE, List.of()), Z)));
    }

    @Test
    void signedDecimalsArePrintedWithOneSign() {
        assertEquals("−0.5 − z", PlainText.UNICODE.write(
                Formulas.sum(List.of(Formulas.decimal("-0.5"), Formulas.negated(Z)))));
        assertEquals("z + 0.5", PlainText.UNICODE.write(
                Formulas.sum(List.of(Z, Formulas.negated(Formulas.decimal("-0.5"))))));
    }

    @Test
    void fractionsHaveTheirSignInFrontAndTheIrrationalAbove() {
        assertEquals("−3·√2/10", PlainText.UNICODE.write(
                Formulas.fraction(Rational.of(-3, 10), Formulas.squareRoot(Formulas.number(2)))));
        Formula angle = Formulas.fraction(Rational.of(2, 5), Formula.Constant.PI);
        assertTrue(Formulas.isMultipleOfPi(angle));
        assertEquals("2π·k/5", PlainText.UNICODE.write(Formulas.overDenominator(angle, new Symbol("k"))));
    }
}
