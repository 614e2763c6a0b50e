package org.pofk.published;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.JsonNode;
import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.IntStream;
import org.pofk.answer.FirstEntrance;
import org.pofk.chain.Chain;
import org.pofk.chain.SparseMatrix;
import org.pofk.exact.Rational;

/** Published tables over several sizes of a chain, each size made here and answered from every state. */
final class PublishedTables {
    private static final Pattern WAIT = Pattern.compile("(\\d+) s(?: = ([\\d.]+) (min|h|days))?");
    private static final Map<String, Long> SECONDS = Map.of("min", 60L, "h", 3_600L, "days", 86_400L);

    private PublishedTables() {
    }

    /** Walks on the levels 0 … a from z, up with probability p; values as they are rounded in print. */
    static void walks(Derived derived, JsonNode rows) {
        for (JsonNode row : rows) {
            Rational p = derived.value(row.get("p").asText());
            Rational start = derived.value(row.get("start").asText());
            Rational goal = derived.value(row.get("goal").asText());
            assertTrue(start.isInteger() && goal.isInteger(), () -> derived + ": " + row);
            int a = goal.numerator().intValueExact();
            int z = start.numerator().intValueExact();
            Chain walk = walk(p, a);
            Rational ruin = FirstEntrance.of(walk, Set.of(0), Set.of(a)).probabilities().get(z);
            assertPrinted(derived, row.get("ruin_rounded").asText(), ruin);
            assertPrinted(derived, row.get("success_rounded").asText(), Rational.ONE.minus(ruin));
            assertPrinted(derived, row.get("mean_duration_rounded").asText(),
                    FirstEntrance.of(walk, Set.of(0, a), Set.of()).means().get(z).orElseThrow());
            String[] cases = row.get("ruin_exact_formula").asText().split(", ");
            assertEquals("1-z/a if p=q", cases[1], derived::toString);
            Rational ratio = Rational.ONE.minus(p).dividedBy(p);
            Map<String, Rational> names = Map.of("p", p, "q", Rational.ONE.minus(p), "a", goal, "z", start);
            assertEquals(ruin, ratio.isOne() ? Rational.ONE.minus(start.dividedBy(goal))
                    : FractionInZ.of(derived.parse(powers(cases[0], a, z)), withoutExponents(names)).value(),
                    derived::toString);
        }
    }

    /** With the exponents put in, for names stand for fractions. */
    private static String powers(String formula, int a, int z) {
        return formula.replace("^a", "^" + a).replace("^z", "^" + z);
    }

    private static Map<String, Rational> withoutExponents(Map<String, Rational> names) {
        return Map.of("p", names.get("p"), "q", names.get("q"));
    }

    private static Chain walk(Rational up, int a) {
        List<List<SparseMatrix.Entry>> columns = new ArrayList<>();
        for (int level = 0; level <= a; level++) {
            columns.add(level == 0 || level == a ? List.of(new SparseMatrix.Entry(level, Rational.ONE))
                    : List.of(new SparseMatrix.Entry(level - 1, Rational.ONE.minus(up)),
                            new SparseMatrix.Entry(level + 1, up)));
        }
        return chain(columns);
    }

    /** Runs of r successes at even chance, a trial a second. */
    static void runs(Derived derived, JsonNode byLength) {
        byLength.properties().forEach(entry -> {
            if (entry.getKey().equals("formula")) {
                for (int r = 1; r <= 12; r++) {
                    assertEquals(derived.value(entry.getValue().asText().replace("(r+1)", String.valueOf(r + 1))),
                            meanUntilRun(r), derived::toString);
                }
            } else {
                Matcher wait = WAIT.matcher(entry.getValue().asText());
                assertTrue(wait.matches(), () -> derived + ": " + entry);
                Rational mean = meanUntilRun(Integer.parseInt(entry.getKey().substring("r=".length())));
                assertEquals(Rational.parse(wait.group(1)), mean, derived::toString);
                if (wait.group(2) != null) {
                    assertPrinted(derived, wait.group(2), mean.dividedBy(Rational.of(SECONDS.get(wait.group(3)))));
                }
            }
        });
    }

    private static Rational meanUntilRun(int r) {
        List<List<SparseMatrix.Entry>> columns = new ArrayList<>();
        for (int length = 0; length < r; length++) {
            columns.add(List.of(new SparseMatrix.Entry(0, Rational.HALF),
                    new SparseMatrix.Entry(length + 1, Rational.HALF)));
        }
        columns.add(List.of(new SparseMatrix.Entry(r, Rational.ONE)));
        return FirstEntrance.of(chain(columns), Set.of(r), Set.of()).means().get(0).orElseThrow();
    }

    private static Chain chain(List<List<SparseMatrix.Entry>> columns) {
        List<Rational> start = new ArrayList<>(Collections.nCopies(columns.size(), Rational.ZERO));
        start.set(0, Rational.ONE);
        return new Chain(Chain.Kind.CHAIN, IntStream.range(0, columns.size()).mapToObj(i -> "s" + i).toList(),
                new SparseMatrix(columns), start, Map.of(), List.of());
    }

    /** Within half a unit of the last place that is printed. */
    private static void assertPrinted(Derived derived, String printed, Rational value) {
        assertTrue(printed.matches("[\\d.]+"), () -> derived + ": " + printed);
        BigDecimal decimal = new BigDecimal(printed);
        Rational half = Rational.of(10).pow(-decimal.scale()).times(Rational.HALF);
        assertTrue(value.minus(Rational.of(decimal)).abs().compareTo(half) <= 0,
                () -> derived + ": printed " + printed + " for " + value);
    }
}
