package org.pofk.modes;

import java.math.BigInteger;
import java.util.Optional;
import org.pofk.exact.BinaryPowering;
import org.pofk.exact.Rational;

/**
 * By how much errors in the numbers of a mode C · binomial(k, p) · λ^(k−p) can show in p(k), for all k at once: upper
 * bounds of binomial(n+p, p) ρ^n (error of C), of n binomial(n+p, p) ρ^(n−1) (error of λ, to be multiplied by |C|) and
 * of n binomial(n+p, p) ρ^n (error of the angle, likewise), over n = k − p, where ρ bounds |λ| and its printed value.
 * Empty where there is no bound. Certified.
 *
 * <p>For ρ below 1, with Σ binomial(i+m−1, m−1) ρ^i = (1−ρ)^−m and its first n+1 terms at least ρ^n binomial(n+m, m):
 * binomial(n+p, p) ρ^n ≤ (1−ρ)^−p, and n binomial(n+p, p) = (p+1) binomial(n+p, p+1) gives (p+1) (1−ρ)^−(p+1).
 */
record Amplification(Optional<Rational> ofCoefficient, Optional<Rational> ofBase, Optional<Rational> ofAngle) {
    private static final int KEPT_BITS = 64;

    /** ρ below one, for every k. */
    static Amplification decaying(Rational rho, int power) {
        Rational inverse = Rational.ONE.minus(rho).inverse();
        Rational base = roundedUp(Rational.of(power + 1L).times(inverse.pow(power + 1)));
        return new Amplification(Optional.of(roundedUp(inverse.pow(power))), Optional.of(base), Optional.of(base));
    }

    /** |λ| = 1 exactly and power zero, for every k: only an error of the coefficient is bounded. */
    static Amplification steady() {
        return new Amplification(Optional.of(Rational.ONE), Optional.empty(), Optional.empty());
    }

    /** A mode that may grow, for every k: nothing is bounded. */
    static Amplification growing() {
        return new Amplification(Optional.empty(), Optional.empty(), Optional.empty());
    }

    /** Any ρ, for k = 0 … last. */
    static Amplification upTo(int last, Rational rho, int power) {
        Rational reach = powerRoundedUp(Rational.max(Rational.ONE, roundedUp(rho)), last);
        Rational coefficient = roundedUp(Rational.max(Rational.ONE, Expansion.binomial(last, power)).times(reach));
        Rational other = coefficient.times(Rational.of(last));
        return new Amplification(Optional.of(coefficient), Optional.of(other), Optional.of(other));
    }

    private static Rational powerRoundedUp(Rational base, int exponent) {
        return BinaryPowering.of(Rational.ONE, base, exponent, (a, b) -> roundedUp(a.times(b)));
    }

    /** A dyadic number at least as large, of 64 bits. */
    static Rational roundedUp(Rational positive) {
        int shift = KEPT_BITS - positive.numerator().bitLength() + positive.denominator().bitLength();
        Rational scale = Rational.TWO.pow(shift);
        return Rational.of(positive.times(scale).negate().floor().negate().max(BigInteger.ONE)).dividedBy(scale);
    }
}
