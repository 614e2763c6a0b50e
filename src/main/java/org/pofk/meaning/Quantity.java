package org.pofk.meaning;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.pofk.exact.ComplexBall;
import org.pofk.exact.EnclosedComplex;
import org.pofk.exact.Rational;
import org.pofk.exact.Root;

/**
 * A complex number as an expression: rationals, decimals as written, roots of polynomials, π, i, square roots,
 * exponentials, arctan and arccos, put together by the four operations and whole powers. At face value a decimal is
 * what its digits denote, and the number is exact; spread, a decimal is every number within half a unit of its last
 * place. Immutable; parts are shared. Made simpler only where it is plain: short rationals are folded, 0 and 1 go.
 *
 * <p>Two quantities are equal as objects when they are the same one; {@code a.minus(b).isZero()} compares numbers.
 */
public final class Quantity {
    /** Rationals longer than this are not multiplied out: what isn't folded costs nothing until it is asked for. */
    private static final int FOLDED_BITS = 1 << 14;

    /** Longer sums stay parts of a sum, so that putting one together term by term isn't quadratic. */
    private static final int TERMS_TAKEN_APART = 64;

    public static final Quantity ZERO = new Quantity(new Node.Number(Rational.ZERO));
    public static final Quantity ONE = new Quantity(new Node.Number(Rational.ONE));
    private static final Quantity PI = new Quantity(Node.Constant.PI);
    private static final Quantity I = new Quantity(Node.Constant.I);

    private final Node node;
    private final EnclosedComplex enclosed;

    private Quantity(Node node) {
        this.node = node;
        this.enclosed = EnclosedComplex.raising(scale -> Enclosing.atFaceValue(this, scale));
    }

    static Quantity of(Node node) {
        return new Quantity(node);
    }

    public static Quantity of(Rational value) {
        return new Quantity(new Node.Number(value));
    }

    public static Quantity of(long value) {
        return of(Rational.of(value));
    }

    public static Quantity of(Written decimal) {
        return new Quantity(new Node.Decimal(decimal));
    }

    public static Quantity of(Root root) {
        return root.polynomial().degree() == 1
                ? of(root.polynomial().coefficient(0).negate())
                : new Quantity(new Node.AtRoot(root));
    }

    public static Quantity pi() {
        return PI;
    }

    public static Quantity i() {
        return I;
    }

    /** The sum of all; zero for none. Terms that are short sums themselves are taken apart. */
    public static Quantity sum(List<Quantity> terms) {
        Rational constant = Rational.ZERO;
        List<Quantity> others = new ArrayList<>();
        for (Quantity term : takenApart(terms)) {
            Optional<Rational> value = term.rational();
            if (value.isPresent() && isShort(constant) && isShort(value.get())) {
                constant = constant.plus(value.get());
            } else {
                others.add(term);
            }
        }
        if (!constant.isZero() || others.isEmpty()) {
            others.add(of(constant));
        }
        return others.size() == 1 ? others.get(0) : new Quantity(new Node.Sum(others));
    }

    private static List<Quantity> takenApart(List<Quantity> terms) {
        List<Quantity> all = new ArrayList<>();
        for (Quantity term : terms) {
            if (term.node instanceof Node.Sum sum && sum.terms().size() + terms.size() <= TERMS_TAKEN_APART) {
                all.addAll(sum.terms());
            } else {
                all.add(term);
            }
        }
        return all;
    }

    Node node() {
        return node;
    }

    /** The value where this is written as a rational number and nothing else. */
    public Optional<Rational> rational() {
        return node instanceof Node.Number number ? Optional.of(number.value()) : Optional.empty();
    }

    /** The decimal this is, where it is one and nothing else. */
    Optional<Written> writtenDecimal() {
        return node instanceof Node.Decimal decimal ? Optional.of(decimal.written()) : Optional.empty();
    }

    private boolean is(Rational value) {
        return rational().filter(value::equals).isPresent();
    }

    /** Whether it is folded with others. */
    static boolean isShort(Rational value) {
        return length(value) <= FOLDED_BITS;
    }

    private static long length(Rational value) {
        return Math.max(value.numerator().bitLength(), value.denominator().bitLength());
    }

    public Quantity plus(Quantity other) {
        return sum(List.of(this, other));
    }

    public Quantity minus(Quantity other) {
        return plus(other.negate());
    }

    public Quantity negate() {
        return of(-1).times(this);
    }

    public Quantity times(Quantity other) {
        if (is(Rational.ZERO) || other.is(Rational.ZERO)) {
            return ZERO;
        }
        return Factored.of(this).times(Factored.of(other)).product();
    }

    public Quantity times(Rational factor) {
        return of(factor).times(this);
    }

    /** 1/this; whether this is zero is for the caller to know. */
    public Quantity inverse() {
        return pow(-1);
    }

    /** This over what the caller knows not to be zero. */
    public Quantity dividedBy(Quantity other) {
        return times(other.inverse());
    }

    /** This to a whole power; to the power 0 it is one. */
    public Quantity pow(int exponent) {
        if (exponent == 0) {
            return ONE;
        }
        if (exponent == 1) {
            return this;
        }
        return node.accept(new PowerRules(this, exponent));
    }

    static boolean foldsToPower(Rational value, int exponent) {
        return length(value) * Math.abs((long) exponent) <= FOLDED_BITS;
    }

    /** The main square root. */
    public Quantity squareRoot() {
        Optional<Rational> value = rational();
        if (value.isEmpty()) {
            return new Quantity(new Node.Radical(2, this));
        }
        if (value.get().signum() < 0) {
            return I.times(of(value.get().negate()).squareRoot());
        }
        BigInteger top = value.get().numerator().sqrt();
        BigInteger bottom = value.get().denominator().sqrt();
        Rational root = new Rational(top, bottom);
        return root.times(root).equals(value.get()) ? of(root) : new Quantity(new Node.Radical(2, this));
    }

    /** The main square root for degree 2, and for a higher one the positive root of what is known to be positive. */
    public Quantity root(int degree) {
        return degree == 1 ? this : degree == 2 ? squareRoot() : new Quantity(new Node.Radical(degree, this));
    }

    /** The natural logarithm of what is known to be positive. */
    public Quantity logarithm() {
        return is(Rational.ONE) ? ZERO : new Quantity(new Node.Logarithm(this));
    }

    /** e^this: cos x and sin x are its parts for i x. */
    public Quantity exponential() {
        if (is(Rational.ZERO)) {
            return ONE;
        }
        return Exponent.wholeTimesLogarithm(this).orElseGet(() -> new Quantity(new Node.Exponential(this)));
    }

    /** cos of this, which is real. */
    public Quantity cosine() {
        return I.times(this).exponential().realPart();
    }

    /** sin of this, which is real. */
    public Quantity sine() {
        return minus(PI.times(Rational.HALF)).cosine();
    }

    /** The angle in (−π/2, π/2) whose tangent this real number is. */
    public Quantity arctangent() {
        return is(Rational.ZERO) ? ZERO : new Quantity(new Node.Angle(Node.Angle.Inverse.TANGENT, this));
    }

    /** The angle in [0, π] whose cosine this real number of [−1, 1] is. */
    public Quantity arccosine() {
        return is(Rational.ONE) ? ZERO : new Quantity(new Node.Angle(Node.Angle.Inverse.COSINE, this));
    }

    public Quantity conjugate() {
        return Conjugating.of(this);
    }

    public Quantity realPart() {
        return ComplexParts.real(this);
    }

    public Quantity imaginaryPart() {
        return ComplexParts.imaginary(this);
    }

    /**
     * At face value, both radii at most 2^−bits · max(1, |this|). An {@link ArithmeticException} where there is no such
     * number (a divisor that is zero, the arccos of 2), or where it hangs on something undecided.
     */
    public ComplexBall enclose(int bits) {
        return enclosed.enclose(bits);
    }

    /** Holds every value the decimals allow; not smaller than that, with some 2^−bits of rounding. */
    public ComplexBall spread(int bits) {
        return Enclosing.spread(this, bits);
    }

    /**
     * Whether it is zero at face value: in canonical form or by a separation bound where it is algebraic, never read off
     * decimals. Not decided also where there is no such number, as with a divisor that is zero.
     */
    public Decision isZero() {
        return ZeroTest.of(this);
    }

    /** Whether it is real at face value. */
    public Decision isReal() {
        return isWrittenReal() ? Decision.YES : imaginaryPart().isZero();
    }

    /** Whether it is seen to be its own conjugate without working anything out. */
    boolean isWrittenReal() {
        Quantity conjugate = conjugate();
        Same same = new Same();
        return conjugate == this || same.of(this).equals(same.of(conjugate));
    }

    /** The sign at face value of what is known to be real; empty where it isn't decided whether it is zero. */
    public Optional<Integer> sign() {
        return Sign.of(this);
    }

    /** The decimals in it, each once, in order of reading. */
    public List<Written> decimals() {
        return DecimalsWithin.of(this);
    }

    /** This with other numbers in place of some decimals. */
    public Quantity with(Map<Written, Quantity> replacements) {
        return replacements.isEmpty() ? this : Rebuilding.with(this, replacements);
    }

    /** As a formula, for messages and assertions. */
    @Override
    public String toString() {
        return Telling.text(this);
    }
}
