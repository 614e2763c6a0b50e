package org.pofk.check;

import java.math.BigDecimal;
import java.util.Optional;
import org.pofk.exact.Rational;

/** A complex number by modulus and angle, each exactly where it has a short form. */
record PolarNumber(Num number, BigDecimal angle) {
    private static final BigDecimal NOTHING = BigDecimal.ONE.movePointLeft(40);

    static PolarNumber of(Num number) {
        return new PolarNumber(number, Elementary.angle(number.value().real(), number.value().imaginary()));
    }

    Real modulus() {
        return square().map(Real::root).orElseGet(() -> Real.of(size()));
    }

    Real twiceModulus() {
        return square().map(square -> Real.root(square.times(Rational.of(4))))
                .orElseGet(() -> Real.of(FormulaWriter.twice(size())));
    }

    private BigDecimal size() {
        BigDecimal x = number.value().real();
        BigDecimal y = number.value().imaginary();
        return x.multiply(x).add(y.multiply(y)).sqrt(Near.CENTRE);
    }

    private Optional<Rational> square() {
        return number.surd().filter(Surd::isImaginary).map(Surd::squaredModulus)
                .or(() -> number.rational().map(value -> value.times(value)));
    }

    boolean isOnUnitCircle() {
        return size().subtract(BigDecimal.ONE).abs().compareTo(NOTHING) < 0;
    }

    /** |angle|: a multiple of π where it is one of a sixtieth part, an arccos where the number is exact. */
    Real positiveAngle() {
        return exactAngle(angle.abs(), number.surd().filter(Surd::isImaginary).map(surd -> Real.arccos(surd.u(),
                surd.squaredModulus(), angle.abs())));
    }

    static Real exactAngle(BigDecimal angle, Optional<Real> otherwise) {
        return multipleOfPi(angle, otherwise);
    }

    private static Real multipleOfPi(BigDecimal angle, Optional<Real> otherwise) {
        BigDecimal sixtieths = angle.multiply(BigDecimal.valueOf(60)).divide(Elementary.PI, Near.CENTRE);
        BigDecimal nearest = sixtieths.setScale(0, java.math.RoundingMode.HALF_EVEN);
        if (sixtieths.subtract(nearest).abs().compareTo(NOTHING) < 0 && nearest.signum() != 0) {
            Rational part = Rational.of(nearest.longValueExact(), 60);
            String top = part.numerator().equals(java.math.BigInteger.ONE) ? "" : part.numerator().toString();
            String plain = (top.isEmpty() ? "pi" : top + "*pi") + (part.isInteger() ? "" : "/" + part.denominator());
            String latex = part.isInteger() ? top + "\\pi" : "\\frac{" + top + "\\pi}{" + part.denominator() + "}";
            return new Real(angle, Optional.of(new Real.Exact(plain, latex, false)));
        }
        return otherwise.orElseGet(() -> Real.of(angle));
    }

    /** The angle in degrees; exact where it is a whole number of them. */
    static Real inDegrees(Real angle) {
        BigDecimal degrees = angle.value().multiply(BigDecimal.valueOf(180)).divide(Elementary.PI, Near.CENTRE);
        BigDecimal nearest = degrees.setScale(0, java.math.RoundingMode.HALF_EVEN);
        return degrees.subtract(nearest).abs().compareTo(NOTHING) < 0
                ? new Real(nearest, Optional.of(Real.fraction(Rational.of(nearest.longValueExact()))))
                : Real.of(degrees);
    }
}
