package org.pofk.steps;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.EnumSet;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.pofk.answer.Deriving;
import org.pofk.chain.Model;
import org.pofk.chain.Outputs;
import org.pofk.exact.Ball;
import org.pofk.exact.Rational;
import org.pofk.input.ModelReader;
import org.pofk.input.Overrides;
import org.pofk.input.Source;
import org.pofk.text.RefusedException;

class StepValuesTest {
    private static final String RARE_FAILURE = """
            pofk: 1
            title: Valve
            step: 1 hour
            start: ok
            transitions:
              ok: {fail: 1e-6, ok: rest}
              fail: stays
            outputs: {lost: fail}
            """;

    /** The closed form 1 − (1 − 10⁻⁶)^k is elementary: one transition that never returns. */
    @Test
    void shortFractionsAreExactAndLongOnesCertified() throws RefusedException {
        List<Integer> steps = List.of(0, 1, 499, 8760);
        Rational stays = Rational.of(999_999, 1_000_000);
        List<StepValue> values = values(steps);
        assertEquals(steps, values.stream().map(StepValue::k).toList());
        for (StepValue value : values.subList(0, 3)) {
            assertEquals(Optional.of(Rational.ONE.minus(stays.pow(value.k()))), value.exact());
        }
        StepValue last = values.get(3);
        assertEquals(Optional.empty(), last.exact());
        Ball ball = last.enclosure().enclose(100);
        Rational expected = Rational.ONE.minus(stays.pow(8760));
        assertTrue(ball.lower().compareTo(expected) <= 0 && expected.compareTo(ball.upper()) <= 0);
        assertTrue(ball.upper().minus(ball.lower()).compareTo(Rational.TWO.pow(-90)) < 0);
    }

    private static List<StepValue> values(List<Integer> steps) throws RefusedException {
        Model model = ModelReader.read(Source.ofText("valve.yaml", RARE_FAILURE), Optional.empty(), Overrides.NONE);
        return Deriving.of(model, Outputs.byDefault(model.chain()), steps, EnumSet.noneOf(Deriving.Extra.class),
                published -> { }).outputs().get(0).values();
    }
}
