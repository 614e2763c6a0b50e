package org.pofk.meaning;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.SortedMap;
import java.util.TreeMap;
import org.pofk.exact.Rational;
import org.pofk.meaning.ExponentialSum.Scope;
import org.pofk.text.Span;

/**
 * Sums, products and whole powers of exponential sums, exact. Terms of one shape are taken together; a product of
 * cosines is the sum of two, cos x cos y = (cos(x − y) + cos(x + y))/2; an impulse times a sum is its value there. A
 * product costs the product of the numbers of terms.
 */
final class PolarArithmetic {
    static final int MOST_TERMS = 1_000;
    static final int MOST_IMPULSES = 1_000;
    static final int LARGEST_POWER = 100;

    private final Scalars scalars;

    PolarArithmetic(Scalars scalars) {
        this.scalars = scalars;
    }

    PolarSum sum(List<PolarSum> sums) {
        List<PolarTerm> terms = new ArrayList<>();
        SortedMap<Long, Scalar> impulses = new TreeMap<>();
        Scope scope = Scope.ALL;
        for (PolarSum sum : sums) {
            terms.addAll(sum.terms());
            sum.impulses().forEach((step, value) -> impulses.merge(step, value, scalars::plus));
            scope = scope.and(sum.scope());
        }
        return tidy(terms, impulses, scope);
    }

    private PolarSum tidy(List<PolarTerm> terms, SortedMap<Long, Scalar> impulses, Scope scope) {
        Map<List<Object>, PolarTerm> together = new LinkedHashMap<>();
        terms.forEach(term -> together.merge(term.shape(), term, this::together));
        impulses.values().removeIf(Scalar::isPlainZero);
        Work.within(together.size(), MOST_TERMS);
        Work.within(impulses.size(), MOST_IMPULSES);
        return new PolarSum(together.values().stream().filter(term -> !term.coefficient().isPlainZero()).toList(),
                impulses, scope);
    }

    private PolarTerm together(PolarTerm first, PolarTerm second) {
        return first.with(scalars.plus(first.coefficient(), second.coefficient()))
                .at(hull(first.span(), second.span()));
    }

    /** From the first character of the two to the last. */
    private static Span hull(Span a, Span b) {
        return new Span(a.start().compareTo(b.start()) <= 0 ? a.start() : b.start(),
                a.end().compareTo(b.end()) >= 0 ? a.end() : b.end());
    }

    PolarSum negate(PolarSum a) {
        SortedMap<Long, Scalar> impulses = new TreeMap<>(a.impulses());
        impulses.replaceAll((step, value) -> scalars.negate(value));
        return new PolarSum(a.terms().stream().map(term -> term.with(scalars.negate(term.coefficient()))).toList(),
                impulses, a.scope());
    }

    PolarSum times(PolarSum a, PolarSum b) {
        List<PolarTerm> terms = new ArrayList<>();
        for (PolarTerm left : a.terms()) {
            for (PolarTerm right : b.terms()) {
                terms.addAll(times(left, right, spanOf(a, left, b, right)));
                Work.within(terms.size(), MOST_TERMS * MOST_TERMS);
            }
        }
        SortedMap<Long, Scalar> impulses = new TreeMap<>();
        a.impulses().forEach((step, value) -> impulses.merge(step,
                scalars.times(value, valueAt(b, step)), scalars::plus));
        b.impulses().forEach((step, value) -> impulses.merge(step,
                scalars.times(valueOfTerms(a, step), value), scalars::plus));
        return tidy(uncancelled(terms), impulses, a.scope().and(b.scope()));
    }

    /** Without terms that cancel by being multiplied out, as in (1 − x)(1 + x). */
    private List<PolarTerm> uncancelled(List<PolarTerm> terms) {
        Map<List<Object>, Scalar> totals = new HashMap<>();
        terms.forEach(term -> totals.merge(term.atFaceValue(), term.coefficient(), scalars::plus));
        return terms.stream().filter(term -> !totals.get(term.atFaceValue()).isPlainZero()).toList();
    }

    /** The place of a term that is multiplied out: that of the one among several, of both where both are. */
    private static Span spanOf(PolarSum a, PolarTerm left, PolarSum b, PolarTerm right) {
        if (a.terms().size() == 1) {
            return right.span();
        }
        return b.terms().size() == 1 ? left.span() : hull(left.span(), right.span());
    }

    private List<PolarTerm> times(PolarTerm a, PolarTerm b, Span span) {
        Scalar coefficient = scalars.times(a.coefficient(), b.coefficient());
        int power = Work.within((long) a.power() + b.power(), LARGEST_POWER);
        Scalar base = scalars.times(a.base(), b.base());
        if (a.oscillates() && b.oscillates()) {
            Scalar half = scalars.times(Scalars.of(Rational.HALF), coefficient);
            return List.of(
                    polar(half, power, base, scalars.minus(a.angle(), b.angle()),
                            scalars.minus(a.phase(), b.phase()), span),
                    polar(half, power, base, scalars.plus(a.angle(), b.angle()),
                            scalars.plus(a.phase(), b.phase()), span));
        }
        PolarTerm oscillating = a.oscillates() ? a : b;
        return List.of(new PolarTerm(coefficient, power, base, oscillating.angle(), oscillating.phase(), span));
    }

    /** The term in canonical form: without an angle the cosine is a number. */
    PolarTerm polar(Scalar coefficient, int power, Scalar base, Scalar angle, Scalar phase, Span span) {
        return angle.isPlainZero() && !phase.isPlainZero()
                ? new PolarTerm(scalars.times(coefficient, scalars.cosine(phase)), power, base, angle, Scalars.of(0),
                        span)
                : new PolarTerm(coefficient, power, base, angle, phase, span);
    }

    /** A whole power, not negative; the power 0 is one. */
    PolarSum pow(PolarSum a, int exponent, Span span) {
        if (a.isOneTerm() && !a.terms().get(0).oscillates()) {
            PolarTerm term = a.terms().get(0);
            return PolarSum.of(List.of(new PolarTerm(scalars.pow(term.coefficient(), exponent),
                    Work.within((long) term.power() * exponent, LARGEST_POWER), scalars.pow(term.base(), exponent),
                    term.angle(), term.phase(), term.span())));
        }
        Work.within(exponent, LARGEST_POWER);
        PolarSum result = PolarSum.of(List.of(PolarTerm.constant(Scalars.of(1), span)));
        for (int i = 0; i < exponent; i++) {
            result = times(result, a);
        }
        return result;
    }

    /** 1/a where a is coefficient · base^k, with a coefficient that isn't zero; nothing otherwise. */
    Optional<PolarSum> inverse(PolarSum a) {
        if (!a.isOneTerm() || a.terms().get(0).oscillates() || a.terms().get(0).power() > 0) {
            return Optional.empty();
        }
        PolarTerm term = a.terms().get(0);
        return Optional.of(PolarSum.of(List.of(new PolarTerm(scalars.inverse(term.coefficient()), 0,
                scalars.inverse(term.base()), term.angle(), term.phase(), term.span()))));
    }

    Scalar valueAt(PolarSum a, long k) {
        return scalars.plus(valueOfTerms(a, k), a.impulses().getOrDefault(k, Scalars.of(0)));
    }

    /** The value without the impulses. */
    Scalar valueOfTerms(PolarSum a, long k) {
        Scalar sum = Scalars.of(0);
        for (PolarTerm term : a.terms()) {
            sum = scalars.plus(sum, valueAt(term, Work.within(k, Integer.MAX_VALUE)));
        }
        return sum;
    }

    private Scalar valueAt(PolarTerm term, int k) {
        Scalar powers = scalars.times(scalars.pow(Scalars.of(k), term.power()), scalars.pow(term.base(), k));
        Scalar value = scalars.times(term.coefficient(), powers);
        return term.oscillates() ? scalars.times(value, scalars.cosine(
                scalars.plus(scalars.times(Scalars.of(k), term.angle()), term.phase()))) : value;
    }

    /** The sum as slope · k + offset where it is a polynomial of degree at most one. */
    Optional<Affine> affine(PolarSum a) {
        boolean isAffine = a.hasTermsOnly()
                && a.terms().stream().allMatch(term -> term.isMonomial() && term.power() <= 1);
        return isAffine ? Optional.of(new Affine(coefficient(a, 1), coefficient(a, 0))) : Optional.empty();
    }

    private static Scalar coefficient(PolarSum a, int power) {
        return a.terms().stream().filter(term -> term.power() == power).map(PolarTerm::coefficient).findFirst()
                .orElse(Scalars.of(0));
    }
}
