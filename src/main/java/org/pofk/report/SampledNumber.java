package org.pofk.report;

import java.math.BigDecimal;
import org.pofk.answer.Simulation.Sample;
import org.pofk.exact.Rational;

/** Numbers of a simulation: sampled ones to a few digits, the exact value to as many as asked for. */
final class SampledNumber {
    private static final int DIGITS = 5;

    private SampledNumber() {
    }

    static String text(double sampled) {
        return ValueText.of(shortest(sampled), DIGITS);
    }

    /** For programs. */
    static String number(double sampled) {
        return ValueText.number(shortest(sampled), DIGITS);
    }

    /** The shortest decimal that is this double: 0.9997 is not to be told from what it is short for. */
    private static Rational shortest(double sampled) {
        return Rational.of(BigDecimal.valueOf(sampled));
    }

    /** Certified decimals of the true value. */
    static String value(Sample sample, int digits) {
        return sample.exact().containsZero() ? "0" : ValueText.of(sample.exact().middle(), digits);
    }

    /** The true value for programs. */
    static String valueNumber(Sample sample, int digits) {
        return sample.exact().containsZero() ? "0" : ValueText.number(sample.exact().middle(), digits);
    }
}
