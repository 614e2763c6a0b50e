package org.pofk.check;

import java.math.BigDecimal;
import java.math.BigInteger;
import java.util.Optional;
import org.pofk.exact.Rational;

/** A positive real number that is to be printed: to seventy digits, and its exact text where it has one. */
record Real(BigDecimal value, Optional<Exact> exact) {

    /** Exact text in ordinary notation and in LaTeX; {@code isAtom} where it may be a base as it stands. */
    record Exact(String plain, String latex, boolean isAtom) {
        String plainBase() {
            return isAtom ? plain : "(" + plain + ")";
        }

        String latexBase() {
            return isAtom ? latex : "\\left(" + latex + "\\right)";
        }
    }

    /** Different ways to write the same radicals. */
    enum Radicals { APART, OVER_ONE_DENOMINATOR, UNDER_THE_ROOT, IN_THE_DENOMINATOR }

    static Real of(BigDecimal value) {
        return new Real(value, Optional.empty());
    }

    static Real of(Num positive, Radicals radicals) {
        Optional<Exact> exact = positive.rational().map(Real::fraction)
                .or(() -> positive.surd().filter(surd -> !surd.isImaginary()).map(surd -> text(surd, radicals)));
        return new Real(positive.real(), exact);
    }

    static Exact fraction(Rational value) {
        return value.isInteger() ? new Exact(value.toString(), value.toString(), true)
                : new Exact(value.toString(), latexFraction(value), false);
    }

    private static String latexFraction(Rational value) {
        return value.isInteger() ? value.toString()
                : "\\frac{" + value.numerator() + "}{" + value.denominator() + "}";
    }

    /** The square root of a positive rational. */
    static Real root(Rational square) {
        BigInteger[] top = square.numerator().sqrtAndRemainder();
        BigInteger[] bottom = square.denominator().sqrtAndRemainder();
        BigDecimal value = Elementary.sqrt(Near.of(square)).real();
        return new Real(value, Optional.of(top[1].signum() == 0 && bottom[1].signum() == 0
                ? fraction(new Rational(top[0], bottom[0]))
                : new Exact("sqrt(" + square + ")", "\\sqrt{" + latexFraction(square) + "}", true)));
    }

    /** arccos(x/√s), an angle in (0, π) of the given value. */
    static Real arccos(Rational x, Rational square, BigDecimal value) {
        Real root = root(square);
        return new Real(value, root.exact().map(below -> new Exact(
                "arccos((" + x + ")/" + below.plainBase() + ")",
                "\\arccos\\left(\\frac{" + latexSigned(x) + "}{" + below.latex() + "}\\right)", true)));
    }

    private static String latexSigned(Rational x) {
        return (x.signum() < 0 ? "-" : "") + latexFraction(x.abs());
    }

    private static Exact text(Surd surd, Radicals radicals) {
        Rational v = surd.v().abs();
        boolean isMinus = surd.v().signum() < 0;
        boolean isPure = surd.u().isZero();
        String u = isPure ? "" : (surd.u().signum() < 0 ? "-" : "") + surd.u().abs();
        String latexU = isPure ? "" : latexSigned(surd.u());
        String sign = isPure ? (isMinus ? "-" : "") : isMinus ? " - " : " + ";
        return switch (radicals) {
            case APART -> parenthesized(u + sign + v + "*sqrt(" + surd.d() + ")",
                    latexU + sign + latexFraction(v) + " \\sqrt{" + surd.d() + "}");
            case UNDER_THE_ROOT -> {
                Rational inside = v.times(v).times(Rational.of(surd.d()));
                yield parenthesized(u + sign + "sqrt(" + inside + ")",
                        latexU + sign + "\\sqrt{" + latexFraction(inside) + "}");
            }
            case OVER_ONE_DENOMINATOR -> overOne(surd);
            case IN_THE_DENOMINATOR -> inDenominator(surd);
        };
    }

    private static Exact parenthesized(String plain, String latex) {
        return new Exact("(" + plain + ")", "\\left(" + latex + "\\right)", true);
    }

    private static Exact overOne(Surd surd) {
        BigInteger m = surd.u().denominator().multiply(surd.v().denominator())
                .divide(surd.u().denominator().gcd(surd.v().denominator()));
        Rational a = surd.u().times(Rational.of(m));
        Rational b = surd.v().times(Rational.of(m));
        String sign = b.signum() < 0 ? " - " : " + ";
        String root = (b.abs().isOne() ? "" : b.abs() + "*") + "sqrt(" + surd.d() + ")";
        String latexRoot = (b.abs().isOne() ? "" : b.abs().toString()) + "\\sqrt{" + surd.d() + "}";
        return new Exact("(" + a + sign + root + ")/" + m, "\\frac{" + a + sign + latexRoot + "}{" + m + "}", false);
    }

    /** 1/(a + b√d), its own inverse below the line. */
    private static Exact inDenominator(Surd surd) {
        Exact below = text(surd.inverse(), Radicals.APART);
        return new Exact("1/" + below.plain(), "\\frac{1}{" + below.latex() + "}", false);
    }
}
