package org.pofk.claim;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import org.pofk.exact.Rational;
import org.pofk.meaning.Decision;
import org.pofk.meaning.Quantity;
import org.pofk.text.RefusedException;

/**
 * A conjugate pair by radius, angle, amplitude and phase. What means the same is the same: angles differ by whole
 * turns; (angle, phase) and both negative; a negative amplitude and half a turn of the phase; a negative radius and
 * half a turn of the angle. Which of these the author means is read off his signs and the nearest angle.
 */
final class JudgedPair {
    private final Statement.Pair stated;
    private final Holding holding;
    private final List<String> names = new ArrayList<>();

    private JudgedPair(Statement.Pair stated, Holding holding) {
        this.stated = stated;
        this.holding = holding;
    }

    static Judgement of(Statement.Pair stated, Claim claim, Truth truth) throws RefusedException {
        return new JudgedPair(stated, new Holding(claim)).judgement(truth.about(stated.output()));
    }

    /** Whether it is right, at less cost than the judgement. */
    static boolean isRight(Statement.Pair stated, Claim claim, Truth truth) {
        try {
            return new JudgedPair(stated, new Holding(claim, Holding.Extent.VERDICT))
                    .judgement(truth.about(stated.output())).isRight();
        } catch (RefusedException meaningless) {
            return false;
        }
    }

    private Judgement judgement(OutputTruth truth) throws RefusedException {
        List<TruePole> pairs = truth.poles().stream().filter(pole -> !pole.isReal()).toList();
        Optional<StatedNumber> radius = number(stated.radius());
        Optional<StatedNumber> angle = number(stated.angle());
        Optional<StatedNumber> amplitude = number(stated.amplitude());
        Optional<StatedNumber> phase = number(stated.phase());
        if (pairs.isEmpty()) {
            holding.wrong(stated.output().name() + " has no conjugate pair of poles");
            return holding.judgement(texts -> "no pair");
        }
        if (pairs.size() > 1 && radius.isEmpty() && angle.isEmpty()) {
            holding.undecided(stated.output().name() + " has " + pairs.size()
                    + " pairs; a radius or an angle tells which is meant");
            return holding.judgement(texts -> String.join(", ", texts.all()));
        }
        boolean isTurned = radius.filter(JudgedPair::isNegative).isPresent();
        Quantity halfTurn = isTurned ? Quantity.pi() : Quantity.ZERO;
        Candidate meant = candidates(pairs, halfTurn).stream()
                .min(Comparator.comparingDouble(each -> each.distance(radius, angle))).orElseThrow();
        TruePole pole = meant.pole;
        radius.ifPresent(r -> hold("radius", r, isTurned ? pole.modulus().negate() : pole.modulus()));
        angle.ifPresent(a -> hold("angle", a, near(a, meant.angle)));
        if (pole.multiplicity() > 1 && (amplitude.isPresent() || phase.isPresent())) {
            holding.remark("the pair stands " + pole.multiplicity()
                    + " times; amplitude and phase are those without a power of k");
        }
        if (pole.coefficients().get(0).isZero() == Decision.YES) {
            amplitude.ifPresent(a -> hold("amplitude", a, Quantity.ZERO));
        } else {
            holdAmplitude(meant, amplitude, phase);
        }
        return holding.judgement(texts -> right(texts.all()));
    }

    private void holdAmplitude(Candidate meant, Optional<StatedNumber> amplitude, Optional<StatedNumber> phase) {
        boolean isOpposite = amplitude.filter(JudgedPair::isNegative).isPresent();
        Quantity size = meant.pole.amplitude(0);
        amplitude.ifPresent(a -> hold("amplitude", a, isOpposite ? size.negate() : size));
        Quantity right = meant.isMirrored ? meant.pole.phase(0).negate() : meant.pole.phase(0);
        Quantity turned = isOpposite ? right.plus(Quantity.pi()) : right;
        phase.ifPresent(p -> {
            names.add("phase");
            holding.hold(new Held(p, Angles.phaseLike(p.value(), turned), Angles.near(turned, p.value())));
        });
    }

    private Optional<StatedNumber> number(Optional<FormulaText> text) throws RefusedException {
        return text.isEmpty() ? Optional.empty() : Optional.of(holding.number(text.get()));
    }

    private void hold(String name, StatedNumber number, Quantity right) {
        names.add(name);
        holding.hold(number, right);
    }

    private String right(List<String> texts) {
        List<String> parts = new ArrayList<>();
        for (int i = 0; i < texts.size(); i++) {
            parts.add(names.get(i) + ": " + texts.get(i));
        }
        return String.join(", ", parts);
    }

    private static boolean isNegative(StatedNumber number) {
        return Guesses.real(number.value()) < 0;
    }

    /** The angle that differs by whole turns and is nearest to the stated one. */
    private static Quantity near(StatedNumber stated, Quantity angle) {
        long turns = Math.round((Guesses.real(stated.value()) - Guesses.real(angle)) / (2 * Math.PI));
        return angle.plus(Quantity.pi().times(Rational.of(2 * turns)));
    }

    /** A pair read one way round or the other: {@code angle} is what the stated one should be but for whole turns. */
    private record Candidate(TruePole pole, boolean isMirrored, Quantity angle) {
        double distance(Optional<StatedNumber> radius, Optional<StatedNumber> stated) {
            double off = radius.map(r -> Math.abs(Guesses.real(r.value())) - Guesses.real(pole.modulus())).orElse(0.0);
            double turn = stated.map(a -> Guesses.real(a.value()) - Guesses.real(near(a, angle))).orElse(0.0);
            return Math.hypot(off, turn);
        }
    }

    /** The upright way of each first, so that it is taken where nothing tells. */
    private static List<Candidate> candidates(List<TruePole> pairs, Quantity halfTurn) {
        List<Candidate> candidates = new ArrayList<>();
        pairs.forEach(pole -> candidates.add(new Candidate(pole, false, pole.angle().plus(halfTurn))));
        pairs.forEach(pole -> candidates.add(new Candidate(pole, true, pole.angle().negate().plus(halfTurn))));
        return candidates;
    }
}
