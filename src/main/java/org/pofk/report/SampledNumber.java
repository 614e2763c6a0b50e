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
        return ValueText.of(Rational.of(new BigDecimal(sampled)), DIGITS);
    }

    /** For programs. */
    static String number(double sampled) {
        return ValueText.number(Rational.of(new BigDecimal(sampled)), DIGITS);
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
