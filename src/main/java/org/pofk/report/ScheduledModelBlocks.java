package org.pofk.report;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import org.pofk.chain.Chain;
import org.pofk.chain.Model;
import org.pofk.chain.Schedule.Action;
import org.pofk.chain.Schedule.Phase;
import org.pofk.chain.SparseMatrix;
import org.pofk.chain.Structure;
import org.pofk.report.Document.Block;
import org.pofk.report.Document.Heading;
import org.pofk.report.Document.Paragraph;
import org.pofk.report.Document.Table;
import org.pofk.schedule.ScheduledModel;
import org.pofk.schedule.ScheduledOutput;

/** What was modelled where there is a schedule: the chain, each action and each phase as a table, and when they are. */
final class ScheduledModelBlocks {
    private final Model model;
    private final Chain chain;
    private final List<Block> blocks = new ArrayList<>();

    private ScheduledModelBlocks(Model model) {
        this.model = model;
        this.chain = model.chain();
    }

    static List<Block> of(ScheduledModel found) {
        ScheduledModelBlocks all = new ScheduledModelBlocks(found.model());
        all.blocks.addAll(ModelBlocks.of(found.model(), found.outputs().stream().map(ScheduledOutput::output).toList(),
                Structure.of(found.model().chain())));
        all.blocks.add(new Heading(2, "What is scheduled"));
        all.blocks.addAll(ScheduleProse.of(found.model().schedule().orElseThrow(), found.timetable()));
        found.timetable().actions().forEach(all::action);
        all.phases();
        return all.blocks;
    }

    private void action(Action action) {
        blocks.add(new Heading(3, Prose.of("Action ").andName(action.name())));
        moves(action.matrix(), "states that aren't listed stay as they are");
    }

    /** The one that the chain's own table shows is named, not listed again. */
    private void phases() {
        Set<String> told = new HashSet<>();
        model.schedule().orElseThrow().phases().ifPresent(phases -> phases.list().stream()
                .filter(phase -> told.add(phase.use())).forEach(this::phase));
    }

    private void phase(Phase phase) {
        blocks.add(new Heading(3, Prose.of("Moves in the phase ").andName(phase.use())));
        if (phase.matrix().equals(chain.matrix())) {
            blocks.add(new Paragraph("Those listed above under " + (chain.kind() == Chain.Kind.CHAIN ? "Transitions."
                    : "Coefficients.")));
        } else {
            moves(phase.matrix(), "states that aren't listed stay");
        }
    }

    private void moves(SparseMatrix matrix, String others) {
        List<List<Prose>> rows = new ArrayList<>();
        for (int from = 0; from < chain.size(); from++) {
            List<SparseMatrix.Entry> column = matrix.columns().get(from);
            boolean stays = column.size() == 1 && column.get(0).row() == from && column.get(0).value().isOne();
            for (SparseMatrix.Entry entry : stays ? List.<SparseMatrix.Entry>of() : column) {
                rows.add(List.of(Prose.name(chain.states().get(from)), Prose.name(chain.states().get(entry.row())),
                        Prose.of(entry.value().toString())));
            }
        }
        blocks.add(rows.size() > MoveBlocks.LISTED_UP_TO ? new Paragraph(rows.size() + " moves, too many to be listed"
                + " here; they are those of the model file, whose checksum is at the end.")
                : new Table(Prose.of("From where to where; " + others), List.of(Prose.of("from"), Prose.of("to"),
                        Prose.of(chain.kind() == Chain.Kind.CHAIN ? "probability" : "coefficient")), rows));
    }
}
