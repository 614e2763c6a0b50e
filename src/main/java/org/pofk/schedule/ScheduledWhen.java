package org.pofk.schedule;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Consumer;
import java.util.stream.Stream;
import org.pofk.answer.When;
import org.pofk.answer.WhenModel;
import org.pofk.chain.Model;
import org.pofk.chain.Output;
import org.pofk.chain.Timetable;
import org.pofk.chain.Timetable.Moment;
import org.pofk.schedule.CycleCourse.Reading;
import org.pofk.schedule.CycleCourse.Side;

/**
 * When outputs of a model with a schedule meet a condition.
 *
 * @param sides   whether at the end of a step, before or after what is done there, or both times
 * @param answers one for each output, in their order, as far as they are found
 */
public record ScheduledWhen(Model model, List<Output> outputs, WhenModel.Asked asked, Sides sides,
        List<Answer> answers) {

    /** Which values of a step are to meet a condition; where nothing is done, they are one. */
    public enum Sides {
        BEFORE(List.of(Side.BEFORE)), AFTER(List.of(Side.AFTER)), BOTH(List.of(Side.BEFORE, Side.AFTER));

        private final List<Side> all;

        Sides(List<Side> all) {
            this.all = all;
        }

        public List<Side> all() {
            return all;
        }

        List<Side> of(Moment moment) {
            return moment.actions().isEmpty() ? List.of(Side.AFTER) : all;
        }
    }

    /**
     * The answer for one output, with the values at the steps it names and just before these.
     *
     * @param otherwiseBefore where the values after what is done were asked for, the answer for those just before it,
     *                        if that is another
     */
    public record Answer(Output output, When when, Optional<When> otherwiseBefore, List<Reading> around) {
        public Answer {
            around = List.copyOf(around);
        }
    }

    public ScheduledWhen {
        outputs = List.copyOf(outputs);
        answers = List.copyOf(answers);
    }

    /** The answers, published one after the other. */
    public static ScheduledWhen of(Model model, List<Output> outputs, WhenModel.Asked asked, Sides sides,
            Consumer<ScheduledWhen> published) {
        ScheduledChain chain = ScheduledChain.of(model.chain(),
                Timetable.of(model.chain(), model.schedule().orElseThrow()));
        List<Answer> answers = new ArrayList<>();
        for (Output output : outputs) {
            When when = new ScheduledWhenSearch(chain, output, sides).of(asked);
            answers.add(new Answer(output, when, otherwiseBefore(chain, output, asked, sides)
                    .filter(before -> !before.equals(when)), around(chain, output, when)));
            published.accept(new ScheduledWhen(model, outputs, asked, sides, answers));
        }
        return new ScheduledWhen(model, outputs, asked, sides, answers);
    }

    /** True when every output has its answer, proved. */
    public boolean isDecided() {
        return answers.size() == outputs.size() && answers.stream().allMatch(answer -> answer.when.decided());
    }

    /** A limit that is kept after each test and exceeded just before it is no limit kept. */
    private static Optional<When> otherwiseBefore(ScheduledChain chain, Output output, WhenModel.Asked asked,
            Sides sides) {
        boolean isAsked = sides == Sides.AFTER && asked.kind() != When.Condition.Kind.SETTLED
                && !chain.timetable().actions().isEmpty();
        return isAsked ? Optional.of(new ScheduledWhenSearch(chain, output, Sides.BEFORE).of(asked)) : Optional.empty();
    }

    /** The steps just before and at the two that were found. */
    private static List<Reading> around(ScheduledChain chain, Output output, When when) {
        List<Integer> steps = Stream.of(when.first(), when.forEverFrom()).flatMap(Optional::stream)
                .flatMap(k -> Stream.of(k - 1, k)).filter(k -> k >= 0 && k <= Integer.MAX_VALUE)
                .map(Long::intValue).distinct().sorted().toList();
        return chain.at(output, steps).stream().flatMap(Optional::stream).toList();
    }
}
