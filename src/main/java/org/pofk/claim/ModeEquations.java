package org.pofk.claim;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.SortedMap;
import java.util.TreeSet;
import org.pofk.claim.ClaimedMode.ClaimedTerm;
import org.pofk.claim.ClaimedMode.Shape;
import org.pofk.claim.ModeEquation.About;
import org.pofk.exact.Rational;
import org.pofk.meaning.Decision;
import org.pofk.meaning.Equation;
import org.pofk.meaning.ExponentialSum;
import org.pofk.meaning.ExponentialSum.Term;
import org.pofk.meaning.PolarForm;
import org.pofk.meaning.Quantity;

/**
 * What must hold for a formula in k to be p(k): its bases and angles those of the true poles, for each pole and power
 * of k the total coefficient the true one, the impulses the same. Coefficients are those of powers of k, so that
 * binomial(k, p) λ^(k−p) on either side is no difference. Exact.
 *
 * @param unlike the poles that a term is meant for whose shape can't stand for them: a real power for a pair. None of
 *               the numbers there is held against anything
 */
record ModeEquations(List<ModeEquation> equations, List<TruePole> unlike) {

    ModeEquations {
        equations = List.copyOf(equations);
        unlike = List.copyOf(unlike);
    }

    /** Whether every term has a shape that can stand for its pole. */
    boolean fits() {
        return unlike.isEmpty();
    }

    static ModeEquations of(ExponentialSum claimed, OutputTruth truth, ClaimedSteps steps) {
        Building building = new Building();
        MatchedModes matched = MatchedModes.of(claimed, truth.poles());
        matched.byPole().forEach(building::pole);
        matched.extra().forEach(building::extra);
        building.impulses(claimed.impulses(), ErrorCurve.trueImpulses(truth), steps);
        return new ModeEquations(building.equations, building.unlike);
    }

    /** Without what they are about. */
    List<Equation> plain() {
        return equations.stream().map(ModeEquation::equation).toList();
    }

    /** Whether all hold at face value, each in the numbers of its own mode only. The formula then is p(k). */
    Decision areExact() {
        Decision all = fits() ? Decision.YES : Decision.NO;
        for (int i = 0; i < equations.size() && all != Decision.NO; i++) {
            Equation equation = equations.get(i).equation();
            Decision one = equation.written().minus(equation.right()).isZero();
            all = one == Decision.YES ? all : one;
        }
        return all;
    }

    private static final class Building {
        private final List<ModeEquation> equations = new ArrayList<>();
        private final List<TruePole> unlike = new ArrayList<>();

        private void add(About about, Optional<TruePole> pole, long power, List<Term> terms, Quantity written,
                Quantity right) {
            equations.add(new ModeEquation(about, pole, power, terms, new Equation(written, right.realPart())));
        }

        /** Both parts of a complex equation. */
        private void addComplex(About about, TruePole pole, long power, List<Term> terms, Quantity written,
                Quantity right) {
            add(about, Optional.of(pole), power, terms, written.realPart(), right.realPart());
            add(about, Optional.of(pole), power, terms, written.imaginaryPart(), right.imaginaryPart());
        }

        void pole(TruePole pole, List<ClaimedTerm> terms) {
            if (!terms.stream().allMatch(term -> isLike(pole, term))) {
                unlike.add(pole);
                return;
            }
            terms.forEach(term -> base(pole, term));
            Map<Integer, List<ClaimedTerm>> byPower = new LinkedHashMap<>();
            terms.forEach(term -> byPower.computeIfAbsent(term.term().power(), p -> new ArrayList<>()).add(term));
            List<Quantity> right = PowersOfK.of(pole);
            for (int power = 0; power < right.size(); power++) {
                if (!byPower.containsKey(power) && right.get(power).isZero() != Decision.YES) {
                    addComplex(About.COEFFICIENT, pole, power, List.of(), Quantity.ZERO, right.get(power));
                }
            }
            byPower.forEach((power, own) -> coefficient(pole, power, own,
                    power < right.size() ? right.get(power) : Quantity.ZERO));
        }

        private static boolean isLike(TruePole pole, ClaimedTerm term) {
            return term.shape() == Shape.OSCILLATION || pole.isReal() == (term.shape() == Shape.REAL);
        }

        private void base(TruePole pole, ClaimedTerm claimed) {
            Term term = claimed.term();
            List<Term> terms = List.of(term);
            boolean isWrittenOut = Quantity.sum(List.of(term.base(), term.angle())).decimals().isEmpty();
            Optional<PolarForm> polar = PolarForm.of(term.base()).filter(PolarForm::isTurnedByDecimals);
            if (claimed.shape() == Shape.OSCILLATION && !isWrittenOut) {
                polarBase(pole, claimed, new PolarForm(term.base(), term.angle()));
            } else if (claimed.shape() == Shape.COMPLEX && polar.isPresent()) {
                polarBase(pole, claimed, polar.get());
            } else if (claimed.shape() == Shape.REAL) {
                add(About.BASE, Optional.of(pole), term.power(), terms, term.base(), pole.value().realPart());
            } else {
                addComplex(About.BASE, pole, term.power(), terms, claimed.pole(),
                        claimed.isBelow() ? pole.value().conjugate() : pole.value());
            }
        }

        private void polarBase(TruePole pole, ClaimedTerm claimed, PolarForm written) {
            Term term = claimed.term();
            List<Term> terms = List.of(term);
            boolean isNegative = isNegative(written.modulus());
            Quantity modulus = pole.modulus();
            add(About.BASE, Optional.of(pole), term.power(), terms, written.modulus(),
                    isNegative ? modulus.negate() : modulus);
            if (!written.isTurnedByDecimals()) {
                Quantity direction = (claimed.isBelow() ? pole.value().conjugate() : pole.value())
                        .dividedBy(isNegative ? modulus.negate() : modulus);
                addComplex(About.ANGLE, pole, term.power(), terms, Angles.unit(written.angle()), direction);
            } else {
                Quantity angle = claimed.isBelow() ? pole.angle().negate() : pole.angle();
                add(About.ANGLE, Optional.of(pole), term.power(), terms, written.angle(),
                        Angles.near(isNegative ? angle.plus(Quantity.pi()) : angle, written.angle()));
            }
        }

        private static boolean isNegative(Quantity real) {
            return real.enclose(64).real().isNegative();
        }

        private void coefficient(TruePole pole, int power, List<ClaimedTerm> claimed, Quantity right) {
            List<Term> terms = claimed.stream().map(ClaimedTerm::term).toList();
            if (pole.isReal()) {
                add(About.COEFFICIENT, Optional.of(pole), power, terms, Quantity.sum(terms.stream()
                        .map(term -> term.coefficient().times(Angles.unit(term.phase()).realPart())).toList()), right);
            } else if (claimed.stream().anyMatch(term -> term.shape() != Shape.OSCILLATION)) {
                complexCoefficient(pole, power, claimed, right);
            } else if (claimed.size() == 1) {
                amplitude(pole, power, claimed.get(0), right.times(Rational.TWO));
            } else if (claimed.size() == 2) {
                twoDirections(pole, power, claimed, right.times(Rational.TWO));
            } else {
                sumOfDirections(pole, power, claimed, right.times(Rational.TWO));
            }
        }

        /** Σ a e^(iφ) = target, both parts. */
        private void sumOfDirections(TruePole pole, int power, List<ClaimedTerm> claimed, Quantity target) {
            List<Term> terms = claimed.stream().map(ClaimedTerm::term).toList();
            add(About.COEFFICIENT, Optional.of(pole), power, terms, Quantity.sum(claimed.stream().map(each ->
                    direction(each).realPart().times(each.term().coefficient())).toList()), target.realPart());
            add(About.COEFFICIENT, Optional.of(pole), power, terms, Quantity.sum(claimed.stream().map(each ->
                    direction(each).imaginaryPart().times(each.term().coefficient())).toList()),
                    target.imaginaryPart());
        }

        /** e^(iφ) for a term that turns as the pole does, its conjugate for one that turns the other way. */
        private static Quantity direction(ClaimedTerm claimed) {
            Quantity unit = Angles.unit(claimed.term().phase());
            return claimed.isBelow() ? unit.conjugate() : unit;
        }

        /** For λ and its conjugate apart, each in both parts; an oscillation counts half for either. */
        private void complexCoefficient(TruePole pole, int power, List<ClaimedTerm> claimed, Quantity right) {
            List<Quantity> upper = new ArrayList<>();
            List<Quantity> lower = new ArrayList<>();
            for (ClaimedTerm each : claimed) {
                Quantity coefficient = each.term().coefficient();
                if (each.shape() == Shape.OSCILLATION) {
                    Quantity half = coefficient.times(direction(each)).times(Rational.HALF);
                    upper.add(half);
                    lower.add(half.conjugate());
                } else {
                    (each.isBelow() ? lower : upper).add(coefficient);
                }
            }
            List<Term> terms = claimed.stream().map(ClaimedTerm::term).toList();
            oneOfPair(pole, power, terms, Quantity.sum(upper), right);
            oneOfPair(pole, power, terms, Quantity.sum(lower), right.conjugate());
        }

        private void oneOfPair(TruePole pole, int power, List<Term> terms, Quantity written, Quantity right) {
            Optional<PolarForm> polar = PolarForm.of(written).filter(PolarForm::isTurnedByDecimals);
            if (polar.isPresent()) {
                polarCoefficient(pole, power, terms, polar.get(), right);
            } else {
                addComplex(About.COEFFICIENT, pole, power, terms, written, right);
            }
        }

        /** a e^(iφ) = target: a the modulus, φ the angle of the target, or both turned by half. */
        private void polarCoefficient(TruePole pole, int power, List<Term> terms, PolarForm written,
                Quantity target) {
            boolean isNegative = isNegative(written.modulus());
            Quantity modulus = target.times(target.conjugate()).squareRoot();
            add(About.COEFFICIENT, Optional.of(pole), power, terms, written.modulus(),
                    isNegative ? modulus.negate() : modulus);
            if (target.isZero() != Decision.YES) {
                add(About.PHASE, Optional.of(pole), power, terms, written.angle(),
                        Angles.phaseLike(written.angle(), Angles.of(isNegative ? target.negate() : target)));
            }
        }

        /** a cos(θk + φ) is Re(target λ^k/r^k), so that a e^(iφ) is the target, or its conjugate from below. */
        private void amplitude(TruePole pole, int power, ClaimedTerm claimed, Quantity target) {
            Term term = claimed.term();
            List<Term> terms = List.of(term);
            if (term.phase().decimals().isEmpty()) {
                Quantity turnedBack = target.times(direction(claimed).conjugate());
                add(About.COEFFICIENT, Optional.of(pole), power, terms, term.coefficient(), turnedBack.realPart());
                add(About.PHASE, Optional.of(pole), power, terms, Quantity.ZERO, turnedBack.imaginaryPart());
                return;
            }
            polarCoefficient(pole, power, terms, new PolarForm(term.coefficient(), term.phase()),
                    claimed.isBelow() ? target.conjugate() : target);
        }

        /** a e + b f = target for two directions: each coefficient by itself where they differ. */
        private void twoDirections(TruePole pole, int power, List<ClaimedTerm> claimed, Quantity target) {
            Quantity e = direction(claimed.get(0));
            Quantity f = direction(claimed.get(1));
            Quantity across = e.times(f.conjugate()).imaginaryPart();
            Term first = claimed.get(0).term();
            Term second = claimed.get(1).term();
            if (Spread.mayBe(across, Quantity.ZERO)) {
                sumOfDirections(pole, power, claimed, target);
                return;
            }
            alongOne(pole, power, first, across, target.times(f.conjugate()).imaginaryPart());
            alongOne(pole, power, second, across, target.times(e.conjugate()).imaginaryPart().negate());
        }

        /** a · across = size, as a = size/across where only a is written in decimals. */
        private void alongOne(TruePole pole, int power, Term term, Quantity across, Quantity size) {
            if (across.decimals().isEmpty() && size.decimals().isEmpty()) {
                add(About.COEFFICIENT, Optional.of(pole), power, List.of(term), term.coefficient(),
                        size.dividedBy(across));
            } else {
                add(About.COEFFICIENT, Optional.of(pole), power, List.of(term),
                        term.coefficient().times(across).minus(size), Quantity.ZERO);
            }
        }

        void extra(ClaimedTerm claimed) {
            Term term = claimed.term();
            add(About.NOTHING, Optional.empty(), term.power(), List.of(term), term.coefficient().realPart(),
                    Quantity.ZERO);
        }

        void impulses(SortedMap<Long, Quantity> claimed, SortedMap<Long, Quantity> right, ClaimedSteps steps) {
            TreeSet<Long> at = new TreeSet<>(claimed.keySet());
            at.addAll(right.keySet());
            at.stream().filter(steps::includes).forEach(k -> add(About.IMPULSE, Optional.empty(), k, List.of(),
                    claimed.getOrDefault(k, Quantity.ZERO), right.getOrDefault(k, Quantity.ZERO)));
        }
    }
}
