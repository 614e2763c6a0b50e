package org.pofk.longrun;

import java.util.List;
import java.util.Optional;
import org.pofk.chain.Chain;
import org.pofk.chain.Structure;
import org.pofk.exact.Rational;
import org.pofk.transform.Transform;

/** What an output does as k grows: decided by exact division by cyclotomic polynomials, never by looking at moduli. */
public sealed interface LongRun {

    <R> R accept(Visitor<R> visitor);

    /** What the averages of p(0) … p(k) tend to, where they tend to anything. */
    Optional<Rational> meanValue();

    /** One method per variant. */
    interface Visitor<R> {
        R limit(Limit limit);

        R cycle(Cycle cycle);

        R none(None none);
    }

    /** p(k) tends to {@code value}. */
    record Limit(Rational value) implements LongRun {
        @Override
        public Optional<Rational> meanValue() {
            return Optional.of(value);
        }

        @Override
        public <R> R accept(Visitor<R> visitor) {
            return visitor.limit(this);
        }
    }

    /** p(k) approaches values that repeat; {@code values} in place j are for k ≡ j modulo the period (at least 2). */
    record Cycle(List<Rational> values) implements LongRun {
        public Cycle {
            values = List.copyOf(values);
        }

        public int period() {
            return values.size();
        }

        public Rational average() {
            return values.stream().reduce(Rational.ZERO, Rational::plus).dividedBy(Rational.of(values.size()));
        }

        @Override
        public Optional<Rational> meanValue() {
            return Optional.of(average());
        }

        @Override
        public <R> R accept(Visitor<R> visitor) {
            return visitor.cycle(this);
        }
    }

    /**
     * No limit and no cycle.
     *
     * @param average     what the averages of p(0) … p(k) tend to, where they tend to anything
     * @param explanation why, in one line: {@code grows like k * 1.2^k}
     */
    record None(Reason reason, Optional<Rational> average, String explanation) implements LongRun {
        @Override
        public Optional<Rational> meanValue() {
            return average;
        }

        @Override
        public <R> R accept(Visitor<R> visitor) {
            return visitor.none(this);
        }
    }

    /** Why there is neither; the last one is a cycle too long to list. */
    enum Reason { GROWS, RECURS_WITHOUT_PERIOD, CYCLE_TOO_LONG }

    /**
     * The long run of a chain's output: divided by the cyclotomic polynomials of the periods of its closed classes,
     * outside of which a chain has no pole on or outside the unit circle.
     */
    static LongRun of(Chain chain, Transform transform) {
        return chain.kind() == Chain.Kind.CHAIN
                ? LongRunByPoles.ofChain(Structure.of(chain), transform.y())
                : of(transform);
    }

    /** The long run of any output, from where its poles lie. */
    static LongRun of(Transform transform) {
        return LongRunByPoles.ofRecursion(transform.y(), transform.factors());
    }
}
