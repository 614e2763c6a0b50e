package org.pofk.cli;

import java.io.PrintStream;
import java.time.Duration;
import java.util.Optional;
import java.util.concurrent.CompletableFuture;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.TimeUnit;
import java.util.concurrent.TimeoutException;
import java.util.concurrent.atomic.AtomicReference;
import java.util.function.Consumer;

/**
 * Work in a thread of its own that publishes what it has proven, so that a limit of time leaves a part of the answer
 * instead of none. The thread is a daemon: what can't be interrupted ends with the process.
 */
final class Worker {
    private static final Duration UNTIL_FIRST_WORD = Duration.ofSeconds(5);
    private static final long STACK = 256L << 20;

    private Worker() {
    }

    /** What was published last, and whether the work came to its end. */
    record Outcome<T>(Optional<T> published, boolean finished) {
    }

    /** Runs the work until it ends or the limit is reached; a failure in it is thrown here. */
    static <T> Outcome<T> within(Optional<Duration> limit, PrintStream notes, Consumer<Consumer<T>> work) {
        AtomicReference<T> published = new AtomicReference<>();
        CompletableFuture<Void> end = new CompletableFuture<>();
        Thread thread = new Thread(null, () -> {
            try {
                work.accept(published::set);
                end.complete(null);
            } catch (Throwable failure) { // handed to the waiting thread, which throws it again
                end.completeExceptionally(failure);
            }
        }, "work", STACK);
        thread.setDaemon(true);
        thread.start();
        boolean finished = waited(end, limit, notes);
        return new Outcome<>(Optional.ofNullable(published.get()), finished);
    }

    private static boolean waited(CompletableFuture<Void> end, Optional<Duration> limit, PrintStream notes) {
        Duration first = limit.filter(given -> given.compareTo(UNTIL_FIRST_WORD) < 0).orElse(UNTIL_FIRST_WORD);
        if (ended(end, first)) {
            return true;
        }
        if (limit.isPresent()) {
            return ended(end, limit.get().minus(first));
        }
        notes.println("still at work; Ctrl-C stops it, --budget SECONDS limits it and keeps what is proven");
        notes.flush();
        return ended(end, Duration.ofDays(365_000));
    }

    private static boolean ended(CompletableFuture<Void> end, Duration limit) {
        try {
            end.get(limit.toMillis(), TimeUnit.MILLISECONDS);
            return true;
        } catch (TimeoutException notYet) {
            return false;
        } catch (InterruptedException interrupted) {
            Thread.currentThread().interrupt();
            return false;
        } catch (ExecutionException failed) {
            throw rethrown(failed.getCause());
        }
    }

    private static RuntimeException rethrown(Throwable failure) {
        if (failure instanceof Error error) {
            throw error;
        }
        return (RuntimeException) failure;
    }
}
