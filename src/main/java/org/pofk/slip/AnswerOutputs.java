package org.pofk.slip;

import java.util.List;
import java.util.function.UnaryOperator;
import org.pofk.chain.Output;
import org.pofk.claim.AnswerOf;

/** The outputs that a question is about. A conditional value is about two, and a passage about none. */
final class AnswerOutputs {
    private AnswerOutputs() {
    }

    /** Which they are. */
    static final class Named implements AnswerOf.Question<List<Output>> {
        @Override
        public List<Output> settling(AnswerOf.SettlingStep settling) {
            return List.of(settling.output());
        }

        @Override
        public List<Output> passage(AnswerOf.MeanPassage passage) {
            return List.of();
        }

        @Override
        public List<Output> sum(AnswerOf.Sum sum) {
            return List.of(sum.output());
        }

        @Override
        public List<Output> mean(AnswerOf.IntervalMean mean) {
            return List.of(mean.output());
        }

        @Override
        public List<Output> conditional(AnswerOf.Conditional conditional) {
            return List.of(conditional.output(), conditional.given());
        }
    }

    /** The same question about others. */
    record Changed(UnaryOperator<Output> change) implements AnswerOf.Question<AnswerOf> {
        @Override
        public AnswerOf settling(AnswerOf.SettlingStep settling) {
            return new AnswerOf.SettlingStep(change.apply(settling.output()), settling.distance(), settling.is());
        }

        @Override
        public AnswerOf passage(AnswerOf.MeanPassage passage) {
            return passage;
        }

        @Override
        public AnswerOf sum(AnswerOf.Sum sum) {
            return new AnswerOf.Sum(change.apply(sum.output()), sum.first(), sum.last(), sum.is());
        }

        @Override
        public AnswerOf mean(AnswerOf.IntervalMean mean) {
            return new AnswerOf.IntervalMean(change.apply(mean.output()), mean.first(), mean.last(), mean.is());
        }

        @Override
        public AnswerOf conditional(AnswerOf.Conditional conditional) {
            return new AnswerOf.Conditional(change.apply(conditional.output()), change.apply(conditional.given()),
                    conditional.at(), conditional.is());
        }
    }
}
