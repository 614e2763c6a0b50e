package org.pofk.meaning;

import java.util.List;
import org.pofk.exact.Rational;
import org.pofk.exact.Root;

/** How a {@link Quantity} is put together from others. What is done per variant is a {@link Visitor}. */
sealed interface Node {

    <R> R accept(Visitor<R> visitor);

    /** One method per variant. */
    interface Visitor<R> {
        R number(Number number);

        R decimal(Decimal decimal);

        R root(AtRoot root);

        R constant(Constant constant);

        R sum(Sum sum);

        R product(Product product);

        R power(Power power);

        R radical(Radical radical);

        R exponential(Exponential exponential);

        R logarithm(Logarithm logarithm);

        R angle(Angle angle);

        R conjugate(Conjugate conjugate);

        R realPart(RealPart realPart);
    }

    /** A rational number. */
    record Number(Rational value) implements Node {
        @Override
        public <R> R accept(Visitor<R> visitor) {
            return visitor.number(this);
        }
    }

    /** A decimal of a text. */
    record Decimal(Written written) implements Node {
        @Override
        public <R> R accept(Visitor<R> visitor) {
            return visitor.decimal(this);
        }
    }

    /** A root of a polynomial. */
    record AtRoot(Root root) implements Node {
        @Override
        public <R> R accept(Visitor<R> visitor) {
            return visitor.root(this);
        }
    }

    /** π, or the imaginary unit. */
    enum Constant implements Node {
        PI, I;

        @Override
        public <R> R accept(Visitor<R> visitor) {
            return visitor.constant(this);
        }
    }

    /** Terms added up, at least two. */
    record Sum(List<Quantity> terms) implements Node {
        public Sum {
            terms = List.copyOf(terms);
        }

        @Override
        public <R> R accept(Visitor<R> visitor) {
            return visitor.sum(this);
        }
    }

    /** first · second; a rational factor is the first. */
    record Product(Quantity first, Quantity second) implements Node {
        @Override
        public <R> R accept(Visitor<R> visitor) {
            return visitor.product(this);
        }
    }

    /** A whole power, not 0 and not 1; −1 is the inverse. */
    record Power(Quantity base, int exponent) implements Node {
        @Override
        public <R> R accept(Visitor<R> visitor) {
            return visitor.power(this);
        }
    }

    /**
     * The main root of a degree of two or more: for two, the real part isn't negative, and on the imaginary axis it is
     * the upper one; for more, the positive root of a positive number.
     */
    record Radical(int degree, Quantity radicand) implements Node {
        @Override
        public <R> R accept(Visitor<R> visitor) {
            return visitor.radical(this);
        }
    }

    /** e^exponent. */
    record Exponential(Quantity exponent) implements Node {
        @Override
        public <R> R accept(Visitor<R> visitor) {
            return visitor.exponential(this);
        }
    }

    /** The natural logarithm of a positive number. */
    record Logarithm(Quantity of) implements Node {
        @Override
        public <R> R accept(Visitor<R> visitor) {
            return visitor.logarithm(this);
        }
    }

    /** The angle whose tangent or cosine is a real number. */
    record Angle(Inverse of, Quantity argument) implements Node {
        /** Which function is turned around: the angle lies in (−π/2, π/2), or in [0, π]. */
        enum Inverse { TANGENT, COSINE }

        @Override
        public <R> R accept(Visitor<R> visitor) {
            return visitor.angle(this);
        }
    }

    record Conjugate(Quantity of) implements Node {
        @Override
        public <R> R accept(Visitor<R> visitor) {
            return visitor.conjugate(this);
        }
    }

    record RealPart(Quantity of) implements Node {
        @Override
        public <R> R accept(Visitor<R> visitor) {
            return visitor.realPart(this);
        }
    }
}
