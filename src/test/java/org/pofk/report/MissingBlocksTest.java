package org.pofk.report;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.EnumSet;
import java.util.List;
import java.util.Optional;
import java.util.function.Predicate;
import org.junit.jupiter.api.Test;
import org.pofk.answer.DerivedModel;
import org.pofk.answer.DerivedOutput;
import org.pofk.answer.Deriving;
import org.pofk.chain.Model;
import org.pofk.chain.Outputs;
import org.pofk.input.ModelReader;
import org.pofk.input.Overrides;
import org.pofk.input.Source;
import org.pofk.text.Alphabet;
import org.pofk.text.Columns;
import org.pofk.text.RefusedException;

class MissingBlocksTest {
    private static final String PUMPS = """
            pofk: 1
            title: Pumps
            step: 1 week
            start: up
            transitions:
              up: {worn: 0.1000000000000000000000000000000000001, up: rest}
              worn: {down: 0.2, up: 0.1, worn: rest}
              down: {up: 0.5, down: rest}
            outputs: {lost: down, used: worn}
            """;

    private final List<DerivedModel> published = new ArrayList<>();

    MissingBlocksTest() throws RefusedException {
        Model model = ModelReader.read(Source.ofText("pumps.yaml", PUMPS), Optional.empty(), Overrides.NONE);
        Deriving.of(model, Outputs.byDefault(model.chain()), List.of(0, 8760),
                EnumSet.of(Deriving.Extra.COMPARISON), published::add);
    }

    private String textOfFirst(Predicate<DerivedModel> stage) {
        DerivedModel model = published.stream().filter(stage).findFirst().orElseThrow();
        return TextWriter.of(Alphabet.UNICODE, StandardCharsets.UTF_8).write(
                DerivationDocument.result(model, new Style(6, Style.Angles.RADIANS)));
    }

    @Test
    void formulasWithoutChecksAndValuesSayThatTheseAreMissing() {
        String text = textOfFirst(DerivedModel::isDecided);
        assertEquals(2, text.split("\n  checked +not decided within the budget\n", -1).length - 1);
        assertTrue(text.contains("\nValues at k = 0, 8760: not decided within the budget\n"), text);
    }

    @Test
    void valuesOfTheOutputsThatHaveNoneAreSaidToBeMissing() {
        String text = textOfFirst(model -> model.outputs().stream().anyMatch(output -> !output.values().isEmpty()));
        assertTrue(text.contains("\nValues at k = 0, 8760 of used: not decided within the budget\n"), text);
    }

    @Test
    void aTransformWithLongCoefficientsIsLeftOutWithAWord() {
        String text = textOfFirst(model -> model.outputs().stream().allMatch(output ->
                output.transform().isPresent()));
        assertTrue(text.replaceAll("\\s+", " ").contains("too long to be shown; they are in the result as JSON"), text);
        assertFalse(text.contains("Y(z) ="), text);
        assertEquals(0, text.lines().filter(line -> Columns.width(line) > 80).count(), text);
    }

    @Test
    void aWholeRunMissesNothing() {
        DerivedModel whole = published.get(published.size() - 1);
        assertEquals(2, whole.outputs().stream().filter(DerivedOutput::isDecided).count());
        assertFalse(textOfFirst(whole::equals).contains("not decided"));
    }
}
