package org.pofk.meaning;

import java.util.function.Function;
import org.pofk.exact.Ball;
import org.pofk.exact.ComplexBall;

/**
 * A quantity in ball arithmetic with a working precision: 2^−scale is the unit everything is rounded to. Certified, each
 * part once. The main square root beside the negative axis: at face value it is decided whether the radicand is real;
 * spread, both sides of the cut are held.
 */
final class Enclosing extends Walk<ComplexBall> {
    private static final int SUSPECT_SCALE = 1000;

    private final int scale;
    private final Function<Written, Ball> decimals;
    private final Cut cut;

    /** What to do where a radicand may lie on the negative axis. */
    private enum Cut { DECIDED, BOTH_SIDES }

    private Enclosing(int scale, Function<Written, Ball> decimals, Cut cut) {
        this.scale = scale;
        this.decimals = decimals;
        this.cut = cut;
    }

    static ComplexBall atFaceValue(Quantity quantity, int scale) {
        return new Enclosing(scale, written -> Ball.of(written.value(), scale), Cut.DECIDED).of(quantity);
    }

    static ComplexBall spread(Quantity quantity, int scale) {
        return new Enclosing(scale, written -> around(written, scale), Cut.BOTH_SIDES).of(quantity);
    }

    private static Ball around(Written written, int scale) {
        Ball low = Ball.of(written.value().minus(written.halfUnit()), scale);
        Ball high = Ball.of(written.value().plus(written.halfUnit()), scale);
        return Ball.between(low.center().subtract(low.radius()), high.center().add(high.radius()), scale);
    }

    @Override
    public ComplexBall number(Node.Number number) {
        return ComplexBall.of(number.value(), scale);
    }

    @Override
    public ComplexBall decimal(Node.Decimal decimal) {
        return ComplexBall.of(decimals.apply(decimal.written()));
    }

    @Override
    public ComplexBall root(Node.AtRoot root) {
        return root.root().enclose(scale).roundedTo(scale);
    }

    @Override
    public ComplexBall constant(Node.Constant constant) {
        return switch (constant) {
            case PI -> ComplexBall.of(Ball.pi(scale));
            case I -> new ComplexBall(Ball.of(0, scale), Ball.of(1, scale));
        };
    }

    @Override
    public ComplexBall sum(Node.Sum sum) {
        ComplexBall total = ComplexBall.of(Ball.of(0, scale));
        for (Quantity term : sum.terms()) {
            total = total.plus(of(term));
        }
        return total;
    }

    @Override
    public ComplexBall product(Node.Product product) {
        return of(product.first()).times(of(product.second()));
    }

    /** A divisor still not told from zero when precision has been raised is asked whether it is zero. */
    @Override
    public ComplexBall power(Node.Power power) {
        ComplexBall base = of(power.base());
        boolean suspect = power.exponent() < 0 && base.containsZero() && scale > SUSPECT_SCALE
                && cut == Cut.DECIDED;
        if (suspect && power.base().isZero() == Decision.YES) {
            throw new UndecidedException("what a quotient is: its divisor is zero");
        }
        return Powers.of(base, power.exponent());
    }

    @Override
    public ComplexBall radical(Node.Radical radical) {
        ComplexBall radicand = of(radical.radicand());
        if (radical.degree() > 2) {
            return ComplexBall.of(radicand.real().root(radical.degree()));
        }
        boolean besideCut = !radicand.imaginary().isExact() && radicand.imaginary().containsZero()
                && radicand.real().isNegative();
        return besideCut && cut == Cut.DECIDED
                ? MainSquareRoot.besideCut(radicand, radical.radicand().imaginaryPart().isZero())
                : MainSquareRoot.of(radicand);
    }

    @Override
    public ComplexBall exponential(Node.Exponential exponential) {
        ComplexBall exponent = of(exponential.exponent());
        Ball modulus = exponent.real().exp();
        return exponent.imaginary().isExact() && exponent.imaginary().center().signum() == 0
                ? ComplexBall.of(modulus)
                : new ComplexBall(exponent.imaginary().cos(), exponent.imaginary().sin()).times(modulus);
    }

    @Override
    public ComplexBall logarithm(Node.Logarithm logarithm) {
        return ComplexBall.of(of(logarithm.of()).real().log());
    }

    @Override
    public ComplexBall angle(Node.Angle angle) {
        Ball argument = of(angle.argument()).real();
        return ComplexBall.of(switch (angle.of()) {
            case TANGENT -> argument.arctan();
            case COSINE -> argument.arccos();
        });
    }

    @Override
    public ComplexBall conjugate(Node.Conjugate conjugate) {
        return of(conjugate.of()).conjugate();
    }

    @Override
    public ComplexBall realPart(Node.RealPart realPart) {
        return ComplexBall.of(of(realPart.of()).real());
    }
}
