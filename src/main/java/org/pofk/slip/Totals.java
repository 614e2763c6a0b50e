package org.pofk.slip;

import java.util.List;
import java.util.Optional;
import org.pofk.chain.Chain;
import org.pofk.chain.Model;
import org.pofk.chain.Output;
import org.pofk.chain.Outputs;
import org.pofk.claim.Claim;
import org.pofk.claim.FormulaText;
import org.pofk.claim.Statement;
import org.pofk.claim.Truth;
import org.pofk.exact.Ball;
import org.pofk.exact.ComplexBall;
import org.pofk.exact.Decimals;
import org.pofk.exact.Rational;
import org.pofk.meaning.Precision;
import org.pofk.meaning.StepEvaluation;
import org.pofk.text.Span;

/** Probabilities stated for every state that can't add up to one, whatever their decimals leave open. Certified. */
final class Totals {
    private static final int BITS = 96;
    private static final int DIGITS = 6;
    private static final int STEPS = 10;
    /** Every number off by all that its digits leave open, and all to one side, is no rounding. */
    private static final Rational NOISE = Rational.TWO.pow(-48);

    private Totals() {
    }

    /** The first step at which the total isn't one; nothing where there is none, or not every state is spoken of. */
    static Optional<Candidate> of(Claim claim, String right, Truth truth) {
        if (truth.chain().kind() != Chain.Kind.CHAIN) {
            return Optional.empty();
        }
        Precision precision = new Precision(claim.carried());
        if (claim.statement() instanceof Statement.LongRunOf longRun
                && isEveryState(longRun.parts().stream().map(Statement.LongRunOf.Part::output).toList(), truth)
                && longRun.parts().stream().allMatch(part -> part.values().size() == 1)) {
            return total(longRun.parts().stream().map(part -> part.values().get(0)).toList(), precision, 0)
                    .map(total -> candidate(claim, "a total of " + total, right, truth));
        }
        if (claim.statement() instanceof Statement.Start start) {
            return total(start.components().stream().map(Statement.Component::is).toList(), precision, 0)
                    .map(total -> candidate(claim, "a total of " + total, right, truth));
        }
        if (claim.statement() instanceof Statement.Matrix matrix) {
            return ofMoves(claim, matrix, precision, right, truth);
        }
        if (claim.statement() instanceof Statement.PofK formula
                && isEveryState(formula.parts().stream().map(Statement.PofK.Part::output).toList(), truth)) {
            for (long k = claim.steps().from(); k < claim.steps().from() + STEPS; k++) {
                long step = k;
                Optional<String> total =
                        total(formula.parts().stream().map(Statement.PofK.Part::is).toList(), precision, k);
                if (total.isPresent()) {
                    return total.map(wrong ->
                            candidate(claim, "a total of " + wrong + " at k = " + step, right, truth));
                }
            }
        }
        return Optional.empty();
    }

    /** The first state from which the probabilities don't add up to one. */
    private static Optional<Candidate> ofMoves(Claim claim, Statement.Matrix matrix, Precision precision,
            String right, Truth truth) {
        List<String> states = truth.chain().states();
        List<List<FormulaText>> rows = matrix.rows();
        for (int from = 0; from < states.size() && from < rows.size(); from++) {
            int j = from;
            boolean byRow = matrix.convention() == Model.Convention.ROWS;
            if (!byRow && rows.stream().anyMatch(row -> row.size() <= j)) {
                return Optional.empty();
            }
            List<FormulaText> moves = byRow ? rows.get(j) : rows.stream().map(row -> row.get(j)).toList();
            Optional<String> total = total(moves, precision, 0);
            if (total.isPresent()) {
                return Optional.of(candidate(claim, place(moves), "from " + states.get(j) + " a total of "
                        + total.get(), right, truth));
            }
        }
        return Optional.empty();
    }

    private static Span place(List<FormulaText> texts) {
        return texts.get(0).parsed().span().to(texts.get(texts.size() - 1).parsed().span());
    }

    private static boolean isEveryState(List<Output> outputs, Truth truth) {
        List<List<Rational>> stated = outputs.stream().map(Output::coefficients).toList();
        List<List<Rational>> states = Outputs.states(truth.chain()).stream().map(Output::coefficients).toList();
        return stated.size() == states.size() && stated.containsAll(states);
    }

    /** The total where it can't be one. */
    private static Optional<String> total(List<FormulaText> texts, Precision precision, long k) {
        Ball total = Ball.of(0, BITS);
        for (FormulaText text : texts) {
            Optional<Ball> value = StepEvaluation.spread(text.parsed(), precision, k, BITS).map(ComplexBall::real);
            if (value.isEmpty()) {
                return Optional.empty();
            }
            total = total.plus(value.get());
        }
        Rational open = total.upper().minus(total.lower()).times(Rational.HALF);
        boolean mayBeOne = total.middle().minus(Rational.ONE).abs().compareTo(open.minus(NOISE)) < 0;
        return mayBeOne || total.middle().isOne() ? Optional.empty()
                : Optional.of(Decimals.of(total.middle(), DIGITS).text());
    }

    private static Candidate candidate(Claim claim, String found, String right, Truth truth) {
        return candidate(claim, OtherTruths.place(claim.statement()), found, right, truth);
    }

    private static Candidate candidate(Claim claim, Span place, String found, String right, Truth truth) {
        return new Candidate(SlipKind.NOT_SUMMING_TO_ONE, place, found, "a total of 1", () -> right, claim,
                () -> truth);
    }
}
