package org.pofk.page;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.JsonNode;
import java.io.IOException;
import java.math.BigDecimal;
import java.math.BigInteger;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestInstance;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.pofk.answer.DerivedModel;
import org.pofk.answer.DerivedOutput;
import org.pofk.answer.PowerSeries;
import org.pofk.exact.Rational;
import org.pofk.report.HtmlWriter;

/** Pages in a browser: no error, nothing beside the screen, and values read off that are the exact ones. */
@TestInstance(TestInstance.Lifecycle.PER_CLASS)
class BrowserTest {
    private static final int FAR = 400;
    private static final Pattern SHOWN =
            Pattern.compile("[=≈] (−?[0-9.]+(?:e-?[0-9]+)?)(?: = (−?[0-9]+)/([0-9]+))?(; 1 minus it .*)?");

    @TempDir
    private Path folder;
    private Browser browser;

    static List<String> patterns() {
        return Pages.patterns();
    }

    @BeforeAll
    void start() throws IOException {
        Installed.require("chromium");
        Installed.require("chromedriver");
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
        Path page = Files.writeString(folder.resolve(pattern + ".html"), HtmlWriter.write(Pages.document(derived)));
        browser.open(page);
        fitsBesideTheMargins();
        int fields = 0;
        for (int i = 0; i < derived.outputs().size(); i++) {
            fields += readsOffExactValues(derived.outputs().get(i), i + 1);
        }
        assertTrue(fields > 0, "no field for a step");
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
        return 1;
    }

    @Test
    void theStepIsMarkedInTheFigureAndNoOther() throws Exception {
        Path page = Files.writeString(folder.resolve("marked.html"),
                HtmlWriter.write(Pages.document(Pages.derived("pump-pair"))));
        browser.open(page);
        for (int k : List.of(2, 5)) {
            browser.type("#step-1", String.valueOf(k));
            JsonNode marked = browser.run("return Array.from(document.querySelectorAll('svg .chosen > title'))"
                    + ".map(title => title.textContent);");
            assertEquals(1, marked.size(), marked.toString());
            assertTrue(marked.get(0).asText().startsWith("lost(" + k + ")"), marked.toString());
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
