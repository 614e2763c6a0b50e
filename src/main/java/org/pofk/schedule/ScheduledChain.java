package org.pofk.schedule;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.IntStream;
import org.pofk.answer.ConditionalSequence;
import org.pofk.answer.TooMuchWorkException;
import org.pofk.chain.Chain;
import org.pofk.chain.Output;
import org.pofk.chain.Timetable;
import org.pofk.schedule.CycleCourse.Reading;
import org.pofk.schedule.CycleCourse.Side;
import org.pofk.schedule.CycleFormula.Place;
import org.pofk.steps.KnownValue;
import org.pofk.steps.ModeValues;
import org.pofk.steps.StateArithmetic;
import org.pofk.steps.WholeState;

/** A chain with its timetable, and the chain of its whole cycles, made when it is first asked for. Exact. */
public final class ScheduledChain {
    /** Cubed states times bits of a cycle's matrix times the steps of a cycle, for a formula at each: ten seconds. */
    private static final double ALL_FORMULAS_AT_MOST = 1.5e7;

    private final Chain chain;
    private final Timetable timetable;
    private final StateArithmetic.Whole whole;
    private final long bits;
    private Optional<CycleChain> cycles = Optional.empty();
    private Optional<Optional<CycleEnclosures>> enclosures = Optional.empty();

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
        return CycleMatrices.areFormulasWithinReach(chain.size(), timetable, whole);
    }

    /** Whether one for each step of a cycle is. */
    boolean areAllFormulasWithinReach() {
        return formulasWithinReach() >= timetable.period();
    }

    /** For how many places of a cycle formulas are found in reasonable time. */
    long formulasWithinReach() {
        return areFormulasWithinReach() ? (long) (ALL_FORMULAS_AT_MOST / Math.pow(chain.size(), 3) / Math.max(1, bits))
                : 0;
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

    /** The states at the beginnings of the cycles, enclosed; empty where they can't be, and for a recursion. */
    Optional<CycleEnclosures> enclosures() {
        if (enclosures.isEmpty()) {
            enclosures = Optional.of(chain.kind() == Chain.Kind.RECURSION ? Optional.empty()
                    : CycleEnclosures.of(chain, timetable));
        }
        return enclosures.get();
    }

    /** An output at the steps 0 … P before the first cycle: exact while the numbers of a chain stay within reach. */
    List<Reading> before(Output output) {
        return ScheduledValues.isWithinReach(chain.size(), timetable, bits, timetable.before())
                ? walked(whole, output, timetable.before()) : first(output, timetable.before());
    }

    /** An output at the steps 0 … last: certified for a chain, exact for a recursion. */
    List<Reading> first(Output output, int last) {
        return chain.kind() == Chain.Kind.RECURSION ? walked(whole, output, last)
                : walked(StateArithmetic.Fixed.of(timetable), output, last);
    }

    private <V, R> List<Reading> walked(StateArithmetic<V, R> arithmetic, Output output, int last) {
        V start = arithmetic.start(chain.start());
        KnownValue here = arithmetic.known(arithmetic.reading(output, start));
        return last == 0 ? List.of(new Reading(0, here, here))
                : CycleCourse.of(timetable, arithmetic, start, 0, last, List.of(output)).courses().get(0).readings();
    }

    /** An output at step j of cycle m, exactly; empty where the numbers are out of reach. */
    Optional<Reading> exactly(Output output, long m, int j) {
        long k = timetable.before() + m * timetable.period() + j;
        return k > Integer.MAX_VALUE || !ScheduledValues.isWithinReach(chain.size(), timetable, bits, (int) k)
                ? Optional.empty()
                : Optional.of(ScheduledValues.of(chain, timetable, whole, List.of(output),
                        List.of((int) k)).get(0).get(0));
    }

    /**
     * An output at some steps, ascending: exactly while the numbers stay within reach, by the formulas over the cycles
     * beyond; where these are out of reach too, certified for a chain and empty for a recursion.
     */
    List<Optional<Reading>> at(Output output, List<Integer> steps) {
        List<Integer> near = steps.stream()
                .filter(k -> ScheduledValues.isWithinReach(chain.size(), timetable, bits, k)).toList();
        List<Optional<Reading>> values = new ArrayList<>();
        if (!near.isEmpty()) {
            ScheduledValues.of(chain, timetable, whole, List.of(output), near).get(0)
                    .forEach(reading -> values.add(Optional.of(reading)));
        }
        steps.subList(near.size(), steps.size()).forEach(k -> values.add(far(output, k)));
        return values;
    }

    /** The same after what is done there. */
    List<Optional<KnownValue>> after(Output output, List<Integer> steps) {
        return at(output, steps).stream().map(each -> each.map(Reading::after)).toList();
    }

    private Optional<Reading> far(Output output, int k) {
        int place = k - timetable.before() - 1;
        int j = Math.floorMod(place, timetable.period()) + 1;
        int m = Math.floorDiv(place, timetable.period());
        if (place >= 0 && areFormulasWithinReach()) {
            KnownValue after = value(output, new Place(j, Side.AFTER), m);
            return Optional.of(new Reading(k, timetable.at(k).actions().isEmpty() ? after
                    : value(output, new Place(j, Side.BEFORE), m), after));
        }
        Optional<Reading> enclosed = place < 0 ? Optional.empty() : enclosures()
                .flatMap(cycles -> enclosed(cycles, output, j, m))
                .map(reading -> new Reading(k, reading.before(), reading.after()));
        return enclosed.isPresent() || chain.kind() == Chain.Kind.RECURSION ? enclosed : Optional.of(
                ScheduledValues.of(chain, timetable, whole, List.of(output), List.of(k)).get(0).get(0));
    }

    private Optional<Reading> enclosed(CycleEnclosures cycles, Output output, int j, int m) {
        try {
            return Optional.of(CycleCourse.of(timetable, StateArithmetic.Fixed.of(timetable), cycles.state(m),
                    timetable.before(), j, List.of(output)).courses().get(0).readings().get(j));
        } catch (TooMuchWorkException tooMuch) {
            return Optional.empty();
        }
    }

    private KnownValue value(Output output, Place place, int m) {
        return new KnownValue(KnownValue.Word.EXACT, Optional.empty(),
                ModeValues.of(cycles().formula(output, place).closedForm()).at(m));
    }
}
