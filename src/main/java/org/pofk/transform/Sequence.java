package org.pofk.transform;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.stream.IntStream;
import org.pofk.chain.Chain;
import org.pofk.exact.Ball;
import org.pofk.exact.CommonDenominator;
import org.pofk.exact.Polynomial;
import org.pofk.exact.Rational;

/**
 * y(k) of one output for any k, exactly: the k-th coefficient of P(t)/Q(t), Q the recurrence turned round, found by
 * halving k with Q(t) Q(−t) (Bostan and Mori 2021, from memory; the idea of Fiduccia 1985). In whole numbers
 * throughout: y(k) = whole(k) / (weight · unitᵏ). Cost: log k products of polynomials of degree d, the last ones with
 * numbers of k · log unit bits, so a small recurrence at a million steps is a matter of seconds.
 */
public final class Sequence {
    private final List<BigInteger> numerator;
    private final List<BigInteger> denominator;
    private final BigInteger unit;
    private final BigInteger weight;

    private Sequence(List<BigInteger> numerator, List<BigInteger> denominator, BigInteger unit, BigInteger weight) {
        this.numerator = numerator;
        this.denominator = denominator;
        this.unit = unit;
        this.weight = weight;
    }

    /** The values of a transform of the chain. */
    public static Sequence of(Chain chain, Transform transform) {
        return of(transform.recurrence(), transform.y(), chain.matrix().commonDenominator());
    }

    /** The values of a sequence known by its transform alone. */
    public static Sequence of(Transform transform) {
        return of(transform.recurrence(), transform.y(),
                CommonDenominator.of(transform.recurrence().coefficients()));
    }

    /** @param unit makes the coefficient of t^i in Q whole when multiplied by its i-th power */
    private static Sequence of(Polynomial<Rational> recurrence, TransferFunction<Rational> y, BigInteger unit) {
        // Y = z P/D was only ever cancelled by a power of z; P/D needs it back.
        int cancelled = recurrence.degree() - y.denominator().degree();
        Polynomial<Rational> p = y.numerator().shiftedUp(cancelled)
                .shiftedDown(y.numerator().isZero() ? 0 : 1);
        int degree = recurrence.degree();
        List<Rational> turned = IntStream.rangeClosed(0, degree).mapToObj(i ->
                recurrence.coefficient(degree - i).times(Rational.of(unit.pow(i)))).toList();
        List<Rational> first = IntStream.range(0, degree).mapToObj(i ->
                p.coefficient(degree - 1 - i).times(Rational.of(unit.pow(i)))).toList();
        BigInteger weight = CommonDenominator.of(first);
        BigInteger common = CommonDenominator.of(turned);
        return new Sequence(whole(first, weight.multiply(common)), whole(turned, common), unit, weight);
    }

    private static List<BigInteger> whole(List<Rational> values, BigInteger scale) {
        return values.stream().map(value -> value.times(Rational.of(scale)).numerator()).toList();
    }

    /** y(k) in lowest terms; the common factor it takes out costs the square of k · log unit. */
    public Rational at(long k) {
        Unreduced value = unreduced(k);
        return new Rational(value.numerator, value.denominator);
    }

    /** Whether y(k) is this number, without taking out the common factor. */
    public boolean isAt(long k, Rational value) {
        Unreduced here = unreduced(k);
        return here.numerator.multiply(value.denominator()).equals(here.denominator.multiply(value.numerator()));
    }

    /** y(k) within 2^−scale of the ball's centre, for steps whose exact fraction would take too long to reduce. */
    public Ball enclose(long k, int scale) {
        Unreduced value = unreduced(k);
        return new Ball(value.numerator.shiftLeft(scale).divide(value.denominator), BigInteger.ONE, scale);
    }

    private record Unreduced(BigInteger numerator, BigInteger denominator) {
    }

    private Unreduced unreduced(long k) {
        if (k < 0) {
            throw new IllegalArgumentException("no step " + k);
        }
        if (numerator.isEmpty()) {
            return new Unreduced(BigInteger.ZERO, BigInteger.ONE);
        }
        List<BigInteger> p = numerator;
        List<BigInteger> q = denominator;
        for (long left = k; left > 0; left >>= 1) {
            List<BigInteger> mirrored = mirrored(q);
            p = everySecond(product(p, mirrored), (int) (left & 1));
            q = everySecond(product(q, mirrored), 0);
        }
        return new Unreduced(p.get(0), q.get(0).multiply(weight).multiply(unit.pow(Math.toIntExact(k))));
    }

    /** Q(−t). */
    private static List<BigInteger> mirrored(List<BigInteger> q) {
        return IntStream.range(0, q.size()).mapToObj(i -> i % 2 == 0 ? q.get(i) : q.get(i).negate()).toList();
    }

    private static List<BigInteger> everySecond(List<BigInteger> all, int from) {
        List<BigInteger> chosen = new ArrayList<>();
        for (int i = from; i < all.size(); i += 2) {
            chosen.add(all.get(i));
        }
        return chosen.isEmpty() ? List.of(BigInteger.ZERO) : chosen;
    }

    private static List<BigInteger> product(List<BigInteger> a, List<BigInteger> b) {
        BigInteger[] product = new BigInteger[a.size() + b.size() - 1];
        Arrays.fill(product, BigInteger.ZERO);
        for (int i = 0; i < a.size(); i++) {
            if (a.get(i).signum() != 0) {
                for (int j = 0; j < b.size(); j++) {
                    product[i + j] = product[i + j].add(a.get(i).multiply(b.get(j)));
                }
            }
        }
        return List.of(product);
    }
}
