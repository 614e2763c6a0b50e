package org.pofk.slip;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.pofk.claim.AuthorText;
import org.pofk.claim.AuthorText.Replacement;
import org.pofk.claim.FormulaText;
import org.pofk.exact.Ball;
import org.pofk.exact.ComplexBall;
import org.pofk.exact.NotSeparatedException;
import org.pofk.formula.ParsedFormula;
import org.pofk.meaning.StepEvaluation;

/**
 * The number that a place of a formula should hold, from the formula's value at one point, all other numbers taken as
 * they stand: the formula is taken to be (a t + b)/(c t + 1) in t, the number less what stands there, and is evaluated
 * at t = 0, 1, 2. A guess: whether it is right is judged.
 */
final class SolvedNumbers {
    private static final int BITS = 256;
    private static final int POINTS = 3;

    private SolvedNumbers() {
    }

    /** One guess for each of the first points, the place's own value added by {@code value}. */
    static List<TrueNumber> of(AuthorText text, ParsedFormula node, Screen screen) {
        List<TrueNumber> guesses = new ArrayList<>();
        List<Optional<FormulaText>> shifted = new ArrayList<>();
        for (String other : List.of("", "+1", "+2")) {
            shifted.add(with(text, node, other));
        }
        Optional<Ball> own = value(node);
        if (own.isEmpty() || shifted.stream().anyMatch(Optional::isEmpty)) {
            return guesses;
        }
        for (int i = 0; i < Math.min(POINTS, screen.probe().points().size()); i++) {
            int point = i;
            List<Optional<Ball>> values = shifted.stream()
                    .map(each -> screen.probe().faceValue(each.orElseThrow(), point, BITS)).toList();
            if (values.stream().allMatch(Optional::isPresent)) {
                step(values.stream().map(Optional::get).toList(), Ball.of(screen.probe().right().get(i), BITS))
                        .map(own.get()::plus).map(SolvedNumbers::number).ifPresent(guesses::add);
            }
        }
        return guesses;
    }

    private static Optional<FormulaText> with(AuthorText text, ParsedFormula node, String more) {
        String changed = AuthorNotation.of(text.notation()).enclosed(text.text(node) + more);
        return text.with(List.of(new Replacement(AuthorText.start(node), AuthorText.end(node), changed)));
    }

    /** The value that stands there. */
    private static Optional<Ball> value(ParsedFormula node) {
        return StepEvaluation.atFaceValue(node, 0, BITS).map(ComplexBall::real);
    }

    /** t; nothing where the number doesn't matter at the point. */
    private static Optional<Ball> step(List<Ball> values, Ball right) {
        Ball f0 = values.get(0);
        Ball f1 = values.get(1);
        Ball f2 = values.get(2);
        try {
            Ball c = f1.times(2).minus(f0).minus(f2).dividedBy(f2.minus(f1).times(2));
            Ball a = f1.times(c.plus(Ball.of(1, BITS))).minus(f0);
            return Optional.of(f0.minus(right).dividedBy(c.times(right).minus(a)));
        } catch (NotSeparatedException none) {
            return Optional.empty();
        }
    }

    private static TrueNumber number(Ball ball) {
        return SimplestFraction.shortIn(ball).map(TrueNumber::of).orElseGet(() ->
                new TrueNumber(Optional.empty(), bits -> Ball.of(ball.middle(), Math.max(bits, 0))));
    }
}
