package org.pofk.input;

import java.util.LinkedHashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import org.pofk.chain.Chain;
import org.pofk.chain.Output;
import org.pofk.chain.Outputs;
import org.pofk.text.RefusedException;

/** The names of a claims file: outputs, sets and states of its model. Without a model no name is a fault. */
final class ClaimNames {
    static final String ALL = "all";

    private final Optional<Chain> chain;
    private final Reading reading;

    ClaimNames(Optional<Chain> chain, Reading reading) {
        this.chain = chain;
        this.reading = reading;
    }

    /** n, where the model is known. */
    Optional<Integer> states() {
        return chain.map(Chain::size);
    }

    /** What the names are those of. */
    Optional<Chain> chain() {
        return chain;
    }

    List<Output> everyState() {
        return chain.map(Outputs::states).orElse(List.of());
    }

    /** Whether the word {@code all} stands for every state: nothing in the model bears that name. */
    boolean meansAll(String name) {
        return name.equals(ALL) && chain.filter(known -> known.states().contains(ALL)
                || known.sets().containsKey(ALL)
                || known.outputs().stream().anyMatch(output -> output.name().equals(ALL))).isEmpty();
    }

    /** The output, set or state of this name; a fault where there is none, or two. */
    Optional<Output> output(Node.Scalar name) {
        if (chain.isEmpty()) {
            return Optional.empty();
        }
        Set<String> known = known();
        if (!known.contains(name.name())) {
            reading.fault(name.position(), "unknown-output", "there is no output, set or state '"
                    + Words.shortened(name.name()) + "'" + reading.known(known, name.name(), "there"));
            return Optional.empty();
        }
        try {
            return Optional.of(Outputs.named(chain.get(), List.of(name.name()), name.position()).get(0));
        } catch (RefusedException forTwo) {
            reading.faults().addAll(forTwo.faults());
            return Optional.empty();
        }
    }

    /** The place of a state, or a fault. */
    Optional<Integer> state(Node.Scalar name) {
        Optional<Integer> place = chain.map(known -> known.states().indexOf(name.name())).filter(found -> found >= 0);
        if (chain.isPresent() && place.isEmpty()) {
            reading.fault(name.position(), "unknown-state", "there is no state '" + Words.shortened(name.name()) + "'"
                    + reading.known(chain.get().states(), name.name(), "the states"));
        }
        return place;
    }

    /** Every name of the model: its outputs, its sets, its states. */
    Set<String> known() {
        Set<String> known = new LinkedHashSet<>();
        chain.ifPresent(model -> {
            model.outputs().forEach(output -> known.add(output.name()));
            known.addAll(model.sets().keySet());
            known.addAll(model.states());
        });
        return known;
    }
}
