package org.pofk.exact;

/**
 * The field of rational numbers. Its polynomials are multiplied, divided and compared after clearing denominators, the
 * large ones by the Rings library. Degree 1,000 with coefficients of 2,000 bits: a product takes 0.2 s, an exact
 * division of twice the degree 3 s, a gcd 0.1 s when it is one and 2.5 s when it is large.
 */
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
    public int bits(Rational a) {
        return a.numerator().bitLength() + a.denominator().bitLength();
    }

    @Override
    public Rational inverse(Rational a) {
        return a.inverse();
    }

    @Override
    public boolean isZero(Rational a) {
        return a.isZero();
    }

    @Override
    public Polynomial<Rational> product(Polynomial<Rational> a, Polynomial<Rational> b) {
        PrimitiveForm first = PrimitiveForm.of(a);
        PrimitiveForm second = PrimitiveForm.of(b);
        return PrimitiveForm.polynomial(first.content().times(second.content()), first.part().times(second.part()));
    }

    @Override
    public Polynomial.Division<Rational> division(Polynomial<Rational> dividend, Polynomial<Rational> divisor) {
        PrimitiveForm first = PrimitiveForm.of(dividend);
        PrimitiveForm second = PrimitiveForm.of(divisor);
        IntegerPolynomial.PseudoDivision division = first.part().pseudoDividedBy(second.part());
        Rational scale = first.content().dividedBy(Rational.of(division.factor()));
        return new Polynomial.Division<>(
                PrimitiveForm.polynomial(scale.dividedBy(second.content()), division.quotient()),
                PrimitiveForm.polynomial(scale, division.remainder()));
    }

    @Override
    public Polynomial<Rational> greatestCommonDivisor(Polynomial<Rational> a, Polynomial<Rational> b) {
        if (a.isZero() || b.isZero()) {
            return PrimitiveForm.monic(PrimitiveForm.partOf(a).greatestCommonDivisor(PrimitiveForm.partOf(b)));
        }
        // A transform has z in common with its recurrence at times, and hardly ever anything else.
        int power = Math.min(a.lowestPower(), b.lowestPower());
        return withoutZero(a.shiftedDown(a.lowestPower()), b.shiftedDown(b.lowestPower())).shiftedUp(power);
    }

    private Polynomial<Rational> withoutZero(Polynomial<Rational> a, Polynomial<Rational> b) {
        return ModularPolynomial.provesCoprime(a, b) ? Polynomial.one(this)
                : PrimitiveForm.monic(PrimitiveForm.partOf(a).greatestCommonDivisor(PrimitiveForm.partOf(b)));
    }

    @Override
    public Polynomial<Rational> inverseModulo(Polynomial<Rational> a, Polynomial<Rational> modulus) {
        PrimitiveForm form = PrimitiveForm.of(a);
        return FractionFreeEuclid.inverse(form.part(), PrimitiveForm.partOf(modulus))
                .orElseThrow(() -> new ArithmeticException("no inverse: a common root with the modulus"))
                .times(form.content().inverse());
    }
}
