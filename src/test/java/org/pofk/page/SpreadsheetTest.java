package org.pofk.page;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.IntFunction;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.pofk.answer.DerivedOutput;
import org.pofk.exact.Rational;
import org.pofk.formula.Formula;
import org.pofk.formula.FormulaParser;
import org.pofk.formula.Formulas;
import org.pofk.formula.OpenFormula;
import org.pofk.modes.DecimalForm;
import org.pofk.steps.PowerSeries;
import org.pofk.text.Position;
import org.pofk.text.RefusedException;
import org.pofk.text.Xml;

/** Formulas as a spreadsheet calculates them, all in one sheet: a column each, a row for each step. */
class SpreadsheetTest {
    private static final int STEPS = 20;

    @TempDir
    private Path folder;

    /** A formula and what it must give at each step. */
    private record Column(String name, Formula formula, IntFunction<Rational> value, Rational within) {
    }

    private static Formula formula(String text) throws RefusedException {
        return FormulaParser.parse(text, new Position("test", 1, 1)).formula();
    }

    private static Column column(String text, IntFunction<Rational> value) throws RefusedException {
        return new Column(text, formula(text), value, Rational.ZERO);
    }

    /** What spreadsheets read in another way than mathematics, or refuse. */
    private static List<Column> traps() throws RefusedException {
        return List.of(column("-2^2 + k - k", k -> Rational.of(-4)),
                column("2^3^2 + 0*k", k -> Rational.of(512)),
                column("-(1/2)^k", k -> Rational.HALF.pow(k).negate()),
                column("(-1/2)^k", k -> Rational.of(-1, 2).pow(k)),
                column("0^k", k -> k == 0 ? Rational.ONE : Rational.ZERO),
                column("(k - 3)^(k - 3) * delta(k - 3)", k -> k == 3 ? Rational.ONE : Rational.ZERO),
                column("delta(k - 2) - delta(k)", k -> Rational.of(k == 2 ? 1 : k == 0 ? -1 : 0)),
                column("binomial(k, 3)*(1/2)^(k - 3)", k -> k < 3 ? Rational.ZERO
                        : Rational.of((long) k * (k - 1) * (k - 2) / 6).times(Rational.HALF.pow(k - 3))),
                column("2*cos(60 deg)*sin(90 deg)*k", Rational::of),
                column("2*cos(pi*k)*arctan(1)/(pi/2)", k -> Rational.of(k % 2 == 0 ? 1 : -1)),
                column("sqrt(2)^2*arccos(-1)/pi*exp(0) - 1.5e0 + 0*k", k -> Rational.HALF),
                column("k/(2*3)/(1/2) - (k - (1 - k))", k -> Rational.of(k, 3).minus(Rational.of(2L * k - 1))),
                column("1 - (-k) - -2", k -> Rational.of(k + 3)));
    }

    private static List<Column> ofPatterns() throws RefusedException {
        List<Column> columns = new ArrayList<>();
        for (String pattern : Pages.patterns()) {
            for (DerivedOutput output : Pages.derived(pattern).outputs()) {
                List<Rational> values = PowerSeries.of(output.transform().orElseThrow().y(), STEPS);
                String name = pattern + " " + output.output().name();
                output.closedForm().orElseThrow().exactFormula().ifPresent(exact ->
                        columns.add(new Column(name, exact, values::get, Rational.ZERO)));
                DecimalForm decimals = output.closedForm().orElseThrow().decimalForm(6);
                decimals.formula().ifPresent(formula ->
                        columns.add(new Column(name, formula, values::get, decimals.errorBound())));
            }
        }
        return columns;
    }

    @Test
    void aSpreadsheetCalculatesTheFormulasAsTheyAreMeant() throws Exception {
        Installed.require("soffice", "no spreadsheet calculates");
        List<Column> columns = new ArrayList<>(traps());
        columns.addAll(ofPatterns());
        columns.removeIf(column -> OpenFormula.write(column.formula, "A1").isEmpty());
        List<String> rows = calculated(columns);
        assertEquals(STEPS + 1, rows.size());
        for (int k = 0; k <= STEPS; k++) {
            String[] cells = rows.get(k).split(",", -1);
            assertEquals(columns.size() + 1, cells.length, rows.get(k));
            for (int j = 0; j < columns.size(); j++) {
                Column column = columns.get(j);
                double expected = column.value.apply(k).approximate();
                double found = number(cells[j + 1], column);
                double within = column.within.approximate() + 1e-11 * Math.max(1, Math.abs(expected));
                assertTrue(Math.abs(found - expected) <= within, column.name + " at " + k + ": " + found + ", not "
                        + expected + "; " + OpenFormula.write(column.formula, "A1").orElseThrow());
            }
        }
        assertTrue(columns.size() >= 40, columns.size() + " formulas calculated");
    }

    private static double number(String cell, Column column) {
        try {
            return Double.parseDouble(cell);
        } catch (NumberFormatException none) {
            throw new AssertionError(cell + " for " + OpenFormula.write(column.formula, "A1"), none);
        }
    }

    private List<String> calculated(List<Column> columns) throws IOException, InterruptedException {
        StringBuilder sheet = new StringBuilder("<?xml version=\"1.0\" encoding=\"UTF-8\"?><office:document"
                + " xmlns:office=\"urn:oasis:names:tc:opendocument:xmlns:office:1.0\""
                + " xmlns:table=\"urn:oasis:names:tc:opendocument:xmlns:table:1.0\""
                + " xmlns:of=\"urn:oasis:names:tc:opendocument:xmlns:of:1.2\" office:version=\"1.2\""
                + " office:mimetype=\"application/vnd.oasis.opendocument.spreadsheet\"><office:body><office:spreadsheet>"
                + "<table:table table:name=\"p\">");
        for (int k = 0; k <= STEPS; k++) {
            sheet.append("<table:table-row><table:table-cell office:value-type=\"float\" office:value=\"").append(k)
                    .append("\"/>");
            for (Column column : columns) {
                sheet.append("<table:table-cell table:formula=\"of:=").append(Xml.escaped(
                        OpenFormula.write(column.formula, "[.A" + (k + 1) + "]").orElseThrow())).append("\"/>");
            }
            sheet.append("</table:table-row>");
        }
        Files.writeString(folder.resolve("p.fods"),
                sheet.append("</table:table></office:spreadsheet></office:body></office:document>"));
        Process process = new ProcessBuilder("soffice", "-env:UserInstallation=" + folder.resolve("profile").toUri(),
                "--headless", "--convert-to", "csv:Text - txt - csv (StarCalc):44,34,76,1,,1033,false,false",
                "--outdir", folder.toString(), folder.resolve("p.fods").toString()).redirectErrorStream(true).start();
        String said = new String(process.getInputStream().readAllBytes(), StandardCharsets.UTF_8);
        assertEquals(0, process.waitFor(), said);
        return Files.readAllLines(folder.resolve("p.csv"));
    }

    @Test
    void whatASpreadsheetCannotSayIsNothing() throws RefusedException {
        for (String text : List.of("z", "i*k", "lost + k")) {
            assertEquals(Optional.empty(), OpenFormula.write(formula(text), "A1"), text);
        }
        assertEquals(Optional.empty(), OpenFormula.write(Formulas.number(Rational.of(10).pow(301)), "A1"));
        Formula k = new Formula.Symbol("k");
        assertEquals(Optional.empty(), OpenFormula.write(new Formula.RootSum(new Formula.Symbol("r"), k, k), "A1"));
    }
}
