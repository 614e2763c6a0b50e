package org.pofk.cli;

import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import org.pofk.chain.Model;
import org.pofk.claim.Claims;
import org.pofk.input.ClaimsReader;
import org.pofk.input.ModelVariants;
import org.pofk.input.Overrides;
import org.pofk.input.Source;
import org.pofk.report.ClaimsText;
import org.pofk.report.Prose;
import org.pofk.report.ReportSection;
import org.pofk.report.ReviewDocument;
import org.pofk.slip.Reviewing;
import org.pofk.slip.Variants;
import org.pofk.text.RefusedException;
import picocli.CommandLine.Option;

/** A derivation made by hand whose verdicts stand in a report. */
final class ClaimsOptions {
    @Option(names = "--claims", paramLabel = "FILE",
            description = "a claims file about the model; what is true of each claim is said in the report")
    private Optional<Path> file = Optional.empty();

    /** What a report says of them; the claims are about the model that is read, or that is a wrong usage. */
    List<AskedSection> sections(Model read, SettingOptions settings) throws RefusedException, UsageException {
        if (file.isEmpty()) {
            return List.of();
        }
        if (read.schedule().isPresent()) {
            throw new UsageException("'" + read.origin().file() + "' has a schedule: claims are judged of a model that"
                    + " moves by one matrix alone; leave --claims out, and compare by hand with what the report states");
        }
        Source source = Source.read(file.get());
        Overrides overrides = settings.overrides();
        Claims claims = settings.read(() ->
                ClaimsReader.read(source, Optional.ofNullable(file.get().getParent()), overrides));
        if (!claims.model().origin().sha256().equals(read.origin().sha256())) {
            throw new UsageException("'" + file.get() + "' is about another model, '" + claims.model().origin().file()
                    + "', than this report, '" + read.origin().file() + "'");
        }
        Variants variants = ModelVariants.of(claims, overrides);
        return List.of(new AskedSection(ReportSection.Place.CHECKS,
                Prose.of("Check of a derivation made by hand"), List.of(claims.origin()),
                () -> ReviewDocument.section(Reviewing.of(claims, variants, partly -> { }),
                        ClaimsText.of(source.text()), VersionCommand.program())));
    }
}
