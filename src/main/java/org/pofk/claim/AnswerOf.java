package org.pofk.claim;

import java.util.Optional;
import java.util.Set;
import java.util.stream.IntStream;
import org.pofk.chain.Output;
import org.pofk.exact.Rational;

/** One number that answers a question about the chain: one variant for each kind of question. */
public sealed interface AnswerOf extends Statement {

    FormulaText is();

    /** The same question with another answer. */
    AnswerOf stating(FormulaText other);

    <R> R asked(Question<R> question);

    @Override
    default <R> R accept(Statement.Visitor<R> visitor) {
        return visitor.answer(this);
    }

    /** One method per variant. */
    interface Question<R> {
        R settling(SettlingStep settling);

        R passage(MeanPassage passage);

        R sum(Sum sum);

        R mean(IntervalMean mean);

        R conditional(Conditional conditional);
    }

    /** The least step from which an output stays within a distance of its long run for ever. */
    record SettlingStep(Output output, Claim.Within distance, FormulaText is) implements AnswerOf {
        @Override
        public AnswerOf stating(FormulaText other) {
            return new SettlingStep(output, distance, other);
        }

        @Override
        public <R> R asked(Question<R> question) {
            return question.settling(this);
        }
    }

    /**
     * The mean of T = min{k ≥ 0: x(k) in a set}.
     *
     * @param set   the set as the file names it
     * @param from  where it begins; empty for the model's start
     * @param cases over what it is taken
     */
    record MeanPassage(String set, Set<Integer> into, Optional<Beginning> from, Cases cases, FormulaText is)
            implements AnswerOf {
        /** A state by its place and its name. */
        public record Beginning(int state, String name) {
        }

        /** What a mean is taken over. */
        public enum Cases {
            /** All, so that there is none where the set may never be entered. */
            ALL,
            /** Those in which the set is entered. */
            ENTERED,
            /** All, those in which the set is never entered counted as nothing: Σ k P(T = k). A mistake. */
            NEVER_AS_NOTHING
        }

        public MeanPassage {
            into = Set.copyOf(into);
        }

        public MeanPassage over(Cases other) {
            return new MeanPassage(set, into, from, other, is);
        }

        public MeanPassage startingFrom(Beginning other) {
            return new MeanPassage(set, into, Optional.of(other), cases, is);
        }

        @Override
        public AnswerOf stating(FormulaText other) {
            return new MeanPassage(set, into, from, cases, other);
        }

        @Override
        public <R> R asked(Question<R> question) {
            return question.passage(this);
        }
    }

    /** p(first) + … + p(last). */
    record Sum(Output output, long first, long last, FormulaText is) implements AnswerOf {
        @Override
        public AnswerOf stating(FormulaText other) {
            return new Sum(output, first, last, other);
        }

        @Override
        public <R> R asked(Question<R> question) {
            return question.sum(this);
        }
    }

    /** The mean of p(first), …, p(last), both of them counted. */
    record IntervalMean(Output output, long first, long last, FormulaText is) implements AnswerOf {
        @Override
        public AnswerOf stating(FormulaText other) {
            return new IntervalMean(output, first, last, other);
        }

        @Override
        public <R> R asked(Question<R> question) {
            return question.mean(this);
        }
    }

    /** p(at) of an output, given that the chain is then in a set: Σ over the set of c x(at), over that of x(at). */
    record Conditional(Output output, Output given, long at, FormulaText is) implements AnswerOf {
        /** What the output comes to in the set, unconditionally. */
        public Output joint() {
            return new Output(output.name() + " and " + given.name(), IntStream
                    .range(0, given.coefficients().size()).mapToObj(i -> given.coefficients().get(i)
                            .times(output.coefficients().get(i).plus(output.constant()))).toList(),
                    Rational.ZERO, output.name() + " and " + given.name());
        }

        @Override
        public AnswerOf stating(FormulaText other) {
            return new Conditional(output, given, at, other);
        }

        @Override
        public <R> R asked(Question<R> question) {
            return question.conditional(this);
        }
    }
}
