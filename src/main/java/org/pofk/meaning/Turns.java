package org.pofk.meaning;

import java.util.HashMap;
import java.util.Map;
import java.util.Optional;
import java.util.function.Function;
import org.pofk.exact.Rational;

/**
 * A number as a sum of angles with Gaussian rational coefficients: c + c_π π + Σ c_a a over arccos and arctan of this
 * and that, where it is written so that this can be seen. Exact. Zero coefficients are left out.
 *
 * @param constant c
 * @param pi       c_π
 * @param angles   by the number that says which angle it is
 */
record Turns(Gaussian constant, Gaussian pi, Map<Integer, Gaussian> angles) {

    /** real + i imaginary. */
    record Gaussian(Rational real, Rational imaginary) {
        static final Gaussian ZERO = new Gaussian(Rational.ZERO, Rational.ZERO);
        static final Gaussian ONE = new Gaussian(Rational.ONE, Rational.ZERO);

        boolean isZero() {
            return real.isZero() && imaginary.isZero();
        }

        Gaussian plus(Gaussian other) {
            return new Gaussian(real.plus(other.real), imaginary.plus(other.imaginary));
        }

        Gaussian times(Gaussian other) {
            return new Gaussian(real.times(other.real).minus(imaginary.times(other.imaginary)),
                    real.times(other.imaginary).plus(imaginary.times(other.real)));
        }

        Gaussian conjugate() {
            return new Gaussian(real, imaginary.negate());
        }

        Gaussian inverse() {
            Rational square = real.times(real).plus(imaginary.times(imaginary));
            return new Gaussian(real.dividedBy(square), imaginary.negate().dividedBy(square));
        }
    }

    Turns {
        angles = Map.copyOf(angles);
    }

    static Turns constant(Gaussian value) {
        return new Turns(value, Gaussian.ZERO, Map.of());
    }

    boolean isConstant() {
        return pi.isZero() && angles.isEmpty();
    }

    /** Whether e to this is a root of unity times what the angles give: all coefficients imaginary, and no constant. */
    boolean isRotation() {
        return constant.isZero() && pi.real().isZero()
                && angles.values().stream().allMatch(coefficient -> coefficient.real().isZero());
    }

    Turns plus(Turns other) {
        Map<Integer, Gaussian> sum = new HashMap<>(angles);
        other.angles.forEach((angle, coefficient) -> sum.merge(angle, coefficient, Gaussian::plus));
        sum.values().removeIf(Gaussian::isZero);
        return new Turns(constant.plus(other.constant), pi.plus(other.pi), sum);
    }

    Turns times(Gaussian factor) {
        return factor.isZero() ? constant(Gaussian.ZERO) : map(factor::times);
    }

    private Turns map(Function<Gaussian, Gaussian> f) {
        Map<Integer, Gaussian> images = new HashMap<>();
        angles.forEach((angle, coefficient) -> images.put(angle, f.apply(coefficient)));
        return new Turns(f.apply(constant), f.apply(pi), images);
    }

    Turns conjugate() {
        return map(Gaussian::conjugate);
    }

    Turns realPart() {
        return plus(conjugate()).times(new Gaussian(Rational.HALF, Rational.ZERO));
    }

    /** Reads a quantity so, each part once; empty where it isn't written as such a sum. */
    static final class Reading extends Walk<Optional<Turns>> {
        private static final int LARGEST_POWER = 1000;
        private final Same same;

        Reading(Same same) {
            this.same = same;
        }

        private static Optional<Turns> rational(Rational value) {
            return Optional.of(Turns.constant(new Gaussian(value, Rational.ZERO)));
        }

        @Override
        public Optional<Turns> number(Node.Number number) {
            return rational(number.value());
        }

        @Override
        public Optional<Turns> decimal(Node.Decimal decimal) {
            return rational(decimal.written().value());
        }

        @Override
        public Optional<Turns> root(Node.AtRoot root) {
            return Optional.empty();
        }

        @Override
        public Optional<Turns> constant(Node.Constant constant) {
            return Optional.of(switch (constant) {
                case PI -> new Turns(Gaussian.ZERO, Gaussian.ONE, Map.of());
                case I -> Turns.constant(new Gaussian(Rational.ZERO, Rational.ONE));
            });
        }

        @Override
        public Optional<Turns> sum(Node.Sum sum) {
            Optional<Turns> total = rational(Rational.ZERO);
            for (Quantity term : sum.terms()) {
                total = total.flatMap(before -> of(term).map(before::plus));
            }
            return total;
        }

        @Override
        public Optional<Turns> product(Node.Product product) {
            return of(product.first()).flatMap(first -> of(product.second()).flatMap(second -> {
                if (first.isConstant()) {
                    return Optional.of(second.times(first.constant()));
                }
                return second.isConstant() ? Optional.of(first.times(second.constant())) : Optional.empty();
            }));
        }

        @Override
        public Optional<Turns> power(Node.Power power) {
            return of(power.base())
                    .filter(base -> base.isConstant() && !base.constant().isZero()
                            && Math.abs((long) power.exponent()) <= LARGEST_POWER)
                    .map(base -> Turns.constant(power(base.constant(), power.exponent())));
        }

        private static Gaussian power(Gaussian base, int exponent) {
            Gaussian result = Gaussian.ONE;
            for (int i = 0; i < Math.abs(exponent); i++) {
                result = result.times(base);
            }
            return exponent < 0 ? result.inverse() : result;
        }

        @Override
        public Optional<Turns> radical(Node.Radical radical) {
            return Optional.empty();
        }

        @Override
        public Optional<Turns> exponential(Node.Exponential exponential) {
            return Optional.empty();
        }

        @Override
        public Optional<Turns> logarithm(Node.Logarithm logarithm) {
            return Optional.empty();
        }

        @Override
        public Optional<Turns> angle(Node.Angle angle) {
            return Optional.of(new Turns(Gaussian.ZERO, Gaussian.ZERO, Map.of(same.numberOf(angle), Gaussian.ONE)));
        }

        @Override
        public Optional<Turns> conjugate(Node.Conjugate conjugate) {
            return of(conjugate.of()).map(Turns::conjugate);
        }

        @Override
        public Optional<Turns> realPart(Node.RealPart realPart) {
            return of(realPart.of()).map(Turns::realPart);
        }
    }
}
