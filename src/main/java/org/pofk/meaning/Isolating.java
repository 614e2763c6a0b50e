package org.pofk.meaning;

import java.util.ArrayList;
import java.util.IdentityHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.pofk.exact.Rational;

/** Solves an equation for a decimal that occurs in it once, by undoing what is done to it from the outside in. Exact. */
final class Isolating implements Node.Visitor<Optional<Quantity>> {
    /** Highest power that is undone: the root of a higher one costs its degree in digits, and nobody writes it. */
    private static final int MOST_DEGREE = 64;
    private static final Quantity QUARTER_TURN = Quantity.pi().times(Rational.HALF);

    private final Occurrences occurrences;
    private final Quantity target;

    private Isolating(Occurrences occurrences, Quantity target) {
        this.occurrences = occurrences;
        this.target = target;
    }

    /** The value of the decimal with which written = target; empty where it can't be isolated. */
    static Optional<Quantity> solve(Quantity written, Written unknown, Quantity target) {
        Occurrences occurrences = new Occurrences(unknown);
        return occurrences.in(written) == 1
                ? written.node().accept(new Isolating(occurrences, target))
                : Optional.empty();
    }

    private Optional<Quantity> goOn(Quantity part, Quantity value) {
        return part.node().accept(new Isolating(occurrences, value));
    }

    /** How often a decimal occurs, a shared part counted wherever it stands; two stands for more. */
    private static final class Occurrences {
        private final Written unknown;
        private final Map<Quantity, Integer> known = new IdentityHashMap<>();

        Occurrences(Written unknown) {
            this.unknown = unknown;
        }

        int in(Quantity quantity) {
            Integer found = known.get(quantity);
            if (found == null) {
                found = quantity.writtenDecimal().filter(unknown::equals).isPresent() ? 1
                        : Math.min(2, Parts.of(quantity).stream().mapToInt(this::in).sum());
                known.put(quantity, found);
            }
            return found;
        }
    }

    private AssertionError notHere() {
        return new AssertionError("the decimal isn't in this part");
    }

    @Override
    public Optional<Quantity> number(Node.Number number) {
        throw notHere();
    }

    @Override
    public Optional<Quantity> decimal(Node.Decimal decimal) {
        return Optional.of(target);
    }

    @Override
    public Optional<Quantity> root(Node.AtRoot root) {
        throw notHere();
    }

    @Override
    public Optional<Quantity> constant(Node.Constant constant) {
        throw notHere();
    }

    @Override
    public Optional<Quantity> sum(Node.Sum sum) {
        List<Quantity> others = new ArrayList<>(List.of(target));
        Quantity with = Quantity.ZERO;
        for (Quantity term : sum.terms()) {
            if (occurrences.in(term) == 1) {
                with = term;
            } else {
                others.add(term.negate());
            }
        }
        return goOn(with, Quantity.sum(others));
    }

    @Override
    public Optional<Quantity> product(Node.Product product) {
        boolean first = occurrences.in(product.first()) == 1;
        Quantity with = first ? product.first() : product.second();
        Quantity other = first ? product.second() : product.first();
        return other.isZero() == Decision.NO ? goOn(with, target.dividedBy(other)) : Optional.empty();
    }

    /** The real root with the sign that the base has at face value, where there are two; of a degree worth its work. */
    @Override
    public Optional<Quantity> power(Node.Power power) {
        Optional<Integer> sign = sign(target);
        if (sign.isEmpty() || sign.get() == 0) {
            return Optional.empty();
        }
        int degree = Math.abs(power.exponent());
        if (degree > MOST_DEGREE) {
            return Optional.empty();
        }
        Quantity raised = power.exponent() < 0 ? target.inverse() : target;
        if (degree % 2 == 1) {
            return goOn(power.base(), sign.get() < 0 ? raised.negate().root(degree).negate() : raised.root(degree));
        }
        boolean negative = sign(power.base()).filter(s -> s < 0).isPresent();
        return sign.get() < 0
                ? Optional.empty()
                : goOn(power.base(), negative ? raised.root(degree).negate() : raised.root(degree));
    }

    /** The sign of what is real; empty for what isn't, and where it isn't decided. */
    private static Optional<Integer> sign(Quantity quantity) {
        return quantity.isReal() == Decision.YES ? quantity.sign() : Optional.empty();
    }

    private static boolean isPositive(Quantity quantity) {
        return sign(quantity).filter(sign -> sign > 0).isPresent();
    }

    private static boolean isNotNegative(Quantity quantity) {
        return sign(quantity).filter(sign -> sign >= 0).isPresent();
    }

    @Override
    public Optional<Quantity> radical(Node.Radical radical) {
        return isNotNegative(target) ? goOn(radical.radicand(), target.pow(radical.degree())) : Optional.empty();
    }

    /** Of a real exponent. */
    @Override
    public Optional<Quantity> exponential(Node.Exponential exponential) {
        return isPositive(target) && exponential.exponent().isReal() == Decision.YES
                ? goOn(exponential.exponent(), target.logarithm())
                : Optional.empty();
    }

    @Override
    public Optional<Quantity> logarithm(Node.Logarithm logarithm) {
        return sign(target).isPresent() ? goOn(logarithm.of(), target.exponential()) : Optional.empty();
    }

    @Override
    public Optional<Quantity> angle(Node.Angle angle) {
        return switch (angle.of()) {
            case TANGENT -> isPositive(QUARTER_TURN.minus(target)) && isPositive(QUARTER_TURN.plus(target))
                    ? goOn(angle.argument(), target.sine().dividedBy(target.cosine()))
                    : Optional.empty();
            case COSINE -> isNotNegative(target) && isNotNegative(Quantity.pi().minus(target))
                    ? goOn(angle.argument(), target.cosine())
                    : Optional.empty();
        };
    }

    @Override
    public Optional<Quantity> conjugate(Node.Conjugate conjugate) {
        return goOn(conjugate.of(), target.conjugate());
    }

    /** cos x = target: of the x with this cosine, the one nearest to x at face value. */
    @Override
    public Optional<Quantity> realPart(Node.RealPart realPart) {
        if (!(realPart.of().node() instanceof Node.Exponential exponential)
                || !isNotNegative(Quantity.ONE.minus(target)) || !isNotNegative(Quantity.ONE.plus(target))) {
            return Optional.empty();
        }
        Quantity x = Quantity.i().negate().times(exponential.exponent());
        return x.isReal() == Decision.YES
                ? goOn(exponential.exponent(), Quantity.i().times(nearest(target.arccosine(), x)))
                : Optional.empty();
    }

    /** Of ±angle + 2πn the nearest to x; any of them solves the equation, so doubles may choose. */
    private static Quantity nearest(Quantity angle, Quantity x) {
        double wanted = approximate(x);
        double size = approximate(angle);
        long up = Math.round((wanted - size) / (2 * Math.PI));
        long down = Math.round((wanted + size) / (2 * Math.PI));
        boolean isUp = Math.abs(size + 2 * Math.PI * up - wanted) <= Math.abs(-size + 2 * Math.PI * down - wanted);
        return (isUp ? angle : angle.negate()).plus(Quantity.pi().times(Rational.of(2 * (isUp ? up : down))));
    }

    private static double approximate(Quantity real) {
        return real.enclose(64).real().middle().approximate();
    }
}
