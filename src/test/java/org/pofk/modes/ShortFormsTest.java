package org.pofk.modes;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigInteger;
import java.util.Optional;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.pofk.exact.Ball;
import org.pofk.exact.Rational;
import org.pofk.formula.Formula;
import org.pofk.formula.PlainText;

class ShortFormsTest {

    @Test
    void squarePartMultipliesBackAndLeavesNoSmallSquare() {
        Random random = new Random(3);
        for (int run = 0; run < 300; run++) {
            BigInteger n = BigInteger.valueOf(1 + random.nextInt(1_000_000)).multiply(
                    BigInteger.valueOf(1 + random.nextInt(2_000)).pow(2));
            SquarePart part = SquarePart.of(n);
            assertEquals(n, part.root().pow(2).multiply(part.free()));
            for (int prime : new int[] {2, 3, 5, 7, 11, 13, 997}) {
                assertTrue(part.free().mod(BigInteger.valueOf((long) prime * prime)).signum() != 0, n + " " + prime);
            }
        }
        BigInteger large = BigInteger.TEN.pow(40).add(BigInteger.valueOf(121));
        assertEquals(new SquarePart(large, BigInteger.ONE), SquarePart.of(large.pow(2)));
    }

    @Test
    void rationalRootsAreFoundExactlyWhenThereAre() {
        assertEquals(Optional.of(Rational.of(2, 3)), SquarePart.root(Rational.of(32, 243), 5));
        assertEquals(Optional.empty(), SquarePart.root(Rational.of(32, 241), 5));
        assertEquals(Optional.of(Rational.ZERO), SquarePart.root(Rational.ZERO));
        assertEquals(Optional.empty(), SquarePart.root(Rational.of(-4)));
    }

    @Test
    void radicalsAreWrittenAsByHand() {
        assertEquals("1/5 + sqrt(2)/10",
                text(Radical.of(Surd.of(Rational.of(1, 5), Rational.of(1, 10), Rational.TWO))));
        assertEquals("-3*sqrt(2)/10", text(Radical.of(Surd.of(Rational.ZERO, Rational.of(-3, 10), Rational.TWO))));
        assertEquals("sqrt(6)/3", text(Radical.root(Surd.of(Rational.of(2, 3)), 2)));
        assertEquals("(1/2)^(1/3)", text(Radical.root(Surd.of(Rational.of(1, 8)), 9)));
        assertEquals("sqrt(2)/2", text(Radical.root(Surd.of(Rational.of(1, 4)), 4)));
        // √(3 + 2√2) = 1 + √2 (Bombelli 1572, from memory)
        assertEquals("1 + sqrt(2)", text(Radical.root(Surd.of(Rational.of(3), Rational.TWO, Rational.TWO), 2)));
        assertEquals("sqrt(2 + sqrt(2))", text(Radical.root(Surd.of(Rational.TWO, Rational.ONE, Rational.TWO), 2)));
        assertThrows(AssertionError.class, () -> Radical.root(Surd.of(Rational.of(-1)), 2));
    }

    @Test
    void rootsTakenByHandAreTheNumber() {
        Random random = new Random(8);
        int denested = 0;
        for (int run = 0; run < 200; run++) {
            Surd base = Surd.of(Rational.of(1 + random.nextInt(5), 2), Rational.of(random.nextInt(5) - 2L, 3),
                    Rational.of(2 + random.nextInt(3)));
            if (base.signum() > 0) {
                Rational d = Rational.of(base.d());
                Surd square = Surd.of(base.u().times(base.u()).plus(base.v().times(base.v()).times(d)),
                        base.u().times(base.v()).times(Rational.TWO), d);
                assertEquals(Optional.of(base), square.squareRoot());
                denested++;
            }
        }
        assertTrue(denested > 100, "denested: " + denested);
    }

    @Test
    void signsOfSurdsAreThoseOfTheirValues() {
        for (int u = -5; u <= 5; u++) {
            for (int v = -4; v <= 4; v++) {
                Surd surd = Surd.of(Rational.of(u), Rational.of(v), Rational.of(3));
                Ball value = FormulaValue.of(surd.formula(), 0, 100);
                assertEquals(value.sign().orElseThrow(), surd.signum(), surd.toString());
            }
        }
    }

    @Test
    void derivationNamesPairsAndJoinsConjugates() {
        Derivation derivation = Samples.closedForm("1/4 0 1", "0 1/4 -1/2 1").derivation();
        assertEquals(2, derivation.impulses().size());
        assertEquals("z^(-1)", PlainText.ASCII.write(derivation.impulses().get(1).pair().transform()));
        Derivation.FactorStep step = derivation.factors().get(0);
        assertEquals("z^2 - 1/2*z + 1/4", PlainText.ASCII.write(step.polynomial()));
        Derivation.PairStep pair = step.pairs().get(0);
        Rational four = Rational.of(4);
        Ball real = pair.real().enclosure().enclose(80);
        Ball imaginary = pair.imaginary().enclosure().enclose(80);
        Ball squares = real.times(real).plus(imaginary.times(imaginary));
        Ball modulus = pair.modulus().enclosure().enclose(80);
        assertTrue(squares.overlaps(modulus.times(modulus)));
        Ball amplitude = pair.mode().amplitude().enclosure().enclose(80);
        assertTrue(amplitude.times(amplitude).overlaps(squares.times(Ball.of(four, 80))));
        assertTrue(pair.joined().isPresent());
        assertTrue(pair.real().exact().isPresent() && pair.imaginary().exact().isPresent());
        Formula sequence = TablePair.ofPole(2).sequence();
        assertEquals("binomial(k, 2)*lambda^(k - 2)",
                PlainText.ASCII.write(sequence).replace("λ", "lambda"));
    }

    @Test
    void sumOverRootsCarriesTheShortestCoefficient() {
        // reduced it is −2970/329 λ² + 1830/329 λ + 660/329
        assertEquals("Σ[λ: 30λ^3 − 10λ − 3 = 0] (3λ + 3)/(9λ^2 − 1)·λ^k",
                PlainText.UNICODE.write(Samples.closedForm("0 1 1", "-1/10 -1/3 0 1").formulaOverRoots()));
    }

    private static String text(Radical radical) {
        return PlainText.ASCII.write(radical.formula());
    }
}
