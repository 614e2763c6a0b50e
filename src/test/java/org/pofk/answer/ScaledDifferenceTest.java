package org.pofk.answer;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Random;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.pofk.answer.When.Condition;
import org.pofk.answer.When.Reason;
import org.pofk.chain.Chain;
import org.pofk.chain.Output;
import org.pofk.chain.SparseMatrix;
import org.pofk.exact.Rational;
import org.pofk.longrun.LongRun;
import org.pofk.modes.ClosedForm;
import org.pofk.steps.ExactSteps;
import org.pofk.transform.Transform;
import org.pofk.transform.Transforms;

/** What grows, or recurs without a period, compared with a bound. */
class ScaledDifferenceTest {
    private static final int LAST = 100;
    private static final int ASKED = 120;

    private final Random random = new Random(20_261_201);

    @Test
    void growingRecursionsAreDecidedAsStepsSay() {
        int asked = 0;
        int decided = 0;
        int forEver = 0;
        while (asked < ASKED) {
            Chain chain = recursion(2 + random.nextInt(2));
            Output first = new Output("first", IntStream.range(0, chain.size())
                    .mapToObj(i -> i == 0 ? Rational.ONE : Rational.ZERO).toList(), Rational.ZERO, "first");
            Transform transform = Transforms.of(chain, List.of(first)).get(0);
            LongRun longRun = LongRun.of(chain, transform);
            if (longRun instanceof LongRun.None) {
                asked++;
                Condition condition = new Condition(random.nextBoolean() ? Condition.Kind.AT_LEAST
                        : Condition.Kind.AT_MOST, Rational.of(random.nextInt(41) - 20, 1 + random.nextInt(3)));
                When when = When.of(chain, ClosedForm.of(transform), longRun, condition);
                decided += when.decided() ? 1 : 0;
                forEver += when.reason() == Reason.FOR_EVER ? 1 : 0;
                hold(when, condition, ExactSteps.of(chain, List.of(first), LAST).values().get(0));
            }
        }
        assertTrue(decided >= 110 && forEver >= 15, decided + " decided, " + forEver + " for ever");
    }

    private static void hold(When when, Condition condition, List<Rational> values) {
        List<Boolean> met = values.stream().map(value -> condition.kind() == Condition.Kind.AT_LEAST
                ? value.compareTo(condition.bound()) >= 0 : value.compareTo(condition.bound()) <= 0).toList();
        int first = met.indexOf(true);
        int lastMissed = met.lastIndexOf(false);
        if (when.decided()) {
            assertEquals(first < 0 ? Optional.empty() : Optional.of((long) first), when.first().filter(k -> k <= LAST));
            assertTrue(when.reason() != Reason.FOR_EVER || when.forEverFrom().orElseThrow() == lastMissed + 1L
                    || when.forEverFrom().orElseThrow() > LAST, when + " but last missed at " + lastMissed);
            assertTrue(when.reason() != Reason.NEVER || first < 0, when + " but met at " + first);
        } else {
            assertEquals(Reason.NO_LONG_RUN, when.reason());
        }
    }

    /** Of small entries, so that its poles lie on all sides of the unit circle. */
    private Chain recursion(int size) {
        List<List<Rational>> rows = new ArrayList<>();
        for (int i = 0; i < size; i++) {
            rows.add(IntStream.range(0, size).mapToObj(j -> Rational.of(random.nextInt(9) - 4, 1 + random.nextInt(4)))
                    .toList());
        }
        List<Rational> start = IntStream.range(0, size).mapToObj(i -> Rational.of(random.nextInt(7) - 3)).toList();
        return new Chain(Chain.Kind.RECURSION, IntStream.range(0, size).mapToObj(i -> "s" + i).toList(),
                SparseMatrix.ofRows(rows), start, Map.of(), List.of());
    }
}
