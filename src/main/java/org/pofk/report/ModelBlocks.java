package org.pofk.report;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.IntStream;
import org.pofk.chain.Chain;
import org.pofk.chain.Model;
import org.pofk.chain.Output;
import org.pofk.chain.Place;
import org.pofk.chain.Structure;
import org.pofk.exact.Rational;
import org.pofk.report.Document.Block;
import org.pofk.report.Document.Figure;
import org.pofk.report.Document.Heading;
import org.pofk.report.Document.Items;
import org.pofk.report.Document.Labelled;
import org.pofk.report.Document.Paragraph;
import org.pofk.report.Document.Table;

/** What was modelled, as its author wrote it: states, moves, costs, parameters, sources, assumptions, and what is open. */
final class ModelBlocks {
    static final Heading TITLE = new Heading(2, "What was modelled");
    private static final int STATES_LISTED_UP_TO = 40;
    private static final int NAMES_AT_MOST = 8;

    private final Model model;
    private final Chain chain;
    private final List<Output> outputs;
    private final Structure structure;
    private final List<Block> blocks = new ArrayList<>();

    private ModelBlocks(Model model, List<Output> outputs, Structure structure) {
        this.model = model;
        this.chain = model.chain();
        this.outputs = outputs;
        this.structure = structure;
    }

    static List<Block> of(Model model, List<Output> outputs, Structure structure) {
        ModelBlocks all = new ModelBlocks(model, outputs, structure);
        all.write();
        return all.blocks;
    }

    private void write() {
        blocks.add(TITLE);
        states();
        blocks.addAll(MoveBlocks.of(model));
        blocks.addAll(CostBlocks.of(model));
        parameters();
        outputs();
        notes();
        blocks.addAll(SourceBlocks.of(model));
        assumptions();
        diagram();
    }

    private void label(String label, Prose text) {
        blocks.add(new Labelled(label, text));
    }

    private void states() {
        boolean isChain = chain.kind() == Chain.Kind.CHAIN;
        blocks.add(new Heading(3, "States"));
        if (chain.size() <= STATES_LISTED_UP_TO) {
            boolean hasSets = !chain.sets().isEmpty();
            List<Prose> header = new ArrayList<>(List.of(Prose.of("state"), Prose.of("at the start")));
            if (hasSets) {
                header.add(Prose.of("in the sets"));
            }
            blocks.add(new Table(Prose.EMPTY, header, IntStream.range(0, chain.size()).mapToObj(i -> {
                List<Prose> row = new ArrayList<>(List.of(Prose.name(chain.states().get(i)),
                        Prose.of(chain.start().get(i).toString())));
                if (hasSets) {
                    row.add(Prose.names(chain.sets().entrySet().stream().filter(set -> set.getValue().contains(i))
                            .map(Map.Entry::getKey).toList()));
                }
                return row;
            }).toList()));
        } else {
            blocks.add(new Paragraph(Prose.of(chain.size() + " states, too many to be listed here; they are those of "
                    + "the model file. The start: ").and(StartProse.of(chain)).and(".")));
            chain.sets().forEach((name, states) -> blocks.add(new Labelled(Prose.of("set ").andName(name),
                    Prose.of(states.size() + (states.size() == 1 ? " state: " : " states: "))
                            .and(StateNames.of(states.stream().sorted().toList(), chain.states())))));
        }
        if (model.schedule().isPresent()) {
            return; // what is scheduled may lead out of them and into them
        }
        if (isChain) {
            named("never left", structure.absorbing());
        }
        named("never reached", structure.unreached());
    }

    private void named(String label, List<Integer> states) {
        if (!states.isEmpty()) {
            List<String> names = states.stream().map(chain.states()::get).toList();
            label(label, names.size() <= NAMES_AT_MOST ? Prose.names(names)
                    : Prose.names(names.subList(0, NAMES_AT_MOST)).and(" and " + (names.size() - NAMES_AT_MOST)
                            + " more"));
        }
    }

    private void parameters() {
        if (model.parameters().isEmpty()) {
            return;
        }
        blocks.add(new Heading(3, "Parameters"));
        blocks.add(new Table(Prose.EMPTY, List.of(Prose.of("name"), Prose.of("value"), Prose.of("meaning"),
                Prose.of("source")), model.parameters().stream().map(this::parameter).toList()));
    }

    private List<Prose> parameter(Model.Parameter each) {
        return List.of(Prose.name(each.name()), each.definition().filter(text -> !text.equals(each.value()))
                .map(text -> Prose.name(text).and(" = ")).orElse(Prose.EMPTY).and(each.value()),
                text(each.meaning()), model.setting(each).map(SettingProse::inPlaceOf).orElseGet(() -> text(each.source())));
    }

    private static Prose text(Optional<String> text) {
        return text.map(ModelHead::words).orElse(Prose.of("–"));
    }

    private void outputs() {
        blocks.add(new Heading(3, "What is asked of it"));
        outputs.forEach(output -> blocks.add(new Labelled(Prose.name(output.name()), meaning(output))));
    }

    /** The states it adds up, with their weights where they aren't one. */
    private Prose meaning(Output output) {
        List<Integer> read = IntStream.range(0, chain.size()).filter(i -> !output.coefficients().get(i).isZero())
                .boxed().toList();
        boolean isPlain = read.stream().allMatch(i -> output.coefficients().get(i).isOne());
        if (read.isEmpty() || !isPlain && read.size() > NAMES_AT_MOST) {
            return Prose.name(output.definition());
        }
        if (read.size() > NAMES_AT_MOST && chain.kind() == Chain.Kind.CHAIN) {
            return Prose.of("the probability of being in one of " + read.size() + " states: ")
                    .and(StateNames.of(read, chain.states()));
        }
        Prose sum = Prose.joined(read.stream().map(i -> isPlain ? Prose.name(chain.states().get(i))
                : weighted(output.coefficients().get(i), chain.states().get(i))).toList(), isPlain ? " or " : " + ");
        boolean isChain = chain.kind() == Chain.Kind.CHAIN;
        return Prose.of(isChain && isPlain ? "the probability of being in " : "the "
                + (isChain ? "expected value of " : "value of ")).and(isPlain && !isChain ? Prose.joined(read.stream()
                        .map(i -> Prose.name(chain.states().get(i))).toList(), " + ") : sum)
                .and(output.constant().isZero() ? "" : " + " + output.constant());
    }

    private static Prose weighted(Rational weight, String state) {
        return Prose.of((weight.isOne() ? "" : weight + " · ")).andName(state);
    }

    private void notes() {
        List<Model.Remark> notes = model.notes().stream().filter(note -> !isOfReplaced(note)).toList();
        if (!notes.isEmpty()) {
            blocks.add(new Heading(3, "Notes and sources"));
            blocks.add(new Items(notes.stream().map(note -> ModelHead.words(note.on().words()).and(", " + note.kind().word()
                    + ": ").and(ModelHead.words(note.text()))).toList()));
        }
    }

    /** The source of a value of the file that the command line replaces. */
    private boolean isOfReplaced(Model.Remark note) {
        return note.kind() == Model.Remark.Kind.SOURCE && model.settings().stream().flatMap(each -> each.parameter().stream())
                .anyMatch(name -> note.on().equals(Place.of(Place.Part.PARAMETER, name)));
    }

    private void assumptions() {
        blocks.add(new Heading(3, "Assumptions"));
        blocks.add(model.about().assumptions().isEmpty() ? new Paragraph("The model file states none.")
                : new Items(model.about().assumptions().stream().map(ModelHead::words).toList()));
    }

    private void diagram() {
        blocks.add(new Heading(3, "State diagram"));
        blocks.add(StateChart.of(model).<Block>map(chart -> new Figure(Prose.of("States and moves"), chart))
                .orElseGet(() -> new Paragraph("Not drawn: a diagram of " + chain.size() + " states can't be read.")));
    }
}
