package org.pofk.steps;

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

    static KnownValue of(Rational value) {
        return new KnownValue(Word.EXACT, Optional.of(value), Enclosed.of(value));
    }

    static KnownValue within(Ball ball) {
        return new KnownValue(Word.CERTIFIED, Optional.empty(), bits -> ball);
    }
}
