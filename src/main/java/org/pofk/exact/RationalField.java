package org.pofk.exact;

/** The field of rational numbers. */
public enum RationalField implements Field<Rational> {
    Q;

    @Override
    public Rational zero() {
        return Rational.ZERO;
    }

    @Override
    public Rational one() {
        return Rational.ONE;
    }

    @Override
    public Rational of(Rational value) {
        return value;
    }

    @Override
    public Rational add(Rational a, Rational b) {
        return a.plus(b);
    }

    @Override
    public Rational negate(Rational a) {
        return a.negate();
    }

    @Override
    public Rational multiply(Rational a, Rational b) {
        return a.times(b);
    }

    @Override
    public Rational inverse(Rational a) {
        return a.inverse();
    }

    @Override
    public boolean isZero(Rational a) {
        return a.isZero();
    }
}
