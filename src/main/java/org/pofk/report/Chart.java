package org.pofk.report;

import java.util.List;
import java.util.Optional;
import org.pofk.exact.Rational;
import org.pofk.exact.Root;
import org.pofk.steps.StepValue;

/**
 * What a figure shows, without how it is drawn: exact or certified data, a title, and an alternative in words that says
 * what is seen.
 */
public sealed interface Chart {
    Prose title();

    Prose alternative();

    <R> R accept(Visitor<R> visitor);

    /** One method per variant. */
    interface Visitor<R> {
        R course(Course course);

        R poleMap(PoleMap poleMap);

        R stateDiagram(StateDiagram diagram);
    }

    /** How values at steps are shown. */
    enum Drawing {
        /** A stem from zero to each value. */
        STEMS,
        /** A mark at each value, joined by thin lines that only lead the eye. */
        JOINED_MARKS,
        /** A line through so many values that marks would touch. */
        LINE
    }

    /**
     * Outputs over steps.
     *
     * @param step   what one step is, where the author says so
     * @param within how near to its long run an output counts as settled
     */
    record Course(Prose title, Prose alternative, Optional<String> step, Drawing drawing, Axis steps, Axis values,
            Rational within, List<Curve> curves) implements Chart {
        public Course {
            curves = List.copyOf(curves);
        }

        @Override
        public <R> R accept(Visitor<R> visitor) {
            return visitor.course(this);
        }
    }

    /**
     * One output.
     *
     * @param points  by ascending step
     * @param longRun the limit alone, the values of a cycle by residue of the step, or nothing
     * @param settled the least step from which the output stays within the course's distance of its long run, proved;
     *                empty when there is none or it isn't decided
     */
    record Curve(String name, List<StepValue> points, List<Rational> longRun, Optional<Long> settled) {
        public Curve {
            points = List.copyOf(points);
            longRun = List.copyOf(longRun);
        }
    }

    /** Where the poles of outputs lie; outputs with the same poles share a map. */
    record PoleMap(Prose title, Prose alternative, List<PoleSet> sets) implements Chart {
        public PoleMap {
            sets = List.copyOf(sets);
        }

        @Override
        public <R> R accept(Visitor<R> visitor) {
            return visitor.poleMap(this);
        }
    }

    /**
     * The poles that some outputs have in common, none for an output that is zero.
     *
     * @param axis of both parts, equal to scale
     */
    record PoleSet(List<String> outputs, List<Pole> poles, Axis axis) {
        public PoleSet {
            outputs = List.copyOf(outputs);
            poles = List.copyOf(poles);
        }
    }

    /** A pole of some multiplicity; each of a conjugate pair is one. */
    record Pole(Root root, Optional<Rational> exact, int multiplicity, Side side) {
    }

    /** Where a pole lies, decided exactly. */
    enum Side { INSIDE, ON, OUTSIDE }

    /** States and the moves between them. */
    record StateDiagram(Prose title, Prose alternative, List<State> states, List<Move> moves) implements Chart {
        public StateDiagram {
            states = List.copyOf(states);
            moves = List.copyOf(moves);
        }

        @Override
        public <R> R accept(Visitor<R> visitor) {
            return visitor.stateDiagram(this);
        }
    }

    /**
     * A state.
     *
     * @param start              x(0) there
     * @param communicatingClass the place of its class in the structure's order
     * @param closed             nothing leads out of that class
     * @param absorbing          it is a closed class alone
     * @param reached            the start reaches it
     */
    record State(String name, Rational start, int communicatingClass, boolean closed, boolean absorbing,
            boolean reached) {
    }

    /** A move by places of states, its exact probability (in a recursion any weight), and how that is written. */
    record Move(int from, int to, Rational probability, String text) {
    }
}
