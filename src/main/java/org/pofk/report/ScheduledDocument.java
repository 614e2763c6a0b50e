package org.pofk.report;

import java.util.ArrayList;
import java.util.List;
import org.pofk.chain.Timetable;
import org.pofk.report.Document.Block;
import org.pofk.report.Document.Heading;
import org.pofk.report.Document.Labelled;
import org.pofk.schedule.ScheduledModel;
import org.pofk.schedule.ScheduledOutput;
import org.pofk.schedule.StretchFormula;

/** What was found about a model with a schedule, as a document. */
public final class ScheduledDocument {
    private ScheduledDocument() {
    }

    public static Document of(ScheduledModel found, Style style) {
        Timetable timetable = found.timetable();
        List<Block> blocks = new ArrayList<>(ModelHead.of(found.model()));
        found.outputs().forEach(output -> {
            blocks.add(new Heading(2, OutputProse.title(output.output())));
            blocks.addAll(RegimeBlocks.of(timetable, output, style));
            CycleTables.longRun(timetable, output, style).ifPresent(blocks::add);
            blocks.addAll(proved(found, output, style));
        });
        CycleTables.values(found, style).ifPresent(blocks::add);
        blocks.add(Caution.ofInspections(found.model()));
        return new Document(blocks);
    }

    /** The formulas with their proof. */
    static List<Block> proved(ScheduledModel found, ScheduledOutput output, Style style) {
        List<Block> blocks = new ArrayList<>(CycleFormulas.within(found.timetable(), output, style));
        blocks.addAll(CycleFormulas.over(found.timetable(), output, style));
        if (!output.over().isEmpty()) {
            blocks.add(CycleProof.holds(found.timetable(), output.over()));
        }
        blocks.addAll(joint(found, output));
        return blocks;
    }

    /** The same of numerator or denominator: no means, and nothing that dies out in the long run. */
    static List<Block> quotientPart(ScheduledModel found, ScheduledOutput output, Style style) {
        return proved(found, output.withWithin(output.within().stream().filter(each ->
                each.cycle() == StretchFormula.Cycle.FIRST || !each.closedForm().modes().isEmpty()).toList())
                .withOver(output.over().stream().filter(each -> each.place().isPresent()).toList()), style);
    }

    /** The long run by step of the cycle, and the formulas, whose proof is told apart. */
    static List<Block> formulas(ScheduledModel found, ScheduledOutput output, Style style) {
        List<Block> blocks = new ArrayList<>();
        CycleTables.longRun(found.timetable(), output, style).ifPresent(blocks::add);
        blocks.addAll(CycleFormulas.within(found.timetable(), output, style));
        blocks.addAll(CycleFormulas.over(found.timetable(), output, style));
        blocks.addAll(joint(found, output));
        return blocks;
    }

    private static List<Block> joint(ScheduledModel found, ScheduledOutput output) {
        List<Block> blocks = new ArrayList<>(CycleFormulas.joint(found.timetable(), output));
        if (found.formulasLeftOut()) {
            blocks.add(new Labelled("formulas", "left out: the numbers of a whole cycle have up to " + found.cycleDigits()
                    + " digits, those of formulas more; --show all derives them however long it takes"));
        }
        return blocks;
    }
}
