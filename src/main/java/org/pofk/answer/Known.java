package org.pofk.answer;

import java.util.Optional;
import org.pofk.chain.Chain;
import org.pofk.chain.Model;
import org.pofk.exact.Rational;
import org.pofk.steps.ExactSteps;

/**
 * A model seen from a step at which something is known: its start is the state then, and k counts the steps from there.
 *
 * @param at          the step, counted from the model's own start
 * @param probability of what is known, at that step; above zero
 */
public record Known(Given given, int at, Rational probability, Model model) {
    /** Longer fractions in the start make everything that follows slow, and nobody reads them. */
    public static final int BITS_AT_MOST = 20_000;

    /** True where the state at the step can be told in fractions that are not too long. */
    public static boolean isNear(Chain chain, int at) {
        return (long) ExactSteps.bitsPerStep(chain.matrix()) * at <= BITS_AT_MOST;
    }

    /** Empty where what is known has probability zero at that step. */
    public static Optional<Known> of(Model model, Given given, int at) {
        return given.at(model.chain(), at).map(start -> new Known(given, at, start.probability(),
                model.with(Given.startedIn(model.chain(), start.state()))));
    }
}
