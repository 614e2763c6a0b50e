package org.pofk.transform;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;

/**
 * The integers of least absolute value with given residues modulo several primes. Exact; cost quadratic in the number
 * of primes.
 */
final class ChineseRemainders {
    private final List<PrimeField> fields;
    private final BigInteger product;
    private final List<BigInteger> cofactors = new ArrayList<>();
    private final long[] inverses;

    ChineseRemainders(List<PrimeField> fields) {
        this.fields = List.copyOf(fields);
        product = product(fields, 0, fields.size());
        inverses = new long[fields.size()];
        for (int i = 0; i < inverses.length; i++) {
            PrimeField field = fields.get(i);
            cofactors.add(product.divide(BigInteger.valueOf(field.prime())));
            inverses[i] = field.inverse(field.of(cofactors.get(i)));
        }
    }

    private static BigInteger product(List<PrimeField> fields, int from, int to) {
        if (to - from <= 1) {
            return to == from ? BigInteger.ONE : BigInteger.valueOf(fields.get(from).prime());
        }
        int middle = (from + to) >>> 1;
        return product(fields, from, middle).multiply(product(fields, middle, to));
    }

    /** The product of the primes. */
    BigInteger product() {
        return product;
    }

    /** The integer x, |x| ≤ product/2, with x ≡ residues[i]·factor modulo the i-th prime. */
    BigInteger combine(long[] residues, BigInteger factor) {
        BigInteger sum = BigInteger.ZERO;
        for (int i = 0; i < residues.length; i++) {
            PrimeField field = fields.get(i);
            long weight = field.multiply(field.multiply(residues[i], inverses[i]), field.of(factor));
            if (weight != 0) {
                sum = sum.add(cofactors.get(i).multiply(BigInteger.valueOf(weight)));
            }
        }
        BigInteger least = sum.mod(product);
        return least.shiftLeft(1).compareTo(product) > 0 ? least.subtract(product) : least;
    }
}
