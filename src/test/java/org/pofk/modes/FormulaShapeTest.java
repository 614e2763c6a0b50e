package org.pofk.modes;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotEquals;

import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.pofk.chain.Model;
import org.pofk.chain.Outputs;
import org.pofk.input.ModelReader;
import org.pofk.input.Overrides;
import org.pofk.input.Source;
import org.pofk.modes.FormulaShape.Kind;
import org.pofk.modes.FormulaShape.Part;
import org.pofk.text.RefusedException;
import org.pofk.transform.Transforms;

/** Formulas without their numbers. */
class FormulaShapeTest {
    private static FormulaShape shape(String moves) throws RefusedException {
        Model model = ModelReader.read(Source.ofText("a.yaml", "pofk: 1\ntitle: Valve (invented)\nstep: 1 h\nstart: up\n"
                + "transitions:\n" + moves.indent(2)), Optional.empty(), Overrides.NONE);
        return FormulaShape.of(ClosedForm.of(Transforms.of(model.chain(), Outputs.byDefault(model.chain())).get(0)));
    }

    @Test
    void otherNumbersKeepTheShape() throws Exception {
        FormulaShape shape = shape("up: {down: 0.1, up: rest}\ndown: {up: 0.3, down: rest}");
        assertEquals(List.of(new Part(Kind.CONSTANT, 0, 1, 1), new Part(Kind.REAL_POWER, 0, 1, 1)), shape.parts());
        assertEquals(shape, shape("up: {down: 0.2, up: rest}\ndown: {up: 1/7, down: rest}"));
    }

    @Test
    void aRepeatedPoleAPairAndAnImpulseAreOtherShapes() throws Exception {
        assertEquals(List.of(new Part(Kind.REAL_POWER, 0, 1, 1)), shape("up: {down: 1/2, up: rest}\ndown: stays").parts());
        FormulaShape pair = shape("up: {worn: 1}\nworn: {down: 1}\ndown: {up: 1/2, down: rest}");
        assertEquals(List.of(new Part(Kind.CONSTANT, 0, 1, 1), new Part(Kind.PAIR, 0, 2, 1)), pair.parts());
        FormulaShape impulse = shape("up: {down: 1}\ndown: stays");
        assertEquals(List.of(new Part(Kind.IMPULSE, 0, 0, 1)), impulse.parts());
        assertNotEquals(pair, impulse);
    }
}
