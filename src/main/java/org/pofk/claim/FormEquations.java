package org.pofk.claim;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.stream.Stream;
import org.pofk.claim.FormEquation.About;
import org.pofk.exact.Polynomial;
import org.pofk.exact.Rational;
import org.pofk.meaning.Equation;
import org.pofk.meaning.Quantity;
import org.pofk.meaning.RationalForm;
import org.pofk.meaning.RationalForm.Factor;
import org.pofk.meaning.RationalForm.Summand;
import org.pofk.text.Span;

/**
 * What must hold for a formula in z to be a given fraction: factors below the line have the true poles, those above it
 * the true zeros, and what stands in front is the true leading coefficient; for a sum, over the poles that summands
 * have in common their numerators add up to the true partial fraction. Exact.
 *
 * @param fits false where degrees don't agree, so that no numbers make it right
 */
record FormEquations(List<FormEquation> equations, boolean fits) {

    FormEquations {
        equations = List.copyOf(equations);
    }

    /** {@code common} are zeros of numerator and denominator that an author may not have cancelled. */
    static FormEquations of(RationalForm form, TransformTarget target, List<FormPole> common) {
        boolean hasZ = !form.summands().isEmpty() && form.summands().stream().allMatch(FormEquations::isMultipleOfZ);
        if (hasZ && target.overZ() == 0 && form.summands().size() > 1) {
            return of(new RationalForm(form.summands().stream().map(FormEquations::dividedByZ).toList()),
                    target.dividedByZ(), common);
        }
        Building building = new Building(target);
        if (form.summands().size() == 1) {
            building.product(form.summands().get(0), common);
        } else {
            building.sum(form.summands());
        }
        return new FormEquations(building.equations, building.fits);
    }

    private static boolean isZ(Factor factor) {
        return factor.degree() == 1 && factor.coefficients().get(0).rational().filter(Rational::isZero).isPresent()
                && factor.coefficients().get(1).rational().filter(Rational::isOne).isPresent();
    }

    private static boolean isMultipleOfZ(Summand summand) {
        return summand.factors().stream().anyMatch(factor -> isZ(factor) && factor.exponent() > 0);
    }

    private static Summand dividedByZ(Summand summand) {
        return new Summand(summand.front(), summand.factors().stream().flatMap(factor -> !isZ(factor)
                ? Stream.of(factor) : factor.exponent() == 1 ? Stream.<Factor>empty()
                : Stream.of(new Factor(factor.coefficients(), factor.exponent() - 1, factor.span()))).toList(),
                summand.span());
    }

    List<Equation> plain() {
        return equations.stream().map(FormEquation::equation).toList();
    }

    private static final class Building {
        private final TransformTarget target;
        private final List<FormEquation> equations = new ArrayList<>();
        private boolean fits = true;

        Building(TransformTarget target) {
            this.target = target;
        }

        private void add(About about, Optional<Span> span, Quantity written, Quantity right) {
            equations.add(new FormEquation(about, span, new Equation(written.realPart(), right.realPart())));
            if (written.realPart() != written) {
                equations.add(new FormEquation(about, span,
                        new Equation(written.imaginaryPart(), right.imaginaryPart())));
            }
        }

        private static List<Factor> above(Summand summand) {
            return summand.factors().stream().filter(factor -> factor.exponent() > 0).toList();
        }

        private static List<Factor> below(Summand summand) {
            return summand.factors().stream().filter(factor -> factor.exponent() < 0).toList();
        }

        private static int degree(List<Factor> factors) {
            return factors.stream().mapToInt(factor -> factor.degree() * Math.abs(factor.exponent())).sum();
        }

        /** One product or quotient. */
        void product(Summand summand, List<FormPole> common) {
            List<FormPole> poles = new ArrayList<>(target.poles());
            int more = degree(below(summand)) - target.fraction().denominator().degree();
            List<FormPole> shared = more > 0 ? common : List.of();
            poles.addAll(shared);
            RootMatching.Matched below = RootMatching.of(below(summand), poles);
            below.byFactor().forEach((factor, roots) -> monic(About.DENOMINATOR, factor, roots));
            Map<FormPole, Integer> uncancelled = new LinkedHashMap<>();
            shared.forEach(pole -> uncancelled.put(pole,
                    pole.multiplicity() - below.left().counts().getOrDefault(pole, 0)));
            uncancelled.values().removeIf(count -> count == 0);
            fits &= below.complete() && more == new RootCounts(uncancelled).degree();
            below.left().counts().keySet().stream().filter(pole -> !shared.contains(pole)).forEach(pole ->
                    add(About.MISSING, Optional.empty(), Quantity.ZERO, Quantity.ONE));
            numerator(summand, new RootCounts(uncancelled));
        }

        private void numerator(Summand summand, RootCounts uncancelled) {
            Polynomial<Rational> right = target.fraction().numerator();
            Quantity front = summand.front();
            for (Factor factor : below(summand)) {
                front = front.times(leading(factor).pow(factor.exponent()));
            }
            List<Factor> above = above(summand);
            fits &= degree(above) == right.degree() + uncancelled.degree();
            List<Factor> others = above.stream().filter(factor -> !isZ(factor)).toList();
            int zeros = degree(above) - degree(others);
            if (right.isZero() || zeros > right.lowestPower() + uncancelled.counts().entrySet().stream()
                    .filter(entry -> entry.getKey().isZero()).mapToInt(Map.Entry::getValue).sum()) {
                fits &= right.isZero();
                add(About.FRONT, Optional.of(summand.span()), front, Quantity.ZERO);
            } else if (others.size() == 1 && others.get(0).exponent() == 1) {
                expanded(others.get(0), front, zeros, right, uncancelled);
            } else {
                factored(summand, others, front, zeros, right, uncancelled);
            }
        }

        /** One polynomial above the line besides powers of z: its coefficients, with what stands in front. */
        private void expanded(Factor factor, Quantity front, int zeros, Polynomial<Rational> right,
                RootCounts uncancelled) {
            List<Quantity> all = QuantityPolynomials.times(QuantityPolynomials.of(right), uncancelled.polynomial());
            for (int power = factor.degree(); power >= 0; power--) {
                add(About.NUMERATOR, Optional.of(factor.span()), front.times(factor.coefficients().get(power)),
                        QuantityPolynomials.coefficient(all, power + zeros));
            }
        }

        private void factored(Summand summand, List<Factor> factors, Quantity front, int zeros,
                Polynomial<Rational> right, RootCounts uncancelled) {
            List<FormPole> roots = new ArrayList<>(FormPole.allOf(right.shiftedDown(
                    Math.min(zeros, right.lowestPower()))));
            uncancelled.counts().forEach((pole, count) ->
                    roots.add(new FormPole(pole.root(), pole.value(), pole.of(), count)));
            RootMatching.Matched matched = RootMatching.of(factors, roots);
            matched.byFactor().forEach((factor, own) -> monic(About.NUMERATOR, factor, own));
            fits &= matched.complete();
            Quantity whole = front;
            for (Factor factor : factors) {
                whole = whole.times(leading(factor).pow(factor.exponent()));
            }
            add(About.FRONT, Optional.of(summand.span()), whole, Quantity.of(right.leading()));
        }

        private static Quantity leading(Factor factor) {
            return factor.coefficients().get(factor.degree());
        }

        /** The coefficients over the leading one are those of the polynomial with these zeros. */
        private void monic(About about, Factor factor, RootCounts roots) {
            List<Quantity> right = roots.polynomial();
            if (right.size() != factor.coefficients().size()) {
                return;
            }
            Quantity leading = leading(factor);
            for (int power = factor.degree() - 1; power >= 0; power--) {
                add(about, Optional.of(factor.span()), factor.coefficients().get(power).dividedBy(leading),
                        right.get(power));
            }
        }

        /** A sum of several. */
        void sum(List<Summand> summands) {
            List<FormPole> poles = target.poles();
            List<Quantity> whole = List.of();
            Map<Summand, RootCounts> taken = new LinkedHashMap<>();
            Set<FormPole> used = new HashSet<>();
            for (Summand summand : summands.stream().sorted(Comparator.comparingDouble(each ->
                    RootMatching.nearest(below(each), poles))).toList()) {
                RootMatching.Matched matched = RootMatching.of(below(summand),
                        RootMatching.open(below(summand), poles, used));
                matched.byFactor().values().forEach(roots -> used.addAll(roots.counts().keySet()));
                fits &= matched.complete();
                matched.byFactor().forEach((factor, roots) -> monic(About.DENOMINATOR, factor, roots));
                taken.put(summand, total(matched));
            }
            List<List<Summand>> groups = groups(taken);
            for (List<Summand> group : groups) {
                whole = QuantityPolynomials.plus(whole, part(group, taken));
            }
            poles.stream().filter(pole -> taken.values().stream().noneMatch(own -> own.counts().containsKey(pole)))
                    .forEach(pole -> add(About.MISSING, Optional.empty(), Quantity.ZERO, Quantity.ONE));
            List<Quantity> right = target.polynomialPart();
            for (int power = 0; power < Math.max(whole.size(), right.size()); power++) {
                add(About.FRONT, Optional.empty(), QuantityPolynomials.coefficient(whole, power),
                        QuantityPolynomials.coefficient(right, power));
            }
        }

        private static RootCounts total(RootMatching.Matched matched) {
            Map<FormPole, Integer> counts = new LinkedHashMap<>();
            matched.byFactor().forEach((factor, roots) -> roots.counts().forEach((pole, count) ->
                    counts.merge(pole, count * -factor.exponent(), Integer::sum)));
            return new RootCounts(counts);
        }

        /** Summands that have poles in common, directly or through others. */
        private static List<List<Summand>> groups(Map<Summand, RootCounts> taken) {
            List<List<Summand>> groups = new ArrayList<>();
            taken.forEach((summand, own) -> {
                List<List<Summand>> touching = groups.stream().filter(group -> group.stream().anyMatch(other ->
                        taken.get(other).counts().keySet().stream().anyMatch(own.counts()::containsKey))).toList();
                List<Summand> joined = new ArrayList<>();
                touching.forEach(joined::addAll);
                joined.add(summand);
                groups.removeAll(touching);
                groups.add(joined);
            });
            return groups;
        }

        /** The equations of one group; what its numerators leave beyond partial fractions. */
        private List<Quantity> part(List<Summand> group, Map<Summand, RootCounts> taken) {
            Map<FormPole, Integer> full = new LinkedHashMap<>();
            group.forEach(summand -> taken.get(summand).counts().keySet().forEach(pole ->
                    full.put(pole, pole.multiplicity())));
            List<Quantity> denominator = new RootCounts(full).polynomial();
            List<Quantity> numerator = List.of();
            for (Summand summand : group) {
                Map<FormPole, Integer> missing = new LinkedHashMap<>(full);
                taken.get(summand).counts().forEach((pole, count) -> missing.merge(pole, -count, Integer::sum));
                missing.values().removeIf(count -> count == 0);
                numerator = QuantityPolynomials.plus(numerator, QuantityPolynomials.times(
                        written(summand), new RootCounts(missing).polynomial()));
            }
            QuantityPolynomials.Division division = QuantityPolynomials.divide(numerator, denominator);
            if (!full.isEmpty()) {
                int zeros = full.keySet().stream().anyMatch(FormPole::isZero) ? 0 : powersOfZ(numerator);
                List<Quantity> own = QuantityPolynomials.divide(numerator.subList(zeros, numerator.size()), denominator)
                        .remainder();
                List<Quantity> right = overZ(target.partAt(new RootCounts(full)), zeros, denominator);
                Optional<Span> span = group.size() == 1 ? Optional.of(group.get(0).span()) : Optional.empty();
                for (int power = 0; power < denominator.size() - 1; power++) {
                    add(About.PART, span, QuantityPolynomials.coefficient(own, power),
                            QuantityPolynomials.coefficient(right, power));
                }
            }
            return division.quotient();
        }

        /** How often z can be taken out as written. */
        private static int powersOfZ(List<Quantity> polynomial) {
            int zeros = 0;
            while (zeros + 1 < polynomial.size()
                    && polynomial.get(zeros).rational().filter(Rational::isZero).isPresent()) {
                zeros++;
            }
            return zeros;
        }

        /**
         * The polynomial that times a power of z leaves a remainder by d, where d(0) isn't zero: with d = d₀ + z e, 1/z
         * is −e/d₀. So c z/(z − λ) says what c is, not c λ.
         */
        private static List<Quantity> overZ(List<Quantity> remainder, int zeros, List<Quantity> denominator) {
            List<Quantity> over = remainder;
            List<Quantity> inverse = QuantityPolynomials.times(denominator.subList(1, denominator.size()),
                    denominator.get(0).inverse().negate());
            for (int i = 0; i < zeros; i++) {
                over = QuantityPolynomials.divide(QuantityPolynomials.times(over, inverse), denominator).remainder();
            }
            return over;
        }

        /** The numerator multiplied out, over leading coefficients below the line. */
        private static List<Quantity> written(Summand summand) {
            List<Quantity> product = List.of(summand.front());
            for (Factor factor : above(summand)) {
                product = QuantityPolynomials.times(product,
                        QuantityPolynomials.power(factor.coefficients(), factor.exponent()));
            }
            for (Factor factor : below(summand)) {
                product = QuantityPolynomials.times(product, leading(factor).pow(factor.exponent()));
            }
            return product;
        }
    }
}
