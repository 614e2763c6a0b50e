package org.pofk.steps;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.stream.IntStream;
import org.pofk.chain.Chain;
import org.pofk.chain.Output;
import org.pofk.exact.Ball;
import org.pofk.exact.Rational;

/**
 * A probability vector from below: every component is a multiple of 2^−{@value #BITS} that is at most the true one.
 * What the components lack to one is therefore the whole error, known without any estimate. Certified.
 */
public record FixedPointState(List<BigInteger> components) {
    public static final int BITS = 128;
    private static final BigInteger ONE = BigInteger.ONE.shiftLeft(BITS);

    public FixedPointState {
        components = List.copyOf(components);
    }

    /** The largest multiples that are not above the components of a probability vector. */
    public static FixedPointState below(List<Rational> probabilities) {
        return new FixedPointState(probabilities.stream().map(FixedPointState::below).toList());
    }

    /** The states of a chain at the given steps, which ascend. */
    public static List<FixedPointState> at(Chain chain, List<Integer> steps) {
        List<FixedPointColumn> columns = FixedPointColumn.below(chain.matrix());
        FixedPointState state = below(chain.start());
        List<FixedPointState> states = new ArrayList<>();
        int k = 0;
        for (int step : steps) {
            for (; k < step; k++) {
                state = combination(columns, state.components);
            }
            states.add(state);
        }
        return states;
    }

    public static BigInteger below(Rational value) {
        return value.numerator().shiftLeft(BITS).divide(value.denominator());
    }

    /** The largest whole number of 2^−{@value #BITS} that isn't above a value. */
    public static BigInteger floor(Rational value) {
        return value.times(Rational.of(ONE)).floor();
    }

    /** What the components lack to one: the true vector lies within this of them, summed over all states. */
    public BigInteger missing() {
        return ONE.subtract(components.stream().reduce(BigInteger.ZERO, BigInteger::add));
    }

    /** What an output reads in the true state. */
    public Ball reading(Output output) {
        Rational sum = output.constant();
        Rational largest = Rational.ZERO;
        for (int i = 0; i < components.size(); i++) {
            Rational weight = output.coefficients().get(i);
            if (!weight.isZero()) {
                sum = sum.plus(weight.times(new Rational(components.get(i), ONE)));
                largest = Rational.max(largest, weight.abs());
            }
        }
        BigInteger center = below(sum);
        // one unit for rounding the sum, one for rounding the product up
        BigInteger radius = largest.times(Rational.of(missing())).floor().add(BigInteger.TWO);
        return new Ball(center, radius, BITS);
    }

    /** Proved: no component differs by more than this from that of another such vector. False decides nothing. */
    public boolean isWithin(Rational tolerance, FixedPointState other) {
        BigInteger largest = BigInteger.ZERO;
        for (int i = 0; i < components.size(); i++) {
            largest = largest.max(components.get(i).subtract(other.components.get(i)).abs());
        }
        return largest.add(missing().max(other.missing())).compareTo(below(tolerance)) <= 0;
    }

    /** The two true vectors differ by no more than this many 2^−{@value #BITS}, summed over all states. */
    public BigInteger distance(FixedPointState other) {
        BigInteger sum = missing().add(other.missing());
        for (int i = 0; i < components.size(); i++) {
            sum = sum.add(components.get(i).subtract(other.components.get(i)).abs());
        }
        return sum;
    }

    /** All in one state, exactly. */
    public static FixedPointState in(int state, int size) {
        return new FixedPointState(IntStream.range(0, size)
                .mapToObj(i -> i == state ? ONE : BigInteger.ZERO).toList());
    }

    /** The components of Σ column · weight, rounded down. */
    public static FixedPointState combination(List<FixedPointColumn> columns, List<BigInteger> weights) {
        BigInteger[] sums = new BigInteger[weights.size()];
        Arrays.fill(sums, BigInteger.ZERO);
        for (int j = 0; j < columns.size(); j++) {
            BigInteger weight = weights.get(j);
            if (weight.signum() != 0) {
                columns.get(j).addTo(sums, weight);
            }
        }
        List<BigInteger> rounded = new ArrayList<>(sums.length);
        for (BigInteger sum : sums) {
            rounded.add(sum.shiftRight(BITS));
        }
        return new FixedPointState(rounded);
    }
}
