package org.pofk.answer;

import java.io.OutputStream;
import java.io.PrintStream;
import org.matheclipse.core.basic.Config;
import org.matheclipse.core.eval.EvalEngine;
import org.matheclipse.core.expression.F;
import org.matheclipse.core.interfaces.IASTAppendable;
import org.matheclipse.core.interfaces.IExpr;
import org.matheclipse.core.interfaces.ISymbol;
import org.pofk.exact.Factorization;
import org.pofk.exact.Polynomial;
import org.pofk.exact.Rational;
import org.pofk.modes.Expansion;
import org.pofk.transform.TransferFunction;

/**
 * Questions put to Symja as trees built here, never as text. The only class that touches it, so that it is loaded only
 * when it is asked. Each call makes an engine of its own in the calling thread, whose messages go nowhere.
 */
final class SymjaQuestions {
    static {
        // before any other class of Symja is touched: its thread pool would keep the program alive
        Config.JAS_NO_THREADS = true;
    }

    private final EvalEngine engine;
    private final ISymbol z;

    private SymjaQuestions() {
        PrintStream nowhere = new PrintStream(OutputStream.nullOutputStream(), true);
        engine = new EvalEngine("second-opinion", 256, 1000, nowhere, nowhere, true);
        EvalEngine.set(engine);
        z = F.Dummy("z");
    }

    /** unit · Π factor^multiplicity − denominator expands to zero. */
    static boolean factorsMultiplyOut(Factorization<Rational> factors, Polynomial<Rational> denominator) {
        SymjaQuestions symja = new SymjaQuestions();
        IASTAppendable product = F.TimesAlloc(factors.factors().size() + 1);
        product.append(symja.number(factors.unit()));
        for (Factorization.Factor<Rational> factor : factors.factors()) {
            product.append(F.Power(symja.polynomial(factor.polynomial()), F.ZZ(factor.multiplicity())));
        }
        return symja.engine.evaluate(F.Expand(F.Subtract(product, symja.polynomial(denominator)))).isZero();
    }

    /**
     * Σ impulse_i z^(−i) + z Σ_q Σ_p Σ_λ R(λ)/(z−λ)^(p+1) − N/D is zero once put over one denominator. The sum over the
     * roots is (−1)^p/p! times the p-th derivative of P/q with P = R q′ modulo q, which the system works out itself.
     */
    static boolean addsUp(Expansion<Rational> expansion, TransferFunction<Rational> y) {
        SymjaQuestions symja = new SymjaQuestions();
        IASTAppendable sum = F.PlusAlloc(8);
        for (int i = 0; i < expansion.impulses().size(); i++) {
            sum.append(F.Times(symja.number(expansion.impulses().get(i)), F.Power(symja.z, F.ZZ(-i))));
        }
        for (Expansion.Part<Rational> part : expansion.parts()) {
            for (int power = 0; power < part.coefficients().size(); power++) {
                sum.append(F.Times(symja.z, symja.overRoots(part, power)));
            }
        }
        IExpr difference = F.Subtract(sum,
                F.Divide(symja.polynomial(y.numerator()), symja.polynomial(y.denominator())));
        return symja.engine.evaluate(F.Together(difference)).isZero();
    }

    private IExpr overRoots(Expansion.Part<Rational> part, int power) {
        IExpr factor = polynomial(part.factor().polynomial());
        Expansion.Coefficient<Rational> coefficient = part.coefficients().get(power);
        IExpr product = F.Expand(F.Times(polynomial(coefficient.numerator()), F.D(factor, z)));
        IExpr numerator = engine.evaluate(F.PolynomialRemainder(product, factor, z));
        IExpr fraction = F.Divide(numerator, factor);
        IExpr derivative = power == 0 ? fraction : engine.evaluate(F.D(fraction, F.List(z, F.ZZ(power))));
        return F.Times(number(sign(power).dividedBy(factorial(power))), derivative);
    }

    private static Rational sign(int power) {
        return power % 2 == 0 ? Rational.ONE : Rational.ONE.negate();
    }

    private static Rational factorial(int n) {
        Rational product = Rational.ONE;
        for (int i = 2; i <= n; i++) {
            product = product.times(Rational.of(i));
        }
        return product;
    }

    private IExpr polynomial(Polynomial<Rational> polynomial) {
        IASTAppendable sum = F.PlusAlloc(polynomial.degree() + 2);
        for (int i = 0; i <= polynomial.degree(); i++) {
            if (!polynomial.coefficient(i).isZero()) {
                sum.append(F.Times(number(polynomial.coefficient(i)), F.Power(z, F.ZZ(i))));
            }
        }
        return engine.evaluate(sum);
    }

    private IExpr number(Rational value) {
        return F.QQ(F.ZZ(value.numerator()), F.ZZ(value.denominator()));
    }
}
