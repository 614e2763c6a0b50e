package org.pofk.report;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.IntStream;
import org.pofk.chain.Costs;
import org.pofk.chain.Entry;
import org.pofk.chain.Entry.Subject;
import org.pofk.chain.Model;
import org.pofk.exact.Decimal;
import org.pofk.exact.Decimals;
import org.pofk.exact.Rational;
import org.pofk.report.Document.Block;
import org.pofk.report.Document.Heading;
import org.pofk.report.Document.Paragraph;
import org.pofk.report.Document.Table;

/** The amounts that costs are made of, each as a decimal, where that ends soon, exact, and as the author wrote it. */
final class CostBlocks {
    private static final int LONGEST_DECIMAL = 12;

    private final List<String> states;
    private final Map<Entry, String> written;
    private final List<List<Prose>> rows = new ArrayList<>();

    private CostBlocks(List<String> states, Map<Entry, String> written) {
        this.states = states;
        this.written = written;
    }

    /** Nothing for a model without costs. */
    static List<Block> of(Model model) {
        return model.costs().map(costs -> new CostBlocks(model.chain().states(), costs.written()).blocks(costs))
                .orElse(List.of());
    }

    private List<Block> blocks(Costs costs) {
        inStates(costs.eachStep(), Subject.COST_OF_STATE, List.of());
        costs.moves().forEach(move -> row(Subject.COST_OF_MOVE,
                List.of(states.get(move.from()), states.get(move.to())), move.cost()));
        costs.actions().forEach(each -> inStates(each.inState(), Subject.COST_OF_ACTION, List.of(each.action())));
        if (!costs.atStart().isZero()) {
            row(Subject.COST_AT_START, List.of(), costs.atStart());
        }
        costs.discount().ifPresent(rate -> row(Subject.DISCOUNT, List.of(), rate));
        return List.of(new Heading(3, "Costs"), rows.size() > MoveBlocks.LISTED_UP_TO
                ? new Paragraph(Prose.of(rows.size() + " amounts in ").andName(costs.unit()).and(", too many to be"
                        + " listed here; they are those of the model file, whose checksum is at the end."))
                : new Table(Prose.of("Amounts in ").andName(costs.unit()).and(costs.discount().isPresent()
                        ? "; the discount is a rate, not an amount" : ""),
                        List.of(Prose.of("what"), Prose.of("decimal"), Prose.of("exact"),
                                Prose.of("as written")), rows));
    }

    private void inStates(List<Rational> amounts, Subject subject, List<String> of) {
        IntStream.range(0, amounts.size()).filter(state -> !amounts.get(state).isZero()).forEach(state -> {
            List<String> named = new ArrayList<>(of);
            named.add(states.get(state));
            row(subject, named, amounts.get(state));
        });
    }

    private void row(Subject subject, List<String> of, Rational amount) {
        Decimal decimal = Decimals.of(amount, LONGEST_DECIMAL);
        Entry entry = new Entry(subject, of);
        rows.add(List.of(EntryProse.of(entry), Prose.of((decimal.exact() ? "" : "≈ ") + decimal.text()),
                Prose.of(amount.toString()), Optional.ofNullable(written.get(entry)).map(Prose::name)
                        .orElse(Prose.EMPTY)));
    }
}
