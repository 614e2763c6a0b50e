package org.pofk.answer;

import java.util.Optional;
import org.pofk.exact.Polynomial;
import org.pofk.exact.Rational;
import org.pofk.transform.TransferFunction;

/**
 * Whether and when something happens that happens once at most, from the transform Y(z) = Σ f(k) z^(−k) of its law:
 * Σ f = Y(1), Σ k f = −Y′(1), Σ k² f = Y″(1) + Y′(1). Exact; f is summable, so Y has no pole at one.
 *
 * @param probability that it happens at all
 * @param mean        of the step, given that it happens; empty when it never does
 * @param variance    likewise
 */
public record PassageMoments(Rational probability, Optional<Rational> mean, Optional<Rational> variance) {

    static PassageMoments of(TransferFunction<Rational> law) {
        Polynomial<Rational> n = law.numerator();
        Polynomial<Rational> d = law.denominator();
        Rational n0 = n.valueAt(Rational.ONE);
        Rational d0 = d.valueAt(Rational.ONE);
        Rational probability = n0.dividedBy(d0);
        if (probability.isZero()) {
            return new PassageMoments(probability, Optional.empty(), Optional.empty());
        }
        // The Taylor coefficients of N/D at one follow from Y D = N, one after the other.
        Rational n1 = n.derivative().valueAt(Rational.ONE);
        Rational d1 = d.derivative().valueAt(Rational.ONE);
        Rational first = n1.minus(probability.times(d1)).dividedBy(d0);
        Rational second = n.derivative().derivative().valueAt(Rational.ONE)
                .minus(first.times(d1).times(Rational.TWO))
                .minus(probability.times(d.derivative().derivative().valueAt(Rational.ONE))).dividedBy(d0);
        Rational mean = first.negate().dividedBy(probability);
        Rational square = second.plus(first).dividedBy(probability);
        return new PassageMoments(probability, Optional.of(mean), Optional.of(square.minus(mean.times(mean))));
    }

    /** True when it happens with probability one. */
    public boolean isCertain() {
        return probability.isOne();
    }
}
