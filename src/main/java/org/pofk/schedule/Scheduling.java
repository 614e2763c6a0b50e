package org.pofk.schedule;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Consumer;
import java.util.function.UnaryOperator;
import java.util.stream.IntStream;
import org.pofk.chain.Chain;
import org.pofk.chain.Model;
import org.pofk.chain.Output;
import org.pofk.chain.Structure;
import org.pofk.chain.Timetable;
import org.pofk.schedule.CycleCourse.Reading;
import org.pofk.schedule.CycleCourse.Side;
import org.pofk.schedule.CycleFormula.Place;
import org.pofk.steps.StateArithmetic;
import org.pofk.steps.WholeMatrix;
import org.pofk.steps.WholeState;

/**
 * Derives outputs of a model with a schedule, and after each stage publishes what is proven so far. Exact where the
 * numbers stay within reach, by powers of the matrix of a whole cycle; certified beyond.
 */
public final class Scheduling {
    /** Cubed states times bits of a cycle's matrix, for exact long runs and formulas: seconds. */
    private static final double EXACT_AT_MOST = 4e7;
    /** Steps times entries times machine words of a number. */
    private static final double WALKED_EXACTLY_AT_MOST = 1e8;
    private static final int PLACES_AT_MOST = 8;
    private static final int JOINT_STATES_AT_MOST = 6;

    private final Consumer<ScheduledModel> published;
    private final Chain chain;
    private final Timetable timetable;
    private final List<Output> outputs;
    private final StateArithmetic.Whole whole;
    private final long cycleBits;
    private ScheduledModel known;

    /** Whether formulas over the cycles are wanted however long they take. */
    public enum Formulas { WITHIN_REACH, ALL }

    private Scheduling(Model model, List<Output> outputs, Consumer<ScheduledModel> published) {
        this.published = published;
        this.chain = model.chain();
        this.timetable = Timetable.of(chain, model.schedule().orElseThrow(() ->
                new IllegalArgumentException(model.origin() + " has no schedule")));
        this.outputs = outputs;
        this.whole = StateArithmetic.Whole.of(timetable);
        this.cycleBits = CycleMatrices.bits(timetable, whole);
        this.known = new ScheduledModel(model, timetable, outputs.stream().map(ScheduledOutput::of).toList(), false);
    }

    /** Everything about these outputs of a model that has a schedule; {@code at} lists steps in ascending order. */
    public static ScheduledModel of(Model model, List<Output> outputs, List<Integer> at, Formulas formulas,
            Consumer<ScheduledModel> published) {
        Scheduling scheduling = new Scheduling(model, outputs, published);
        if (scheduling.isWalkedExactly(scheduling.timetable.before() + scheduling.timetable.period())) {
            scheduling.derive(scheduling.whole, at, formulas);
        } else {
            scheduling.derive(StateArithmetic.Fixed.of(scheduling.timetable), at, formulas);
        }
        return scheduling.known;
    }

    private <V, R> void derive(StateArithmetic<V, R> arithmetic, List<Integer> at, Formulas formulas) {
        first(arithmetic);
        Optional<WholeState> limit = regime();
        if (!at.isEmpty()) {
            values(at);
        }
        boolean within = CycleMatrices.areFormulasWithinReach(chain.size(), timetable, whole)
                || formulas == Formulas.ALL;
        if (within) {
            formulas(beginExactly(), limit, at);
        } else {
            publish(new ScheduledModel(known.model(), timetable, known.outputs(), true));
        }
    }

    private void publish(ScheduledModel next) {
        known = next;
        published.accept(next);
    }

    private void publish(int place, UnaryOperator<ScheduledOutput> found) {
        publish(new ScheduledModel(known.model(), timetable, IntStream.range(0, outputs.size()).mapToObj(i ->
                i == place ? found.apply(known.outputs().get(i)) : known.outputs().get(i)).toList(),
                known.formulasLeftOut()));
    }

    /** Numbers that double with every squaring are the work there is. */
    private double work() {
        return Math.pow(chain.size(), 3) * cycleBits;
    }

    private boolean isWalkedExactly(long steps) {
        double bits = (double) cycleBits / timetable.period() * steps;
        long entries = whole.moves().stream().mapToLong(WholeMatrix::entries).max().orElseThrow() + chain.size();
        return chain.kind() == Chain.Kind.RECURSION || bits / Long.SIZE * entries * steps <= WALKED_EXACTLY_AT_MOST;
    }

    /** Preamble and first cycle. */
    private <V, R> void first(StateArithmetic<V, R> arithmetic) {
        V begin = arithmetic.start(chain.start());
        List<Optional<CycleCourse>> before = outputs.stream().map(each -> Optional.<CycleCourse>empty()).toList();
        if (timetable.before() > 0) {
            CycleCourse.Walked<V> walked =
                    CycleCourse.of(timetable, arithmetic, begin, 0, timetable.before(), outputs);
            before = walked.courses().stream().map(Optional::of).toList();
            begin = walked.end();
        }
        List<CycleCourse> cycle = CycleCourse.of(timetable, arithmetic, begin, timetable.before(), timetable.period(),
                outputs).courses();
        for (int i = 0; i < outputs.size(); i++) {
            int place = i;
            Optional<CycleCourse> preamble = before.get(i);
            publish(i, output -> output.withFirst(preamble, cycle.get(place)));
        }
    }

    private WholeState beginExactly() {
        return begin(whole);
    }

    /** x(P). */
    private <V, R> V begin(StateArithmetic<V, R> arithmetic) {
        return arithmetic.walked(timetable, arithmetic.start(chain.start()), 0, timetable.before());
    }

    /** What the cycles tend to; exactly known, the state at their beginning. */
    private Optional<WholeState> regime() {
        if (chain.kind() == Chain.Kind.RECURSION) {
            return recursionRegime();
        }
        Structure structure = CycleGraph.of(timetable, chain.start());
        Optional<Integer> period = CycleLongRun.period(structure);
        if (period.isEmpty()) {
            nowhere("it recurs, but only after more cycles than are listed");
            return Optional.empty();
        }
        if (work() * period.get() <= EXACT_AT_MOST) {
            CycleLongRun<WholeState> found = CycleLongRun.exact(CycleMatrices.exact(timetable, whole), beginExactly(),
                    structure, period.get());
            recurring(found, whole);
            return Optional.of(found.limit());
        }
        StateArithmetic.Fixed fixed = StateArithmetic.Fixed.of(timetable);
        CycleLongRun.certified(CycleMatrices.below(timetable, fixed), begin(fixed), structure, period.get())
                .ifPresent(found -> recurring(found, fixed));
        return Optional.empty();
    }

    private Optional<WholeState> recursionRegime() {
        Chain cycles = CycleChain.of(chain, timetable, whole, CycleMatrices.exact(timetable, whole), beginExactly())
                .chain();
        Optional<CycleLongRun<WholeState>> found = CycleLongRun.ofRecursion(cycles);
        found.ifPresentOrElse(longRun -> recurring(longRun, whole),
                () -> nowhere("the state itself tends to nothing that recurs"));
        return found.map(CycleLongRun::limit);
    }

    private void nowhere(String explanation) {
        IntStream.range(0, outputs.size()).forEach(i -> recurring(i, new PeriodicRegime.None(explanation)));
    }

    private <V, R> void recurring(CycleLongRun<V> longRun, StateArithmetic<V, R> arithmetic) {
        List<CycleCourse> courses = CycleCourse.of(timetable, arithmetic, longRun.limit(), timetable.before(),
                timetable.period() * longRun.cycles(), outputs).courses();
        for (int i = 0; i < outputs.size(); i++) {
            recurring(i, new PeriodicRegime.Recurring(longRun.cycles(), courses.get(i)));
        }
    }

    private void recurring(int place, PeriodicRegime regime) {
        publish(place, output -> output.with(regime));
    }

    private void values(List<Integer> at) {
        List<List<Reading>> values = ScheduledValues.of(chain, timetable, whole, outputs, at);
        for (int i = 0; i < outputs.size(); i++) {
            List<Reading> found = values.get(i);
            publish(i, output -> output.withValues(found));
        }
    }

    private void formulas(WholeState begin, Optional<WholeState> limit, List<Integer> at) {
        StretchFormulas within = new StretchFormulas(chain, timetable, whole);
        for (int i = 0; i < outputs.size(); i++) {
            List<StretchFormula> found = within.of(outputs.get(i), begin, limit);
            publish(i, output -> output.withWithin(found));
        }
        CycleChain cycles = CycleChain.of(chain, timetable, whole, CycleMatrices.exact(timetable, whole), begin);
        List<List<CycleFormula>> over = cycles.formulas(outputs, places(at));
        for (int i = 0; i < outputs.size(); i++) {
            List<CycleFormula> found = over.get(i);
            publish(i, output -> output.withOver(found));
        }
        within.firstPart().filter(part -> chain.size() <= JOINT_STATES_AT_MOST).flatMap(part -> JointFormulas.of(
                cycles.chain(), timetable.moves().get(part.move()), part.to())).ifPresent(this::joint);
    }

    private void joint(JointFormulas formulas) {
        for (int i = 0; i < outputs.size(); i++) {
            Optional<JointFormula> found = formulas.of(outputs.get(i));
            if (found.isPresent()) {
                publish(i, output -> output.with(found.get()));
            }
        }
    }

    private List<Place> places(List<Integer> at) {
        List<Place> places = new ArrayList<>(CycleChain.places(timetable, PLACES_AT_MOST));
        for (int k : at) {
            int j = timetable.place(k).within();
            for (Side side : k >= timetable.before() ? List.of(Side.BEFORE, Side.AFTER) : List.<Side>of()) {
                Place place = new Place(j, j == 0 ? Side.AFTER : side);
                boolean isActed = j > 0 && !timetable.cycle().get(j - 1).actions().isEmpty();
                if (!places.contains(place) && (side == Side.AFTER || isActed) && places.size() < PLACES_AT_MOST) {
                    places.add(place);
                }
            }
        }
        return places;
    }
}
