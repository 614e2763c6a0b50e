package org.pofk.report;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import org.pofk.chain.Chain;
import org.pofk.chain.Model;
import org.pofk.exact.Rational;
import org.pofk.report.Document.Block;
import org.pofk.report.Document.Heading;
import org.pofk.report.Document.Labelled;
import org.pofk.report.Document.Paragraph;
import org.pofk.report.Document.Table;
import org.pofk.schedule.CycleFormula;
import org.pofk.schedule.ScheduledEntrance;
import org.pofk.schedule.ScheduledPassage;
import org.pofk.schedule.ScheduledVisits;
import org.pofk.schedule.ScheduledWait;
import org.pofk.schedule.ScheduledWait.Ever;
import org.pofk.steps.KnownValue;

/** Whether and when a set of states is first entered under a schedule, as a document. */
public final class ScheduledPassageDocument {
    /** Above so many states the table of all starts is left out. */
    private static final int STATES_AT_MOST = 40;
    private static final String GIVEN = " | T < ∞";
    private static final String NOT_DECIDED = "not decided within the budget";

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
                List.of(new Labelled(Prose.of("first into ").and(set)
                        .and(passage.avoiding().isEmpty() ? Prose.EMPTY
                                : Prose.of(", before ").and(document.names(passage.avoiding()))),
                        Prose.of("from ").and(StartProse.of(chain)).and(": " + document.inBrief()))),
                document.blocks, document.proofs(set), passage.isDecided() ? ReportSection.Standing.ANSWERED
                        : ReportSection.Standing.NOT_DECIDED);
    }

    private List<Proved> proofs(Prose set) {
        return passage.over().stream().flatMap(over -> Stream.of(
                proofs(over.laws(), "=", set), proofs(over.distributions(), "≤", set),
                proofs(over.survivals(), ">", set))).flatMap(each -> each).toList();
    }

    private Stream<Proved> proofs(List<CycleFormula> formulas, String relation, Prose set) {
        return formulas.stream().map(formula -> Proved.overCycles(left(relation, formula).and(", into ").and(set),
                "stopped chain", formula));
    }

    /** Whether and when, in a line. */
    private String inBrief() {
        return passage.entrance().map(entrance -> switch (entrance.first().ever()) {
            case NEVER -> PassageDocument.never(passage.avoiding());
            case CERTAIN -> "certain" + inBrief(entrance.first());
            case PERHAPS -> "with probability " + number(entrance.first().probability()) + "; given that it happens"
                    + inBrief(entrance.first());
        }).orElse(NOT_DECIDED);
    }

    private String inBrief(ScheduledWait wait) {
        return wait.mean().map(mean -> ", after " + number(mean) + " steps in the mean").orElse("")
                + PassageDocument.inBrief(passage.percentiles());
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
        passage.entrance().ifPresentOrElse(this::entrance, () -> label("ever", NOT_DECIDED));
        passage.percentiles().forEach(each -> label(PassageDocument.percent(each.p()),
                PassageDocument.percentile(each)));
        passage.decay().filter(decay -> passage.entrance().map(each -> each.first().ever() != Ever.NEVER).orElse(true))
                .ifPresent(this::decay);
        passage.entrance().flatMap(ScheduledEntrance::back).ifPresent(this::back);
        label("visits", passage.visits().map(this::visits).orElse(NOT_DECIDED)
                + PassageDocument.whatever(passage.avoiding()));
        if (passage.entrance().filter(entrance -> !entrance.first().isExact()).isPresent()) {
            label("numbers", "certified: every digit shown is right");
        }
        formulas();
        values();
        passage.entrance().filter(entrance -> chain.size() <= STATES_AT_MOST).ifPresent(this::fromEach);
    }

    private Prose names(List<Integer> states) {
        return Prose.names(states.stream().map(chain.states()::get).toList());
    }

    private void label(String label, String text) {
        blocks.add(new Labelled(label, text));
    }

    private void entrance(ScheduledEntrance entrance) {
        ScheduledWait wait = entrance.first();
        boolean isCertain = wait.ever() == Ever.CERTAIN;
        label("ever", switch (wait.ever()) {
            case NEVER -> PassageDocument.never(passage.avoiding());
            case CERTAIN -> "with probability 1";
            case PERHAPS -> "with probability " + number(wait.probability());
        });
        wait.mean().ifPresent(mean -> label("mean", (isCertain ? ""
                : "infinite, since it may never happen; given that it does, ") + number(mean)));
        wait.variance().ifPresent(variance -> label("variance", (isCertain ? "" : "given that it happens, ")
                + number(variance) + (variance.exact().filter(Rational::isZero).isPresent() ? ""
                : "; standard deviation " + KnownText.of(variance.sqrt(), style.digits()))));
    }

    private void decay(ScheduledPassage.Decay decay) {
        String left = passage.entrance().filter(entrance -> entrance.first().ever() == Ever.PERHAPS).isPresent()
                ? "what P(T > k) is above its limit" : "P(T > k)";
        boolean isOver = decay.perCycle().exact().filter(Rational::isZero).isPresent();
        label("decay", isOver ? "nothing of " + left + " is left after finitely many cycles"
                : "in the long run " + left + " falls by the factor " + number(decay.perCycle()) + " a cycle"
                + (passage.timetable().period() == 1 ? "" : ", " + number(decay.perStep()) + " a step on average"));
    }

    private void back(ScheduledWait back) {
        String how = ", in the first step k ≥ 1 in which it is entered or still there, by the move or by an action";
        String when = back.mean().map(mean -> "after " + number(mean) + " steps in the mean").orElse(NOT_DECIDED);
        label("return", switch (back.ever()) {
            case NEVER -> "never";
            case CERTAIN -> "certain, " + when + how;
            case PERHAPS -> "with probability " + number(back.probability()) + "; given that, " + when + how;
        });
    }

    private String visits(ScheduledVisits visits) {
        return visits.steps().map(steps -> number(steps)
                + " steps are expected to end there, after what is done in them")
                .orElse("infinitely many steps are expected to end there");
    }

    private void formulas() {
        if (passage.formulas() == ScheduledPassage.Formulas.TOO_LONG) {
            label("formulas", "left out: those over the cycles would need numbers too long to be found at once");
        }
        passage.over().ifPresent(over -> {
            formulas("Law over the cycles", "=", over.laws());
            formulas("Distribution over the cycles", "≤", over.distributions());
            formulas("Survival over the cycles", ">", over.survivals());
            over.happening().ifPresent(happening -> {
                blocks.add(new Heading(3, "Given that it happens"));
                FormulaInSteps formulas = new FormulaInSteps("m", style);
                formulas.add(happening.law().closedForm(), left(passage, "=", happening.law(), GIVEN),
                        Prose.of("m ≥ 0"));
                formulas.add(happening.distribution().closedForm(), left(passage, "≤", happening.distribution(), GIVEN),
                        Prose.of("m ≥ 0"));
                blocks.addAll(formulas.blocks());
            });
        });
    }

    private void formulas(String title, String relation, List<CycleFormula> all) {
        blocks.add(new Heading(3, title));
        FormulaInSteps formulas = new FormulaInSteps("m", style);
        all.forEach(formula -> formulas.add(formula.closedForm(), left(relation, formula), Prose.of("m ≥ 0")));
        blocks.addAll(formulas.blocks());
        blocks.add(CycleProof.holds(passage.timetable(), all));
    }

    private Prose left(String relation, CycleFormula formula) {
        return left(passage, relation, formula, "");
    }

    /** {@code P(T ≤ 12 m)}, with any relation. */
    static Prose left(ScheduledPassage passage, String relation, CycleFormula formula, String given) {
        return Prose.of("P(T " + relation + " "
                + ScheduleProse.stepOf(passage.timetable(), formula.place().orElseThrow().j()) + given + ")");
    }

    private String number(KnownValue value) {
        return KnownText.withFraction(value, style.digits());
    }

    private void values() {
        if (!passage.values().isEmpty()) {
            blocks.add(Table.ofText("Values at step k", List.of("k", "P(T = k)", "P(T ≤ k)", "P(T > k)", "hazard"),
                    passage.values().stream().map(each -> List.of(String.valueOf(each.k()),
                            KnownText.of(each.law(), style.digits()),
                            KnownText.of(each.distribution(), style.digits()),
                            KnownText.of(each.survival(), style.digits()),
                            hazard(each))).toList()));
        }
    }

    private String hazard(ScheduledPassage.At at) {
        boolean isOver = at.survival().exact().filter(Rational::isZero).isPresent();
        return at.hazard().map(hazard -> KnownText.of(hazard, style.digits())).orElse(isOver ? "–" : "not decided");
    }

    private void fromEach(ScheduledEntrance entrance) {
        blocks.add(new Table(Prose.of("From each state, started there at k = 0"),
                List.of(Prose.of("from"), Prose.of("ever"), Prose.of("mean steps, where it happens")),
                IntStream.range(0, chain.size()).mapToObj(state -> {
                    ScheduledWait wait = entrance.fromEach().get(state);
                    return List.of(Prose.name(chain.states().get(state)),
                            Prose.of(KnownText.of(wait.probability(), style.digits())),
                            Prose.of(wait.mean().map(mean -> KnownText.of(mean, style.digits())).orElse("–")));
                }).toList()));
    }
}
