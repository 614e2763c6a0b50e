package org.pofk.exact;

import java.util.ArrayList;
import java.util.List;

/**
 * Primes by trial division, for numbers up to a few millions. In small models, opening a library for this would take
 * longer than all of the factoring.
 */
final class SmallPrimes {
    private SmallPrimes() {
    }

    static boolean isPrime(int number) {
        if (number < 2) {
            return false;
        }
        for (int divisor = 2; divisor * divisor <= number; divisor++) {
            if (number % divisor == 0) {
                return false;
            }
        }
        return true;
    }

    /** The least prime above the number. */
    static int after(int number) {
        int next = number + 1;
        while (!isPrime(next)) {
            next++;
        }
        return next;
    }

    /** The different primes that divide a positive number, ascending. */
    static List<Integer> dividing(int number) {
        List<Integer> primes = new ArrayList<>();
        int rest = number;
        for (int divisor = 2; divisor * divisor <= rest; divisor++) {
            if (rest % divisor == 0) {
                primes.add(divisor);
            }
            while (rest % divisor == 0) {
                rest /= divisor;
            }
        }
        if (rest > 1) {
            primes.add(rest);
        }
        return primes;
    }
}
