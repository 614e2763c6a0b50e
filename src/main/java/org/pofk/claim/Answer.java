package org.pofk.claim;

import java.util.List;
import java.util.Optional;
import org.pofk.exact.Ball;
import org.pofk.exact.Rational;

/**
 * What is right where a claim answers a question. Exact where both ends are the same; otherwise certified, between
 * them.
 *
 * @param standing whether there is a number, and whether it is known
 * @param low      zero where there is none
 * @param word     what stands in the place of a number, {@code infinite} or {@code never}; empty where nothing does
 * @param remarks  what a reviewer should know besides; first the reason where there is no number
 */
public record Answer(Standing standing, Rational low, Rational high, String word, List<String> remarks) {
    /** Whether there is a number. */
    public enum Standing { KNOWN, NONE, NOT_DECIDED }

    public Answer {
        remarks = List.copyOf(remarks);
    }

    static Answer of(Rational value) {
        return new Answer(Standing.KNOWN, value, value, "", List.of());
    }

    static Answer within(Ball ball) {
        return new Answer(Standing.KNOWN, ball.lower(), ball.upper(), "", List.of());
    }

    static Answer none(String word, String reason) {
        return new Answer(Standing.NONE, Rational.ZERO, Rational.ZERO, word, List.of(reason));
    }

    static Answer notDecided(String reason) {
        return new Answer(Standing.NOT_DECIDED, Rational.ZERO, Rational.ZERO, "", List.of(reason));
    }

    Answer remarking(String remark) {
        return new Answer(standing, low, high, word, List.of(remark));
    }

    /** The number, where it is known exactly. */
    public Optional<Rational> exact() {
        return Optional.of(low).filter(value -> standing == Standing.KNOWN && value.equals(high));
    }
}
