package org.pofk.answer;

import java.util.List;
import java.util.Optional;
import java.util.stream.IntStream;
import org.pofk.chain.Chain;
import org.pofk.exact.Rational;
import org.pofk.modes.ClosedForm;
import org.pofk.steps.ClosedFormValues;
import org.pofk.steps.DoubleSteps;
import org.pofk.steps.ExactSteps;
import org.pofk.steps.ModeValues;
import org.pofk.steps.PowerSeries;
import org.pofk.transform.Transform;

/**
 * A closed form held against simulation of the chain it came from. Says what was compared and how far apart the two
 * were; it is a check beside the proof, not the proof.
 *
 * @param exactPowers    against A^k x(0) stepped in exact numbers
 * @param doubleStepping ordinary double-precision stepping against the exact powers
 * @param random         for chains, a random simulation; empty when none was asked for
 */
public record Comparison(ExactPowers exactPowers, DoubleStepping doubleStepping,
        Optional<Simulation.Series> random) {

    /** What stood for the closed form. */
    public enum How {
        /** The partial fractions, summed over the roots of each factor exactly. */
        PARTIAL_FRACTIONS,
        /** Y(z) divided out, where a factor of high degree keeps its coefficient as a quotient. */
        TRANSFORM_DIVIDED_OUT
    }

    /**
     * The closed form against exact powers.
     *
     * @param last              k = 0 … last were compared
     * @param largestDifference exact; zero when all agree
     * @param at                the first k with that difference
     * @param modesWithin       the sum of the modes as enclosures (their bases, angles, phases) lies within this of the
     *                          exact powers at each of these k; proved
     */
    public record ExactPowers(int last, How how, Rational largestDifference, int at, Rational modesWithin) {
    }

    /**
     * Stepping in doubles against exact powers.
     *
     * @param last              k = 0 … last were compared; less than asked for where the doubles overflow
     * @param largestDifference of the exact values of the doubles from the exact powers
     * @param at                the first k with that difference
     */
    public record DoubleStepping(int last, Rational largestDifference, int at) {
    }

    /** One comparison for each closed form, in their order, at k = 0 … last. */
    public static List<Comparison> of(Chain chain, List<ClosedForm> closedForms, int last,
            Optional<Simulation> simulation) {
        ExactSteps exact = ExactSteps.of(chain, closedForms.stream().map(each -> each.transform().output()).toList(),
                last);
        DoubleSteps doubles = DoubleSteps.of(chain, closedForms.stream().map(each -> each.transform().output()).toList(),
                last);
        return IntStream.range(0, closedForms.size()).mapToObj(i -> new Comparison(
                exactPowers(closedForms.get(i), exact.values().get(i)),
                doubleStepping(doubles.values().get(i), exact.values().get(i)),
                simulation.map(each -> each.series().get(i)))).toList();
    }

    private static ExactPowers exactPowers(ClosedForm closedForm, List<Rational> exact) {
        int last = exact.size() - 1;
        boolean reduced = ClosedFormValues.isReduced(closedForm.expansion());
        List<Rational> values = reduced
                ? ClosedFormValues.of(closedForm.expansion(), last)
                : dividedOut(closedForm.transform(), last);
        Difference difference = Difference.largest(values, exact);
        return new ExactPowers(last, reduced ? How.PARTIAL_FRACTIONS : How.TRANSFORM_DIVIDED_OUT, difference.size(),
                difference.at(), ModeValues.of(closedForm).farthestFrom(exact));
    }

    private static DoubleStepping doubleStepping(List<Rational> doubles, List<Rational> exact) {
        Difference difference = Difference.largest(doubles, exact);
        return new DoubleStepping(doubles.size() - 1, difference.size(), difference.at());
    }

    /** The coefficients of z^0, z^(−1), …, z^(−last) of Y(z). */
    private static List<Rational> dividedOut(Transform transform, int last) {
        return PowerSeries.of(transform.y(), last);
    }

    /** The largest difference of two sequences over the steps both have, and the first step it occurs at. */
    private record Difference(Rational size, int at) {
        static Difference largest(List<Rational> found, List<Rational> expected) {
            Difference largest = new Difference(Rational.ZERO, 0);
            for (int k = 0; k < Math.min(found.size(), expected.size()); k++) {
                Rational size = found.get(k).minus(expected.get(k)).abs();
                largest = size.compareTo(largest.size) > 0 ? new Difference(size, k) : largest;
            }
            return largest;
        }
    }
}
