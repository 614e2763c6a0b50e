package org.pofk.meaning;

import java.util.IdentityHashMap;
import java.util.List;
import java.util.Map;

/**
 * The complex conjugate, taken through sums, products, powers and exponentials down to what isn't real; the same object
 * where a quantity is real for plain reasons. Exact; each part once.
 */
final class Conjugating {
    private static final int SIGN_BITS = 64;

    private final Map<Quantity, Quantity> known = new IdentityHashMap<>();

    private Conjugating() {
    }

    static Quantity of(Quantity quantity) {
        return new Conjugating().conjugated(quantity);
    }

    private Quantity conjugated(Quantity quantity) {
        Quantity found = known.get(quantity);
        if (found == null) {
            found = quantity.node().accept(new Rules(quantity));
            known.put(quantity, found);
        }
        return found;
    }

    private final class Rules implements Node.Visitor<Quantity> {
        private final Quantity whole;

        private Rules(Quantity whole) {
            this.whole = whole;
        }

        @Override
        public Quantity number(Node.Number number) {
            return whole;
        }

        @Override
        public Quantity decimal(Node.Decimal decimal) {
            return whole;
        }

        @Override
        public Quantity root(Node.AtRoot root) {
            return root.root().isReal() ? whole : Quantity.of(new Node.Conjugate(whole));
        }

        @Override
        public Quantity constant(Node.Constant constant) {
            return constant == Node.Constant.PI ? whole : whole.negate();
        }

        @Override
        public Quantity sum(Node.Sum sum) {
            List<Quantity> terms = sum.terms().stream().map(Conjugating.this::conjugated).toList();
            boolean same = true;
            for (int i = 0; i < terms.size(); i++) {
                same &= terms.get(i) == sum.terms().get(i);
            }
            return same ? whole : Quantity.sum(terms);
        }

        @Override
        public Quantity product(Node.Product product) {
            Quantity first = conjugated(product.first());
            Quantity second = conjugated(product.second());
            return first == product.first() && second == product.second() ? whole : first.times(second);
        }

        @Override
        public Quantity power(Node.Power power) {
            Quantity base = conjugated(power.base());
            return base == power.base() ? whole : base.pow(power.exponent());
        }

        /** A root of a positive number is real; else the cut on the negative axis decides, and it stays as it is. */
        @Override
        public Quantity radical(Node.Radical radical) {
            Quantity radicand = radical.radicand();
            boolean real = radical.degree() > 2 || radicand.rational().isPresent()
                    || radicand.isWrittenReal() && radicand.enclose(SIGN_BITS).real().isPositive();
            return real ? whole : Quantity.of(new Node.Conjugate(whole));
        }

        @Override
        public Quantity exponential(Node.Exponential exponential) {
            Quantity exponent = conjugated(exponential.exponent());
            return exponent == exponential.exponent() ? whole : exponent.exponential();
        }

        @Override
        public Quantity logarithm(Node.Logarithm logarithm) {
            return whole;
        }

        @Override
        public Quantity angle(Node.Angle angle) {
            return whole;
        }

        @Override
        public Quantity conjugate(Node.Conjugate conjugate) {
            return conjugate.of();
        }

        @Override
        public Quantity realPart(Node.RealPart realPart) {
            return whole;
        }
    }
}
