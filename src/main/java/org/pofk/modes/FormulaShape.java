package org.pofk.modes;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import org.pofk.exact.Factorization.Factor;
import org.pofk.exact.Polynomial;
import org.pofk.exact.Rational;

/**
 * What a formula looks like without its numbers: which kinds of terms it has, and of what degree the factors are that
 * their poles come from. Formulas of the same shape differ in numbers alone. Exact.
 *
 * @param parts in order, no two of the same kind, power and degree
 */
public record FormulaShape(List<Part> parts) {

    /** The kinds of terms; a constant belongs to the pole one. */
    public enum Kind { IMPULSE, CONSTANT, REAL_POWER, PAIR }

    /**
     * Terms that are alike.
     *
     * @param power  of an impulse the step, else the p of binomial(k, p)
     * @param degree of the factor of the denominator; 0 for an impulse
     * @param count  how many there are
     */
    public record Part(Kind kind, int power, int degree, int count) {
    }

    public FormulaShape {
        parts = List.copyOf(parts);
    }

    public static FormulaShape of(ClosedForm form) {
        Map<Part, Integer> counts = new TreeMap<>(Comparator.comparing(Part::kind).thenComparing(Part::power)
                .thenComparing(Part::degree));
        form.modes().forEach(mode -> counts.merge(mode.accept(new One(form)), 1, Integer::sum));
        List<Part> parts = new ArrayList<>();
        counts.forEach((part, count) -> parts.add(new Part(part.kind, part.power, part.degree, count)));
        return new FormulaShape(parts);
    }

    /** The part a mode is one of. */
    private record One(ClosedForm form) implements Mode.Visitor<Part> {
        private Factor<Rational> factor(int place) {
            return form.transform().factors().factors().get(place);
        }

        @Override
        public Part impulse(Mode.Impulse impulse) {
            return new Part(Kind.IMPULSE, impulse.at(), 0, 0);
        }

        @Override
        public Part geometric(Mode.Geometric geometric) {
            Polynomial<Rational> factor = factor(geometric.factor()).polynomial();
            boolean isOfOne = factor.degree() == 1
                    && factor.coefficient(0).equals(factor.coefficient(1).negate());
            return new Part(isOfOne ? Kind.CONSTANT : Kind.REAL_POWER, geometric.power(), factor.degree(), 0);
        }

        @Override
        public Part oscillating(Mode.Oscillating oscillating) {
            return new Part(Kind.PAIR, oscillating.power(), factor(oscillating.factor()).polynomial().degree(), 0);
        }
    }
}
