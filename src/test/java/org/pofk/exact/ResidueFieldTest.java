package org.pofk.exact;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.util.List;
import org.junit.jupiter.api.Test;

class ResidueFieldTest {
    private static final ResidueField<Rational> GOLDEN = new ResidueField<>(Polynomial.ofIntegers(-1, -1, 1));

    /** Lucas numbers 2, 1, 3, 4, 7, 11, … are φ^k + ψ^k. */
    @Test
    void tracesOfPowersOfTheGoldenRatioAreLucasNumbers() {
        Polynomial<Rational> power = GOLDEN.one();
        for (long lucas : new long[] {2, 1, 3, 4, 7, 11, 18, 29, 47, 76}) {
            assertEquals(Rational.of(lucas), GOLDEN.trace(power));
            power = GOLDEN.multiply(power, GOLDEN.generator());
        }
    }

    @Test
    void normIsTheProductOverTheRoots() {
        assertEquals(Rational.of(-1), GOLDEN.norm(GOLDEN.generator()));
        assertEquals(Rational.of(9), GOLDEN.norm(GOLDEN.of(3)));
        assertEquals(Rational.of(-7), new ResidueField<>(Polynomial.ofIntegers(7, 1, 0, 1)).norm(
                Polynomial.ofIntegers(0, 1)));
        assertEquals(Rational.ZERO, GOLDEN.norm(GOLDEN.zero()));
    }

    /** The square of √2 + √3 is 5 + 2√6, with minimal polynomial z² − 10 z + 1. */
    @Test
    void minimalPolynomialIsOfTheDegreeOfTheElement() {
        ResidueField<Rational> field = new ResidueField<>(Polynomial.ofIntegers(1, 0, -10, 0, 1));
        Polynomial<Rational> square = field.multiply(field.generator(), field.generator());
        assertEquals(Polynomial.ofIntegers(1, -10, 1), field.minimalPolynomial(square));
        assertEquals(Polynomial.ofIntegers(1, -10, 1).pow(2), field.characteristicPolynomial(square));
        assertEquals(field.modulus(), field.minimalPolynomial(field.generator()));
        assertEquals(Polynomial.ofIntegers(-5, 1), field.minimalPolynomial(field.of(5)));
    }

    @Test
    void minimalPolynomialVanishesAtTheElement() {
        ResidueField<Rational> field = new ResidueField<>(Polynomial.ofIntegers(3, -1, 0, 2, 0, 0, 1));
        Polynomial<Rational> element = Polynomial.ofIntegers(1, 4, 0, -2, 1, 1);
        Polynomial<Rational> minimal = field.minimalPolynomial(element);
        assertEquals(6, minimal.degree());
        assertEquals(field.zero(), minimal.map(field, field::of).valueAt(element));
    }

    @Test
    void valuesAtTheRootsOfAProductAreKeptApart() {
        ResidueField<Rational> ring = new ResidueField<>(
                Polynomial.ofIntegers(-1, 1).times(Polynomial.ofIntegers(2, 0, 1)));
        assertThrows(ArithmeticException.class, () -> ring.inverse(Polynomial.ofIntegers(-1, 1)));
        assertEquals(ring.one(), ring.multiply(ring.generator(), ring.inverse(ring.generator())));
        assertEquals(Polynomial.ofIntegers(-1, 1).times(Polynomial.ofIntegers(2, 1)),
                ring.minimalPolynomial(Polynomial.ofIntegers(0, 0, 1)));
    }

    @Test
    void elementsAreReducedAndTheModulusIsMadeMonic() {
        ResidueField<Rational> field = new ResidueField<>(Polynomial.ofIntegers(2, 0, 2));
        assertEquals(Polynomial.ofIntegers(1, 0, 1), field.modulus());
        assertEquals(field.of(-1), field.residue(Polynomial.ofIntegers(0, 0, 1)));
        assertEquals(field.zero(), field.add(Polynomial.ofIntegers(0, 0, 1), field.one()));
        assertThrows(ArithmeticException.class, () -> new ResidueField<>(Polynomial.ofIntegers(3)));
    }

    /** Over Q(√2): the minimal polynomial of ⁴√2 over Q(√2) is z² − √2, its norm −√2. */
    @Test
    void towersWorkOverAnyField() {
        ResidueField<Rational> base = new ResidueField<>(Polynomial.ofIntegers(-2, 0, 1));
        Polynomial<Polynomial<Rational>> modulus = new Polynomial<>(base,
                List.of(base.negate(base.generator()), base.zero(), base.one()));
        ResidueField<Polynomial<Rational>> tower = new ResidueField<>(modulus);
        assertEquals(modulus, tower.minimalPolynomial(tower.generator()));
        assertEquals(base.negate(base.generator()), tower.norm(tower.generator()));
        assertEquals(base.zero(), tower.trace(tower.generator()));
    }
}
