package org.pofk.report;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.IntStream;
import org.pofk.answer.DerivedOutput;
import org.pofk.answer.Growth;
import org.pofk.answer.Increment.Kind;
import org.pofk.answer.Total;
import org.pofk.chain.Model;
import org.pofk.chain.Output;
import org.pofk.exact.Decimals;
import org.pofk.exact.Rational;
import org.pofk.longrun.LongRun;
import org.pofk.report.Document.Block;
import org.pofk.report.Document.Labelled;
import org.pofk.report.Document.Table;
import org.pofk.steps.StepValue;

/** What is said of one total: what counts, the formulas, how it grows, values. */
final class TotalBlocks {
    static final String LONG_RUN = "long run";

    private final Model model;
    private final Total total;
    private final Style style;
    private final List<Block> blocks = new ArrayList<>();

    private TotalBlocks(Model model, Total total, Style style) {
        this.model = model;
        this.total = total;
        this.style = style;
    }

    /** Without a heading. */
    static List<Block> of(Model model, Total total, Style style) {
        TotalBlocks writer = new TotalBlocks(model, total, style);
        writer.write();
        return writer.blocks;
    }

    /** What there is to say on the first page of a report. */
    static List<Labelled> keyFigures(Model model, Total total, Style style) {
        TotalBlocks writer = new TotalBlocks(model, total, style);
        writer.growth(total.growth());
        return writer.blocks.stream().map(Labelled.class::cast).toList();
    }

    /** The first thing said of how a total grows, with its name. */
    static Labelled keyFigure(Output total, Labelled growth) {
        boolean isSentence = growth.label().equals(Prose.of(LONG_RUN));
        return new Labelled(Prose.name(total.name()), isSentence ? growth.text()
                : growth.label().and(" ").and(growth.text()));
    }

    /** Of the formulas shown. */
    static List<Proved> proofs(Total total) {
        return shown(total).stream().flatMap(output -> Proved.of(OutputProse.atStep(output.output()),
                total.summed().recursion(), "recursion", output).stream()).toList();
    }

    private void write() {
        label("counts", counts());
        shown(total).forEach(output -> blocks.addAll(ResultBlocks.proved(output, OutputProse.atStep(output.output()),
                "states and sums", style)));
        growth(total.growth());
        if (!total.total().values().isEmpty()) {
            blocks.add(values());
        }
    }

    /** Of costs, what a step adds has a formula of its own. */
    private static List<DerivedOutput> shown(Total total) {
        return total.increment().kind() == Kind.COSTS ? List.of(total.step(), total.total()) : List.of(total.total());
    }

    private void label(String label, String text) {
        blocks.add(new Labelled(label, text));
    }

    private String counts() {
        return switch (total.increment().kind()) {
            case VALUES -> "the value at the end of each step 0 … k, both included";
            case STEPS -> "every step 0 … k at whose end the chain is there, both included";
            case ENTRIES -> "every move from outside in the steps 1 … k; a start inside is no entry";
            case COSTS -> total.factor().isOne()
                    ? "in step k the state at its end and the move made in it; in step 0 the state at the start and"
                    + " what is due at the start"
                    : "what is due in step k counts (" + total.factor() + ")^k of it: a discount of "
                    + percent(total.factor().inverse().minus(Rational.ONE)) + " a step";
        };
    }

    private static String percent(Rational share) {
        return Decimals.of(share.times(Rational.of(100)), 6).text() + " %";
    }

    private void growth(Growth growth) {
        Optional<Rational> everything = growth.everything();
        if (everything.isPresent()) {
            label("in all", amount(everything.get()) + " over all steps k ≥ 0");
        } else if (growth.perStep().isZero()) {
            label(LONG_RUN, prose().of(growth.beyond()));
        } else {
            label("grows", "in the long run by " + amount(growth.perStep()) + " a step"
                    + (total.increment().kind() == Kind.ENTRIES ? ", once in "
                            + number(growth.perStep().inverse()) + " steps on average" : ""));
            label("offset", "what it is above that times k " + growth.beyond().accept(new Offset()));
        }
        if (total.increment().kind() == Kind.STEPS) {
            label("share", "of the steps up to k: the total over k + 1; tends to " + number(growth.perStep()));
        }
    }

    private LongRunProse prose() {
        return new LongRunProse(style.digits());
    }

    private String number(Rational value) {
        return prose().number(value);
    }

    private String amount(Rational value) {
        return number(value) + switch (total.increment().kind()) {
            case VALUES, STEPS -> "";
            case ENTRIES -> " entries";
            case COSTS -> " " + unit();
        };
    }

    private String unit() {
        return model.costs().map(costs -> costs.unit()).orElse("");
    }

    /** What a total does besides growing evenly. */
    private final class Offset implements LongRun.Visitor<String> {
        @Override
        public String limit(LongRun.Limit limit) {
            return "tends to " + number(limit.value());
        }

        @Override
        public String cycle(LongRun.Cycle cycle) {
            return "has " + prose().cycle(cycle);
        }

        @Override
        public String none(LongRun.None none) {
            return none.explanation();
        }
    }

    private Table values() {
        List<Prose> header = new ArrayList<>(List.of(Prose.of("k")));
        List<List<StepValue>> columns = new ArrayList<>();
        if (total.increment().kind() == Kind.COSTS) {
            header.add(Prose.name(total.step().output().name()));
            columns.add(total.step().values());
        }
        header.add(Prose.name(total.total().output().name()));
        columns.add(total.total().values());
        if (total.factor().isOne()) {
            header.add(Prose.of(total.increment().kind() == Kind.STEPS ? "share of time" : "a step"));
            columns.add(total.averages());
        }
        return new Table(Prose.of("Totals of the steps 0 … k" + (total.increment().kind() == Kind.COSTS
                ? ", in " + unit() : "")), header, IntStream.range(0, total.total().values().size())
                .mapToObj(row -> row(columns, row)).toList());
    }

    private List<Prose> row(List<List<StepValue>> columns, int row) {
        List<Prose> cells = new ArrayList<>(List.of(Prose.of(String.valueOf(columns.get(0).get(row).k()))));
        int k = columns.get(0).get(row).k();
        columns.forEach(column -> cells.add(Prose.of(column.stream().filter(value -> value.k() == k).findFirst()
                .map(value -> ValueText.of(value, style.digits())).orElse("–"))));
        return cells;
    }
}
