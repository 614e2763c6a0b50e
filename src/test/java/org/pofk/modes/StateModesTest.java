package org.pofk.modes;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.pofk.chain.Chain;
import org.pofk.chain.SparseMatrix;
import org.pofk.exact.Ball;
import org.pofk.exact.Factorization.Factor;
import org.pofk.exact.Polynomial;
import org.pofk.exact.Rational;
import org.pofk.exact.RationalField;
import org.pofk.exact.ResidueField;
import org.pofk.formula.PlainText;
import org.pofk.transform.StateTransform;

class StateModesTest {
    private static final int SCALE = 200;

    @Test
    void twoStateChainHasItsStationaryVectorAndItsTransient() {
        // up/down with failure 1/10 and repair 2/5: π = (4/5, 1/5), second eigenvalue 1 − 1/10 − 2/5 = 1/2
        // (Kemeny and Snell, Finite Markov Chains, 1960, section 5.5; from memory)
        Chain chain = Samples.chain(Chain.Kind.CHAIN, List.of(
                List.of(Rational.of(9, 10), Rational.of(2, 5)),
                List.of(Rational.of(1, 10), Rational.of(3, 5))), Samples.unit(2, 0));
        StateModes modes = StateModes.of(chain);
        assertEquals(List.of("4/5 1/5", "1/5 -1/5"), modes.modes().stream().map(StateModesTest::vector).toList());
        assertEquals(List.of("4/5", "1/5"), modes.modes().stream().map(m -> text(m.excitation())).toList());
    }

    @Test
    void startInAnEigenvectorExcitesOneMode() {
        Chain chain = Samples.chain(Chain.Kind.CHAIN, List.of(
                List.of(Rational.of(9, 10), Rational.of(2, 5)),
                List.of(Rational.of(1, 10), Rational.of(3, 5))), List.of(Rational.of(4, 5), Rational.of(1, 5)));
        assertEquals(1, StateModes.of(chain).modes().size());
    }

    @Test
    void ringOfThreeHasExactComponents() {
        // round and round: p of state s is 1 when k ≡ s modulo 3; R of state s is ω^−s/3
        Chain chain = Samples.chain(Chain.Kind.CHAIN, List.of(
                List.of(Rational.ZERO, Rational.ZERO, Rational.ONE),
                List.of(Rational.ONE, Rational.ZERO, Rational.ZERO),
                List.of(Rational.ZERO, Rational.ONE, Rational.ZERO)), Samples.unit(3, 0));
        StateModes.VectorMode pair = StateModes.of(chain).modes().get(1);
        assertEquals("2/3 -1/3 -1/3", vector(pair));
        assertEquals(List.of("0", "-sqrt(3)/3", "sqrt(3)/3"), pair.sine().stream().map(StateModesTest::text).toList());
        assertEquals("2/3", text(pair.excitation()));
    }

    /** Exactly, in Q[λ]/(q): the coefficients of the highest power over all states are an eigenvector of A. */
    @Test
    void vectorsOfTheHighestPowerAreEigenvectors() {
        Random random = new Random(515);
        int vectors = 0;
        int irrational = 0;
        int repeated = 0;
        for (int run = 0; run < 250; run++) {
            Chain chain = run % 2 == 0 ? Samples.randomChain(random, 2 + random.nextInt(4))
                    : Samples.randomRecursion(random);
            StateTransform transform = StateTransform.of(chain);
            List<Expansion<Rational>> states =
                    PartialFractions.ofEach(transform.numerators(), transform.recurrence(), transform.factors());
            for (int part = 0; part < states.get(0).parts().size(); part++) {
                Factor<Rational> factor = states.get(0).parts().get(part).factor();
                ResidueField<Rational> residues = new ResidueField<>(factor.polynomial());
                List<Polynomial<Rational>> vector = new ArrayList<>();
                for (Expansion<Rational> state : states) {
                    vector.add(state.parts().get(part).coefficients().get(factor.multiplicity() - 1).numerator());
                }
                assertTrue(vector.stream().anyMatch(entry -> !entry.isZero()), "no vector for " + factor);
                assertEquals(vector.stream().map(v -> residues.multiply(residues.generator(), v)).toList(),
                        times(chain.matrix(), vector), () -> "A v = λ v fails for " + chain);
                vectors++;
                irrational += factor.polynomial().degree() > 1 ? 1 : 0;
                repeated += factor.multiplicity() > 1 ? 1 : 0;
            }
        }
        assertTrue(vectors > 300 && irrational > 100 && repeated > 30, vectors + " " + irrational + " " + repeated);
    }

    /** Σ vector · mode(k) is x(k) for chains and recursions with repeated and nilpotent parts. */
    @Test
    void modesAddUpToTheState() {
        Random random = new Random(77);
        int oscillating = 0;
        int impulses = 0;
        int powers = 0;
        for (int run = 0; run < 60; run++) {
            Chain chain = run % 2 == 0 ? Samples.randomChain(random, 2 + random.nextInt(3))
                    : Samples.randomRecursion(random);
            StateModes modes = StateModes.of(chain);
            for (StateModes.VectorMode mode : modes.modes()) {
                oscillating += mode.shape() instanceof Mode.Oscillating ? 1 : 0;
                impulses += mode.shape() instanceof Mode.Impulse ? 1 : 0;
                powers += mode.shape() instanceof Mode.Geometric g && g.power() > 0
                        || mode.shape() instanceof Mode.Oscillating o && o.power() > 0 ? 1 : 0;
            }
            List<Rational> x = chain.start();
            for (int k = 0; k <= 5; k++) {
                for (int state = 0; state < chain.size(); state++) {
                    Ball value = Ball.of(0, SCALE);
                    for (StateModes.VectorMode mode : modes.modes()) {
                        value = value.plus(mode.shape().accept(new Contribution(mode, state, k)));
                    }
                    assertTrue(value.minus(Ball.of(x.get(state), SCALE)).abs().upper()
                            .compareTo(Rational.TWO.pow(-100)) < 0, chain + " at " + k);
                }
                x = chain.matrix().times(x);
            }
        }
        assertTrue(oscillating > 15 && impulses > 20 && powers > 10, oscillating + " " + impulses + " " + powers);
    }

    /** What one mode adds to one state at one step. */
    private record Contribution(StateModes.VectorMode mode, int state, int k) implements Mode.Visitor<Ball> {
        @Override
        public Ball impulse(Mode.Impulse impulse) {
            return k == impulse.at() ? ball(mode.vector().get(state)) : Ball.of(0, SCALE);
        }

        @Override
        public Ball geometric(Mode.Geometric shape) {
            return k < shape.power() ? Ball.of(0, SCALE) : ball(mode.vector().get(state))
                    .times(ball(shape.base()).pow(k - shape.power())).times(weight(shape.power()));
        }

        @Override
        public Ball oscillating(Mode.Oscillating shape) {
            if (k < shape.power()) {
                return Ball.of(0, SCALE);
            }
            int n = k - shape.power();
            Ball turn = ball(shape.angle()).times(n);
            Ball joined = ball(mode.vector().get(state)).times(turn.cos())
                    .minus(ball(mode.sine().get(state)).times(turn.sin()));
            return joined.times(ball(shape.modulus()).pow(n)).times(weight(shape.power()));
        }

        private Ball weight(int power) {
            return Ball.of(Expansion.binomial(k, power), SCALE);
        }

        private static Ball ball(RealValue value) {
            return value.enclosure().enclose(SCALE);
        }
    }

    private static List<Polynomial<Rational>> times(SparseMatrix matrix, List<Polynomial<Rational>> vector) {
        List<Polynomial<Rational>> product =
                new ArrayList<>(Collections.nCopies(vector.size(), Polynomial.zero(RationalField.Q)));
        for (int j = 0; j < vector.size(); j++) {
            for (SparseMatrix.Entry entry : matrix.columns().get(j)) {
                product.set(entry.row(), product.get(entry.row()).plus(vector.get(j).times(entry.value())));
            }
        }
        return product;
    }

    private static String vector(StateModes.VectorMode mode) {
        return String.join(" ", mode.vector().stream().map(StateModesTest::text).toList());
    }

    private static String text(RealValue value) {
        return value.exact().map(PlainText.ASCII::write).orElse("none");
    }
}
