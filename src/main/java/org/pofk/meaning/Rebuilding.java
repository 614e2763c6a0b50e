package org.pofk.meaning;

import java.util.List;
import java.util.Map;

/** A quantity put together anew with other numbers in place of some decimals. Exact; each part once. */
final class Rebuilding extends Walk<Quantity> {
    private final Map<Written, Quantity> replacements;

    private Rebuilding(Map<Written, Quantity> replacements) {
        this.replacements = replacements;
    }

    static Quantity with(Quantity quantity, Map<Written, Quantity> replacements) {
        return new Rebuilding(replacements).of(quantity);
    }

    @Override
    public Quantity number(Node.Number number) {
        return Quantity.of(number.value());
    }

    @Override
    public Quantity decimal(Node.Decimal decimal) {
        return replacements.getOrDefault(decimal.written(), Quantity.of(decimal.written()));
    }

    @Override
    public Quantity root(Node.AtRoot root) {
        return Quantity.of(root.root());
    }

    @Override
    public Quantity constant(Node.Constant constant) {
        return constant == Node.Constant.PI ? Quantity.pi() : Quantity.i();
    }

    @Override
    public Quantity sum(Node.Sum sum) {
        List<Quantity> terms = sum.terms().stream().map(this::of).toList();
        return Quantity.sum(terms);
    }

    @Override
    public Quantity product(Node.Product product) {
        return of(product.first()).times(of(product.second()));
    }

    @Override
    public Quantity power(Node.Power power) {
        return of(power.base()).pow(power.exponent());
    }

    @Override
    public Quantity radical(Node.Radical radical) {
        return of(radical.radicand()).root(radical.degree());
    }

    @Override
    public Quantity exponential(Node.Exponential exponential) {
        return of(exponential.exponent()).exponential();
    }

    @Override
    public Quantity logarithm(Node.Logarithm logarithm) {
        return of(logarithm.of()).logarithm();
    }

    @Override
    public Quantity angle(Node.Angle angle) {
        return switch (angle.of()) {
            case TANGENT -> of(angle.argument()).arctangent();
            case COSINE -> of(angle.argument()).arccosine();
        };
    }

    @Override
    public Quantity conjugate(Node.Conjugate conjugate) {
        return of(conjugate.of()).conjugate();
    }

    @Override
    public Quantity realPart(Node.RealPart realPart) {
        return of(realPart.of()).realPart();
    }
}
