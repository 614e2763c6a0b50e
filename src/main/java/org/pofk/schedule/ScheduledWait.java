package org.pofk.schedule;

import java.util.Optional;
import org.pofk.exact.Rational;
import org.pofk.steps.KnownValue;

/**
 * Whether something ever happens, and after how many steps. Exact, or certified where its numbers say so.
 *
 * @param ever        decided by which moves there are, whatever their numbers
 * @param probability that it happens
 * @param mean        of the step, given that it happens; empty when it never does
 * @param variance    likewise
 */
public record ScheduledWait(Ever ever, KnownValue probability, Optional<KnownValue> mean,
        Optional<KnownValue> variance) {

    /** Whether it happens. */
    public enum Ever { NEVER, PERHAPS, CERTAIN }

    static ScheduledWait never() {
        return new ScheduledWait(Ever.NEVER, KnownValue.of(Rational.ZERO), Optional.empty(), Optional.empty());
    }

    /** From the sums Σ f(k), Σ k f(k) and Σ k² f(k) over the probabilities f(k) of the steps. */
    static ScheduledWait of(Ever ever, KnownValue sum, KnownValue first, KnownValue second) {
        if (ever == Ever.NEVER) {
            return never();
        }
        KnownValue probability = ever == Ever.CERTAIN ? KnownValue.of(Rational.ONE) : sum;
        Optional<KnownValue> mean = first.dividedBy(probability);
        Optional<KnownValue> square = second.dividedBy(probability);
        return new ScheduledWait(ever, probability, mean, mean.flatMap(each ->
                square.map(of -> of.minus(each.times(each)))));
    }

    /** True when each number is known itself and not by an interval. */
    public boolean isExact() {
        return probability.word() == KnownValue.Word.EXACT
                && mean.stream().allMatch(each -> each.word() == KnownValue.Word.EXACT);
    }
}
