package org.pofk.report;

import java.util.ArrayList;
import java.util.List;
import org.pofk.answer.DerivedModel;
import org.pofk.answer.DerivedOutput;
import org.pofk.answer.Wanted;
import org.pofk.report.Document.Block;
import org.pofk.report.Document.Heading;
import org.pofk.report.Document.Labelled;
import org.pofk.report.Document.Paragraph;

/** What was asked for and a budget left no time for, each where it would have stood. */
final class MissingBlocks {
    static final String NOT_DECIDED = "not decided within the budget";
    private static final int LISTED_STEPS = 6;

    private MissingBlocks() {
    }

    /** The checks of an output whose formula is known; without a formula, none could be expected. */
    static List<Block> checks(DerivedOutput output, Wanted wanted) {
        List<Block> blocks = new ArrayList<>();
        if (output.isDecided() && wanted.isMissingComparison(output)) {
            blocks.add(new Labelled("checked", NOT_DECIDED));
        }
        if (output.isDecided() && wanted.isMissingSecondOpinion(output)) {
            blocks.add(new Labelled("second opinion", NOT_DECIDED));
        }
        return blocks;
    }

    /** The values of those outputs that have none. */
    static List<Block> values(DerivedModel derived) {
        List<Prose> names = derived.outputs().stream().filter(derived.wanted()::isMissingValues)
                .map(output -> Prose.name(output.output().name())).toList();
        if (names.isEmpty()) {
            return List.of();
        }
        Prose which = names.size() == derived.outputs().size() ? Prose.EMPTY
                : Prose.of(" of ").and(Prose.joined(names, ", "));
        return List.of(new Paragraph(Prose.of("Values at k = " + steps(derived.wanted().at())).and(which)
                .and(": " + NOT_DECIDED)));
    }

    private static String steps(List<Integer> at) {
        return at.size() <= LISTED_STEPS
                ? String.join(", ", at.stream().map(String::valueOf).toList())
                : at.get(0) + " … " + at.get(at.size() - 1) + ", " + at.size() + " steps";
    }

    /** The way of an output whose closed form isn't known. */
    static List<Block> way(DerivedOutput output) {
        return output.closedForm().isPresent() ? List.of()
                : List.of(new Heading(2, Prose.of("From Y(z) to ").and(OutputProse.atStep(output.output()))),
                        new Paragraph(NOT_DECIDED));
    }

    /** The modes of the whole state. */
    static List<Block> state(DerivedModel derived) {
        return derived.wanted().isMissingState(derived)
                ? List.of(new Paragraph("Modes of the whole state: " + NOT_DECIDED)) : List.of();
    }
}
