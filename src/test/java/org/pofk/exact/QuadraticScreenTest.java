package org.pofk.exact;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;

class QuadraticScreenTest {
    private static final Polynomial<Rational> FOURTH_ROOTS_OF_TWO = Polynomial.ofIntegers(-2, 0, 0, 0, 1);

    /** λ^4 = 2: λ has degree four, λ² is √2. */
    @Test
    void aPowerInAQuadraticFieldIsLetThrough() {
        Polynomial<Rational> generator = Polynomial.ofIntegers(0, 1);
        assertTrue(QuadraticScreen.provesHigherDegree(FOURTH_ROOTS_OF_TWO, generator, 1));
        assertFalse(QuadraticScreen.provesHigherDegree(FOURTH_ROOTS_OF_TWO, generator, 2));
        assertFalse(QuadraticScreen.provesHigherDegree(FOURTH_ROOTS_OF_TWO, generator, 4));
    }

    /** What the minimal polynomial says is never contradicted, and degrees above two are nearly always proved. */
    @Test
    void agreesWithMinimalPolynomials() {
        Random random = new Random(11);
        ResidueField<Rational> field = new ResidueField<>(FOURTH_ROOTS_OF_TWO);
        int proved = 0;
        for (int i = 0; i < 400; i++) {
            List<Rational> coefficients = new ArrayList<>();
            for (int j = 0; j < 4; j++) {
                coefficients.add(Rational.of(random.nextInt(3) - 1, 1 + random.nextInt(4)));
            }
            Polynomial<Rational> element = Polynomial.ofRationals(coefficients);
            boolean higher = field.minimalPolynomial(element).degree() > 2;
            boolean screened = QuadraticScreen.provesHigherDegree(FOURTH_ROOTS_OF_TWO, element, 1);
            assertTrue(higher || !screened, element::toString);
            proved += higher == screened ? 1 : 0;
        }
        assertEquals(400, proved);
    }
}
