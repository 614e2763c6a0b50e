package org.pofk.claim;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalLong;
import java.util.SortedMap;
import java.util.TreeMap;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import java.util.stream.LongStream;
import java.util.stream.Stream;
import org.pofk.chain.Chain;
import org.pofk.exact.Rational;
import org.pofk.meaning.ExponentialSum;
import org.pofk.meaning.Precision;
import org.pofk.meaning.Quantity;
import org.pofk.meaning.SameSequence;
import org.pofk.text.RefusedException;

/** A formula for p(k), of one output or of every state, held against what is true. */
final class JudgedFormula {
    /** Steps at which the sum over all states is held against one. */
    private static final int SUMMED_STEPS = 16;
    /** Terms of a part up to which it is held against one at every step. */
    private static final int MOST_SUMMED = 16;

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
        if (worst != Verdict.EXACT && sums.size() == parts.size() && isWhole(stated, truth)) {
            notOne(sums, claim.steps()).ifPresent(k ->
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
        return truth.chain().kind() == Chain.Kind.CHAIN
                && IntStream.range(0, truth.chain().size()).allMatch(state -> stated.parts().stream()
                .map(part -> part.output().coefficients().get(state)).reduce(Rational.ZERO, Rational::plus).isOne());
    }

    /** A step at which no numbers that the decimals stand for give one; without decimals, of all steps. */
    private static OptionalLong notOne(List<ExponentialSum> sums, Claim.Steps steps) {
        OptionalLong early = LongStream.range(steps.from(), steps.from() + SUMMED_STEPS)
                .filter(k -> sums.stream().allMatch(sum -> sum.scope().includes(k)))
                .filter(k -> !Spread.mayBe(Quantity.sum(sums.stream().map(each -> each.valueAt(k)).toList()),
                        Quantity.ONE)).findFirst();
        return early.isPresent() || !sums.stream().allMatch(JudgedFormula::isExact) ? early
                : SameSequence.decide(total(sums), k -> Rational.ONE, 1, steps.from(), steps.to()).differsAt();
    }

    /** Whether it says something of every step, in numbers without decimals. */
    private static boolean isExact(ExponentialSum sum) {
        return sum.scope().equals(ExponentialSum.Scope.ALL) && sum.terms().size() <= MOST_SUMMED
                && Stream.concat(sum.impulses().values().stream(), sum.terms().stream().flatMap(term -> Stream.of(
                        term.coefficient(), term.base(), term.angle(), term.phase())))
                .allMatch(number -> number.decimals().isEmpty());
    }

    private static ExponentialSum total(List<ExponentialSum> sums) {
        SortedMap<Long, Quantity> impulses = new TreeMap<>();
        sums.forEach(sum -> sum.impulses().forEach((k, value) -> impulses.merge(k, value, Quantity::plus)));
        return new ExponentialSum(sums.stream().flatMap(sum -> sum.terms().stream()).toList(), impulses,
                ExponentialSum.Scope.ALL);
    }
}
