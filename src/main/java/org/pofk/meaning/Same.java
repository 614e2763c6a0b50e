package org.pofk.meaning;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import org.pofk.exact.Rational;
import org.pofk.exact.Root;

/**
 * Numbers quantities so that those put together alike have the same number, wherever they stand: what is irrational
 * counts once then. Decimals are alike when their face values are. Exact; each part once.
 */
final class Same extends Walk<Integer> {
    private final Map<List<Object>, Integer> numbers = new HashMap<>();
    private final List<Node> byNumber = new ArrayList<>();

    /** The number of an expression; {@link #withNumber} leads back. */
    int numberOf(Node node) {
        return node.accept(this);
    }

    /** The first expression that was given this number. */
    Node withNumber(int number) {
        return byNumber.get(number);
    }

    private int number(Node node, Object... signature) {
        List<Object> key = List.of(signature);
        Integer known = numbers.get(key);
        if (known == null) {
            known = byNumber.size();
            byNumber.add(node);
            numbers.put(key, known);
        }
        return known;
    }

    private int rational(Node node, Rational value) {
        return number(node, "rational", value);
    }

    @Override
    public Integer number(Node.Number number) {
        return rational(number, number.value());
    }

    @Override
    public Integer decimal(Node.Decimal decimal) {
        return rational(decimal, decimal.written().value());
    }

    @Override
    public Integer root(Node.AtRoot root) {
        Root at = root.root();
        return number(root, "root", at.polynomial(), at.index());
    }

    @Override
    public Integer constant(Node.Constant constant) {
        return number(constant, constant);
    }

    @Override
    public Integer sum(Node.Sum sum) {
        return number(sum, "sum", sum.terms().stream().map(this::of).sorted().toList());
    }

    @Override
    public Integer product(Node.Product product) {
        int first = of(product.first());
        int second = of(product.second());
        return number(product, "product", Math.min(first, second), Math.max(first, second));
    }

    @Override
    public Integer power(Node.Power power) {
        return number(power, "power", of(power.base()), power.exponent());
    }

    @Override
    public Integer radical(Node.Radical radical) {
        return number(radical, "root", radical.degree(), of(radical.radicand()));
    }

    @Override
    public Integer exponential(Node.Exponential exponential) {
        return number(exponential, "exponential", of(exponential.exponent()));
    }

    @Override
    public Integer logarithm(Node.Logarithm logarithm) {
        return number(logarithm, "logarithm", of(logarithm.of()));
    }

    @Override
    public Integer angle(Node.Angle angle) {
        return number(angle, angle.of(), of(angle.argument()));
    }

    @Override
    public Integer conjugate(Node.Conjugate conjugate) {
        return number(conjugate, "conjugate", of(conjugate.of()));
    }

    @Override
    public Integer realPart(Node.RealPart realPart) {
        return number(realPart, "real part", of(realPart.of()));
    }
}
