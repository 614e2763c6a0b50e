package org.pofk.answer;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.pofk.Pofk;
import org.pofk.chain.Chain;
import org.pofk.chain.Output;
import org.pofk.chain.Outputs;
import org.pofk.exact.Rational;
import org.pofk.text.RefusedException;
import org.pofk.transform.Transform;
import org.pofk.transform.Transforms;

class ProofWindowTest {

    @Test
    void aWindowOfEveryPatternAddsUpToZeroOverTheStepsOfTheModel() throws IOException, RefusedException {
        int windows = 0;
        for (String pattern : Files.readAllLines(Path.of("test-data/models/index.txt"))) {
            Chain chain = Pofk.read(Path.of("test-data/models", pattern.strip() + ".yaml")).chain();
            windows += chain.size() > 20 ? 0 : checked(chain, Outputs.byDefault(chain));
        }
        assertTrue(windows >= 30, String.valueOf(windows));
    }

    @Test
    void soDoesOneOfEveryStateOfChainsMadeUp() {
        RandomChains chains = new RandomChains(7);
        int windows = 0;
        for (int i = 0; i < 40; i++) {
            Chain chain = chains.next();
            windows += checked(chain, Outputs.states(chain));
        }
        assertTrue(windows >= 80, String.valueOf(windows));
    }

    private static int checked(Chain chain, List<Output> outputs) {
        int windows = 0;
        for (Transform transform : Transforms.of(chain, outputs)) {
            Optional<ProofWindow> window = ProofWindow.of(chain, transform);
            assertEquals(transform.recurrence().degree() <= 12, window.isPresent());
            if (window.isPresent()) {
                holds(chain, transform, window.get());
                windows++;
            }
        }
        return windows;
    }

    /** By other steps than those it was made with: the state itself, one multiplication after the other. */
    private static void holds(Chain chain, Transform transform, ProofWindow window) {
        int order = transform.recurrence().degree();
        List<Rational> terms = new ArrayList<>();
        List<Rational> state = chain.start();
        for (int k = 0; k <= window.from() + order; k++) {
            if (k >= window.from()) {
                terms.add(transform.output().of(state));
            }
            state = chain.matrix().times(state);
        }
        assertEquals(terms, window.terms());
        Rational sum = Rational.ZERO;
        for (int i = 0; i <= order; i++) {
            assertEquals(transform.recurrence().coefficient(i), window.coefficients().get(i));
            sum = sum.plus(window.coefficients().get(i).times(terms.get(i)));
        }
        assertEquals(Rational.ZERO, sum);
        assertEquals(Rational.ZERO, window.sum());
    }
}
