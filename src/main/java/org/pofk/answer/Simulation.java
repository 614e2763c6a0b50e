package org.pofk.answer;

import java.util.ArrayList;
import java.util.List;
import org.pofk.chain.Chain;
import org.pofk.chain.Output;
import org.pofk.chain.Timetable;
import org.pofk.exact.Ball;
import org.pofk.exact.Rational;
import org.pofk.steps.FixedPointState;
import org.pofk.steps.StateArithmetic;

/**
 * A chain run at random many times from a fixed seed, and what the outputs read at chosen steps, each with an interval
 * that holds the true value with {@value #CONFIDENCE_IN_WORDS} confidence per step, not jointly. Sampled.
 *
 * @param seed   of the generator; the same seed, chain, steps and runs give the same result
 * @param runs   how often the chain was run
 * @param series one for each output, in their order
 */
public record Simulation(long seed, int runs, List<Series> series) {
    /** The confidence of each interval, for one step by itself. */
    public static final double CONFIDENCE = 0.999;
    static final String CONFIDENCE_IN_WORDS = "99.9 %";
    /** Where fewer hits than this are expected, a step says nothing. */
    public static final int HITS_NEEDED = 10;

    /** Where the interval comes from. */
    public enum Method {
        /** Clopper and Pearson 1934, for the probability of a set of states. */
        CLOPPER_PEARSON,
        /** Hoeffding, Probability inequalities for sums of bounded random variables, 1963, for the mean of a reading with other coefficients than 0 and 1. */
        HOEFFDING
    }

    /** What a step says about the exact value. */
    public enum Verdict { INSIDE, OUTSIDE, CANT_TELL }

    /**
     * One output at one step.
     *
     * @param exact    the true value, certified
     * @param hits     runs that were in a state the output reads with a coefficient other than zero
     * @param estimate the mean reading over all runs
     * @param verdict  whether the interval holds the exact value; {@code CANT_TELL} where fewer than ten hits are
     *                 expected, which is no check
     */
    public record Sample(int k, Ball exact, long hits, double estimate, BinomialInterval interval, Verdict verdict) {
    }

    /** One output's samples, by ascending step. */
    public record Series(Output output, Method method, List<Sample> samples) {
        public Series {
            samples = List.copyOf(samples);
        }

        /** The steps that are a check. */
        public long checked() {
            return samples.stream().filter(each -> each.verdict != Verdict.CANT_TELL).count();
        }

        public long inside() {
            return samples.stream().filter(each -> each.verdict == Verdict.INSIDE).count();
        }
    }

    public Simulation {
        series = List.copyOf(series);
    }

    /**
     * Runs a chain (not a recursion).
     *
     * @param steps the steps to be read, in any order, none negative
     * @param runs  at least one
     */
    public static Simulation of(Chain chain, List<Output> outputs, List<Integer> steps, int runs, long seed) {
        List<Integer> ascending = steps.stream().distinct().sorted().toList();
        return of(outputs, ascending, StateCounts.of(chain, ascending, runs, seed),
                FixedPointState.at(chain, ascending), runs, seed);
    }

    /** The same of a chain to which a timetable happens; at each step what is read after the actions done there. */
    public static Simulation of(Chain chain, Timetable timetable, List<Output> outputs, List<Integer> steps, int runs,
            long seed) {
        List<Integer> ascending = steps.stream().distinct().sorted().toList();
        StateArithmetic.Fixed fixed = StateArithmetic.Fixed.of(timetable);
        List<FixedPointState> exact = new ArrayList<>();
        FixedPointState state = fixed.start(chain.start());
        int k = 0;
        for (int step : ascending) {
            state = fixed.walked(timetable, state, k, step - k);
            k = step;
            exact.add(state);
        }
        return of(outputs, ascending, StateCounts.of(chain, timetable, ascending, runs, seed), exact, runs, seed);
    }

    private static Simulation of(List<Output> outputs, List<Integer> ascending, StateCounts counts,
            List<FixedPointState> exact, int runs, long seed) {
        List<Series> series = new ArrayList<>();
        for (Output output : outputs) {
            Reading reading = Reading.of(output);
            List<Sample> samples = new ArrayList<>();
            for (int i = 0; i < ascending.size(); i++) {
                samples.add(reading.sample(ascending.get(i), counts.counts().get(i), runs, exact.get(i)));
            }
            series.add(new Series(output, reading.method(), samples));
        }
        return new Simulation(seed, runs, series);
    }

    /** An output with what is needed to judge a sample of it. */
    private record Reading(Output output, Output support, Method method, double least, double most) {

        static Reading of(Output output) {
            List<Rational> weights = output.coefficients();
            boolean isSet = output.constant().isZero()
                    && weights.stream().allMatch(weight -> weight.isZero() || weight.isOne());
            List<Rational> read = weights.stream().map(weight -> weight.isZero() ? weight : Rational.ONE).toList();
            double constant = output.constant().approximate();
            return new Reading(output, new Output(output.name(), read, Rational.ZERO, output.definition()),
                    isSet ? Method.CLOPPER_PEARSON : Method.HOEFFDING,
                    constant + weights.stream().mapToDouble(Rational::approximate).min().orElse(0),
                    constant + weights.stream().mapToDouble(Rational::approximate).max().orElse(0));
        }

        Sample sample(int k, List<Long> counts, int runs, FixedPointState exact) {
            long hits = 0;
            double sum = 0;
            for (int i = 0; i < counts.size(); i++) {
                hits += support.coefficients().get(i).isZero() ? 0 : counts.get(i);
                sum += output.coefficients().get(i).approximate() * counts.get(i);
            }
            double estimate = sum / runs + output.constant().approximate();
            BinomialInterval interval = method == Method.CLOPPER_PEARSON
                    ? BinomialInterval.of(hits, runs, CONFIDENCE)
                    : hoeffding(estimate, runs);
            Ball value = exact.reading(output);
            return new Sample(k, value, hits, estimate, interval, verdict(value, interval, runs, exact));
        }

        private Verdict verdict(Ball value, BinomialInterval interval, int runs, FixedPointState exact) {
            Rational expectedHits = exact.reading(support).upper().times(Rational.of(runs));
            if (expectedHits.compareTo(Rational.of(HITS_NEEDED)) < 0) {
                return Verdict.CANT_TELL;
            }
            return interval.overlaps(value) ? Verdict.INSIDE : Verdict.OUTSIDE;
        }

        /** The mean of independent readings between two bounds, each tail with half of what the confidence leaves. */
        private BinomialInterval hoeffding(double estimate, int runs) {
            double reach = (most - least) * Math.sqrt(Math.log(2 / (1 - CONFIDENCE)) / (2.0 * runs));
            return BinomialInterval.outward(Math.max(least, estimate - reach), Math.min(most, estimate + reach));
        }
    }
}
