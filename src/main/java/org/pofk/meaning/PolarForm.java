package org.pofk.meaning;

import java.util.Optional;
import org.pofk.exact.Rational;

/**
 * A number as modulus · e^(i angle), where it is written so: as a product of real numbers, i and exponentials. Both are
 * real, in the decimals written in them; the modulus may be negative, the angle is any. Exact.
 */
public record PolarForm(Quantity modulus, Quantity angle) {

    /** Empty for what is written in another way, as 0.4 + 0.33 i. */
    public static Optional<PolarForm> of(Quantity number) {
        if (number.conjugate() == number) {
            return Optional.of(new PolarForm(number, Quantity.ZERO));
        }
        if (number.node() == Node.Constant.I) {
            return Optional.of(new PolarForm(Quantity.ONE, Quantity.pi().times(Rational.HALF)));
        }
        if (number.node() instanceof Node.Exponential exponential) {
            return Optional.of(new PolarForm(exponential.exponent().realPart().exponential(),
                    exponential.exponent().imaginaryPart()));
        }
        if (number.node() instanceof Node.Power power) {
            return of(power.base()).map(base -> new PolarForm(base.modulus.pow(power.exponent()),
                    base.angle.times(Rational.of(power.exponent()))));
        }
        return number.node() instanceof Node.Product product
                ? of(product.first()).flatMap(first -> of(product.second()).map(first::times)) : Optional.empty();
    }

    private PolarForm times(PolarForm other) {
        return new PolarForm(modulus.times(other.modulus), angle.plus(other.angle));
    }

    /** Whether decimals say how it is turned. */
    public boolean isTurnedByDecimals() {
        return !angle.decimals().isEmpty();
    }
}
