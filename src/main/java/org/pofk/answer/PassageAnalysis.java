package org.pofk.answer;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.stream.IntStream;
import org.pofk.chain.Chain;
import org.pofk.chain.Output;
import org.pofk.exact.Rational;
import org.pofk.longrun.LongRunChecks;
import org.pofk.longrun.Settling;
import org.pofk.modes.ClosedForm;
import org.pofk.modes.KnownPoles;
import org.pofk.steps.ExactSteps;
import org.pofk.steps.StepValue;
import org.pofk.steps.StepValues;
import org.pofk.transform.TransferFunction;
import org.pofk.transform.Transform;
import org.pofk.transform.Transforms;

/** Puts a {@link Passage} together: the formulas from the stopped chain, what is infinite from the chain itself. */
final class PassageAnalysis {
    private static final int SETTLED_DIGITS = 6;

    private final Chain chain;
    private final Set<Integer> into;
    private final Set<Integer> avoiding;
    private final StoppedChain stopped;

    PassageAnalysis(Chain chain, Set<Integer> into, Set<Integer> avoiding) {
        this.chain = chain;
        this.into = into;
        this.avoiding = avoiding;
        this.stopped = StoppedChain.of(chain, into, avoiding);
    }

    Passage passage(List<Rational> percentiles, List<Integer> steps) {
        FirstEntrance fromEach = FirstEntrance.of(chain, into, avoiding);
        List<Output> outputs = new ArrayList<>(List.of(stopped.law(), stopped.distribution(), stopped.survival()));
        Rational ever = ever(fromEach);
        if (!ever.isZero() && !ever.isOne()) {
            outputs.add(over(stopped.law(), ever, "P(T = k | T < ∞)"));
            outputs.add(over(stopped.distribution(), ever, "P(T ≤ k | T < ∞)"));
        }
        List<Transform> transforms = Transforms.of(stopped.chain(), outputs);
        KnownPoles poles = new KnownPoles(() -> Eigenvalues.guesses(stopped.chain().matrix()));
        LongRunChecks.Ground ground = LongRunChecks.Ground.of(stopped.chain());
        List<ClosedForm> forms = transforms.stream().map(transform -> ClosedForm.of(transform, poles)).toList();
        List<List<StepValue>> values = StepValues.of(stopped.chain(), forms, steps);
        List<DerivedOutput> derived = IntStream.range(0, outputs.size()).mapToObj(i ->
                DerivedOutput.of(outputs.get(i)).with(transforms.get(i))
                        .with(LongRunChecks.of(ground, transforms.get(i))).with(forms.get(i)).with(values.get(i)))
                .toList();
        PassageMoments moments = PassageMoments.of(transforms.get(0).y());
        Percentile.Finder finder = new Percentile.Finder(stopped.chain(), forms.get(1), moments.probability());
        return new Passage(sorted(into), sorted(avoiding), stopped.chain(), derived.get(0), derived.get(1), derived.get(2),
                derived.size() > 3 ? Optional.of(new Passage.Happening(derived.get(3), derived.get(4)))
                        : Optional.empty(), moments,
                Settling.of(forms.get(2), derived.get(2).longRun().orElseThrow().byPoles(), SETTLED_DIGITS),
                percentiles.stream().map(finder::of).toList(), hazards(steps), fromEach, returns(fromEach), visits());
    }

    private Rational ever(FirstEntrance fromEach) {
        return IntStream.range(0, chain.size())
                .mapToObj(i -> chain.start().get(i).times(fromEach.probabilities().get(i)))
                .reduce(Rational.ZERO, Rational::plus);
    }

    private static Output over(Output output, Rational probability, String definition) {
        return new Output(output.name() + " given that it happens", output.coefficients().stream()
                .map(weight -> weight.dividedBy(probability)).toList(), Rational.ZERO, definition);
    }

    private static List<Integer> sorted(Set<Integer> states) {
        return states.stream().sorted().toList();
    }

    /** f(k) over P(T > k − 1), exact for the steps that are stepped quickly. */
    private List<Passage.Hazard> hazards(List<Integer> steps) {
        List<Integer> near = steps.stream().filter(k -> k <= ExactSteps.FEW).toList();
        if (near.isEmpty()) {
            return List.of();
        }
        List<List<Rational>> values = ExactSteps.of(stopped.chain(),
                List.of(stopped.law(), stopped.survival()), near.get(near.size() - 1)).values();
        List<Passage.Hazard> hazards = new ArrayList<>();
        for (int k : near) {
            Rational waiting = k == 0 ? Rational.ONE : values.get(1).get(k - 1);
            hazards.add(new Passage.Hazard(k, waiting.isZero() ? Optional.empty()
                    : Optional.of(values.get(0).get(k).dividedBy(waiting))));
        }
        return hazards;
    }

    /** One step into the open, then back: Σ over the first step of what {@link FirstEntrance} says from there. */
    private Optional<Passage.Return> returns(FirstEntrance fromEach) {
        if (!IntStream.range(0, chain.size()).allMatch(i -> into.contains(i) || chain.start().get(i).isZero())) {
            return Optional.empty();
        }
        List<Rational> after = chain.matrix().times(chain.start());
        Rational probability = Rational.ZERO;
        Rational steps = Rational.ZERO;
        for (int i = 0; i < chain.size(); i++) {
            Rational reached = after.get(i).times(fromEach.probabilities().get(i));
            probability = probability.plus(reached);
            steps = steps.plus(reached.times(fromEach.means().get(i).orElse(Rational.ZERO).plus(Rational.ONE)));
        }
        return Optional.of(new Passage.Return(probability,
                probability.isZero() ? Optional.empty() : Optional.of(steps.dividedBy(probability))));
    }

    /** Σ p(k) of the set is Y(1), unless Y has a pole there. */
    private Optional<Rational> visits() {
        List<Rational> coefficients = IntStream.range(0, chain.size())
                .mapToObj(i -> into.contains(i) ? Rational.ONE : Rational.ZERO).toList();
        TransferFunction<Rational> y = Transforms.inLowestTerms(chain,
                List.of(new Output("visits", coefficients, Rational.ZERO, "the set"))).get(0);
        Rational below = y.denominator().valueAt(Rational.ONE);
        return below.isZero() ? Optional.empty()
                : Optional.of(y.numerator().valueAt(Rational.ONE).dividedBy(below));
    }
}
