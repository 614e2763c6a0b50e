package org.pofk.answer;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.pofk.answer.CycleCourse.Reading;
import org.pofk.chain.Chain;
import org.pofk.chain.Output;
import org.pofk.chain.Timetable;

/** A chain with its timetable, and the chain of its whole cycles, made when it is first asked for. Exact. */
final class ScheduledChain {
    /** Cubed states times bits of a cycle's matrix, for formulas over the cycles: a second or two. */
    private static final double FORMULAS_AT_MOST = 3e6;

    private final Chain chain;
    private final Timetable timetable;
    private final StateArithmetic.Whole whole;
    private final long bits;
    private Optional<CycleChain> cycles = Optional.empty();

    private ScheduledChain(Chain chain, Timetable timetable) {
        this.chain = chain;
        this.timetable = timetable;
        this.whole = StateArithmetic.Whole.of(timetable);
        this.bits = CycleMatrices.bits(timetable, whole);
    }

    static ScheduledChain of(Chain chain, Timetable timetable) {
        return new ScheduledChain(chain, timetable);
    }

    Chain chain() {
        return chain;
    }

    Timetable timetable() {
        return timetable;
    }

    /** Whether so many formulas over the cycles are found in reasonable time. */
    boolean areWithinReach(int formulas) {
        return Math.pow(chain.size(), 3) * bits * formulas <= FORMULAS_AT_MOST;
    }

    /** The chain that moves by a whole cycle from x(P). */
    CycleChain cycles() {
        if (cycles.isEmpty()) {
            WholeState start = WholeState.of(chain.start());
            WholeState begin = timetable.before() == 0 ? start
                    : CycleCourse.of(timetable, whole, start, 0, timetable.before(), List.of()).end();
            cycles = Optional.of(CycleChain.of(chain, timetable, whole, CycleMatrices.exact(timetable, whole), begin));
        }
        return cycles.get();
    }

    /** An output at the end of the steps 0 … P before the first cycle. */
    List<KnownValue> before(Output output) {
        return timetable.before() == 0 ? List.of(at(output, List.of(0)).get(0).orElseThrow())
                : CycleCourse.of(timetable, whole, WholeState.of(chain.start()), 0, timetable.before(),
                        List.of(output)).courses().get(0).readings().stream().map(Reading::after).toList();
    }

    /**
     * An output at the end of some steps, ascending, after what is done there: exactly while the numbers stay within
     * reach, by the formulas over the cycles beyond; where these are out of reach too, certified for a chain and empty for
     * a recursion.
     */
    List<Optional<KnownValue>> at(Output output, List<Integer> steps) {
        List<Integer> near = steps.stream().filter(k -> ScheduledValues.isWithinReach(chain.size(), timetable, bits, k))
                .toList();
        List<Optional<KnownValue>> values = new ArrayList<>();
        if (!near.isEmpty()) {
            ScheduledValues.of(chain, timetable, whole, List.of(output), near).get(0)
                    .forEach(reading -> values.add(Optional.of(reading.after())));
        }
        steps.subList(near.size(), steps.size()).forEach(k -> values.add(far(output, k)));
        return values;
    }

    private Optional<KnownValue> far(Output output, int k) {
        Timetable.Place place = timetable.place(k);
        if (areWithinReach(1) && place.cycle().isPresent()) {
            return Optional.of(new KnownValue(KnownValue.Word.EXACT, Optional.empty(),
                    ModeValues.of(cycles().formula(output, place.within()).closedForm())
                            .at(place.cycle().getAsInt())));
        }
        return chain.kind() == Chain.Kind.RECURSION ? Optional.empty() : Optional.of(ScheduledValues.of(chain,
                timetable, whole, List.of(output), List.of(k)).get(0).get(0).after());
    }
}
