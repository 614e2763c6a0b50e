package org.pofk.schedule;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Consumer;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import org.pofk.answer.When;
import org.pofk.answer.WhenModel;
import org.pofk.chain.Model;
import org.pofk.chain.Output;
import org.pofk.chain.Timetable;
import org.pofk.steps.KnownValue;
import org.pofk.steps.StepValue;

/**
 * When outputs of a model with a schedule meet a condition at the end of a step, after what is done there.
 *
 * @param answers one for each output, in their order, as far as they are found
 */
public record ScheduledWhen(Model model, List<Output> outputs, WhenModel.Asked asked, List<Answer> answers) {

    /** The answer for one output, with the values around it. */
    public record Answer(Output output, When when, List<StepValue> around) {
        public Answer {
            around = List.copyOf(around);
        }
    }

    public ScheduledWhen {
        outputs = List.copyOf(outputs);
        answers = List.copyOf(answers);
    }

    /** The answers, published one after the other. */
    public static ScheduledWhen of(Model model, List<Output> outputs, WhenModel.Asked asked,
            Consumer<ScheduledWhen> published) {
        ScheduledChain chain = ScheduledChain.of(model.chain(),
                Timetable.of(model.chain(), model.schedule().orElseThrow()));
        List<Answer> answers = new ArrayList<>();
        for (Output output : outputs) {
            When when = new ScheduledWhenSearch(chain, output).of(asked);
            answers.add(new Answer(output, when, around(chain, output, when)));
            published.accept(new ScheduledWhen(model, outputs, asked, answers));
        }
        return new ScheduledWhen(model, outputs, asked, answers);
    }

    /** True when every output has its answer, proved. */
    public boolean isDecided() {
        return answers.size() == outputs.size() && answers.stream().allMatch(answer -> answer.when.decided());
    }

    /** The steps just before and at the two that were found. */
    private static List<StepValue> around(ScheduledChain chain, Output output, When when) {
        List<Integer> steps = Stream.of(when.first(), when.forEverFrom()).flatMap(Optional::stream)
                .flatMap(k -> Stream.of(k - 1, k)).filter(k -> k >= 0 && k <= Integer.MAX_VALUE)
                .map(Long::intValue).distinct().sorted().toList();
        List<Optional<KnownValue>> values = chain.at(output, steps);
        return IntStream.range(0, steps.size()).boxed().flatMap(i -> values.get(i).map(value ->
                new StepValue(steps.get(i), value.exact(), value.enclosure())).stream()).toList();
    }
}
