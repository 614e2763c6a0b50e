package org.pofk.meaning;

import java.math.BigInteger;
import java.util.Optional;
import org.pofk.exact.LeastCommonMultiple;
import org.pofk.exact.Rational;

/**
 * The least common order of the roots of unity a quantity is written with: that of e^(iπ p/q) divides 2q, that of i
 * is 4. Exact; each part once.
 */
final class Unity extends Walk<BigInteger> {
    private static final BigInteger FOUR = BigInteger.valueOf(4);
    private final Turns.Reading turns;

    private Unity(Turns.Reading turns) {
        this.turns = turns;
    }

    static BigInteger order(Quantity quantity, Turns.Reading turns) {
        return new Unity(turns).of(quantity);
    }

    private BigInteger ofParts(Iterable<Quantity> parts) {
        BigInteger order = BigInteger.ONE;
        for (Quantity part : parts) {
            order = LeastCommonMultiple.of(order, of(part));
        }
        return order;
    }

    @Override
    public BigInteger number(Node.Number number) {
        return BigInteger.ONE;
    }

    @Override
    public BigInteger decimal(Node.Decimal decimal) {
        return BigInteger.ONE;
    }

    /** The roots of a quadratic polynomial are written with i where they aren't real. */
    @Override
    public BigInteger root(Node.AtRoot root) {
        return root.root().isReal() || root.root().polynomial().degree() > 2 ? BigInteger.ONE : FOUR;
    }

    @Override
    public BigInteger constant(Node.Constant constant) {
        return constant == Node.Constant.I ? FOUR : BigInteger.ONE;
    }

    @Override
    public BigInteger sum(Node.Sum sum) {
        return ofParts(sum.terms());
    }

    @Override
    public BigInteger product(Node.Product product) {
        return LeastCommonMultiple.of(of(product.first()), of(product.second()));
    }

    @Override
    public BigInteger power(Node.Power power) {
        return of(power.base());
    }

    @Override
    public BigInteger radical(Node.Radical radical) {
        return of(radical.radicand());
    }

    @Override
    public BigInteger exponential(Node.Exponential exponential) {
        Optional<Turns> exponent = turns.of(exponential.exponent()).filter(Turns::isRotation);
        if (exponent.isEmpty()) {
            throw new BeyondTowerException();
        }
        Rational halfTurns = exponent.get().pi().imaginary();
        BigInteger order = halfTurns.times(Rational.HALF).denominator();
        return exponent.get().angles().isEmpty() ? order : LeastCommonMultiple.of(order, FOUR);
    }

    @Override
    public BigInteger logarithm(Node.Logarithm logarithm) {
        throw new BeyondTowerException();
    }

    @Override
    public BigInteger angle(Node.Angle angle) {
        throw new BeyondTowerException();
    }

    @Override
    public BigInteger conjugate(Node.Conjugate conjugate) {
        return of(conjugate.of());
    }

    @Override
    public BigInteger realPart(Node.RealPart realPart) {
        return of(realPart.of());
    }
}
