package org.pofk.answer;

import java.util.Optional;
import java.util.stream.Stream;
import org.pofk.exact.Ball;
import org.pofk.exact.Rational;

/** The numbers from low to high, both included; open-ended where one is missing. Exact. */
public record Band(Optional<Rational> low, Optional<Rational> high) {

    /** How numbers lie to a band. */
    public enum Relation {
        INSIDE, OUTSIDE, EITHER;

        /** Inside both, outside one of them, or that isn't told. */
        Relation and(Relation other) {
            return this == OUTSIDE || other == OUTSIDE ? OUTSIDE : this == INSIDE ? other : this;
        }
    }

    public boolean contains(Rational value) {
        return low.stream().allMatch(bound -> bound.compareTo(value) <= 0)
                && high.stream().allMatch(bound -> value.compareTo(bound) <= 0);
    }

    /** All numbers of a ball, none of them, or that isn't told. */
    public Relation of(Ball ball) {
        Rational lower = ball.lower();
        Rational upper = ball.upper();
        if (low.stream().anyMatch(bound -> upper.compareTo(bound) < 0)
                || high.stream().anyMatch(bound -> bound.compareTo(lower) < 0)) {
            return Relation.OUTSIDE;
        }
        return contains(lower) && contains(upper) ? Relation.INSIDE : Relation.EITHER;
    }

    /** All numbers strictly between two, none of them, or neither is the case. */
    public Relation ofBetween(Rational lower, Rational upper) {
        if (low.stream().anyMatch(bound -> upper.compareTo(bound) <= 0)
                || high.stream().anyMatch(bound -> bound.compareTo(lower) <= 0)) {
            return Relation.OUTSIDE;
        }
        return contains(lower) && contains(upper) ? Relation.INSIDE : Relation.EITHER;
    }

    /** How far zero is from the nearest end; zero when it is one. */
    Rational distanceFromZero() {
        return Stream.concat(low.stream(), high.stream()).map(Rational::abs).min(Rational::compareTo).orElseThrow();
    }

    /** The band moved by −by: what value − by has to lie in for value to lie in this. */
    Band minus(Rational by) {
        return new Band(low.map(bound -> bound.minus(by)), high.map(bound -> bound.minus(by)));
    }
}
