package org.pofk.report;

import java.util.ArrayList;
import java.util.List;
import org.pofk.formula.Formula;
import org.pofk.formula.Formulas;
import org.pofk.modes.Mode;
import org.pofk.modes.ModeFormula;
import org.pofk.modes.RealValue;
import org.pofk.modes.StateModes;
import org.pofk.modes.StateModes.VectorMode;
import org.pofk.report.Document.Block;
import org.pofk.report.Document.Heading;
import org.pofk.report.Document.Paragraph;
import org.pofk.report.Document.Table;

/** The whole state as a sum of vectors times modes: the eigenvector expansion of the start. */
final class StateBlocks {
    private static final int STATES_WRITTEN_OUT_UP_TO = 12;

    private final NumberFormula numbers;
    private final List<List<Prose>> rows = new ArrayList<>();

    private StateBlocks(Style style) {
        this.numbers = new NumberFormula(style);
    }

    static List<Block> of(StateModes state, List<String> states, Style style) {
        StateBlocks blocks = new StateBlocks(style);
        boolean writtenOut = states.size() <= STATES_WRITTEN_OUT_UP_TO;
        state.modes().forEach(mode -> mode.shape().accept(blocks.new Rows(mode, writtenOut)));
        List<Prose> header = new ArrayList<>(List.of(Prose.of("mode"), Prose.of("excited")));
        if (writtenOut) {
            states.forEach(name -> header.add(Prose.name(name)));
        }
        return List.of(new Heading(2, "The whole state"),
                new Paragraph("The state at step k is the sum over these modes of the mode times its vector over the"
                        + " states; 'excited' says how strongly the start excites it: the largest component."
                        + (writtenOut ? "" : " The vectors of " + states.size() + " states are in the result as JSON.")),
                new Table(Prose.EMPTY, header, blocks.rows));
    }

    /** One row for a real mode, two for a pair: with the cosine and with minus the sine. */
    private final class Rows implements Mode.Visitor<Boolean> {
        private final VectorMode mode;
        private final boolean writtenOut;

        Rows(VectorMode mode, boolean writtenOut) {
            this.mode = mode;
            this.writtenOut = writtenOut;
        }

        private boolean row(Formula shape, Prose excited, List<RealValue> vector) {
            List<Prose> row = new ArrayList<>(List.of(Prose.formula(shape), excited));
            if (writtenOut) {
                vector.forEach(component -> row.add(Prose.formula(numbers.of(component))));
            }
            return rows.add(row);
        }

        private Prose excitation() {
            return Prose.formula(numbers.of(mode.excitation()));
        }

        @Override
        public Boolean impulse(Mode.Impulse impulse) {
            return row(ModeFormula.impulse(Formulas.number(1), impulse.at()), excitation(), mode.vector());
        }

        @Override
        public Boolean geometric(Mode.Geometric shape) {
            return row(ModeFormula.geometric(Formulas.number(1), shape.power(), numbers.of(shape.base())),
                    excitation(), mode.vector());
        }

        @Override
        public Boolean oscillating(Mode.Oscillating shape) {
            Formula turn = Formulas.overDenominator(numbers.angle(shape.angle()), ModeFormula.kMinus(shape.power()));
            List<Formula> damping = List.of(ModeFormula.binomial(shape.power()),
                    Formulas.power(numbers.of(shape.modulus()), ModeFormula.kMinus(shape.power())));
            row(times(damping, Formulas.call(Formula.Function.COS, turn)), excitation(), mode.vector());
            return row(Formulas.negated(times(damping, Formulas.call(Formula.Function.SIN, turn))), Prose.EMPTY,
                    mode.sine());
        }

        private static Formula times(List<Formula> factors, Formula last) {
            List<Formula> all = new ArrayList<>(factors);
            all.add(last);
            return Formulas.product(all);
        }
    }
}
