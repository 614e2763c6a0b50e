package org.pofk.report;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.pofk.answer.Peak;
import org.pofk.answer.When;
import org.pofk.answer.WhenModel;
import org.pofk.chain.Output;
import org.pofk.exact.Decimals;
import org.pofk.exact.Rational;
import org.pofk.report.Document.Block;
import org.pofk.report.Document.Heading;
import org.pofk.report.Document.Labelled;
import org.pofk.report.Document.Table;

/** When outputs meet a condition, as a document. */
public final class WhenDocument {
    private static final int LONGEST_FRACTION = 60;

    private final WhenModel found;
    private final Style style;
    private final List<Block> blocks = new ArrayList<>();

    private WhenDocument(WhenModel found, Style style) {
        this.found = found;
        this.style = style;
    }

    public static Document of(WhenModel found, Style style) {
        WhenDocument document = new WhenDocument(found, style);
        document.blocks.addAll(ModelHead.of(found.model()));
        found.answers().forEach(answer -> {
            document.blocks.add(new Heading(2, OutputProse.title(answer.output())));
            document.answer(answer);
        });
        document.blocks.add(Caution.of(found.model()));
        return new Document(document.blocks);
    }

    /** The same as a part of a report. */
    public static ReportSection section(WhenModel found, Style style) {
        WhenDocument document = new WhenDocument(found, style);
        List<Labelled> key = new ArrayList<>();
        found.answers().forEach(answer -> {
            if (found.answers().size() > 1) {
                document.blocks.add(new Heading(3, OutputProse.title(answer.output())));
            }
            document.met(answer);
            if (answer.when().classes().size() > 1 || answer.around().size() > 1) {
                document.steps(answer);
            }
            key.add(keyFigure(answer.output(), answer.when(), style));
        });
        return new ReportSection(ReportSection.Place.RESULTS, Prose.of(title(found.asked(), style)), key, document.blocks,
                found.isDecided() ? ReportSection.Standing.ANSWERED : ReportSection.Standing.NOT_DECIDED);
    }

    /** What is asked of all outputs. */
    public static String title(WhenModel.Asked asked, Style style) {
        String bound = asked.relative() ? percent(asked.bound()) + " of the long run" : number(asked.bound(), style);
        return "When p(k) is " + switch (asked.kind()) {
            case AT_LEAST -> "not below " + bound;
            case AT_MOST -> "not above " + bound;
            case SETTLED -> asked.relative() ? "within " + bound : "within " + bound + " of its long run";
        };
    }

    private static String percent(Rational share) {
        return Decimals.of(share.times(Rational.of(100)), 6).text() + " %";
    }

    private void answer(WhenModel.Answer answer) {
        met(answer);
        longRun(answer);
        steps(answer);
    }

    private void met(WhenModel.Answer answer) {
        label("asked", asked(answer.when().condition()));
        partOfNothing(answer.when()).ifPresent(blocks::add);
        label("answer", inWords(answer.when()));
        answer.nearest().ifPresent(peak -> label("nearest", nearest(peak, answer.when().condition())));
        answer.when().first().ifPresent(first -> label("first", "k = " + first));
        answer.when().forEverFrom().ifPresent(from -> label("for ever", "from k = " + from + " on"));
    }

    private void longRun(WhenModel.Answer answer) {
        label("long run", new LongRunProse(style.digits()).of(answer.longRun()));
        answer.settling().ifPresent(settling ->
                label("settles", SettlingProse.of(settling, answer.longRun(), style.digits())));
        answer.settling().flatMap(settling -> SettlingProse.slowest(settling, style.digits()))
                .ifPresent(slowest -> label("slowest part", slowest));
    }

    private void steps(WhenModel.Answer answer) {
        if (answer.when().classes().size() > 1) {
            blocks.add(ResidueTable.of(answer.when().classes()));
        }
        if (!answer.around().isEmpty()) {
            blocks.add(Table.ofText("Values there", List.of("k", answer.output().name() + "(k)"),
                    answer.around().stream().map(value -> List.of(String.valueOf(value.k()),
                            ValueText.of(value, style.digits()))).toList()));
        }
    }

    private void label(String label, String text) {
        blocks.add(new Labelled(label, text));
    }

    /** That a part of a long run of zero is no distance. */
    static Optional<Labelled> partOfNothing(When when) {
        boolean isNothing = when.condition().kind() == When.Condition.Kind.SETTLED && when.condition().bound().isZero();
        return isNothing && when.reason() != When.Reason.NO_LONG_RUN
                ? Optional.of(new Labelled("beware", "the long run is 0, and so is every part of it: met only where p(k)"
                        + " is 0 itself; ask for a distance, as with --settles-within 1e-6"))
                : Optional.empty();
    }

    private String asked(When.Condition condition) {
        return asked(condition, style);
    }

    static String asked(When.Condition condition, Style style) {
        return switch (condition.kind()) {
            case AT_LEAST -> "not below " + number(condition.bound(), style);
            case AT_MOST -> "not above " + number(condition.bound(), style);
            case SETTLED -> "within " + number(condition.bound(), style) + " of its long run";
        };
    }

    /** Exact as a fraction where its decimals don't say it all. */
    private String number(Rational value) {
        return number(value, style);
    }

    private static String number(Rational value, Style style) {
        if (value.toString().length() > LONGEST_FRACTION) {
            return new LongRunProse(style.digits()).number(value);
        }
        return Decimals.of(value, style.digits()).exact() ? Decimals.of(value, style.digits()).text()
                : value + " ≈ " + Decimals.of(value, style.digits()).text();
    }

    private String nearest(Peak peak, When.Condition condition) {
        String value = peak.value().exact().map(this::number)
                .orElseGet(() -> ValueText.of(peak.value(), style.digits()));
        return (condition.kind() == When.Condition.Kind.AT_LEAST ? "the highest value is " : "the lowest value is ")
                + value + peak.at().map(k -> ", at k = " + k).orElse(", approached as k grows");
    }

    /** What is asked of an output, and the answer in a line. */
    static Labelled keyFigure(Output output, When when, Style style) {
        return new Labelled(Prose.name(output.name()).and(" " + asked(when.condition(), style)),
                Prose.of(inBrief(when)));
    }

    /** With the step, in a line. */
    static String inBrief(When when) {
        boolean isForEver = when.forEverFrom().isPresent() && when.forEverFrom().get() > 0;
        return isForEver ? "for ever from k = " + when.forEverFrom().get() + " on"
                + (when.first().equals(when.forEverFrom()) ? ", not before"
                        : when.first().map(first -> "; first at k = " + first).orElse(""))
                : inWords(when) + when.first().filter(first -> when.forEverFrom().isEmpty())
                        .map(first -> "; first at k = " + first).orElse("");
    }

    static String inWords(When when) {
        return switch (when.reason()) {
            case FOR_EVER -> when.forEverFrom().equals(Optional.of(0L)) ? "at every step"
                    : when.first().equals(when.forEverFrom()) ? "from a step on for ever; not before"
                    : "from a step on for ever; now and then before";
            case ONLY_IN_SOME_CLASSES -> "for ever only " + ResidueTable.met(when.classes());
            case AGAIN_AND_AGAIN -> "met and missed again and again, for ever";
            case ONLY_FOR_A_WHILE -> "only for a while: from some step on never again";
            case NEVER -> "never, proved for every k";
            case NOTHING_DEFINED -> "none: nothing is defined, as what is given has probability zero at every step,"
                    + " proved";
            case NO_LONG_RUN -> "not decided: there is neither a limit nor a cycle to compare with";
            case APPROACH_NOT_DECIDED -> "not decided: the value asked for is the long run itself, and nothing known"
                    + " decides from which side it is approached in the end";
            case TOO_MANY_STEPS -> "not decided: too many steps would have to be looked at";
        };
    }
}
