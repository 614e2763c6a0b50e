package org.pofk.schedule;

import java.util.Optional;
import org.pofk.answer.When;
import org.pofk.answer.When.End;
import org.pofk.answer.When.Reason;
import org.pofk.answer.When.ResidueClass;
import org.pofk.chain.Timetable;

/**
 * The steps k ≡ P + j modulo T of a schedule, those before the cycles included, from what is answered of step j of each
 * cycle.
 */
final class ResidueOfPlace {
    private ResidueOfPlace() {
    }

    /** Whether a step k ≤ P meets the condition, m < 0 being its cycle if there were one; empty where nobody tells. */
    interface Earlier {
        Optional<Boolean> isMet(int k, int m);
    }

    /** @param inCycles the answer in m */
    static ResidueClass of(Timetable timetable, int j, When inCycles, Earlier earlier) {
        long period = timetable.period();
        long begin = timetable.before() + j;
        long residue = begin % period;
        Optional<Long> first = inCycles.first().map(m -> begin + m * period);
        Optional<Long> forEver = inCycles.forEverFrom().map(m -> begin + m * period);
        boolean holdsSoFar = forEver.equals(Optional.of(begin));
        for (long k = begin - period; k >= 0; k -= period) {
            Optional<Boolean> isMet = earlier.isMet((int) k, Math.toIntExact((k - begin) / period));
            if (isMet.isEmpty()) {
                return new ResidueClass(residue, period, End.TOO_MANY_STEPS, Optional.empty(), Optional.empty());
            }
            holdsSoFar &= isMet.get();
            first = isMet.get() ? Optional.of(k) : first;
            forEver = holdsSoFar ? Optional.of(k) : forEver;
        }
        return new ResidueClass(residue, period, end(inCycles.reason()), first, forEver);
    }

    private static End end(Reason reason) {
        return switch (reason) {
            case FOR_EVER -> End.MET;
            case ONLY_IN_SOME_CLASSES, AGAIN_AND_AGAIN -> End.BOTH_FOR_EVER;
            case ONLY_FOR_A_WHILE, NEVER, NOTHING_DEFINED -> End.FAILED;
            case NO_LONG_RUN, APPROACH_NOT_DECIDED -> End.APPROACH_NOT_DECIDED;
            case TOO_MANY_STEPS -> End.TOO_MANY_STEPS;
        };
    }
}
