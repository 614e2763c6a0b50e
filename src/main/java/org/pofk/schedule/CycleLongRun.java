package org.pofk.schedule;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import org.pofk.chain.Chain;
import org.pofk.chain.Outputs;
import org.pofk.chain.Structure;
import org.pofk.chain.Structure.CommunicatingClass;
import org.pofk.exact.LeastCommonMultiple;
import org.pofk.exact.Rational;
import org.pofk.longrun.LongRun;
import org.pofk.longrun.LongRunValues;
import org.pofk.steps.FixedPointColumn;
import org.pofk.steps.FixedPointState;
import org.pofk.steps.Fraction;
import org.pofk.steps.WholeMatrix;
import org.pofk.steps.WholeState;
import org.pofk.transform.Transforms;

/**
 * What the state at the beginning of a cycle tends to: lim S^(d m) x, d the period of the closed classes of S.
 *
 * @param <V>    a state, exact or from below
 * @param cycles d: the limit recurs after so many cycles
 */
record CycleLongRun<V>(int cycles, V limit) {
    /** Squarings before a chain counts as too slow to be enclosed; 2^this cycles. */
    private static final int SQUARINGS = 70;
    private static final int WITHIN_BITS = 90;
    private static final int CYCLES_AT_MOST = 64;

    /** d, from which moves of S there are; empty when it is above {@value #CYCLES_AT_MOST}. */
    static Optional<Integer> period(Structure structure) {
        BigInteger period = structure.period();
        return period.bitLength() < Integer.SIZE && period.intValue() <= CYCLES_AT_MOST
                ? Optional.of(period.intValue()) : Optional.empty();
    }

    /**
     * Exactly: from the null vector of each closed class, and the shares in which they are reached.
     *
     * @param structure of S, with {@code start} as where it begins
     */
    static CycleLongRun<WholeState> exact(WholeMatrix cycle, WholeState start, Structure structure, int period) {
        WholeMatrix matrix = cycle.power(period);
        List<Integer> left = structure.transientClasses().stream().filter(CommunicatingClass::reached)
                .flatMap(each -> each.states().stream()).sorted().toList();
        BigInteger[][] table = matrix.table();
        WholeState visits = visits(matrix.divisor(), table, start, left);
        BigInteger[] numerators = new BigInteger[matrix.size()];
        Arrays.fill(numerators, BigInteger.ZERO);
        WholeState limit = new WholeState(List.of(numerators), BigInteger.ONE);
        for (List<Integer> closed : closedClasses(structure)) {
            limit = sum(limit, ending(matrix.divisor(), table, start, left, visits, closed));
        }
        return new CycleLongRun<>(period, limit);
    }

    /** Exactly, for a recursion: where every state tends to a limit or a cycle. */
    static Optional<CycleLongRun<WholeState>> ofRecursion(Chain cycles) {
        List<List<Rational>> values = Transforms.of(cycles, Outputs.states(cycles)).stream()
                .map(LongRun::of).map(LongRunValues::of).toList();
        BigInteger period = values.stream().map(each -> BigInteger.valueOf(Math.max(1, each.size())))
                .reduce(BigInteger.ONE, LeastCommonMultiple::of);
        return values.stream().anyMatch(List::isEmpty) || period.bitLength() >= Integer.SIZE
                || period.intValue() > CYCLES_AT_MOST ? Optional.empty()
                : Optional.of(new CycleLongRun<>(period.intValue(),
                        WholeState.of(values.stream().map(each -> each.get(0)).toList())));
    }

    /** Σ over m of the share of each transient state after m cycles: (I − S)⁻¹ x there. */
    private static WholeState visits(BigInteger divisor, BigInteger[][] table, WholeState start, List<Integer> left) {
        BigInteger[][] rows = new BigInteger[left.size()][left.size()];
        BigInteger[] right = new BigInteger[left.size()];
        for (int i = 0; i < left.size(); i++) {
            for (int j = 0; j < left.size(); j++) {
                rows[i][j] = (i == j ? divisor : BigInteger.ZERO).subtract(table[left.get(i)][left.get(j)]);
            }
            right[i] = start.numerators().get(left.get(i)).multiply(divisor);
        }
        WholeState solution = FractionFreeElimination.solve(rows, right).orElseThrow(() ->
                new AssertionError("states that are left for ever have no finite number of visits"));
        return new WholeState(solution.numerators(), solution.divisor().multiply(start.divisor()));
    }

    /** How likely the class is to be the last, times its null vector. */
    private static WholeState ending(BigInteger divisor, BigInteger[][] table, WholeState start, List<Integer> left,
            WholeState visits, List<Integer> members) {
        BigInteger entered = BigInteger.ZERO;
        BigInteger begun = BigInteger.ZERO;
        for (int member : members) {
            begun = begun.add(start.numerators().get(member));
            for (int t = 0; t < left.size(); t++) {
                entered = entered.add(table[member][left.get(t)].multiply(visits.numerators().get(t)));
            }
        }
        Fraction weight = new Fraction(begun, start.divisor())
                .plus(new Fraction(entered, divisor.multiply(visits.divisor())));
        WholeState stationary = stationary(divisor, table, members);
        BigInteger[] numerators = new BigInteger[table.length];
        Arrays.fill(numerators, BigInteger.ZERO);
        for (int i = 0; i < members.size(); i++) {
            numerators[members.get(i)] = stationary.numerators().get(i).multiply(weight.numerator());
        }
        return new WholeState(List.of(numerators), stationary.divisor().multiply(weight.denominator()));
    }

    /** The vector v of a closed class with S v = v and components that sum to one. */
    private static WholeState stationary(BigInteger divisor, BigInteger[][] table, List<Integer> members) {
        int size = members.size() - 1;
        BigInteger[][] rows = new BigInteger[size][size];
        BigInteger[] right = new BigInteger[size];
        for (int i = 0; i < size; i++) {
            for (int j = 0; j < size; j++) {
                rows[i][j] = (i == j ? divisor : BigInteger.ZERO)
                        .subtract(table[members.get(i + 1)][members.get(j + 1)]);
            }
            right[i] = table[members.get(i + 1)][members.get(0)];
        }
        WholeState others = FractionFreeElimination.solve(rows, right).orElseThrow(() ->
                new AssertionError("a closed class with more than one stationary vector"));
        List<BigInteger> all = new ArrayList<>(List.of(others.divisor()));
        all.addAll(others.numerators());
        return new WholeState(all, all.stream().reduce(BigInteger.ZERO, BigInteger::add));
    }

    private static WholeState sum(WholeState a, WholeState b) {
        if (a.numerators().stream().allMatch(each -> each.signum() == 0)) {
            return b;
        }
        List<BigInteger> numerators = new ArrayList<>();
        for (int i = 0; i < a.numerators().size(); i++) {
            numerators.add(a.numerators().get(i).multiply(b.divisor()).add(b.numerators().get(i).multiply(a.divisor())));
        }
        return new WholeState(numerators, a.divisor().multiply(b.divisor()));
    }

    /**
     * From below, within 2^−{@value #WITHIN_BITS} of one in sum: S^(d·2^q) is squared until the columns of each closed
     * class agree and next to nothing is left elsewhere. A stationary vector is a mean of such columns, so it lies
     * between their smallest and largest components. Empty where 2^{@value #SQUARINGS} cycles don't settle.
     */
    static Optional<CycleLongRun<FixedPointState>> certified(List<FixedPointColumn> cycle, FixedPointState start,
            Structure structure, int period) {
        List<FixedPointColumn> power = FixedPointColumn.identity(cycle.size());
        for (int i = 0; i < period; i++) {
            power = FixedPointColumn.product(cycle, power);
        }
        List<List<Integer>> closed = closedClasses(structure);
        for (int squarings = 0; squarings <= SQUARINGS; squarings++) {
            FixedPointState state = FixedPointState.combination(power, start.components());
            FixedPointState limit = below(power, state, closed);
            if (limit.missing().bitLength() <= FixedPointState.BITS - WITHIN_BITS) {
                return Optional.of(new CycleLongRun<>(period, limit));
            }
            power = FixedPointColumn.squared(power);
        }
        return Optional.empty();
    }

    /** The reached closed classes of S^d: the cyclic classes of those of S. */
    private static List<List<Integer>> closedClasses(Structure structure) {
        return structure.closedClasses().stream().filter(CommunicatingClass::reached)
                .flatMap(each -> each.cyclicClasses().stream()).toList();
    }

    /** The share of each class that is certainly in it by now, times the smallest components of its columns. */
    private static FixedPointState below(List<FixedPointColumn> power, FixedPointState state,
            List<List<Integer>> closed) {
        BigInteger[] components = new BigInteger[power.size()];
        Arrays.fill(components, BigInteger.ZERO);
        for (List<Integer> members : closed) {
            BigInteger share = members.stream().map(state.components()::get).reduce(BigInteger.ZERO, BigInteger::add);
            for (int i : members) {
                BigInteger least = members.stream().map(j -> power.get(j).at(i)).reduce(BigInteger::min).orElseThrow();
                components[i] = share.multiply(least).shiftRight(FixedPointState.BITS);
            }
        }
        return new FixedPointState(List.of(components));
    }
}
