package org.pofk.answer;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Consumer;
import java.util.stream.Stream;
import org.pofk.answer.When.Condition;
import org.pofk.chain.Chain;
import org.pofk.chain.Model;
import org.pofk.chain.Output;
import org.pofk.modes.ClosedForm;
import org.pofk.modes.KnownPoles;
import org.pofk.steps.PossibleSteps;
import org.pofk.steps.StepValues;
import org.pofk.transform.Transforms;

/**
 * When outputs given what is known at the same step meet a condition. a/b ≥ t where b > 0 is the sign of a − t b, a sum
 * of exponentials again; where b is zero nothing is met.
 *
 * @param answers one for each output, in their order, as far as they are found
 */
public record ConditionalWhen(Model model, Given given, List<Output> outputs, Optional<PossibleSteps> possible,
        List<Answer> answers) {

    /** The answer for one output, with the values around it; {@code when} is empty where nothing is known of b. */
    public record Answer(Output output, When when, ConditionalLongRun longRun, List<Conditional.At> around) {
        public Answer {
            around = List.copyOf(around);
        }
    }

    public ConditionalWhen {
        outputs = List.copyOf(outputs);
        answers = List.copyOf(answers);
    }

    /** True when every output has its answer, proved. */
    public boolean isDecided() {
        return answers.size() == outputs.size() && answers.stream().allMatch(answer -> answer.when.decided());
    }

    /** The answers, published one after the other. */
    public static ConditionalWhen of(Model model, Given given, List<Output> outputs, WhenModel.Asked asked,
            Consumer<ConditionalWhen> published) {
        Chain chain = given.chain(model.chain());
        Optional<PossibleSteps> possible = PossibleSteps.of(chain, given.in());
        List<Output> all = new ArrayList<>(List.of(given.event(chain)));
        outputs.forEach(output -> all.add(given.joint(output)));
        KnownPoles poles = new KnownPoles(() -> Eigenvalues.guesses(chain.matrix()));
        List<ClosedForm> forms = Transforms.of(chain, all).stream()
                .map(transform -> ClosedForm.of(transform, poles)).toList();
        Optional<ConditionalForms> seen = ConditionalForms.of(given.in(), chain, forms);
        List<Answer> answers = new ArrayList<>();
        for (int i = 0; i < outputs.size(); i++) {
            ConditionalLongRun longRun = ConditionalForms.longRuns(seen, outputs.size()).get(i);
            When when = possible.filter(PossibleSteps::isNever).isPresent() ? nothingDefined(asked)
                    : seen.isPresent() && possible.isPresent()
                    ? ConditionalSearch.of(seen.get(), possible.get(), longRun, i, asked)
                    : new When(new Condition(asked.kind(), asked.bound()), Optional.empty(), Optional.empty(),
                            List.of(), false, When.Reason.NO_LONG_RUN);
            List<Integer> around = around(when);
            answers.add(new Answer(outputs.get(i), when, longRun, ConditionalValues.of(
                    StepValues.of(chain, List.of(forms.get(i + 1)), around).get(0), forms.get(i + 1),
                    StepValues.of(chain, List.of(forms.get(0)), around).get(0), forms.get(0), possible)));
            published.accept(new ConditionalWhen(model, given, outputs, possible, answers));
        }
        return new ConditionalWhen(model, given, outputs, possible, answers);
    }

    /** The answer where what is known has probability zero at every step. */
    public static When nothingDefined(WhenModel.Asked asked) {
        return new When(new Condition(asked.kind(), asked.bound()), Optional.empty(), Optional.empty(), List.of(), true,
                When.Reason.NOTHING_DEFINED);
    }

    /** The steps just before and at the two that were found. */
    private static List<Integer> around(When when) {
        return Stream.of(when.first(), when.forEverFrom()).flatMap(Optional::stream)
                .flatMap(k -> Stream.of(k - 1, k)).filter(k -> k >= 0 && k <= Integer.MAX_VALUE)
                .map(Long::intValue).distinct().sorted().toList();
    }
}
