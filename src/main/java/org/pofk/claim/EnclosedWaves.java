package org.pofk.claim;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.pofk.exact.Ball;
import org.pofk.exact.BinaryPowering;
import org.pofk.exact.ComplexBall;
import org.pofk.exact.LeastCommonMultiple;
import org.pofk.exact.Rational;

/**
 * A sum of waves with all numbers enclosed: its values, and intervals that hold its values over whole ranges of k. In a
 * class of k modulo {@link #classes} the powers of real bases and of roots of unity keep their direction, so that
 * r^k lies between its values at the ends; other pairs are bounded by their moduli. Certified.
 */
final class EnclosedWaves {
    private static final int MOST_CLASSES = 720;
    /** Powers that may be more than some e^64 times each other are bounded each by itself. */
    private static final Rational MOST_APART = Rational.of(64);

    private final List<Line> lines;
    private final int bits;
    private final int classes;

    /** One wave, enclosed, and how it turns. */
    private record Enclosed(ComplexBall coefficient, int power, ComplexBall base, Ball modulus, Turn turn) {
        static Enclosed of(Wave wave, Turn turn, int bits) {
            ComplexBall base = wave.base().enclose(bits).roundedTo(bits);
            Ball one = Ball.of(1, bits);
            return new Enclosed(wave.coefficient().enclose(bits).roundedTo(bits), wave.power(), base,
                    turn.place() == Turn.Place.ON ? one : base.modulus(), turn);
        }

        boolean isSteady() {
            return turn.place() == Turn.Place.ON && power == 0;
        }
    }

    private record Line(Enclosed wave, Optional<Enclosed> nearlyOpposite) {
    }

    private EnclosedWaves(List<Line> lines, int bits) {
        this.lines = List.copyOf(lines);
        this.bits = bits;
        this.classes = classes(lines);
    }

    static EnclosedWaves of(List<TurningStrand> strands, int bits) {
        return new EnclosedWaves(strands.stream().map(strand -> new Line(
                Enclosed.of(strand.strand().wave(), strand.turn(), bits),
                strand.strand().nearlyOpposite().map(wave -> Enclosed.of(wave, strand.turnOfOpposite(), bits))))
                .toList(), bits);
    }

    private static int classes(List<Line> lines) {
        int common = 1;
        for (Line line : lines) {
            for (Enclosed wave : all(line)) {
                int order = Math.max(1, wave.turn.order());
                long next = LeastCommonMultiple.of(common, order);
                common = next > MOST_CLASSES ? common : (int) next;
            }
        }
        return common;
    }

    private static List<Enclosed> all(Line line) {
        List<Enclosed> all = new ArrayList<>(List.of(line.wave));
        line.nearlyOpposite.ifPresent(all::add);
        return all;
    }

    int classes() {
        return classes;
    }

    boolean isEmpty() {
        return lines.isEmpty();
    }

    /** The value at one step. */
    Ball valueAt(long k) {
        Ball sum = Ball.of(0, bits);
        for (Line line : lines) {
            for (Enclosed wave : all(line)) {
                sum = sum.plus(wave.coefficient.times(power(wave.base, k)).real().times(kPower(k, wave.power)));
            }
        }
        return sum;
    }

    private static ComplexBall power(ComplexBall base, long exponent) {
        if (base.imaginary().isExact() && base.imaginary().center().signum() == 0) {
            return ComplexBall.of(Intervals.power(base.real(), exponent));
        }
        return BinaryPowering.of(ComplexBall.of(Ball.of(1, base.scale())), base, exponent, ComplexBall::times);
    }

    private Ball kPower(long k, int power) {
        return power == 0 ? Ball.of(1, 0) : Ball.exact(java.math.BigInteger.valueOf(k).pow(power), 0);
    }

    /** Holds the values at all k ≡ of the class from first to last. */
    Ball over(int residue, long first, long last) {
        Ball sum = Ball.of(0, bits);
        for (Line line : lines) {
            sum = sum.plus(line.nearlyOpposite.isPresent()
                    ? pairOver(line.wave, line.nearlyOpposite.get(), residue, first, last)
                    : over(line.wave, residue, first, last));
        }
        return sum;
    }

    private Ball over(Enclosed wave, int residue, long first, long last) {
        Optional<Ball> direction = direction(wave, residue);
        Ball size = powers(wave, first, last);
        return direction.isPresent()
                ? direction.get().times(size)
                : Intervals.symmetric(wave.coefficient.modulus().times(size));
    }

    /** c̃ λ̃^k − c λ^k is (c̃ − c) λ̃^k + c λ^k ((λ̃/λ)^k − 1); for other pairs |λ̃^k − λ^k| ≤ k |λ̃ − λ| r^(k−1). */
    private Ball pairOver(Enclosed near, Enclosed opposite, int residue, long first, long last) {
        Optional<Ball> ours = direction(near, residue);
        Optional<Ball> theirs = direction(opposite, residue);
        if (ours.isPresent() && theirs.isPresent() && opposite.modulus.isPositive()) {
            Ball ratio = near.modulus.dividedBy(opposite.modulus);
            if (ratio.minus(Ball.of(1, bits)).abs().upper().times(Rational.of(last)).compareTo(MOST_APART) > 0) {
                return apart(near, opposite, residue, first, last);
            }
            Ball growth = Intervals.hull(Intervals.power(ratio, first), Intervals.power(ratio, last))
                    .minus(Ball.of(1, bits));
            return ours.get().plus(theirs.get()).times(powers(near, first, last))
                    .minus(theirs.get().times(powers(opposite, first, last)).times(growth));
        }
        if (first == 0) {
            return apart(near, opposite, residue, first, last);
        }
        Ball larger = Intervals.hull(near.modulus, opposite.modulus);
        Ball rest = near.coefficient.plus(opposite.coefficient).modulus().times(powers(near, first, last));
        Ball distance = near.base.minus(opposite.base).modulus();
        Ball moved = opposite.coefficient.modulus().times(distance).times(kPower(last, near.power + 1))
                .times(Intervals.hull(Intervals.power(larger, first - 1), Intervals.power(larger, last - 1)));
        Ball together = Intervals.symmetric(rest.plus(moved));
        Ball apart = apart(near, opposite, residue, first, last);
        return together.upper().compareTo(apart.abs().upper()) <= 0 ? together : apart;
    }

    private Ball apart(Enclosed near, Enclosed opposite, int residue, long first, long last) {
        return over(near, residue, first, last).plus(over(opposite, residue, first, last));
    }

    /** The real coefficient a wave has in a class of k, before r^k; empty where it has none. */
    private Optional<Ball> direction(Enclosed wave, int residue) {
        int order = wave.turn.order();
        if (order == 0 || classes % order != 0) {
            return Optional.empty();
        }
        return Optional.of(switch (order) {
            case 1 -> wave.coefficient.real();
            case 2 -> residue % 2 == 0 ? wave.coefficient.real() : wave.coefficient.real().negate();
            default -> wave.coefficient.times(power(wave.base, residue % order)).real();
        });
    }

    /** Holds k^power · r^k for all k from first to last. */
    private Ball powers(Enclosed wave, long first, long last) {
        Ball range = wave.isSteady() ? Ball.of(1, bits)
                : Intervals.hull(Intervals.power(wave.modulus, first), Intervals.power(wave.modulus, last));
        return wave.power == 0 ? range
                : range.times(Intervals.hull(kPower(first, wave.power), kPower(last, wave.power)));
    }

    /** Holds the values at all k of the class from first on; empty where that is not bounded, or not from there on. */
    Optional<Ball> beyond(int residue, long first) {
        Ball sum = Ball.of(0, bits);
        for (Line line : lines) {
            for (Enclosed wave : all(line)) {
                Optional<Ball> size = powersBeyond(wave, first);
                if (size.isEmpty()) {
                    return Optional.empty();
                }
                Optional<Ball> direction = direction(wave, residue);
                sum = sum.plus(direction.isPresent() ? direction.get().times(size.get())
                        : Intervals.symmetric(wave.coefficient.modulus().times(size.get())));
            }
        }
        return Optional.of(sum);
    }

    /** From where k^p r^k falls: where (1 + 1/k)^p r ≤ 1. */
    private Optional<Ball> powersBeyond(Enclosed wave, long first) {
        if (wave.isSteady()) {
            return Optional.of(Ball.of(1, bits));
        }
        if (wave.turn.place() != Turn.Place.INSIDE || first == 0 && wave.power > 0) {
            return Optional.empty();
        }
        if (wave.power > 0) {
            Ball step = Ball.of(Rational.of(first + 1, first), bits).pow(wave.power);
            if (!Ball.of(1, bits).minus(step.times(wave.modulus)).isPositive()) {
                return Optional.empty();
            }
        }
        return Optional.of(Intervals.hull(Ball.of(0, bits),
                Intervals.power(wave.modulus, first).times(kPower(first, wave.power))));
    }

    /** What is left in a class as k grows; empty where waves that don't fall have no direction there. */
    Optional<Ball> limit(int residue) {
        Ball sum = Ball.of(0, bits);
        for (Line line : lines) {
            for (Enclosed wave : all(line)) {
                if (wave.turn.place() != Turn.Place.INSIDE) {
                    Optional<Ball> direction = direction(wave, residue);
                    if (!wave.isSteady() || direction.isEmpty()) {
                        return Optional.empty();
                    }
                    sum = sum.plus(direction.get());
                }
            }
        }
        return Optional.of(sum);
    }

    /** Whether some wave that isn't zero surely grows beyond every bound. */
    boolean grows() {
        return lines.stream().flatMap(line -> all(line).stream()).anyMatch(wave ->
                !wave.coefficient.containsZero() && (wave.turn.place() == Turn.Place.OUTSIDE
                        || wave.turn.place() == Turn.Place.ON && wave.power > 0));
    }

    /** The values at k = first, first + 1, …, each found from the one before. */
    Stepping from(long first) {
        return new Stepping(first);
    }

    /** Goes through the steps one by one. */
    final class Stepping {
        private final List<Enclosed> waves = new ArrayList<>();
        private final List<ComplexBall> powers = new ArrayList<>();
        private long k;

        private Stepping(long first) {
            k = first;
            for (Line line : lines) {
                for (Enclosed wave : all(line)) {
                    waves.add(wave);
                    powers.add(power(wave.base, first));
                }
            }
        }

        /** The value at the step reached; then one further. */
        Ball next() {
            Ball sum = Ball.of(0, bits);
            for (int i = 0; i < waves.size(); i++) {
                Enclosed wave = waves.get(i);
                sum = sum.plus(wave.coefficient.times(powers.get(i)).real().times(kPower(k, wave.power)));
                powers.set(i, powers.get(i).times(wave.base));
            }
            k++;
            return sum;
        }
    }
}
