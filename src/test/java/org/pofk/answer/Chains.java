package org.pofk.answer;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Map;
import java.util.stream.IntStream;
import org.pofk.chain.Chain;
import org.pofk.chain.Output;
import org.pofk.chain.SparseMatrix;
import org.pofk.exact.Rational;
import org.pofk.longrun.LongRun;
import org.pofk.modes.ClosedForm;
import org.pofk.transform.Transform;
import org.pofk.transform.Transforms;

/** Small chains and recursions as text, row by row, entry in row i and column j the move from j to i. */
public final class Chains {
    private Chains() {
    }

    public static Chain chain(String start, String... rows) {
        return of(Chain.Kind.CHAIN, start, rows);
    }

    public static Chain recursion(String start, String... rows) {
        return of(Chain.Kind.RECURSION, start, rows);
    }

    private static Chain of(Chain.Kind kind, String start, String... rows) {
        List<Rational> first = numbers(start);
        List<List<Rational>> all = new ArrayList<>();
        for (String row : rows) {
            all.add(numbers(row));
        }
        List<String> names = IntStream.range(0, first.size()).mapToObj(i -> "s" + i).toList();
        return new Chain(kind, names, SparseMatrix.ofRows(all), first, Map.of(), List.of());
    }

    public static List<Rational> numbers(String text) {
        List<Rational> numbers = new ArrayList<>();
        for (String number : text.strip().split("\\s+")) {
            numbers.add(Rational.parse(number));
        }
        return numbers;
    }

    public static Output state(Chain chain, int state) {
        List<Rational> coefficients = new ArrayList<>(Collections.nCopies(chain.size(), Rational.ZERO));
        coefficients.set(state, Rational.ONE);
        return new Output(chain.states().get(state), coefficients, Rational.ZERO, chain.states().get(state));
    }

    public static Output reading(String coefficients) {
        return new Output("reading", numbers(coefficients), Rational.ZERO, coefficients);
    }

    public static Transform transform(Chain chain, Output output) {
        return Transforms.of(chain, List.of(output)).get(0);
    }

    public static ClosedForm closedForm(Chain chain, Output output) {
        return ClosedForm.of(transform(chain, output));
    }

    public static LongRun longRun(Chain chain, Output output) {
        return LongRun.of(chain, transform(chain, output));
    }

    /** Duty and standby pump, invented: both run, one runs, none runs. */
    public static Chain pumps() {
        return chain("1 0 0", "0.9025 0.6 0", "0.095 0.38 0.6", "1/400 0.02 0.4");
    }

    /** Three valves in strict rotation, invented; between them a shift may be skipped before the first turn. */
    public static Chain rotation() {
        return chain("1 0 0 0", "1/2 0 0 0", "1/2 0 0 1", "0 1 0 0", "0 0 1 0");
    }

    /** A deck that ages between two sound states and fails with a chance of 1e-10 a step, for ever; invented. */
    public static Chain nearlyReducible() {
        return chain("1 0 0", "0.9 0.3 0", "0.0999999999 0.7 0", "0.0000000001 0 1");
    }
}
