package org.pofk.chain;

import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.pofk.exact.Rational;

/**
 * States, moves and a start: x(k+1) = A x(k), x(0) = start. Exact.
 *
 * @param states  names, in order
 * @param matrix  A, n × n; for a chain every column sums to one and no entry is negative
 * @param start   x(0), n components; for a chain non-negative, summing to one
 * @param sets    named groups of states (places in {@code states}), in the order of the model
 * @param outputs the outputs the model names, none when it names none
 */
public record Chain(Kind kind, List<String> states, SparseMatrix matrix, List<Rational> start,
        Map<String, List<Integer>> sets, List<Output> outputs) {

    /** A probability chain, or any linear recursion. */
    public enum Kind { CHAIN, RECURSION }

    public Chain {
        states = List.copyOf(states);
        start = List.copyOf(start);
        sets = Collections.unmodifiableMap(new LinkedHashMap<>(sets));
        outputs = List.copyOf(outputs);
    }

    /** n, the number of states. */
    public int size() {
        return states.size();
    }
}
