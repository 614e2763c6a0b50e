package org.pofk.formula;

import org.apache.commons.math3.complex.Complex;
import org.pofk.exact.Rational;

/** The value of a formula's tree at k = 3, with letters as {@link PrintedLatex} has them. Approximate, in doubles. */
final class TreeValue implements Formula.Visitor<Complex> {

    static Complex of(Formula formula) {
        return formula.accept(new TreeValue());
    }

    @Override
    public Complex number(Formula.Number number) {
        Rational value = number.value();
        return new Complex(value.numerator().doubleValue() / value.denominator().doubleValue());
    }

    @Override
    public Complex decimal(Formula.WrittenDecimal decimal) {
        return new Complex(Double.parseDouble(decimal.text()));
    }

    @Override
    public Complex symbol(Formula.Symbol symbol) {
        if (symbol.name().length() > 1 || !Character.isLetter(symbol.name().charAt(0))) {
            throw new PrintedLatex.Unclear(symbol.name());
        }
        return PrintedLatex.letter(symbol.name().charAt(0));
    }

    @Override
    public Complex constant(Formula.Constant constant) {
        return switch (constant) {
            case PI -> new Complex(Math.PI);
            case I -> Complex.I;
            case DEGREE -> new Complex(Math.PI / 180);
        };
    }

    @Override
    public Complex negation(Formula.Negation negation) {
        return of(negation.operand()).negate();
    }

    @Override
    public Complex sum(Formula.Sum sum) {
        return sum.terms().stream().map(TreeValue::of).reduce(Complex.ZERO, Complex::add);
    }

    @Override
    public Complex product(Formula.Product product) {
        return product.factors().stream().map(TreeValue::of).reduce(Complex.ONE, Complex::multiply);
    }

    @Override
    public Complex quotient(Formula.Quotient quotient) {
        return of(quotient.numerator()).divide(of(quotient.denominator()));
    }

    @Override
    public Complex power(Formula.Power power) {
        Complex base = of(power.base());
        Complex exponent = of(power.exponent());
        boolean isWhole = exponent.getImaginary() == 0 && exponent.getReal() == Math.rint(exponent.getReal())
                && Math.abs(exponent.getReal()) < 1000;
        if (!isWhole) {
            return new Complex(base.getReal(), base.getImaginary() + 0.0).pow(exponent);
        }
        Complex value = Complex.ONE;
        for (int i = 0; i < Math.abs(exponent.getReal()); i++) {
            value = value.multiply(base);
        }
        return exponent.getReal() < 0 ? value.reciprocal() : value;
    }

    @Override
    public Complex call(Formula.Call call) {
        Complex x = of(call.arguments().get(0));
        return switch (call.function()) {
            case SQRT -> x.sqrt();
            case COS -> x.cos();
            case SIN -> x.sin();
            case EXP -> x.exp();
            case BINOMIAL -> {
                double value = 1;
                for (int i = 0; i < (int) of(call.arguments().get(1)).getReal(); i++) {
                    value *= (x.getReal() - i) / (i + 1);
                }
                yield new Complex(value);
            }
            default -> throw new PrintedLatex.Unclear(call.function().name());
        };
    }

    @Override
    public Complex rootSum(Formula.RootSum rootSum) {
        throw new AssertionError("nothing is read as a sum over roots");
    }

    @Override
    public Complex cases(Formula.Cases cases) {
        throw new PrintedLatex.Unclear("cases");
    }
}
