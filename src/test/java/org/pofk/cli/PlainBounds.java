package org.pofk.cli;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import org.pofk.exact.Rational;

/** Bounds on the state of a chain of probabilities far out, by squaring its matrix in whole multiples of 2^−256. */
final class PlainBounds {
    private static final int BITS = 256;
    private static final int FEW = 5_000;

    private final List<List<BigInteger>> low;
    private final List<List<BigInteger>> high;

    private PlainBounds(List<List<BigInteger>> low, List<List<BigInteger>> high) {
        this.low = low;
        this.high = high;
    }

    /** The least and the largest that weights, of any sign, can read off x(k). */
    static List<Rational> of(PlainChain chain, long k, List<Rational> weights) {
        PlainBounds power = new PlainBounds(floors(chain.rows()), ceilings(chain.rows()));
        PlainBounds state = new PlainBounds(floors(columnOf(chain.start())), ceilings(columnOf(chain.start())));
        if (k <= FEW) {
            for (long step = 0; step < k; step++) {
                state = power.times(state);
            }
        } else {
            for (long rest = k; rest > 0; rest >>= 1) {
                state = (rest & 1) == 1 ? power.times(state) : state;
                power = power.times(power);
            }
        }
        return List.of(state.read(weights, -1), state.read(weights, 1));
    }

    private Rational read(List<Rational> weights, int side) {
        Rational sum = Rational.ZERO;
        for (int i = 0; i < weights.size(); i++) {
            List<List<BigInteger>> taken = weights.get(i).signum() * side > 0 ? high : low;
            sum = sum.plus(weights.get(i).times(new Rational(taken.get(i).get(0), BigInteger.ONE.shiftLeft(BITS))));
        }
        return sum;
    }

    /** Entries are never negative, so lower bounds multiply to lower ones. */
    private PlainBounds times(PlainBounds other) {
        return new PlainBounds(product(low, other.low, BigInteger.ZERO),
                product(high, other.high, BigInteger.ONE.shiftLeft(BITS).subtract(BigInteger.ONE)));
    }

    private static List<List<BigInteger>> product(List<List<BigInteger>> a, List<List<BigInteger>> b, BigInteger up) {
        List<List<BigInteger>> product = new ArrayList<>();
        for (List<BigInteger> row : a) {
            List<BigInteger> entries = new ArrayList<>();
            for (int column = 0; column < b.get(0).size(); column++) {
                BigInteger sum = BigInteger.ZERO;
                for (int i = 0; i < row.size(); i++) {
                    if (row.get(i).signum() != 0 && b.get(i).get(column).signum() != 0) {
                        sum = sum.add(row.get(i).multiply(b.get(i).get(column)));
                    }
                }
                entries.add(sum.add(up).shiftRight(BITS));
            }
            product.add(entries);
        }
        return product;
    }

    private static List<List<Rational>> columnOf(List<Rational> vector) {
        return vector.stream().map(List::of).toList();
    }

    private static List<List<BigInteger>> floors(List<List<Rational>> rows) {
        return rows.stream().map(row -> row.stream().map(value -> scaled(value).floor()).toList()).toList();
    }

    private static List<List<BigInteger>> ceilings(List<List<Rational>> rows) {
        return rows.stream().map(row -> row.stream().map(value -> scaled(value).negate().floor().negate()).toList())
                .toList();
    }

    private static Rational scaled(Rational value) {
        return value.times(Rational.of(BigInteger.ONE.shiftLeft(BITS)));
    }
}
