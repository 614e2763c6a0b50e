package org.pofk.longrun;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Random;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.pofk.answer.Chains;
import org.pofk.chain.SparseMatrix;
import org.pofk.exact.Rational;

class LinearEquationsTest {

    @Test
    void theInverseOfAHilbertMatrixIsWhole() {
        // Choi 1983, American Mathematical Monthly 90 (from memory): with b = (1, …, 1) the solution's i-th component is
        // (−1)^(n−i) binomial(n+i−1, i−1) binomial(n, i) i, and the components sum to n²
        int n = 12;
        List<List<Rational>> rows = new ArrayList<>();
        for (int i = 0; i < n; i++) {
            int first = i + 1;
            rows.add(IntStream.range(0, n).mapToObj(j -> Rational.of(1, first + j)).toList());
        }
        List<Rational> solution = LinearEquations.solve(SparseMatrix.ofRows(rows),
                IntStream.range(0, n).mapToObj(i -> Rational.ONE).toList());
        assertEquals(Rational.of(n * n), solution.stream().reduce(Rational.ZERO, Rational::plus));
        for (int i = 1; i <= n; i++) {
            BigInteger size = binomial(n + i - 1, i - 1).multiply(binomial(n, i)).multiply(BigInteger.valueOf(i));
            assertEquals(Rational.of((n - i) % 2 == 0 ? size : size.negate()), solution.get(i - 1));
        }
    }

    @Test
    void aChosenSolutionIsFoundAgain() {
        Random random = new Random(23);
        for (int round = 0; round < 200; round++) {
            int size = 1 + random.nextInt(12);
            List<List<Rational>> rows = new ArrayList<>();
            for (int i = 0; i < size; i++) {
                List<Rational> row = new ArrayList<>();
                for (int j = 0; j < size; j++) {
                    // a heavy diagonal keeps the matrix invertible
                    row.add(Rational.of(i == j ? 500 + random.nextInt(100) : random.nextInt(19) - 9,
                            1 + random.nextInt(4)));
                }
                rows.add(row);
            }
            List<Rational> chosen = random.ints(size, -1_000, 1_000)
                    .mapToObj(numerator -> Rational.of(numerator, 1 + random.nextInt(1_000))).toList();
            SparseMatrix matrix = SparseMatrix.ofRows(rows);
            assertEquals(chosen, LinearEquations.solve(matrix, matrix.times(chosen)), "seed 23, round " + round);
        }
    }

    @Test
    void aSingularMatrixIsRefused() {
        SparseMatrix singular = SparseMatrix.ofRows(List.of(Chains.numbers("1 2"), Chains.numbers("2 4")));
        assertThrows(ArithmeticException.class, () -> LinearEquations.solve(singular, Chains.numbers("1 1")));
    }

    @Test
    void everyFractionWithinTheLimitIsReadBackFromItsResidue() {
        BigInteger modulus = BigInteger.valueOf(20_011);
        BigInteger limit = BigInteger.valueOf(100);
        int read = 0;
        for (int numerator = -100; numerator <= 100; numerator++) {
            for (int denominator = 1; denominator <= 100; denominator++) {
                Rational fraction = Rational.of(numerator, denominator);
                BigInteger residue = fraction.numerator().multiply(fraction.denominator().modInverse(modulus))
                        .mod(modulus);
                assertEquals(Optional.of(fraction), RationalReconstruction.of(residue, modulus, limit));
                read++;
            }
        }
        assertEquals(20_100, read);
    }

    private static BigInteger binomial(int n, int k) {
        BigInteger product = BigInteger.ONE;
        for (int i = 0; i < k; i++) {
            product = product.multiply(BigInteger.valueOf(n - i)).divide(BigInteger.valueOf(i + 1));
        }
        return product;
    }
}
