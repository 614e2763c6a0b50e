package org.pofk.check;

import static org.junit.jupiter.api.Assertions.assertAll;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Collections;
import java.util.EnumSet;
import java.util.List;
import java.util.Random;
import java.util.Set;
import java.util.concurrent.Callable;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.pofk.slip.SlipKind;

/**
 * How reliable the check is, measured: right derivations of every published case and pattern, written in many
 * notations, and the same with slips put into their text. What is counted as wrong is proven wrong by arithmetic of
 * these tests' own; what can't be told from a rounding isn't counted.
 */
class CheckMeasurementTest {
    private static final long SEED = 20_261_201L;
    /** Slips that few models have a place for; their claims are always taken. */
    private static final Set<SlipKind> RARE = EnumSet.of(SlipKind.JOINT_FOR_CONDITIONAL, SlipKind.NEVER_IS_AVERAGED,
            SlipKind.TIME_FOR_STEPS, SlipKind.POWER_FOR_BINOMIAL);

    /** All right claims of a round, and one in forty of the wrong ones. */
    @Test
    void rightClaimsPassAndSlipsAreNamed() {
        Measurement measurement = measured(1, 10, 40);
        measurement.write(Path.of("target", "check-measurement.txt"));
        require(measurement, 5_000);
    }

    /** One in six of the wrong ones, so that every kind of slip is among them. */
    @Test
    @Tag("soak")
    void everyKindOfSlipIsNamed() {
        Measurement measurement = measured(1, 10, 6);
        measurement.write(Path.of("target", "check-measurement-kinds.txt"));
        requireAll(measurement, 5_000);
    }

    /** The claims of the gate take no more than a minute for five thousand of them. */
    @Test
    @Tag("soak")
    void fiveThousandClaimsTakeAMinute() {
        long begun = System.nanoTime();
        Measurement measurement = measured(1, 10, 40);
        long seconds = (System.nanoTime() - begun) / 1_000_000_000L;
        assertTrue(seconds * 5_000 <= measurement.claims() * 60L, () -> seconds + " seconds for "
                + measurement.claims() + " claims");
    }

    /** All wrong claims, twice over, with other choices each time. */
    @Test
    @Tag("soak")
    void rightClaimsPassAndSlipsAreNamedTwiceOver() {
        int rounds = 2;
        Measurement measurement = measured(rounds, 19, 1);
        measurement.write(Path.of("target", "check-measurement-soak.txt"));
        requireAll(measurement, rounds * 5_000);
    }

    /** One claim in so many of the wrong ones; what is misread in the models of these tests is always taken. */
    static void measure(Subject subject, int formulas, int oneIn, Random random, Measurement measurement) {
        measurement.addRight(RightClaims.of(subject, formulas, random));
        measurement.addRight(AnswerClaims.right(subject, random));
        List<Claimed> slips = new ArrayList<>(WrongClaims.of(subject, random));
        slips.addAll(WrongClaims.twice(subject, random));
        slips.addAll(AnswerClaims.wrong(subject, random));
        slips.addAll(OtherSlips.of(subject, random));
        slips.addAll(WrongClaims.approximations(subject, random));
        sampled(slips, oneIn, random).forEach(measurement::addWrong);
        List<Claimed> misread = Misreadings.of(subject, random);
        boolean isOwn = subject.file().toString().contains("resources");
        sampled(misread, isOwn ? 1 : oneIn, random).forEach(measurement::addWrong);
    }

    private static List<Claimed> sampled(List<Claimed> claims, int oneIn, Random random) {
        Collections.shuffle(claims, random);
        int taken = (claims.size() + oneIn - 1) / oneIn;
        List<Claimed> sampled = new ArrayList<>(claims.subList(0, taken));
        claims.subList(taken, claims.size()).stream().filter(claim -> claim.injected().stream().anyMatch(RARE::contains))
                .forEach(sampled::add);
        return sampled;
    }

    /** Every model by itself, as many at a time as there are processors; put together in the order of the models. */
    private static Measurement measured(int rounds, int formulas, int oneIn) {
        ExecutorService processors = Executors.newFixedThreadPool(Runtime.getRuntime().availableProcessors());
        try {
            List<Callable<Measurement>> tasks = new ArrayList<>();
            for (int round = 0; round < rounds; round++) {
                long seed = SEED + 1_000L * round;
                Subject.all().forEach(subject -> tasks.add(() -> measured(subject, seed, formulas, oneIn)));
            }
            Measurement all = new Measurement();
            for (Future<Measurement> one : processors.invokeAll(tasks)) {
                all.add(one.get());
            }
            return all;
        } catch (InterruptedException | ExecutionException e) {
            throw new AssertionError(e);
        } finally {
            processors.shutdownNow();
        }
    }

    private static Measurement measured(Subject subject, long seed, int formulas, int oneIn) {
        Measurement measurement = new Measurement();
        measure(subject, formulas, oneIn, new Random(seed + subject.toString().hashCode()), measurement);
        return measurement;
    }

    private static void requireAll(Measurement measured, int claims) {
        assertEquals(SlipKind.values().length, measured.kinds(), () -> "kinds of slip\n" + measured.summary());
        require(measured, claims);
    }

    private static void require(Measurement measured, int claims) {
        String figures = "\n" + measured.summary();
        assertAll(
                () -> assertTrue(measured.claims() >= claims, () -> measured.claims() + " claims" + figures),
                () -> assertEquals(0, measured.faults(), () -> "faults of the tool" + figures),
                () -> assertEquals(0, measured.falseAlarms(), () -> "right claims not passed" + figures),
                () -> assertEquals(0, measured.passed(), () -> "wrong claims passed" + figures),
                () -> assertTrue(measured.namedFirstShare() >= 95, () -> "named first" + figures),
                () -> assertTrue(measured.namedShare() >= 99, () -> "named" + figures),
                () -> assertTrue(measured.uncountedShare() <= 10, () -> "edits not counted" + figures));
    }
}
