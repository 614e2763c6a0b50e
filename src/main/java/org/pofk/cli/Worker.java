package org.pofk.cli;

import java.time.Duration;
import java.util.Optional;
import java.util.concurrent.CompletableFuture;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.TimeUnit;
import java.util.concurrent.TimeoutException;
import java.util.concurrent.atomic.AtomicReference;
import java.util.function.Consumer;
import java.util.function.Function;

/**
 * Work in a thread of its own that publishes what it has proven, so that a limit of time leaves a part of the answer
 * instead of none. The thread is a daemon: what can't be interrupted ends with the process.
 */
final class Worker {
    private static final Duration BETWEEN_WORDS = Duration.ofSeconds(1);
    private static final long STACK = 256L << 20;

    private Worker() {
    }

    /** What was published last, and whether the work came to its end. */
    record Outcome<T>(Optional<T> published, boolean finished) {
    }

    /**
     * Runs the work until it ends or the limit is reached; a failure in it is thrown here.
     *
     * @param soFar what to tell who waits of what is published; may be empty
     */
    static <T> Outcome<T> within(Optional<Duration> limit, Progress progress, Function<T, String> soFar,
            Consumer<Consumer<T>> work) {
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
        try {
            boolean finished = waited(end, limit, elapsed -> progress.told(elapsed, limit,
                    Optional.ofNullable(published.get()).map(soFar).orElse("")));
            return new Outcome<>(Optional.ofNullable(published.get()), finished);
        } finally {
            progress.ended();
        }
    }

    private static boolean waited(CompletableFuture<Void> end, Optional<Duration> limit, Consumer<Duration> told) {
        long begun = System.nanoTime();
        Duration elapsed = Duration.ZERO;
        while (limit.isEmpty() || elapsed.compareTo(limit.get()) < 0) {
            Duration left = limit.orElse(BETWEEN_WORDS).minus(limit.isEmpty() ? Duration.ZERO : elapsed);
            if (ended(end, left.compareTo(BETWEEN_WORDS) < 0 ? left : BETWEEN_WORDS)) {
                return true;
            }
            if (Thread.currentThread().isInterrupted()) {
                return false;
            }
            elapsed = Duration.ofNanos(System.nanoTime() - begun);
            told.accept(elapsed);
        }
        return false;
    }

    private static boolean ended(CompletableFuture<Void> end, Duration limit) {
        try {
            end.get(limit.toNanos(), TimeUnit.NANOSECONDS);
            return true;
        } catch (TimeoutException notYet) {
            return false;
        } catch (InterruptedException interrupted) {
            Thread.currentThread().interrupt();
            return false;
        } catch (ExecutionException failed) {
            throw thrown(failed.getCause());
        }
    }

    /** Throws it again; what work can't declare to throw is a fault of ours. */
    private static AssertionError thrown(Throwable failure) {
        if (failure instanceof Error error) {
            throw error;
        }
        if (failure instanceof RuntimeException exception) {
            throw exception;
        }
        return new AssertionError("work ended with what it can't declare", failure);
    }
}
