package org.pofk.answer;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import org.pofk.chain.SparseMatrix;
import org.pofk.exact.Polynomial;
import org.pofk.exact.Rational;
import org.pofk.longrun.StationaryDistribution;

/**
 * det(zI − A) of the part of A between given states, as a second way to it: the method of Faddeev and Le Verrier (Faddeev and Sominskii
 * 1949; from memory) on whole numbers: with M = L·A, B_0 = I, c_k = −tr(M B_(k−1))/k, which comes out whole, and
 * B_k = M B_(k−1) + c_k I. Exact; n² times the number of entries, on numbers of up to n · log L bits.
 */
final class ClassPolynomial {
    private ClassPolynomial() {
    }

    static Polynomial<Rational> of(SparseMatrix matrix, List<Integer> states) {
        int size = states.size();
        List<List<SparseMatrix.Entry>> columns = between(matrix, states);
        BigInteger scale = columns.stream().flatMap(List::stream).map(entry -> entry.value().denominator())
                .reduce(BigInteger.ONE, (a, b) -> a.divide(a.gcd(b)).multiply(b));
        Rational[] coefficients = new Rational[size + 1];
        coefficients[size] = Rational.ONE;
        BigInteger[][] product = identity(size);
        BigInteger power = BigInteger.ONE;
        for (int k = 1; k <= size; k++) {
            product = times(columns, scale, product);
            BigInteger coefficient = trace(product).negate().divide(BigInteger.valueOf(k));
            power = power.multiply(scale);
            coefficients[size - k] = new Rational(coefficient, power);
            for (int i = 0; i < size; i++) {
                product[i][i] = product[i][i].add(coefficient);
            }
        }
        return Polynomial.ofRationals(Arrays.asList(coefficients));
    }

    private static List<List<SparseMatrix.Entry>> between(SparseMatrix matrix, List<Integer> states) {
        Map<Integer, Integer> place = StationaryDistribution.placeOf(states);
        List<List<SparseMatrix.Entry>> columns = new ArrayList<>();
        for (int state : states) {
            columns.add(matrix.columns().get(state).stream().filter(entry -> place.containsKey(entry.row()))
                    .map(entry -> new SparseMatrix.Entry(place.get(entry.row()), entry.value())).toList());
        }
        return columns;
    }

    private static BigInteger[][] identity(int size) {
        BigInteger[][] identity = new BigInteger[size][size];
        for (int i = 0; i < size; i++) {
            Arrays.fill(identity[i], BigInteger.ZERO);
            identity[i][i] = BigInteger.ONE;
        }
        return identity;
    }

    /** scale · A times B. */
    private static BigInteger[][] times(List<List<SparseMatrix.Entry>> columns, BigInteger scale, BigInteger[][] b) {
        int size = columns.size();
        BigInteger[][] product = new BigInteger[size][size];
        for (BigInteger[] row : product) {
            Arrays.fill(row, BigInteger.ZERO);
        }
        for (int j = 0; j < size; j++) {
            for (SparseMatrix.Entry entry : columns.get(j)) {
                BigInteger value = entry.value().numerator().multiply(scale.divide(entry.value().denominator()));
                for (int i = 0; i < size; i++) {
                    if (b[j][i].signum() != 0) {
                        product[entry.row()][i] = product[entry.row()][i].add(value.multiply(b[j][i]));
                    }
                }
            }
        }
        return product;
    }

    private static BigInteger trace(BigInteger[][] matrix) {
        BigInteger trace = BigInteger.ZERO;
        for (int i = 0; i < matrix.length; i++) {
            trace = trace.add(matrix[i][i]);
        }
        return trace;
    }
}
