package org.pofk.claim;

import org.pofk.exact.Ball;
import org.pofk.exact.BinaryPowering;
import org.pofk.exact.ComplexBall;
import org.pofk.exact.Rational;
import org.pofk.meaning.Quantity;

/**
 * p(k) far out, from the poles: Σ R_p · binomial(k, p) · λ^(k−p). Certified; log k products for each pole, so the
 * fraction with its k · log bits is never made.
 */
final class FarValue {
    /** A growing sequence is followed until it has this many bits. */
    private static final long LONGEST = 1_000_000;

    private FarValue() {
    }

    /** A ball around p(k) of a radius of some 2^−bits; for a sequence that has grown, relative to it. */
    static Ball enclose(OutputTruth truth, long k, int bits) {
        for (int scale = bits + 64; true; scale *= 2) {
            Ball sum = sum(truth, k, scale);
            if (sum.isWithin(bits)) {
                return sum;
            }
            if (scale > LONGEST) {
                throw new AssertionError("p(" + k + ") isn't enclosed with " + scale + " bits");
            }
        }
    }

    private static Ball sum(OutputTruth truth, long k, int scale) {
        Ball sum = Ball.of(k < truth.impulses().size() ? truth.impulses().get((int) k) : Rational.ZERO, scale);
        for (TruePole pole : truth.poles()) {
            for (int p = 0; p < pole.multiplicity() && p <= k; p++) {
                Ball term = term(pole, p, k, scale);
                sum = sum.plus(pole.isReal() ? term : term.times(2));
            }
        }
        return sum;
    }

    private static Ball term(TruePole pole, int power, long k, int scale) {
        Ball binomial = Ball.of(binomial(k, power), scale);
        return coefficient(pole.coefficients().get(power), scale)
                .times(power(coefficient(pole.value(), scale), k - power, scale)).roundedTo(scale).real().times(binomial)
                .roundedTo(scale);
    }

    private static ComplexBall coefficient(Quantity number, int scale) {
        return number.enclose(scale).roundedTo(scale);
    }

    private static ComplexBall power(ComplexBall base, long exponent, int scale) {
        return BinaryPowering.of(ComplexBall.of(Rational.ONE, scale), base, exponent, (a, b) -> a.times(b).roundedTo(scale));
    }

    private static Rational binomial(long k, int p) {
        Rational result = Rational.ONE;
        for (int i = 0; i < p; i++) {
            result = result.times(Rational.of(k - i)).dividedBy(Rational.of(i + 1));
        }
        return result;
    }
}
