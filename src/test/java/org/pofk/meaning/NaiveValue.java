package org.pofk.meaning;

import java.math.BigDecimal;
import java.math.BigInteger;
import java.math.MathContext;
import org.pofk.formula.Formula;

/**
 * The value of a formula with its variable at a whole number, straight from the tree in decimals of eighty digits:
 * the second way of working it out. Complex numbers as real and imaginary part; series without any reduction.
 */
final class NaiveValue implements Formula.Visitor<NaiveValue.Complex> {
    private static final MathContext DIGITS = new MathContext(80);
    private static final BigDecimal PI = new BigDecimal(
            "3.14159265358979323846264338327950288419716939937510582097494459230781640628620899862803482534211706798");
    private static final int TERMS = 400;

    /** re + i·im. */
    record Complex(BigDecimal re, BigDecimal im) {
        static Complex of(BigDecimal re) {
            return new Complex(re, BigDecimal.ZERO);
        }

        static Complex of(long re) {
            return of(BigDecimal.valueOf(re));
        }

        Complex plus(Complex o) {
            return new Complex(re.add(o.re, DIGITS), im.add(o.im, DIGITS));
        }

        Complex times(Complex o) {
            return new Complex(re.multiply(o.re, DIGITS).subtract(im.multiply(o.im, DIGITS), DIGITS),
                    re.multiply(o.im, DIGITS).add(im.multiply(o.re, DIGITS), DIGITS));
        }

        Complex inverse() {
            BigDecimal squares = re.multiply(re, DIGITS).add(im.multiply(im, DIGITS), DIGITS);
            return new Complex(re.divide(squares, DIGITS), im.negate().divide(squares, DIGITS));
        }

        Complex pow(int n) {
            Complex product = of(1);
            for (int i = 0; i < Math.abs(n); i++) {
                product = product.times(this);
            }
            return n < 0 ? product.inverse() : product;
        }

        /** The main root of a number that isn't a negative real one by less than rounding. */
        Complex root() {
            BigDecimal modulus = re.multiply(re, DIGITS).add(im.multiply(im, DIGITS), DIGITS).sqrt(DIGITS);
            BigDecimal half = new BigDecimal("0.5");
            BigDecimal across = modulus.add(re).multiply(half).max(BigDecimal.ZERO).sqrt(DIGITS);
            BigDecimal up = modulus.subtract(re).multiply(half).max(BigDecimal.ZERO).sqrt(DIGITS);
            return new Complex(across, im.signum() < 0 ? up.negate() : up);
        }

        Complex exponential() {
            Complex term = of(1);
            Complex sum = of(1);
            for (int i = 1; i < TERMS; i++) {
                term = term.times(this).times(of(BigDecimal.ONE.divide(BigDecimal.valueOf(i), DIGITS)));
                sum = sum.plus(term);
            }
            return sum;
        }

        Complex timesI() {
            return new Complex(im.negate(), re);
        }

        boolean isWhole() {
            return re.subtract(re.setScale(0, java.math.RoundingMode.HALF_EVEN)).abs()
                    .compareTo(new BigDecimal("1e-60")) < 0 && im.abs().compareTo(new BigDecimal("1e-60")) < 0;
        }

        int whole() {
            return re.setScale(0, java.math.RoundingMode.HALF_EVEN).intValueExact();
        }
    }

    private final Complex variable;

    private NaiveValue(Complex variable) {
        this.variable = variable;
    }

    static Complex of(Formula formula, BigDecimal variable) {
        return formula.accept(new NaiveValue(Complex.of(variable)));
    }

    @Override
    public Complex number(Formula.Number number) {
        return Complex.of(new BigDecimal(number.value().numerator())
                .divide(new BigDecimal(number.value().denominator()), DIGITS));
    }

    @Override
    public Complex decimal(Formula.WrittenDecimal decimal) {
        return Complex.of(new BigDecimal(decimal.text()));
    }

    @Override
    public Complex symbol(Formula.Symbol symbol) {
        return symbol.name().equals("e") ? Complex.of(1).exponential() : variable;
    }

    @Override
    public Complex constant(Formula.Constant constant) {
        return switch (constant) {
            case PI -> Complex.of(PI);
            case I -> new Complex(BigDecimal.ZERO, BigDecimal.ONE);
            case DEGREE -> Complex.of(PI.divide(BigDecimal.valueOf(180), DIGITS));
        };
    }

    @Override
    public Complex negation(Formula.Negation negation) {
        return Complex.of(-1).times(negation.operand().accept(this));
    }

    @Override
    public Complex sum(Formula.Sum sum) {
        return sum.terms().stream().map(term -> term.accept(this)).reduce(Complex.of(0), Complex::plus);
    }

    @Override
    public Complex product(Formula.Product product) {
        return product.factors().stream().map(factor -> factor.accept(this)).reduce(Complex.of(1), Complex::times);
    }

    @Override
    public Complex quotient(Formula.Quotient quotient) {
        return quotient.numerator().accept(this).times(quotient.denominator().accept(this).inverse());
    }

    @Override
    public Complex power(Formula.Power power) {
        Complex exponent = power.exponent().accept(this);
        if (power.base() instanceof Formula.Symbol symbol && symbol.name().equals("e")) {
            return exponent.exponential();
        }
        Complex base = power.base().accept(this);
        if (exponent.isWhole()) {
            return base.pow(exponent.whole());
        }
        Complex twice = exponent.times(Complex.of(2));
        if (!twice.isWhole()) {
            throw new AssertionError("no half: " + power);
        }
        return base.root().pow(twice.whole());
    }

    @Override
    public Complex call(Formula.Call call) {
        Complex x = call.arguments().get(0).accept(this);
        Complex half = Complex.of(new BigDecimal("0.5"));
        return switch (call.function()) {
            case SQRT -> x.root();
            case COS -> half.times(x.timesI().exponential()
                    .plus(Complex.of(-1).times(x.timesI()).exponential()));
            case SIN -> Complex.of(-1).times(half).timesI().times(x.timesI().exponential()
                    .plus(Complex.of(-1).times(Complex.of(-1).times(x.timesI()).exponential())));
            case EXP -> x.exponential();
            case ARCTAN, ARCCOS -> throw new AssertionError("not by series: " + call);
            case BINOMIAL -> Complex.of(binomial(x.whole(), call.arguments().get(1).accept(this).whole()));
            case DELTA -> Complex.of(x.isWhole() && x.whole() == 0 ? 1 : 0);
        };
    }

    private static BigDecimal binomial(int n, int p) {
        BigInteger value = n < p ? BigInteger.ZERO : BigInteger.ONE;
        for (int i = 1; i <= p; i++) {
            value = value.multiply(BigInteger.valueOf(n - i + 1L)).divide(BigInteger.valueOf(i));
        }
        return new BigDecimal(value);
    }

    @Override
    public Complex rootSum(Formula.RootSum rootSum) {
        throw new AssertionError("not read: " + rootSum);
    }

    @Override
    public Complex cases(Formula.Cases cases) {
        return cases.branches().stream().filter(branch -> branch.holdsAt(variable.whole())).findFirst().orElseThrow()
                .formula().accept(this);
    }
}
