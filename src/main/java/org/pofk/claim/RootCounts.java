package org.pofk.claim;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.pofk.exact.Polynomial;
import org.pofk.exact.Rational;
import org.pofk.exact.RationalField;
import org.pofk.meaning.Quantity;

/** Zeros with how often each is taken. Exact. */
record RootCounts(Map<FormPole, Integer> counts) {

    /** The monic polynomial with these zeros: in rational coefficients as far as whole factors are taken. */
    List<Quantity> polynomial() {
        Map<FormPole, Integer> left = new LinkedHashMap<>(counts);
        Polynomial<Rational> rational = Polynomial.one(RationalField.Q);
        for (Polynomial<Rational> factor : counts.keySet().stream().map(FormPole::of).distinct().toList()) {
            List<FormPole> roots = left.keySet().stream().filter(pole -> pole.of().equals(factor)).toList();
            if (roots.size() == factor.degree()) {
                int times = roots.stream().mapToInt(left::get).min().orElse(0);
                rational = rational.times(factor.pow(times));
                roots.forEach(root -> left.merge(root, -times, Integer::sum));
            }
        }
        List<Quantity> product = QuantityPolynomials.of(rational);
        for (List<Quantity> factor : realFactors(left)) {
            product = QuantityPolynomials.times(product, factor);
        }
        return product;
    }

    /** Linear factors, and z² − 2 Re λ z + |λ|² for pairs. */
    private static List<List<Quantity>> realFactors(Map<FormPole, Integer> counts) {
        Map<FormPole, Integer> left = new LinkedHashMap<>(counts);
        List<List<Quantity>> factors = new ArrayList<>();
        for (FormPole pole : List.copyOf(left.keySet())) {
            while (left.get(pole) > 0) {
                left.merge(pole, -1, Integer::sum);
                FormPole other = pole.conjugate(List.copyOf(left.keySet())).filter(each -> left.get(each) > 0)
                        .orElse(pole);
                if (other == pole) {
                    factors.add(QuantityPolynomials.withRoot(pole.value()));
                } else {
                    left.merge(other, -1, Integer::sum);
                    Quantity value = pole.value();
                    factors.add(List.of(value.times(value.conjugate()).realPart(),
                            value.realPart().times(Rational.of(-2)), Quantity.ONE));
                }
            }
        }
        return factors;
    }

    int degree() {
        return counts.values().stream().mapToInt(Integer::intValue).sum();
    }
}
