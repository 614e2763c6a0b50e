package org.pofk.chain;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.lang.reflect.RecordComponent;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
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

    /** Without what is worked out, so that an edit changes one entry. */
    private static final String PLAIN = FULL.replace("slow: 2*f, down: 1/100, up: rest", "slow: 0.1, down: 1/100, up: 0.89")
            .replace("slow: rest", "slow: 0.4").replace("{up: 3/5, down: rest}", "{up: 3/5, down: 0.4, note: seen}")
            .replace("assumptions: [one crew]", "assumptions: [one crew], concerns: structure")
            .replace("source: log}}", "source: log}, g: 2*f}")
            + "costs: {unit: kEUR, each step in: {down: 3}, each move: {up: {down: 7}}, at start: 2, discount: 1%}\n";

    private static final String ROUNDED = """
            pofk: 1
            states: [up, down]
            start: up
            matrix: {orientation: rows, entries: [[0.33, 0.33], [1, 0]]}
            sums: rescale
            """;

    private static final String TESTED = """
            pofk: 1
            states: [up, down]
            start: up
            transitions: {up: {down: 1/9, up: rest}, down: stays}
            actions: {test: {down: {up: 1/2, down: rest}}, wash: {up: {down: 1/7, up: rest}}}
            schedule: [{every: 6, first: 2, do: test}, {every: 4, do: wash}]
            """;

    private static final String PHASED = """
            pofk: 1
            states: [up, down]
            start: up
            moves:
              wet: {up: {down: 1/9, up: rest}, down: {up: 1}}
              dry: {up: {down: 1/99, up: rest}, down: {up: 1}}
            phases: [{for: 3, use: wet}, {for: 9, use: dry}]
            repeat: once
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

    /** A text, what is edited in it, and the subject of the entries that this changes. */
    private record Edit(String in, String from, String to, Subject subject) {
        List<Change> changes() throws RefusedException {
            assertTrue(in.contains(from), from);
            return ModelChanges.of(read(in), read(in.replace(from, to))).changes();
        }
    }

    private static Edit edit(String from, String to, Subject subject) {
        return new Edit(PLAIN, from, to, subject);
    }

    private static final List<Edit> EDITS = List.of(
            edit("Transfer line", "Transfer lines", Subject.TITLE), edit("TN-7", "TN-8", Subject.DOCUMENT),
            edit("revision: A", "revision: B", Subject.REVISION), edit("line desk", "other desk", Subject.PREPARED_BY),
            edit("concerns: structure", "concerns: protective function", Subject.CONCERNS),
            edit(", concerns: structure", "", Subject.CONCERNS), edit("[one crew]", "[two crews]", Subject.ASSUMPTION),
            edit("[one crew]", "[one crew, one crew]", Subject.ASSUMPTION),
            edit("pofk: 1", "pofk: 1\nconvention: rows", Subject.CONVENTION),
            edit("is: shift", "is: slot", Subject.STEP), edit("8 h", "6 h", Subject.STEP_LASTS),
            edit("2031", "2032", Subject.FIRST_STEP), edit("[up, slow, down]", "[up, down, slow]", Subject.ORDER),
            new Edit(TESTED, "down]\nstart: up\ntransitions: {", "down, dry]\nstart: up\ntransitions: {dry: stays, ",
                    Subject.STATE),
            edit("{up: 9/10, slow: 1/10}", "{up: 4/5, slow: 1/5}", Subject.START),
            edit("value: 1/20", "value: 1/21", Subject.PARAMETER), edit("g: 2*f", "g: 1/10", Subject.DEFINITION),
            edit("to: 1/2", "to: 1/3", Subject.RANGE), edit("fails in a shift", "fails in it", Subject.MEANING),
            edit("source: log", "source: logs", Subject.NOTE), edit("note: seen", "note: counted", Subject.NOTE),
            edit("{up: 1/2, down: 1/10, slow: 0.4}", "{up: 1/2, down: 1/5, slow: 0.3}", Subject.MOVE),
            edit("working: [up, slow]", "working: [up]", Subject.SET),
            edit("working: [up, slow]", "working: [up, slow], idle: [down]", Subject.SET),
            edit("lost: down", "lost: 1 - up - slow", Subject.OUTPUT), edit("slow: 1/2}", "slow: 1/3}", Subject.OUTPUT),
            edit("lost: down, load: {up: 1, slow: 1/2}", "load: {up: 1, slow: 1/2}, lost: down", Subject.ORDER),
            edit("unit: kEUR", "unit: EUR", Subject.COST_UNIT), edit("in: {down: 3}", "in: {down: 4}", Subject.COST_OF_STATE),
            edit("{up: {down: 7}}", "{up: {down: 8}}", Subject.COST_OF_MOVE),
            edit("at start: 2", "at start: 5", Subject.COST_AT_START), edit(", discount: 1%", "", Subject.DISCOUNT),
            new Edit(PLAIN.substring(0, PLAIN.indexOf("costs")), "pofk: 1", "pofk: 1\nkind: recursion", Subject.KIND),
            new Edit(ROUNDED, "[0.33, 0.33]", "[0.25, 0.25]", Subject.ADJUSTED),
            new Edit(TESTED, "every: 6", "every: 7", Subject.ACTION), new Edit(TESTED, "first: 2", "first: 3", Subject.ACTION),
            new Edit(TESTED, "down: {up: 1/2, down: rest}}", "down: {up: 1/3, down: rest}}", Subject.ACTION_MOVE),
            new Edit(TESTED + "costs: {each test in: {down: 3}}\n", "{down: 3}", "{down: 4}", Subject.COST_OF_ACTION),
            new Edit(TESTED, "[{every: 6, first: 2, do: test}, {every: 4, do: wash}]",
                    "[{every: 4, do: wash}, {every: 6, first: 2, do: test}]", Subject.ORDER),
            new Edit(PHASED, "for: 3", "for: 4", Subject.PHASE),
            new Edit(PHASED, "up: {down: 1/9, up: rest}", "up: {down: 1/8, up: rest}", Subject.PHASE_MOVE),
            new Edit(PHASED, "repeat: once", "repeat: yes", Subject.AFTER_PHASES));

    /** Whatever a model file can say is tried: every subject there is, but what the command line adds. */
    @Test
    void eachEditIsSaidAsWhatItIs() throws Exception {
        Set<Subject> seen = EnumSet.of(Subject.PARAMETER_IN_FILE, Subject.START_IN_FILE);
        for (Edit edit : EDITS) {
            List<Subject> subjects = edit.changes().stream().map(change -> change.entry().subject()).distinct().toList();
            assertTrue(subjects.contains(edit.subject()), edit.from() + " " + edit.changes());
            assertTrue(Set.of(Subject.PARAMETER, Subject.STATE, Subject.PHASE_MOVE).contains(edit.subject())
                    || subjects.size() == 1, edit.from() + " " + edit.changes());
            seen.add(edit.subject());
        }
        assertEquals(EnumSet.allOf(Subject.class), seen);
    }

    /** What is put into a model later must be compared too, as all of this is, or be how a file is laid out. */
    @Test
    void allThatAModelHoldsIsCompared() {
        assertEquals(List.of("title", "step", "convention", "about", "chain", "schedule", "costs", "parameters", "notes",
                "changes", "written", "origin", "tables", "settings"), components(Model.class));
        assertEquals(List.of("is", "lasts", "first"), components(Model.Step.class));
        assertEquals(List.of("document", "revision", "preparedBy", "assumptions", "concerns"), components(Model.About.class));
        assertEquals(List.of("name", "value", "definition", "from", "to", "meaning", "source"),
                components(Model.Parameter.class));
        assertEquals(List.of("kind", "states", "matrix", "start", "sets", "outputs"), components(Chain.class));
        assertEquals(List.of("unit", "eachStep", "moves", "actions", "atStart", "discount", "written"),
                components(Costs.class));
        assertEquals(List.of("action", "inState"), components(Costs.OfAction.class));
        assertEquals(List.of("recurring", "phases"), components(Schedule.class));
        assertEquals(List.of("action", "every", "first", "when"), components(Schedule.Recurring.class));
    }

    private static List<String> components(Class<?> record) {
        return Arrays.stream(record.getRecordComponents()).map(RecordComponent::getName).toList();
    }

    /** With the same values on the command line, what the files say there is told all the same. */
    @Test
    void whatTheCommandLineReplacesIsComparedToo() throws Exception {
        Overrides overrides = new Overrides(Map.of("f", "1/10"), Optional.of("up"));
        Model before = ModelReader.read(Source.ofText("line.yaml", FULL), Optional.empty(), overrides);
        Model after = ModelReader.read(Source.ofText("line.yaml", FULL.replace("1/20", "1/25").replace("up: 9/10, slow: 1/10",
                "slow: 1")), Optional.empty(), overrides);
        assertEquals(List.of(
                new Change(Entry.of(Subject.START_IN_FILE), Optional.of("{up: 9/10, slow: 1/10}"), Optional.of("{slow: 1}")),
                new Change(Entry.of(Subject.PARAMETER_IN_FILE, "f"), Optional.of("1/20"), Optional.of("1/25"))),
                ModelChanges.of(before, after).changes());
        assertEquals(Optional.empty(), before.parameters().get(0).source());
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
