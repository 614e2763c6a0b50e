package org.pofk.meaning;

import java.util.stream.Collectors;

/** A quantity as text, for messages and assertions; a shared part is written wherever it stands. */
final class Telling extends Walk<String> {
    private Telling() {
    }

    static String text(Quantity quantity) {
        return new Telling().of(quantity);
    }

    @Override
    public String number(Node.Number number) {
        return number.value().toString();
    }

    @Override
    public String decimal(Node.Decimal decimal) {
        return decimal.written().text();
    }

    @Override
    public String root(Node.AtRoot root) {
        return "(root " + root.root().index() + " of " + root.root().polynomial() + ")";
    }

    @Override
    public String constant(Node.Constant constant) {
        return constant == Node.Constant.PI ? "pi" : "i";
    }

    @Override
    public String sum(Node.Sum sum) {
        return sum.terms().stream().map(this::of).collect(Collectors.joining(" + ", "(", ")"));
    }

    @Override
    public String product(Node.Product product) {
        return of(product.first()) + "*" + of(product.second());
    }

    @Override
    public String power(Node.Power power) {
        return "(" + of(power.base()) + ")^" + power.exponent();
    }

    @Override
    public String radical(Node.Radical radical) {
        return radical.degree() == 2
                ? "sqrt(" + of(radical.radicand()) + ")"
                : "(" + of(radical.radicand()) + ")^(1/" + radical.degree() + ")";
    }

    @Override
    public String exponential(Node.Exponential exponential) {
        return "exp(" + of(exponential.exponent()) + ")";
    }

    @Override
    public String logarithm(Node.Logarithm logarithm) {
        return "log(" + of(logarithm.of()) + ")";
    }

    @Override
    public String angle(Node.Angle angle) {
        return (angle.of() == Node.Angle.Inverse.TANGENT ? "arctan(" : "arccos(") + of(angle.argument()) + ")";
    }

    @Override
    public String conjugate(Node.Conjugate conjugate) {
        return "conj(" + of(conjugate.of()) + ")";
    }

    @Override
    public String realPart(Node.RealPart realPart) {
        return "re(" + of(realPart.of()) + ")";
    }
}
