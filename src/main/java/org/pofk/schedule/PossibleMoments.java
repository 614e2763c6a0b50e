package org.pofk.schedule;

import java.util.ArrayList;
import java.util.BitSet;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import org.pofk.chain.SparseMatrix;
import org.pofk.chain.Timetable;
import org.pofk.chain.Timetable.Moment;
import org.pofk.exact.Rational;
import org.pofk.schedule.CycleCourse.Side;
import org.pofk.steps.PossibleSteps;

/**
 * At which steps a scheduled chain can be in a set of states, just before and just after what is done there: which
 * states carry probability where a cycle begins follows from which did where the one before began, so they repeat. Exact:
 * a matter of moves and actions, not of numbers. What is before the actions of step 0 is what is after them.
 */
public record PossibleMoments(PossibleSteps before, PossibleSteps after) {
    /** More steps beyond the first cycle are not looked at. */
    private static final int MOST_STEPS = 50_000;

    /** Empty where the repetition comes too late to be looked for. */
    static Optional<PossibleMoments> of(Timetable timetable, List<Rational> start, Set<Integer> states) {
        return new Walk(timetable, start, states).walked();
    }

    /** On one of the two sides. */
    public PossibleSteps at(Side side) {
        return side == Side.BEFORE ? before : after;
    }

    private static final class Walk {
        private final Timetable timetable;
        private final BitSet wanted = new BitSet();
        private final Map<BitSet, Integer> seen = new HashMap<>();
        private final List<Boolean> before = new ArrayList<>();
        private final List<Boolean> after = new ArrayList<>();
        private BitSet now = new BitSet();

        Walk(Timetable timetable, List<Rational> start, Set<Integer> states) {
            this.timetable = timetable;
            states.forEach(wanted::set);
            for (int i = 0; i < start.size(); i++) {
                now.set(i, !start.get(i).isZero());
            }
        }

        Optional<PossibleMoments> walked() {
            before.add(now.intersects(wanted));
            long most = (long) MOST_STEPS + timetable.before() + timetable.period();
            for (int k = 0; k <= most; k++) {
                Optional<Integer> same = timetable.place(k).cycle().isPresent() && timetable.place(k).within() == 0
                        ? Optional.ofNullable(seen.put(now, k)) : Optional.empty();
                if (same.isPresent()) {
                    int period = k - same.get();
                    return Optional.of(new PossibleMoments(PossibleSteps.leastPeriod(before, same.get() + 1, period),
                            PossibleSteps.leastPeriod(after, same.get(), period)));
                }
                after.add(now.intersects(wanted));
                step(timetable.at(k + 1));
            }
            return Optional.empty();
        }

        private void step(Moment moment) {
            if (moment.move().isPresent()) {
                now = image(timetable.moves().get(moment.move().getAsInt()));
            }
            before.add(now.intersects(wanted));
            for (int action : moment.actions()) {
                now = image(timetable.actions().get(action).matrix());
            }
        }

        private BitSet image(SparseMatrix matrix) {
            BitSet to = new BitSet();
            now.stream().forEach(state -> matrix.columns().get(state).forEach(entry -> to.set(entry.row())));
            return to;
        }
    }
}
