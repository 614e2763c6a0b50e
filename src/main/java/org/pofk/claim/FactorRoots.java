package org.pofk.claim;

import java.util.ArrayList;
import java.util.Collections;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.stream.Collectors;
import org.pofk.exact.Factoring;
import org.pofk.exact.Factorization.Factor;
import org.pofk.exact.Polynomial;
import org.pofk.exact.Rational;
import org.pofk.exact.RationalField;
import org.pofk.exact.Root;
import org.pofk.exact.Roots;
import org.pofk.meaning.Quantity;
import org.pofk.meaning.RationalForm;

/**
 * Which roots of a polynomial the factors that an author splits it into should have: each factor's own roots, at face
 * value, are matched with the nearest. A guess; that the factor then is the product over these roots is for the caller
 * to prove.
 */
final class FactorRoots {
    private static final int BITS = 96;

    private FactorRoots() {
    }

    /**
     * One factor as often as it stands there, with the monic polynomial it should be but for a constant.
     *
     * @param right coefficients by ascending power
     */
    record Matched(RationalForm.Factor factor, List<Quantity> right) {
        Matched {
            right = List.copyOf(right);
        }
    }

    private record Own(int entry, Quantity root) {
    }

    /** Empty where the degrees don't add up, or the roots of a factor aren't found. */
    static Optional<List<Matched>> of(List<RationalForm.Factor> factors, Polynomial<Rational> polynomial) {
        List<RationalForm.Factor> entries = factors.stream()
                .flatMap(factor -> Collections.nCopies(Math.abs(factor.exponent()), factor).stream()).toList();
        if (entries.stream().mapToInt(RationalForm.Factor::degree).sum() != polynomial.degree()) {
            return Optional.empty();
        }
        List<Own> own = new ArrayList<>();
        for (int entry = 0; entry < entries.size(); entry++) {
            Optional<List<Quantity>> roots = roots(entries.get(entry));
            if (roots.isEmpty()) {
                return Optional.empty();
            }
            for (Quantity root : roots.get()) {
                own.add(new Own(entry, root));
            }
        }
        List<Root> right = repeatedRoots(polynomial);
        Matching matching = Matching.of(own.stream().map(Own::root).toList(), right.stream().map(Quantity::of).toList());
        List<Matched> matched = new ArrayList<>();
        for (int entry = 0; entry < entries.size(); entry++) {
            List<Root> taken = new ArrayList<>();
            for (int i = 0; i < own.size(); i++) {
                if (own.get(i).entry == entry) {
                    taken.add(right.get(matching.partners().get(i)));
                }
            }
            matched.add(new Matched(entries.get(entry), product(taken)));
        }
        return Optional.of(matched);
    }

    /** All roots of a polynomial, each as often as it is one. */
    private static List<Root> repeatedRoots(Polynomial<Rational> polynomial) {
        List<Root> roots = new ArrayList<>();
        for (Factor<Rational> factor : Factoring.of(polynomial).factors()) {
            for (Root root : Roots.of(factor.polynomial()).all()) {
                roots.addAll(Collections.nCopies(factor.multiplicity(), root));
            }
        }
        return roots;
    }

    /** The roots of a factor as it is written, near enough to tell which is which. */
    private static Optional<List<Quantity>> roots(RationalForm.Factor factor) {
        if (factor.degree() == 1) {
            return Optional.of(List.of(
                    factor.coefficients().get(0).dividedBy(factor.coefficients().get(1)).negate()));
        }
        if (factor.coefficients().stream().anyMatch(each -> !each.enclose(BITS).imaginary().containsZero())) {
            return Optional.empty();
        }
        Polynomial<Rational> face = Polynomial.ofRationals(factor.coefficients().stream()
                .map(each -> AtFaceValue.of(each).rational().orElseGet(() -> each.enclose(BITS).real().middle())).toList());
        return face.degree() < factor.degree() ? Optional.empty()
                : Optional.of(repeatedRoots(face).stream().map(Quantity::of).toList());
    }

    /** Π (z − λ): all roots of one polynomial together are that polynomial, so that numbers stay rational. */
    private static List<Quantity> product(List<Root> roots) {
        List<Root> left = new ArrayList<>(roots);
        Polynomial<Rational> rational = Polynomial.one(RationalField.Q);
        Set<Polynomial<Rational>> owners = roots.stream().map(Root::polynomial).collect(Collectors.toSet());
        for (Polynomial<Rational> owner : owners) {
            List<Root> own = roots.stream().filter(root -> root.polynomial().equals(owner)).toList();
            Set<Integer> places = new HashSet<>(own.stream().map(Root::index).toList());
            if (own.size() == owner.degree() && places.size() == owner.degree()) {
                rational = rational.times(owner);
                left.removeAll(own);
            }
        }
        List<Quantity> product = rational.coefficients().stream().map(Quantity::of).toList();
        for (Root root : left) {
            product = times(product, Quantity.of(root));
        }
        return product;
    }

    /** The product with z − λ. */
    private static List<Quantity> times(List<Quantity> polynomial, Quantity root) {
        List<Quantity> product = new ArrayList<>();
        for (int power = 0; power <= polynomial.size(); power++) {
            Quantity shifted = power > 0 ? polynomial.get(power - 1) : Quantity.ZERO;
            Quantity scaled = power < polynomial.size() ? polynomial.get(power).times(root) : Quantity.ZERO;
            product.add(shifted.minus(scaled));
        }
        return product;
    }
}
