package org.pofk.claim;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalLong;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import org.pofk.exact.Rational;
import org.pofk.meaning.ExponentialSum;
import org.pofk.meaning.Precision;
import org.pofk.meaning.Quantity;
import org.pofk.text.RefusedException;

/** A formula for p(k), of one output or of every state, held against what is true. */
final class JudgedFormula {
    /** Steps at which the sum over all states is held against one. */
    private static final int SUMMED_STEPS = 16;

    private JudgedFormula() {
    }

    static Judgement of(Statement.PofK stated, Claim claim, Truth truth) {
        List<Judgement> parts = new ArrayList<>();
        List<ExponentialSum> sums = new ArrayList<>();
        for (Statement.PofK.Part part : stated.parts()) {
            try {
                ExponentialSum sum = ExponentialSum.of(part.is().parsed(), new Precision(claim.carried()));
                sums.add(sum);
                parts.add(JudgedPart.of(sum, part.is(), claim, truth.about(part.output())));
            } catch (RefusedException refused) {
                parts.add(unreadable(refused, part.is()));
            }
        }
        return parts.size() == 1 ? parts.get(0) : together(stated, parts, sums, truth, claim);
    }

    /** Whether it is right, at less cost than the judgement where it is not. */
    static boolean isRight(Statement.PofK stated, Claim claim, Truth truth) {
        for (Statement.PofK.Part part : stated.parts()) {
            try {
                ExponentialSum sum = ExponentialSum.of(part.is().parsed(), new Precision(claim.carried()));
                if (!JudgedPart.isRight(sum, claim, truth.about(part.output()))) {
                    return false;
                }
            } catch (RefusedException refused) {
                return false;
            }
        }
        return true;
    }

    private static Judgement unreadable(RefusedException refused, FormulaText text) {
        return new Judgement(Verdict.UNDECIDED, Optional.empty(), OptionalLong.empty(), List.of(),
                refused.faults().stream().map(fault -> fault.message()).toList(), text.text());
    }

    private static Judgement together(Statement.PofK stated, List<Judgement> parts, List<ExponentialSum> sums,
            Truth truth, Claim claim) {
        Verdict worst = parts.stream().map(Judgement::verdict).max(Verdict::compareTo).orElseThrow();
        List<String> remarks = new ArrayList<>();
        for (int i = 0; i < parts.size(); i++) {
            String name = stated.parts().get(i).output().name();
            parts.get(i).remarks().forEach(remark -> remarks.add(name + ": " + remark));
        }
        if (sums.size() == parts.size() && isWhole(stated, truth)) {
            notOne(sums, claim).ifPresent(k ->
                    remarks.add("the probabilities over all states don't sum to one at k = " + k));
        }
        return new Judgement(worst, parts.stream().flatMap(part -> part.difference().stream())
                .max((a, b) -> a.size().value().compareTo(b.size().value())), parts.stream()
                .flatMapToLong(part -> part.firstWrongStep().stream()).min(),
                parts.stream().flatMap(part -> part.numbers().stream()).toList(), remarks,
                IntStream.range(0, parts.size())
                        .mapToObj(i -> stated.parts().get(i).output().name() + ": " + parts.get(i).right())
                        .collect(Collectors.joining("; ")));
    }

    /** Whether the outputs add up to one for every chain of this kind: each state once. */
    private static boolean isWhole(Statement.PofK stated, Truth truth) {
        return truth.chain().kind() == org.pofk.chain.Chain.Kind.CHAIN
                && IntStream.range(0, truth.chain().size()).allMatch(state -> stated.parts().stream()
                .map(part -> part.output().coefficients().get(state)).reduce(Rational.ZERO, Rational::plus).isOne());
    }

    /** A step at which no numbers that the decimals stand for give one. */
    private static Optional<Long> notOne(List<ExponentialSum> sums, Claim claim) {
        for (long k = claim.steps().from(); k < claim.steps().from() + SUMMED_STEPS; k++) {
            long step = k;
            if (sums.stream().allMatch(sum -> sum.scope().includes(step))) {
                Quantity sum = Quantity.sum(sums.stream().map(each -> each.valueAt(step)).toList());
                if (!Spread.mayBe(sum, Quantity.ONE)) {
                    return Optional.of(k);
                }
            }
        }
        return Optional.empty();
    }
}
