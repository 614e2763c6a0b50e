package org.pofk.answer;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Random;
import java.util.function.IntPredicate;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.pofk.Pofk;
import org.pofk.chain.Chain;
import org.pofk.chain.Costs;
import org.pofk.chain.Output;
import org.pofk.chain.Outputs;
import org.pofk.chain.SparseMatrix;
import org.pofk.chain.Structure;
import org.pofk.exact.Rational;
import org.pofk.longrun.ClosedClassLongRun;
import org.pofk.longrun.LongRun;
import org.pofk.longrun.LongRunValues;
import org.pofk.steps.ExactSteps;
import org.pofk.steps.StepValue;
import org.pofk.transform.TransferFunction;

class TotalTest {
    private static final long SEED = 20_261_202;
    private static final int CHAINS = 60;
    private static final int STEPS = 24;

    /** Random chains; no step before the first can be entered in, so k = 0 has no average. */
    @Test
    void entriesAreAveragedOverTheStepsInWhichTheyAreMade() {
        RandomChains chains = new RandomChains(SEED);
        for (int i = 0; i < CHAINS; i++) {
            Chain chain = chains.next();
            Increment entries = Increment.ofEntries(chain, Outputs.states(chain).get(0));
            Total total = Total.of(chain, entries, List.of(0, 1, STEPS));
            assertEquals(List.of(1, STEPS), total.averages().stream().map(StepValue::k).toList());
            assertEquals(Optional.of(valueAt(total.total(), STEPS).dividedBy(Rational.of(STEPS))),
                    total.averages().get(1).exact());
        }
    }

    /** Random chains and costs, some discounted; added up move by move. */
    @Test
    void theTotalIsWhatSteppingAddsUpAtEveryStep() {
        RandomChains chains = new RandomChains(SEED);
        Random random = new Random(SEED);
        int compared = 0;
        for (int i = 0; i < CHAINS; i++) {
            Chain chain = chains.next();
            Costs costs = costs(chain, random);
            Rational factor = i % 3 == 0 ? Rational.of(20, 21) : Rational.ONE;
            Total total = Total.of(chain, Increment.ofCosts(chain, costs), factor, List.of(STEPS));
            Rational sum = Rational.ZERO;
            Rational counted = Rational.ONE;
            List<Rational> state = chain.start();
            for (int k = 0; k <= STEPS; k++) {
                Rational due = k == 0 ? costs.atStart() : Rational.ZERO;
                if (k > 0) {
                    due = due.plus(ofMoves(chain, costs, state));
                    state = chain.matrix().times(state);
                    counted = counted.times(factor);
                }
                due = due.plus(Gauss.dot(costs.eachStep(), state)).times(counted);
                sum = sum.plus(due);
                assertEquals(due, valueAt(total.step(), k), chain::toString);
                assertEquals(sum, valueAt(total.total(), k), chain::toString);
                compared++;
            }
            assertEquals(Optional.of(sum.dividedBy(Rational.of(STEPS + 1))), total.averages().get(0).exact());
        }
        assertEquals(CHAINS * (STEPS + 1), compared);
    }

    private static Costs costs(Chain chain, Random random) {
        List<Rational> eachStep = IntStream.range(0, chain.size())
                .mapToObj(i -> Rational.of(random.nextInt(9) - 3, 1 + random.nextInt(4))).toList();
        List<Costs.Move> moves = new ArrayList<>();
        for (int from = 0; from < chain.size(); from++) {
            for (SparseMatrix.Entry entry : chain.matrix().columns().get(from)) {
                if (random.nextInt(3) == 0) {
                    moves.add(new Costs.Move(from, entry.row(), Rational.of(random.nextInt(50))));
                }
            }
        }
        return new Costs("EUR", eachStep, moves, Rational.of(random.nextInt(3)), Optional.empty());
    }

    private static Rational ofMoves(Chain chain, Costs costs, List<Rational> from) {
        Rational sum = Rational.ZERO;
        for (Costs.Move move : costs.moves()) {
            sum = sum.plus(move.cost().times(chain.matrix().at(move.to(), move.from())).times(from.get(move.from())));
        }
        return sum;
    }

    private static Rational valueAt(DerivedOutput output, int k) {
        return output.closedForm().orElseThrow().expansion().valueAt(k);
    }

    /**
     * Kemeny and Snell's fundamental matrix Z = (I − A + A*)⁻¹, A* what A^k tends to on average, by elimination: the
     * average of G(k) − perStep·k is perStep + c (Z − A*) x(0), whatever the classes and periods.
     */
    @Test
    void growthIsThatOfTheFundamentalMatrix() {
        RandomChains chains = new RandomChains(SEED);
        int cycles = 0;
        int finite = 0;
        for (int i = 0; i < 200; i++) {
            Chain chain = chains.next();
            Output output = chains.output(chain);
            Growth growth = Total.of(chain, Increment.ofOutput(output), List.of()).growth();
            List<List<Rational>> limit = averagePowers(chain);
            List<List<Rational>> z = Gauss.inverse(combined(chain, limit));
            Rational perStep = Gauss.dot(output.coefficients(), Gauss.times(limit, chain.start()));
            assertEquals(perStep, growth.perStep(), chain::toString);
            List<Rational> beyond = LongRunValues.of(growth.beyond());
            Rational average = beyond.stream().reduce(Rational.ZERO, Rational::plus)
                    .dividedBy(Rational.of(beyond.size()));
            assertEquals(Gauss.dot(output.coefficients(), Gauss.times(z, chain.start())), average, chain::toString);
            cycles += beyond.size() > 1 ? 1 : 0;
            finite += growth.everything().isPresent() ? 1 : 0;
        }
        assertTrue(cycles > 30 && finite > 30, cycles + " cycles, " + finite + " finite");
    }

    /** A*, row by row: what a start in each state leads to, from the closed classes alone. */
    private static List<List<Rational>> averagePowers(Chain chain) {
        List<List<Rational>> columns = new ArrayList<>();
        for (int j = 0; j < chain.size(); j++) {
            Chain started = startedIn(chain, j);
            ClosedClassLongRun run = ClosedClassLongRun.of(started, Structure.of(started)).orElseThrow();
            columns.add(Outputs.states(started).stream().map(run::of).map(LongRunValues::of)
                    .map(values -> values.stream().reduce(Rational.ZERO, Rational::plus)
                            .dividedBy(Rational.of(values.size()))).toList());
        }
        return IntStream.range(0, chain.size()).mapToObj(i -> columns.stream().map(each -> each.get(i)).toList())
                .toList();
    }

    private static Chain startedIn(Chain chain, int state) {
        return new Chain(chain.kind(), chain.states(), chain.matrix(), IntStream.range(0, chain.size())
                .mapToObj(i -> i == state ? Rational.ONE : Rational.ZERO).toList(), chain.sets(), chain.outputs());
    }

    private static List<List<Rational>> combined(Chain chain, List<List<Rational>> limit) {
        return IntStream.range(0, chain.size()).mapToObj(i -> IntStream.range(0, chain.size()).mapToObj(j ->
                (i == j ? Rational.ONE : Rational.ZERO).minus(chain.matrix().at(i, j)).plus(limit.get(i).get(j)))
                .toList()).toList();
    }

    /** N = (I − Q)⁻¹ of Kemeny and Snell: visits to states that are left for ever, all of them. */
    @Test
    void theTotalOfALeftStateIsThatOfTheFundamentalMatrixN() {
        RandomChains chains = new RandomChains(SEED);
        int compared = 0;
        for (int i = 0; i < 200; i++) {
            Chain chain = chains.next();
            List<Integer> left = Structure.of(chain).transientClasses().stream()
                    .flatMap(each -> each.states().stream()).sorted().toList();
            List<List<Rational>> n = Gauss.inverse(left.stream().map(to -> left.stream().map(from ->
                    (to.equals(from) ? Rational.ONE : Rational.ZERO).minus(chain.matrix().at(to, from))).toList())
                    .toList());
            List<Rational> visits = Gauss.times(n, left.stream().map(chain.start()::get).toList());
            for (int place = 0; place < left.size(); place++) {
                Output state = Outputs.states(chain).get(left.get(place));
                assertEquals(Optional.of(visits.get(place)),
                        Total.of(chain, Increment.ofOutput(state), List.of()).growth().everything(), chain::toString);
                compared++;
            }
        }
        assertTrue(compared > 200, compared + " states");
    }

    @Test
    void entriesLessExitsAreWhatBeingInsideHasChangedBy() {
        RandomChains chains = new RandomChains(SEED);
        Random random = new Random(SEED);
        int compared = 0;
        for (int i = 0; i < CHAINS; i++) {
            Chain chain = chains.next();
            boolean[] inside = new boolean[chain.size()];
            IntStream.range(0, chain.size()).forEach(state -> inside[state] = random.nextBoolean());
            Output set = indicator("inside", chain.size(), state -> inside[state]);
            Total into = Total.of(chain, Increment.ofEntries(chain, set), List.of());
            Total outOf = Total.of(chain, Increment.ofEntries(chain,
                    indicator("outside", chain.size(), state -> !inside[state])), List.of());
            List<Rational> state = chain.start();
            for (int k = 0; k <= STEPS; k++) {
                assertEquals(set.of(state).minus(set.of(chain.start())),
                        valueAt(into.total(), k).minus(valueAt(outOf.total(), k)), chain::toString);
                state = chain.matrix().times(state);
                compared++;
            }
        }
        assertEquals(CHAINS * (STEPS + 1), compared);
    }

    private static Output indicator(String name, int size, IntPredicate inside) {
        return new Output(name, IntStream.range(0, size)
                .mapToObj(i -> inside.test(i) ? Rational.ONE : Rational.ZERO).toList(), Rational.ZERO, name);
    }

    @Test
    void totalsOfEveryPatternAreSumsOfItsSteps() throws Exception {
        int compared = 0;
        for (Path file : PatternFiles.all()) {
            Chain chain = Pofk.read(file).chain();
            int last = 60;
            for (Output output : Outputs.byDefault(chain)) {
                Total total = Total.of(chain, Increment.ofOutput(output), List.of());
                List<Rational> values = ExactSteps.of(chain, List.of(output), last).values().get(0);
                List<Rational> found = terms(total.total().transform().orElseThrow().y(), last);
                Rational sum = Rational.ZERO;
                for (int k = 0; k <= last; k++) {
                    sum = sum.plus(values.get(k));
                    assertEquals(sum, found.get(k), file + " " + output.name() + " at " + k);
                    compared++;
                }
            }
        }
        assertTrue(compared > 1_500, compared + " values");
    }

    /** The coefficients of z^−k, by division. */
    private static List<Rational> terms(TransferFunction<Rational> y, int last) {
        int degree = y.denominator().degree();
        List<Rational> terms = new ArrayList<>();
        for (int k = 0; k <= last; k++) {
            Rational term = k > degree ? Rational.ZERO : y.numerator().coefficient(degree - k);
            for (int i = 1; i <= Math.min(k, degree); i++) {
                term = term.minus(y.denominator().coefficient(degree - i).times(terms.get(k - i)));
            }
            terms.add(term);
        }
        return terms;
    }

    /** 20,000 walks each; the mean of what lies in 0 … range is within Hoeffding's bound but for one case in 10^9. */
    @Test
    void randomWalksAddUpToTheTotals() {
        Chain chain = Chains.pumps();
        Output down = Chains.state(chain, 2);
        int last = 60;
        Rational steps = valueAtStep(Total.of(chain, Increment.ofOutput(down), List.of(last)));
        Rational entries = valueAtStep(Total.of(chain, Increment.ofEntries(chain, down), List.of(last)));
        Random random = new Random(SEED);
        int runs = 20_000;
        long spent = 0;
        long entered = 0;
        for (int run = 0; run < runs; run++) {
            int state = 0;
            for (int k = 1; k <= last; k++) {
                int next = moved(chain, state, random);
                spent += next == 2 ? 1 : 0;
                entered += next == 2 && state != 2 ? 1 : 0;
                state = next;
            }
        }
        double bound = 61 * Math.sqrt(Math.log(2e9) / (2.0 * runs));
        assertTrue(Math.abs((double) spent / runs - approximate(steps)) < bound, spent + " for " + steps);
        assertTrue(Math.abs((double) entered / runs - approximate(entries)) < bound, entered + " for " + entries);
        assertTrue(spent > entered && entered > runs / 10, spent + " " + entered);
    }

    private static Rational valueAtStep(Total total) {
        return total.total().values().get(0).exact().orElseThrow();
    }

    private static double approximate(Rational value) {
        return new java.math.BigDecimal(value.numerator())
                .divide(new java.math.BigDecimal(value.denominator()), java.math.MathContext.DECIMAL64).doubleValue();
    }

    private static int moved(Chain chain, int from, Random random) {
        double drawn = random.nextDouble();
        for (SparseMatrix.Entry entry : chain.matrix().columns().get(from)) {
            drawn -= approximate(entry.value());
            if (drawn < 0) {
                return entry.row();
            }
        }
        return from;
    }

    @Test
    void aRecursionIsAddedUpWithItsConstantAndItsGrowthIsToldInWords() {
        Chain doubling = Chains.recursion("1", "2");
        Output output = new Output("y", List.of(Rational.ONE), Rational.of(3), "x + 3");
        Total total = Total.of(doubling, Increment.ofValues(output), List.of(3));
        // 1 + 2 + 4 + 8 and four times three
        assertEquals(Optional.of(Rational.of(27)), total.total().values().get(0).exact());
        assertEquals(Rational.ZERO, total.growth().perStep());
        Total constant = Total.of(Chains.recursion("1", "1/2"), Increment.ofValues(output), List.of());
        assertEquals(Rational.of(3), constant.growth().perStep());
        assertEquals(new LongRun.Limit(Rational.of(5)), constant.growth().beyond());
    }
}
