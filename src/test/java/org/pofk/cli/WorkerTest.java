package org.pofk.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.OutputStream;
import java.io.PrintStream;
import java.time.Duration;
import java.util.Optional;
import java.util.concurrent.CountDownLatch;
import org.junit.jupiter.api.Test;

class WorkerTest {
    private static final PrintStream NOWHERE = new PrintStream(OutputStream.nullOutputStream());

    @Test
    void whatWasPublishedBeforeTheLimitIsKept() {
        CountDownLatch never = new CountDownLatch(1);
        Worker.Outcome<String> outcome = Worker.within(Optional.of(Duration.ofMillis(300)), NOWHERE, published -> {
            published.accept("first");
            published.accept("second");
            try {
                never.await();
            } catch (InterruptedException interrupted) {
                Thread.currentThread().interrupt();
            }
        });
        assertFalse(outcome.finished());
        assertEquals(Optional.of("second"), outcome.published());
    }

    @Test
    void workThatEndsIsFinished() {
        Worker.Outcome<Integer> outcome =
                Worker.within(Optional.empty(), NOWHERE, published -> published.accept(7));
        assertTrue(outcome.finished());
        assertEquals(Optional.of(7), outcome.published());
    }

    @Test
    void aFailureInTheWorkIsThrownToWhoWaits() {
        AssertionError failure = assertThrows(AssertionError.class, () -> Worker.within(Optional.empty(), NOWHERE,
                published -> {
                    throw new AssertionError("of the work");
                }));
        assertEquals("of the work", failure.getMessage());
    }

    @Test
    void aBudgetThatRunsOutGivesExitCodeFourAndSaysWhatIsOpen() {
        Run run = Run.of("derive", "test-data/models/cable-route.yaml", "--budget", "0.001");
        assertEquals(4, run.exitCode(), run.notes());
        assertTrue(run.answer().isEmpty() || run.answer().contains("not decided"), run.answer());
    }

    @Test
    void aBudgetOfNothingIsNoBudget() {
        assertEquals(2, Run.of("derive", "test-data/models/pump-pair.yaml", "--budget", "0").exitCode());
        assertEquals(2, Run.of("derive", "test-data/models/pump-pair.yaml", "--budget", "-1").exitCode());
    }
}
