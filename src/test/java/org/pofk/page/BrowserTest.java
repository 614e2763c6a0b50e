package org.pofk.page;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.JsonNode;
import java.io.IOException;
import java.math.BigDecimal;
import java.math.BigInteger;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.IntStream;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestInstance;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.pofk.answer.DerivedModel;
import org.pofk.answer.DerivedOutput;
import org.pofk.exact.Rational;
import org.pofk.report.HtmlWriter;
import org.pofk.steps.PowerSeries;

/** Pages in a browser: no error, nothing beside the screen, and values read off that are the exact ones. */
@TestInstance(TestInstance.Lifecycle.PER_CLASS)
class BrowserTest {
    private static final int FAR = 400;
    /** What the field takes. */
    private static final int TARGET_LENGTH = 40;
    private static final Pattern SHOWN =
            Pattern.compile("[=≈] (−?[0-9.]+(?:e-?[0-9]+)?)(?: = (−?[0-9]+)/([0-9]+))?(; 1 minus it .*)?");

    @TempDir
    private Path folder;
    private Browser browser;
    private int targets;

    static List<String> patterns() {
        return Pages.patterns();
    }

    @BeforeAll
    void start() throws IOException {
        Installed.require("chromium", "no page is looked at");
        Installed.require("chromedriver", "no page is looked at");
        browser = Browser.started();
    }

    @AfterAll
    void end() throws IOException {
        if (browser != null) {
            browser.close();
        }
    }

    @ParameterizedTest
    @MethodSource("patterns")
    void aPageShowsItsPatternAndReadsOffExactValues(String pattern) throws Exception {
        DerivedModel derived = Pages.derived(pattern);
        Path page = Files.writeString(folder.resolve(pattern + ".html"), HtmlWriter.write(Pages.report(derived)));
        browser.open(page);
        fitsBesideTheMargins();
        int fields = 0;
        for (int i = 0; i < derived.outputs().size(); i++) {
            fields += readsOffExactValues(derived.outputs().get(i), i + 1);
        }
        assertTrue(fields > 0, "no field for a step");
        assertTrue(targets > 0, "no target");
        copiesEveryFormula();
        for (JsonNode entry : browser.console()) {
            throw new AssertionError(entry.toString());
        }
    }

    private void fitsBesideTheMargins() throws IOException {
        for (int width : List.of(1600, 800, 380)) {
            browser.resize(width, 900);
            JsonNode widest = browser.run("return [document.documentElement.scrollWidth, innerWidth];");
            assertTrue(widest.get(0).asInt() <= widest.get(1).asInt(), width + ": " + widest);
            assertEquals(width, widest.get(1).asInt());
        }
        assertEquals("loaded", browser.run("return document.fonts.check('16px \"page mathematics\"', 'k')"
                + " ? 'loaded' : 'not loaded';").asText());
    }

    /** One where the page has the field, at the steps of a table and at a far one. */
    private int readsOffExactValues(DerivedOutput output, int place) throws IOException {
        String field = "#step-" + place;
        if (browser.run("return document.querySelector('" + field + "') === null;").asBoolean()) {
            return 0;
        }
        int order = output.transform().orElseThrow().recurrence().degree();
        int far = order <= 20 ? FAR : order + 10;
        List<Rational> values = PowerSeries.of(output.transform().orElseThrow().y(), far);
        for (int k : List.of(0, 1, 2, 3, 7, Pages.LAST_VALUE, far)) {
            browser.type(field, String.valueOf(k));
            String shown = browser.run("return document.querySelector('" + field
                    + "').closest('.step').querySelector('output').textContent;").asText();
            isExact(values.get(k), shown);
        }
        for (Rational target : List.of(values.get(3), values.get(Pages.LAST_VALUE), Rational.of(1, 100))) {
            readsOffTheFirstStep(field, target, values);
        }
        return 1;
    }

    /** At which the values are at the target or on its other side, as far as they are known here. */
    private void readsOffTheFirstStep(String field, Rational target, List<Rational> values) throws IOException {
        String typed = target.toString();
        if (typed.length() > TARGET_LENGTH) {
            return;
        }
        int startsAt = values.get(0).compareTo(target);
        int first = 0;
        while (first < values.size() && startsAt != 0 && values.get(first).compareTo(target) == startsAt) {
            first++;
        }
        browser.type(field + "-target", typed);
        String shown = browser.run("return document.querySelector('" + field
                + "').closest('.step').querySelector('output').textContent;").asText();
        if (first < values.size()) {
            assertTrue(shown.startsWith("at k = " + first + ","), shown + " for " + typed + ", not " + first);
        } else {
            assertFalse(IntStream.range(0, first).anyMatch(k -> shown.startsWith("at k = " + k + ",")), shown);
        }
        targets++;
    }

    @Test
    void theStepIsMarkedInTheFigureAndNoOther() throws Exception {
        Path page = Files.writeString(folder.resolve("marked.html"),
                HtmlWriter.write(Pages.report(Pages.derived("pump-pair"))));
        browser.open(page);
        for (int k : List.of(2, 5)) {
            browser.type("#step-1", String.valueOf(k));
            JsonNode marked = browser.run("return Array.from(document.querySelectorAll('svg .chosen > title'))"
                    + ".map(title => title.textContent);");
            assertEquals(1, marked.size(), marked.toString());
            assertTrue(marked.get(0).asText().startsWith("lost(" + k + ")"), marked.toString());
        }
    }

    /** However a number is written; what is none is refused, and what isn't reached is no step. */
    @Test
    void aTargetIsReadAsWritten() throws Exception {
        Path page = Files.writeString(folder.resolve("targets.html"),
                HtmlWriter.write(Pages.report(Pages.derived("pump-pair"))));
        browser.open(page);
        Map<String, String> answers = new LinkedHashMap<>();
        for (String typed : List.of("0.005", "5e-3", "1/200", "0.5 %")) {
            answers.put(typed, "at k = 2, where it is ");
        }
        for (String typed : List.of("0,005", "1/0", "--1", "about 1", "1/2.5")) {
            answers.put(typed, "A number like");
        }
        answers.put("0.9", "Not up to step ");
        answers.put("-1", "Not up to step ");
        for (Map.Entry<String, String> answer : answers.entrySet()) {
            browser.type("#step-1-target", answer.getKey());
            String shown = browser.run("return document.querySelector('.step output').textContent;").asText();
            assertTrue(shown.startsWith(answer.getValue()), answer.getKey() + ": " + shown);
            assertEquals(answer.getValue().startsWith("at") ? 1 : 0,
                    browser.run("return document.querySelectorAll('svg .chosen').length;").asInt(), answer.getKey());
        }
    }

    /** The figure has marks every few hundred thousand steps, the field up to some thousand. */
    @Test
    void aStepWithoutAMarkOfItsOwnHasALineAcrossTheFigure() throws Exception {
        Path page = Files.writeString(folder.resolve("across.html"),
                HtmlWriter.write(Pages.report(Pages.derived("storage-cavern"))));
        browser.open(page);
        String count = "return [document.querySelectorAll('svg line.chosen').length,"
                + " document.querySelectorAll('svg .chosen > title').length];";
        for (int k : List.of(0, 5, 1000)) {
            browser.type("#step-1", String.valueOf(k));
            JsonNode chosen = browser.run(count);
            assertEquals(k == 0 ? 0 : 1, chosen.get(0).asInt(), "lines for " + k);
            assertEquals(k == 0 ? 1 : 0, chosen.get(1).asInt(), "marks for " + k);
        }
    }

    private static void isExact(Rational value, String shown) {
        Matcher parts = SHOWN.matcher(shown);
        assertTrue(parts.matches(), shown);
        BigDecimal decimal = new BigDecimal(parts.group(1).replace('−', '-'));
        Rational error = Rational.of(decimal).minus(value).abs();
        BigDecimal unit = BigDecimal.ONE.movePointRight(decimal.precision() - decimal.scale() - 15);
        assertTrue(shown.startsWith("=") ? error.isZero()
                : error.times(Rational.of(2)).compareTo(Rational.of(unit)) <= 0, shown + " for " + value);
        if (parts.group(2) != null) {
            assertEquals(value, new Rational(new BigInteger(parts.group(2).replace('−', '-')),
                    new BigInteger(parts.group(3))));
        }
    }

    /** What is copied is caught on its way to the clipboard, which a browser without a window doesn't have. */
    private void copiesEveryFormula() throws IOException {
        JsonNode copies = browser.run("const got = []; Object.defineProperty(navigator, 'clipboard', {configurable: true,"
                + " value: {writeText: function (text) { got.push(text); return Promise.resolve(); }}});"
                + "document.querySelectorAll('.display').forEach(d => d.querySelectorAll('button').forEach(b => b.click()));"
                + "return [got.length, document.querySelectorAll('.display').length,"
                + " got.filter(t => t.trim() === '').length,"
                + " got.filter(t => t.startsWith('<math') && new DOMParser().parseFromString(t, 'text/xml')"
                + ".querySelector('parsererror')).length];");
        assertTrue(copies.get(0).asInt() >= 3 * copies.get(1).asInt() && copies.get(1).asInt() > 0, copies.toString());
        assertEquals(0, copies.get(2).asInt() + copies.get(3).asInt(), copies.toString());
    }
}
