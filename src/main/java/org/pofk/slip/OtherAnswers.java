package org.pofk.slip;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.IntStream;
import org.pofk.chain.Chain;
import org.pofk.claim.AnswerOf;
import org.pofk.claim.AnswerOf.MeanPassage;
import org.pofk.claim.AnswerOf.MeanPassage.Beginning;
import org.pofk.claim.AnswerOf.MeanPassage.Cases;
import org.pofk.claim.OutputTruth;
import org.pofk.claim.Statement;
import org.pofk.claim.Truth;

/**
 * Questions that a number may answer instead of the one it is claimed to answer: the joint probability, the value at
 * the end, a term less, another state to begin in.
 */
final class OtherAnswers implements AnswerOf.Question<List<OtherAnswers.Other>> {
    private final Truth truth;
    private final Chain chain;

    /**
     * A question that was answered by mistake.
     *
     * @param found what it asks
     * @param right what is to be asked
     */
    record Other(SlipKind kind, String found, String right, Statement statement) {
    }

    private OtherAnswers(Truth truth) {
        this.truth = truth;
        this.chain = truth.chain();
    }

    /** All of them; whether the number answers one is to be judged. */
    static List<Other> of(AnswerOf asked, Truth truth) {
        return asked.asked(new OtherAnswers(truth));
    }

    /** A step too early or too late is a number that is wrong by one. */
    @Override
    public List<Other> settling(AnswerOf.SettlingStep settling) {
        return List.of();
    }

    @Override
    public List<Other> passage(MeanPassage passage) {
        List<Other> others = new ArrayList<>();
        if (passage.cases() == Cases.ALL) {
            others.add(never("the mean given that it is entered", "no mean: it may never be entered",
                    passage.over(Cases.ENTERED)));
        }
        others.add(never("the mean with nothing for what never happens", passage.cases() == Cases.ALL
                ? "no mean: it may never be entered" : "the mean given that it is entered",
                passage.over(Cases.NEVER_AS_NOTHING)));
        // another start of the model is another chain
        passage.from().ifPresent(own -> others.addAll(elsewhere(passage, own)));
        return others;
    }

    private List<Other> elsewhere(MeanPassage passage, Beginning own) {
        return IntStream.range(0, chain.size()).filter(state -> state != own.state()).mapToObj(state ->
                new Other(SlipKind.START_MISREAD, "from " + chain.states().get(state), "from " + own.name(),
                        passage.startingFrom(new Beginning(state, chain.states().get(state))))).toList();
    }

    private static Other never(String found, String right, Statement statement) {
        return new Other(SlipKind.NEVER_IS_AVERAGED, found, right, statement);
    }

    @Override
    public List<Other> sum(AnswerOf.Sum sum) {
        List<Other> others = new ArrayList<>();
        long first = sum.first();
        long last = sum.last();
        if (first < last) {
            others.add(sum(sum, SlipKind.TERM_MISSING, first, last - 1));
            others.add(sum(sum, SlipKind.TERM_MISSING, first + 1, last));
        }
        others.add(sum(sum, SlipKind.INDEX_SHIFTED, first, last + 1));
        others.add(sum(sum, SlipKind.INDEX_SHIFTED, first + 1, last + 1));
        // where the term before is zero, the last one is merely missing
        if (first > 0 && first <= OutputTruth.EXACT && !truth.about(sum.output()).valueAt(first - 1).isZero()) {
            others.add(sum(sum, SlipKind.INDEX_SHIFTED, first - 1, last));
            others.add(sum(sum, SlipKind.INDEX_SHIFTED, first - 1, last - 1));
        }
        return others;
    }

    private static Other sum(AnswerOf.Sum sum, SlipKind kind, long first, long last) {
        return new Other(kind, steps(first, last), steps(sum.first(), sum.last()),
                new AnswerOf.Sum(sum.output(), first, last, sum.is()));
    }

    private static String steps(long first, long last) {
        return "k = " + first + " to " + last;
    }

    @Override
    public List<Other> mean(AnswerOf.IntervalMean mean) {
        List<Other> others = new ArrayList<>();
        String right = "the mean of " + steps(mean.first(), mean.last());
        others.add(new Other(SlipKind.END_VALUE_FOR_THE_MEAN, "p(" + mean.last() + ")", right,
                new Statement.Value(mean.output(), mean.last(), mean.is())));
        List<long[]> shifted = new ArrayList<>(List.of(new long[] {1, 0}, new long[] {0, 1}, new long[] {1, 1},
                new long[] {0, -1}, new long[] {-1, 0}, new long[] {-1, -1}));
        shifted.removeIf(by -> mean.first() + by[0] < 0 || mean.first() + by[0] > mean.last() + by[1]);
        shifted.forEach(by -> others.add(new Other(SlipKind.INDEX_SHIFTED, "the mean of "
                + steps(mean.first() + by[0], mean.last() + by[1]), right,
                new AnswerOf.IntervalMean(mean.output(), mean.first() + by[0], mean.last() + by[1], mean.is()))));
        return others;
    }

    @Override
    public List<Other> conditional(AnswerOf.Conditional asked) {
        List<Other> others = new ArrayList<>();
        others.add(new Other(SlipKind.JOINT_FOR_CONDITIONAL, "the probability of both",
                "the probability given " + asked.given().name(),
                new Statement.Value(asked.joint(), asked.at(), asked.is())));
        for (long at : new long[] {asked.at() - 1, asked.at() + 1}) {
            if (at >= 0) {
                others.add(new Other(SlipKind.INDEX_SHIFTED, "at k = " + at, "at k = " + asked.at(),
                        new AnswerOf.Conditional(asked.output(), asked.given(), at, asked.is())));
            }
        }
        return others;
    }
}
