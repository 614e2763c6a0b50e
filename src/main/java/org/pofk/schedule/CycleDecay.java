package org.pofk.schedule;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.stream.IntStream;
import org.pofk.chain.Structure;
import org.pofk.chain.Structure.CommunicatingClass;
import org.pofk.exact.Ball;
import org.pofk.exact.Rational;
import org.pofk.steps.BoundedMatrix;

/**
 * By which factor a cycle lessens what is left in states that are left for ever: the largest spectral radius of their
 * classes. That of an irreducible Q ≥ 0 lies between the smallest and the largest (Q v)ᵢ / vᵢ of any v &gt; 0 (Collatz
 * 1942, Wielandt 1950; from memory); v is made by powers of I + Q, which has no other root of that modulus. Certified.
 */
final class CycleDecay {
    private static final int SQUARINGS = 60;
    /** Bits of the numbers v is made with. */
    private static final int KEPT_BITS = 256;
    private static final int RIGHT_BITS = 64;
    /** Below 2^−this a factor counts as told by its bound. */
    private static final int SMALL_BITS = 256;

    private final BoundedMatrix cycle;
    private final List<Integer> members;
    private BigInteger[][] power;

    private CycleDecay(BoundedMatrix cycle, List<Integer> members) {
        this.cycle = cycle;
        this.members = members;
        int size = members.size();
        this.power = new BigInteger[size][size];
        for (int i = 0; i < size; i++) {
            for (int j = 0; j < size; j++) {
                BigInteger entry = cycle.at(members.get(i), members.get(j)).roundedTo(KEPT_BITS).center();
                power[i][j] = i == j ? entry.add(BigInteger.ONE.shiftLeft(KEPT_BITS)) : entry;
            }
        }
    }

    /**
     * @param cycle     Sᵀ
     * @param structure of S
     * @param open      of its states those whose share is asked for
     * @return zero where nothing is left after finitely many cycles; empty where no closer bounds are found
     */
    static Optional<Ball> of(BoundedMatrix cycle, Structure structure, List<Integer> open) {
        Optional<Ball> largest = Optional.of(Ball.of(0, BoundedMatrix.BITS));
        for (CommunicatingClass each : structure.transientClasses()) {
            if (each.reached() && open.containsAll(each.states()) && !each.cyclicClasses().isEmpty()) {
                Optional<Ball> radius = new CycleDecay(cycle, each.states()).radius();
                largest = largest.flatMap(so -> radius.map(found -> larger(so, found)));
            }
        }
        return largest;
    }

    private static Ball larger(Ball a, Ball b) {
        return between(Rational.max(a.lower(), b.lower()), Rational.max(a.upper(), b.upper()));
    }

    private static Ball between(Rational low, Rational high) {
        int bits = BoundedMatrix.BITS;
        return Ball.between(low.times(Rational.TWO.pow(bits)).floor(),
                high.times(Rational.TWO.pow(bits)).floor().add(BigInteger.ONE), bits);
    }

    private Optional<Ball> radius() {
        for (int squarings = 0; squarings <= SQUARINGS; squarings++) {
            Ball ratios = ratios();
            if (isClose(ratios)) {
                return Optional.of(ratios);
            }
            power = squared();
        }
        return Optional.empty();
    }

    private static boolean isClose(Ball ratios) {
        return ratios.radius().shiftLeft(RIGHT_BITS).compareTo(ratios.center()) <= 0
                || ratios.upper().times(Rational.TWO.pow(SMALL_BITS)).compareTo(Rational.ONE) <= 0;
    }

    /** From the smallest to the largest (Q v)ᵢ / vᵢ, v the sums of the rows of the power. */
    private Ball ratios() {
        List<Rational> v = Arrays.stream(power).map(row -> new Rational(Arrays.stream(row)
                .reduce(BigInteger.ONE, BigInteger::add), BigInteger.ONE.shiftLeft(KEPT_BITS))).toList();
        List<Rational> low = new ArrayList<>();
        List<Rational> high = new ArrayList<>();
        for (int i = 0; i < members.size(); i++) {
            int row = i;
            Ball sum = IntStream.range(0, members.size()).mapToObj(j ->
                    cycle.at(members.get(row), members.get(j)).times(Ball.of(v.get(j), BoundedMatrix.BITS)))
                    .reduce(Ball.of(0, BoundedMatrix.BITS), Ball::plus);
            low.add(sum.lower().dividedBy(v.get(i)));
            high.add(sum.upper().dividedBy(v.get(i)));
        }
        return between(low.stream().reduce(Rational::min).orElseThrow(), high.stream().reduce(Rational::max)
                .orElseThrow());
    }

    /** The square to any scale, its largest entry brought to {@value #KEPT_BITS} bits. */
    private BigInteger[][] squared() {
        int size = power.length;
        BigInteger[][] square = new BigInteger[size][size];
        int longest = 0;
        for (int i = 0; i < size; i++) {
            for (int j = 0; j < size; j++) {
                BigInteger sum = BigInteger.ZERO;
                for (int k = 0; k < size; k++) {
                    sum = sum.add(power[i][k].multiply(power[k][j]));
                }
                square[i][j] = sum;
                longest = Math.max(longest, sum.bitLength());
            }
        }
        int shift = longest - KEPT_BITS;
        return Arrays.stream(square).map(row -> Arrays.stream(row).map(each -> each.shiftRight(shift))
                .toArray(BigInteger[]::new)).toArray(BigInteger[][]::new);
    }
}
