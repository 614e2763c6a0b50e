package org.pofk.chain;

import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.stream.IntStream;
import org.pofk.exact.Rational;
import org.pofk.text.Fault;
import org.pofk.text.Position;
import org.pofk.text.RefusedException;
import org.pofk.text.Suggestion;

/** The outputs of a chain by name: those the model names, its sets and its states. Exact. */
public final class Outputs {
    private static final String ALL = "all";

    private Outputs() {
    }

    /** What is shown when nothing is asked for: the outputs the model names, every state when it names none. */
    public static List<Output> byDefault(Chain chain) {
        return chain.outputs().isEmpty() ? states(chain) : chain.outputs();
    }

    /** Every state, in order. */
    public static List<Output> states(Chain chain) {
        return IntStream.range(0, chain.size()).mapToObj(state -> sum(chain, chain.states().get(state), List.of(state)))
                .toList();
    }

    /**
     * The outputs of these names, each an output, a set or a state; {@code all} stands for every state unless
     * something bears that name. Refused, with a fault at {@code asked} for each: names that are unknown or stand for
     * two of them.
     */
    public static List<Output> named(Chain chain, List<String> names, Position asked) throws RefusedException {
        Set<Output> found = new LinkedHashSet<>();
        List<Fault> faults = new ArrayList<>();
        for (String name : names) {
            List<Output> bearing = bearing(chain, name);
            if (bearing.size() == 1) {
                found.add(bearing.get(0));
            } else if (bearing.isEmpty() && name.equals(ALL)) {
                found.addAll(states(chain));
            } else {
                faults.add(bearing.isEmpty() ? unknown(chain, name, asked) : forTwo(name, asked));
            }
        }
        if (!faults.isEmpty()) {
            throw new RefusedException(faults);
        }
        return List.copyOf(found);
    }

    private static List<Output> bearing(Chain chain, String name) {
        List<Output> bearing = new ArrayList<>(
                chain.outputs().stream().filter(output -> output.name().equals(name)).toList());
        Optional.ofNullable(chain.sets().get(name)).ifPresent(members -> bearing.add(sum(chain, name, members)));
        int state = chain.states().indexOf(name);
        if (state >= 0) {
            bearing.add(sum(chain, name, List.of(state)));
        }
        return bearing;
    }

    private static Output sum(Chain chain, String name, List<Integer> members) {
        List<Rational> coefficients = IntStream.range(0, chain.size())
                .mapToObj(state -> members.contains(state) ? Rational.ONE : Rational.ZERO).toList();
        return new Output(name, coefficients, Rational.ZERO, name);
    }

    private static Fault unknown(Chain chain, String name, Position asked) {
        List<String> known = new ArrayList<>(chain.outputs().stream().map(Output::name).toList());
        known.addAll(chain.sets().keySet());
        known.addAll(chain.states());
        return new Fault(asked, "unknown-output",
                "there is no output, set or state '" + name + "'" + Suggestion.didYouMeanOrAll(known, name));
    }

    private static Fault forTwo(String name, Position asked) {
        return new Fault(asked, "name-for-two", "'" + name
                + "' names more than one of outputs, sets and states; give them different names in the model");
    }
}
