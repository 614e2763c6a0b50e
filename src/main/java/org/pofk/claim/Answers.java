package org.pofk.claim;

import java.util.Optional;
import org.pofk.answer.FirstEntrance;
import org.pofk.chain.Chain;
import org.pofk.chain.Output;
import org.pofk.exact.Ball;
import org.pofk.exact.Rational;

/** What is right where a claim answers a question about a chain. */
final class Answers implements AnswerOf.Question<Answer> {
    private static final int BITS = 512;

    private final Truth truth;

    private Answers(Truth truth) {
        this.truth = truth;
    }

    static Answer of(AnswerOf asked, Truth truth) {
        return asked.asked(new Answers(truth));
    }

    @Override
    public Answer settling(AnswerOf.SettlingStep settling) {
        return truth.about(settling.output()).settledFrom(settling.distance());
    }

    @Override
    public Answer sum(AnswerOf.Sum sum) {
        return quotient(sum.output(), sum.first(), sum.last(), Rational.ONE);
    }

    @Override
    public Answer mean(AnswerOf.IntervalMean mean) {
        return quotient(mean.output(), mean.first(), mean.last(), Rational.of(mean.last() - mean.first() + 1));
    }

    /** Of p(first) + … + p(last) and a number: a difference of two sums from k = 0 on. */
    private Answer quotient(Output output, long first, long last, Rational divisor) {
        OutputTruth sums = truth.about(output).sums();
        if (last <= OutputTruth.EXACT) {
            Rational before = first == 0 ? Rational.ZERO : sums.valueAt(first - 1);
            return Answer.of(sums.valueAt(last).minus(before).dividedBy(divisor));
        }
        Ball before = first == 0 ? Ball.of(0, BITS) : FarValue.enclose(sums, first - 1, BITS);
        return Answer.within(FarValue.enclose(sums, last, BITS).minus(before).dividedBy(Ball.of(divisor, BITS)));
    }

    @Override
    public Answer conditional(AnswerOf.Conditional conditional) {
        long at = conditional.at();
        OutputTruth given = truth.about(conditional.given());
        OutputTruth joint = truth.about(conditional.joint());
        if (at > OutputTruth.EXACT) {
            Ball below = FarValue.enclose(given, at, BITS);
            return below.containsZero()
                    ? Answer.notDecided("the probability of what is given is too small for enclosures")
                    : Answer.within(FarValue.enclose(joint, at, BITS).dividedBy(below));
        }
        Rational below = given.valueAt(at);
        return below.isZero()
                ? Answer.none("", "at k = " + at + " what is given has probability zero: nothing is given by it")
                : Answer.of(joint.valueAt(at).dividedBy(below));
    }

    @Override
    public Answer passage(AnswerOf.MeanPassage passage) {
        if (truth.chain().kind() != Chain.Kind.CHAIN) {
            return Answer.none("", "only in a chain is a set entered");
        }
        FirstEntrance entrance = truth.entrance(passage.into());
        Rational entered = Rational.ZERO;
        Rational steps = Rational.ZERO;
        for (int state = 0; state < truth.chain().size(); state++) {
            Rational begun = begun(passage.from(), state).times(entrance.probabilities().get(state));
            entered = entered.plus(begun);
            steps = steps.plus(begun.times(entrance.means().get(state).orElse(Rational.ZERO)));
        }
        if (entered.isZero()) {
            return Answer.none("never", passage.set() + " is never entered");
        }
        return switch (passage.cases()) {
            case NEVER_AS_NOTHING -> Answer.of(steps);
            case ENTERED -> Answer.of(steps.dividedBy(entered));
            case ALL -> entered.isOne() ? Answer.of(steps) : Answer.none("infinite", passage.set()
                    + " is never entered with probability " + Rational.ONE.minus(entered) + ", so that the mean is"
                    + " infinite; given that it is entered, the mean is " + steps.dividedBy(entered));
        };
    }

    private Rational begun(Optional<AnswerOf.MeanPassage.Beginning> from, int state) {
        return from.map(begun -> begun.state() == state ? Rational.ONE : Rational.ZERO)
                .orElseGet(() -> truth.chain().start().get(state));
    }
}
