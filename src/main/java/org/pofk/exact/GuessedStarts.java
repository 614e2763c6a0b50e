package org.pofk.exact;

import java.util.Comparator;
import java.util.List;
import java.util.OptionalInt;
import java.util.stream.Stream;

/**
 * Starts from guesses at the roots of a polynomial among others: kept are as many as there are roots, those nearest
 * to one by the disc of n·|p/p′|. Approximate: what comes of them is proved afterwards. One evaluation a guess.
 */
final class GuessedStarts {
    private static final int PRECISION = 192;
    private static final int BITS_PER_DEGREE = 64;
    private static final double ROUNDING = 0x1p-45;

    private GuessedStarts() {
    }

    /** None when there are fewer useful guesses than roots. */
    static List<Start> of(BoundedHorner polynomial, List<Guess> guesses) {
        List<Start> nearest = guesses.stream().flatMap(guess -> start(polynomial, guess))
                .sorted(Comparator.comparingInt(Start::doubtExponent)).limit(polynomial.degree()).toList();
        return nearest.size() < polynomial.degree() ? List.of() : nearest;
    }

    private static Stream<Start> start(BoundedHorner polynomial, Guess guess) {
        double size = Math.hypot(guess.real(), guess.imaginary());
        if (!(size > Double.MIN_NORMAL && size < Double.MAX_VALUE)) {
            return Stream.empty();
        }
        Start start = Start.of(guess.real(), guess.imaginary(), size * ROUNDING);
        return radius(polynomial, start).stream().mapToObj(radius -> new Start(start.x(), start.y(), start.scale(),
                Math.max(start.doubtExponent(), radius)));
    }

    /** The disc of n·|p/p′|, with as many bits as show p′. */
    private static OptionalInt radius(BoundedHorner polynomial, Start start) {
        OptionalInt radius = OptionalInt.empty();
        for (int bits = PRECISION; radius.isEmpty() && bits <= BITS_PER_DEGREE * polynomial.degree(); bits *= 2) {
            radius = polynomial.at(start.x(), start.y(), start.scale(), bits).radiusExponent();
        }
        return radius;
    }
}
