package org.pofk.check;

import java.math.BigDecimal;
import java.util.Optional;
import org.pofk.exact.Rational;

/** A complex number to seventy digits, and exactly where it is rational or a root of a quadratic. */
record Num(Near value, Optional<Rational> rational, Optional<Surd> surd) {
    private static final BigDecimal NOTHING = BigDecimal.ONE.movePointLeft(50);

    static Num of(Rational value) {
        return new Num(Near.of(value), Optional.of(value), Optional.empty());
    }

    static Num of(Near value) {
        return new Num(value, Optional.empty(), Optional.empty());
    }

    static Num real(BigDecimal value) {
        return of(Near.exactly(value));
    }

    boolean isReal() {
        return value.isReal() || rational.isPresent();
    }

    boolean isExact() {
        return rational.isPresent() || surd.isPresent();
    }

    boolean isOne() {
        return rational.filter(Rational::isOne).isPresent();
    }

    int signum() {
        return value.real().signum();
    }

    BigDecimal real() {
        return value.real();
    }

    /** No true number of these tests is nearer to zero than 1e-50 without being zero. */
    boolean isNothing() {
        return value.upperModulus().compareTo(NOTHING) < 0;
    }

    Num negate() {
        return new Num(value.negate(), rational.map(Rational::negate), surd.map(Surd::negate));
    }

    Num abs() {
        return signum() < 0 ? negate() : this;
    }

    Num times(Num other) {
        return new Num(value.times(other.value),
                rational.flatMap(a -> other.rational.map(a::times)),
                surd.isPresent() && other.surd.isPresent() && surd.get().d().equals(other.surd.get().d())
                        ? Optional.of(surd.get().times(other.surd.get()))
                        : surd.flatMap(a -> other.rational.map(b -> a.scaled(Rational.ZERO, b)))
                                .or(() -> other.surd.flatMap(b -> rational.map(a -> b.scaled(Rational.ZERO, a)))));
    }

    Num plus(Num other) {
        return new Num(value.plus(other.value),
                rational.flatMap(a -> other.rational.map(a::plus)),
                surd.isPresent() && other.surd.isPresent() && surd.get().d().equals(other.surd.get().d())
                        ? Optional.of(surd.get().plus(other.surd.get()))
                        : surd.flatMap(a -> other.rational.map(b -> a.scaled(b, Rational.ONE)))
                                .or(() -> other.surd.flatMap(b -> rational.map(a -> b.scaled(a, Rational.ONE)))));
    }

    Num pow(int exponent) {
        Num power = of(Rational.ONE);
        for (int i = 0; i < Math.abs(exponent); i++) {
            power = power.times(this);
        }
        return exponent < 0 ? power.inverse() : power;
    }

    /** Real part and imaginary part, as real numbers. */
    Num realPart() {
        return new Num(Near.exactly(value.real()), rational.or(() -> surd.map(Surd::u)), Optional.empty());
    }

    Num imaginaryPart() {
        return new Num(Near.exactly(value.imaginary()), rational.map(any -> Rational.ZERO), surd.map(Surd::imaginaryPart));
    }

    Num inverse() {
        return new Num(value.inverse(), rational.map(Rational::inverse), surd.map(Surd::inverse));
    }
}
