package org.pofk.report;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.IntStream;
import org.pofk.answer.PassageMoments;
import org.pofk.chain.Chain;
import org.pofk.chain.Model;
import org.pofk.exact.Decimals;
import org.pofk.exact.Enclosed;
import org.pofk.exact.Rational;
import org.pofk.report.Document.Block;
import org.pofk.report.Document.Heading;
import org.pofk.report.Document.Labelled;
import org.pofk.report.Document.Paragraph;
import org.pofk.report.Document.Table;
import org.pofk.schedule.CycleFormula;
import org.pofk.schedule.ScheduledPassage;

/** Whether and when a set of states is first entered under a schedule, as a document. */
public final class ScheduledPassageDocument {
    /** Above so many states the table of all starts is left out. */
    private static final int STATES_AT_MOST = 40;

    private final Chain chain;
    private final ScheduledPassage passage;
    private final Style style;
    private final List<Block> blocks = new ArrayList<>();

    private ScheduledPassageDocument(Chain chain, ScheduledPassage passage, Style style) {
        this.chain = chain;
        this.passage = passage;
        this.style = style;
    }

    /** @param model with the start that was asked about */
    public static Document of(Model model, ScheduledPassage passage, Style style) {
        ScheduledPassageDocument document = new ScheduledPassageDocument(model.chain(), passage, style);
        document.blocks.addAll(ModelHead.of(model));
        document.blocks.add(new Heading(2, document.title()));
        document.write();
        document.blocks.add(Caution.ofInspections(model));
        return new Document(document.blocks);
    }

    /** The same as a part of a report. */
    public static ReportSection section(Chain chain, ScheduledPassage passage, Style style) {
        ScheduledPassageDocument document = new ScheduledPassageDocument(chain, passage, style);
        document.write();
        Prose set = document.names(passage.into());
        return new ReportSection(ReportSection.Place.RESULTS, document.title(),
                List.of(new Labelled(Prose.of("first into ").and(set), Prose.of(passage.over().map(over ->
                        PassageDocument.inBrief(over.moments(), over.percentiles(), style))
                        .orElse("not decided: the numbers of a whole cycle are too long for formulas")))),
                document.blocks, passage.over().stream().flatMap(over -> over.distributions().stream())
                        .map(formula -> Proved.overCycles(left(passage, formula).and(", into ").and(set), "stopped chain",
                                formula)).toList(),
                passage.over().isPresent() ? ReportSection.Standing.ANSWERED : ReportSection.Standing.NOT_DECIDED);
    }

    private Prose title() {
        return Prose.of("First passage into ").and(names(passage.into()));
    }

    private void write() {
        Prose set = names(passage.into());
        blocks.add(new Paragraph(Prose.of("T is the first step k ≥ 0 in which ").and(set)
                .and(" is entered, by the move or by an action, from ").and(StartProse.of(chain))
                .and("; what is done at the end of the same step doesn't undo it")
                .and(passage.avoiding().isEmpty() ? Prose.EMPTY
                        : Prose.of("; entering ").and(names(passage.avoiding())).and(" first ends the wait"))
                .and(".")));
        passage.over().ifPresentOrElse(this::over, () -> label("ever",
                "not decided: the numbers of a whole cycle are too long for formulas"));
        values();
        passage.over().filter(over -> chain.size() <= STATES_AT_MOST).ifPresent(this::fromEach);
    }

    private Prose names(List<Integer> states) {
        return Prose.names(states.stream().map(chain.states()::get).toList());
    }

    private void label(String label, String text) {
        blocks.add(new Labelled(label, text));
    }

    private void over(ScheduledPassage.OverCycles over) {
        moments(over.moments());
        over.percentiles().forEach(each -> label(PassageDocument.percent(each.p()), PassageDocument.percentile(each)));
        over.settling().flatMap(settling -> settling.slowest()).ifPresent(slowest -> label("decay",
                "in the long run " + (over.moments().isCertain() ? "P(T > k)" : "what P(T > k) is above its limit")
                        + " falls by the factor " + Decimals.of(slowest, style.digits()).text() + " a cycle"));
        blocks.add(new Heading(3, "Over the cycles"));
        FormulaInSteps formulas = new FormulaInSteps("m", style);
        over.distributions().forEach(formula -> formulas.add(formula.closedForm(), left(passage, formula), Prose.of("m ≥ 0")));
        blocks.addAll(formulas.blocks());
        blocks.add(CycleProof.holds(passage.timetable(), over.distributions().get(0)));
    }

    static Prose left(ScheduledPassage passage, CycleFormula formula) {
        return Prose.of("P(T ≤ " + ScheduleProse.stepOf(passage.timetable(), formula.place().orElseThrow().j()) + ")");
    }

    private void moments(PassageMoments moments) {
        if (moments.probability().isZero()) {
            label("ever", "never: it can't be reached from there");
            return;
        }
        label("ever", moments.isCertain() ? "with probability 1" : "with probability " + number(moments.probability()));
        label("mean", (moments.isCertain() ? "" : "infinite, since it may never happen; given that it does, ")
                + number(moments.mean().orElseThrow()) + " steps");
        Rational variance = moments.variance().orElseThrow();
        label("variance", (moments.isCertain() ? "" : "given that it happens, ") + number(variance)
                + (variance.isZero() ? "" : "; standard deviation "
                + Decimals.of(Enclosed.of(variance).map(ball -> ball.sqrt()), style.digits()).text()));
    }

    private String number(Rational value) {
        return new LongRunProse(style.digits()).number(value);
    }

    private void values() {
        if (!passage.values().isEmpty()) {
            blocks.add(Table.ofText("Values at step k", List.of("k", "P(T ≤ k)", "P(T > k)"),
                    passage.values().stream().map(each -> List.of(String.valueOf(each.k()),
                            KnownText.of(each.distribution(), style.digits()),
                            KnownText.of(each.survival(), style.digits()))).toList()));
        }
    }

    private void fromEach(ScheduledPassage.OverCycles over) {
        blocks.add(new Table(Prose.of("From each state, started there at k = 0"),
                List.of(Prose.of("from"), Prose.of("ever"), Prose.of("mean steps, where it happens")),
                IntStream.range(0, chain.size()).mapToObj(state -> List.of(Prose.name(chain.states().get(state)),
                        Prose.of(ValueText.of(over.fromEach().probabilities().get(state), style.digits())),
                        Prose.of(over.fromEach().means().get(state)
                                .map(mean -> ValueText.of(mean, style.digits())).orElse("–")))).toList()));
    }
}
