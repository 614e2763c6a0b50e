package org.pofk.chain;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalInt;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.pofk.chain.Schedule.Action;
import org.pofk.chain.Schedule.Phase;
import org.pofk.chain.Schedule.Phases;
import org.pofk.chain.Schedule.Recurring;
import org.pofk.chain.Schedule.Repeat;
import org.pofk.chain.Schedule.When;
import org.pofk.chain.Timetable.Moment;
import org.pofk.exact.Rational;

class TimetableTest {
    private static final long SEED = 61_508L;
    private static final Chain CHAIN = new Chain(Chain.Kind.CHAIN, List.of("works", "failed"), matrix(9, 10),
            List.of(Rational.ONE, Rational.ZERO), Map.of(), List.of());
    private static final Action TEST = new Action("test", matrix(1, 1));
    private static final Action OVERHAUL = new Action("overhaul", matrix(1, 2));

    private static SparseMatrix matrix(long numerator, long denominator) {
        Rational staying = Rational.of(numerator, denominator);
        return SparseMatrix.ofRows(List.of(List.of(staying, Rational.ONE.minus(staying)),
                List.of(Rational.ONE.minus(staying), staying)));
    }

    private static Timetable of(Recurring... recurring) {
        return Timetable.of(CHAIN, new Schedule(List.of(recurring), Optional.empty()));
    }

    private static Recurring after(Action action, int every, int first) {
        return new Recurring(action, every, first, When.AFTER_THE_STEP);
    }

    @Test
    void aCycleEndsWithItsAction() {
        Timetable plain = of(after(TEST, 12, 12));
        assertEquals(List.of(0, 12), List.of(plain.before(), plain.period()));
        assertEquals(List.of(0), plain.at(12).actions());
        Timetable early = of(after(TEST, 12, 5));
        assertEquals(List.of(5, 12), List.of(early.before(), early.period()));
        Timetable late = of(after(TEST, 12, 30));
        assertEquals(List.of(18, 12), List.of(late.before(), late.period()));
        assertEquals(List.of(), late.at(18).actions());
    }

    @Test
    void staggeredActionsRecurAfterTheirLeastCommonMultiple() {
        Timetable staggered = of(after(TEST, 4, 2), after(OVERHAUL, 6, 6));
        assertEquals(12, staggered.period());
        assertEquals(List.of(0, 1), of(after(TEST, 4, 4), after(OVERHAUL, 6, 6)).at(12).actions());
    }

    @Test
    void phasesRunOnceGoOnWithTheLast() {
        Phases once = new Phases(List.of(new Phase(3, "wet", matrix(1, 3)), new Phase(2, "dry", matrix(1, 4))),
                Repeat.ONCE);
        Timetable timetable = Timetable.of(CHAIN, new Schedule(List.of(), Optional.of(once)));
        assertEquals(List.of(3, 1), List.of(timetable.before(), timetable.period()));
        assertEquals(matrix(1, 4), timetable.moves().get(timetable.at(500).move().orElseThrow()));
    }

    /** What a step holds by the schedule itself, without any cycle. */
    private static Moment plainly(Schedule schedule, int k) {
        List<Recurring> due = schedule.recurring().stream()
                .filter(each -> k >= each.first() && (k - each.first()) % each.every() == 0).toList();
        boolean moves = due.stream().allMatch(each -> each.when() == When.AFTER_THE_STEP);
        return new Moment(moves ? OptionalInt.of(0) : OptionalInt.empty(),
                due.stream().map(each -> each.action().equals(TEST) ? 0 : 1).toList());
    }

    @Test
    void everyStepIsAsTheScheduleSays() {
        Random random = new Random(SEED);
        int compared = 0;
        for (int n = 0; n < 100; n++) {
            List<Recurring> recurring = new ArrayList<>();
            for (Action action : List.of(TEST, OVERHAUL)) {
                recurring.add(new Recurring(action, 1 + random.nextInt(9), 1 + random.nextInt(20),
                        When.values()[random.nextInt(2)]));
            }
            Schedule schedule = new Schedule(recurring, Optional.empty());
            Timetable timetable = Timetable.of(CHAIN, schedule);
            boolean ordered = timetable.actions().equals(List.of(TEST, OVERHAUL));
            for (int k = 1; k <= 200 && ordered; k++) {
                Moment told = timetable.at(k);
                assertEquals(plainly(schedule, k).actions(), told.actions(), schedule + " at " + k);
                assertEquals(plainly(schedule, k).move().isPresent(), told.move().isPresent());
                assertEquals(Math.floorMod(k - timetable.before(), timetable.period()),
                        timetable.place(k).cycle().isPresent() ? timetable.place(k).within()
                                : Math.floorMod(k - timetable.before(), timetable.period()));
                compared++;
            }
        }
        assertTrue(compared > 5_000, "compared " + compared);
    }
}
