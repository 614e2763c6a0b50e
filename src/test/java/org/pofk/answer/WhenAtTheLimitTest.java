package org.pofk.answer;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.pofk.answer.When.Condition;
import org.pofk.answer.When.Condition.Kind;
import org.pofk.answer.When.End;
import org.pofk.answer.When.ResidueClass;
import org.pofk.chain.Chain;
import org.pofk.chain.Output;
import org.pofk.chain.Outputs;
import org.pofk.chain.SparseMatrix;
import org.pofk.exact.Rational;
import org.pofk.longrun.LongRun;
import org.pofk.longrun.LongRunValues;
import org.pofk.modes.ClosedForm;
import org.pofk.steps.ExactSteps;
import org.pofk.transform.Transform;
import org.pofk.transform.Transforms;

/** Bounds that are values of the long run: the side from which p(k) comes decides, on each residue by itself. */
class WhenAtTheLimitTest {
    private static final long SEED = 20_261_204;
    private static final int CHAINS = 60;
    private static final int STEPS = 160;

    @Test
    void theSideOfApproachAgreesWithExactStepsOnEveryResidue() {
        Random random = new Random(SEED);
        Map<End, Integer> seen = new EnumMap<>(End.class);
        for (int i = 0; i < CHAINS; i++) {
            Chain chain = random(random);
            Output output = Outputs.byDefault(chain).get(0);
            Transform transform = Transforms.of(chain, List.of(output)).get(0);
            LongRun longRun = LongRun.of(chain, transform);
            List<Rational> limits = LongRunValues.of(longRun);
            List<Rational> values = ExactSteps.of(chain, List.of(output), STEPS).values().get(0);
            for (Condition condition : List.of(new Condition(Kind.AT_LEAST, limits.get(0)),
                    new Condition(Kind.AT_MOST, limits.get(0)), new Condition(Kind.AT_MOST, Rational.ZERO),
                    new Condition(Kind.SETTLED, Rational.ZERO))) {
                When when = When.of(chain, ClosedForm.of(transform), longRun, condition);
                for (ResidueClass each : when.classes()) {
                    seen.merge(each.end(), 1, Integer::sum);
                    assertAgrees(chain, condition, each, met(condition, values, limits));
                }
            }
        }
        assertTrue(seen.get(End.MET) > 120 && seen.get(End.FAILED) > 120 && seen.get(End.BOTH_FOR_EVER) > 5
                && seen.getOrDefault(End.APPROACH_NOT_DECIDED, 0) < 25, seen::toString);
    }

    private static List<Boolean> met(Condition condition, List<Rational> values, List<Rational> limits) {
        List<Boolean> met = new ArrayList<>();
        for (int k = 0; k < values.size(); k++) {
            Rational limit = limits.get(k % limits.size());
            met.add(condition.around(limit).contains(values.get(k).minus(limit)));
        }
        return met;
    }

    private static void assertAgrees(Chain chain, Condition condition, ResidueClass each, List<Boolean> met) {
        boolean held = false;
        boolean failed = false;
        for (long k = each.residue(); k < met.size(); k += each.modulus()) {
            boolean holds = met.get((int) k);
            String where = chain + " " + condition + " " + each + " at " + k;
            if (each.forEverFrom().isPresent()) {
                long from = each.forEverFrom().get();
                assertTrue(k < from ? k < from - each.modulus() || !holds : holds, where);
            }
            if (each.first().isPresent()) {
                assertTrue(k >= each.first().get() || !holds, where);
                assertTrue(k != each.first().get() || holds, where);
            }
            if (k >= met.size() / 2) {
                held |= holds;
                failed |= !holds;
            }
        }
        switch (each.end()) {
            case MET -> assertEquals(true, held && !failed, chain + " " + condition + " " + each);
            case FAILED -> assertEquals(true, failed && !held, chain + " " + condition + " " + each);
            case BOTH_FOR_EVER -> assertEquals(true, failed && held, chain + " " + condition + " " + each);
            case APPROACH_NOT_DECIDED, TOO_MANY_STEPS -> { }
        }
    }

    /** Two to five states with one to three moves each, in fifths or halves, so that cycles are not rare. */
    private static Chain random(Random random) {
        int n = 2 + random.nextInt(4);
        List<List<SparseMatrix.Entry>> columns = new ArrayList<>();
        List<String> states = new ArrayList<>();
        List<Rational> start = new ArrayList<>();
        for (int j = 0; j < n; j++) {
            int a = random.nextInt(n);
            int b = (a + 1 + random.nextInt(n - 1)) % n;
            Rational share = random.nextInt(3) == 0 ? Rational.ONE : Rational.of(1 + random.nextInt(4), 5);
            List<SparseMatrix.Entry> column = new ArrayList<>(List.of(new SparseMatrix.Entry(a, share)));
            if (!share.equals(Rational.ONE)) {
                column.add(new SparseMatrix.Entry(b, Rational.ONE.minus(share)));
            }
            columns.add(column.stream().sorted((x, y) -> x.row() - y.row()).toList());
            states.add("s" + j);
            start.add(j == 0 ? Rational.ONE : Rational.ZERO);
        }
        return new Chain(Chain.Kind.CHAIN, states, new SparseMatrix(columns), start, Map.of(), List.of());
    }
}
