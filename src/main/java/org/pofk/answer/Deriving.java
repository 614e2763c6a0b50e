package org.pofk.answer;

import java.time.Duration;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.function.Consumer;
import org.pofk.chain.Model;
import org.pofk.chain.Output;
import org.pofk.chain.Structure;
import org.pofk.longrun.LongRunChecks;
import org.pofk.modes.ClosedForm;
import org.pofk.modes.KnownPoles;
import org.pofk.modes.StateModes;
import org.pofk.steps.StepValue;
import org.pofk.steps.StepValues;
import org.pofk.transform.Transform;
import org.pofk.transform.Transforms;

/**
 * Derives outputs of a model stage by stage, and after each stage publishes what is proven so far: whoever waits for
 * it may stop at any time and keep that.
 */
public final class Deriving {
    /** The closed form is compared with simulation up to this step. */
    public static final int COMPARED_UP_TO = 60;
    /** Runs of the random comparison, and its seed. */
    public static final int RUNS = 10_000;
    public static final long SEED = 1;
    private static final Duration SECOND_OPINION_LIMIT = Duration.ofSeconds(20);

    private final Consumer<DerivedModel> published;
    private final KnownPoles poles;
    private DerivedModel known;

    private Deriving(DerivedModel known, Consumer<DerivedModel> published) {
        this.known = known;
        this.published = published;
        this.poles = new KnownPoles(() -> Eigenvalues.guesses(known.model().chain().matrix()));
    }

    /** What may be asked for besides formulas and long runs. */
    public enum Extra { COMPARISON, POLE_CHECK, STATE_MODES, SECOND_OPINION }

    /** Everything about these outputs; {@code at} lists steps in ascending order whose values are wanted. */
    public static DerivedModel of(Model model, List<Output> outputs, List<Integer> at, Set<Extra> extras,
            Consumer<DerivedModel> published) {
        if (model.schedule().isPresent()) {
            throw new IllegalArgumentException(model.origin() + " has a schedule, of which these formulas know nothing");
        }
        Deriving deriving = new Deriving(new DerivedModel(model, Structure.of(model.chain()),
                outputs.stream().map(DerivedOutput::of).toList(), Optional.empty(), new Wanted(at, extras)),
                published);
        deriving.publish(deriving.known);
        deriving.formulas(outputs);
        deriving.absentEigenvalues();
        if (!at.isEmpty()) {
            deriving.values(at);
        }
        if (extras.contains(Extra.COMPARISON)) {
            deriving.compare();
        }
        if (extras.contains(Extra.POLE_CHECK)) {
            deriving.checkPoles();
        }
        if (extras.contains(Extra.STATE_MODES)) {
            deriving.publish(deriving.known.with(StateModes.of(model.chain(), deriving.poles)));
        }
        if (extras.contains(Extra.SECOND_OPINION)) {
            deriving.askAnother();
        }
        return deriving.known;
    }

    private void publish(DerivedModel next) {
        known = next;
        published.accept(next);
    }

    private void formulas(List<Output> outputs) {
        List<Transform> transforms = Transforms.of(known.model().chain(), outputs);
        for (int i = 0; i < transforms.size(); i++) {
            publish(known.with(i, known.outputs().get(i).with(transforms.get(i))));
        }
        LongRunChecks.Ground ground = LongRunChecks.Ground.of(known.model().chain());
        for (int i = 0; i < transforms.size(); i++) {
            publish(known.with(i, known.outputs().get(i).with(LongRunChecks.of(ground, transforms.get(i)))));
            publish(known.with(i, known.outputs().get(i).with(ClosedForm.of(transforms.get(i), poles))));
        }
    }

    private void absentEigenvalues() {
        for (int i = 0; i < known.outputs().size(); i++) {
            DerivedOutput output = known.outputs().get(i);
            Optional<AbsentEigenvalues> absent = AbsentEigenvalues.of(known.model().chain(), known.structure(),
                    output.transform().orElseThrow());
            if (absent.isPresent()) {
                publish(known.with(i, output.with(absent.get())));
            }
        }
    }

    private List<ClosedForm> closedForms() {
        return known.outputs().stream().map(each -> each.closedForm().orElseThrow()).toList();
    }

    private void values(List<Integer> at) {
        List<List<StepValue>> values = StepValues.of(known.model().chain(), closedForms(), at);
        for (int i = 0; i < values.size(); i++) {
            publish(known.with(i, known.outputs().get(i).with(values.get(i))));
        }
    }

    private void compare() {
        var chain = known.model().chain();
        List<Output> outputs = known.outputs().stream().map(DerivedOutput::output).toList();
        Optional<Simulation> simulation = chain.kind() == org.pofk.chain.Chain.Kind.CHAIN
                ? Optional.of(RandomRuns.of(chain, known.outputs(), RUNS, SEED))
                : Optional.empty();
        List<Comparison> comparisons = Comparison.of(chain, closedForms(), COMPARED_UP_TO, simulation);
        for (int i = 0; i < comparisons.size(); i++) {
            publish(known.with(i, known.outputs().get(i).with(comparisons.get(i))));
        }
    }

    private void checkPoles() {
        for (int i = 0; i < known.outputs().size(); i++) {
            publish(known.with(i, known.outputs().get(i).with(
                    PoleCheck.of(known.model().chain(), closedForms().get(i)))));
        }
    }

    private void askAnother() {
        for (int i = 0; i < known.outputs().size(); i++) {
            ClosedForm form = closedForms().get(i);
            publish(known.with(i, known.outputs().get(i).with(
                    SecondOpinion.of(form.transform(), form.expansion(), SECOND_OPINION_LIMIT))));
        }
    }
}
