package org.pofk.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertSame;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.time.Duration;
import java.util.Collections;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.CopyOnWriteArrayList;
import java.util.concurrent.CountDownLatch;
import org.junit.jupiter.api.Test;

class WorkerTest {
    @Test
    void whatWasPublishedBeforeTheLimitIsKept() {
        CountDownLatch never = new CountDownLatch(1);
        Worker.Outcome<String> outcome = Worker.within(Optional.of(Duration.ofMillis(300)), Progress.UNSEEN, Object::toString, published -> {
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
                Worker.within(Optional.empty(), Progress.UNSEEN, Object::toString, published -> published.accept(7));
        assertTrue(outcome.finished());
        assertEquals(Optional.of(7), outcome.published());
    }

    /** As libraries do that hide what they throw from the compiler. */
    @SuppressWarnings("unchecked")
    private static <E extends Throwable> void undeclared(Throwable failure) throws E {
        throw (E) failure;
    }

    @Test
    void whatWorkDoesNotDeclareIsAFaultOfOursWithItsCause() {
        IOException cause = new IOException("not declared");
        AssertionError failure = assertThrows(AssertionError.class, () -> Worker.within(Optional.empty(),
                Progress.UNSEEN, Object::toString, published -> WorkerTest.<RuntimeException>undeclared(cause)));
        assertSame(cause, failure.getCause());
    }

    @Test
    void aFailureInTheWorkIsThrownToWhoWaits() {
        AssertionError failure = assertThrows(AssertionError.class, () -> Worker.within(Optional.empty(), Progress.UNSEEN, Object::toString,
                published -> {
                    throw new AssertionError("of the work");
                }));
        assertEquals("of the work", failure.getMessage());
    }

    /** The work goes on until it has been told twice that it does, however long that takes. */
    @Test
    void whoWaitsIsToldWhatIsPublishedUntilTheWorkEnds() {
        CountDownLatch told = new CountDownLatch(2);
        List<String> heard = new CopyOnWriteArrayList<>();
        Progress progress = new Progress() {
            @Override
            public void told(Duration elapsed, Optional<Duration> limit, String soFar) {
                heard.add(soFar);
                told.countDown();
            }

            @Override
            public void ended() {
                heard.add("ended");
            }
        };
        Worker.Outcome<Integer> outcome = Worker.within(Optional.empty(), progress, count -> count + " of 2", published -> {
            published.accept(1);
            try {
                told.await();
            } catch (InterruptedException interrupted) {
                Thread.currentThread().interrupt();
            }
        });
        assertTrue(outcome.finished());
        int last = heard.size() - 1;
        assertTrue(last >= 2, heard.toString());
        assertEquals(Collections.nCopies(last, "1 of 2"), heard.subList(0, last));
        assertEquals("ended", heard.get(last));
    }

    @Test
    void theLineOfATerminalIsWrittenOverAndGoneAtTheEnd() {
        ByteArrayOutputStream bytes = new ByteArrayOutputStream();
        Progress progress = Progress.onTerminal(new PrintStream(bytes, false, StandardCharsets.UTF_8));
        progress.told(Duration.ofMillis(9_999), Optional.of(Duration.ofSeconds(60)), "2 of 5 outputs");
        progress.told(Duration.ofSeconds(10), Optional.of(Duration.ofSeconds(60)), "");
        progress.ended();
        String first = "at work: 9 s of 60 s, 2 of 5 outputs";
        String second = "at work: 10 s of 60 s";
        assertEquals("\r" + first + "\r" + second + " ".repeat(first.length() - second.length())
                + "\r" + " ".repeat(second.length()) + "\r", bytes.toString(StandardCharsets.UTF_8));
        assertTrue(Progress.line(Duration.ofDays(9), Optional.empty(), "1000 of 1000 outputs").length() < 80);
    }

    @Test
    void workThatIsNotWatchedWritesNothingAndShortWorkNeither() {
        ByteArrayOutputStream bytes = new ByteArrayOutputStream();
        Progress.onTerminal(new PrintStream(bytes)).ended();
        assertEquals(0, bytes.size());
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
