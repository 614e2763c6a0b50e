package org.pofk.transform;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import org.pofk.exact.Rational;

/**
 * Different rational numbers, each held once, so that all of them are taken modulo a prime with a single inversion
 * (Montgomery 1987, simultaneous inversion, from memory). Exact. Mutable while it is filled.
 */
final class RationalTable {
    private final Map<Rational, Integer> places = new HashMap<>();
    private final List<Rational> values = new ArrayList<>();

    /** The place of a value, a new one when it wasn't there. */
    int placeOf(Rational value) {
        return places.computeIfAbsent(value, unseen -> {
            values.add(unseen);
            return values.size() - 1;
        });
    }

    /** True when the prime divides no denominator. */
    boolean isDefinedModulo(PrimeField field) {
        return values.stream().allMatch(value -> field.of(value.denominator()) != 0);
    }

    /** Every value modulo the prime, in place order; the prime divides no denominator. */
    long[] modulo(PrimeField field) {
        int size = values.size();
        long[] denominators = new long[size];
        long[] products = new long[size + 1];
        products[0] = 1;
        for (int i = 0; i < size; i++) {
            denominators[i] = field.of(values.get(i).denominator());
            products[i + 1] = field.multiply(products[i], denominators[i]);
        }
        long inverse = field.inverse(products[size]);
        long[] residues = new long[size];
        for (int i = size - 1; i >= 0; i--) {
            BigInteger numerator = values.get(i).numerator();
            residues[i] = field.multiply(field.of(numerator), field.multiply(inverse, products[i]));
            inverse = field.multiply(inverse, denominators[i]);
        }
        return residues;
    }
}
