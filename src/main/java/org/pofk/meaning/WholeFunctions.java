package org.pofk.meaning;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.SortedMap;
import java.util.TreeMap;
import org.pofk.exact.Rational;
import org.pofk.formula.ParsedFormula;
import org.pofk.meaning.ExponentialSum.Scope;
import org.pofk.text.Span;

/** delta, binomial and powers of zero: what differs from a formula at single steps. Exact. */
final class WholeFunctions {
    private static final int LARGEST_STEP = 1_000_000;

    private final PolarArithmetic arithmetic;
    private final Scalars scalars;

    WholeFunctions(PolarArithmetic arithmetic, Scalars scalars) {
        this.arithmetic = arithmetic;
        this.scalars = scalars;
    }

    /** One at the step k ≥ 0 where the argument is zero, and zero elsewhere. */
    PolarSum delta(Affine argument, ParsedFormula part) {
        ParsedFormula at = part.parts().get(0);
        return impulse(whole(argument, at), at);
    }

    /** 0^(slope · k + offset): one where the exponent is zero, zero beyond; refused where it is negative at a step. */
    PolarSum powerOfZero(Rational slope, Rational offset, ParsedFormula part) {
        ParsedFormula at = part.parts().get(1);
        if (slope.signum() < 0 || offset.signum() < 0) {
            throw RefusedPart.at(part, "division-by-zero", "divides by zero where the exponent is negative;"
                    + " delta(k-1) is one at k = 1 and zero elsewhere");
        }
        return impulse(whole(new Affine(scalars.rational(slope), scalars.rational(offset)), at), at);
    }

    private PolarSum impulse(Affine.Whole argument, ParsedFormula at) {
        SortedMap<Long, Scalar> impulses = new TreeMap<>();
        long step = -argument.offset() / argument.slope();
        if (step > LARGEST_STEP) {
            throw RefusedPart.at(at, "step-too-late", "is zero at step " + step + ", later than "
                    + LARGEST_STEP);
        }
        if (argument.valueAt(step) == 0 && step >= 0) {
            impulses.put(step, Scalars.of(1));
        }
        return new PolarSum(List.of(), impulses, Scope.ALL);
    }

    private static Affine.Whole whole(Affine argument, ParsedFormula part) {
        return argument.whole().filter(whole -> whole.slope() != 0).orElseThrow(() -> RefusedPart.at(part,
                "argument-not-whole", "isn't a whole number times k plus a whole number, as it must be here"));
    }

    /** n (n − 1) … (n − p + 1)/p! for n = slope · k + offset, and zero at the steps where n is negative. */
    PolarSum binomial(Affine upper, Optional<Scalar> lower, ParsedFormula part) {
        Affine.Whole n = whole(upper, part.parts().get(0));
        int p = lower.flatMap(Scalar::whole).filter(value -> value >= 0).orElseThrow(() -> RefusedPart.at(
                part.parts().get(1), "binomial-argument", "isn't a whole number from 0 on, as the lower number is"));
        if (n.slope() < 0) {
            throw RefusedPart.at(part.parts().get(0), "binomial-argument",
                    "falls as k grows: binomial(n, p) counts for n from 0 on");
        }
        Work.within(p, PolarArithmetic.LARGEST_POWER);
        PolarSum polynomial = fallingProduct(n, p, part.span());
        SortedMap<Long, Scalar> impulses = new TreeMap<>();
        for (long k = 0; n.valueAt(k) < 0; k++) {
            impulses.put(k, scalars.rational(valueBelowZero(n.valueAt(k), p).negate()));
            Work.within(k, PolarArithmetic.MOST_IMPULSES);
        }
        return arithmetic.sum(List.of(polynomial, new PolarSum(List.of(), impulses, Scope.ALL)));
    }

    /** The polynomial n (n − 1) … (n − p + 1)/p! at a whole n. */
    private static Rational valueBelowZero(long n, int p) {
        BigInteger value = BigInteger.ONE;
        for (int i = 1; i <= p; i++) {
            value = value.multiply(BigInteger.valueOf(n - i + 1)).divide(BigInteger.valueOf(i));
        }
        return Rational.of(value);
    }

    private PolarSum fallingProduct(Affine.Whole n, int p, Span span) {
        PolarSum product = polynomial(List.of(Rational.ONE), span);
        for (int i = 0; i < p; i++) {
            product = arithmetic.times(product, polynomial(List.of(Rational.of(n.offset() - i, i + 1L),
                    Rational.of(n.slope(), i + 1L)), span));
        }
        return product;
    }

    /** Highest power first, as one writes it. */
    private PolarSum polynomial(List<Rational> ascending, Span span) {
        List<PolarTerm> terms = new ArrayList<>();
        for (int power = ascending.size() - 1; power >= 0; power--) {
            if (!ascending.get(power).isZero()) {
                terms.add(new PolarTerm(scalars.rational(ascending.get(power)), power, Scalars.of(1), Scalars.of(0),
                        Scalars.of(0), span));
            }
        }
        return PolarSum.of(terms);
    }
}
