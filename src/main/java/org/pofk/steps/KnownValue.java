package org.pofk.steps;

import java.math.BigInteger;
import java.util.List;
import java.util.Optional;
import java.util.function.BinaryOperator;
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
    /** To so many bits a number is taken that is combined with one known by an interval. */
    private static final int BITS = 512;

    /** What stands behind a number. */
    public enum Word { EXACT, CERTIFIED }

    public static KnownValue of(Rational value) {
        return new KnownValue(Word.EXACT, Optional.of(value), Enclosed.of(value));
    }

    public static KnownValue within(Ball ball) {
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
        return combined(positive, Rational::dividedBy, Ball::dividedBy);
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
        return values.stream().map(each -> each.enclosure.enclose(bits))
                .reduce(Ball.of(Rational.ZERO, bits), Ball::plus).dividedBy(values.size());
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

    public KnownValue plus(KnownValue other) {
        return combined(other, Rational::plus, Ball::plus);
    }

    public KnownValue minus(KnownValue other) {
        return combined(other, Rational::minus, Ball::minus);
    }

    public KnownValue times(KnownValue other) {
        return combined(other, Rational::times, Ball::times);
    }

    /** This over a number that isn't zero; empty where {@value #BITS} bits don't show that it isn't. */
    public Optional<KnownValue> dividedBy(KnownValue other) {
        return other.exact.isEmpty() && other.enclosure.enclose(BITS).containsZero() ? Optional.empty()
                : Optional.of(over(other));
    }

    /** √ of a number that isn't negative. */
    public KnownValue sqrt() {
        return new KnownValue(word, Optional.empty(), word == Word.CERTIFIED ? bits -> enclosure.enclose(BITS).sqrt()
                : enclosure.map(Ball::sqrt));
    }

    private KnownValue combined(KnownValue other, BinaryOperator<Rational> exactly, BinaryOperator<Ball> enclosed) {
        if (word == Word.CERTIFIED || other.word == Word.CERTIFIED) {
            return within(enclosed.apply(enclosure.enclose(BITS), other.enclosure.enclose(BITS)));
        }
        return exact.isPresent() && other.exact.isPresent()
                ? of(exactly.apply(exact.get(), other.exact.get()))
                : of(Enclosed.combine(enclosure, other.enclosure, enclosed));
    }
}
