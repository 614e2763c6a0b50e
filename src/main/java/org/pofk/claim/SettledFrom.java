package org.pofk.claim;

import java.util.Optional;
import org.pofk.answer.When;
import org.pofk.answer.When.Condition;
import org.pofk.answer.WhenModel;
import org.pofk.exact.Rational;
import org.pofk.longrun.LongRun;

/**
 * The least step from which an output stays within a distance of its long run, or of each value of its cycle, for
 * ever; a relative distance is a part of the largest of these values. Proved by {@link When}, class of steps by class.
 */
final class SettledFrom {
    private SettledFrom() {
    }

    static Answer of(OutputTruth truth, Claim.Within distance) {
        LongRun longRun = truth.longRun();
        WhenModel.Asked asked =
                new WhenModel.Asked(Condition.Kind.SETTLED, distance.amount(), distance.relative());
        When when = When.of(truth.chain(), truth.closedForm(), longRun, asked.of(longRun));
        return switch (when.reason()) {
            case FOR_EVER -> remarked(when.forEverFrom().orElseThrow(), when.first());
            case NOTHING_DEFINED -> throw new AssertionError("nothing is given, so p(k) is defined: " + truth);
            case NO_LONG_RUN -> longRun.accept(new Missing());
            case APPROACH_NOT_DECIDED, TOO_MANY_STEPS -> Answer.notDecided("how close it stays isn't decided");
            case NEVER, ONLY_FOR_A_WHILE, AGAIN_AND_AGAIN, ONLY_IN_SOME_CLASSES -> Answer.none("never",
                    when.condition().bound().isZero() ? "its long run is 0, and a part of that is 0, which it never"
                            + " stays at: a distance is to be named as a number"
                            : "it never stays that close to its long run");
        };
    }

    /** That it comes close before it stays close is worth a word: it is what is read off a table. */
    private static Answer remarked(long from, Optional<Long> first) {
        Answer answer = Answer.of(Rational.of(from));
        return first.filter(step -> step < from).map(step -> answer.remarking("it is that close for the first time at"
                + " k = " + step + ", and again further off until k = " + (from - 1))).orElse(answer);
    }

    /** Why there is no step without a limit or a cycle to compare with. */
    private static final class Missing implements LongRun.Visitor<Answer> {
        @Override
        public Answer limit(LongRun.Limit limit) {
            throw new AssertionError("a limit is a long run to settle at: " + limit);
        }

        @Override
        public Answer cycle(LongRun.Cycle cycle) {
            throw new AssertionError("a cycle is a long run to settle at: " + cycle);
        }

        @Override
        public Answer none(LongRun.None none) {
            return none.reason() == LongRun.Reason.CYCLE_TOO_LONG
                    ? Answer.notDecided("its cycle is too long to look at each of its values")
                    : Answer.none("never", "there is no long run to settle at: " + none.explanation());
        }
    }
}
