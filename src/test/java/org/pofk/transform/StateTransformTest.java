package org.pofk.transform;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.pofk.chain.Chain;
import org.pofk.exact.Polynomial;
import org.pofk.exact.Rational;
import org.pofk.transform.RandomSystems.Shape;

class StateTransformTest {

    @Test
    void recurrenceAnnihilatesTheStartAndNoProperDivisorDoes() {
        RandomSystems systems = new RandomSystems(51);
        int divisors = 0;
        for (int i = 0; i < 600; i++) {
            Chain chain = systems.next(Shape.values()[i % Shape.values().length]);
            StateTransform transform = StateTransform.of(chain);
            assertTrue(isZero(applied(transform.recurrence(), chain)), chain::toString);
            for (var factor : transform.factors().factors()) {
                assertTrue(!isZero(applied(transform.recurrence().dividedExactlyBy(factor.polynomial()), chain)));
                divisors++;
            }
        }
        assertEquals(951, divisors);
    }

    @Test
    void everyComponentTakesTheValuesOfDirectElimination() {
        RandomSystems systems = new RandomSystems(52);
        int compared = 0;
        for (int i = 0; i < 300; i++) {
            Chain chain = systems.next(Shape.values()[i % Shape.values().length]);
            StateTransform transform = StateTransform.of(chain);
            for (int at = 1; at <= 2 * chain.size() + 2; at++) {
                Rational z = Rational.of(1000 * at + 7, 13);
                List<Rational> solution = DirectSolution.stateTransformAt(chain, z);
                for (int state = 0; state < chain.size(); state++) {
                    assertEquals(solution.get(state), z.times(transform.numerators().get(state).valueAt(z))
                            .dividedBy(transform.recurrence().valueAt(z)));
                    compared++;
                }
            }
        }
        assertTrue(compared > 9000, "compared: " + compared);
    }

    private static boolean isZero(List<Rational> vector) {
        return vector.stream().allMatch(Rational::isZero);
    }

    private static List<Rational> applied(Polynomial<Rational> polynomial, Chain chain) {
        List<Rational> value = Collections.nCopies(chain.size(), Rational.ZERO);
        for (int power = polynomial.degree(); power >= 0; power--) {
            List<Rational> product = chain.matrix().times(value);
            List<Rational> sum = new ArrayList<>();
            for (int i = 0; i < chain.size(); i++) {
                sum.add(product.get(i).plus(chain.start().get(i).times(polynomial.coefficient(power))));
            }
            value = sum;
        }
        return value;
    }
}
