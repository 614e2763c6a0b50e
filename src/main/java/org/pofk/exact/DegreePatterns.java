package org.pofk.exact;

import java.util.BitSet;
import java.util.List;

/**
 * Proof of irreducibility by degrees: a factor over Q has, modulo every good prime, a degree that is a sum of degrees
 * of factors there; when only 0 and the full degree remain for all primes together, there is no factor (Musser 1975,
 * Multivariate polynomial factorization; from memory). Exact when it says yes; no says nothing: the eighth cyclotomic
 * polynomial splits modulo every prime.
 */
final class DegreePatterns {
    private static final int FIRST_PRIME = 13;
    private static final int PRIMES_AT_MOST = 40;

    private DegreePatterns() {
    }

    /**
     * Whether the degrees modulo up to 40 primes prove it, ending after {@code patience} in a row that brought nothing.
     *
     * @param squareFree without a rational root, of degree 2 at least
     */
    static boolean proveIrreducible(IntegerPolynomial squareFree, int patience) {
        BitSet possible = new BitSet();
        possible.set(0, squareFree.degree() + 1);
        possible.clear(1);
        possible.clear(squareFree.degree() - 1);
        if (possible.cardinality() == 2) {
            return true;
        }
        int useless = 0;
        int used = 0;
        for (int prime = FIRST_PRIME; used < PRIMES_AT_MOST && useless < patience;
                prime = SmallPrimes.after(prime)) {
            ModularPolynomial image = squareFree.modulo(prime);
            if (image.degree() == squareFree.degree() && image.isSquareFree()) {
                int before = possible.cardinality();
                possible.and(sums(image.factorDegrees()));
                if (possible.cardinality() == 2) {
                    return true;
                }
                used++;
                useless = possible.cardinality() < before ? 0 : useless + 1;
            }
        }
        return false;
    }

    /** All sums of some of the numbers. */
    private static BitSet sums(List<Integer> degrees) {
        BitSet sums = new BitSet();
        sums.set(0);
        int total = 0;
        for (int degree : degrees) {
            for (int sum = total; sum >= 0; sum--) {
                if (sums.get(sum)) {
                    sums.set(sum + degree);
                }
            }
            total += degree;
        }
        return sums;
    }
}
