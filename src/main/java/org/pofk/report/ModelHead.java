package org.pofk.report;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import org.pofk.chain.Chain;
import org.pofk.chain.Model;
import org.pofk.chain.Timetable;
import org.pofk.report.Document.Block;
import org.pofk.report.Document.Heading;
import org.pofk.report.Document.Items;
import org.pofk.report.Document.Labelled;
import org.pofk.report.Document.Paragraph;

/** Which model a document is about, with what its author says about it. */
final class ModelHead {
    private ModelHead() {
    }

    static List<Block> of(Model model) {
        List<Block> blocks = new ArrayList<>(withoutAssumptions(model));
        if (!model.about().assumptions().isEmpty()) {
            blocks.add(new Paragraph("Assumptions"));
            blocks.add(new Items(model.about().assumptions().stream().map(Prose::name).toList()));
        }
        return blocks;
    }

    /** The same for an answer that is not about the model's own start. */
    static List<Block> ofEachStart(Model model) {
        List<Block> blocks = new ArrayList<>(of(model));
        blocks.set(1, new Paragraph(facts(model).and(", started in each state in turn.")));
        return blocks;
    }

    /** The same where these stand elsewhere. */
    static List<Block> withoutAssumptions(Model model) {
        List<Block> blocks = new ArrayList<>();
        blocks.add(new Heading(1, words(model.title())));
        blocks.add(new Paragraph(facts(model).and(start(model.chain())).and(".")));
        model.about().document().ifPresent(document -> blocks.add(new Labelled("document", Prose.name(document)
                .and(model.about().revision().map(revision -> ", revision " + revision).orElse("")))));
        model.about().preparedBy().ifPresent(who -> blocks.add(new Labelled("prepared by", Prose.name(who))));
        model.schedule().ifPresent(schedule ->
                blocks.addAll(ScheduleProse.of(schedule, Timetable.of(model.chain(), schedule))));
        return blocks;
    }

    /** A name whose words may stand in different lines, as other names' may not. */
    static Prose words(String text) {
        return Prose.joined(Arrays.stream(text.strip().split(" +")).map(Prose::name).toList(), " ");
    }

    private static Prose facts(Model model) {
        Chain chain = model.chain();
        return Prose.name(model.origin().file()).and(": "
                + (chain.kind() == Chain.Kind.CHAIN ? "" : "a recursion of ")
                + (chain.size() == 1 ? "1 state" : chain.size() + " states"))
                .and(model.step().named().map(is -> Prose.of(", one step is ").andName(is)).orElse(Prose.EMPTY))
                .and(model.step().lasts().filter(lasts -> !lasts.equals(model.step().is()))
                        .map(lasts -> Prose.of(" (lasts ").andName(lasts).and(")"))
                        .orElse(Prose.EMPTY));
    }

    private static Prose start(Chain chain) {
        return chain.kind() == Chain.Kind.CHAIN ? Prose.of(", starts in ").and(StartProse.of(chain)) : Prose.EMPTY;
    }
}
