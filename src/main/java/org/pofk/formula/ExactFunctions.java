package org.pofk.formula;

import java.math.BigInteger;
import java.util.List;
import java.util.Optional;
import org.pofk.exact.Rational;
import org.pofk.formula.Formula.Function;

/** The values of functions that are rational at rational arguments, as far as that is told at a glance. Exact. */
final class ExactFunctions {
    private static final BigInteger LARGEST_BINOMIAL = BigInteger.valueOf(10_000);

    private ExactFunctions() {
    }

    /** The value, or nothing where it is irrational, undefined or too large to be written out. */
    static Optional<Rational> value(Function function, List<Rational> arguments) {
        Rational x = arguments.get(0);
        return switch (function) {
            case SQRT -> squareRoot(x);
            case COS, EXP -> x.isZero() ? Optional.of(Rational.ONE) : Optional.empty();
            case SIN, ARCTAN -> x.isZero() ? Optional.of(Rational.ZERO) : Optional.empty();
            case ARCCOS -> x.isOne() ? Optional.of(Rational.ZERO) : Optional.empty();
            case DELTA -> Optional.of(x.isZero() ? Rational.ONE : Rational.ZERO);
            case BINOMIAL -> binomial(x, arguments.get(1));
        };
    }

    private static Optional<Rational> squareRoot(Rational x) {
        if (x.signum() < 0) {
            return Optional.empty();
        }
        BigInteger[] above = x.numerator().sqrtAndRemainder();
        BigInteger[] below = x.denominator().sqrtAndRemainder();
        return above[1].signum() == 0 && below[1].signum() == 0
                ? Optional.of(new Rational(above[0], below[0])) : Optional.empty();
    }

    /** n over p for integers 0 ≤ n ≤ 10,000 and 0 ≤ p; zero where p exceeds n. */
    private static Optional<Rational> binomial(Rational n, Rational p) {
        if (!n.isInteger() || !p.isInteger() || n.signum() < 0 || p.signum() < 0
                || n.numerator().compareTo(LARGEST_BINOMIAL) > 0) {
            return Optional.empty();
        }
        if (p.compareTo(n) > 0) {
            return Optional.of(Rational.ZERO);
        }
        BigInteger product = BigInteger.ONE;
        BigInteger smaller = p.numerator().min(n.numerator().subtract(p.numerator()));
        for (int i = 1; i <= smaller.intValue(); i++) {
            BigInteger next = n.numerator().subtract(BigInteger.valueOf(i - 1L));
            product = product.multiply(next).divide(BigInteger.valueOf(i));
        }
        return Optional.of(Rational.of(product));
    }
}
