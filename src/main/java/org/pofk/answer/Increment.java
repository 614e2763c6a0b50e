package org.pofk.answer;

import java.util.ArrayList;
import java.util.Collections;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import org.pofk.chain.Chain;
import org.pofk.chain.Costs;
import org.pofk.chain.Output;
import org.pofk.chain.SparseMatrix;
import org.pofk.exact.Rational;

/**
 * What is added up, as what one step adds in expectation: g(k) = constant + c x(k) + m x(k−1) for k ≥ 1, and
 * g(0) = constant + c x(0) + atStart. Exact.
 *
 * @param kind       what the amounts are
 * @param name       what is added up: a state, a set, an output, {@code costs}
 * @param definition how the model writes it, or the name itself
 * @param atState    c: from the state at the end of the step, one a state
 * @param byMove     m: from the move made in the step, by the state it is made from, weighed with its probabilities
 * @param constant   zero for a chain, where a constant is spread over all states
 */
public record Increment(Kind kind, String name, String definition, List<Rational> atState, List<Rational> byMove,
        Rational atStart, Rational constant) {

    /** What is added up: values of an output, which for a state or a set are steps spent there, entries, or costs. */
    public enum Kind { VALUES, STEPS, ENTRIES, COSTS }

    public Increment {
        atState = List.copyOf(atState);
        byMove = List.copyOf(byMove);
    }

    /** The value of an output at the end of each step. */
    public static Increment of(Chain chain, Output output) {
        return chain.kind() == Chain.Kind.CHAIN ? ofOutput(output) : ofValues(output);
    }

    /** The value of a chain's output at the end of each step: for a state or a set, the steps spent there. */
    public static Increment ofOutput(Output output) {
        return ofOutput(isSet(output) ? Kind.STEPS : Kind.VALUES, output);
    }

    /** The same of a recursion, in which nothing is spent. */
    public static Increment ofValues(Output output) {
        return ofOutput(Kind.VALUES, output);
    }

    private static Increment ofOutput(Kind kind, Output output) {
        return new Increment(kind, output.name(), output.definition(), output.coefficients(),
                zeros(output.coefficients().size()), Rational.ZERO, output.constant());
    }

    /** Whether an output is one in some states and zero in the others. */
    public static boolean isSet(Output output) {
        return output.constant().isZero()
                && output.coefficients().stream().allMatch(each -> each.isZero() || each.isOne());
    }

    /** The moves into a set from outside; a start inside it is none. */
    public static Increment ofEntries(Chain chain, Output set) {
        Set<Integer> inside = new HashSet<>();
        for (int state = 0; state < chain.size(); state++) {
            if (!set.coefficients().get(state).isZero()) {
                inside.add(state);
            }
        }
        List<Rational> entering = zeros(chain.size());
        for (int state = 0; state < chain.size(); state++) {
            if (!inside.contains(state)) {
                entering.set(state, chain.matrix().columns().get(state).stream()
                        .filter(entry -> inside.contains(entry.row())).map(SparseMatrix.Entry::value)
                        .reduce(Rational.ZERO, Rational::plus));
            }
        }
        return new Increment(Kind.ENTRIES, set.name(), set.definition(), zeros(chain.size()), entering, Rational.ZERO,
                Rational.ZERO);
    }

    /** What a step costs. */
    public static Increment ofCosts(Chain chain, Costs costs) {
        List<Rational> byMove = zeros(chain.size());
        for (Costs.Move move : costs.moves()) {
            byMove.set(move.from(), byMove.get(move.from())
                    .plus(move.cost().times(chain.matrix().at(move.to(), move.from()))));
        }
        return new Increment(Kind.COSTS, "costs", "costs", costs.eachStep(), byMove, costs.atStart(), Rational.ZERO);
    }

    public static List<Rational> zeros(int size) {
        return new ArrayList<>(Collections.nCopies(size, Rational.ZERO));
    }
}
