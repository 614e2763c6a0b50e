package org.pofk.cli;

import java.nio.file.Path;
import java.util.Optional;
import org.pofk.chain.Model;
import org.pofk.claim.Claims;
import org.pofk.claim.Verdict;
import org.pofk.input.ClaimsReader;
import org.pofk.input.ModelReader;
import org.pofk.input.ModelVariants;
import org.pofk.input.Overrides;
import org.pofk.input.Source;
import org.pofk.report.BlankClaims;
import org.pofk.report.ClaimsText;
import org.pofk.report.CsvWriter;
import org.pofk.report.ReviewDocument;
import org.pofk.report.VerdictsJson;
import org.pofk.report.VerdictsTable;
import org.pofk.slip.ReviewedClaims;
import org.pofk.slip.Reviewing;
import org.pofk.slip.Variants;
import org.pofk.text.RefusedException;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

/** {@code pofk check CLAIMS}: a derivation made by hand, held against the exact one. */
@Command(description = {"Checks a derivation made by hand, step by step, against the exact one: which",
    "steps are right, which are wrong, where, and by which slip."})
final class CheckCommand implements Work {
    @Parameters(paramLabel = "CLAIMS", description = "a claims file (YAML or JSON); the model it names lies beside it")
    private Path file;

    @Option(names = "--blank",
            description = "writes an empty claims file instead, to be filled in, for the MODEL named in place of CLAIMS")
    private boolean blank;

    @Mixin
    private SettingOptions settings = new SettingOptions();

    @Mixin
    private WritingOptions writing = new WritingOptions(CommandName.CHECK, Format.JSON, Format.CSV);

    @Mixin
    private RunOptions run;

    @Override
    public ExitCode run(Streams streams) throws RefusedException, UsageException, WritingException {
        return blank ? writeBlank(streams) : check(streams);
    }

    private ExitCode writeBlank(Streams streams) throws RefusedException, UsageException, WritingException {
        SaveOptions save = writing.destinationOfYaml("an empty claims file");
        Overrides overrides = settings.overrides();
        Model model = ScheduleRefusal.unlessScheduled(settings.read(() -> ModelReader.read(file, overrides)));
        save.write(BlankClaims.of(model, fromClaims(save)), streams);
        return ExitCode.ANSWERED;
    }

    /** The model's file as the claims file must name it: from where that is to be saved. */
    private String fromClaims(SaveOptions save) {
        return save.file().flatMap(saved -> Optional.ofNullable(saved.toAbsolutePath().getParent()))
                .map(folder -> folder.normalize().relativize(file.toAbsolutePath().normalize()).toString())
                .orElse(file.toString()).replace('\\', '/');
    }

    private ExitCode check(Streams streams) throws RefusedException, UsageException, WritingException {
        Destination destination = writing.destination(file);
        Source source = Source.read(file);
        Overrides overrides = settings.overrides();
        Claims claims = settings.read(() ->
                ClaimsReader.read(source, Optional.ofNullable(file.getParent()), overrides));
        ScheduleRefusal.unlessScheduled(claims.model());
        Variants variants = ModelVariants.of(claims, overrides);
        Worker.Outcome<ReviewedClaims> outcome = run.within(streams, published ->
                published.accept(Reviewing.of(claims, variants, published)));
        if (outcome.published().isEmpty()) {
            return run.undecided(streams);
        }
        ReviewedClaims reviewed = outcome.published().get();
        destination.write(Answer.of(() -> ReviewDocument.of(reviewed, ClaimsText.of(source.text()),
                VersionCommand.program())).with(Format.JSON, () -> VerdictsJson.write(reviewed))
                .with(Format.CSV, () -> CsvWriter.write(VerdictsTable.of(reviewed))), streams);
        return code(reviewed, outcome.finished());
    }

    private static ExitCode code(ReviewedClaims reviewed, boolean finished) {
        if (reviewed.findings().stream().anyMatch(finding -> finding.verdict() == Verdict.WRONG
                || finding.verdict() == Verdict.CARRIED)) {
            return ExitCode.CLAIM_WRONG;
        }
        return finished && reviewed.findings().stream().noneMatch(finding -> finding.verdict() == Verdict.UNDECIDED)
                ? ExitCode.ANSWERED : ExitCode.NOT_DECIDED;
    }
}
