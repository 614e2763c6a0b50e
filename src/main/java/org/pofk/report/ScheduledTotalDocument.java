package org.pofk.report;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.pofk.answer.Growth;
import org.pofk.answer.Increment.Kind;
import org.pofk.chain.Timetable;
import org.pofk.exact.Decimals;
import org.pofk.exact.Rational;
import org.pofk.longrun.LongRun;
import org.pofk.report.Document.Block;
import org.pofk.report.Document.Heading;
import org.pofk.report.Document.Labelled;
import org.pofk.report.Document.Table;
import org.pofk.schedule.ScheduledTotal;
import org.pofk.schedule.ScheduledTotalModel;
import org.pofk.steps.KnownValue;

/** What is spent in states, entered and paid under a schedule, as a document. */
public final class ScheduledTotalDocument {
    private static final String OUT_OF_REACH = "not decided: the numbers of a whole cycle are too long for formulas";
    private static final String CERTIFIED = "certified: every digit shown is right; formulas over the cycles would need"
            + " numbers too long to be found at once";

    private final ScheduledTotalModel found;
    private final Timetable timetable;
    private final Style style;
    private final List<Block> blocks = new ArrayList<>();

    private ScheduledTotalDocument(ScheduledTotalModel found, Style style) {
        this.found = found;
        this.timetable = found.timetable();
        this.style = style;
    }

    public static Document of(ScheduledTotalModel found, Style style) {
        ScheduledTotalDocument document = new ScheduledTotalDocument(found, style);
        document.blocks.addAll(ModelHead.of(found.model()));
        found.totals().forEach(total -> {
            document.blocks.add(new Heading(2, OutputProse.title(total.total())));
            document.total(total);
        });
        if (found.totals().size() < found.wanted()) {
            document.label("not decided", "within the budget: " + (found.wanted() - found.totals().size()) + " more");
        }
        document.blocks.add(Caution.ofInspections(found.model()));
        return new Document(document.blocks);
    }

    /** The place the totals have in a report. */
    public static ReportSection section(ScheduledTotalModel found, Prose title, Style style) {
        ScheduledTotalDocument document = new ScheduledTotalDocument(found, style);
        List<Labelled> keyFigures = new ArrayList<>();
        List<Proved> proofs = new ArrayList<>();
        found.totals().forEach(total -> {
            document.blocks.add(new Heading(3, OutputProse.title(total.total())));
            document.total(total);
            keyFigures.add(document.keyFigure(total));
            total.over().ifPresent(over -> proofs.addAll(document.proofs(total, over)));
        });
        return new ReportSection(ReportSection.Place.RESULTS, title, keyFigures, document.blocks, proofs,
                found.isDecided() ? ReportSection.Standing.ANSWERED : ReportSection.Standing.NOT_DECIDED);
    }

    /** What is said of one total, without a heading. */
    static List<Block> section(ScheduledTotalModel found, ScheduledTotal total, Style style) {
        ScheduledTotalDocument document = new ScheduledTotalDocument(found, style);
        document.total(total);
        return document.blocks;
    }

    /** How it grows. */
    private Labelled keyFigure(ScheduledTotal total) {
        ScheduledTotalDocument alone = new ScheduledTotalDocument(found, style);
        total.over().ifPresentOrElse(over -> alone.growth(total, over.growth()), () -> alone.bounds(total));
        Labelled figure = TotalBlocks.keyFigure(total.total(), (Labelled) alone.blocks.get(0));
        return total.over().isPresent() && timetable.period() > 1
                ? new Labelled(figure.label(), figure.text().and(aStep(total))) : figure;
    }

    /** What two schedules with other cycles are compared by. */
    private String aStep(ScheduledTotal total) {
        return total.perStep().filter(value -> !value.isZero()).map(value -> ", " + amount(total, value) + " a step")
                .orElse("");
    }

    private List<Proved> proofs(ScheduledTotal total, ScheduledTotal.OverCycles over) {
        return List.of(Proved.overCycles(left(total), "recursion", over.total()),
                Proved.overCycles(Prose.of("what cycle m adds to ").andName(total.total().name()), "recursion",
                        over.cycle()));
    }

    private Prose left(ScheduledTotal total) {
        return Prose.name(total.total().name()).and("(" + ScheduleProse.stepOf(timetable, 0) + ")");
    }

    private void total(ScheduledTotal total) {
        label("counts", counts(total));
        total.over().ifPresentOrElse(over -> over(total, over), () -> bounds(total));
        values(total);
    }

    /** What is certain without formulas. */
    private void bounds(ScheduledTotal total) {
        total.bounds().flatMap(ScheduledTotal.Bounds::perStep).ifPresent(value -> label("grows", "in the long run by "
                + amount(total, value) + " a step"
                + (total.increment().kind() == Kind.STEPS ? ", the share of time in the long run" : "")));
        total.bounds().flatMap(ScheduledTotal.Bounds::everything).ifPresent(value -> label("in all",
                amount(total, value) + " over all steps k ≥ 0"));
        label(total.isDecided() && total.bounds().isPresent() ? "numbers" : TotalBlocks.LONG_RUN,
                total.isDecided() && total.bounds().isPresent() ? CERTIFIED : OUT_OF_REACH);
    }

    private String amount(ScheduledTotal total, KnownValue value) {
        return KnownText.of(value, style.digits()) + unit(total);
    }

    private void label(String label, String text) {
        blocks.add(new Labelled(label, text));
    }

    private static String counts(ScheduledTotal total) {
        return switch (total.increment().kind()) {
            case VALUES -> "the value at the end of each step 0 … k, both included, after what is done there";
            case STEPS -> "every step 0 … k, both included, at whose end, after what is done there, the chain is in it";
            case ENTRIES -> "every move and every action in the steps 1 … k that leads into it from outside; a start"
                    + " inside is no entry";
            case COSTS -> total.factor().isOne()
                    ? "in step k the state at its end, after what is done there, the move made in it, and each action"
                    + " by the state in which it finds the chain; in step 0 the state at the start and what is due"
                    + " there"
                    : "what is due in step k counts (" + total.factor() + ")^k of it: a discount of "
                    + Decimals.of(total.factor().inverse().minus(Rational.ONE).times(Rational.of(100)), 6).text()
                    + " % a step";
        };
    }

    private void over(ScheduledTotal total, ScheduledTotal.OverCycles over) {
        FormulaInSteps formulas = new FormulaInSteps("m", style);
        formulas.add(over.total().closedForm(), left(total), Prose.of("m ≥ 0"));
        formulas.add(over.cycle().closedForm(), Prose.of("added by cycle m"), Prose.of("m ≥ 0, steps "
                + ScheduleProse.stepOf(timetable, 1) + " … " + ScheduleProse.stepOf(timetable, timetable.period())));
        blocks.addAll(formulas.blocks());
        blocks.add(CycleProof.holds(timetable, List.of(over.total(), over.cycle())));
        growth(total, over.growth());
    }

    private void growth(ScheduledTotal total, Growth growth) {
        Optional<Rational> everything = growth.everything();
        if (everything.isPresent()) {
            label("in all", amount(total, everything.get()) + " over all steps k ≥ 0");
        } else if (growth.perStep().isZero()) {
            label(TotalBlocks.LONG_RUN, prose().of(growth.beyond()) + ", at the beginning of cycle m");
        } else {
            label("grows", "in the long run by " + amount(total, growth.perStep()) + " a cycle of "
                    + timetable.period() + " steps");
            if (timetable.period() > 1) {
                label("a step", amount(total, total.perStep().orElseThrow())
                        + (total.increment().kind() == Kind.STEPS ? ", the share of time in the long run" : ""));
            }
            label("offset", "at the beginning of cycle m, what it is above that times m "
                    + growth.beyond().accept(new Offset()));
        }
    }

    private LongRunProse prose() {
        return new LongRunProse(style.digits());
    }

    private String amount(ScheduledTotal total, Rational value) {
        return prose().number(value)
                + (total.increment().kind() == Kind.STEPS && value.isOne() ? " step" : unit(total));
    }

    private String unit(ScheduledTotal total) {
        return switch (total.increment().kind()) {
            case VALUES -> "";
            case STEPS -> " steps";
            case ENTRIES -> " entries";
            case COSTS -> " " + unit();
        };
    }

    private String unit() {
        return found.model().costs().map(costs -> costs.unit()).orElse("");
    }

    /** What a total does besides growing evenly. */
    private final class Offset implements LongRun.Visitor<String> {
        @Override
        public String limit(LongRun.Limit limit) {
            return "tends to " + prose().number(limit.value());
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

    private void values(ScheduledTotal total) {
        if (total.values().isEmpty()) {
            return;
        }
        boolean isCost = total.increment().kind() == Kind.COSTS;
        List<Prose> header = new ArrayList<>(List.of(Prose.of("k"), Prose.name(total.total().name())));
        if (total.factor().isOne()) {
            header.add(Prose.of(total.increment().kind() == Kind.STEPS ? "share of time" : "a step"));
        }
        blocks.add(new Table(Prose.of("Totals of the steps 0 … k" + (isCost ? ", in " + unit() : "")), header,
                total.values().stream().map(each -> row(total, each)).toList()));
    }

    private List<Prose> row(ScheduledTotal total, ScheduledTotal.At at) {
        List<Prose> cells = new ArrayList<>(List.of(Prose.of(String.valueOf(at.k())), Prose.of(text(at.total()))));
        if (total.factor().isOne()) {
            boolean isNone = at.total().isPresent() && at.average().isEmpty();
            cells.add(Prose.of(isNone ? "–" : text(at.average())));
        }
        return cells;
    }

    private String text(Optional<KnownValue> value) {
        return value.map(known -> KnownText.of(known, style.digits())).orElse("not decided");
    }
}
