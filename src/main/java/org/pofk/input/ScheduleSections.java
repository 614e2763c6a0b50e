package org.pofk.input;

import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.stream.IntStream;
import org.pofk.chain.Place;
import org.pofk.chain.Schedule;
import org.pofk.chain.Schedule.Phases;
import org.pofk.chain.Schedule.Recurring;
import org.pofk.chain.SparseMatrix;
import org.pofk.chain.SparseMatrix.Entry;
import org.pofk.chain.Timetable;
import org.pofk.exact.Rational;

/** The sections {@code actions} and {@code schedule}, {@code moves}, {@code phases} and {@code repeat}. */
final class ScheduleSections {
    /** The name that the model's own moves have in {@code phases}. */
    static final String OWN_MOVES = "transitions";
    private static final String MOVES = "moves";
    private static final String ACTIONS = "actions";

    private final Fields fields;
    private final States states;
    private final Head head;
    private final Amounts amounts;
    private final Reading reading;
    private final Set<String> used = new HashSet<>();

    private ScheduleSections(Fields fields, States states, Head head, Amounts amounts, Reading reading) {
        this.fields = fields;
        this.states = states;
        this.head = head;
        this.amounts = amounts;
        this.reading = reading;
    }

    /** The schedule, when the file has one; {@code own} are the model's own moves. */
    static Optional<Schedule> read(Fields fields, States states, Head head, Amounts amounts, SparseMatrix own,
            Reading reading) {
        return new ScheduleSections(fields, states, head, amounts, reading).schedule(own);
    }

    /** The moves of a file that has neither {@code transitions} nor {@code matrix}: the first under {@code moves}. */
    static Optional<Node> firstMoves(Fields fields) {
        return fields.value(MOVES).flatMap(Node::asMapping).flatMap(mapping -> mapping.entries().stream()
                .filter(entry -> !Fields.isRemark(entry)).map(Node.Entry::value).findFirst());
    }

    private Optional<Schedule> schedule(SparseMatrix own) {
        int before = reading.count();
        StepCounts counts = new StepCounts(head.step().is(), reading);
        Map<String, SparseMatrix> actions = named(ACTIONS, "in the action", identity());
        List<Recurring> recurring = fields.value("schedule").map(node ->
                new RecurringSection(actions, used, counts, reading).read(node)).orElse(List.of());
        refuseUnused(ACTIONS, "is never done; say when, under schedule, or leave it out");
        Map<String, SparseMatrix> moves = named(MOVES, "in the moves", own);
        if (hasOwnMoves()) {
            moves.putIfAbsent(OWN_MOVES, own);
        }
        Optional<Phases> phases = new PhasesSection(moves, used, counts, reading).read(fields);
        refuseUnused(MOVES, "are used in no phase; name them under phases, or leave them out");
        if (reading.count() > before || recurring.isEmpty() && phases.isEmpty()) {
            return Optional.empty();
        }
        return checked(new Schedule(recurring, phases));
    }

    private Optional<Schedule> checked(Schedule schedule) {
        boolean fits = Timetable.cycleSteps(schedule) <= Timetable.STEPS_AT_MOST
                && schedule.phases().map(Phases::steps).orElse(0) <= Timetable.STEPS_AT_MOST;
        if (!fits) {
            reading.fault(fields.position("schedule").or(() -> fields.position("phases")).orElseThrow(),
                    "cycle-too-long", "taken together the schedule repeats only after more than "
                            + Timetable.STEPS_AT_MOST + " steps, the most there may be; make phases shorter, or the"
                            + " intervals multiples of each other");
        }
        return Optional.of(schedule).filter(each -> fits);
    }

    private SparseMatrix identity() {
        return new SparseMatrix(IntStream.range(0, states.size())
                .mapToObj(state -> List.of(new Entry(state, Rational.ONE))).toList());
    }

    /** The matrices of a section by name; from states they don't name they are those of {@code others}. */
    private Map<String, SparseMatrix> named(String section, String in, SparseMatrix others) {
        Map<String, SparseMatrix> matrices = new LinkedHashMap<>();
        Optional<Node.Mapping> written = fields.value(section).flatMap(node -> reading.mapping(node,
                "'" + section + "'", "{NAME: {STATE: {OTHER: 0.9, STATE: rest}}}"));
        for (Node.Entry entry : written.map(Node.Mapping::entries).orElse(List.of())) {
            boolean isRemark = entry.value().asScalar().isPresent() && Fields.takeRemark(entry, Place.named(section), reading);
            if (!isRemark && States.isName(entry.key(), section.equals(ACTIONS) ? "an action" : "moves", reading)) {
                String place = in + " '" + Words.shortened(entry.name()) + "'";
                reading.mapping(entry.value(), "what happens " + place, "{STATE: {OTHER: 0.9, STATE: rest}}")
                        .ifPresent(moves -> matrices.put(entry.name(), matrix(section, entry, place, moves, others)));
            }
        }
        return matrices;
    }

    private SparseMatrix matrix(String section, Node.Entry entry, String place, Node.Mapping moves,
            SparseMatrix others) {
        Transitions written = Transitions.named(place, moves, states, head, amounts, reading);
        if (hasOwnMoves() || section.equals(ACTIONS)) {
            return written.over(others);
        }
        return firstMoves(fields).filter(first -> first == entry.value()).isPresent() ? others
                : written.complete(entry.key().position());
    }

    private boolean hasOwnMoves() {
        return fields.value(OWN_MOVES).isPresent() || fields.value("matrix").isPresent();
    }

    private void refuseUnused(String section, String why) {
        fields.value(section).flatMap(Node::asMapping).ifPresent(mapping -> mapping.entries().stream()
                .filter(entry -> entry.value().asMapping().isPresent() && !used.contains(entry.name()))
                .forEach(entry -> reading.fault(entry.key().position(), "never-used",
                        "'" + Words.shortened(entry.name()) + "' " + why)));
    }
}
