package org.pofk.claim;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import org.pofk.exact.ComplexBall;
import org.pofk.meaning.Quantity;
import org.pofk.meaning.RationalForm.Factor;

/**
 * The factors of a product as written beside the true zeros they stand for: to each factor those at which it is
 * smallest, its derivatives for repeated ones. A guess; the equations that follow from it prove or refute it.
 */
final class RootMatching {
    private static final int BITS = 64;

    private RootMatching() {
    }

    /**
     * @param byFactor the zeros of each factor, counted once for the factor to the first power
     * @param complete whether every factor has as many as its degree
     * @param left     the zeros that no factor stands for
     */
    record Matched(Map<Factor, RootCounts> byFactor, boolean complete, RootCounts left) {
    }

    private record Pairing(Factor factor, FormPole pole, int copy, double size) {
    }

    static Matched of(List<Factor> factors, List<FormPole> zeros) {
        List<Pairing> pairings = new ArrayList<>();
        for (Factor factor : factors) {
            for (FormPole zero : zeros) {
                double[] sizes = sizes(factor, zero);
                for (int copy = 0; copy < sizes.length; copy++) {
                    pairings.add(new Pairing(factor, zero, copy, sizes[copy]));
                }
            }
        }
        pairings.sort(Comparator.comparingDouble(Pairing::size).thenComparingInt(Pairing::copy));
        Map<FormPole, Integer> left = new LinkedHashMap<>();
        zeros.forEach(zero -> left.put(zero, zero.multiplicity()));
        Map<Factor, Map<FormPole, Integer>> taken = new LinkedHashMap<>();
        factors.forEach(factor -> taken.put(factor, new LinkedHashMap<>()));
        for (Optional<Pairing> next = next(pairings, left, taken); next.isPresent();
                next = next(pairings, left, taken)) {
            Pairing pairing = next.get();
            taken.get(pairing.factor).merge(pairing.pole, 1, Integer::sum);
            left.merge(pairing.pole, -Math.abs(pairing.factor.exponent()), Integer::sum);
        }
        Map<Factor, RootCounts> byFactor = new LinkedHashMap<>();
        taken.forEach((factor, own) -> byFactor.put(factor, new RootCounts(own)));
        left.values().removeIf(count -> count == 0);
        return new Matched(byFactor, byFactor.entrySet().stream()
                .allMatch(entry -> entry.getValue().degree() == entry.getKey().degree()), new RootCounts(left));
    }

    /** The best one that is still open: a copy after those before it, a zero as often as it is left. */
    private static Optional<Pairing> next(List<Pairing> pairings, Map<FormPole, Integer> left,
            Map<Factor, Map<FormPole, Integer>> taken) {
        return pairings.stream().filter(pairing -> {
            Map<FormPole, Integer> own = taken.get(pairing.factor);
            return left.get(pairing.pole) >= Math.abs(pairing.factor.exponent())
                    && own.getOrDefault(pairing.pole, 0) == pairing.copy
                    && own.values().stream().mapToInt(Integer::intValue).sum() < pairing.factor.degree();
        }).findFirst();
    }

    /**
     * The zeros to choose from for factors of which some others already have theirs: without simple ones that are
     * taken, where one of the others may be meant too.
     */
    static List<FormPole> open(List<Factor> factors, List<FormPole> zeros, Set<FormPole> taken) {
        List<FormPole> rest = zeros.stream().filter(zero -> !taken.contains(zero) || zero.multiplicity() > 1).toList();
        boolean isMeant = rest.size() < zeros.size() && factors.stream().allMatch(factor ->
                rest.stream().anyMatch(zero -> mayVanish(factor, zero)));
        return isMeant ? rest : zeros;
    }

    private static boolean mayVanish(Factor factor, FormPole zero) {
        Quantity value = Quantity.ZERO;
        for (int power = factor.degree(); power >= 0; power--) {
            value = value.times(zero.value()).plus(factor.coefficients().get(power));
        }
        return Spread.mayBe(value, Quantity.ZERO);
    }

    /** How near the nearest zero is to one of a factor. */
    static double nearest(List<Factor> factors, List<FormPole> zeros) {
        return factors.stream().flatMap(factor -> zeros.stream().map(zero -> sizes(factor, zero)[0]))
                .min(Double::compare).orElse(0.0);
    }

    /** |g^(c)(λ)| against the sizes of its terms, for each copy c of λ. */
    private static double[] sizes(Factor factor, FormPole zero) {
        ComplexBall at = zero.value().enclose(BITS);
        double x = at.real().middle().approximate();
        double y = at.imaginary().middle().approximate();
        List<double[]> polynomial = new ArrayList<>();
        for (Quantity coefficient : factor.coefficients()) {
            ComplexBall value = coefficient.enclose(BITS);
            polynomial.add(new double[] {value.real().middle().approximate(),
                    value.imaginary().middle().approximate()});
        }
        double[] sizes = new double[zero.multiplicity()];
        for (int copy = 0; copy < sizes.length; copy++) {
            sizes[copy] = size(polynomial, x, y);
            polynomial = derivative(polynomial);
        }
        return sizes;
    }

    private static List<double[]> derivative(List<double[]> polynomial) {
        List<double[]> derivative = new ArrayList<>();
        for (int i = 1; i < polynomial.size(); i++) {
            derivative.add(new double[] {i * polynomial.get(i)[0], i * polynomial.get(i)[1]});
        }
        return derivative;
    }

    private static double size(List<double[]> polynomial, double x, double y) {
        if (polynomial.size() < 2) {
            return Double.MAX_VALUE;
        }
        double real = 0;
        double imaginary = 0;
        double largest = 0;
        double modulus = Math.hypot(x, y);
        for (int i = polynomial.size() - 1; i >= 0; i--) {
            double next = real * x - imaginary * y + polynomial.get(i)[0];
            imaginary = real * y + imaginary * x + polynomial.get(i)[1];
            real = next;
            largest = largest * modulus + Math.hypot(polynomial.get(i)[0], polynomial.get(i)[1]);
        }
        return largest == 0 ? 0 : Math.hypot(real, imaginary) / largest;
    }
}
