package org.pofk.cli;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.EnumSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.stream.Stream;
import org.pofk.answer.Deriving;
import org.pofk.chain.Chain;
import org.pofk.chain.Model;
import org.pofk.chain.ModelChanges;
import org.pofk.chain.Output;
import org.pofk.report.CsvWriter;
import org.pofk.report.DerivationTable;
import org.pofk.report.NotebookWriter;
import org.pofk.report.Provenance;
import org.pofk.report.Report;
import org.pofk.report.ReportDocument;
import org.pofk.report.ReportSection;
import org.pofk.report.Style;
import org.pofk.text.RefusedException;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Spec;

/** {@code pofk report MODEL}: the document to hand in. */
@Command(description = {"Writes the document to hand in: results first, then the whole derivation,",
    "worked, with figures, how it was checked, and what it stands on."})
final class ReportCommand implements Work {
    static final int REPORTED_UNASKED = 12;
    static final String CHANGES_NOT_REACHED = "pofk: what has changed was not reached within the budget";

    @Spec
    private CommandSpec command;

    @Mixin
    private AnswerOptions options = new AnswerOptions(CommandName.REPORT, Format.CSV, Format.NOTEBOOK);

    @Option(names = "--of", paramLabel = "NAME",
            description = "an output, a set or a state; repeatable; 'all' for every state")
    private List<String> of = new ArrayList<>();

    @Option(names = "--at", paramLabel = "STEPS", converter = StepList.Converter.class, defaultValue = "0..10,20,50",
            description = {"the steps of the table of values; ${DEFAULT-VALUE}",
                    "otherwise, and later ones where it settles later"})
    private StepList at;

    @Option(names = "--show", paramLabel = "DEPTH", defaultValue = "full",
            description = "brief or full; ${DEFAULT-VALUE} otherwise")
    private Report.Depth show;

    @Mixin
    private ConditionOptions conditions = new ConditionOptions();

    @Mixin
    private PassageOptions passage = new PassageOptions();

    @Mixin
    private TotalSections totals = new TotalSections();

    @Mixin
    private GivenOptions given = new GivenOptions();

    @Mixin
    private ClaimsOptions claims = new ClaimsOptions();

    @Mixin
    private SinceOptions since = new SinceOptions();

    @Override
    public ExitCode run(Streams streams) throws RefusedException, UsageException, WritingException {
        Style style = options.style();
        Destination destination = options.destination();
        List<Model> models = since.models(options);
        Model read = models.get(0);
        requireFew(read.chain());
        AskedReport asked = asked(read, style);
        Optional<AskedReport> earlier = models.size() == 1 ? Optional.empty()
                : Optional.of(earlier(models.get(1), read, style));
        Provenance provenance = provenance(Stream.concat(asked.files(), earlier.stream().flatMap(AskedReport::files)));
        if (read.schedule().isPresent()) {
            return ScheduledReporting.write(options, asked, earlier, show, provenance, destination, streams);
        }
        Worker.Outcome<Report> outcome = options.within(streams, published -> {
            Report report = asked.find(provenance, published);
            earlier.ifPresent(each -> each.at(report.derived().wanted().at()).find(provenance,
                    found -> published.accept(report.since(found))));
        });
        if (outcome.published().isEmpty()) {
            return options.undecided(streams);
        }
        Report report = outcome.published().get();
        if (earlier.isPresent() && report.since().isEmpty()) {
            streams.notes().println(CHANGES_NOT_REACHED);
        }
        destination.write(Answer.of(() -> ReportDocument.of(report, show, style, options.convention(read)))
                .with(Format.CSV, () -> CsvWriter.write(DerivationTable.of(report.derived(), style.digits())))
                .with(Format.NOTEBOOK, () -> NotebookWriter.write(report, show, style,
                        options.convention(read))), streams);
        return code(report.answers(), outcome.finished() && report.derived().isDecided());
    }

    /** Everything a report can say besides what is derived; an answer more is a line more. */
    private List<AskedSection> sections(Model read, List<Output> outputs, Style style)
            throws RefusedException, UsageException {
        return Stream.of(conditions.sections(read, outputs, style),
                passage.sections(read, at.steps(), style),
                totals.sections(read, at.steps(), style),
                given.sections(read, outputs, at.steps(), style),
                claims.sections(read, options.settings())).flatMap(List::stream).toList();
    }

    private void requireFew(Chain chain) throws UsageException {
        if (chain.size() > REPORTED_UNASKED && chain.outputs().isEmpty() && of.isEmpty()) {
            throw new UsageException("what is the report to be about? The model names no outputs and has "
                    + chain.size() + " states; name those that matter with --of STATE or --of SET");
        }
    }

    private AskedReport asked(Model read, Style style) throws RefusedException, UsageException {
        List<Output> outputs = AskedOutputs.of(read.chain(), of);
        return new AskedReport(read, outputs, sections(read, outputs, style), at.steps(), reach(), extras());
    }

    /** The same of the model of an earlier issue, as far as it can be asked of that; states by their later names. */
    private AskedReport earlier(Model model, Model later, Style style) throws RefusedException, UsageException {
        Chain chain = ModelChanges.of(model, later).renamed(model.chain());
        List<Output> outputs = AskedOutputs.thoseOf(chain, of);
        List<AskedSection> sections = new ArrayList<>(conditions.sections(model, outputs, style));
        sections.addAll(whereAsked(() -> passage.sections(model.with(chain), at.steps(), style)));
        sections.addAll(whereAsked(() -> totals.sections(model.with(chain), at.steps(), style)));
        sections.addAll(whereAsked(() -> given.sections(model.with(chain), outputs, at.steps(), style)));
        sections.addAll(whereAsked(() -> claims.sections(model, options.settings())));
        return new AskedReport(model, outputs, sections, at.steps(), reach(), extras());
    }

    /** None about names that the earlier model doesn't have, or by a derivation that is about the later one. */
    private static List<AskedSection> whereAsked(SettingOptions.FileReading<List<AskedSection>> sections)
            throws RefusedException {
        try {
            return sections.read();
        } catch (UsageException notOfThatModel) {
            return List.of();
        }
    }

    private Provenance provenance(Stream<Model.Origin> files) {
        return new Provenance(VersionCommand.program(), TypedLine.of("report", command.commandLine().getParseResult()
                .originalArgs()), files.distinct().toList());
    }

    private AskedReport.Reach reach() {
        return command.commandLine().getParseResult().hasMatchedOption("--at") ? AskedReport.Reach.AS_LISTED
                : AskedReport.Reach.UNTIL_SETTLED;
    }

    private Set<Deriving.Extra> extras() {
        return show == Report.Depth.BRIEF ? Set.of() : EnumSet.of(Deriving.Extra.COMPARISON, Deriving.Extra.POLE_CHECK,
                Deriving.Extra.SECOND_OPINION);
    }

    /** @param isDecided whether all that is derived is */
    static ExitCode code(List<ReportSection> answers, boolean isDecided) {
        Optional<ReportSection.Standing> worst = answers.stream().map(ReportSection::standing)
                .max(Comparator.naturalOrder());
        if (worst.equals(Optional.of(ReportSection.Standing.CLAIM_WRONG))) {
            return ExitCode.CLAIM_WRONG;
        }
        return isDecided && !worst.equals(Optional.of(ReportSection.Standing.NOT_DECIDED))
                ? ExitCode.ANSWERED : ExitCode.NOT_DECIDED;
    }
}
