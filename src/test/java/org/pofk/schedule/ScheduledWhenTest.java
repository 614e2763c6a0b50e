package org.pofk.schedule;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Random;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.pofk.answer.When;
import org.pofk.answer.When.Condition.Kind;
import org.pofk.answer.When.Reason;
import org.pofk.answer.WhenModel.Asked;
import org.pofk.chain.Model;
import org.pofk.chain.Output;
import org.pofk.chain.Outputs;
import org.pofk.chain.Timetable;
import org.pofk.exact.Rational;
import org.pofk.input.ModelReader;
import org.pofk.input.Overrides;
import org.pofk.input.Source;
import org.pofk.schedule.ScheduledWhen.Sides;
import org.pofk.text.RefusedException;

/** Conditions before and after what a schedule does, with long cycles too, against plain stepping in whole numbers. */
class ScheduledWhenTest {
    private static final int SHIFT = 12;
    private static final long SEED = 20261201;

    /**
     * A chain with probabilities n/2^12, stepped with shifts alone; every {@code every} steps an action moves the states
     * elsewhere, each to one other.
     */
    private record Plain(int[][] columns, int[] action, int every) {
        static Plain of(Random random, int states, int every, int[] action, int most) {
            int[][] columns = new int[states][states];
            for (int j = 0; j < states; j++) {
                for (int i = Math.max(0, j - 2); i <= Math.min(states - 1, j + 2); i++) {
                    columns[j][i] = i == j ? 0 : 1 + random.nextInt(most);
                }
                columns[j][j] = (1 << SHIFT) - Arrays.stream(columns[j]).sum();
            }
            return new Plain(columns, action, every);
        }

        Model model() {
            String moves = IntStream.range(0, columns.length).mapToObj(j -> "  s" + j + ": {"
                    + IntStream.range(0, columns.length).filter(i -> columns[j][i] > 0).mapToObj(i -> "s" + i + ": "
                            + columns[j][i] + "/" + (1 << SHIFT)).collect(Collectors.joining(", ")) + "}\n")
                    .collect(Collectors.joining());
            String actions = IntStream.range(0, action.length).filter(j -> action[j] != j)
                    .mapToObj(j -> "s" + j + ": {s" + action[j] + ": 1}").collect(Collectors.joining(", "));
            String text = "pofk: 1\nstates: [" + IntStream.range(0, columns.length).mapToObj(i -> "s" + i)
                    .collect(Collectors.joining(", ")) + "]\nstart: s0\ntransitions:\n" + moves + "actions: {do: {" + actions
                    + "}}\nschedule: {every: " + every + ", do: do}\n";
            try {
                return ModelReader.read(Source.ofText("plain.yaml", text), Optional.empty(), Overrides.NONE);
            } catch (RefusedException e) {
                throw new AssertionError(text + e.faults(), e);
            }
        }

        /** Before and after, times 2^(12 k). */
        List<BigInteger[][]> steps(int last) {
            BigInteger[] now = new BigInteger[columns.length];
            Arrays.fill(now, BigInteger.ZERO);
            now[0] = BigInteger.ONE;
            List<BigInteger[][]> all = new ArrayList<>(List.of(new BigInteger[][][] {{now, now}}));
            for (int k = 1; k <= last; k++) {
                BigInteger[] before = new BigInteger[columns.length];
                Arrays.fill(before, BigInteger.ZERO);
                for (int j = 0; j < columns.length; j++) {
                    for (int i = 0; i < columns.length; i++) {
                        if (columns[j][i] > 0) {
                            before[i] = before[i].add(now[j].multiply(BigInteger.valueOf(columns[j][i])));
                        }
                    }
                }
                BigInteger[] after = before;
                if (k % every == 0) {
                    after = new BigInteger[columns.length];
                    Arrays.fill(after, BigInteger.ZERO);
                    for (int j = 0; j < columns.length; j++) {
                        after[action[j]] = after[action[j]].add(before[j]);
                    }
                }
                all.add(new BigInteger[][] {before, after});
                now = after;
            }
            return all;
        }
    }

    /** The sum of some states at each step, before and after, times 2^(12 k). */
    private static BigInteger[][] values(List<BigInteger[][]> steps, Output output) {
        BigInteger[][] values = new BigInteger[steps.size()][2];
        for (int k = 0; k < steps.size(); k++) {
            for (int side = 0; side < 2; side++) {
                BigInteger sum = BigInteger.ZERO;
                for (int i = 0; i < output.coefficients().size(); i++) {
                    sum = output.coefficients().get(i).isZero() ? sum : sum.add(steps.get(k)[side][i]);
                }
                values[k][side] = sum;
            }
        }
        return values;
    }

    private static List<Boolean> met(BigInteger[][] values, Sides asked, Kind kind, Rational bound) {
        return IntStream.range(0, values.length).mapToObj(k -> asked.all().stream().map(side -> values[k][side.ordinal()]
                .multiply(bound.denominator()).compareTo(bound.numerator().shiftLeft(SHIFT * k)))
                .allMatch(sign -> kind == Kind.AT_LEAST ? sign >= 0 : sign <= 0)).toList();
    }

    /** Nothing holds before the first step said, all does from the one for ever on, and no earlier one would do. */
    private static int compare(String name, When when, List<Boolean> met) {
        int first = met.indexOf(true);
        assertEquals(first < 0 ? when.first().filter(k -> k >= met.size()) : Optional.of((long) first), when.first(), name);
        when.forEverFrom().filter(from -> from < met.size()).ifPresent(from -> assertTrue(from == 0
                || !met.get((int) (from - 1)), name + " for ever from " + from));
        int compared = 0;
        for (When.ResidueClass each : when.classes()) {
            boolean failedLast = false;
            for (long k = each.residue(); k < met.size(); k += each.modulus()) {
                boolean isMet = met.get((int) k);
                boolean isForEver = each.forEverFrom().isPresent() && k >= each.forEverFrom().get();
                assertTrue(!isForEver || isMet, name + " for ever at " + k);
                assertTrue(!each.forEverFrom().equals(Optional.of(k)) || k == each.residue() || failedLast, name + " earlier");
                assertTrue(!isMet || each.first().isPresent() && each.first().get() <= k, name + " first at " + k);
                failedLast = !isMet;
                compared++;
            }
        }
        return compared;
    }

    /** What was compared and how it was answered. */
    private static final class Counts {
        private final Map<Reason, Integer> reasons = new EnumMap<>(Reason.class);
        private int decided;
        private int compared;
    }

    private static Counts check(Plain plain, int last, List<Output> outputs, List<Rational> bounds) {
        ScheduledChain chain = scheduled(plain.model());
        List<BigInteger[][]> steps = plain.steps(last);
        Counts counts = new Counts();
        for (Output output : outputs) {
            BigInteger[][] values = values(steps, output);
            for (Kind kind : List.of(Kind.AT_LEAST, Kind.AT_MOST)) {
                for (Sides sides : Sides.values()) {
                    ScheduledWhenSearch search = new ScheduledWhenSearch(chain, output, sides);
                    for (Rational bound : bounds) {
                        When when = search.of(new Asked(kind, bound, false));
                        counts.decided += when.decided() ? 1 : 0;
                        counts.reasons.merge(when.reason(), 1, Integer::sum);
                        counts.compared += compare(plain.every + " " + output.name() + " " + kind + " " + sides + " "
                                + bound, when, met(values, sides, kind, bound));
                    }
                }
            }
        }
        return counts;
    }

    private static ScheduledChain scheduled(Model model) {
        return ScheduledChain.of(model.chain(), Timetable.of(model.chain(), model.schedule().orElseThrow()));
    }

    /** Ten states, an action every 1,000 steps that renews: 2,500 steps before and after it. */
    @Test
    void longCyclesAreDecidedAtEveryPlace() {
        int[] renew = {0, 1, 2, 3, 4, 5, 6, 7, 0, 0};
        Plain plain = Plain.of(new Random(SEED), 10, 1000, renew, 8);
        Output last = Outputs.states(plain.model().chain()).get(9);
        Counts counts = check(plain, 2500, List.of(last), List.of(Rational.of(1, 100), Rational.of(1, 12), Rational.ZERO));
        assertEquals(18, counts.decided);
        assertEquals(18 * 2501, counts.compared);
        assertEquals(Map.of(Reason.FOR_EVER, 6, Reason.ONLY_IN_SOME_CLASSES, 7, Reason.ONLY_FOR_A_WHILE, 2,
                Reason.NEVER, 3), counts.reasons);
    }

    /** The action swaps two halves that nothing else connects, so that the long run has a period of two cycles. */
    @Test
    void cyclesThatAlternateAreDecidedHalfByHalf() {
        int[] swap = {4, 5, 6, 7, 0, 1, 2, 3};
        Plain plain = Plain.of(new Random(SEED), 8, 400, swap, 40);
        for (int j = 2; j < 6; j++) {
            for (int i = 2; i < 6; i++) {
                if (i / 4 != j / 4) {
                    plain.columns[j][j] += plain.columns[j][i];
                    plain.columns[j][i] = 0;
                }
            }
        }
        List<Output> states = Outputs.states(plain.model().chain());
        Counts counts = check(plain, 2500, List.of(states.get(0), states.get(6)), List.of(Rational.of(1, 5),
                Rational.of(1, 3), Rational.ZERO));
        assertEquals(36, counts.decided);
        assertEquals(36 * 2501, counts.compared);
        assertTrue(counts.reasons.get(Reason.ONLY_IN_SOME_CLASSES) > 9, counts.reasons.toString());
    }

    /** Where every state is as likely as any other in the end, no place of a cycle is told from that bound. */
    @Test
    void aLimitThatIsTheBoundIsNotDecidedWithoutAFormula() {
        int[] turn = {3, 0, 1, 2, 4, 5, 6, 7, 9, 8};
        Plain plain = Plain.of(new Random(SEED), 10, 1000, turn, 1);
        Output first = Outputs.states(plain.model().chain()).get(0);
        Asked tenth = new Asked(Kind.AT_LEAST, Rational.of(1, 10), false);
        When when = ScheduledWhen.of(plain.model(), List.of(first), tenth, Sides.BOTH, partly -> { }).answers().get(0)
                .when();
        assertEquals(Reason.APPROACH_NOT_DECIDED, when.reason());
        assertEquals(Optional.of(0L), when.first());
        assertFalse(when.decided());
    }

    /** With four states a few formulas are within reach, and they decide. */
    @Test
    void aLimitThatIsTheBoundIsDecidedByItsFormula() {
        int[] turn = {1, 0, 2, 3};
        Plain plain = Plain.of(new Random(SEED), 4, 5, turn, 1);
        Model model = plain.model();
        ScheduledChain chain = scheduled(model);
        int decided = 0;
        for (Output output : Outputs.states(model.chain()).subList(0, 1)) {
            for (Kind kind : List.of(Kind.AT_LEAST, Kind.AT_MOST)) {
                for (Sides sides : Sides.values()) {
                    ScheduledWhenSearch search = new ScheduledWhenSearch(chain, output, sides);
                    Asked quarter = new Asked(kind, Rational.of(1, 4), false);
                    When when = search.byEnclosures(quarter);
                    decided += when.decided() ? 1 : 0;
                    assertEquals(search.byFormulas(quarter), when);
                }
            }
        }
        assertEquals(6, decided);
    }

    /** Two ways: by formulas over the cycles, and by states enclosed; every condition with every side in some case. */
    @Test
    void enclosuresSayWhatFormulasSay() {
        int same = 0;
        List<Asked> all = List.of(new Asked(Kind.AT_LEAST, Rational.of(1, 10), false),
                new Asked(Kind.AT_MOST, Rational.of(1, 5), false), new Asked(Kind.AT_MOST, Rational.ZERO, false),
                new Asked(Kind.SETTLED, Rational.of(1, 1000), false), new Asked(Kind.SETTLED, Rational.of(1, 100), true));
        for (Map.Entry<String, String> each : ScheduledCases.withCosts().entrySet()) {
            ScheduledChain chain = scheduled(ScheduledCases.model(each.getKey(), each.getValue()));
            Output output = Outputs.states(chain.chain()).get(2);
            for (Asked asked : all) {
                Sides sides = Sides.values()[same % Sides.values().length];
                ScheduledWhenSearch search = new ScheduledWhenSearch(chain, output, sides);
                When formulas = search.byFormulas(asked);
                When enclosures = search.byEnclosures(asked);
                String name = each.getKey() + " " + output.name() + " " + asked + " " + sides;
                assertTrue(formulas.decided(), name);
                assertEquals(List.of(formulas.classes(), formulas.first(), formulas.forEverFrom(), formulas.reason()),
                        List.of(enclosures.classes(), enclosures.first(), enclosures.forEverFrom(),
                        enclosures.reason()), name);
                same++;
            }
        }
        assertEquals(ScheduledCases.withCosts().size() * 5, same);
    }
}
