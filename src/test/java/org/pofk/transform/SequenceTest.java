package org.pofk.transform;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.pofk.chain.Chain;
import org.pofk.chain.Output;
import org.pofk.chain.SparseMatrix;
import org.pofk.exact.Ball;
import org.pofk.exact.Rational;
import org.pofk.transform.RandomSystems.Shape;

class SequenceTest {

    @Test
    void everyStepEqualsSteppingThere() {
        RandomSystems systems = new RandomSystems(71);
        int compared = 0;
        for (int i = 0; i < 400; i++) {
            Chain chain = systems.next(Shape.values()[i % Shape.values().length]);
            for (Transform transform : Transforms.of(chain, chain.outputs())) {
                Sequence sequence = Sequence.of(chain, transform);
                List<Rational> terms = DirectSolution.terms(chain, transform.output(), 24);
                for (int k = 0; k < 24; k++) {
                    assertEquals(terms.get(k), sequence.at(k), () -> chain + " " + transform);
                    compared++;
                }
            }
        }
        assertTrue(compared >= 400 * 24, "compared: " + compared);
    }

    // (1/3)(1 − (1/4)^k), worked out by hand from two states with chances 1/4 there and 1/2 back
    @Test
    void millionthStepIsEnclosedAndTheThousandthExact() {
        Chain chain = new Chain(Chain.Kind.CHAIN, List.of("a", "b"), SparseMatrix.ofRows(List.of(
                List.of(Rational.of(3, 4), Rational.HALF), List.of(Rational.of(1, 4), Rational.HALF))),
                List.of(Rational.ONE, Rational.ZERO), Map.of(),
                List.of(new Output("b", List.of(Rational.ZERO, Rational.ONE), Rational.ZERO, "b")));
        Sequence sequence = Sequence.of(chain, Transforms.of(chain, chain.outputs()).get(0));
        assertEquals(Rational.of(1, 3).times(Rational.ONE.minus(Rational.of(1, 4).pow(1000))), sequence.at(1000));
        Ball late = sequence.enclose(1_000_000, 200);
        assertTrue(late.lower().compareTo(Rational.of(1, 3)) <= 0 && late.upper().compareTo(Rational.of(1, 3)) >= 0);
        assertTrue(late.upper().minus(late.lower()).compareTo(Rational.HALF.pow(198)) < 0);
    }
}
