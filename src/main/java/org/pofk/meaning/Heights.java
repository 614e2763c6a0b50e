package org.pofk.meaning;

import java.math.BigInteger;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.TreeSet;
import org.pofk.exact.CommonDenominator;
import org.pofk.exact.Cyclotomic;
import org.pofk.exact.LeastCommonMultiple;
import org.pofk.exact.Polynomial;
import org.pofk.exact.Rational;
import org.pofk.exact.Root;

/**
 * Bounds on the size of an algebraic number read off how it is written: on the degree D of a field it lies in and on
 * its absolute logarithmic height h. A number that isn't zero then has |x| ≥ 2^(−D·h) (Liouville's inequality; Michel
 * Waldschmidt, Diophantine Approximation on Linear Algebraic Groups, 2000, section 3.5). Certified.
 *
 * <p>h(p/q) = log max(|p|, q); h(xy) ≤ h(x) + h(y); h(x₁ + … + xₙ) ≤ Σ h(xᵢ) + log n; h(xᵐ) = |m| h(x), for fractions m
 * too; h(α) = log M(q)/deg q for a root of an irreducible q, where Mahler's measure M(q) ≤ ‖q‖₂ (Landau); h is zero at
 * roots of unity and the same for conjugates (sections 3.2 and 3.3). D is the product of the degrees of what is
 * irrational, each counted once. For a root of a reducible q both bounds err on the same side: D·h is what matters.
 */
final class Heights extends Walk<Optional<Long>> {
    /** Roots of unity beyond this order aren't tried. */
    private static final int LARGEST_ORDER = 100_000;

    private final Same same = new Same();
    private final Turns.Reading turns = new Turns.Reading(same);
    private final boolean conjugates;
    private final Map<Polynomial<Rational>, Set<Integer>> roots = new HashMap<>();
    private final Map<Integer, Integer> radicals = new HashMap<>();
    private final Map<Integer, Integer> realRadicals = new HashMap<>();
    private final Map<Integer, BigInteger> anglesOver = new HashMap<>();
    private BigInteger order = BigInteger.ONE;

    private Heights(boolean conjugates) {
        this.conjugates = conjugates;
    }

    /**
     * b with |x| ≥ 2^−b unless x is zero; empty where it isn't seen to be algebraic. An {@link ArithmeticException}
     * beyond the range of a long.
     */
    static Optional<Long> separation(Quantity quantity) {
        Heights heights = new Heights(Within.conjugation(quantity));
        return heights.of(quantity).map(height ->
                Logarithm.divideUp(Math.multiplyExact(heights.degree(), height), Logarithm.PER_BIT));
    }

    private long degree() {
        if (order.bitLength() > 31 || order.intValueExact() > LARGEST_ORDER) {
            throw new ArithmeticException("a root of unity of order " + order);
        }
        BigInteger degree = BigInteger.valueOf(Cyclotomic.totient(order.intValueExact()));
        for (Map.Entry<Polynomial<Rational>, Set<Integer>> entry : roots.entrySet()) {
            for (int i = 0; i < entry.getValue().size(); i++) {
                degree = degree.multiply(BigInteger.valueOf(entry.getKey().degree() - i));
            }
        }
        for (BigInteger over : anglesOver.values()) {
            degree = degree.multiply(over).shiftLeft(1);
        }
        for (int radical : realRadicals.values()) {
            degree = degree.multiply(BigInteger.valueOf(radical));
        }
        return degree.shiftLeft((conjugates ? 2 : 1) * radicals.size()).longValueExact();
    }

    private void takeInOrder(BigInteger other) {
        order = LeastCommonMultiple.of(order, other);
    }

    private static Optional<Long> rational(Rational value) {
        return Optional.of(Logarithm.ofMagnitude(value.numerator().abs().max(value.denominator())));
    }

    @Override
    public Optional<Long> number(Node.Number number) {
        return rational(number.value());
    }

    @Override
    public Optional<Long> decimal(Node.Decimal decimal) {
        return rational(decimal.written().value());
    }

    @Override
    public Optional<Long> root(Node.AtRoot node) {
        Root root = node.root();
        Set<Integer> known = roots.computeIfAbsent(root.polynomial(), q -> new TreeSet<>());
        known.add(root.index());
        if (conjugates) {
            known.add(root.conjugateIndex());
        }
        return Optional.of(Logarithm.divideUp(measure(root.polynomial()), root.polynomial().degree()));
    }

    /** At least the logarithm of Mahler's measure of the primitive integer multiple, by Landau's ‖q‖₂. */
    static long measure(Polynomial<Rational> polynomial) {
        BigInteger denominator = CommonDenominator.of(polynomial.coefficients());
        BigInteger squares = polynomial.coefficients().stream()
                .map(c -> c.numerator().multiply(denominator.divide(c.denominator())))
                .map(c -> c.multiply(c)).reduce(BigInteger.ZERO, BigInteger::add);
        return Logarithm.divideUp(Logarithm.ofMagnitude(squares), 2);
    }

    @Override
    public Optional<Long> constant(Node.Constant constant) {
        if (constant == Node.Constant.PI) {
            return Optional.empty();
        }
        takeInOrder(BigInteger.valueOf(4));
        return Optional.of(0L);
    }

    @Override
    public Optional<Long> sum(Node.Sum sum) {
        return total(sum.terms())
                .map(total -> Math.addExact(total, Logarithm.ofMagnitude(sum.terms().size())));
    }

    @Override
    public Optional<Long> product(Node.Product product) {
        return total(List.of(product.first(), product.second()));
    }

    private Optional<Long> total(List<Quantity> parts) {
        Optional<Long> total = Optional.of(0L);
        for (Quantity part : parts) {
            total = total.flatMap(before -> of(part).map(height -> Math.addExact(before, height)));
        }
        return total;
    }

    @Override
    public Optional<Long> power(Node.Power power) {
        return of(power.base()).map(height -> Math.multiplyExact(height, Math.abs((long) power.exponent())));
    }

    @Override
    public Optional<Long> radical(Node.Radical radical) {
        boolean real = radical.degree() > 2 || radical.radicand().rational().isPresent();
        (real ? realRadicals : radicals).put(same.numberOf(radical), radical.degree());
        return of(radical.radicand()).map(height -> Logarithm.divideUp(height, radical.degree()));
    }

    /** e^(iπ p/q) is a root of unity; for others see {@link #rotation}. */
    @Override
    public Optional<Long> exponential(Node.Exponential exponential) {
        Optional<Turns> exponent = turns.of(exponential.exponent()).filter(Turns::isRotation);
        if (exponent.isEmpty()) {
            return Optional.empty();
        }
        takeInOrder(exponent.get().pi().imaginary().denominator().shiftLeft(1));
        Optional<Long> total = Optional.of(0L);
        for (Map.Entry<Integer, Turns.Gaussian> angle : exponent.get().angles().entrySet()) {
            total = total.flatMap(before -> rotation(angle.getKey(), angle.getValue().imaginary())
                    .map(height -> Math.addExact(before, height)));
        }
        return total;
    }

    /**
     * e^(iqa). w = e^(i arccos x) is a root of w² − 2xw + 1, so 2h(w) ≤ h(x) + log √6 place by place (Landau at the
     * infinite ones); e^(2i arctan x) = (1 + ix)/(1 − ix) has at most height h(x) + log 2. Of degree twice the
     * denominator of q over what x and i give.
     */
    private Optional<Long> rotation(int angleNumber, Rational times) {
        Node.Angle angle = (Node.Angle) same.withNumber(angleNumber);
        takeInOrder(BigInteger.valueOf(4));
        anglesOver.merge(angleNumber, times.denominator(), LeastCommonMultiple::of);
        return of(angle.argument()).map(height -> {
            long doubled = Math.addExact(height, 2 * Logarithm.PER_BIT);
            BigInteger total = BigInteger.valueOf(doubled).multiply(times.numerator().abs());
            BigInteger over = times.denominator().shiftLeft(1);
            return total.add(over).subtract(BigInteger.ONE).divide(over).longValueExact();
        });
    }

    @Override
    public Optional<Long> logarithm(Node.Logarithm logarithm) {
        return Optional.empty();
    }

    @Override
    public Optional<Long> angle(Node.Angle angle) {
        return Optional.empty();
    }

    @Override
    public Optional<Long> conjugate(Node.Conjugate conjugate) {
        return of(conjugate.of());
    }

    /** (x + x̄)/2. */
    @Override
    public Optional<Long> realPart(Node.RealPart realPart) {
        return of(realPart.of()).map(height -> Math.addExact(Math.multiplyExact(2, height), 2 * Logarithm.PER_BIT));
    }
}
