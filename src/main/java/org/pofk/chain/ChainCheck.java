package org.pofk.chain;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import org.pofk.chain.SparseMatrix.Entry;
import org.pofk.exact.Rational;

/** What makes a {@link Chain} one, checked exactly; linear in the number of its entries. */
public final class ChainCheck {
    private final Chain chain;
    private final List<String> violations = new ArrayList<>();

    private ChainCheck(Chain chain) {
        this.chain = chain;
    }

    /** What breaks the rules, in words; nothing for a sound chain. */
    public static List<String> violations(Chain chain) {
        ChainCheck check = new ChainCheck(chain);
        check.names();
        check.sizes();
        if (chain.kind() == Chain.Kind.CHAIN && check.violations.isEmpty()) {
            check.probabilities();
        }
        return List.copyOf(check.violations);
    }

    private void names() {
        require(!chain.states().isEmpty(), "no states");
        require(new HashSet<>(chain.states()).size() == chain.size(), "two states of one name");
    }

    private void sizes() {
        require(chain.matrix().size() == chain.size(), "matrix of another size than the states");
        require(chain.start().size() == chain.size(), "start of another size than the states");
        require(chain.matrix().columns().stream().flatMap(List::stream).map(Entry::row).allMatch(this::isState),
                "entry outside the matrix");
        require(chain.matrix().columns().stream()
                .allMatch(column -> column.stream().map(Entry::row).distinct().count() == column.size()),
                "two entries in one place");
        require(chain.sets().values().stream().flatMap(List::stream).allMatch(this::isState), "set beyond the states");
        require(chain.outputs().stream().allMatch(output -> output.coefficients().size() == chain.size()),
                "output of another size than the states");
    }

    private void probabilities() {
        for (int j = 0; j < chain.size(); j++) {
            distribution(chain.matrix().columns().get(j).stream().map(Entry::value).toList(),
                    "moves from " + chain.states().get(j));
        }
        distribution(chain.start(), "start");
        require(chain.outputs().stream().allMatch(output -> output.constant().isZero()), "constant not spread");
    }

    private void distribution(List<Rational> values, String what) {
        require(values.stream().allMatch(value -> value.signum() >= 0), what + ": negative");
        require(values.stream().reduce(Rational.ZERO, Rational::plus).isOne(), what + ": the sum is not one");
    }

    private boolean isState(int place) {
        return place >= 0 && place < chain.size();
    }

    private void require(boolean holds, String violation) {
        if (!holds) {
            violations.add(violation);
        }
    }
}
