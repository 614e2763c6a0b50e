package org.pofk.answer;

import java.time.Duration;
import java.util.concurrent.CompletableFuture;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.TimeUnit;
import java.util.concurrent.TimeoutException;
import org.pofk.exact.Rational;
import org.pofk.modes.Expansion;
import org.pofk.steps.ClosedFormValues;
import org.pofk.transform.Transform;

/**
 * What another computer algebra system, Symja, says of two steps of a derivation. It can refuse; it never makes a
 * result surer than it was: the proof is elsewhere.
 *
 * @param factors   whether the factors, multiplied out, are the denominator of Y(z)
 * @param expansion whether the partial fractions add up to Y(z)
 */
public record SecondOpinion(Verdict factors, Verdict expansion) {

    /** What it doesn't look at, for the reader. */
    public static final String NOT_CONFIRMED = "not confirmed by it: that Y(z) is the transform of this chain, that the "
            + "factors can't be split further, the decimals, and the exact forms of moduli, angles and phases";

    /** What became of one question. */
    public enum Verdict {
        CONFIRMED,
        REFUSED,
        /** No second opinion within the limit. */
        NOT_WITHIN_LIMIT,
        /** A coefficient is kept as a quotient (factor of high degree); the question isn't put. */
        NOT_ASKED
    }

    /**
     * Asks both questions; the first call loads the system, which takes about a second.
     *
     * @param limit for each of the two questions
     */
    public static SecondOpinion of(Transform transform, Expansion<Rational> expansion, Duration limit) {
        Verdict factors = within(limit, () -> SymjaQuestions.factorsMultiplyOut(transform.factors(),
                transform.y().denominator()));
        Verdict expansions = ClosedFormValues.isReduced(expansion)
                ? within(limit, () -> SymjaQuestions.addsUp(expansion, transform.y()))
                : Verdict.NOT_ASKED;
        return new SecondOpinion(factors, expansions);
    }

    @FunctionalInterface
    private interface Question {
        boolean ask();
    }

    /** The work can't be interrupted, so it runs in a thread that doesn't keep the program from ending. */
    private static Verdict within(Duration limit, Question question) {
        CompletableFuture<Boolean> answer = new CompletableFuture<>();
        Thread thread = new Thread(() -> {
            try {
                answer.complete(question.ask());
            } catch (RuntimeException | StackOverflowError | LinkageError failure) {
                answer.completeExceptionally(failure);
            }
        }, "second opinion");
        thread.setDaemon(true);
        thread.start();
        try {
            return answer.get(limit.toMillis(), TimeUnit.MILLISECONDS) ? Verdict.CONFIRMED : Verdict.REFUSED;
        } catch (TimeoutException late) {
            return Verdict.NOT_WITHIN_LIMIT;
        } catch (InterruptedException interrupted) {
            Thread.currentThread().interrupt();
            return Verdict.NOT_WITHIN_LIMIT;
        } catch (ExecutionException failure) {
            throw new AssertionError("the second opinion failed on a question of ours", failure.getCause());
        }
    }
}
