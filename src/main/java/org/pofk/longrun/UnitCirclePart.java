package org.pofk.longrun;

import java.util.ArrayList;
import java.util.List;
import org.pofk.chain.SparseMatrix;
import org.pofk.exact.Cyclotomic;
import org.pofk.exact.Polynomial;
import org.pofk.exact.Rational;
import org.pofk.exact.RationalField;
import org.pofk.transform.TransferFunction;

/**
 * The part of Y(z) at the primitive m-th roots of unity, simple poles all: with D = Φ V, the part is a/Φ where
 * a V ≡ N modulo Φ, and a/Φ = b/(z^m − 1) = Σ b_(m−k) z^(−k) over k ≥ 1, places modulo m. Exact; one
 * {@link LinearEquations} with φ(m) unknowns.
 */
final class UnitCirclePart {
    private UnitCirclePart() {
    }

    /** The values the part adds to y(k), in place k modulo m; for k ≥ 1 in Y itself, for every k in the long run. */
    static List<Rational> values(TransferFunction<Rational> y, int order) {
        Polynomial<Rational> cyclotomic = Cyclotomic.polynomial(order);
        Polynomial<Rational> rest = y.denominator().dividedExactlyBy(cyclotomic);
        Polynomial<Rational> part = quotientModulo(y.numerator(), rest, cyclotomic);
        Polynomial<Rational> whole = Polynomial.monomial(RationalField.Q, Rational.ONE, order)
                .minus(Polynomial.one(RationalField.Q));
        Polynomial<Rational> over = part.times(whole.dividedExactlyBy(cyclotomic));
        List<Rational> values = new ArrayList<>();
        for (int k = 0; k < order; k++) {
            values.add(over.coefficient((order - k) % order));
        }
        return List.copyOf(values);
    }

    /** The a of lower degree than the modulus with a · divisor ≡ dividend; divisor and modulus are coprime. */
    private static Polynomial<Rational> quotientModulo(Polynomial<Rational> dividend, Polynomial<Rational> divisor,
            Polynomial<Rational> modulus) {
        int degree = modulus.degree();
        if (degree == 1) {
            return Polynomial.ofRationals(List.of(dividend.remainder(modulus).coefficient(0)
                    .dividedBy(divisor.remainder(modulus).coefficient(0))));
        }
        List<List<SparseMatrix.Entry>> columns = new ArrayList<>();
        Polynomial<Rational> multiple = divisor.remainder(modulus);
        for (int j = 0; j < degree; j++) {
            List<SparseMatrix.Entry> column = new ArrayList<>();
            for (int i = 0; i < degree; i++) {
                column.add(new SparseMatrix.Entry(i, multiple.coefficient(i)));
            }
            columns.add(column);
            multiple = multiple.shiftedUp(1).remainder(modulus);
        }
        Polynomial<Rational> right = dividend.remainder(modulus);
        List<Rational> values = new ArrayList<>();
        for (int i = 0; i < degree; i++) {
            values.add(right.coefficient(i));
        }
        return Polynomial.ofRationals(LinearEquations.solve(new SparseMatrix(columns), values));
    }
}
