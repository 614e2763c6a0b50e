package org.pofk.report;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import org.pofk.chain.Chain;
import org.pofk.chain.Model;
import org.pofk.chain.SparseMatrix;
import org.pofk.chain.Structure;

/** The states of a model and the moves between them, where they are few enough to be read. */
public final class StateChart {
    /** A circle of more states can't be read. */
    public static final int MOST_STATES = 12;
    private static final int DIGITS = 3;

    private StateChart() {
    }

    /** Empty for a model of more than {@value #MOST_STATES} states. */
    public static Optional<Chart.StateDiagram> of(Model model) {
        return model.chain().size() > MOST_STATES ? Optional.empty() : Optional.of(drawn(model));
    }

    private static Chart.StateDiagram drawn(Model model) {
        Chain chain = model.chain();
        Structure structure = Structure.of(chain);
        // what is never left by the moves drawn may be left by what is scheduled
        boolean isAlone = model.schedule().isEmpty();
        List<Integer> classes = structure.classOfState();
        Set<Integer> unreached = new HashSet<>(structure.unreached());
        List<Chart.State> states = new ArrayList<>();
        List<Chart.Move> moves = new ArrayList<>();
        for (int i = 0; i < chain.size(); i++) {
            Structure.CommunicatingClass its = structure.classes().get(classes.get(i));
            states.add(new Chart.State(chain.states().get(i), chain.start().get(i), classes.get(i),
                    isAlone && its.closed(), isAlone && its.isAbsorbing(), !isAlone || !unreached.contains(i)));
            for (SparseMatrix.Entry entry : chain.matrix().columns().get(i)) {
                moves.add(new Chart.Move(i, entry.row(), entry.value(), ChartNumber.of(entry.value(), DIGITS)));
            }
        }
        return new Chart.StateDiagram(Prose.of(heading(model)).andName(model.title()),
                StateProse.of(states, moves, chain.kind()).and(leftOut(model)), states, moves);
    }

    private static String heading(Model model) {
        return model.schedule().map(schedule -> schedule.phases().isPresent() ? "States and the moves named first, without"
                + " what is scheduled — " : "States and moves, without what is scheduled — ").orElse("States and moves — ");
    }

    /** Actions and later phases move by matrices of their own. */
    private static String leftOut(Model model) {
        return model.schedule().map(schedule -> (schedule.recurring().isEmpty() ? ""
                : " What is done by the schedule is not drawn.") + schedule.phases().map(phases ->
                        " The moves are those that the file names first, not those of every phase.").orElse(""))
                .orElse("");
    }
}
