package org.pofk.exact;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;

/** Guesses make roots faster to find and never other roots. */
class GuessedRootsTest {
    private static final int ROOTS = 60;

    /** (z − 1/60) … (z − 60/60): ill-conditioned in its coefficients, known exactly. */
    private static Polynomial<Rational> spaced() {
        Polynomial<Rational> product = Polynomial.ofIntegers(1);
        for (int i = 1; i <= ROOTS; i++) {
            product = product.times(Polynomial.linear(RationalField.Q, Rational.of(i, ROOTS)));
        }
        return product;
    }

    private static void assertFound(Roots roots) {
        assertEquals(ROOTS, roots.all().size());
        for (int i = 0; i < ROOTS; i++) {
            assertTrue(roots.all().get(i).isReal());
            assertTrue(roots.all().get(i).enclose(128).real().contains(Rational.of(ROOTS - i, ROOTS)));
        }
    }

    @Test
    void roughGuessesAmongOthersLeadToTheRoots() {
        Random random = new Random(3);
        List<Guess> guesses = new ArrayList<>();
        for (int i = 1; i <= ROOTS; i++) {
            guesses.add(new Guess((double) i / ROOTS * (1 + 1e-9 * random.nextGaussian()), 0));
        }
        guesses.add(new Guess(0, 0));
        guesses.add(new Guess(-0.4, 0.3));
        guesses.add(new Guess(Double.NaN, 1));
        assertFound(Roots.of(spaced(), () -> guesses));
    }

    @Test
    void wrongGuessesDoNoHarm() {
        List<Guess> guesses = new ArrayList<>();
        for (int i = 1; i <= 2 * ROOTS; i++) {
            guesses.add(new Guess(0.5 + i * 1e-3, i * 1e-2));
        }
        assertFound(Roots.of(spaced(), () -> guesses));
    }
}
