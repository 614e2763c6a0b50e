package org.pofk.steps;

import java.math.BigInteger;
import java.util.List;
import java.util.Optional;
import org.pofk.exact.Ball;
import org.pofk.exact.Enclosed;
import org.pofk.exact.Rational;

/**
 * A number of an answer with what it is worth.
 *
 * @param word      whether the number itself is known or an interval that holds it
 * @param exact     the number, where it is known and short enough to be looked at
 * @param enclosure as close as asked for an exact number; for a certified one the interval there is
 */
public record KnownValue(Word word, Optional<Rational> exact, Enclosed enclosure) {

    /** What stands behind a number. */
    public enum Word { EXACT, CERTIFIED }

    private static final int BITS = 256;

    public static KnownValue of(Rational value) {
        return new KnownValue(Word.EXACT, Optional.of(value), Enclosed.of(value));
    }

    static KnownValue within(Ball ball) {
        return new KnownValue(Word.CERTIFIED, Optional.empty(), bits -> ball);
    }

    /** A number that is known as closely as asked. */
    public static KnownValue of(Enclosed value) {
        return new KnownValue(Word.EXACT, Optional.empty(), value);
    }

    /** Whether it is above zero for certain; one that is smaller than 2^−{@value #BITS} is not. */
    public boolean isPositive() {
        return exact.map(value -> value.signum() > 0).orElseGet(() -> enclosure.enclose(BITS).isPositive());
    }

    /** This over a number that is above zero for certain. */
    public KnownValue over(KnownValue positive) {
        if (exact.isPresent() && positive.exact.isPresent()) {
            return of(exact.get().dividedBy(positive.exact.get()));
        }
        return word == Word.EXACT && positive.word == Word.EXACT ? of(enclosure.dividedBy(positive.enclosure))
                : within(enclosure.enclose(BITS).dividedBy(positive.enclosure.enclose(BITS)));
    }

    /** The mean of some, at least one. */
    public static KnownValue mean(List<KnownValue> values) {
        if (values.stream().allMatch(each -> each.exact.isPresent())) {
            return of(values.stream().map(each -> each.exact.get()).reduce(Rational.ZERO, Rational::plus)
                    .dividedBy(Rational.of(values.size())));
        }
        return values.stream().allMatch(each -> each.word == Word.EXACT)
                ? of(Enclosed.raising(bits -> mean(values, Math.max(bits, 0)))) : within(mean(values, BITS));
    }

    private static Ball mean(List<KnownValue> values, int bits) {
        return values.stream().map(each -> each.enclosure.enclose(bits)).reduce(Ball.of(Rational.ZERO, bits), Ball::plus)
                .dividedBy(values.size());
    }

    /** Positive where this is the larger one, zero where they can't be told apart. */
    public int compareMiddle(KnownValue other) {
        return exact.isPresent() && other.exact.isPresent() ? exact.get().compareTo(other.exact.get())
                : enclosure.enclose(BITS).middle().compareTo(other.enclosure.enclose(BITS).middle());
    }

    /** This, or some number near to it that may be meant where others are known within their enclosures only. */
    public KnownValue among(List<KnownValue> others) {
        if (others.stream().allMatch(each -> each.word == Word.EXACT)) {
            return this;
        }
        BigInteger widest = others.stream().map(each -> each.enclosure.enclose(BITS).roundedTo(BITS).radius())
                .reduce(BigInteger.ZERO, BigInteger::max);
        return within(new Ball(enclosure.enclose(BITS).roundedTo(BITS).center(), widest, BITS));
    }
}
