package org.pofk.slip;

import java.math.BigInteger;
import java.util.Optional;
import org.pofk.exact.Ball;
import org.pofk.exact.Rational;

/**
 * The rational of smallest denominator between two: the whole part that both have, and so on with the inverses of what
 * is left (continued fractions). Exact; as many divisions as the answer has partial quotients, and no common divisors.
 */
final class SimplestFraction {
    private static final int SHORT_BITS = 64;

    private SimplestFraction() {
    }

    /** The simplest in a ball. */
    static Rational in(Ball ball) {
        return between(ball.lower(), ball.upper());
    }

    /** The simplest in a ball, where numerator and denominator have fewer than {@value #SHORT_BITS} bits together. */
    static Optional<Rational> shortIn(Ball ball) {
        return between(ball.lower(), ball.upper(), SHORT_BITS);
    }

    static Rational between(Rational low, Rational high) {
        return between(low, high, Integer.MAX_VALUE).orElseThrow();
    }

    private static Optional<Rational> between(Rational low, Rational high, int bits) {
        if (low.signum() <= 0 && high.signum() >= 0) {
            return Optional.of(Rational.ZERO);
        }
        return high.signum() < 0 ? positive(high.negate(), low.negate(), bits).map(Rational::negate)
                : positive(low, high, bits);
    }

    private static Optional<Rational> positive(Rational low, Rational high, int bits) {
        BigInteger[] below = {low.numerator(), low.denominator()};
        BigInteger[] above = {high.numerator(), high.denominator()};
        BigInteger[] last = {BigInteger.ZERO, BigInteger.ONE};
        BigInteger[] convergent = {BigInteger.ONE, BigInteger.ZERO};
        while (bitLength(convergent) < bits) {
            BigInteger[] whole = below[0].divideAndRemainder(below[1]);
            boolean ends = whole[1].signum() == 0;
            boolean parts = !ends && above[0].divide(above[1]).compareTo(whole[0]) > 0;
            BigInteger next = parts ? whole[0].add(BigInteger.ONE) : whole[0];
            BigInteger[] longer = {next.multiply(convergent[0]).add(last[0]), next.multiply(convergent[1]).add(last[1])};
            if (ends || parts) {
                return Optional.of(longer).filter(found -> bitLength(found) < bits)
                        .map(found -> new Rational(found[0], found[1]));
            }
            last = convergent;
            convergent = longer;
            BigInteger[] rest = {below[1], whole[1]};
            below = new BigInteger[] {above[1], above[0].subtract(next.multiply(above[1]))};
            above = rest;
        }
        return Optional.empty();
    }

    private static int bitLength(BigInteger[] fraction) {
        return fraction[0].bitLength() + fraction[1].bitLength();
    }
}
