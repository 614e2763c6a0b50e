package org.pofk.answer;

import java.math.BigDecimal;
import org.apache.commons.math3.distribution.BetaDistribution;
import org.pofk.exact.Ball;
import org.pofk.exact.Rational;

/**
 * The Clopper–Pearson interval of a chance from hits in independent runs (Clopper and Pearson 1934, Biometrika 26):
 * whatever the chance, it lies in the interval with at least the confidence. Sampled; the ends are quantiles of beta
 * distributions, computed in doubles and moved outward by more than those are off.
 */
public record BinomialInterval(double lower, double upper) {
    private static final double QUANTILE_WITHIN = 1e-13;
    private static final double ROUNDING = 1e-10;

    /**
     * @param hits       of {@code runs}, at least one run
     * @param confidence for example 0.999
     */
    public static BinomialInterval of(long hits, long runs, double confidence) {
        double tail = (1 - confidence) / 2;
        double lower = hits == 0 ? 0 : quantile(hits, runs - hits + 1.0, tail);
        double upper = hits == runs ? 1 : quantile(hits + 1.0, runs - hits, 1 - tail);
        BinomialInterval wide = outward(lower - QUANTILE_WITHIN, upper + QUANTILE_WITHIN);
        return new BinomialInterval(Math.max(0, wide.lower), Math.min(1, wide.upper));
    }

    /** The interval, wider by what some thousand roundings of doubles come to. */
    static BinomialInterval outward(double lower, double upper) {
        double rounding = ROUNDING * Math.max(Math.abs(lower), Math.abs(upper));
        return new BinomialInterval(lower - rounding, upper + rounding);
    }

    /** Whether the ball reaches into the interval; compared exactly. */
    boolean overlaps(Ball ball) {
        return exactly(lower).compareTo(ball.upper()) <= 0 && ball.lower().compareTo(exactly(upper)) <= 0;
    }

    private static Rational exactly(double end) {
        return Rational.of(new BigDecimal(end));
    }

    private static double quantile(double alpha, double beta, double probability) {
        return new BetaDistribution(null, alpha, beta, QUANTILE_WITHIN).inverseCumulativeProbability(probability);
    }
}
