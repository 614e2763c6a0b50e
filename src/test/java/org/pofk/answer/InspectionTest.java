package org.pofk.answer;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.pofk.answer.Question.Kind;
import org.pofk.chain.Chain;
import org.pofk.chain.Model;
import org.pofk.chain.Model.Adjustment;
import org.pofk.chain.Model.Adjustment.Reason;
import org.pofk.chain.Place;
import org.pofk.exact.Rational;
import org.pofk.longrun.RecursionPoles;

class InspectionTest {
    private static final Model.About ASSUMED = new Model.About(Optional.empty(), Optional.empty(), Optional.empty(),
            List.of("repairs as good as new"), Optional.empty());
    private static final Model.Remark SOURCE = new Model.Remark(Place.of(Place.Part.TRANSITIONS),
            Model.Remark.Kind.SOURCE, "log book");

    @Test
    void aWellDocumentedErgodicChainRaisesNoQuestion() {
        assertEquals(List.of(), kinds(Chains.pumps()));
        Inspection inspection = inspection(Chains.pumps());
        assertEquals(3, inspection.states());
        assertEquals(8, inspection.moves());
        assertEquals(Optional.empty(), inspection.poles());
    }

    @Test
    void eachOddityOfAChainIsAskedAbout() {
        assertEquals(List.of(Kind.NEVER_REACHED), kinds(Chains.chain("0 1 0", "0 0 0", "1 1/2 1", "0 1/2 0")));
        assertEquals(List.of(Kind.NEVER_LEFT), kinds(Chains.chain("1 0", "1/2 0", "1/2 1")));
        assertEquals(List.of(Kind.NEVER_LEFT, Kind.DEPENDS_ON_START),
                kinds(Chains.chain("1 0 0", "1/2 0 0", "1/4 1 0", "1/4 0 1")));
        assertEquals(List.of(Kind.PERIODIC), kinds(Chains.rotation()));
        assertEquals(List.of(Kind.HARDLY_LEFT), kinds(Chains.chain("1 0", "1/2 1/100000", "1/2 99999/100000")));
    }

    @Test
    void statesLeftHardlyEverAreNamedWithTheirChance() {
        Inspection inspection = inspection(Chains.nearlyReducible());
        assertEquals(List.of(new NearlyClosed(List.of(0, 1), Rational.parse("0.0000000001"))),
                inspection.nearlyClosed());
        assertTrue(inspection.questions().stream().anyMatch(question -> question.kind() == Kind.SETTLES_LATE));
        // rare failures that are repaired soon delay nothing
        assertEquals(List.of(), inspection(Chains.chain("1 0", "0.9999999 0.6", "0.0000001 0.4")).nearlyClosed());
    }

    @Test
    void missingSourcesAndAssumptionsAndChangesOnEntryAreAskedAbout() {
        Model bare = model(Chains.pumps(), Model.About.NOTHING, List.of(),
                List.of(new Adjustment(Reason.REST_OF_MOVES,
                        "from 'one': rest came to 19/50"), new Adjustment(Reason.SUM, "from 'none' to 'none': 0.41 became 2/5")));
        assertEquals(List.of(Kind.CHANGED_ON_ENTRY, Kind.WITHOUT_SOURCE, Kind.WITHOUT_ASSUMPTIONS),
                Inspection.of(bare).questions().stream().map(Question::kind).toList());
    }

    @Test
    void aRecursionIsPlacedByItsPoles() {
        // z (z − 1/2) (z² − 6/5 z + 1) (z − 2)² as a companion matrix
        Chain recursion = Chains.recursion("1 0 0 0 0 0",
                "57/10 -62/5 137/10 -42/5 2 0", "1 0 0 0 0 0", "0 1 0 0 0 0", "0 0 1 0 0 0", "0 0 0 1 0 0",
                "0 0 0 0 1 0");
        RecursionPoles poles = inspection(recursion).poles().orElseThrow();
        assertEquals(new RecursionPoles(6, 2, 2, 2, Optional.of("grows like k * 2^k")), poles);
    }

    private static List<Kind> kinds(Chain chain) {
        return inspection(chain).questions().stream().map(Question::kind).toList();
    }

    private static Inspection inspection(Chain chain) {
        return Inspection.of(model(chain, ASSUMED, List.of(SOURCE), List.of()));
    }

    private static Model model(Chain chain, Model.About about, List<Model.Remark> remarks,
            List<Adjustment> changes) {
        return new Model("invented", new Model.Step("1 shift", Optional.empty(), Optional.empty()),
                Model.Convention.COLUMNS, about, chain, Optional.empty(), Optional.empty(), List.of(),
                remarks, changes, List.of(), new Model.Origin("invented.yaml", ""), List.of());
    }
}
