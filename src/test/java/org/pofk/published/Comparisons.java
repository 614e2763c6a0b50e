package org.pofk.published;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.BiConsumer;
import org.pofk.chain.Outputs;
import org.pofk.chain.Structure;
import org.pofk.exact.ComplexBall;
import org.pofk.exact.Decimals;
import org.pofk.exact.Factoring;
import org.pofk.exact.Factorization;
import org.pofk.exact.Polynomial;
import org.pofk.exact.Rational;
import org.pofk.exact.Roots;
import org.pofk.formula.Formula;
import org.pofk.longrun.LongRun;
import org.pofk.modes.ClosedForm;
import org.pofk.modes.Mode;
import org.pofk.modes.RealValue;
import org.pofk.transform.CharacteristicPolynomial;

/** How each published key is compared with what the tool derives. Each fails with the source in its message. */
final class Comparisons {
    /** Steps a published closed form is held to. */
    private static final int STEPS = 60;
    private static final int SCALE = 400;
    /** Units in the last place of a root printed to fifteen digits. */
    private static final Rational FIFTEEN_DIGITS = Rational.of(10).pow(-14);

    static final Map<String, BiConsumer<Derived, JsonNode>> BY_KEY = new LinkedHashMap<>();

    static {
        BY_KEY.put("p_k", Comparisons::values);
        BY_KEY.put("transfer", Comparisons::transforms);
        BY_KEY.put("published_transform", Comparisons::transform);
        BY_KEY.put("poles", Comparisons::poles);
        BY_KEY.put("eigenvalues", Comparisons::eigenvalues);
        BY_KEY.put("char_poly", Comparisons::characteristicPolynomial);
        BY_KEY.put("second_eigenvalue", Comparisons::secondEigenvalue);
        BY_KEY.put("delta", Comparisons::secondEigenvalue);
        BY_KEY.put("closed_form", Comparisons::closedForms);
        BY_KEY.put("modes", Comparisons::modes);
        BY_KEY.put("long_run", Comparisons::longRun);
        BY_KEY.put("long_run_kind", Comparisons::longRunKind);
        BY_KEY.put("loss_rate", Comparisons::lossRate);
        BY_KEY.put("period", Comparisons::period);
        BY_KEY.put("A_power", Comparisons::powers);
        BY_KEY.put("dominant_root_approx", Comparisons::dominantRoot);
        BY_KEY.put("start_state2", Comparisons::startedInTheSecond);
        BY_KEY.put("conditional_loss_after_loss", Comparisons::lossAfterLoss);
        BY_KEY.put("cohort_10000", Comparisons::cohort);
        BY_KEY.put("numeric", Comparisons::availabilityAtTen);
        BY_KEY.put("at_x_3_5", Comparisons::wholeInstance);
        BY_KEY.put("rational_instance", Comparisons::wholeInstance);
        BY_KEY.putAll(PassageComparisons.BY_KEY);
        BY_KEY.putAll(TotalComparisons.BY_KEY);
        BY_KEY.putAll(InspectionComparisons.BY_KEY);
    }

    private Comparisons() {
    }

    private static void values(Derived derived, JsonNode byOutput) {
        byOutput.properties().forEach(output -> valuesOf(derived, output.getKey(), output.getValue()));
    }

    private static void valuesOf(Derived derived, String output, JsonNode byStep) {
        byStep.properties().forEach(step -> assertEquals(derived.value(step.getValue().asText()),
                derived.form(output).expansion().valueAt(Long.parseLong(step.getKey())),
                () -> derived + ": " + output + " at k = " + step.getKey()));
    }

    private static void transforms(Derived derived, JsonNode byOutput) {
        byOutput.properties().forEach(output -> assertTransform(derived, output.getKey(),
                derived.fraction(output.getValue().get("num").asText())
                        .times(derived.fraction(output.getValue().get("den").asText()).inverse())));
    }

    private static void transform(Derived derived, JsonNode expression) {
        assertTransform(derived, "y", derived.fraction(expression.asText()));
    }

    private static void assertTransform(Derived derived, String output, FractionInZ expected) {
        var found = derived.form(output).transform().y();
        assertTrue(expected.sameAs(new FractionInZ(found.numerator(), found.denominator())),
                () -> derived + ": transform of " + output + " is " + found + ", published " + expected);
    }

    private static void poles(Derived derived, JsonNode byOutput) {
        byOutput.properties().forEach(output -> assertRoots(derived, output.getKey(),
                derived.form(output.getKey()).transform().factors(), output.getValue()));
    }

    private static void eigenvalues(Derived derived, JsonNode list) {
        Polynomial<Rational> polynomial = CharacteristicPolynomial.of(derived.chain()).orElseThrow().polynomial();
        assertRoots(derived, "A", Factoring.of(polynomial), list);
    }

    /** Roots are given by value or by factor; each with its multiplicity, and none is left out. */
    private static void assertRoots(Derived derived, String of, Factorization<Rational> found, JsonNode list) {
        int distinct = found.factors().stream().mapToInt(factor -> factor.polynomial().degree()).sum();
        int listed = 0;
        for (JsonNode root : list) {
            if (root.has("factor")) {
                listed += assertFactor(derived, of, found, root);
            } else if (root.has("irreducible_factor")) {
                listed += assertIrreducible(derived, of, found, root);
            } else {
                listed++;
                assertRoot(derived, of, found, root.get("value").asText(), root.get("multiplicity").asInt());
            }
        }
        int all = listed;
        assertEquals(distinct, all, () -> derived + ": number of roots of " + of);
    }

    private static int assertFactor(Derived derived, String of, Factorization<Rational> found, JsonNode root) {
        FractionInZ factor = derived.fraction(root.get("factor").asText());
        Polynomial<Rational> expected = factor.numerator().dividedExactlyBy(factor.denominator()).monic();
        Polynomial<Rational> product = Polynomial.ofIntegers(1);
        for (Factorization.Factor<Rational> each : found.factors()) {
            if (each.multiplicity() == root.get("multiplicity").asInt()
                    && expected.remainder(each.polynomial()).isZero()) {
                product = product.times(each.polynomial());
            }
        }
        assertEquals(expected, product, () -> derived + ": a factor of " + of);
        return expected.degree();
    }

    /** A factor printed as irreducible, with its roots to about fifteen digits, all of them. */
    private static int assertIrreducible(Derived derived, String of, Factorization<Rational> found, JsonNode root) {
        FractionInZ factor = derived.fraction(root.get("irreducible_factor").asText());
        Polynomial<Rational> expected = factor.numerator().dividedExactlyBy(factor.denominator()).monic();
        assertTrue(found.factors().contains(new Factorization.Factor<>(expected, root.get("multiplicity").asInt(),
                Factorization.Irreducible.PROVED)), () -> derived + ": a factor of " + of);
        assertEquals(expected.degree(), root.get("approx_roots").size(), derived::toString);
        for (JsonNode approximate : root.get("approx_roots")) {
            ComplexBall printed = CertifiedValue.of(derived.parse(approximate.asText()), Map.of(), SCALE);
            long near = Roots.of(expected).all().stream()
                    .map(each -> each.enclose(SCALE / 2).minus(printed).modulus().upper())
                    .filter(distance -> distance.compareTo(FIFTEEN_DIGITS) < 0).count();
            assertEquals(1, near, () -> derived + ": root " + approximate.asText() + " of " + of);
        }
        return expected.degree();
    }

    private static void assertRoot(Derived derived, String of, Factorization<Rational> found, String value,
            int multiplicity) {
        ComplexBall expected = CertifiedValue.of(derived.parse(value), derived.valuesAt(0), SCALE);
        List<Integer> multiplicities = found.factors().stream()
                .flatMap(factor -> Roots.of(factor.polynomial()).all().stream()
                        .filter(root -> root.enclose(SCALE / 2).overlaps(expected))
                        .map(root -> factor.multiplicity()))
                .toList();
        assertEquals(List.of(multiplicity), multiplicities, () -> derived + ": root " + value + " of " + of);
    }

    private static void characteristicPolynomial(Derived derived, JsonNode expression) {
        FractionInZ expected = derived.fraction(expression.asText());
        assertEquals(expected.numerator().dividedExactlyBy(expected.denominator()),
                CharacteristicPolynomial.of(derived.chain()).orElseThrow().polynomial(), derived::toString);
    }

    private static void secondEigenvalue(Derived derived, JsonNode value) {
        Polynomial<Rational> expected = Polynomial.ofIntegers(-1, 1).times(
                Polynomial.linear(Polynomial.ofIntegers(1).field(), derived.value(value.asText())));
        assertEquals(expected, CharacteristicPolynomial.of(derived.chain()).orElseThrow().polynomial(),
                derived::toString);
    }

    private static void closedForms(Derived derived, JsonNode byOutput) {
        byOutput.properties().forEach(output -> assertClosedForm(derived, output.getKey(),
                output.getValue().get("expr").asText(), output.getValue().get("valid_from").asInt()));
    }

    private static void assertClosedForm(Derived derived, String output, String expression, int validFrom) {
        Formula published = derived.parse(expression);
        for (int k = validFrom; k <= STEPS; k++) {
            int step = k;
            Rational found = derived.form(output).expansion().valueAt(k);
            ComplexBall expected = CertifiedValue.of(published, derived.valuesAt(k), SCALE);
            assertTrue(expected.real().contains(found) && expected.imaginary().containsZero()
                            && expected.isWithin(SCALE / 2),
                    () -> derived + ": " + output + " at k = " + step + " is " + found + ", published " + expression);
        }
    }

    private static void modes(Derived derived, JsonNode byOutput) {
        byOutput.properties().forEach(output -> {
            ClosedForm form = derived.form(output.getKey());
            JsonNode expected = output.getValue();
            if (expected.has("constant")) {
                assertEquals(Optional.of(derived.value(expected.get("constant").asText())),
                        form.modes().stream().flatMap(mode -> mode.accept(new Constants()).stream()).findFirst(),
                        derived::toString);
            }
            Mode.Oscillating found = form.modes().stream().flatMap(mode -> mode.accept(new Oscillations()).stream())
                    .findFirst().orElseThrow();
            JsonNode oscillation = expected.get("oscillation");
            assertSame(derived, found.amplitude(), oscillation.get("amplitude"));
            assertSame(derived, found.modulus(), oscillation.get("r"));
            assertSame(derived, found.angle(), oscillation.get("theta"));
            assertSame(derived, found.phase(), oscillation.get("phi"));
        });
    }

    /** Both the exact short form and the enclosure agree with the published constant. */
    private static void assertSame(Derived derived, RealValue found, JsonNode expected) {
        ComplexBall published = CertifiedValue.of(derived.parse(expected.asText()), Map.of(), SCALE);
        assertTrue(published.real().overlaps(found.enclosure().enclose(SCALE / 2)),
                () -> derived + ": " + found + ", published " + expected);
        ComplexBall exact = CertifiedValue.of(found.exact().orElseThrow(), Map.of(), SCALE);
        assertTrue(exact.overlaps(published), () -> derived + ": " + found + ", published " + expected);
    }

    private static void longRun(Derived derived, JsonNode list) {
        List<LongRun> found = derived.longRuns();
        assertEquals(list.size(), found.size(), derived::toString);
        for (int i = 0; i < list.size(); i++) {
            assertEquals(Optional.of(derived.value(list.get(i).asText())), found.get(i).meanValue(),
                    derived::toString);
        }
    }

    private static void longRunKind(Derived derived, JsonNode kind) {
        boolean cycle = kind.asText().startsWith("cesaro");
        assertTrue(cycle || kind.asText().startsWith("limit"), () -> derived + ": unknown kind " + kind);
        assertEquals(cycle, derived.longRuns().stream().anyMatch(each -> each.accept(new Periods()) > 1),
                derived::toString);
        if (kind.asText().contains("depends on the start")) {
            assertTrue(Structure.of(derived.chain()).closedClasses().size() > 1, derived::toString);
        }
    }

    private static void lossRate(Derived derived, JsonNode value) {
        assertEquals(Optional.of(derived.value(value.asText())), derived.longRun("loss").meanValue(),
                derived::toString);
    }

    /** The period of the whole: of the states' cycle values, or of the output's for a recursion. */
    private static void period(Derived derived, JsonNode period) {
        int found = Outputs.byDefault(derived.chain()).stream().mapToInt(output ->
                derived.longRun(output.name()).accept(new Periods())).max().orElseThrow();
        assertEquals(period.asInt(), found, derived::toString);
    }

    private static void powers(Derived derived, JsonNode byExponent) {
        int size = derived.chain().size();
        for (int column = 0; column < size; column++) {
            Derived started = derived.startedIn(column);
            for (Map.Entry<String, JsonNode> power : byExponent.properties()) {
                for (int row = 0; row < size; row++) {
                    assertEquals(derived.value(power.getValue().get(row).get(column).asText()),
                            started.form(derived.chain().states().get(row)).expansion()
                                    .valueAt(Long.parseLong(power.getKey())), derived::toString);
                }
            }
        }
    }

    private static void dominantRoot(Derived derived, JsonNode decimal) {
        Polynomial<Rational> denominator =
                derived.form(derived.chain().outputs().get(0).name()).transform().y().denominator();
        assertEquals(decimal.asText(), Decimals.of(Roots.of(denominator).all().get(0).realPart(),
                decimal.asText().replace(".", "").length()).text(), derived::toString);
    }

    private static void startedInTheSecond(Derived derived, JsonNode expected) {
        Derived second = derived.startedIn(1);
        expected.get("closed_form").properties().forEach(output ->
                assertClosedForm(second, output.getKey(), output.getValue().asText(), 0));
    }

    private static void lossAfterLoss(Derived derived, JsonNode expected) {
        assertClosedForm(derived.startedIn(1), "loss", expected.get("closed_form").asText(), 0);
    }

    private static void cohort(Derived derived, JsonNode byStep) {
        byStep.properties().forEach(step -> {
            for (int i = 0; i < step.getValue().size(); i++) {
                assertEquals(derived.value(step.getValue().get(i).asText()), Rational.of(10_000).times(
                        derived.form(derived.chain().states().get(i)).expansion()
                                .valueAt(Long.parseLong(step.getKey()))), derived::toString);
            }
        });
    }

    /** Given for one choice of parameters; the others have nothing to compare. */
    private static void availabilityAtTen(Derived derived, JsonNode numeric) {
        boolean thisSample = derived.value("l").equals(Rational.parse(numeric.get("l").asText()))
                && derived.value("mu").equals(Rational.parse(numeric.get("mu").asText()));
        if (thisSample) {
            assertEquals(derived.value(numeric.get("A_10").asText()), derived.form("up").expansion().valueAt(10),
                    derived::toString);
            assertEquals(Optional.of(derived.value(numeric.get("A_inf").asText())),
                    derived.longRun("up").meanValue(), derived::toString);
        }
    }

    /** A whole published instance: values, poles, closed forms and modes as far as it gives them. */
    private static void wholeInstance(Derived derived, JsonNode instance) {
        boolean thisSample = !instance.has("poles") || derived.value("x").equals(Rational.of(3, 5));
        if (!thisSample) {
            return;
        }
        if (instance.has("poles")) {
            instance.get("poles").forEach(pole ->
                    assertRoot(derived, "y", derived.form("y").transform().factors(), pole.asText(), 1));
        }
        if (instance.get("closed_form").isTextual()) {
            assertClosedForm(derived, "y", instance.get("closed_form").asText(), 0);
            valuesOf(derived, "y", instance.get("p_k"));
        } else {
            instance.get("closed_form").properties().forEach(output ->
                    assertClosedForm(derived, output.getKey(), output.getValue().asText(), 0));
            values(derived, instance.get("p_k"));
            modes(derived, instance.get("modes"));
        }
    }

    /** The coefficient of a mode with base one. */
    private record Constants() implements Mode.Visitor<Optional<Rational>> {
        @Override
        public Optional<Rational> impulse(Mode.Impulse impulse) {
            return Optional.empty();
        }

        @Override
        public Optional<Rational> geometric(Mode.Geometric geometric) {
            return geometric.base().rational().filter(Rational::isOne).flatMap(base ->
                    geometric.coefficient().rational());
        }

        @Override
        public Optional<Rational> oscillating(Mode.Oscillating oscillating) {
            return Optional.empty();
        }
    }

    private record Oscillations() implements Mode.Visitor<Optional<Mode.Oscillating>> {
        @Override
        public Optional<Mode.Oscillating> impulse(Mode.Impulse impulse) {
            return Optional.empty();
        }

        @Override
        public Optional<Mode.Oscillating> geometric(Mode.Geometric geometric) {
            return Optional.empty();
        }

        @Override
        public Optional<Mode.Oscillating> oscillating(Mode.Oscillating oscillating) {
            return Optional.of(oscillating);
        }
    }

    /** 1 for a limit, the period of a cycle, 0 for neither. */
    private record Periods() implements LongRun.Visitor<Integer> {
        @Override
        public Integer limit(LongRun.Limit limit) {
            return 1;
        }

        @Override
        public Integer cycle(LongRun.Cycle cycle) {
            return cycle.period();
        }

        @Override
        public Integer none(LongRun.None none) {
            return 0;
        }
    }
}
