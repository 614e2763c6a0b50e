package org.pofk.schedule;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.IntStream;
import org.pofk.answer.Constraint;
import org.pofk.answer.Eigenvalues;
import org.pofk.answer.When.Condition;
import org.pofk.chain.Chain;
import org.pofk.chain.Output;
import org.pofk.chain.Timetable;
import org.pofk.exact.Rational;
import org.pofk.longrun.LongRun;
import org.pofk.modes.ClosedForm;
import org.pofk.modes.KnownPoles;
import org.pofk.schedule.CycleCourse.Side;
import org.pofk.schedule.CycleFormula.Place;
import org.pofk.steps.StateArithmetic;
import org.pofk.steps.WholeMatrix;
import org.pofk.steps.WholeState;
import org.pofk.transform.Transform;
import org.pofk.transform.Transforms;

/**
 * The chain that moves once a cycle, by S from x(P): its outputs at step m are the outputs of a scheduled chain in
 * cycle m, so that all that is known of chains is known of these.
 */
final class CycleChain {
    private final Timetable timetable;
    private final StateArithmetic.Whole matrices;
    private final Chain chain;
    private final KnownPoles poles;

    private CycleChain(Timetable timetable, StateArithmetic.Whole matrices, Chain chain) {
        this.timetable = timetable;
        this.matrices = matrices;
        this.chain = chain;
        this.poles = new KnownPoles(() -> Eigenvalues.guesses(chain.matrix()));
    }

    /** @param begin x(P) */
    static CycleChain of(Chain chain, Timetable timetable, StateArithmetic.Whole matrices, WholeMatrix cycle,
            WholeState begin) {
        return new CycleChain(timetable, matrices, new Chain(chain.kind(), chain.states(), cycle.reduced(),
                begin.reduced(), chain.sets(), List.of()));
    }

    Chain chain() {
        return chain;
    }

    /** For each output its formulas at these places, and that of its mean over a cycle. */
    List<List<CycleFormula>> formulas(List<Output> outputs, List<Place> places) {
        List<Optional<Place>> asked = new ArrayList<>(places.stream().map(Optional::of).toList());
        if (timetable.period() > 1) {
            asked.add(Optional.empty());
        }
        List<Transform> transforms = Transforms.of(chain, outputs.stream()
                .map(output -> new CycleOutputs(timetable, matrices, output))
                .flatMap(later -> asked.stream().map(place -> place.map(at -> later.at(at.j(), at.side()))
                        .orElseGet(later::average))).toList());
        List<List<CycleFormula>> formulas = new ArrayList<>();
        for (int i = 0; i < outputs.size(); i++) {
            int from = i * asked.size();
            formulas.add(IntStream.range(0, asked.size()).mapToObj(place ->
                    formula(asked.get(place), transforms.get(from + place))).toList());
        }
        return formulas;
    }

    /** An output as a formula in m at step j of cycle m, after what is done there. */
    CycleFormula formula(Output output, int j) {
        return formula(output, new Place(j, Side.AFTER));
    }

    /** The same at any place. */
    CycleFormula formula(Output output, Place place) {
        Output read = new CycleOutputs(timetable, matrices, output).at(place.j(), place.side());
        return formula(Optional.of(place), Transforms.of(chain, List.of(read)).get(0));
    }

    /** A condition on an output at a place of cycle m; empty where there is no long run. */
    Optional<Constraint> constraint(Output output, Place place, Condition condition) {
        CycleFormula formula = formula(output, place);
        return Constraint.of(chain, formula.closedForm(), formula.longRun(), condition);
    }

    /** The same at each step j = 0 … T − 1 of a cycle. */
    List<CycleFormula> formulas(Output output) {
        return formulas(output, IntStream.range(0, timetable.period())
                .mapToObj(j -> new Place(j, Side.AFTER)).toList());
    }

    /** The same at these places. */
    List<CycleFormula> formulas(Output output, List<Place> places) {
        CycleOutputs later = new CycleOutputs(timetable, matrices, output);
        List<Transform> transforms = Transforms.of(chain, places.stream()
                .map(at -> later.at(at.j(), at.side())).toList());
        return IntStream.range(0, places.size()).mapToObj(i ->
                formula(Optional.of(places.get(i)), transforms.get(i))).toList();
    }

    /** What step j of cycle m adds to an output, 1 ≤ j ≤ T: its value there less that one step before. */
    CycleFormula difference(Output output, int j) {
        CycleOutputs later = new CycleOutputs(timetable, matrices, output);
        return formula(Optional.of(new Place(j, Side.AFTER)), Transforms.of(chain, List.of(difference(output,
                later.at(j, Side.AFTER), j == 1 ? output : later.at(j - 1, Side.AFTER)))).get(0));
    }

    private static Output difference(Output output, Output end, Output begin) {
        return new Output(output.name(), IntStream.range(0, end.coefficients().size())
                .mapToObj(i -> end.coefficients().get(i).minus(begin.coefficients().get(i))).toList(), Rational.ZERO,
                output.definition());
    }

    /** What cycle m adds to an output: its value at the end less that at the beginning. */
    CycleFormula added(Output output) {
        Output end = new CycleOutputs(timetable, matrices, output).at(timetable.period(), Side.AFTER);
        return formula(Optional.empty(),
                Transforms.of(chain, List.of(difference(output, end, output))).get(0));
    }

    private CycleFormula formula(Optional<Place> place, Transform transform) {
        return new CycleFormula(place, chain, ClosedForm.of(transform, poles), LongRun.of(chain, transform));
    }

    /** Where an output is looked at unasked: after the actions that end a cycle, and just before any action. */
    static List<Place> places(Timetable timetable, int most) {
        List<Place> places = new ArrayList<>(List.of(new Place(0, Side.AFTER)));
        for (int j = 1; j <= timetable.period() && places.size() <= most; j++) {
            if (!timetable.cycle().get(j - 1).actions().isEmpty()) {
                places.add(new Place(j, Side.BEFORE));
                if (j < timetable.period()) {
                    places.add(new Place(j, Side.AFTER));
                }
            }
        }
        return places.size() <= most ? places : places.subList(0, 1);
    }
}
