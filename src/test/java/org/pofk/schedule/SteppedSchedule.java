package org.pofk.schedule;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import org.pofk.chain.Model;
import org.pofk.chain.Schedule;
import org.pofk.chain.SparseMatrix;
import org.pofk.exact.Rational;

/**
 * A scheduled model stepped by hand from what its schedule says, without a timetable: the probability of each state
 * together with never having been in some of them, just before and just after the actions of a step.
 */
final class SteppedSchedule {
    private final Model model;
    private final Set<Integer> never;
    private int k;
    private List<Rational> before;
    private List<Rational> after;

    SteppedSchedule(Model model, Set<Integer> never) {
        this.model = model;
        this.never = never;
        this.before = without(model.chain().start());
        this.after = before;
    }

    /** From the end of a step on, with the state then. */
    SteppedSchedule(Model model, int step, List<Rational> state) {
        this(model, Set.of());
        this.k = step;
        this.before = state;
        this.after = state;
    }

    List<Rational> before() {
        return before;
    }

    List<Rational> after() {
        return after;
    }

    void step() {
        k++;
        List<Schedule.Recurring> due = model.schedule().orElseThrow().recurring().stream()
                .filter(each -> k >= each.first() && (k - each.first()) % each.every() == 0).toList();
        before = due.stream().allMatch(each -> each.when() == Schedule.When.AFTER_THE_STEP)
                ? without(move(model, k).times(after)) : after;
        after = before;
        due.forEach(each -> after = without(each.action().matrix().times(after)));
    }

    private List<Rational> without(List<Rational> state) {
        List<Rational> left = new ArrayList<>(state);
        never.forEach(each -> left.set(each, Rational.ZERO));
        return left;
    }

    static SparseMatrix move(Model model, int k) {
        Optional<Schedule.Phases> phases = model.schedule().orElseThrow().phases();
        if (phases.isEmpty()) {
            return model.chain().matrix();
        }
        int place = phases.get().repeat() == Schedule.Repeat.YES ? (k - 1) % phases.get().steps()
                : Math.min(k - 1, phases.get().steps() - 1);
        for (Schedule.Phase phase : phases.get().list()) {
            if (place < phase.steps()) {
                return phase.matrix();
            }
            place -= phase.steps();
        }
        throw new AssertionError("no phase at step " + k);
    }
}
