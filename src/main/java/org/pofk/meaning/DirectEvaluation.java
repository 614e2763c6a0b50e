package org.pofk.meaning;

import java.math.BigInteger;
import org.pofk.exact.Ball;
import org.pofk.exact.ComplexBall;
import org.pofk.exact.Rational;
import org.pofk.formula.Formula;

/**
 * Evaluates a formula tree at a point in ball arithmetic; {@link StepEvaluation} says what comes out. Real numbers have
 * the exact imaginary part zero and are worked with as such. A few operations on numbers of {@code bits} for each node,
 * log₂ of the exponent for a power.
 */
final class DirectEvaluation implements Formula.Visitor<ComplexBall> {
    /** Longest whole part of a power or an exponential, in bits. */
    private static final int LONGEST = 1 << 14;
    private static final int LARGEST_BINOMIAL = 2_000;
    private static final int MOST_ROOTS = 6;

    private final String variable;
    private final Rational point;
    private final DecimalBalls decimals;
    private final int scale;
    private final ExactAtPoint exact;
    private final Ball zero;

    DirectEvaluation(String variable, Rational point, DecimalBalls decimals) {
        this.variable = variable;
        this.point = point;
        this.decimals = decimals;
        this.scale = decimals.scale();
        this.exact = new ExactAtPoint(variable, point);
        this.zero = Ball.exact(BigInteger.ZERO, scale);
    }

    private ComplexBall real(Ball value) {
        return new ComplexBall(value, zero);
    }

    private ComplexBall real(Rational value) {
        return real(Ball.of(value, scale));
    }

    private static boolean isReal(ComplexBall value) {
        return value.imaginary().isExact() && value.imaginary().center().signum() == 0;
    }

    private ComplexBall times(ComplexBall a, ComplexBall b) {
        return isReal(a) && isReal(b) ? real(a.real().times(b.real())) : a.times(b);
    }

    private ComplexBall dividedBy(ComplexBall a, ComplexBall b) {
        return isReal(a) && isReal(b) ? real(a.real().dividedBy(b.real())) : a.dividedBy(b);
    }

    @Override
    public ComplexBall number(Formula.Number number) {
        return real(number.value());
    }

    @Override
    public ComplexBall decimal(Formula.WrittenDecimal decimal) {
        return real(decimals.of(decimal.text()));
    }

    @Override
    public ComplexBall symbol(Formula.Symbol symbol) {
        return symbol.name().equals("e") && !variable.equals("e")
                ? real(Ball.of(1, scale).exp()) : real(symbol.accept(exact));
    }

    @Override
    public ComplexBall constant(Formula.Constant constant) {
        return switch (constant) {
            case PI -> real(Ball.pi(scale));
            case I -> new ComplexBall(zero, Ball.of(1, scale));
            case DEGREE -> real(Ball.pi(scale + Byte.SIZE).dividedBy(Ball.of(180, scale)).roundedTo(scale));
        };
    }

    @Override
    public ComplexBall negation(Formula.Negation negation) {
        return negation.operand().accept(this).negate();
    }

    @Override
    public ComplexBall sum(Formula.Sum sum) {
        ComplexBall total = sum.terms().get(0).accept(this);
        for (Formula term : sum.terms().subList(1, sum.terms().size())) {
            total = total.plus(term.accept(this));
        }
        return total;
    }

    @Override
    public ComplexBall product(Formula.Product product) {
        boolean isAngle = product.factors().contains(Formula.Constant.DEGREE);
        ComplexBall total = real(Ball.of(1, scale));
        for (Formula factor : product.factors()) {
            total = times(total, isAngle && factor instanceof Formula.WrittenDecimal decimal
                    ? real(decimals.inDegrees().of(decimal.text())) : factor.accept(this));
        }
        return total;
    }

    @Override
    public ComplexBall quotient(Formula.Quotient quotient) {
        return dividedBy(quotient.numerator().accept(this), quotient.denominator().accept(this));
    }

    @Override
    public ComplexBall power(Formula.Power power) {
        if (power.base() instanceof Formula.Symbol symbol && symbol.name().equals("e") && !variable.equals("e")) {
            return exponential(power.exponent().accept(this));
        }
        Rational exponent = power.exponent().accept(exact);
        int roots = exponent.denominator().getLowestSetBit();
        if (exponent.denominator().bitCount() != 1 || roots > MOST_ROOTS || exponent.numerator().bitLength() > 30) {
            throw new NoValueException();
        }
        ComplexBall base = power.base().accept(this);
        for (int i = 0; i < roots; i++) {
            base = MainSquareRoot.of(base);
        }
        return raised(base, exponent.numerator().intValueExact());
    }

    private ComplexBall raised(ComplexBall base, int exponent) {
        long longest = exponent < 0 ? wholeBits(dividedBy(real(Ball.of(1, scale)), base)) : wholeBits(base);
        if (longest * Math.abs((long) exponent) > LONGEST) {
            throw new NoValueException();
        }
        return Powers.of(base, exponent);
    }

    /** At least log₂ of the modulus, for numbers beyond one. */
    private int wholeBits(ComplexBall value) {
        BigInteger across = value.real().center().abs().add(value.real().radius());
        BigInteger up = value.imaginary().center().abs().add(value.imaginary().radius());
        BigInteger most = across.add(up);
        return most.compareTo(BigInteger.ONE.shiftLeft(value.scale())) <= 0
                ? 0 : Math.max(1, most.bitLength() - value.scale());
    }

    private ComplexBall exponential(ComplexBall exponent) {
        if (wholeBits(exponent) > Integer.SIZE / 2 - 2) {
            throw new NoValueException();
        }
        Ball modulus = exponent.real().exp();
        return isReal(exponent) ? real(modulus)
                : new ComplexBall(exponent.imaginary().cos(), exponent.imaginary().sin()).times(modulus);
    }

    @Override
    public ComplexBall call(Formula.Call call) {
        return switch (call.function()) {
            case BINOMIAL -> binomial(call.arguments().get(0).accept(exact), call.arguments().get(1).accept(exact));
            case DELTA -> real(Ball.of(call.arguments().get(0).accept(exact).isZero() ? 1 : 0, scale));
            case SQRT -> MainSquareRoot.of(argument(call));
            case COS -> cosine(argument(call));
            case SIN -> cosine(argument(call).minus(real(quarterTurn())));
            case EXP -> exponential(argument(call));
            case ARCTAN -> real(realArgument(call).arctan());
            case ARCCOS -> real(withinOne(realArgument(call)).arccos());
        };
    }

    private ComplexBall argument(Formula.Call call) {
        return call.arguments().get(0).accept(this);
    }

    private Ball realArgument(Formula.Call call) {
        ComplexBall argument = argument(call);
        if (!isReal(argument)) {
            throw new NoValueException();
        }
        return argument.real();
    }

    private Ball withinOne(Ball cosine) {
        if (cosine.abs().minus(Ball.of(1, scale)).isPositive()) {
            throw new NoValueException();
        }
        return cosine;
    }

    private Ball quarterTurn() {
        return Ball.pi(scale + 1).timesPowerOfTwo(-1).roundedTo(scale);
    }

    private ComplexBall cosine(ComplexBall angle) {
        if (isReal(angle)) {
            return real(angle.real().cos());
        }
        ComplexBall turned = new ComplexBall(angle.imaginary().negate(), angle.real());
        ComplexBall twice = exponential(turned).plus(exponential(turned.negate()));
        return times(twice, real(Rational.HALF));
    }

    /** n over p, zero where n < p; whole numbers, p ≥ 0, or no value. */
    private ComplexBall binomial(Rational n, Rational p) {
        if (!n.isInteger() || !p.isInteger() || p.signum() < 0 || p.numerator().bitLength() > Short.SIZE
                || n.numerator().bitLength() > Long.SIZE - 2) {
            throw new NoValueException();
        }
        if (n.compareTo(p) < 0) {
            return real(zero);
        }
        BigInteger chosen = p.numerator().min(n.numerator().subtract(p.numerator()));
        if (chosen.bitLength() > Short.SIZE || chosen.intValueExact() > LARGEST_BINOMIAL) {
            throw new NoValueException();
        }
        BigInteger value = BigInteger.ONE;
        for (int i = 1; i <= chosen.intValueExact(); i++) {
            value = value.multiply(n.numerator().subtract(BigInteger.valueOf(i - 1L))).divide(BigInteger.valueOf(i));
        }
        return real(Ball.exact(value.shiftLeft(scale), scale));
    }

    @Override
    public ComplexBall rootSum(Formula.RootSum rootSum) {
        throw new NoValueException();
    }

    @Override
    public ComplexBall cases(Formula.Cases cases) {
        if (!variable.equals("k") || !point.isInteger()) {
            throw new NoValueException();
        }
        long k = point.numerator().longValueExact();
        return cases.branches().stream().filter(branch -> branch.holdsAt(k)).findFirst()
                .orElseThrow(NoValueException::new).formula().accept(this);
    }
}
