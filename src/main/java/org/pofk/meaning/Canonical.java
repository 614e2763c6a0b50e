package org.pofk.meaning;

import java.math.BigInteger;
import java.util.Map;
import java.util.Optional;
import org.pofk.exact.Rational;

/**
 * A quantity worked out in a {@link Tower} over what is irrational in it: square roots of primes, one root of unity,
 * roots of polynomials, roots of what is worked out already. Exact; each part once.
 */
final class Canonical extends Walk<Quotient> {
    private final Same same = new Same();
    private final Turns.Reading turns = new Turns.Reading(same);
    private final Tower tower = new Tower();
    private final Generators generators;

    private Canonical(Quantity quantity) {
        this.generators = new Generators(tower, Unity.order(quantity, turns));
    }

    /**
     * What decides whether a quantity is zero.
     *
     * @param isZero     whether the element is zero in the tower, and so as a number
     * @param value      a number that is zero exactly when the quantity is
     * @param separation b with |value| ≥ 2^−b unless it is zero
     */
    record Form(boolean isZero, Quantity value, long separation) {
    }

    /** Empty where it isn't seen to be algebraic, or is too large to be worked out. */
    static Optional<Form> form(Quantity quantity) {
        try {
            Canonical canonical = new Canonical(quantity);
            Element top = canonical.of(quantity).top().numerator();
            return Optional.of(top.isZero()
                    ? new Form(true, Quantity.ZERO, 0)
                    : new Form(false, canonical.tower.value(top), canonical.tower.separation(top)));
        } catch (BeyondTowerException beyond) {
            return Optional.empty();
        }
    }

    @Override
    public Quotient number(Node.Number number) {
        return Quotient.of(number.value());
    }

    @Override
    public Quotient decimal(Node.Decimal decimal) {
        return Quotient.of(decimal.written().value());
    }

    @Override
    public Quotient root(Node.AtRoot root) {
        return Quotient.of(generators.root(root.root()));
    }

    @Override
    public Quotient constant(Node.Constant constant) {
        if (constant == Node.Constant.PI) {
            throw new BeyondTowerException();
        }
        return Quotient.of(generators.imaginaryUnit());
    }

    @Override
    public Quotient sum(Node.Sum sum) {
        Quotient total = Quotient.ZERO;
        for (Quantity term : sum.terms()) {
            total = total.plus(of(term), tower);
        }
        return total;
    }

    @Override
    public Quotient product(Node.Product product) {
        return of(product.first()).times(of(product.second()), tower);
    }

    @Override
    public Quotient power(Node.Power power) {
        return power(of(power.base()), power.exponent());
    }

    private Quotient power(Quotient base, int exponent) {
        Quotient upright = exponent < 0 ? inverse(base) : base;
        int size = Math.abs(exponent);
        return new Quotient(tower.pow(upright.top(), size), tower.pow(upright.bottom(), size));
    }

    private Quotient inverse(Quotient quotient) {
        return generators.inverse(quotient.top())
                .map(inverse -> Quotient.of(tower.times(quotient.bottom(), inverse)))
                .orElseGet(() -> new Quotient(quotient.bottom(), quotient.top()));
    }

    @Override
    public Quotient radical(Node.Radical radical) {
        return root(of(radical.radicand()), radical.degree(), Quantity.of(radical));
    }

    /** The n-th root y of t/b, with c the denominator of t: s = c·b·y has sⁿ = cⁿ bⁿ⁻¹ t, which is whole. */
    private Quotient root(Quotient radicand, int n, Quantity value) {
        if (n == 2 && radicand.isWhole() && radicand.top().isRational()) {
            return Quotient.of(generators.squareRoot(radicand.top().constant()));
        }
        BigInteger cleared = radicand.top().denominator();
        Element power = tower.times(radicand.top().times(Rational.of(cleared.pow(n))),
                tower.pow(radicand.bottom(), n - 1));
        Element scale = radicand.bottom().times(Rational.of(cleared));
        return new Quotient(generators.radical(power, n, tower.value(scale).times(value)), scale);
    }

    @Override
    public Quotient exponential(Node.Exponential exponential) {
        Turns exponent = turns.of(exponential.exponent()).orElseThrow(BeyondTowerException::new);
        Quotient product = Quotient.of(generators.turn(exponent.pi().imaginary().times(Rational.HALF)));
        for (Map.Entry<Integer, Turns.Gaussian> angle : exponent.angles().entrySet()) {
            product = product.times(rotation((Node.Angle) same.withNumber(angle.getKey()),
                    angle.getValue().imaginary()), tower);
        }
        return product;
    }

    /** e^(i times angle): e^(i arccos x) = x + i √(1 − x²), e^(i arctan x) = (1 + ix)/√(1 + x²), and their powers. */
    private Quotient rotation(Node.Angle angle, Rational times) {
        if (!times.isInteger() || times.numerator().bitLength() > 31) {
            throw new BeyondTowerException();
        }
        Quantity x = angle.argument();
        Quantity square = x.pow(2);
        Quantity rotated = switch (angle.of()) {
            case COSINE -> x.plus(Quantity.i().times(Quantity.ONE.minus(square).squareRoot()));
            case TANGENT -> Quantity.ONE.plus(Quantity.i().times(x))
                    .dividedBy(Quantity.ONE.plus(square).squareRoot());
        };
        return power(of(rotated), times.numerator().intValueExact());
    }

    @Override
    public Quotient logarithm(Node.Logarithm logarithm) {
        throw new BeyondTowerException();
    }

    @Override
    public Quotient angle(Node.Angle angle) {
        throw new BeyondTowerException();
    }

    @Override
    public Quotient conjugate(Node.Conjugate conjugate) {
        return conjugate(of(conjugate.of()));
    }

    private Quotient conjugate(Quotient quotient) {
        return new Quotient(generators.conjugate(quotient.top()), generators.conjugate(quotient.bottom()));
    }

    /** (x + x̄)/2. */
    @Override
    public Quotient realPart(Node.RealPart realPart) {
        Quotient value = of(realPart.of());
        return value.plus(conjugate(value), tower).times(Quotient.of(Rational.HALF), tower);
    }
}
