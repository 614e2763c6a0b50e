package org.pofk.meaning;

import java.util.List;
import java.util.Map;
import org.pofk.exact.ComplexBall;
import org.pofk.exact.Rational;
import org.pofk.exact.Root;

/**
 * A complex number as an expression: rationals, decimals as written, roots of polynomials, π, i, square roots,
 * exponentials, arctan and arccos, put together by the four operations and whole powers. At face value a decimal is
 * what its digits denote, and the number is exact; spread, a decimal is every number within half a unit of its last
 * place. Immutable; parts are shared.
 */
public interface Quantity {

    static Quantity of(Rational value) {
        throw new AssertionError("to come");
    }

    static Quantity of(Written decimal) {
        throw new AssertionError("to come");
    }

    static Quantity of(Root root) {
        throw new AssertionError("to come");
    }

    static Quantity pi() {
        throw new AssertionError("to come");
    }

    static Quantity i() {
        throw new AssertionError("to come");
    }

    Quantity plus(Quantity other);

    Quantity negate();

    Quantity times(Quantity other);

    /** 1/this; whether this is zero is for the caller to know. */
    Quantity inverse();

    Quantity pow(int exponent);

    /** The main square root. */
    Quantity squareRoot();

    /** e^this: cos x and sin x are its parts for i x. */
    Quantity exponential();

    Quantity conjugate();

    /** At face value, both radii at most 2^−bits · max(1, |this|). */
    ComplexBall enclose(int bits);

    /** Holds every value the decimals allow; not smaller than that, with some 2^−bits of rounding. */
    ComplexBall spread(int bits);

    /** Whether it is zero at face value: by a separation bound where it is algebraic, never read off decimals. */
    Decision isZero();

    /** The decimals in it, each once, in order of reading. */
    List<Written> decimals();

    /** This with other numbers in place of some decimals. */
    Quantity with(Map<Written, Quantity> replacements);
}
