package org.pofk.claim;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.pofk.claim.ModeEquation.About;
import org.pofk.exact.Rational;
import org.pofk.meaning.ExponentialSum;
import org.pofk.meaning.ExponentialSum.Term;
import org.pofk.meaning.Written;

/**
 * From where on rounded poles alone, with every coefficient exactly right, put a formula off by more than half a unit
 * of the last place of its coefficients: there it says more digits than it has. Certified.
 */
final class RoundedPoles {
    private RoundedPoles() {
    }

    static Optional<String> remark(ExponentialSum claimed, ModeEquations modes, OutputTruth truth, ClaimedSteps steps) {
        Optional<Rational> promise = claimed.terms().stream().flatMap(term -> term.coefficient().decimals().stream())
                .map(Written::halfUnit).max(Rational::compareTo);
        if (promise.isEmpty() || claimed.terms().stream().allMatch(RoundedPoles::isPoleExact)) {
            return Optional.empty();
        }
        ErrorCurve curve = ErrorCurve.of(withRightCoefficients(modes, truth), ErrorCurve.trueImpulses(truth), truth);
        LeastStepAbove least = LeastStepAbove.of(curve, promise.get(), steps.range());
        return least.step().stream().mapToObj(k -> "from k = " + k
                + " on its rounded poles alone put it off by more than half a unit of the last place of its"
                + " coefficients").findFirst();
    }

    private static boolean isPoleExact(Term term) {
        return term.base().decimals().isEmpty() && term.angle().decimals().isEmpty();
    }

    /** The true modes with the poles that are written for them. */
    private static List<Wave> withRightCoefficients(ModeEquations modes, OutputTruth truth) {
        Map<TruePole, Wave> written = new LinkedHashMap<>();
        modes.equations().stream().filter(each -> each.about() == About.BASE).forEach(each ->
                written.putIfAbsent(each.pole().orElseThrow(), upper(each)));
        List<Wave> waves = new ArrayList<>();
        for (TruePole pole : truth.poles()) {
            Wave.of(pole).forEach(wave -> {
                Wave like = written.getOrDefault(pole, wave);
                waves.add(new Wave(wave.coefficient(), wave.power(), like.base(), like.radius()));
            });
        }
        return waves;
    }

    /** What is written for the pole, on its side of the real axis. */
    private static Wave upper(ModeEquation equation) {
        Wave wave = Wave.of(equation.terms().get(0));
        return wave.base().enclose(64).imaginary().isNegative() ? wave.conjugate() : wave;
    }
}
