package org.pofk.input;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Path;
import java.util.Comparator;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.pofk.chain.Chain;
import org.pofk.chain.Model;
import org.pofk.chain.Model.Adjustment;
import org.pofk.chain.Model.Adjustment.Reason;
import org.pofk.chain.Model.Convention;
import org.pofk.chain.Model.Parameter;
import org.pofk.chain.Model.Remark;
import org.pofk.chain.Model.Written;
import org.pofk.chain.Model.Written.Form;
import org.pofk.chain.Output;
import org.pofk.chain.Place;
import org.pofk.exact.Rational;
import org.pofk.text.RefusedException;

/** What is written in a file is what the model holds. */
class ModelReaderTest {
    private static final Path MODELS = Path.of("src/test/resources/models");

    private static Model model(String file) throws RefusedException {
        return ModelReader.read(MODELS.resolve(file), Overrides.NONE);
    }

    private static Model text(String text) throws RefusedException {
        return ModelReader.read(Source.ofText("m", text), Optional.empty(), Overrides.NONE);
    }

    private static List<Rational> numbers(String list) {
        return List.of(list.split(" ")).stream().map(Rational::parse).toList();
    }

    private static Output output(Model model, String name) {
        return model.chain().outputs().stream().filter(output -> output.name().equals(name)).findFirst().orElseThrow();
    }

    private static String move(Model model, String from, String to) {
        List<String> states = model.chain().states();
        return model.chain().matrix().at(states.indexOf(to), states.indexOf(from)).toString();
    }

    @Test
    void numbersAreExactAsWritten() throws RefusedException {
        Model model = model("exact-numbers.yaml");
        assertEquals(numbers("3/10 1/4 1/4 1/5"), model.chain().start());
        assertEquals("7/10", move(model, "idle", "run"));
        assertEquals("1/20", move(model, "run", "worn"));
        assertEquals("23/10000000", move(model, "run", "out"));
        assertEquals("1/6", move(model, "worn", "out"));
        assertEquals("7/12", move(model, "worn", "worn"));
        assertEquals(new Model.Step("shift", Optional.of("8 h"), Optional.of("2024")), model.step());
    }

    @Test
    void setsMayHoldSetsAndWhatIsNotInThem() throws RefusedException {
        Model model = model("crossing-sets.yaml");
        assertEquals(List.of(2, 3), model.chain().sets().get("down"));
        assertEquals(List.of(0, 1, 2), model.chain().sets().get("moving"));
        assertEquals(List.of(1), model.chain().sets().get("alone"));
        assertEquals(List.of(0, 1, 2), model.chain().sets().get("noted"));
        assertEquals(numbers("5/2 1/2 0 0"), output(model, "twice").coefficients());
        assertEquals(numbers("5/2 2 0 0"), output(model, "weights").coefficients());
        assertEquals("{up: 2, both: 1/2}", output(model, "weights").definition());
        assertTrue(model.notes().contains(new Remark(Place.named("set 'noted'"), Remark.Kind.NOTE, "agreed with operations")));
    }

    @Test
    void namesAreComparedAsTextAndQuotesTellNamesFromNumbers() throws RefusedException {
        Model model = model("numbers-as-names.yaml");
        assertEquals(List.of("2", "1", "01", "no", "0 left", "k"), model.chain().states());
        assertEquals(numbers("1 0 0 0 0 0"), model.chain().start());
        assertEquals(numbers("1 0 0 0 0 0"), output(model, "first").coefficients());
        assertEquals(numbers("4 3 4 4 3 3"), output(model, "sum").coefficients());
        assertEquals(numbers("2 1 0 0 0 -1"), output(model, "count").coefficients());
    }

    @Test
    void aTableBesideTheModelMayHaveItsStatesInAnotherOrder() throws RefusedException {
        Model model = model("table-beside.yaml");
        assertEquals(List.of("3", "4", "5"), model.chain().states());
        assertEquals("1/10", move(model, "5", "4"));
        assertEquals("3/4", move(model, "4", "4"));
        assertEquals("1/4", move(model, "4", "3"));
        assertEquals("1", move(model, "3", "3"));
        assertEquals(Convention.ROWS, model.convention());
        assertEquals(List.of(new Adjustment(Reason.REST_OF_MOVES, "from '4' (row 2) to '4': rest came to 3/4")),
                model.changes());
    }

    @Test
    void entriesAreWrittenAsOnPaperWhateverTheOrientation() throws RefusedException {
        Model columns = model("columns.yaml");
        assertEquals("1/2", move(columns, "1", "2"));
        assertEquals("1/5", move(columns, "2", "1"));
        assertEquals("7/10", move(columns, "2", "2"));
        Model rows = text("pofk: 1\nstart: '1'\nmatrix: {orientation: rows, entries: [[0.5, 0.5], [0.2, 0.8]]}\n");
        assertEquals("1/5", move(rows, "2", "1"));
        assertEquals("1/2", move(rows, "1", "2"));
    }

    @Test
    void roundedRowsAreRescaledAndEachChangeIsListed() throws RefusedException {
        Model model = model("rounded.yaml");
        assertEquals("1/3", move(model, "new", "used"));
        assertEquals("2/3", move(model, "new", "new"));
        assertEquals(numbers("1/3 1/3 1/3"), model.chain().start());
        assertEquals(5, model.changes().size());
        assertTrue(model.changes().contains(new Adjustment(Reason.SUM,
                "from 'new' to 'used': 33/100 became 1/3, rescaled because the sum was 99/100")));
    }

    @Test
    void aSumFurtherFromOneThanRoundingIsSaid() throws RefusedException {
        Model model = text("pofk: 1\nsums: rescale\nstart: a\ntransitions:\n  a: {a: 0.50, b: 0.25}\n  b: stays\n");
        assertTrue(model.changes().contains(new Adjustment(Reason.SUM, "from 'a' to 'b': 1/4 became 1/3, rescaled because"
                + " the sum was 3/4, further from 1 than rounding explains")), model.changes().toString());
    }

    @Test
    void eachNumberTellsWhetherItIsOneItselfARestOrAnExpressionInParameters() throws RefusedException {
        Model model = text("pofk: 1\nparameters: {f: 1/20}\nstart: {a: 1/2, b: rest}\ntransitions:\n"
                + "  a: {a: rest, b: 2*f}\n  b: {a: 1/4 - 1/20, b: {value: 0.8, source: log book}}\n");
        assertEquals(List.of(new Written(0, 0, "rest", Form.REST), new Written(0, 1, "2*f", Form.EXPRESSION),
                new Written(1, 0, "1/4 - 1/20", Form.NUMBER), new Written(1, 1, "0.8", Form.NUMBER)), model.written());
        assertEquals(List.of(Reason.REST_OF_START, Reason.REST_OF_MOVES),
                model.changes().stream().map(Adjustment::reason).sorted(Comparator.reverseOrder()).toList());
        assertEquals(List.of(new Remark(Place.of(Place.Part.MOVE, "b", "b"), Remark.Kind.SOURCE, "log book")),
                model.notes());
    }

    @Test
    void whatIsMissingMayGoToTheDiagonal() throws RefusedException {
        Model model = model("to-the-diagonal.yaml");
        assertEquals("67/100", move(model, "a", "a"));
        assertEquals("33/50", move(model, "b", "b"));
        assertEquals(2, model.changes().size());
    }

    @Test
    void parametersMayBeDefinedByOthersAndUsedAnywhere() throws RefusedException {
        Model model = model("parameters.yaml");
        assertEquals("1/10", move(model, "up", "down"));
        assertEquals("19/100", move(model, "down", "up"));
        assertEquals(numbers("9/10 1/10"), model.chain().start());
        assertEquals(numbers("1 10"), output(model, "cost").coefficients());
        assertEquals(new Parameter("per hour", "1/80", Optional.empty(), Optional.of("0"), Optional.of("1"),
                Optional.of("failures in an hour"), Optional.of("invented")), model.parameters().get(0));
        assertEquals(Optional.of("8*'per hour'"), model.parameters().get(1).definition());
        assertEquals("1 - up", output(model, "lost").definition());
        assertTrue(model.notes().contains(new Remark(Place.of(Place.Part.MOVE, "up", "down"), Remark.Kind.NOTE,
                "a shift of eight hours")));
    }

    @Test
    void theCommandLineComesBeforeTheFile() throws RefusedException {
        Model model = ModelReader.read(MODELS.resolve("parameters.yaml"),
                new Overrides(Map.of("per hour", "1/16"), Optional.of("down")));
        assertEquals("1/2", move(model, "up", "down"));
        assertEquals("3/4", move(model, "down", "up"));
        assertEquals(numbers("0 1"), model.chain().start());
    }

    @Test
    void aRecursionNeedNotAddUpAndOneIsItsConstant() throws RefusedException {
        Model model = model("recursion.yaml");
        assertEquals(Chain.Kind.RECURSION, model.chain().kind());
        assertEquals(numbers("10 -5/2"), model.chain().start());
        assertEquals("-1/3", move(model, "far", "near"));
        assertEquals(numbers("1 1"), output(model, "above plan").coefficients());
        assertEquals(Rational.of(-6), output(model, "above plan").constant());
    }

    @Test
    void oneInTheOutputsOfAChainIsTheSumOverAllStates() throws RefusedException {
        Output output = output(text("pofk: 1\nstart: a\ntransitions: {a: {b: 1}, b: stays}\n"
                + "outputs: {x: 3 - 2*a}\n"), "x");
        assertEquals(numbers("1 3"), output.coefficients());
        assertEquals(Rational.ZERO, output.constant());
    }

    @Test
    void jsonIsReadAndNamesAreBroughtIntoOneForm() throws RefusedException {
        Model model = model("ordinary.json");
        assertEquals(List.of("up", "döwn"), model.chain().states());
        assertEquals("9/10", move(model, "döwn", "döwn"));
        assertEquals(numbers("0 1"), output(model, "lost").coefficients());
    }

    @Test
    void whatTheAuthorSaysIsCarried() throws RefusedException {
        Model model = model("in-words.yaml");
        assertEquals(new Model.About(Optional.of("PN-12"), Optional.of("B"), Optional.of("A. Smith"),
                List.of("repairs start at once", "no two failures in one step"),
                Optional.of(Model.Concern.PROTECTIVE_FUNCTION)), model.about());
        assertEquals(List.of("model", "model", "transitions", "from 'Ventil A'"),
                model.notes().stream().map(note -> note.on().words()).toList());
        assertEquals("1 inspection", model.step().is());
        assertEquals(64, model.origin().sha256().length());
    }

    @Test
    void withoutATitleTheFileGivesIt() throws RefusedException {
        assertEquals("a.yaml", ModelReader.read(Source.ofText("x/a.yaml", "pofk: 1\nstart: a\ntransitions: {a: stays}\n"),
                Optional.empty(), Overrides.NONE).title());
    }

    @Test
    void statesStandInTheOrderOfTheirEntriesUnlessTheyAreListed() throws RefusedException {
        String transitions = "start: b\ntransitions:\n  b: {c: 1}\n  a: {b: 1}\n  c: {a: 1}\n";
        assertEquals(List.of("b", "a", "c"), text("pofk: 1\n" + transitions).chain().states());
        assertEquals(List.of("a", "b", "c"), text("pofk: 1\nstates: [a, b, c]\n" + transitions).chain().states());
    }

    @Test
    void restMayBeZeroButNotLess() throws RefusedException {
        assertEquals("0", move(text("pofk: 1\nstart: a\ntransitions: {a: {b: 1, a: rest}, b: stays}\n"), "a", "a"));
        assertThrows(RefusedException.class,
                () -> text("pofk: 1\nstart: a\ntransitions: {a: {b: 1, c: 1e-400, a: rest}, b: stays, c: stays}\n"));
    }
}
