package org.pofk.steps;

import java.math.BigInteger;
import java.util.List;
import org.pofk.chain.Output;
import org.pofk.chain.Timetable;
import org.pofk.chain.Timetable.Moment;
import org.pofk.exact.Ball;
import org.pofk.exact.Rational;

/**
 * What a state is taken through a timetable with: whole numbers, which grow from step to step, or fixed point, whose
 * error is known.
 *
 * @param <V> a state
 * @param <R> what an output reads in it
 */
public interface StateArithmetic<V, R> {

    V start(List<Rational> vector);

    /** The state after the move in this place of the timetable. */
    V moved(int move, V state);

    /** The state after the action in this place of the timetable. */
    V acted(int action, V state);

    /** The state {@code steps} steps of the timetable after step {@code first}; none gives the state itself. */
    default V walked(Timetable timetable, V state, int first, int steps) {
        V now = state;
        for (int j = 1; j <= steps; j++) {
            Moment moment = timetable.at(first + j);
            now = moment.move().isPresent() ? moved(moment.move().getAsInt(), now) : now;
            for (int action : moment.actions()) {
                now = acted(action, now);
            }
        }
        return now;
    }

    R reading(Output output, V state);

    R sum(R first, R second);

    R over(R value, int divisor);

    /** Exactly for whole numbers, by the middle in fixed point. */
    boolean isAbove(R first, R second);

    /** The largest (or smallest) of some, {@code best} being so by {@link #isAbove}. */
    KnownValue extreme(R best, List<R> all);

    KnownValue known(R value);

    /** In whole numbers. */
    record Whole(List<WholeMatrix> moves, List<WholeMatrix> actions) implements StateArithmetic<WholeState, Fraction> {
        public static Whole of(Timetable timetable) {
            return new Whole(timetable.moves().stream().map(WholeMatrix::of).toList(),
                    timetable.actions().stream().map(action -> WholeMatrix.of(action.matrix())).toList());
        }

        @Override
        public WholeState start(List<Rational> vector) {
            return WholeState.of(vector);
        }

        @Override
        public WholeState moved(int move, WholeState state) {
            return moves.get(move).times(state);
        }

        @Override
        public WholeState acted(int action, WholeState state) {
            return actions.get(action).times(state);
        }

        @Override
        public Fraction reading(Output output, WholeState state) {
            return state.reading(output);
        }

        @Override
        public Fraction sum(Fraction first, Fraction second) {
            return first.plus(second);
        }

        @Override
        public Fraction over(Fraction value, int divisor) {
            return value.over(divisor);
        }

        @Override
        public boolean isAbove(Fraction first, Fraction second) {
            return first.isAbove(second);
        }

        @Override
        public KnownValue extreme(Fraction best, List<Fraction> all) {
            return best.known();
        }

        @Override
        public KnownValue known(Fraction value) {
            return value.known();
        }
    }

    /** In fixed point; for chains, not for recursions. */
    record Fixed(List<List<FixedPointColumn>> moves, List<List<FixedPointColumn>> actions)
            implements StateArithmetic<FixedPointState, Ball> {
        public static Fixed of(Timetable timetable) {
            return new Fixed(timetable.moves().stream().map(FixedPointColumn::below).toList(),
                    timetable.actions().stream().map(action -> FixedPointColumn.below(action.matrix())).toList());
        }

        @Override
        public FixedPointState start(List<Rational> vector) {
            return FixedPointState.below(vector);
        }

        @Override
        public FixedPointState moved(int move, FixedPointState state) {
            return FixedPointState.combination(moves.get(move), state.components());
        }

        @Override
        public FixedPointState acted(int action, FixedPointState state) {
            return FixedPointState.combination(actions.get(action), state.components());
        }

        @Override
        public Ball reading(Output output, FixedPointState state) {
            return state.reading(output);
        }

        @Override
        public Ball sum(Ball first, Ball second) {
            return first.plus(second);
        }

        @Override
        public Ball over(Ball value, int divisor) {
            return value.dividedBy(divisor);
        }

        @Override
        public boolean isAbove(Ball first, Ball second) {
            return first.center().compareTo(second.center()) > 0;
        }

        /** Any of them may be the true extreme that is nowhere farther from the best than the widest two are wide. */
        @Override
        public KnownValue extreme(Ball best, List<Ball> all) {
            BigInteger widest = all.stream().map(Ball::radius).reduce(best.radius(), BigInteger::max);
            return KnownValue.within(new Ball(best.center(), widest, best.scale()));
        }

        @Override
        public KnownValue known(Ball value) {
            return KnownValue.within(value);
        }
    }
}
