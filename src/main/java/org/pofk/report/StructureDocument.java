package org.pofk.report;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.IntStream;
import org.pofk.answer.InspectedModel;
import org.pofk.answer.InspectedModel.InspectedOutput;
import org.pofk.answer.Question;
import org.pofk.chain.Chain;
import org.pofk.chain.Structure;
import org.pofk.chain.Structure.CommunicatingClass;
import org.pofk.longrun.HighPowers;
import org.pofk.longrun.LongRunChecks;
import org.pofk.longrun.RecursionPoles;
import org.pofk.report.Document.Block;
import org.pofk.report.Document.Heading;
import org.pofk.report.Document.Items;
import org.pofk.report.Document.Labelled;
import org.pofk.report.Document.Paragraph;
import org.pofk.report.Document.Table;

/** A model's structure, its long runs and a reviewer's questions, as a document. */
public final class StructureDocument {
    private static final int NAMES_AT_MOST = 8;
    private static final int STATES_LISTED_AT_MOST = 40;

    private final InspectedModel inspected;
    private final Style style;
    private final List<Block> blocks = new ArrayList<>();

    private StructureDocument(InspectedModel inspected, Style style) {
        this.inspected = inspected;
        this.style = style;
    }

    public static Document of(InspectedModel inspected, Style style) {
        StructureDocument document = new StructureDocument(inspected, style);
        document.write();
        return new Document(document.blocks);
    }

    private void write() {
        blocks.addAll(ModelHead.of(inspected.model()));
        structure();
        inspected.inspection().poles().ifPresent(this::poles);
        if (!inspected.states().isEmpty() || !inspected.outputs().isEmpty()) {
            longRuns();
        }
        questions();
        blocks.add(Caution.of(inspected.model()));
    }

    private void structure() {
        Structure structure = inspected.inspection().structure();
        boolean isScheduled = inspected.model().schedule().isPresent();
        blocks.add(new Heading(2, isScheduled ? "Structure between what is scheduled" : "Structure"));
        if (isScheduled) {
            blocks.add(new Paragraph("Of the model's own moves alone. What the schedule makes of them in the long run"
                    + " is told by pofk derive."));
        }
        blocks.add(new Table(Prose.EMPTY, List.of(Prose.of("class"), Prose.of("kind"), Prose.of("period"),
                Prose.of("reached"), Prose.of("states")), IntStream.range(0, structure.classes().size())
                        .mapToObj(i -> row(i, structure.classes().get(i))).toList()));
        blocks.add(new Labelled("moves", String.valueOf(inspected.inspection().moves())));
        blocks.add(new Labelled("absorbing", names(structure.absorbing())));
        blocks.add(new Labelled("never reached", names(structure.unreached())));
    }

    private List<Prose> row(int place, CommunicatingClass each) {
        return List.of(Prose.of(String.valueOf(place + 1)), Prose.of(kind(each)),
                Prose.of(each.period() == 0 ? "–" : String.valueOf(each.period())),
                Prose.of(each.reached() ? "yes" : "no"), names(each.states()));
    }

    private static String kind(CommunicatingClass each) {
        return each.isAbsorbing() ? "absorbing" : each.closed() ? "closed" : "transient";
    }

    private Prose names(List<Integer> states) {
        if (states.isEmpty()) {
            return Prose.of("none");
        }
        List<String> all = states.stream().map(inspected.model().chain().states()::get).toList();
        return all.size() <= NAMES_AT_MOST ? Prose.names(all)
                : Prose.names(all.subList(0, NAMES_AT_MOST)).and(" and " + (all.size() - NAMES_AT_MOST) + " more");
    }

    private void poles(RecursionPoles poles) {
        blocks.add(new Labelled("order", "the whole state satisfies a recurrence of order " + poles.order()));
        blocks.add(new Labelled("poles", poles.inside() + " inside the unit circle, " + poles.on() + " on it, "
                + poles.outside() + " outside, counted with multiplicity"));
        blocks.add(new Labelled("growth", poles.growth().orElse("none, the state stays bounded")));
    }

    private void longRuns() {
        blocks.add(new Heading(2, "Long run"));
        LongRunProse prose = new LongRunProse(style.digits());
        List<String> states = inspected.model().chain().states();
        if (!inspected.states().isEmpty() && states.size() <= STATES_LISTED_AT_MOST) {
            blocks.add(new Table(Prose.EMPTY, List.of(Prose.of("state"), Prose.of("long run")),
                    IntStream.range(0, states.size()).mapToObj(i -> List.of(Prose.name(states.get(i)),
                            Prose.of(prose.of(inspected.states().get(i))))).toList()));
        }
        inspected.outputs().forEach(output -> output(output, prose));
    }

    private void output(InspectedOutput output, LongRunProse prose) {
        LongRunChecks checks = output.longRun();
        blocks.add(new Heading(3, OutputProse.title(output.output())));
        blocks.add(new Labelled("long run", prose.of(checks.byPoles())));
        output.settling().ifPresent(settling -> blocks.add(new Labelled("settles",
                SettlingProse.of(settling, checks.byPoles(), style.digits()))));
        blocks.add(new Labelled("found by", LongRunProse.ways(checks)));
        checks.highPowers().stream().flatMap(verdict -> verdict.habits().stream())
                .filter(stop -> stop.outcome() != HighPowers.Outcome.RIGHT)
                .forEach(stop -> blocks.add(new Labelled("beware", LongRunWarning.of(stop, style.digits()))));
    }

    private void questions() {
        List<Question> questions = inspected.inspection().questions();
        if (!questions.isEmpty()) {
            blocks.add(new Heading(2, "What a reviewer would ask"));
            blocks.add(new Items(questions.stream().map(question -> Prose.of(question.text())).toList()));
        }
    }

    /** For a model too large to derive every state of: how to ask for more, and what is known without. */
    public static Document tooLargeForAll(InspectedModel inspected, Style style) {
        List<Block> blocks = new ArrayList<>(of(inspected, style).blocks());
        blocks.add(ModelHead.of(inspected.model()).size(), new Paragraph(askingForOutputs(inspected.model().chain())));
        return new Document(blocks);
    }

    /** Why no formula is shown for a chain without outputs, and how to ask for one. */
    public static String askingForOutputs(Chain chain) {
        return "No formula yet: the model names no outputs and has " + chain.size() + " states. Say which formula is"
                + " wanted, --of STATE or --of SET; --of all derives every state.";
    }
}
