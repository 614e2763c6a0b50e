package org.pofk.report;

import java.math.BigDecimal;
import org.pofk.answer.Simulation.Sample;
import org.pofk.exact.Decimals;
import org.pofk.exact.Rational;

/** Numbers of a simulation: sampled ones to a few digits, the exact value to as many as asked for. */
final class SampledNumber {
    private static final int DIGITS = 5;

    private SampledNumber() {
    }

    static String text(double sampled) {
        return Decimals.of(Rational.of(new BigDecimal(sampled)), DIGITS).text();
    }

    /** Certified decimals of the true value. */
    static String value(Sample sample, int digits) {
        return sample.exact().containsZero() ? "0" : Decimals.of(sample.exact().middle(), digits).text();
    }
}
