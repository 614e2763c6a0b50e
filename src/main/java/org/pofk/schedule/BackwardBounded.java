package org.pofk.schedule;

import java.util.List;
import java.util.Optional;
import java.util.stream.IntStream;
import org.pofk.chain.Timetable;
import org.pofk.chain.Timetable.Moment;
import org.pofk.exact.Ball;
import org.pofk.exact.Rational;
import org.pofk.steps.BoundedMatrix;
import org.pofk.steps.KnownValue;

/**
 * Between bounds, however long a cycle is: Sᵀ by powers of the bounds of its steps. Certified.
 *
 * @param moves   the moves' matrices the other way round
 * @param actions likewise
 * @param cycle   Sᵀ
 */
record BackwardBounded(List<BoundedMatrix> moves, List<BoundedMatrix> actions, BoundedMatrix cycle)
        implements BackwardArithmetic<BoundedMatrix> {

    static BackwardBounded of(Timetable timetable) {
        List<BoundedMatrix> moves = timetable.moves().stream().map(BoundedMatrix::transposed).toList();
        List<BoundedMatrix> actions = timetable.actions().stream()
                .map(action -> BoundedMatrix.transposed(action.matrix())).toList();
        BoundedMatrix cycle = BoundedMatrix.identity(timetable.moves().get(0).size());
        for (CycleMatrices.Stretch stretch : CycleMatrices.stretches(timetable.cycle())) {
            cycle = cycle.times(step(stretch.moment(), moves, actions).power(stretch.times()));
        }
        return new BackwardBounded(moves, actions, cycle);
    }

    private static BoundedMatrix step(Moment moment, List<BoundedMatrix> moves, List<BoundedMatrix> actions) {
        BoundedMatrix step = moment.move().isPresent() ? moves.get(moment.move().getAsInt())
                : BoundedMatrix.identity(moves.get(0).rows());
        for (int action : moment.actions()) {
            step = step.times(actions.get(action));
        }
        return step;
    }

    @Override
    public BoundedMatrix weights(List<Rational> weights) {
        return BoundedMatrix.of(weights);
    }

    @Override
    public BoundedMatrix beforeMove(int move, BoundedMatrix after) {
        return moves.get(move).times(after);
    }

    @Override
    public BoundedMatrix beforeAction(int action, BoundedMatrix after) {
        return actions.get(action).times(after);
    }

    @Override
    public BoundedMatrix sum(BoundedMatrix first, BoundedMatrix second) {
        return first.plus(second);
    }

    @Override
    public BoundedMatrix only(List<Integer> states, BoundedMatrix weights) {
        return weights.only(states);
    }

    @Override
    public Optional<BoundedMatrix> solved(List<Integer> open, BoundedMatrix added) {
        return cycle.only(open).series(added.only(open)).map(found -> found.only(open));
    }

    @Override
    public KnownValue expected(List<Rational> start, BoundedMatrix weights) {
        Ball sum = IntStream.range(0, start.size()).filter(i -> !start.get(i).isZero())
                .mapToObj(i -> weights.at(i, 0).times(Ball.of(start.get(i), BoundedMatrix.BITS)))
                .reduce(Ball.of(0, BoundedMatrix.BITS), Ball::plus);
        return KnownValue.within(sum);
    }
}
