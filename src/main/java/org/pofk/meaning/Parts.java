package org.pofk.meaning;

import java.util.List;

/** What a quantity is put together from, in order of reading. */
final class Parts implements Node.Visitor<List<Quantity>> {
    private static final Parts PARTS = new Parts();

    private Parts() {
    }

    static List<Quantity> of(Quantity quantity) {
        return quantity.node().accept(PARTS);
    }

    @Override
    public List<Quantity> number(Node.Number number) {
        return List.of();
    }

    @Override
    public List<Quantity> decimal(Node.Decimal decimal) {
        return List.of();
    }

    @Override
    public List<Quantity> root(Node.AtRoot root) {
        return List.of();
    }

    @Override
    public List<Quantity> constant(Node.Constant constant) {
        return List.of();
    }

    @Override
    public List<Quantity> sum(Node.Sum sum) {
        return sum.terms();
    }

    @Override
    public List<Quantity> product(Node.Product product) {
        return List.of(product.first(), product.second());
    }

    @Override
    public List<Quantity> power(Node.Power power) {
        return List.of(power.base());
    }

    @Override
    public List<Quantity> radical(Node.Radical radical) {
        return List.of(radical.radicand());
    }

    @Override
    public List<Quantity> exponential(Node.Exponential exponential) {
        return List.of(exponential.exponent());
    }

    @Override
    public List<Quantity> logarithm(Node.Logarithm logarithm) {
        return List.of(logarithm.of());
    }

    @Override
    public List<Quantity> angle(Node.Angle angle) {
        return List.of(angle.argument());
    }

    @Override
    public List<Quantity> conjugate(Node.Conjugate conjugate) {
        return List.of(conjugate.of());
    }

    @Override
    public List<Quantity> realPart(Node.RealPart realPart) {
        return List.of(realPart.of());
    }
}
