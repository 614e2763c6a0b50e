package org.pofk.input;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.nio.file.Path;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.pofk.chain.Costs;
import org.pofk.chain.Entry;
import org.pofk.chain.Entry.Subject;
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

    private static Costs costs(String file) throws RefusedException {
        return ModelReader.read(Path.of(file), Overrides.NONE).costs().orElseThrow();
    }
}
