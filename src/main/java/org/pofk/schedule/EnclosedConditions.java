package org.pofk.schedule;

import java.math.BigInteger;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.LongStream;
import java.util.stream.Stream;
import org.pofk.answer.Band;
import org.pofk.answer.Constraint;
import org.pofk.answer.TooMuchWorkException;
import org.pofk.answer.When.Condition;
import org.pofk.answer.When.Condition.Kind;
import org.pofk.answer.When.End;
import org.pofk.answer.WhenModel;
import org.pofk.chain.Output;
import org.pofk.exact.Ball;
import org.pofk.exact.LeastCommonMultiple;
import org.pofk.exact.Rational;
import org.pofk.schedule.CycleCourse.Reading;
import org.pofk.schedule.CycleFormula.Place;
import org.pofk.steps.FixedPointState;
import org.pofk.steps.KnownValue;

/**
 * By states at the beginnings of cycles in fixed point. No state is ever farther from its limit than it was in an
 * earlier cycle, nor does it move farther in a cycle: so where a limit differs from the bound, all cycles from one on
 * are decided at once, and before it those of a stretch in which little moves. Where the limit is the bound, the states
 * that can be occupied may decide, or a formula. Certified; single values exactly where an enclosure can't tell.
 */
final class EnclosedConditions implements CycleConditions {
    private static final int MOST_DOUBLINGS = 40;
    private static final int EXACT_VALUES_AT_MOST = 40;
    /** How far a place is searched whose end isn't decided. */
    private static final long UNDECIDED_SEARCHED_UP_TO = 64;

    private final ScheduledChain chain;
    private final Output output;
    private final CycleEnclosures cycles;
    private final CycleRows rows;
    private final Optional<OccupiedStates> occupied;
    private final Condition condition;
    private final Band band;
    private final FixedPointBand units;
    private final Map<Place, Optional<Constraint>> formulas = new HashMap<>();
    private int exactValues;

    /**
     * Two where the bound is a part of a long run that is enclosed itself: with the least and the largest it may be.
     * Empty where the states can't be enclosed.
     */
    static Optional<List<EnclosedConditions>> of(ScheduledChain chain, Output output, List<Place> places,
            WhenModel.Asked asked) {
        Optional<CycleEnclosures> cycles = CycleRows.isWithinReach(chain.chain(), chain.timetable())
                ? chain.enclosures() : Optional.empty();
        return cycles.map(known -> {
            CycleRows rows = CycleRows.of(chain.chain(), chain.timetable(), output);
            Optional<OccupiedStates> occupied = OccupiedStates.of(chain.chain(), chain.timetable());
            return sizes(asked, known, rows, places).map(asked::of).distinct().map(condition ->
                    new EnclosedConditions(chain, output, known, rows, occupied, condition)).toList();
        });
    }

    /** The least and the largest that the largest value of the long run may be. */
    private static Stream<Rational> sizes(WhenModel.Asked asked, CycleEnclosures cycles, CycleRows rows,
            List<Place> places) {
        if (!asked.relative()) {
            return Stream.of(Rational.ONE);
        }
        List<Ball> values = places.stream().flatMap(place -> LongStream.range(0, cycles.period())
                .mapToObj(r -> rows.of(place, cycles.limit(r)).abs())).toList();
        return Stream.of(values.stream().map(Ball::lower).reduce(Rational.ZERO, Rational::max),
                values.stream().map(Ball::upper).reduce(Rational.ZERO, Rational::max));
    }

    private EnclosedConditions(ScheduledChain chain, Output output, CycleEnclosures cycles, CycleRows rows,
            Optional<OccupiedStates> occupied, Condition condition) {
        this.chain = chain;
        this.output = output;
        this.cycles = cycles;
        this.rows = rows;
        this.occupied = condition.kind() == Kind.SETTLED ? Optional.empty() : occupied;
        this.condition = condition;
        this.band = condition.around(Rational.ZERO);
        this.units = FixedPointBand.of(band);
    }

    @Override
    public Condition condition() {
        return condition;
    }

    @Override
    public Constraint at(Place place) {
        return new Sequence(place);
    }

    @Override
    public KnownValue limit(Place place, long residue) {
        return new KnownValue(KnownValue.Word.CERTIFIED, Optional.empty(), bits -> reading(place, residue));
    }

    /** What is read in the long run. */
    private Ball reading(Place place, long residue) {
        return rows.of(place, cycles.limit(Math.floorMod(residue, (long) cycles.period())));
    }

    /** By a formula, while few are needed. */
    private Optional<Constraint> formula(Place place) {
        if (!formulas.containsKey(place)) {
            formulas.put(place, formulas.size() >= chain.formulasWithinReach() ? Optional.empty()
                    : chain.cycles().constraint(output, place, condition));
        }
        return formulas.get(place);
    }

    /** What is read at one place, less its limit where it has to settle. */
    private final class Sequence implements Constraint {
        private final Place place;

        private Sequence(Place place) {
            this.place = place;
        }

        @Override
        public int period() {
            return cycles.period();
        }

        @Override
        public long stride(long least, long most) {
            return least;
        }

        @Override
        public Ending ending(long residue, long modulus) throws TooMuchWorkException {
            Optional<Ending> byStates = occupied.flatMap(states -> byStates(states, residue, modulus));
            if (byStates.isPresent()) {
                return byStates.get();
            }
            if (known().isPresent() || units.of(limit(residue), BigInteger.ZERO) == Band.Relation.EITHER) {
                Optional<Constraint> formula = formula(place);
                return formula.isPresent() ? formula.get().ending(residue, modulus)
                        : new Ending(End.APPROACH_NOT_DECIDED, UNDECIDED_SEARCHED_UP_TO);
            }
            for (int i = 0; i < MOST_DOUBLINGS; i++) {
                long m = residue + modulus * ((1L << i) - 1);
                Band.Relation relation = fromThenOn(residue, m);
                if (relation != Band.Relation.EITHER) {
                    return new Ending(relation == Band.Relation.INSIDE ? End.MET : End.FAILED, m);
                }
            }
            throw new TooMuchWorkException();
        }

        /** Its formula, where that was needed already. */
        private Optional<Constraint> known() {
            return formulas.getOrDefault(place, Optional.empty());
        }

        private Ball limit(long residue) {
            return condition.kind() == Kind.SETTLED ? Ball.of(0, FixedPointState.BITS) : reading(place, residue);
        }

        private Band.Relation fromThenOn(long residue, long m) throws TooMuchWorkException {
            return units.of(limit(residue), rows.apart(place, cycles.distance(m)));
        }

        private Ball value(long residue, long m) throws TooMuchWorkException {
            Ball value = rows.of(place, cycles.state(m));
            return condition.kind() == Kind.SETTLED ? value.minus(reading(place, residue)) : value;
        }

        @Override
        public Band.Relation over(long residue, long low, long high, long modulus) throws TooMuchWorkException {
            Optional<Constraint> formula = known();
            if (formula.isPresent()) {
                return formula.get().over(residue, low, high, modulus);
            }
            BigInteger moved = rows.apart(place, cycles.change(low, modulus))
                    .multiply(BigInteger.valueOf((high - low) / modulus));
            for (long m : new long[] {low, high}) {
                Band.Relation relation = units.of(value(residue, m), moved);
                if (relation != Band.Relation.EITHER) {
                    return relation;
                }
            }
            return fromThenOn(residue, low);
        }

        @Override
        public Band.Relation at(long residue, long m) throws TooMuchWorkException {
            Optional<Constraint> formula = known();
            if (formula.isPresent()) {
                return formula.get().at(residue, m);
            }
            Band.Relation byStates = occupied.map(states -> byStates(states, m)).orElse(Band.Relation.EITHER);
            if (byStates != Band.Relation.EITHER) {
                return byStates;
            }
            Band.Relation relation = units.of(value(residue, m), BigInteger.ZERO);
            return relation == Band.Relation.EITHER ? exactly(residue, m) : relation;
        }

        private Band.Relation exactly(long residue, long m) throws TooMuchWorkException {
            Optional<Constraint> formula = formula(place);
            if (formula.isPresent()) {
                return formula.get().at(residue, m);
            }
            Optional<Rational> value = condition.kind() == Kind.SETTLED || ++exactValues > EXACT_VALUES_AT_MOST
                    ? Optional.empty()
                    : chain.exactly(output, m, place.j()).map(reading -> reading.at(place.side()))
                            .flatMap(KnownValue::exact);
            return value.map(exact -> band.contains(exact) ? Band.Relation.INSIDE : Band.Relation.OUTSIDE)
                    .orElseThrow(TooMuchWorkException::new);
        }

        /** By the states that are occupied in the cycles that recur, where these all say the same. */
        private Optional<Ending> byStates(OccupiedStates states, long residue, long modulus) {
            List<Band.Relation> relations = LongStream.range(states.recursFrom(), states.recursFrom() + states.period())
                    .filter(m -> Math.floorMod(m - residue, modulus * states.period()
                            / LeastCommonMultiple.of(modulus, states.period())) == 0)
                    .mapToObj(m -> byStates(states, m)).distinct().toList();
            return relations.size() != 1 || relations.get(0) == Band.Relation.EITHER ? Optional.empty()
                    : Optional.of(new Ending(relations.get(0) == Band.Relation.INSIDE ? End.MET : End.FAILED,
                            states.recursFrom()));
        }

        /** A mean of coefficients that aren't all the same lies strictly between the least and the largest of them. */
        private Band.Relation byStates(OccupiedStates states, long m) {
            List<Rational> coefficients = states.at(place, m).stream().mapToObj(output.coefficients()::get).toList();
            Rational low = coefficients.stream().reduce(Rational::min).orElseThrow().plus(output.constant());
            Rational high = coefficients.stream().reduce(Rational::max).orElseThrow().plus(output.constant());
            return low.equals(high) ? band.contains(low) ? Band.Relation.INSIDE : Band.Relation.OUTSIDE
                    : band.ofBetween(low, high);
        }
    }
}
