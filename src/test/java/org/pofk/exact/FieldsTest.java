package org.pofk.exact;

import net.jqwik.api.Arbitraries;
import net.jqwik.api.Arbitrary;
import net.jqwik.api.Combinators;
import net.jqwik.api.Group;

/** Every field of the project, each held to the laws. */
class FieldsTest {
    private static final ResidueField<Rational> CUBIC = new ResidueField<>(Polynomial.ofIntegers(-2, 0, 0, 1));
    private static final Polynomial<Polynomial<Rational>> CUBIC_SQUARED_PLUS_ROOT =
            Polynomial.monomial(CUBIC, CUBIC.one(), 2).plus(Polynomial.constant(CUBIC, CUBIC.generator()));

    @Group
    class Rationals extends FieldLaws<Rational> {
        Rationals() {
            super(RationalField.Q, rationals());
        }
    }

    @Group
    class GaussianNumbers extends FieldLaws<Polynomial<Rational>> {
        GaussianNumbers() {
            super(new ResidueField<>(Polynomial.ofIntegers(1, 0, 1)), residues(RationalField.Q, rationals(), 2));
        }
    }

    @Group
    class CubicField extends FieldLaws<Polynomial<Rational>> {
        CubicField() {
            super(CUBIC, residues(RationalField.Q, rationals(), 3));
        }
    }

    @Group
    class TowerOfFields extends FieldLaws<Polynomial<Polynomial<Rational>>> {
        TowerOfFields() {
            super(new ResidueField<>(CUBIC_SQUARED_PLUS_ROOT),
                    residues(CUBIC, residues(RationalField.Q, rationals(), 3), 2));
        }
    }

    private static Arbitrary<Rational> rationals() {
        Arbitrary<Integer> numerators = Arbitraries.integers().between(-1_000, 1_000);
        Arbitrary<Integer> denominators = Arbitraries.integers().between(1, 60);
        return Combinators.combine(numerators, denominators).as((p, q) -> Rational.of(p, q));
    }

    private static <E> Arbitrary<Polynomial<E>> residues(Field<E> base, Arbitrary<E> coefficients, int degree) {
        return coefficients.list().ofMaxSize(degree).map(all -> new Polynomial<>(base, all));
    }
}
