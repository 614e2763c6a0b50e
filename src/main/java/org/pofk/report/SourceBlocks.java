package org.pofk.report;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.stream.Collectors;
import org.pofk.chain.Model;
import org.pofk.chain.Model.Remark;
import org.pofk.chain.Model.Written;
import org.pofk.chain.Place;
import org.pofk.chain.Place.Part;
import org.pofk.exact.Rational;
import org.pofk.report.Document.Block;
import org.pofk.report.Document.Heading;
import org.pofk.report.Document.Items;
import org.pofk.report.Document.Paragraph;

/**
 * The numbers of a model that name no source. A source stands for all that it is written on: the model, its moves, the
 * moves out of a state, one move, the start, an output, the costs, a parameter. What a rest came to and a certain move
 * need none; an expression in parameters has theirs.
 */
final class SourceBlocks {
    private static final Set<Place> ON_ALL = Set.of(Place.of(Part.MODEL), Place.of(Part.TRANSITIONS),
            Place.of(Part.MATRIX));
    private static final int LISTED_UP_TO = 30;

    private final Model model;
    private final Set<Place> sourced;

    private SourceBlocks(Model model) {
        this.model = model;
        this.sourced = model.notes().stream().filter(note -> note.kind() == Remark.Kind.SOURCE).map(Remark::on)
                .collect(Collectors.toSet());
    }

    static List<Block> of(Model model) {
        return new SourceBlocks(model).blocks();
    }

    private List<Block> blocks() {
        Map<String, List<Prose>> moves = moves();
        List<Prose> open = new ArrayList<>();
        if (moves.size() > LISTED_UP_TO) {
            open.add(Prose.of("the moves out of " + moves.size() + " states, too many to be listed here"));
        } else {
            moves.forEach((from, each) -> open.add(Prose.of("from ").andName(from).and(": ")
                    .and(Prose.joined(each, ", "))));
        }
        open.addAll(OtherSources.of(model, sourced));
        model.parameters().stream().filter(each -> each.source().isEmpty() && each.definition().isEmpty())
                .forEach(each -> open.add(Prose.of("parameter ").andName(each.name()).and(" = " + each.value())));
        Heading heading = new Heading(3, "Numbers without a source");
        return List.of(heading, open.isEmpty() ? new Paragraph("None: every number of the moves, the start, the outputs"
                + " and the costs, and every parameter, names one, or follows from those that do.") : new Items(open));
    }

    /** The moves without one, by the state they lead out of. */
    private Map<String, List<Prose>> moves() {
        Map<String, List<Prose>> open = new LinkedHashMap<>();
        if (sourced.stream().anyMatch(ON_ALL::contains)) {
            return open;
        }
        List<String> states = model.chain().states();
        for (Written each : model.written()) {
            String from = states.get(each.from());
            String to = states.get(each.to());
            if (each.form() == Written.Form.NUMBER && !isCertain(each) && !sourced.contains(Place.of(Part.MOVES_FROM, from))
                    && !sourced.contains(Place.of(Part.MOVE, from, to))) {
                open.computeIfAbsent(from, none -> new ArrayList<>())
                        .add(Prose.of("to ").andName(to).and(" ").andName(each.text()));
            }
        }
        return open;
    }

    /** Zero and one say that a move never or always happens. */
    private boolean isCertain(Written each) {
        Rational value = model.chain().matrix().at(each.to(), each.from());
        return value.isZero() || value.isOne();
    }
}
