package org.pofk.transform;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.pofk.chain.Chain;
import org.pofk.chain.SparseMatrix;
import org.pofk.chain.Output;
import org.pofk.exact.Polynomial;
import org.pofk.exact.Rational;
import org.pofk.transform.RandomSystems.Shape;

class TransformsTest {

    @Test
    void sequencesSatisfyTheirRecurrenceBeyondEveryComparedStep() {
        RandomSystems systems = new RandomSystems(41);
        Map<Shape, Integer> windows = new EnumMap<>(Shape.class);
        int compared = 0;
        for (int i = 0; i < 5000; i++) {
            Shape shape = Shape.values()[i % Shape.values().length];
            Chain chain = systems.next(shape);
            for (Transform transform : Transforms.of(chain, chain.outputs())) {
                int order = transform.recurrence().degree();
                int beyond = transform.proof().comparedSteps() + 6;
                List<Rational> terms = DirectSolution.terms(chain, transform.output(), beyond);
                for (int k = 0; k + order < beyond; k++) {
                    Rational window = Rational.ZERO;
                    for (int j = 0; j <= order; j++) {
                        window = window.plus(transform.recurrence().coefficient(j).times(terms.get(k + j)));
                    }
                    assertTrue(window.isZero(), () -> shape + " " + chain + " " + transform);
                    windows.merge(shape, 1, Integer::sum);
                }
                compared++;
            }
        }
        assertEquals(Shape.values().length, windows.size());
        assertTrue(compared >= 5000);
        assertTrue(windows.values().stream().allMatch(count -> count > 5000), windows::toString);
    }

    @Test
    void transformsTakeTheValuesOfDirectElimination() {
        RandomSystems systems = new RandomSystems(42);
        int compared = 0;
        for (int i = 0; i < 500; i++) {
            Chain chain = systems.next(Shape.values()[i % Shape.values().length]);
            List<Transform> transforms = Transforms.of(chain, chain.outputs());
            for (Transform transform : transforms) {
                for (int at = 1; at <= 2 * chain.size() + 2; at++) {
                    Rational z = Rational.of(1000 * at + 7, 11);
                    assertEquals(DirectSolution.transformAt(chain, transform.output(), z),
                            transform.y().numerator().valueAt(z).dividedBy(transform.y().denominator().valueAt(z)));
                    compared++;
                }
            }
        }
        assertEquals(9064, compared);
    }

    @Test
    void transformIsInLowestTermsAndItsFactorsMultiplyOut() {
        RandomSystems systems = new RandomSystems(43);
        for (int i = 0; i < 500; i++) {
            Chain chain = systems.next(Shape.values()[i % Shape.values().length]);
            for (Transform transform : Transforms.of(chain, chain.outputs())) {
                Polynomial<Rational> denominator = transform.y().denominator();
                assertEquals(0, transform.y().numerator().greatestCommonDivisor(denominator).degree());
                assertEquals(denominator, transform.factors().expand(denominator.field()));
            }
        }
    }

    // Two states, a goes to b with 1/4, b to a with 1/2; by hand:
    // p_b(k) = (1/3)(1 − (1/4)^k), so Y = (1/3)(z/(z−1) − z/(z−1/4)) = (1/4) z / (z² − (5/4) z + 1/4)
    @Test
    void twoStatesGiveTheTransformWorkedOutByHand() {
        Chain chain = chain(List.of(List.of(Rational.of(3, 4), Rational.HALF), List.of(Rational.of(1, 4), Rational.HALF)));
        Transform transform = Transforms.of(chain, chain.outputs()).get(0);
        assertEquals(Polynomial.ofRationals(List.of(Rational.ZERO, Rational.of(1, 4))), transform.y().numerator());
        assertEquals(Polynomial.ofRationals(List.of(Rational.of(1, 4), Rational.of(-5, 4), Rational.ONE)),
                transform.y().denominator());
    }

    @Test
    void nilpotentRecursionKeepsItsZerosInTheRecurrenceAndLosesOneInTheTransform() {
        // x0 → x1 → gone: y = x0 + x1 is 1, 1, 0, 0, … so D = z² and Y = 1 + 1/z = (z + 1)/z
        Chain chain = new Chain(Chain.Kind.RECURSION, List.of("a", "b"),
                SparseMatrix.ofRows(List.of(List.of(Rational.ZERO, Rational.ZERO), List.of(Rational.ONE, Rational.ZERO))),
                List.of(Rational.ONE, Rational.ZERO), Map.of(),
                List.of(new Output("y", List.of(Rational.ONE, Rational.ONE), Rational.ZERO, "a + b")));
        Transform transform = Transforms.of(chain, chain.outputs()).get(0);
        assertEquals(Polynomial.ofIntegers(0, 0, 1), transform.recurrence());
        assertEquals(new TransferFunction<>(Polynomial.ofIntegers(1, 1), Polynomial.ofIntegers(0, 1)), transform.y());
    }

    @Test
    void outputThatIsZeroForEverIsZeroOverOne() {
        Chain chain = chain(List.of(List.of(Rational.ONE, Rational.HALF), List.of(Rational.ZERO, Rational.HALF)));
        Transform transform = Transforms.of(chain, chain.outputs()).get(0);
        assertTrue(transform.y().numerator().isZero());
        assertEquals(Polynomial.ofIntegers(1), transform.y().denominator());
        assertEquals(0, transform.proof().order());
    }

    /** Starts in the first state, reads the last. */
    private static Chain chain(List<List<Rational>> rows) {
        return new Chain(Chain.Kind.CHAIN, List.of("a", "b"), SparseMatrix.ofRows(rows),
                List.of(Rational.ONE, Rational.ZERO), Map.of(),
                List.of(new Output("b", List.of(Rational.ZERO, Rational.ONE), Rational.ZERO, "b")));
    }
}
