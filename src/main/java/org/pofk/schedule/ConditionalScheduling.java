package org.pofk.schedule;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.IntStream;
import org.pofk.answer.Given;
import org.pofk.chain.Model;
import org.pofk.chain.Output;
import org.pofk.chain.Timetable;
import org.pofk.exact.Rational;
import org.pofk.schedule.ConditionalCourse.Reading;
import org.pofk.schedule.ConditionalCourse.Value;
import org.pofk.schedule.ConditionalSchedule.Conditional;
import org.pofk.schedule.CycleCourse.Side;
import org.pofk.schedule.CycleFormula.Place;
import org.pofk.steps.KnownValue;

/**
 * Puts a {@link ConditionalSchedule} together: numerators and denominator are outputs of one scheduled chain; that the
 * denominator is zero is decided by moves and actions alone.
 */
final class ConditionalScheduling {
    private final Model model;
    private final Given given;
    private final List<Output> outputs;
    private final ScheduledModel stopped;
    private final ScheduledChain chain;
    private final Timetable timetable;
    private final Optional<PossibleMoments> possible;

    ConditionalScheduling(Model model, Given given, List<Output> outputs, List<Integer> at,
            Scheduling.Formulas formulas) {
        this.model = model;
        this.given = given;
        this.outputs = outputs;
        Model other = given.model(model);
        List<Output> asked = new ArrayList<>(List.of(given.event(other.chain())));
        outputs.forEach(output -> asked.add(given.joint(output)));
        this.stopped = Scheduling.of(other, asked, at, formulas, partly -> { });
        this.timetable = stopped.timetable();
        this.chain = ScheduledChain.of(other.chain(), timetable);
        this.possible = PossibleMoments.of(timetable, other.chain().start(), given.in());
    }

    ConditionalSchedule found() {
        return new ConditionalSchedule(model, given, stopped, possible, IntStream.range(0, outputs.size())
                .mapToObj(i -> conditional(outputs.get(i), stopped.outputs().get(i + 1))).toList());
    }

    private Conditional conditional(Output output, ScheduledOutput joint) {
        ScheduledOutput event = stopped.outputs().get(0);
        return new Conditional(output, joint, quotient(joint.preamble(), event.preamble(), 0),
                quotient(joint.first(), event.first(), timetable.before()),
                ConditionalRegime.of(chain, possible, joint, event), values(joint, event));
    }

    /** @param begin the step k at which the courses begin */
    private Optional<ConditionalCourse> quotient(Optional<CycleCourse> joint, Optional<CycleCourse> event, int begin) {
        return joint.flatMap(above -> event.map(below -> ConditionalCourse.of(above.steps(), (j, side) ->
                quotient(above.readings().get(j).at(side), below.readings().get(j).at(side), begin + j, side))));
    }

    private Value quotient(KnownValue above, KnownValue below, int k, Side side) {
        if (possible.isPresent() && !possible.get().at(side).at(k)
                || below.exact().filter(Rational::isZero).isPresent()) {
            return Value.IMPOSSIBLE;
        }
        boolean isQuotient = below.isPositive() || possible.isPresent() && below.word() == KnownValue.Word.EXACT;
        return isQuotient ? Value.of(above.over(below)) : Value.NOT_DECIDED;
    }

    private List<Reading> values(ScheduledOutput joint, ScheduledOutput event) {
        return IntStream.range(0, event.values().size()).mapToObj(i -> {
            int k = event.values().get(i).j();
            return new Reading(k, value(joint, event, i, Side.BEFORE), value(joint, event, i, Side.AFTER));
        }).toList();
    }

    /** By formulas over the cycles where stepping gives enclosures only, which may be too wide beside a rare event. */
    private Value value(ScheduledOutput joint, ScheduledOutput event, int i, Side side) {
        KnownValue below = event.values().get(i).at(side);
        int k = event.values().get(i).j();
        Value stepped = quotient(joint.values().get(i).at(side), below, k, side);
        int beyond = k - timetable.before();
        boolean endsOne = side == Side.BEFORE && beyond % timetable.period() == 0;
        int m = endsOne ? beyond / timetable.period() - 1 : beyond / timetable.period();
        if (stepped.kind() == Value.Kind.IMPOSSIBLE || possible.isEmpty() || beyond < 0 || m < 0
                || below.word() == KnownValue.Word.EXACT || !chain.areFormulasWithinReach()) {
            return stepped;
        }
        Place place = new Place(endsOne ? timetable.period() : beyond % timetable.period(), side);
        return Value.of(KnownValue.of(chain.conditional(joint.output(), event.output(), List.of(place)).get(0).at(m)));
    }
}
