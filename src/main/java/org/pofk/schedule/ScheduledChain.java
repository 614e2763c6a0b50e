package org.pofk.schedule;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.IntStream;
import org.pofk.answer.ConditionalSequence;
import org.pofk.chain.Chain;
import org.pofk.chain.Output;
import org.pofk.chain.Timetable;
import org.pofk.schedule.CycleCourse.Reading;
import org.pofk.schedule.CycleFormula.Place;
import org.pofk.steps.KnownValue;
import org.pofk.steps.ModeValues;
import org.pofk.steps.StateArithmetic;
import org.pofk.steps.WholeState;

/** A chain with its timetable, and the chain of its whole cycles, made when it is first asked for. Exact. */
public final class ScheduledChain {
    /** Cubed states times bits of a cycle's matrix, for formulas over the cycles: a second or two. */
    private static final double FORMULAS_AT_MOST = 3e6;
    /** The same times the steps of a cycle, for a formula at each of them: ten seconds. */
    private static final double ALL_FORMULAS_AT_MOST = 1.5e7;

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

    public Chain chain() {
        return chain;
    }

    public Timetable timetable() {
        return timetable;
    }

    /** Whether a few formulas over the cycles are found in reasonable time. */
    boolean areFormulasWithinReach() {
        return Math.pow(chain.size(), 3) * bits <= FORMULAS_AT_MOST;
    }

    /** Whether one for each step of a cycle is. */
    boolean areAllFormulasWithinReach() {
        return areFormulasWithinReach()
                && Math.pow(chain.size(), 3) * bits * timetable.period() <= ALL_FORMULAS_AT_MOST;
    }

    /** The chain that moves by a whole cycle from x(P). */
    CycleChain cycles() {
        if (cycles.isEmpty()) {
            WholeState begin = whole.walked(timetable, WholeState.of(chain.start()), 0, timetable.before());
            cycles = Optional.of(CycleChain.of(chain, timetable, whole, CycleMatrices.exact(timetable, whole), begin));
        }
        return cycles.get();
    }

    /** One output over another, each at these places of a cycle, as sequences in m. */
    List<ConditionalSequence> conditional(Output joint, Output event, List<Place> places) {
        List<CycleFormula> above = cycles().formulas(joint, places);
        List<CycleFormula> below = cycles().formulas(event, places);
        return IntStream.range(0, places.size()).mapToObj(i -> ConditionalSequence.of(cycles().chain(),
                above.get(i).closedForm(), below.get(i).closedForm())).toList();
    }

    /** An output at the end of the steps 0 … P before the first cycle. */
    List<KnownValue> before(Output output) {
        return timetable.before() == 0 ? List.of(at(output, List.of(0)).get(0).orElseThrow())
                : CycleCourse.of(timetable, whole, WholeState.of(chain.start()), 0, timetable.before(),
                        List.of(output)).courses().get(0).readings().stream().map(Reading::after).toList();
    }

    /** An output at the end of the steps 0 … last: certified for a chain, exact for a recursion. */
    List<KnownValue> first(Output output, int last) {
        return chain.kind() == Chain.Kind.RECURSION ? walked(whole, output, last)
                : walked(StateArithmetic.Fixed.of(timetable), output, last);
    }

    private <V, R> List<KnownValue> walked(StateArithmetic<V, R> arithmetic, Output output, int last) {
        return CycleCourse.of(timetable, arithmetic, arithmetic.start(chain.start()), 0, last, List.of(output)).courses()
                .get(0).readings().stream().map(Reading::after).toList();
    }

    /**
     * An output at the end of some steps, ascending, after what is done there: exactly while the numbers stay within
     * reach, by the formulas over the cycles beyond; where these are out of reach too, certified for a chain and empty for
     * a recursion.
     */
    List<Optional<KnownValue>> at(Output output, List<Integer> steps) {
        boolean isByFormula = chain.kind() == Chain.Kind.RECURSION || areFormulasWithinReach();
        List<Integer> near = steps.stream().filter(k -> !isByFormula
                || ScheduledValues.isWithinReach(chain.size(), timetable, bits, k)).toList();
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
        return areFormulasWithinReach() && place.cycle().isPresent()
                ? Optional.of(new KnownValue(KnownValue.Word.EXACT, Optional.empty(),
                        ModeValues.of(cycles().formula(output, place.within()).closedForm())
                                .at(place.cycle().getAsInt()))) : Optional.empty();
    }
}
