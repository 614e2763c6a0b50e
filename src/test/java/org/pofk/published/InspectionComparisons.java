package org.pofk.published;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static org.junit.jupiter.api.Assertions.fail;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.BiConsumer;
import org.pofk.chain.Model;
import org.pofk.exact.Rational;
import org.pofk.input.ModelReader;
import org.pofk.input.Overrides;
import org.pofk.input.Source;
import org.pofk.schedule.ScheduledModel;
import org.pofk.schedule.Scheduling;
import org.pofk.steps.KnownValue;
import org.pofk.text.RefusedException;

/**
 * How published average probabilities of failure on demand are compared with those of a chain that a perfect proof test
 * renews every T steps; and how far the approximations of the standard are from them.
 */
final class InspectionComparisons {
    static final Map<String, BiConsumer<Derived, JsonNode>> BY_KEY = new LinkedHashMap<>();
    private static final List<Integer> INTERVALS = List.of(1, 12, 52);

    static {
        BY_KEY.put("PFDavg_exact_T_steps", InspectionComparisons::exact);
        BY_KEY.put("PFDavg_approximation", InspectionComparisons::approximation);
        BY_KEY.put("small_exact", InspectionComparisons::smallExact);
        BY_KEY.put("standard_row", InspectionComparisons::standardRow);
    }

    private InspectionComparisons() {
    }

    private static void exact(Derived derived, JsonNode expression) {
        Rational p = derived.value("p");
        for (int interval : INTERVALS) {
            assertEquals(at(derived, expression, interval), average(p, interval).exact().orElseThrow(),
                    () -> derived + ": T = " + interval);
        }
    }

    private static Rational at(Derived derived, JsonNode expression, int interval) {
        Map<String, Rational> values = derived.valuesAt(0);
        values.put("T", Rational.of(interval));
        return FractionInZ.of(derived.parse(expression.asText()), values).value();
    }

    /** Above the exact value by half a step and the chance of failing twice: p/2 + p²T²/2 at most. */
    private static void approximation(Derived derived, JsonNode expression) {
        Rational p = derived.value("p");
        for (int interval : INTERVALS) {
            Rational surplus = at(derived, expression, interval)
                    .minus(average(p, interval).exact().orElseThrow());
            Rational most = p.plus(p.times(p).times(Rational.of((long) interval * interval))).dividedBy(Rational.TWO);
            assertTrue(surplus.signum() > 0 && surplus.compareTo(most) <= 0, () -> derived + ": T = " + interval
                    + ", too high by " + surplus.approximate());
        }
    }

    private static void smallExact(Derived derived, JsonNode row) {
        Rational p = derived.value(row.get("p").asText());
        int interval = whole(derived, row.get("T"));
        Rational average = average(p, interval).exact().orElseThrow();
        assertEquals(derived.value(row.get("PFDavg").asText()), average, derived::toString);
        Rational rule = p.times(Rational.of(interval - 1)).dividedBy(Rational.TWO);
        Rational error = rule.minus(average).abs().dividedBy(average);
        Rational bound = derived.value(row.get("relative_error_of_p*(T-1)/2_below").asText());
        assertTrue(error.compareTo(bound) < 0 && bound.compareTo(error.times(Rational.of(10))) < 0,
                () -> derived + ": " + error.approximate());
    }

    private static void standardRow(Derived derived, JsonNode row) {
        Rational rate = derived.value(row.get("lambda_D_per_hour").asText());
        int interval = whole(derived, row.get("T_hours"));
        Rational repair = derived.value(row.get("MTTR_hours").asText());
        Rational formula = derived.value(row.get("PFDavg_formula_value").asText());
        Rational undetected = rate.times(Rational.ONE.minus(derived.value(row.get("DC").asText())));
        assertEquals(formula, undetected.times(Rational.of(interval).dividedBy(Rational.TWO).plus(repair)),
                derived::toString);
        KnownValue average = average(undetected, interval);
        Rational chain = average.enclosure().enclose(100).middle();
        assertDecimal(derived, row.get("PFDavg_hourly_chain_decimal"), chain);
        assertDecimal(derived, row.get("PFDavg_hourly_chain_plus_repair"), chain.plus(undetected.times(repair)));
        assertTrue(formula.minus(chain).abs().times(Rational.of(100)).compareTo(chain) < 0, derived::toString);
    }

    /** Within a unit of the last place printed. */
    private static void assertDecimal(Derived derived, JsonNode printed, Rational value) {
        String text = printed.asText();
        Rational unit = Rational.of(10).pow(text.indexOf('.') + 1 - text.replaceAll("[()+].*", "").length());
        assertTrue(derived.value(text).minus(value).abs().compareTo(unit) <= 0,
                () -> derived + ": " + value.approximate() + ", printed " + text);
    }

    private static int whole(Derived derived, JsonNode number) {
        Rational value = derived.value(number.asText());
        return value.isInteger() ? value.numerator().intValueExact() : fail(derived + ": T = " + value);
    }

    /** Over a cycle in the long run, which is the first one again: every test finds and mends all. */
    private static KnownValue average(Rational p, int interval) {
        String text = "pofk: 1\nstart: ready\ntransitions: {ready: {failed: " + p + ", ready: rest}, failed: stays}\n"
                + "actions: {test: {failed: {ready: 1}}}\nschedule: {every: " + interval
                + ", do: test}\noutputs: {PFD: failed}\n";
        try {
            Model model = ModelReader.read(Source.ofText("tested", text), Optional.empty(), Overrides.NONE);
            ScheduledModel found = Scheduling.of(model, model.chain().outputs(), List.of(),
                    Scheduling.Formulas.WITHIN_REACH, published -> { });
            return found.outputs().get(0).first().orElseThrow().average();
        } catch (RefusedException e) {
            throw new AssertionError(text, e);
        }
    }
}
