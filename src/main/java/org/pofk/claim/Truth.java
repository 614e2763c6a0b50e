package org.pofk.claim;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.concurrent.ConcurrentHashMap;
import org.pofk.answer.FirstEntrance;
import org.pofk.chain.Chain;
import org.pofk.chain.Output;
import org.pofk.exact.Polynomial;
import org.pofk.exact.Rational;
import org.pofk.modes.KnownPoles;
import org.pofk.transform.CharacteristicPolynomial;
import org.pofk.transform.MinimalPolynomial;

/**
 * What is true of one chain, exact, each part worked out when first asked for and kept. What single steps tell costs
 * only these steps: nothing is factored for it.
 */
public final class Truth {
    private final Chain chain;
    private final List<List<Rational>> states = new ArrayList<>();
    private final Map<Output, OutputTruth> outputs = new ConcurrentHashMap<>();
    private final Map<Set<Integer>, FirstEntrance> entrances = new ConcurrentHashMap<>();
    private final KnownPoles poles = new KnownPoles();
    private final Kept<Optional<Polynomial<Rational>>> characteristic;
    private final Kept<Polynomial<Rational>> minimal;

    private Truth(Chain chain) {
        this.chain = chain;
        this.characteristic = new Kept<>(
                () -> CharacteristicPolynomial.of(chain).map(CharacteristicPolynomial::polynomial));
        this.minimal = new Kept<>(() -> MinimalPolynomial.of(chain));
    }

    public static Truth of(Chain chain) {
        return new Truth(chain);
    }

    public Chain chain() {
        return chain;
    }

    /** What is true of one output of the chain. */
    public OutputTruth about(Output output) {
        return outputs.computeIfAbsent(output, each -> OutputTruth.of(this, each));
    }

    /** x(k), by stepping; for small k. */
    public synchronized List<Rational> stateAt(int k) {
        if (states.isEmpty()) {
            states.add(chain.start());
        }
        while (states.size() <= k) {
            states.add(chain.matrix().times(states.get(states.size() - 1)));
        }
        return states.get(k);
    }

    /** det(zI − A); empty where a class is too large for it. */
    public Optional<Polynomial<Rational>> characteristicPolynomial() {
        return characteristic.get();
    }

    /** The monic polynomial m of least degree with m(A) = 0. */
    public Polynomial<Rational> minimalPolynomial() {
        return minimal.get();
    }

    /** The answer to what a claim answers. */
    public Answer answer(AnswerOf asked) {
        return Answers.of(asked, this);
    }

    /** How often and how soon a set of states is entered from each state. */
    FirstEntrance entrance(Set<Integer> into) {
        return entrances.computeIfAbsent(into, each -> FirstEntrance.of(chain, each, Set.of()));
    }

    KnownPoles poles() {
        return poles;
    }
}
