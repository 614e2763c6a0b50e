package org.pofk.answer;

import java.util.List;
import java.util.Optional;
import org.pofk.chain.Model;
import org.pofk.chain.Timetable;
import org.pofk.exact.Rational;
import org.pofk.steps.ExactSteps;

/**
 * A model seen from a step at which something is known: its start is the state then, and k counts the steps from there,
 * in its schedule too.
 *
 * @param at          the step, counted from the model's own start
 * @param probability of what is known, at that step; above zero
 */
public record Known(Given given, int at, Rational probability, Model model) {
    /** Longer fractions in the start make everything that follows slow, and nobody reads them. */
    public static final int BITS_AT_MOST = 20_000;

    /** True where the state at the step can be told in fractions that are not too long. */
    public static boolean isNear(Model model, int at) {
        return model.schedule().map(schedule -> bits(Timetable.of(model.chain(), schedule), at))
                .orElseGet(() -> (long) ExactSteps.bitsPerStep(model.chain().matrix()) * at) <= BITS_AT_MOST;
    }

    /** How many bits the steps up to one add, or more than enough of them. */
    private static long bits(Timetable timetable, int at) {
        List<Integer> ofMoves = timetable.moves().stream().map(ExactSteps::bitsPerStep).toList();
        List<Integer> ofActions = timetable.actions().stream()
                .map(each -> ExactSteps.bitsPerStep(each.matrix())).toList();
        long bits = 0;
        for (int k = 1; k <= at && bits <= BITS_AT_MOST; k++) {
            Timetable.Moment moment = timetable.at(k);
            bits += moment.move().isPresent() ? ofMoves.get(moment.move().getAsInt()) : 0;
            bits += moment.actions().stream().mapToLong(ofActions::get).sum();
        }
        return bits;
    }

    /** Empty where what is known has probability zero at that step. */
    public static Optional<Known> of(Model model, Given given, int at) {
        return given.at(model, at).map(start -> new Known(given, at, start.probability(),
                seenFrom(model, at).with(Given.startedIn(model.chain(), start.state()))));
    }

    private static Model seenFrom(Model model, int at) {
        return model.schedule().map(schedule -> model.with(schedule.after(at))).orElse(model);
    }
}
