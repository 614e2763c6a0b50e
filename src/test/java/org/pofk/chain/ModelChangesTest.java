package org.pofk.chain;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.EnumSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.stream.Collectors;
import org.junit.jupiter.api.Test;
import org.pofk.chain.Entry.Subject;
import org.pofk.chain.ModelChanges.Change;
import org.pofk.input.ModelReader;
import org.pofk.input.Overrides;
import org.pofk.input.Source;
import org.pofk.text.RefusedException;

/** What two models say otherwise. */
class ModelChangesTest {
    private static final String FULL = """
            pofk: 1
            title: Transfer line (invented)
            about: {document: TN-7, revision: A, prepared by: line desk, assumptions: [one crew]}
            step: {is: shift, lasts: 8 h, first: 2031}
            states: [up, slow, down]
            start: {up: 9/10, slow: 1/10}
            parameters: {f: {value: 1/20, from: 0, to: 1/2, meaning: fails in a shift, source: log}}
            transitions:
              up: {slow: 2*f, down: 1/100, up: rest}
              slow: {up: 1/2, down: 1/10, slow: rest}
              down: {up: 3/5, down: rest}
            sets: {working: [up, slow]}
            outputs: {lost: down, load: {up: 1, slow: 1/2}}
            """;

    private static Model read(String text) throws RefusedException {
        return ModelReader.read(Source.ofText("line.yaml", text), Optional.empty(), Overrides.NONE);
    }

    private static List<Model> patterns() throws IOException, RefusedException {
        List<Model> models = new ArrayList<>();
        for (String name : Files.readAllLines(Path.of("test-data/models/index.txt"))) {
            if (!name.isBlank()) {
                models.add(ModelReader.read(Source.read(Path.of("test-data/models", name.strip() + ".yaml")),
                        Optional.of(Path.of("test-data/models")), Overrides.NONE));
            }
        }
        return models;
    }

    @Test
    void aModelSaysWhatItSays() throws Exception {
        List<Model> patterns = patterns();
        for (Model model : patterns) {
            assertTrue(ModelChanges.of(model, model).isEmpty(), model.title());
        }
        assertTrue(patterns.size() >= 16, patterns.size() + " models");
    }

    @Test
    void howTheFileIsWrittenIsNoChange() throws Exception {
        String rewritten = FULL.replace("9/10", "0.9").replace("1/20", "5%").replace("slow: 2*f", "slow: 0.1")
                .replace("up: 3/5, down: rest", "down: 2/5, up: rest").replace("shift, lasts", "'shift', lasts");
        assertEquals(List.of(), ModelChanges.of(read(FULL), read(rewritten)).changes());
    }

    @Test
    void theOtherWayAroundBeforeAndAfterChangePlaces() throws Exception {
        List<Model> models = patterns();
        models.add(read(FULL));
        int changes = 0;
        for (int i = 0; i + 1 < models.size(); i++) {
            Set<Change> there = Set.copyOf(ModelChanges.of(models.get(i), models.get(i + 1)).changes());
            Set<Change> back = ModelChanges.of(models.get(i + 1), models.get(i)).changes().stream()
                    .map(change -> new Change(change.entry(), change.after(), change.before()))
                    .collect(Collectors.toSet());
            assertEquals(Map.of(), ModelChanges.of(models.get(i), models.get(i + 1)).renamed());
            assertEquals(there, back, models.get(i).title());
            changes += there.size();
        }
        assertTrue(changes > 200, changes + " changes");
    }

    /** One edit, and the subject of the one entry that it changes. */
    @Test
    void eachEditIsSaidAsWhatItIs() throws Exception {
        Map<String, Map<String, Subject>> edits = Map.ofEntries(
                edit("Transfer line", "Transfer lines", Subject.TITLE), edit("TN-7", "TN-8", Subject.DOCUMENT),
                edit("revision: A", "revision: B", Subject.REVISION), edit("line desk", "other desk", Subject.PREPARED_BY),
                edit("is: shift", "is: slot", Subject.STEP), edit("8 h", "6 h", Subject.STEP_LASTS),
                edit("2031", "2032", Subject.FIRST_STEP), edit("to: 1/2", "to: 1/3", Subject.RANGE),
                edit("fails in a shift", "fails in it", Subject.MEANING), edit("source: log", "source: logs", Subject.NOTE),
                edit("working: [up, slow]", "working: [up]", Subject.SET), edit("lost: down", "lost: 1 - up - slow",
                        Subject.OUTPUT), edit("pofk: 1", "pofk: 1\nkind: recursion", Subject.KIND));
        Set<Subject> seen = EnumSet.noneOf(Subject.class);
        for (Map.Entry<String, Map<String, Subject>> edit : edits.entrySet()) {
            Map.Entry<String, Subject> to = edit.getValue().entrySet().iterator().next();
            String plain = FULL.replace("up: rest", "up: 0.89").replace("slow: rest", "slow: 0.4")
                    .replace("down: rest", "down: 0.4");
            List<Change> changes = ModelChanges.of(read(plain), read(plain.replace(edit.getKey(), to.getKey()))).changes();
            assertEquals(List.of(to.getValue()), changes.stream().map(change -> change.entry().subject()).toList(),
                    edit + " " + changes);
            seen.add(to.getValue());
        }
        assertEquals(edits.size(), seen.size());
    }

    private static Map.Entry<String, Map<String, Subject>> edit(String from, String to, Subject subject) {
        return Map.entry(from, Map.of(to, subject));
    }

    @Test
    void whatFollowsFromAParameterIsSaidWithIt() throws Exception {
        List<Change> changes = ModelChanges.of(read(FULL), read(FULL.replace("1/20", "1/25"))).changes();
        assertEquals(List.of(
                new Change(Entry.of(Subject.PARAMETER, "f"), Optional.of("0.05"), Optional.of("0.04")),
                new Change(Entry.of(Subject.MOVE, "up", "up"), Optional.of("0.89"), Optional.of("0.91")),
                new Change(Entry.of(Subject.MOVE, "up", "slow"), Optional.of("0.1"), Optional.of("0.08"))), changes);
    }

    @Test
    void aStateUnderAnotherNameIsRenamedAndNothingElse() throws Exception {
        ModelChanges changes = ModelChanges.of(read(FULL), read(FULL.replaceAll("\\bslow\\b", "crawl")));
        assertEquals(Map.of("slow", "crawl"), changes.renamed());
        assertEquals(Set.of(Entry.of(Subject.STATE, "crawl"), Entry.of(Subject.OUTPUT, "load")),
                changes.changes().stream().map(Change::entry).collect(Collectors.toSet()));
    }

    @Test
    void aStateThatMovesOtherwiseIsAnotherState() throws Exception {
        ModelChanges changes = ModelChanges.of(read(FULL),
                read(FULL.replaceAll("\\bslow\\b", "crawl").replace("down: 1/10", "down: 1/11")));
        assertEquals(Map.of(), changes.renamed());
        assertTrue(changes.changes().contains(new Change(Entry.of(Subject.STATE, "slow"), Optional.of("slow"),
                Optional.empty())));
        assertTrue(changes.changes().contains(new Change(Entry.of(Subject.STATE, "crawl"), Optional.empty(),
                Optional.of("crawl"))));
    }
}
