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
import org.pofk.exact.Rational;
import org.pofk.longrun.LongRun;
import org.pofk.longrun.LongRunValues;
import org.pofk.longrun.Settling;
import org.pofk.modes.ClosedForm;
import org.pofk.modes.KnownPoles;
import org.pofk.steps.StepValue;
import org.pofk.steps.StepValues;
import org.pofk.transform.Transform;
import org.pofk.transform.Transforms;

/**
 * When outputs of a model meet a condition.
 *
 * @param answers one for each output, in their order, as far as they are found
 */
public record WhenModel(Model model, List<Output> outputs, Asked asked, List<Answer> answers) {

    /**
     * What is asked of every output.
     *
     * @param relative for {@code SETTLED}: the bound is a part of the long run's size, of its largest value for a cycle
     */
    public record Asked(Condition.Kind kind, Rational bound, boolean relative) {
        /** With a part of the long run worked out; nothing of none. */
        public Condition of(LongRun longRun) {
            return of(LongRunValues.of(longRun).stream().map(Rational::abs).reduce(Rational.ZERO, Rational::max));
        }

        /** @param size of the largest value of the long run */
        public Condition of(Rational size) {
            return new Condition(kind, relative ? bound.times(size) : bound);
        }
    }

    /**
     * The answer for one output, with the values around it and how the output settles.
     *
     * @param nearest where the condition is never met, the value that comes nearest to doing so
     */
    public record Answer(Output output, When when, LongRun longRun, Optional<Settling> settling,
            List<StepValue> around, Optional<Peak> nearest) {
        public Answer {
            around = List.copyOf(around);
        }
    }

    public WhenModel {
        outputs = List.copyOf(outputs);
        answers = List.copyOf(answers);
    }

    /** True when every output has its answer, proved. */
    public boolean isDecided() {
        return answers.size() == outputs.size() && answers.stream().allMatch(answer -> answer.when.decided());
    }

    /** The answers, published one after the other. */
    public static WhenModel of(Model model, List<Output> outputs, Asked asked, Consumer<WhenModel> published) {
        List<Answer> answers = new ArrayList<>();
        KnownPoles poles = new KnownPoles(() -> Eigenvalues.guesses(model.chain().matrix()));
        List<Transform> transforms = Transforms.of(model.chain(), outputs);
        for (int i = 0; i < outputs.size(); i++) {
            LongRun longRun = LongRun.of(model.chain(), transforms.get(i));
            ClosedForm form = ClosedForm.of(transforms.get(i), poles);
            When when = When.of(model.chain(), form, longRun, asked.of(longRun));
            answers.add(new Answer(outputs.get(i), when, longRun, Settling.of(form, longRun, 6),
                    StepValues.of(model.chain(), List.of(form), around(when)).get(0),
                    nearest(model.chain(), form, longRun, when)));
            published.accept(new WhenModel(model, outputs, asked, answers));
        }
        return new WhenModel(model, outputs, asked, answers);
    }

    private static Optional<Peak> nearest(Chain chain, ClosedForm form, LongRun longRun, When when) {
        if (when.reason() != When.Reason.NEVER) {
            return Optional.empty();
        }
        return switch (when.condition().kind()) {
            case AT_LEAST -> Peak.highest(chain, form, longRun);
            case AT_MOST -> Peak.lowest(chain, form.transform().output());
            case SETTLED -> Optional.empty();
        };
    }

    /** The steps just before and at the two that were found. */
    private static List<Integer> around(When when) {
        return Stream.of(when.first(), when.forEverFrom()).flatMap(Optional::stream)
                .flatMap(k -> Stream.of(k - 1, k)).filter(k -> k >= 0 && k <= Integer.MAX_VALUE)
                .map(Long::intValue).distinct().sorted().toList();
    }
}
