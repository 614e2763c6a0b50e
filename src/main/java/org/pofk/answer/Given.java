package org.pofk.answer;

import java.util.Collections;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.TreeSet;
import java.util.stream.IntStream;
import org.pofk.chain.Chain;
import org.pofk.chain.Model;
import org.pofk.chain.Output;
import org.pofk.chain.Schedule;
import org.pofk.chain.SparseMatrix;
import org.pofk.chain.Timetable;
import org.pofk.exact.Rational;
import org.pofk.steps.ExactSteps;
import org.pofk.steps.StateArithmetic;
import org.pofk.steps.WholeState;

/**
 * What is known of a chain at a step: the state lies in a set, and other states have not been entered up to then. The
 * second is a set too, of the chain in which a state never to be entered keeps what enters it. Exact.
 *
 * @param names      what the set was called, one name for each part that all have to hold
 * @param in         states the chain may be in
 * @param neverNames what was not entered, by name
 * @param never      states not entered at steps 0 … k; none of them is in {@code in}
 */
public record Given(List<String> names, Set<Integer> in, List<String> neverNames, Set<Integer> never) {

    public Given {
        names = List.copyOf(names);
        neverNames = List.copyOf(neverNames);
        never = Collections.unmodifiableSet(new TreeSet<>(never));
        Set<Integer> left = new TreeSet<>(in);
        left.removeAll(never);
        in = Collections.unmodifiableSet(left);
    }

    /** The state a chain is in at a step, given what is known: with which probability that was so. */
    public record Start(Rational probability, List<Rational> state) {
        public Start {
            state = List.copyOf(state);
        }
    }

    /** The chain in which what is known is a matter of the state at k alone. */
    public Chain chain(Chain chain) {
        if (never.isEmpty()) {
            return chain;
        }
        return with(chain, stopped(chain.matrix()), chain.start());
    }

    /** The same of a model: with a schedule, neither moves nor actions lead out of states never to be entered. */
    public Model model(Model model) {
        Model stopped = model.with(chain(model.chain()));
        return model.schedule().map(schedule -> stopped.with(schedule.with(this::stopped))).orElse(stopped);
    }

    private SparseMatrix stopped(SparseMatrix matrix) {
        return new SparseMatrix(IntStream.range(0, matrix.size()).mapToObj(state -> never.contains(state)
                ? List.of(new SparseMatrix.Entry(state, Rational.ONE)) : matrix.columns().get(state)).toList());
    }

    /** The output where what is known holds, zero elsewhere: E[output at k, and known]. */
    public Output joint(Output output) {
        List<Rational> coefficients = IntStream.range(0, output.coefficients().size()).mapToObj(state ->
                in.contains(state) ? output.coefficients().get(state).plus(output.constant()) : Rational.ZERO).toList();
        return new Output(output.name(), coefficients, Rational.ZERO, output.definition());
    }

    /** The probability that what is known holds, as an output of {@link #chain}. */
    public Output event(Chain chain) {
        return new Output("known", IntStream.range(0, chain.size()).mapToObj(state ->
                in.contains(state) ? Rational.ONE : Rational.ZERO).toList(), Rational.ZERO, "P(known at k)");
    }

    /**
     * The state at step j given what is known there, after what a schedule does then; empty where that has probability
     * zero. Cost: j steps in fractions that grow, see {@link ExactSteps#bitsPerStep}.
     */
    public Optional<Start> at(Model model, int j) {
        Model stopped = model(model);
        List<Rational> state = stopped.schedule().map(schedule -> stepped(stopped.chain(), schedule, j))
                .orElseGet(() -> stepped(stopped.chain(), j));
        List<Rational> kept = IntStream.range(0, state.size()).mapToObj(i ->
                in.contains(i) ? state.get(i) : Rational.ZERO).toList();
        Rational probability = kept.stream().reduce(Rational.ZERO, Rational::plus);
        return probability.isZero() ? Optional.empty() : Optional.of(new Start(probability,
                kept.stream().map(share -> share.dividedBy(probability)).toList()));
    }

    private static List<Rational> stepped(Chain chain, int j) {
        List<Rational> state = chain.start();
        for (int k = 0; k < j; k++) {
            state = chain.matrix().times(state);
        }
        return state;
    }

    private static List<Rational> stepped(Chain chain, Schedule schedule, int j) {
        Timetable timetable = Timetable.of(chain, schedule);
        return StateArithmetic.Whole.of(timetable).walked(timetable, WholeState.of(chain.start()), 0, j).reduced();
    }

    /** The same chain from another start. */
    public static Chain startedIn(Chain chain, List<Rational> start) {
        return with(chain, chain.matrix(), start);
    }

    private static Chain with(Chain chain, SparseMatrix matrix, List<Rational> start) {
        return new Chain(chain.kind(), chain.states(), matrix, start, chain.sets(), chain.outputs());
    }
}
