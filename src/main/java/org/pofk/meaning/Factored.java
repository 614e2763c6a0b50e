package org.pofk.meaning;

import org.pofk.exact.Rational;

/**
 * A quantity as factor · i^quarterTurns · rest, as far as factor and i are written in front; so written it is
 * factor · (i · rest). Exact. Canonical form: no quarter turns but 0 and 1, the factor not zero.
 */
record Factored(Rational factor, int quarterTurns, Quantity rest) {
    private static final Factored I = new Factored(Rational.ONE, 1, Quantity.ONE);

    Factored {
        quarterTurns = Math.floorMod(quarterTurns, 4);
        if (quarterTurns > 1) {
            quarterTurns -= 2;
            factor = factor.negate();
        }
    }

    /** Of what isn't written as zero. */
    static Factored of(Quantity quantity) {
        if (quantity.node() == Node.Constant.I) {
            return I;
        }
        if (quantity.node() instanceof Node.Number number && Quantity.isShort(number.value())) {
            return new Factored(number.value(), 0, Quantity.ONE);
        }
        return quantity.node() instanceof Node.Product product && isFront(product.first())
                ? of(product.first()).times(of(product.second()))
                : new Factored(Rational.ONE, 0, quantity);
    }

    private static boolean isFront(Quantity first) {
        return first.node() == Node.Constant.I || first.rational().filter(Quantity::isShort).isPresent();
    }

    Factored times(Factored other) {
        return new Factored(factor.times(other.factor), quarterTurns + other.quarterTurns,
                isOne(rest) ? other.rest : isOne(other.rest) ? rest
                        : Quantity.of(new Node.Product(rest, other.rest)));
    }

    private static boolean isOne(Quantity quantity) {
        return quantity.rational().filter(Rational::isOne).isPresent();
    }

    Quantity product() {
        Quantity turned = quarterTurns == 0 ? rest
                : isOne(rest) ? Quantity.i() : Quantity.of(new Node.Product(Quantity.i(), rest));
        if (isOne(turned)) {
            return Quantity.of(factor);
        }
        return factor.isOne() ? turned : Quantity.of(new Node.Product(Quantity.of(factor), turned));
    }
}
