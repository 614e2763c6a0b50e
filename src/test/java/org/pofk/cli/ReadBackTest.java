package org.pofk.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.pofk.page.Installed;

/** Formulas of every pattern as written, read back by others than who wrote them. */
class ReadBackTest {
    private static final ObjectMapper JSON = new ObjectMapper();
    private static final List<String> TOO_LONG = List.of("cable-route");

    /** In doubles, at the first steps; within what a formula in decimals, six digits of them, promises for every k. */
    private static final String PYTHON = """
            import json, sys
            from fractions import Fraction
            from math import sqrt, pi, cos, sin, exp, comb, acos as arccos, atan as arctan
            delta = lambda n: 1 if n == 0 else 0
            binomial = lambda n, p: comb(n, p) if n >= p else 0
            for text, values in json.load(sys.stdin):
                code = compile(text.replace('^', '**'), text, 'eval')
                for k, value in enumerate(values):
                    found = eval(code, dict(globals(), k=k))
                    if abs(found - float(Fraction(value))) > (1e-6 if '.' in text else 1e-9) * max(1, abs(float(Fraction(value)))):
                        sys.exit(f'{text} at {k}: {found}, not {value}')
                    print(k)
            """;

    @TempDir
    private Path folder;

    /** An output's formula, and its exact values at k = 0 … 20. */
    private record Written(String pattern, String output, String text, String latex, List<String> values) {
        boolean isRootSum() {
            return latex.contains("\\sum");
        }

        boolean isInDecimals() {
            return text.contains(".");
        }
    }

    private static List<Written> written() throws Exception {
        List<Written> all = new ArrayList<>();
        for (String line : Files.readAllLines(Path.of("test-data/models/index.txt"))) {
            String pattern = line.split("[\\s:]")[0].replace(".yaml", "");
            if (pattern.isBlank() || TOO_LONG.contains(pattern)) {
                continue;
            }
            Run run = Run.of("derive", "test-data/models/" + pattern + ".yaml", "--at", "0..20", "--as", "json");
            for (JsonNode output : JSON.readTree(run.answer()).get("outputs")) {
                List<String> values = new ArrayList<>();
                output.get("values").forEach(value -> values.add(value.get("exact").asText()));
                all.add(new Written(pattern, output.get("name").asText(), output.get("formula").get("text").asText(),
                        output.get("formula").get("latex").asText(), values));
            }
        }
        return all;
    }

    @Test
    void pythonReadsThePlainText() throws Exception {
        Installed.require("python3", "no formula is read by Python");
        List<List<Object>> formulas = new ArrayList<>();
        written().stream().filter(each -> !each.isRootSum())
                .forEach(each -> formulas.add(List.of(each.text, each.values)));
        Process python = new ProcessBuilder("python3", "-c", PYTHON).redirectErrorStream(true).start();
        try (var input = python.getOutputStream()) {
            input.write(JSON.writeValueAsBytes(formulas));
        }
        String said = new String(python.getInputStream().readAllBytes(), StandardCharsets.UTF_8);
        assertEquals(0, python.waitFor(), said);
        assertEquals(21L * formulas.size(), said.lines().count());
        assertTrue(formulas.size() >= 20, formulas.size() + " formulas");
    }

    /** Found to be exact for every k, or every decimal right. */
    @Test
    void theCheckReadsTheLatex() throws Exception {
        int read = 0;
        Set<String> undecided = new TreeSet<>();
        for (Written each : written()) {
            if (each.isRootSum()) {
                continue;
            }
            Path claims = folder.resolve("claims" + read + ".yaml");
            Files.writeString(claims, "pofk-claims: 1\nmodel: " + Path.of("test-data/models", each.pattern + ".yaml")
                    .toAbsolutePath() + "\nclaims:\n  - {formula: '" + each.output.replace("'", "''")
                    + "', is-latex: '" + each.latex + "'}\n");
            Run run = Run.of("check", claims.toString(), "--as", "json");
            String verdict = JSON.readTree(run.answer()).get("claims").get(0).get("verdict").asText();
            if (verdict.equals("undecided")) {
                undecided.add(each.pattern);
            } else {
                assertEquals(each.isInDecimals() ? "rounded" : "exact", verdict, () -> each + run.answer());
            }
            read++;
        }
        // cosines of roots below roots, fifths of a turn apart: more than the budget of a claim
        assertEquals(Set.of("valve-rotation"), undecided);
        assertTrue(read >= 20, read + " formulas");
    }
}
