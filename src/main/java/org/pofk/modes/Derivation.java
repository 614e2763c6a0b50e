package org.pofk.modes;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.pofk.exact.EnclosedComplex;
import org.pofk.exact.Factorization.Factor;
import org.pofk.exact.Rational;
import org.pofk.formula.Formula;
import org.pofk.formula.Formulas;

/** The way from a factored transform to the closed form, step by step, to be written down. As exact as the form. */
public record Derivation(List<ImpulseStep> impulses, List<FactorStep> factors) {

    /** value · z^−at becomes value · δ(k − at). */
    public record ImpulseStep(Mode.Impulse mode, TablePair pair) {
    }

    /**
     * What becomes of one factor.
     *
     * @param factor       its place in the denominator
     * @param polynomial   the factor in z
     * @param coefficients R_p(λ) by power p, each a formula in λ
     */
    public record FactorStep(int factor, Formula polynomial, int multiplicity, List<Formula> coefficients,
            List<RealStep> real, List<PairStep> pairs) {
        public FactorStep {
            coefficients = List.copyOf(coefficients);
            real = List.copyOf(real);
            pairs = List.copyOf(pairs);
        }
    }

    /** A real pole; {@code term} in short exact form where there is one. */
    public record RealStep(Mode.Geometric mode, TablePair pair, Optional<Formula> term) {
    }

    /**
     * R λ^(k−p) and its conjugate joined: R = real + i · imaginary has the modulus and the argument given, and
     * R λ^n + R̄ λ̄^n = 2|R| r^n cos(θn + arg R).
     */
    public record PairStep(Mode.Oscillating mode, TablePair pair, RealValue real, RealValue imaginary,
            RealValue modulus, RealValue argument, Optional<Formula> joined) {
    }

    public Derivation {
        impulses = List.copyOf(impulses);
        factors = List.copyOf(factors);
    }

    static Derivation of(ClosedForm form) {
        Collected collected = new Collected();
        form.modes().forEach(mode -> mode.accept(collected));
        List<FactorStep> steps = new ArrayList<>();
        for (Expansion.Part<Rational> part : form.expansion().parts()) {
            Factor<Rational> factor = part.factor();
            int index = form.transform().factors().factors().indexOf(factor);
            FactorPoles poles = new FactorPoles(factor, form.roots().get(index));
            List<Mode.Oscillating> pairs = collected.pairs.stream().filter(mode -> mode.factor() == index).toList();
            List<CoefficientValues> values = pairs.isEmpty() ? List.of() : part.coefficients().stream()
                    .map(coefficient -> new CoefficientValues(poles, coefficient)).toList();
            steps.add(new FactorStep(index, Formulas.polynomial(factor.polynomial(), TablePair.Z),
                    factor.multiplicity(), FormulaOverRoots.coefficients(part, form.transform().y()),
                    collected.real.stream().filter(step -> step.mode().factor() == index).toList(),
                    pairs.stream().map(mode -> pair(mode, poles, values.get(mode.power()))).toList()));
        }
        return new Derivation(collected.impulses, steps);
    }

    private static PairStep pair(Mode.Oscillating mode, FactorPoles poles, CoefficientValues values) {
        FactorPoles.Pole pole = poles.poles().stream()
                .filter(candidate -> candidate.root().index() == mode.root()).findFirst().orElseThrow();
        EnclosedComplex value = values.at(pole.root());
        Optional<ElementAtRoot> element = values.element(pole.root(), value);
        Rectangular halves = Rectangular.ofHalves(element, value, pole.squaredModulus());
        Polar polar = element.map(e -> Polar.of(e, pole.squaredModulus())).orElse(Polar.unknown());
        return new PairStep(mode, TablePair.ofPole(mode.power()), halves.cosine(), halves.sine(),
                RealValue.of(polar.modulus(), value.modulus()), mode.phase(), exactTerm(mode));
    }

    private static Optional<Formula> exactTerm(Mode mode) {
        return mode.isExact() ? Optional.of(ModeFormula.exact(mode)) : Optional.empty();
    }

    /** The modes by kind. */
    private static final class Collected implements Mode.Visitor<Boolean> {
        private final List<ImpulseStep> impulses = new ArrayList<>();
        private final List<RealStep> real = new ArrayList<>();
        private final List<Mode.Oscillating> pairs = new ArrayList<>();

        @Override
        public Boolean impulse(Mode.Impulse mode) {
            return impulses.add(new ImpulseStep(mode, TablePair.ofImpulse(mode.at())));
        }

        @Override
        public Boolean geometric(Mode.Geometric mode) {
            return real.add(new RealStep(mode, TablePair.ofPole(mode.power()), exactTerm(mode)));
        }

        @Override
        public Boolean oscillating(Mode.Oscillating mode) {
            return pairs.add(mode);
        }
    }
}
