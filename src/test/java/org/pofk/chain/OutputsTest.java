package org.pofk.chain;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.pofk.exact.Rational;
import org.pofk.text.Position;
import org.pofk.text.RefusedException;

class OutputsTest {
    private static final Position ASKED = Position.ofWhole("--of");
    private static final Output LOSS = new Output("loss", List.of(Rational.ZERO, Rational.HALF), Rational.ZERO, "down/2");

    private static Chain chain(Map<String, List<Integer>> sets, List<Output> outputs) {
        SparseMatrix matrix = SparseMatrix.ofRows(List.of(List.of(Rational.HALF, Rational.ONE),
                List.of(Rational.HALF, Rational.ZERO)));
        return new Chain(Chain.Kind.CHAIN, List.of("up", "down"), matrix, List.of(Rational.ONE, Rational.ZERO), sets,
                outputs);
    }

    private static List<String> coefficients(List<Output> outputs) {
        return outputs.stream().map(output -> output.name() + output.coefficients()).toList();
    }

    @Test
    void aNameIsAnOutputASetOrAState() throws RefusedException {
        Chain chain = chain(Map.of("any", List.of(0, 1)), List.of(LOSS));
        assertEquals(List.of("loss[0, 1/2]", "any[1, 1]", "down[0, 1]"),
                coefficients(Outputs.named(chain, List.of("loss", "any", "down", "loss"), ASKED)));
    }

    @Test
    void allStandsForEveryStateUnlessSomethingIsCalledAll() throws RefusedException {
        assertEquals(List.of("up[1, 0]", "down[0, 1]"),
                coefficients(Outputs.named(chain(Map.of(), List.of(LOSS)), List.of("all"), ASKED)));
        assertEquals(List.of("all[1, 0]"),
                coefficients(Outputs.named(chain(Map.of("all", List.of(0)), List.of()), List.of("all"), ASKED)));
    }

    @Test
    void withoutNamesTheModelsOutputsOrElseItsStates() {
        assertEquals(List.of(LOSS), Outputs.byDefault(chain(Map.of(), List.of(LOSS))));
        assertEquals(List.of("up[1, 0]", "down[0, 1]"), coefficients(Outputs.byDefault(chain(Map.of(), List.of()))));
    }

    @Test
    void unknownNamesAndNamesForTwoAreAllRefusedAtOnce() {
        Chain chain = chain(Map.of("loss", List.of(1)), List.of(LOSS));
        RefusedException refused = assertThrows(RefusedException.class,
                () -> Outputs.named(chain, List.of("dwon", "loss", "up"), ASKED));
        assertEquals("--of: 'loss' names more than one of outputs, sets and states; give them different names in the "
                + "model\n--of: there is no output, set or state 'dwon'; did you mean 'down'?", refused.getMessage());
    }
}
