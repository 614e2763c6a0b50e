package org.pofk.schedule;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.stream.IntStream;
import org.pofk.answer.FirstEntrance;
import org.pofk.answer.Increment;
import org.pofk.chain.SparseMatrix;
import org.pofk.exact.Rational;
import org.pofk.longrun.LinearEquations;
import org.pofk.longrun.StationaryDistribution;
import org.pofk.steps.KnownValue;
import org.pofk.steps.StateArithmetic;
import org.pofk.steps.WholeState;

/** In whole numbers; a system with I − Sᵀ is solved exactly. */
record BackwardExactly(ScheduledChain chain, StateArithmetic.Whole matrices) implements BackwardArithmetic<WholeState> {

    static BackwardExactly of(ScheduledChain chain) {
        return new BackwardExactly(chain, StateArithmetic.Whole.of(chain.timetable()));
    }

    @Override
    public WholeState weights(List<Rational> weights) {
        return WholeState.of(weights);
    }

    @Override
    public WholeState beforeMove(int move, WholeState after) {
        return matrices.moves().get(move).timesFromLeft(after);
    }

    @Override
    public WholeState beforeAction(int action, WholeState after) {
        return matrices.actions().get(action).timesFromLeft(after);
    }

    @Override
    public WholeState sum(WholeState first, WholeState second) {
        if (first.divisor().compareTo(second.divisor()) < 0) {
            return sum(second, first);
        }
        // a multiple from the second sum on, since all divisors grow alike from step to step
        BigInteger[] parts = first.divisor().divideAndRemainder(second.divisor());
        BigInteger common = parts[1].signum() == 0 ? second.divisor() : first.divisor().gcd(second.divisor());
        BigInteger ofFirst = second.divisor().divide(common);
        BigInteger ofSecond = first.divisor().divide(common);
        List<BigInteger> sums = new ArrayList<>();
        for (int i = 0; i < first.numerators().size(); i++) {
            sums.add(first.numerators().get(i).multiply(ofFirst).add(second.numerators().get(i).multiply(ofSecond)));
        }
        return new WholeState(sums, first.divisor().multiply(ofFirst));
    }

    @Override
    public WholeState only(List<Integer> states, WholeState weights) {
        Set<Integer> kept = new HashSet<>(states);
        return new WholeState(IntStream.range(0, weights.numerators().size())
                .mapToObj(i -> kept.contains(i) ? weights.numerators().get(i) : BigInteger.ZERO).toList(),
                weights.divisor());
    }

    @Override
    public Optional<WholeState> solved(List<Integer> open, WholeState added) {
        SparseMatrix cycle = chain.cycles().chain().matrix();
        List<Rational> right = added.reduced();
        List<Rational> solution = LinearEquations.solve(FirstEntrance.identityMinusTransposed(cycle, open,
                StationaryDistribution.placeOf(open)), open.stream().map(right::get).toList());
        List<Rational> all = Increment.zeros(right.size());
        IntStream.range(0, open.size()).forEach(i -> all.set(open.get(i), solution.get(i)));
        return Optional.of(WholeState.of(all));
    }

    @Override
    public KnownValue expected(List<Rational> start, WholeState weights) {
        List<Rational> reduced = weights.reduced();
        return KnownValue.of(IntStream.range(0, start.size()).filter(i -> !start.get(i).isZero())
                .mapToObj(i -> start.get(i).times(reduced.get(i))).reduce(Rational.ZERO, Rational::plus));
    }
}
