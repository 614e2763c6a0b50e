package org.pofk.slip;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.function.Supplier;
import java.util.stream.IntStream;
import org.pofk.chain.Chain;
import org.pofk.chain.Output;
import org.pofk.chain.Outputs;
import org.pofk.chain.SparseMatrix;
import org.pofk.claim.AnswerOf;
import org.pofk.claim.Claim;
import org.pofk.claim.Statement;
import org.pofk.claim.Truth;
import org.pofk.exact.Rational;
import org.pofk.longrun.LongRun;
import org.pofk.text.Span;

/** What a claim may be true of instead: another chain, another output, the average of a cycle. */
final class OtherTruths {
    private final ModelTruths known;
    private final Truth truth;
    private final Set<SlipKind> contradicted;

    /** Without those that the derivation itself contradicts. */
    OtherTruths(ModelTruths known, Set<SlipKind> contradicted) {
        this.known = known;
        this.truth = known.truth();
        this.contradicted = contradicted;
    }

    /** All that a claim may be true of; {@code right} is what it should say. */
    List<Candidate> of(Claim claim, String right) {
        // a small whole number is right of many a chain, and so explains nothing
        boolean isStep = claim.statement() instanceof AnswerOf.SettlingStep;
        if (isStep || StatementPart.of(claim.statement()).isEmpty()) {
            return List.of();
        }
        List<Candidate> candidates = new ArrayList<>();
        Span place = place(claim.statement());
        Supplier<String> corrected = () -> right;
        // these have steps of their own that may be shifted
        boolean atStep = claim.statement() instanceof Statement.Value || claim.statement() instanceof AnswerOf;
        for (OtherChain other : known.others()) {
            boolean isLeftOut = contradicted.contains(other.kind()) || atStep && other.kind() == SlipKind.INDEX_SHIFTED;
            if (!isLeftOut) {
                candidates.add(new Candidate(other.kind(), place, other.found(), other.right(), corrected, claim,
                        () -> known.of(other)));
            }
        }
        if (Outcomes.only(claim.statement()).isPresent()) {
            Output own = Outcomes.only(claim.statement()).get();
            for (Output other : others(own)) {
                candidates.add(new Candidate(SlipKind.OUTPUT_MISREAD, place, other.name(), own.name(), corrected,
                        about(claim, other), () -> truth));
            }
            candidates.add(new Candidate(SlipKind.COMPLEMENT_QUOTED, place, "1 - " + own.name(), own.name(), corrected,
                    about(claim, complement(own)), () -> truth));
        }
        if (claim.statement() instanceof Statement.LongRunOf longRun) {
            candidates.addAll(ofCycle(claim, longRun, place, corrected));
        }
        if (claim.statement() instanceof AnswerOf asked) {
            OtherAnswers.of(asked, truth).forEach(other -> candidates.add(new Candidate(other.kind(), place,
                    other.found(), other.right(), corrected, Candidate.with(claim, other.statement()), () -> truth)));
        }
        if (claim.statement() instanceof Statement.Bound bound) {
            candidates.add(new Candidate(SlipKind.LONG_RUN_FOR_THE_LARGEST, place, "the long run", right, corrected,
                    Candidate.with(claim, new Statement.LongRunOf(List.of(
                            new Statement.LongRunOf.Part(bound.output(), List.of(bound.is()))))), () -> truth));
        }
        if (claim.statement() instanceof Statement.Value value) {
            for (long at : known.stepsTakenFor(value.at())) {
                candidates.add(new Candidate(SlipKind.TIME_FOR_STEPS, place, "p(" + at + ")",
                        "p(" + value.at() + ")", corrected, Candidate.with(claim,
                                new Statement.Value(value.output(), at, value.is())), () -> truth));
            }
            for (long at : new long[] {value.at() - 1, value.at() + 1}) {
                if (at >= 0) {
                    candidates.add(new Candidate(SlipKind.INDEX_SHIFTED, place, "p(" + at + ")",
                            "p(" + value.at() + ")", corrected, Candidate.with(claim,
                                    new Statement.Value(value.output(), at, value.is())), () -> truth));
                }
            }
        }
        return candidates;
    }

    /** From the first text of a statement to its last. */
    static Span place(Statement statement) {
        List<StatementPart> parts = StatementPart.of(statement);
        return parts.get(0).text().parsed().span().to(parts.get(parts.size() - 1).text().parsed().span());
    }

    private static Claim about(Claim claim, Output other) {
        return Candidate.with(claim, Outcomes.mapped(claim.statement(), own -> other));
    }

    private List<Output> others(Output own) {
        Chain chain = truth.chain();
        List<Output> all = new ArrayList<>(chain.outputs());
        all.addAll(Outputs.states(chain));
        chain.sets().forEach((name, members) -> all.add(new Output(name, IntStream.range(0, chain.size())
                .mapToObj(i -> members.contains(i) ? Rational.ONE : Rational.ZERO).toList(), Rational.ZERO, name)));
        List<Output> different = new ArrayList<>();
        for (Output each : all) {
            if (!same(each, own) && different.stream().noneMatch(other -> same(each, other))) {
                different.add(each);
            }
        }
        return different;
    }

    private static boolean same(Output a, Output b) {
        return a.coefficients().equals(b.coefficients()) && a.constant().equals(b.constant());
    }

    private Output complement(Output own) {
        boolean spread = truth.chain().kind() == Chain.Kind.CHAIN;
        return new Output("1 - " + own.name(), own.coefficients().stream()
                .map(value -> spread ? Rational.ONE.minus(value) : value.negate()).toList(),
                spread ? own.constant().negate() : Rational.ONE.minus(own.constant()), "1 - " + own.definition());
    }

    /** Single values where the truth is a cycle: its average, or one of its values. */
    private List<Candidate> ofCycle(Claim claim, Statement.LongRunOf stated, Span place, Supplier<String> corrected) {
        List<Output> outputs = stated.parts().stream().map(Statement.LongRunOf.Part::output).toList();
        List<Optional<LongRun.Cycle>> cycles = outputs.stream().map(this::cycle).toList();
        int period = cycles.stream().flatMap(Optional::stream).mapToInt(LongRun.Cycle::period).max().orElse(0);
        List<Candidate> candidates = new ArrayList<>();
        for (int place0 = -1; place0 < period; place0++) {
            int at = place0;
            List<Rational> values = IntStream.range(0, outputs.size()).mapToObj(i -> cycles.get(i)
                    .map(cycle -> at < 0 ? cycle.average() : cycle.values().get(at % cycle.period()))
                    .orElseGet(() -> limit(outputs.get(i)))).toList();
            Chain constant = constant(values);
            List<Output> readings = Outputs.states(constant);
            List<Statement.LongRunOf.Part> parts = IntStream.range(0, outputs.size()).mapToObj(i ->
                    new Statement.LongRunOf.Part(readings.get(i), stated.parts().get(i).values())).toList();
            candidates.add(new Candidate(SlipKind.LONG_RUN_OF_A_CYCLE, place,
                    at < 0 ? "the average over a cycle" : "the value for k = " + at + " modulo " + period,
                    "a cycle of period " + period, corrected,
                    Candidate.with(claim, new Statement.LongRunOf(parts)), () -> Truth.of(constant)));
        }
        return period == 0 ? List.of() : candidates;
    }

    private Optional<LongRun.Cycle> cycle(Output output) {
        return truth.about(output).longRun() instanceof LongRun.Cycle cycle ? Optional.of(cycle) : Optional.empty();
    }

    private Rational limit(Output output) {
        return truth.about(output).longRun() instanceof LongRun.Limit limit ? limit.value() : Rational.ZERO;
    }

    /** A state for each value, which it keeps for ever. */
    static Chain constant(List<Rational> values) {
        List<List<SparseMatrix.Entry>> columns = IntStream.range(0, values.size())
                .mapToObj(i -> List.of(new SparseMatrix.Entry(i, Rational.ONE))).toList();
        return new Chain(Chain.Kind.RECURSION, IntStream.range(0, values.size()).mapToObj(i -> "value" + i).toList(),
                new SparseMatrix(columns), values, Map.of(), List.of());
    }
}
