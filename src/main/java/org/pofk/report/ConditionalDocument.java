package org.pofk.report;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.IntStream;
import org.pofk.answer.Conditional;
import org.pofk.answer.ConditionalModel;
import org.pofk.answer.DerivedOutput;
import org.pofk.answer.Given;
import org.pofk.chain.Model;
import org.pofk.chain.Output;
import org.pofk.exact.Rational;
import org.pofk.report.Document.Block;
import org.pofk.report.Document.Heading;
import org.pofk.report.Document.Labelled;
import org.pofk.report.Document.Paragraph;
import org.pofk.report.Document.Table;
import org.pofk.steps.PossibleSteps;

/** Outputs given what is known at the same step, as a document: quotients of formulas that are shown and proved. */
public final class ConditionalDocument {
    static final String EXCLUDED = "0 wherever it is defined: what is given excludes it";

    private final ConditionalModel found;
    private final Style style;
    private final Prose given;
    private final List<Block> blocks = new ArrayList<>();
    private final List<Proved> proofs = new ArrayList<>();

    private ConditionalDocument(ConditionalModel found, Style style) {
        this.found = found;
        this.style = style;
        this.given = GivenProse.of(found.given(), "k");
    }

    public static Document of(ConditionalModel found, Style style) {
        ConditionalDocument document = new ConditionalDocument(found, style);
        document.blocks.addAll(ModelHead.of(found.model()));
        document.write();
        document.blocks.add(Caution.of(found.model()));
        return new Document(document.blocks);
    }

    /** The same as a part of a report. */
    public static ReportSection section(ConditionalModel found, Style style) {
        ConditionalDocument document = new ConditionalDocument(found, style);
        document.write();
        List<Labelled> key = found.outputs().stream()
                .filter(output -> !isExcluded(output.joint().output()))
                .flatMap(output -> output.longRun().stream().map(longRun ->
                new Labelled(Prose.name(output.joint().output().name()).and(", given ").and(document.given),
                        Prose.of("long run: ").and(new ConditionalLongRunProse(style.digits()).of(longRun))))).toList();
        return new ReportSection(ReportSection.Place.RESULTS, title(found.given()), key,
                document.blocks.stream().map(Document::lowered).toList(), document.proofs,
                found.isDecided() ? ReportSection.Standing.ANSWERED : ReportSection.Standing.NOT_DECIDED);
    }

    /** Of the section of a report. */
    public static Prose title(Given given) {
        return Prose.of("Given ").and(GivenProse.of(given, "k"));
    }

    /** What is given has probability zero at the step: nothing follows from it. */
    public static Document ofNothing(Model model, Given given, int at) {
        List<Block> blocks = new ArrayList<>(ModelHead.of(model));
        blocks.add(new Paragraph(Prose.of("Given ").and(GivenProse.of(given, "step " + at)).and(
                ": that has probability zero, proved, so nothing is defined given it.")));
        return new Document(blocks);
    }

    private void write() {
        if (found.possible().filter(PossibleSteps::isNever).isPresent()) {
            blocks.add(new Labelled("defined", GivenProse.NEVER));
            return;
        }
        found.outputs().forEach(this::output);
        if (found.outputs().stream().allMatch(each -> isExcluded(each.joint().output()))) {
            return;
        }
        blocks.addAll(ResultBlocks.of(found.event(), new Heading(2, Prose.of("D(k) = P(").and(given).and(")")),
                Prose.of("D(k)"), style));
        proved(Prose.of("D(k) = P(").and(given).and(")"), found.event());
        values();
    }

    private void output(Conditional output) {
        Output asked = output.joint().output();
        blocks.add(new Heading(2, OutputProse.title(asked).and(", given ").and(given)));
        if (isExcluded(asked)) {
            label("is", Prose.of(EXCLUDED));
            defined();
            return;
        }
        label("is", quotient(found.model().chain().outputs().stream().filter(each -> each.name().equals(asked.name()))
                .findFirst().orElse(asked), given));
        defined();
        output.longRun().ifPresent(longRun -> label("long run", new ConditionalLongRunProse(style.digits()).of(longRun)));
        Prose title = Prose.of("N(k) for ").andName(asked.name());
        blocks.addAll(ResultBlocks.of(output.joint(), new Heading(3, title), Prose.of("N(k)"), style));
        proved(title.and(", given ").and(given), output.joint());
    }

    private void defined() {
        label("defined", Prose.of(found.possible().map(GivenProse::impossible)
                .orElse("wherever D(k) isn't zero; which steps these are repeats too late to be listed")));
    }

    /** Whether it is zero in all states in which what is given holds. @param joint the quotient's numerator */
    static boolean isExcluded(Output joint) {
        return joint.coefficients().stream().allMatch(Rational::isZero);
    }

    private void proved(Prose title, DerivedOutput output) {
        Proved.of(title, found.given().chain(found.model().chain()),
                found.given().never().isEmpty() ? "model" : "stopped chain", output).ifPresent(proofs::add);
    }

    /** What is divided by what. */
    static Prose quotient(Output asked, Prose given) {
        return isShare(asked)
                ? Prose.of("N(k)/D(k): the probability of ").andName(asked.name()).and(" at k together with ").and(given)
                        .and(", over that of ").and(given)
                : Prose.of("N(k)/D(k): the mean of ").andName(asked.name()).and(" at k, counted where ").and(given)
                        .and(", over the probability of that");
    }

    private static boolean isShare(Output output) {
        return output.coefficients().stream().allMatch(value -> value.isZero() || value.isOne());
    }

    private void label(String label, Prose text) {
        blocks.add(new Labelled(label, text));
    }

    private void values() {
        if (found.outputs().isEmpty() || found.outputs().get(0).values().isEmpty()) {
            return;
        }
        List<Prose> header = new ArrayList<>(List.of(Prose.of("k")));
        found.outputs().forEach(output -> header.add(Prose.name(output.joint().output().name())));
        List<Conditional.At> first = found.outputs().get(0).values();
        blocks.add(new Table(Prose.of("Values at the end of step k, given that"), header,
                IntStream.range(0, first.size()).mapToObj(row -> {
                    List<Prose> cells = new ArrayList<>(List.of(Prose.of(String.valueOf(first.get(row).k()))));
                    found.outputs().forEach(output -> cells.add(Prose.of(output.values().get(row).value()
                            .map(value -> ValueText.of(value, style.digits())).orElse("–"))));
                    return cells;
                }).toList()));
    }
}
