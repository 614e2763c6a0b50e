package org.pofk.claim;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.pofk.chain.SparseMatrix;
import org.pofk.exact.Polynomial;
import org.pofk.exact.Rational;
import org.pofk.exact.ResidueField;
import org.pofk.exact.Root;
import org.pofk.meaning.Quantity;

/**
 * The eigenvectors of A at an eigenvalue λ, a root of q: the solutions of (A − λ) v = 0 over Q[λ]/(q), by elimination.
 * Exact; n³ operations there.
 *
 * @param free    the components that may be chosen, ascending
 * @param vectors the solution in which one free component, in their order, is one and the others are zero
 */
record Eigenspace(List<Integer> free, List<List<Quantity>> vectors) {

    /** Empty where q isn't known to be irreducible and a divisor of zero came up. */
    static Optional<Eigenspace> of(SparseMatrix matrix, Root eigenvalue) {
        ResidueField<Rational> field = new ResidueField<>(eigenvalue.polynomial());
        try {
            return Optional.of(new Elimination(field, matrix).solved(Quantity.of(eigenvalue)));
        } catch (ArithmeticException notAField) {
            return Optional.empty();
        }
    }

    /** Rows brought to reduced echelon form. */
    private static final class Elimination {
        private final ResidueField<Rational> field;
        private final List<List<Polynomial<Rational>>> rows = new ArrayList<>();
        private final List<Integer> pivots = new ArrayList<>();
        private final int size;

        Elimination(ResidueField<Rational> field, SparseMatrix matrix) {
            this.field = field;
            this.size = matrix.size();
            for (int i = 0; i < size; i++) {
                List<Polynomial<Rational>> row = new ArrayList<>();
                for (int j = 0; j < size; j++) {
                    Polynomial<Rational> entry = field.of(matrix.at(i, j));
                    row.add(i == j ? field.subtract(entry, field.generator()) : entry);
                }
                rows.add(row);
            }
            for (int column = 0; column < size; column++) {
                clear(column);
            }
        }

        private void clear(int column) {
            int place = pivots.size();
            int row = place;
            while (row < size && field.isZero(rows.get(row).get(column))) {
                row++;
            }
            if (row == size) {
                return;
            }
            Polynomial<Rational> inverse = field.inverse(rows.get(row).get(column));
            List<Polynomial<Rational>> pivot =
                    rows.remove(row).stream().map(entry -> field.multiply(entry, inverse)).toList();
            rows.add(place, pivot);
            pivots.add(column);
            for (int other = 0; other < size; other++) {
                Polynomial<Rational> factor = rows.get(other).get(column);
                if (other != place && !field.isZero(factor)) {
                    List<Polynomial<Rational>> cleared = new ArrayList<>();
                    for (int j = 0; j < size; j++) {
                        cleared.add(field.subtract(rows.get(other).get(j), field.multiply(factor, pivot.get(j))));
                    }
                    rows.set(other, cleared);
                }
            }
        }

        Eigenspace solved(Quantity eigenvalue) {
            List<Integer> free = new ArrayList<>();
            List<List<Quantity>> vectors = new ArrayList<>();
            for (int column = 0; column < size; column++) {
                if (!pivots.contains(column)) {
                    free.add(column);
                    vectors.add(vector(column, eigenvalue));
                }
            }
            return new Eigenspace(free, vectors);
        }

        private List<Quantity> vector(int free, Quantity eigenvalue) {
            List<Quantity> vector = new ArrayList<>();
            for (int state = 0; state < size; state++) {
                int row = pivots.indexOf(state);
                vector.add(row >= 0 ? valueAt(eigenvalue, rows.get(row).get(free)).negate()
                        : state == free ? Quantity.ONE : Quantity.ZERO);
            }
            return vector;
        }

        private static Quantity valueAt(Quantity point, Polynomial<Rational> polynomial) {
            Quantity value = Quantity.ZERO;
            for (int power = polynomial.degree(); power >= 0; power--) {
                value = value.times(point).plus(Quantity.of(polynomial.coefficient(power)));
            }
            return value;
        }
    }

    Eigenspace {
        free = List.copyOf(free);
        vectors = vectors.stream().map(List::copyOf).toList();
    }
}
