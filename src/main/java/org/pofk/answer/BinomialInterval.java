package org.pofk.answer;

import org.apache.commons.math3.distribution.BetaDistribution;

/**
 * The Clopper–Pearson interval of a chance from hits in independent runs (Clopper and Pearson 1934, Biometrika 26):
 * whatever the chance, it lies in the interval with at least the confidence. Sampled; the ends are quantiles of beta
 * distributions, computed in doubles.
 */
public record BinomialInterval(double lower, double upper) {
    private static final double QUANTILE_WITHIN = 1e-13;

    /**
     * @param hits       of {@code runs}, at least one run
     * @param confidence for example 0.999
     */
    public static BinomialInterval of(long hits, long runs, double confidence) {
        double tail = (1 - confidence) / 2;
        double lower = hits == 0 ? 0 : quantile(hits, runs - hits + 1.0, tail);
        double upper = hits == runs ? 1 : quantile(hits + 1.0, runs - hits, 1 - tail);
        return new BinomialInterval(lower, upper);
    }

    private static double quantile(double alpha, double beta, double probability) {
        return new BetaDistribution(null, alpha, beta, QUANTILE_WITHIN).inverseCumulativeProbability(probability);
    }
}
