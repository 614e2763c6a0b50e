package org.pofk.schedule;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.pofk.chain.Chain;
import org.pofk.chain.Output;
import org.pofk.chain.SparseMatrix;
import org.pofk.chain.Timetable;
import org.pofk.chain.Timetable.Moment;
import org.pofk.modes.ClosedForm;
import org.pofk.steps.StateArithmetic;
import org.pofk.steps.WholeState;
import org.pofk.transform.Transforms;

/** Formulas within a cycle: between two actions, or in one phase, the chain moves by one matrix, as any chain does. */
final class StretchFormulas {
    private static final int STRETCHES_AT_MOST = 4;
    /** A stretch of one step needs no formula. */
    private static final int STEPS_AT_LEAST = 2;
    /** Longer fractions at the beginning of a cycle make formulas nobody reads. */
    private static final int BITS_AT_MOST = 1_500;

    private final Chain chain;
    private final Timetable timetable;
    private final StateArithmetic.Whole matrices;

    StretchFormulas(Chain chain, Timetable timetable, StateArithmetic.Whole matrices) {
        this.chain = chain;
        this.timetable = timetable;
        this.matrices = matrices;
    }

    /** A part of the cycle without actions but at its end, and without a change of phase. */
    record Part(int from, int to, int move) {
    }

    /**
     * In the first cycle and in what the cycles tend to, where that is exactly known.
     *
     * @param begin x(P)
     * @param limit what x(P + m T) tends to
     */
    List<StretchFormula> of(Output output, WholeState begin, Optional<WholeState> limit) {
        List<StretchFormula> formulas = new ArrayList<>(of(output, begin, StretchFormula.Cycle.FIRST));
        limit.ifPresent(state -> formulas.addAll(of(output, state.shortened(), StretchFormula.Cycle.LONG_RUN)));
        return formulas;
    }

    private List<StretchFormula> of(Output output, WholeState begin, StretchFormula.Cycle cycle) {
        List<StretchFormula> formulas = new ArrayList<>();
        WholeState state = begin;
        int j = 0;
        for (Part part : parts()) {
            state = walked(state, j, part.from);
            j = part.from;
            if (state.divisor().bitLength() <= BITS_AT_MOST) {
                formulas.add(new StretchFormula(cycle, part.from, part.to,
                        form(output, timetable.moves().get(part.move), state)));
            }
        }
        return formulas;
    }

    /** The move that each cycle begins with, and for how many steps; empty where it begins with none. */
    Optional<Part> firstPart() {
        return parts().stream().filter(part -> part.from == 0).findFirst();
    }

    private WholeState walked(WholeState state, int from, int to) {
        return matrices.walked(timetable, state, timetable.before() + from, to - from);
    }

    private ClosedForm form(Output output, SparseMatrix move, WholeState begin) {
        Chain within = new Chain(chain.kind(), chain.states(), move, begin.reduced(), Map.of(), List.of());
        return ClosedForm.of(Transforms.of(within, List.of(output)).get(0));
    }

    /** Those worth a formula; none when they are too many. */
    private List<Part> parts() {
        List<Part> parts = new ArrayList<>();
        int from = 0;
        for (int j = 1; j <= timetable.period(); j++) {
            Moment moment = timetable.cycle().get(j - 1);
            boolean isLast = j == timetable.period() || !moment.actions().isEmpty()
                    || !timetable.cycle().get(j).move().equals(moment.move());
            if (isLast) {
                if (moment.move().isPresent() && j - from >= STEPS_AT_LEAST) {
                    parts.add(new Part(from, j, moment.move().getAsInt()));
                }
                from = j;
            }
        }
        return parts.size() <= STRETCHES_AT_MOST ? parts : List.of();
    }
}
