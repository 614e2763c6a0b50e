package org.pofk.report;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import org.pofk.answer.DerivedOutput;
import org.pofk.answer.Passage;
import org.pofk.answer.PassageMoments;
import org.pofk.answer.Percentile;
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

/** Whether and when a set of states is first entered, as a document. */
public final class PassageDocument {
    /** Above so many states the table of all starts is left out. */
    private static final int STATES_AT_MOST = 40;
    private static final int LONGEST_FRACTION = 60;

    private final Chain chain;
    private final Passage passage;
    private final Style style;
    private final List<Block> blocks = new ArrayList<>();
    private final List<Proved> proofs = new ArrayList<>();

    private PassageDocument(Chain chain, Passage passage, Style style) {
        this.chain = chain;
        this.passage = passage;
        this.style = style;
    }

    /** @param chain with the start that was asked about */
    public static Document of(Model model, Chain chain, Passage passage, Style style) {
        PassageDocument document = new PassageDocument(chain, passage, style);
        document.blocks.addAll(ModelHead.of(model));
        document.blocks.add(new Heading(2, document.title()));
        document.write();
        document.blocks.add(Caution.of(model));
        return new Document(document.blocks);
    }

    /** The same as a part of a report. */
    public static ReportSection section(Chain chain, Passage passage, Style style) {
        PassageDocument document = new PassageDocument(chain, passage, style);
        document.write();
        Labelled key = new Labelled(Prose.of("first into ").and(document.names(passage.into()))
                .and(passage.avoiding().isEmpty() ? Prose.EMPTY
                        : Prose.of(", before ").and(document.names(passage.avoiding()))),
                Prose.of("from ").and(StartProse.of(chain)).and(": " + document.inBrief()));
        return new ReportSection(ReportSection.Place.RESULTS, document.title(), List.of(key), document.blocks,
                document.proofs, ReportSection.Standing.ANSWERED);
    }

    private Prose title() {
        return Prose.of("First passage into ").and(names(passage.into()));
    }

    /** That it isn't entered at all. */
    static String never(List<Integer> avoiding) {
        return "never: it can't be reached from there" + (avoiding.isEmpty() ? "" : " unless the wait has ended before");
    }

    /** Visits are counted after the wait has ended, too. */
    static String whatever(List<Integer> avoiding) {
        return avoiding.isEmpty() ? "" : ", whatever is entered before";
    }

    /** Whether and when, in a line. */
    private String inBrief() {
        PassageMoments moments = passage.moments();
        return moments.probability().isZero() ? never(passage.avoiding())
                : (moments.isCertain() ? "certain" : "with probability "
                        + number(moments.probability(), style) + "; given that it happens") + ", after "
                        + number(moments.mean().orElseThrow(), style) + " steps in the mean" + inBrief(passage.percentiles());
    }

    /** Those reached; the others have their reason in the section. */
    static String inBrief(List<Percentile> percentiles) {
        return percentiles.stream().filter(each -> each.k().isPresent())
                .map(each -> "; " + percent(each.p()) + " by k = " + each.k().getAsInt()).collect(Collectors.joining());
    }

    private void write() {
        blocks.add(new Paragraph(Prose.of("T is the first step k ≥ 0 at the end of which the chain is in ")
                .and(names(passage.into())).and(", from ").and(StartProse.of(chain))
                .and(passage.avoiding().isEmpty() ? Prose.EMPTY
                        : Prose.of("; entering ").and(names(passage.avoiding())).and(" first ends the wait"))
                .and(".")));
        moments();
        passage.percentiles().forEach(each -> label(percent(each.p()), percentile(each)));
        passage.settling().flatMap(settling -> settling.slowest()).ifPresent(slowest -> label("decay",
                "in the long run " + (passage.moments().isCertain() ? "P(T > k)" : "what P(T > k) is above its limit")
                        + " falls by the factor " + Decimals.of(slowest, style.digits()).text() + " a step"));
        passage.returns().ifPresent(this::returns);
        label("visits", passage.visits().map(visits -> number(visits) + " steps are expected to be spent there")
                .orElse("infinitely many steps are expected to be spent there") + whatever(passage.avoiding()));
        blocks.add(new Paragraph(Prose.of("The formulas are those of the chain stopped there: from ")
                .and(names(passage.into())).and(" it goes on to one more state and stays in it.")));
        formula("Law", "P(T = k)", passage.law());
        formula("Distribution", "P(T ≤ k)", passage.distribution());
        formula("Survival", "P(T > k)", passage.survival());
        passage.happening().ifPresent(happening -> {
            formula("Law, given that it happens", "P(T = k | T < ∞)", happening.law());
            formula("Distribution, given that it happens", "P(T ≤ k | T < ∞)", happening.distribution());
        });
        values();
        if (chain.size() <= STATES_AT_MOST) {
            fromEach();
        }
    }

    private Prose names(List<Integer> states) {
        return Prose.names(states.stream().map(chain.states()::get).toList());
    }

    private void label(String label, String text) {
        blocks.add(new Labelled(label, text));
    }

    private void moments() {
        PassageMoments moments = passage.moments();
        label("ever", moments.isCertain() ? "with probability 1"
                : moments.probability().isZero() ? never(passage.avoiding())
                : "with probability " + number(moments.probability()));
        if (moments.isCertain()) {
            label("mean", number(moments.mean().orElseThrow()));
            spread(moments, "");
        } else if (!moments.probability().isZero()) {
            label("mean", "infinite, since it may never happen; given that it does, "
                    + number(moments.mean().orElseThrow()));
            spread(moments, "given that it happens, ");
        }
    }

    private void spread(PassageMoments moments, String given) {
        Rational variance = moments.variance().orElseThrow();
        label("variance", given + number(variance) + (variance.isZero() ? "" : "; standard deviation "
                + Decimals.of(Enclosed.of(variance).map(ball -> ball.sqrt()), style.digits()).text()));
    }

    private String number(Rational value) {
        return number(value, style);
    }

    /** Exact as a fraction where its decimals don't say it all. */
    private static String number(Rational value, Style style) {
        if (value.toString().length() > LONGEST_FRACTION) {
            return new LongRunProse(style.digits()).number(value);
        }
        String decimals = ValueText.of(value, style.digits());
        return ValueText.isExact(value, style.digits()) ? decimals : value + " ≈ " + decimals;
    }

    static String percent(Rational share) {
        return Decimals.of(share.times(Rational.of(100)), 6).text() + " %";
    }

    static String percentile(Percentile percentile) {
        if (percentile.k().isPresent()) {
            return "has happened by k = " + percentile.k().getAsInt() + ", not before";
        }
        return switch (percentile.reason().orElseThrow()) {
            case NEVER -> "never: the probability stays below that";
            case BEYOND_TWO_BILLION_STEPS -> "not within two billion steps";
            case NOT_DECIDED -> "not decided: the probability comes too close to that at a step too far away";
        };
    }

    private void returns(Passage.Return back) {
        label("return", back.probability().isOne()
                ? "certain, after " + number(back.mean().orElseThrow()) + " steps in the mean"
                : back.probability().isZero() ? "never"
                : "with probability " + number(back.probability()) + "; given that, after "
                        + number(back.mean().orElseThrow()) + " steps in the mean");
    }

    private void formula(String title, String left, DerivedOutput output) {
        blocks.add(new Heading(3, title));
        blocks.addAll(ResultBlocks.proved(output, Prose.of(left), "states of the stopped chain", style));
        Proved.of(Prose.of(left + ", into ").and(names(passage.into())), passage.stopped(), "stopped chain", output)
                .ifPresent(proofs::add);
    }

    private void values() {
        List<Integer> steps = passage.law().values().stream().map(value -> value.k()).toList();
        if (!steps.isEmpty()) {
            blocks.add(Table.ofText("Step by step", List.of("k", "P(T = k)", "P(T ≤ k)", "hazard"),
                    IntStream.range(0, steps.size()).mapToObj(i -> List.of(String.valueOf(steps.get(i)),
                            ValueText.of(passage.law().values().get(i), style.digits()),
                            ValueText.of(passage.distribution().values().get(i), style.digits()),
                            i < passage.hazards().size() ? passage.hazards().get(i).value().map(value ->
                                    ValueText.of(value, style.digits())).orElse("–") : "–")).toList()));
        }
    }

    private void fromEach() {
        blocks.add(new Table(Prose.of("From each state"),
                List.of(Prose.of("from"), Prose.of("ever"), Prose.of("mean steps, where it happens")),
                IntStream.range(0, chain.size()).mapToObj(i -> List.of(Prose.name(chain.states().get(i)),
                        Prose.of(number(passage.fromEach().probabilities().get(i))),
                        Prose.of(passage.fromEach().means().get(i).map(this::number).orElse("–")))).toList()));
    }
}
