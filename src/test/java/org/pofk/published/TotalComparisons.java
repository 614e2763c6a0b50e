package org.pofk.published;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.ArrayList;
import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.BiConsumer;
import org.pofk.answer.Increment;
import org.pofk.answer.Total;
import org.pofk.chain.Chain;
import org.pofk.chain.Costs;
import org.pofk.chain.Output;
import org.pofk.chain.Outputs;
import org.pofk.exact.ComplexBall;
import org.pofk.exact.Rational;
import org.pofk.formula.Formula;
import org.pofk.longrun.LongRunValues;

/** How published totals, rewards and fundamental matrices are compared with what the tool adds up. */
final class TotalComparisons {
    private static final int STEPS = 40;
    private static final int SCALE = 400;
    private static final String RECURSION =
            "v(0)=0, v(n)=q+P v(n-1) with P row-stochastic (the transpose of A)";

    static final Map<String, BiConsumer<Derived, JsonNode>> BY_KEY = new LinkedHashMap<>();

    static {
        BY_KEY.put("total_reward", TotalComparisons::rewards);
        BY_KEY.put("quality_adjusted_cycles", TotalComparisons::qualityAdjusted);
        BY_KEY.put("fundamental_Z_row_convention", TotalComparisons::fundamental);
        BY_KEY.put("kemeny_constant_trace_Z", TotalComparisons::trace);
    }

    private TotalComparisons() {
    }

    /** Each move earns what the state it leaves is worth: v(n) of a start is the total of the steps up to n. */
    private static void rewards(Derived derived, JsonNode node) {
        assertEquals(RECURSION, node.get("recursion").asText(), derived::toString);
        for (int start = 0; start < 2; start++) {
            Chain chain = derived.startedIn(start).chain();
            Total total = Total.of(chain, Increment.ofCosts(chain, earned(derived, chain, node.get("q"))), List.of());
            assertEquals(derived.value(node.get("gain").asText()), total.growth().perStep(), derived::toString);
            String name = "v" + (start + 1);
            JsonNode values = node.get(name);
            for (int n = 0; n < values.size(); n++) {
                assertEquals(derived.value(values.get(n).asText()), at(total, n), derived::toString);
            }
            Formula published = derived.parse(node.get(name + "_closed_form").asText());
            for (int k = 0; k <= STEPS; k++) {
                ComplexBall expected = CertifiedValue.of(published, derived.valuesAt(k), SCALE);
                Rational found = at(total, k);
                assertTrue(expected.real().contains(found) && expected.isWithin(SCALE / 2),
                        () -> derived + ": " + name + " is " + found);
            }
        }
    }

    private static Costs earned(Derived derived, Chain chain, JsonNode q) {
        List<Costs.Move> moves = new ArrayList<>();
        for (int from = 0; from < chain.size(); from++) {
            for (var entry : chain.matrix().columns().get(from)) {
                moves.add(new Costs.Move(from, entry.row(), derived.value(q.get(from).asText())));
            }
        }
        return new Costs("units", Collections.nCopies(chain.size(), Rational.ZERO), moves, Rational.ZERO,
                Optional.empty());
    }

    private static Rational at(Total total, long k) {
        return total.total().closedForm().orElseThrow().expansion().valueAt(k);
    }

    /** The utility of all cycles, the first one included. */
    private static void qualityAdjusted(Derived derived, JsonNode value) {
        Output utility = derived.chain().outputs().stream().filter(each -> each.name().equals("utility")).findFirst()
                .orElseThrow();
        assertEquals(Optional.of(derived.value(value.asText())),
                Total.of(derived.chain(), Increment.ofOutput(utility), List.of()).growth().everything(),
                derived::toString);
    }

    /** Z of Kemeny and Snell: what the steps in j from a start in i are above π_j k in the end. */
    private static void fundamental(Derived derived, JsonNode rows) {
        assertEquals(derived.chain().size(), rows.size());
        for (int i = 0; i < rows.size(); i++) {
            assertEquals(derived.chain().size(), rows.get(i).size());
            for (int j = 0; j < rows.get(i).size(); j++) {
                assertEquals(derived.value(rows.get(i).get(j).asText()), offset(derived, i, j), derived::toString);
            }
        }
    }

    private static void trace(Derived derived, JsonNode value) {
        Rational trace = Rational.ZERO;
        for (int i = 0; i < derived.chain().size(); i++) {
            trace = trace.plus(offset(derived, i, i));
        }
        assertEquals(derived.value(value.asText()), trace, derived::toString);
    }

    private static Rational offset(Derived derived, int from, int in) {
        Chain chain = derived.startedIn(from).chain();
        List<Rational> beyond = LongRunValues.of(Total.of(chain, Increment.ofOutput(Outputs.states(chain).get(in)),
                List.of()).growth().beyond());
        assertEquals(1, beyond.size(), derived::toString);
        return beyond.get(0);
    }
}
