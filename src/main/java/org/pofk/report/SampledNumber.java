package org.pofk.report;

import java.math.BigDecimal;
import org.pofk.answer.Simulation.Method;
import org.pofk.answer.Simulation.Sample;
import org.pofk.exact.Decimals;
import org.pofk.exact.Rational;

/**
 * Numbers of a simulation: sampled ones to a few digits, the exact value to as many as asked for and its enclosure
 * decides. Only a probability is told by what it lacks to one.
 */
final class SampledNumber {
    private static final int DIGITS = 5;

    private SampledNumber() {
    }

    static String text(double sampled) {
        return ValueText.of(Rational.of(new BigDecimal(sampled)), DIGITS);
    }

    /** As it is read where samples of this method stand. */
    static String text(double sampled, Method method) {
        return method == Method.CLOPPER_PEARSON ? text(sampled)
                : Decimals.of(Rational.of(new BigDecimal(sampled)), DIGITS).text();
    }

    /** For programs. */
    static String number(double sampled) {
        return ValueText.number(Rational.of(new BigDecimal(sampled)), DIGITS);
    }

    /** Certified decimals of the true value. */
    static String value(Sample sample, Method method, int digits) {
        return DecidedDigits.of(sample.exact(), digits, method == Method.CLOPPER_PEARSON ? ValueText::of
                : (value, most) -> Decimals.of(value, most).text());
    }

    /** The true value for programs. */
    static String valueNumber(Sample sample, int digits) {
        return DecidedDigits.of(sample.exact(), digits, ValueText::number);
    }
}
