package org.pofk.input;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.pofk.chain.Costs;
import org.pofk.chain.Entry;
import org.pofk.chain.Entry.Subject;
import org.pofk.exact.Rational;
import org.pofk.text.RefusedException;

/** Costs keep the words in which their author wrote them. */
class CostsSectionTest {
    @Test
    void amountsAndDiscountAreKeptAsWritten() throws RefusedException {
        assertEquals(Map.of(Entry.of(Subject.COST_OF_STATE, "fading"), "120",
                Entry.of(Subject.COST_OF_MOVE, "clear", "fading"), "300",
                Entry.of(Subject.COST_AT_START), "500", Entry.of(Subject.DISCOUNT), "0.01%"),
                costs("test-data/costs/burst-error-link.yaml").written());
    }

    @Test
    void costsOfActionsAreKeptByActionAndState() throws RefusedException {
        Map<Entry, String> written = costs("test-data/scheduled/tested-valve-costs.yaml").written();
        assertEquals("9", written.get(Entry.of(Subject.COST_OF_ACTION, "proof test", "leaking")));
        assertEquals("0.5", written.get(Entry.of(Subject.COST_OF_STATE, "leaking")));
    }

    /** From cracked to sound there is a move in dry months alone. */
    @Test
    void aMoveOfAnyPhaseCosts() throws RefusedException {
        Source source = Source.ofText("deck.yaml", """
                pofk: 1
                states: [sound, cracked]
                start: sound
                moves:
                  wet: {sound: {cracked: 0.06, sound: rest}, cracked: stays}
                  dry: {sound: stays, cracked: {sound: 0.2, cracked: rest}}
                phases: [{for: 3 steps, use: wet}, {for: 9 steps, use: dry}]
                sets: {any: [sound, cracked]}
                costs: {each move: {sound: {cracked: 1}, cracked: {any: 40}}}
                """);
        assertEquals(List.of(new Costs.Move(0, 1, Rational.of(1)), new Costs.Move(1, 0, Rational.of(40)),
                new Costs.Move(1, 1, Rational.of(40))),
                ModelReader.read(source, Optional.empty(), Overrides.NONE).costs().orElseThrow().moves());
    }

    private static Costs costs(String file) throws RefusedException {
        return ModelReader.read(Path.of(file), Overrides.NONE).costs().orElseThrow();
    }
}
