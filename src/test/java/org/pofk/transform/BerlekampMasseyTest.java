package org.pofk.transform;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Random;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;

class BerlekampMasseyTest {
    private static final PrimeField FIELD = PrimeField.of(2147483629L);

    @Test
    void zeroSequenceHasTheRecurrenceOne() {
        assertArrayEquals(new long[] {1}, of(0, 0, 0, 0).recurrence());
    }

    @Test
    void impulseNeedsPowersOfZ() {
        // 0, 0, 1, 0, 0, 0: only z³ annihilates it from the start on; the connection polynomial is 1, the order 3
        assertArrayEquals(new long[] {0, 0, 0, 1}, of(0, 0, 1, 0, 0, 0).recurrence());
        // numerator of z^−3 = 1/z³
        assertArrayEquals(new long[] {1, 0, 0}, of(0, 0, 1, 0, 0, 0).numerator());
    }

    @Test
    void impulseBeforeAGeometricSequenceKeepsOneZ() {
        // 5, 2, 4, 8, 16, …: z² − 2z
        assertArrayEquals(new long[] {0, FIELD.prime() - 2, 1}, of(5, 2, 4, 8, 16, 32).recurrence());
    }

    @Test
    void fibonacciNumbersFollowZSquaredMinusZMinusOne() {
        long minusOne = FIELD.prime() - 1;
        assertArrayEquals(new long[] {minusOne, minusOne, 1}, of(0, 1, 1, 2, 3, 5, 8, 13).recurrence());
    }

    @Test
    void everyRandomRecurrenceIsFoundAgainOrAShorterOneThatFits() {
        Random random = new Random(91);
        int same = 0;
        for (int i = 0; i < 2000; i++) {
            int order = 1 + random.nextInt(9);
            int zeros = random.nextInt(order + 1);
            long[] recurrence = new long[order + 1];
            recurrence[order] = 1;
            for (int power = zeros; power < order; power++) {
                recurrence[power] = random.nextInt(5);
            }
            long[] terms = new long[3 * order];
            for (int k = 0; k < terms.length; k++) {
                terms[k] = k < order ? random.nextInt(3) : next(recurrence, terms, k);
            }
            BerlekampMassey found = of(terms);
            assertTrue(found.order() <= order);
            long[] shortest = found.recurrence();
            for (int k = shortest.length - 1; k < terms.length; k++) {
                assertEquals(terms[k], next(shortest, terms, k));
            }
            same += found.order() == order ? 1 : 0;
        }
        assertTrue(same > 1000, "same: " + same);
    }

    @Test
    void fourPrimesTogetherSayWhatEachSaysAlone() {
        LinearSystem system = ScaledSystem.of(Reduction.of(RandomSystems.sparseChain(4, 70, 6),
                RandomSystems.sparseChain(4, 70, 6).outputs()).reduced()).system();
        SystemResidues residues = new SystemResidues(system);
        List<ModularSystem> systems = Stream.iterate(PrimeField.below(1L << 31),
                        field -> PrimeField.below(field.prime())).limit(4)
                .map(residues::modulo).toList();
        ModularLanes lanes = ModularLanes.of(systems).orElseThrow();
        for (int order : new int[] {70, 40}) {
            for (int lane = 0; lane < 4; lane++) {
                ModularRecurrence alone = systems.get(lane).recurrences().get(0);
                ModularRecurrence together = lanes.recurrences(order).get(lane).get(0);
                assertEquals(70, alone.order());
                for (int power = 0; power < 70; power++) {
                    assertEquals(alone.denominator(power), together.denominator(power));
                    assertEquals(alone.numerator(0, power), together.numerator(0, power));
                }
            }
        }
    }

    private static long next(long[] recurrence, long[] terms, int k) {
        int order = recurrence.length - 1;
        long sum = 0;
        for (int i = 0; i < order; i++) {
            sum = FIELD.subtract(sum, FIELD.multiply(recurrence[i], terms[k - order + i]));
        }
        return sum;
    }

    private static BerlekampMassey of(long... terms) {
        BerlekampMassey found = new BerlekampMassey(FIELD);
        for (long term : terms) {
            found.accept(term);
        }
        return found;
    }
}
