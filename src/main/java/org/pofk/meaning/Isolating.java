package org.pofk.meaning;

import java.util.ArrayList;
import java.util.IdentityHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/** Solves an equation for a decimal that occurs in it once, by undoing what is done to it from the outside in. Exact. */
final class Isolating implements Node.Visitor<Optional<Quantity>> {
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

    @Override
    public Optional<Quantity> power(Node.Power power) {
        return power.exponent() == -1 && target.isZero() == Decision.NO
                ? goOn(power.base(), target.inverse())
                : Optional.empty();
    }

    @Override
    public Optional<Quantity> squareRoot(Node.SquareRoot squareRoot) {
        boolean main = target.isReal() == Decision.YES && target.sign().filter(sign -> sign >= 0).isPresent();
        return main ? goOn(squareRoot.radicand(), target.pow(2)) : Optional.empty();
    }

    @Override
    public Optional<Quantity> exponential(Node.Exponential exponential) {
        return Optional.empty();
    }

    @Override
    public Optional<Quantity> angle(Node.Angle angle) {
        return Optional.empty();
    }

    @Override
    public Optional<Quantity> conjugate(Node.Conjugate conjugate) {
        return goOn(conjugate.of(), target.conjugate());
    }

    @Override
    public Optional<Quantity> realPart(Node.RealPart realPart) {
        return Optional.empty();
    }
}
