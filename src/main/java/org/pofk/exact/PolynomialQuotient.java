package org.pofk.exact;

import java.util.Optional;
import java.util.concurrent.atomic.AtomicInteger;
import java.util.concurrent.atomic.AtomicReference;
import java.util.function.Function;

/**
 * N(λ)/D(λ) at many algebraic numbers λ, for example the coefficients of partial fractions N(λ)/D′(λ). Certified; n
 * multiplications a point and precision. Keeps the coefficients at the finest scale asked for so far.
 */
public final class PolynomialQuotient {
    private final Polynomial<Rational> numerator;
    private final Polynomial<Rational> denominator;
    private final AtomicReference<Optional<Pair>> finest = new AtomicReference<>(Optional.empty());

    /** Working bits beyond the goal that some point has needed: the next is likely to need them too. */
    private final AtomicInteger guard = Raising.firstGuard();

    private record Pair(EnclosedPolynomial numerator, EnclosedPolynomial denominator) {
    }

    private PolynomialQuotient(Polynomial<Rational> numerator, Polynomial<Rational> denominator) {
        this.numerator = numerator;
        this.denominator = denominator;
    }

    public static PolynomialQuotient of(Polynomial<Rational> numerator, Polynomial<Rational> denominator) {
        return new PolynomialQuotient(numerator, denominator);
    }

    /** A polynomial alone. */
    public static PolynomialQuotient of(Polynomial<Rational> polynomial) {
        return new PolynomialQuotient(polynomial, Polynomial.one(RationalField.Q));
    }

    /** The value at λ, which the caller knows to be no root of the denominator. Real where λ is an exact real. */
    public EnclosedComplex at(EnclosedComplex point) {
        return new Raising<ComplexBall>(bits -> valueAt(point, bits), ComplexBall::isWithin, guard)::enclose;
    }

    private ComplexBall valueAt(EnclosedComplex point, int bits) {
        Pair pair = atScale(bits);
        ComplexBall z = point.enclose(bits);
        return pair.numerator.valueAt(z).dividedBy(pair.denominator.valueAt(z)).roundedTo(bits);
    }

    /** The value at a real number; see {@link #at(EnclosedComplex)}. */
    public Enclosed at(Enclosed point) {
        return at(EnclosedComplex.of(point)).realPart();
    }

    private Pair atScale(int scale) {
        Function<Polynomial<Rational>, EnclosedPolynomial> enclose = p -> new EnclosedPolynomial(p, scale);
        Optional<Pair> known = finest.get();
        if (known.isPresent() && known.get().numerator.scale() >= scale
                && known.get().numerator.scale() <= scale + scale / 2) {
            return known.get();
        }
        Pair pair = new Pair(enclose.apply(numerator), enclose.apply(denominator));
        if (known.isEmpty() || known.get().numerator.scale() < scale) {
            finest.set(Optional.of(pair));
        }
        return pair;
    }
}
