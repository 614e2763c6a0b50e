package org.pofk.report;

import java.util.ArrayList;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Collectors;
import org.pofk.chain.Model;
import org.pofk.claim.Claims;
import org.pofk.claim.Verdict;
import org.pofk.meaning.Carried;
import org.pofk.report.Document.Block;
import org.pofk.report.Document.Heading;
import org.pofk.report.Document.Items;
import org.pofk.report.Document.Labelled;
import org.pofk.report.Document.Paragraph;
import org.pofk.report.Document.Table;
import org.pofk.slip.Finding;
import org.pofk.slip.ReviewedClaims;

/** What was found when a derivation made by hand was checked, to be put into a review as it is. */
public final class ReviewDocument {
    private static final String LINE = "_".repeat(40);

    private final ReviewedClaims reviewed;
    private final ClaimsText text;
    private final String program;
    private final List<Block> blocks = new ArrayList<>();

    private ReviewDocument(ReviewedClaims reviewed, ClaimsText text, String program) {
        this.reviewed = reviewed;
        this.text = text;
        this.program = program;
    }

    /**
     * The whole review.
     *
     * @param text    of the claims file
     * @param program what checked it, {@code pofk 1.0}
     */
    public static Document of(ReviewedClaims reviewed, ClaimsText text, String program) {
        ReviewDocument document = new ReviewDocument(reviewed, text, program);
        document.write();
        return new Document(document.blocks);
    }

    /** The verdicts and what is found as a part of a report about the same model. */
    public static ReportSection section(ReviewedClaims reviewed, ClaimsText text, String program) {
        ReviewDocument document = new ReviewDocument(reviewed, text, program);
        document.review();
        document.verdicts();
        document.findings();
        document.notStated();
        return new ReportSection(ReportSection.Place.CHECKS, Prose.of("Check of a derivation made by hand"),
                List.of(new Labelled(Prose.of("check of ").andName(reviewed.claims().origin().file()),
                        document.summary())),
                document.blocks.stream().map(Document::lowered).toList(), standing(reviewed));
    }

    private static ReportSection.Standing standing(ReviewedClaims reviewed) {
        boolean isWrong = reviewed.findings().stream().anyMatch(finding -> finding.verdict() == Verdict.WRONG
                || finding.verdict() == Verdict.CARRIED);
        boolean isOpen = !reviewed.notReached().isEmpty() || reviewed.findings().stream()
                .anyMatch(finding -> finding.verdict() == Verdict.UNDECIDED);
        return isWrong ? ReportSection.Standing.CLAIM_WRONG
                : isOpen ? ReportSection.Standing.NOT_DECIDED : ReportSection.Standing.ANSWERED;
    }

    private void write() {
        head();
        verdicts();
        findings();
        notStated();
        signature();
        blocks.add(Caution.of(reviewed.claims().model()));
    }

    private void review() {
        Claims.Review review = reviewed.claims().review();
        label("document", review.document());
        label("revision", review.revision());
        label("author", review.author());
        label("reviewer", review.reviewer());
        label("date", review.date());
    }

    private void head() {
        Claims claims = reviewed.claims();
        Claims.Review review = claims.review();
        Model model = claims.model();
        blocks.add(new Heading(1, "Check of a derivation"));
        review();
        blocks.add(new Labelled("model", ClaimProse.text(model.title())));
        model.step().named().ifPresent(is -> blocks.add(new Labelled("step", Prose.name(is)
                .and(model.step().lasts().filter(lasts -> !lasts.equals(is))
                        .map(lasts -> Prose.of(", lasts ").andName(lasts)).orElse(Prose.EMPTY)))));
        review.carried().ifPresent(carried -> blocks.add(new Labelled("numbers", carried(carried))));
        blocks.add(new Labelled("claims file", file(claims.origin())));
        blocks.add(new Labelled("model file", file(model.origin())));
        blocks.add(new Labelled("checked by", Prose.name(program)));
    }

    private void label(String label, Optional<String> text) {
        text.ifPresent(written -> blocks.add(new Labelled(label, ClaimProse.text(written))));
    }

    private static String carried(Carried carried) {
        String digits = carried.unit() == Carried.Unit.DECIMALS ? "decimal" : "significant digit";
        return "carried to " + carried.count() + " " + digits + (carried.count() == 1 ? "" : "s");
    }

    private static Prose file(Model.Origin origin) {
        return Prose.name(origin.file()).and(", SHA-256 ").andName(origin.sha256());
    }

    private void verdicts() {
        blocks.add(new Heading(2, "Verdicts"));
        if (reviewed.findings().isEmpty()) {
            blocks.add(new Paragraph("No claims yet: the file states no step of a derivation."));
            return;
        }
        blocks.add(new Paragraph(summary()));
        if (!reviewed.notReached().isEmpty()) {
            blocks.add(new Paragraph("Stopped before " + (reviewed.notReached().size() == 1 ? "claim " : "claims ")
                    + reviewed.notReached().stream().map(claim -> String.valueOf(claim.number()))
                            .collect(Collectors.joining(", ")) + ": the budget was used up. Nothing is said of "
                    + (reviewed.notReached().size() == 1 ? "it." : "them.")));
        }
        boolean hasPlaces = reviewed.findings().stream().anyMatch(finding -> finding.claim().where().isPresent());
        boolean hasErrors = reviewed.findings().stream()
                .anyMatch(finding -> VerdictProse.largestError(finding).isPresent());
        List<Prose> header = new ArrayList<>(List.of(Prose.of("claim")));
        if (hasPlaces) {
            header.add(Prose.of("where"));
        }
        header.addAll(List.of(Prose.of("what it states"), Prose.of("verdict")));
        if (hasErrors) {
            header.add(Prose.of("largest error"));
        }
        blocks.add(new Table(Prose.EMPTY, header,
                reviewed.findings().stream().map(finding -> row(finding, hasPlaces, hasErrors)).toList()));
        wordsUsed().forEach(verdict ->
                blocks.add(new Labelled(VerdictProse.word(verdict), VerdictProse.meaning(verdict))));
    }

    private static List<Prose> row(Finding finding, boolean hasPlaces, boolean hasErrors) {
        List<Prose> row = new ArrayList<>(List.of(Prose.of(String.valueOf(finding.claim().number()))));
        if (hasPlaces) {
            row.add(finding.claim().where().map(ClaimProse::text).orElse(Prose.EMPTY));
        }
        row.add(ClaimProse.of(finding.claim()));
        row.add(Prose.of(VerdictProse.of(finding)));
        if (hasErrors) {
            row.add(Prose.of(VerdictProse.largestError(finding).orElse("")));
        }
        return row;
    }

    /** {@code Of 6 claims 3 are exact, 2 rounded, 1 wrong. The first that is wrong is claim 4, eq. (5).} */
    private Prose summary() {
        Map<Verdict, Integer> counts = new EnumMap<>(Verdict.class);
        reviewed.findings().forEach(finding -> counts.merge(finding.verdict(), 1, Integer::sum));
        int all = reviewed.findings().size();
        List<String> parts = new ArrayList<>();
        counts.forEach((verdict, count) -> parts.add(count + " " + VerdictProse.word(verdict)));
        return Prose.of((all == 1 ? "1 claim: " : all + " claims: ") + String.join(", ", parts) + ". ")
                .and(reviewed.firstWrong().map(first -> Prose.of("The first wrong step is ")
                        .and(ClaimProse.number(first.claim())).and(": ").and(ClaimProse.of(first.claim())).and("."))
                        .orElse(Prose.of(counts.containsKey(Verdict.UNDECIDED) ? "No step was found to be wrong."
                                : "No step is wrong.")));
    }

    private List<Verdict> wordsUsed() {
        return reviewed.findings().stream().map(Finding::verdict).distinct().sorted().toList();
    }

    private void findings() {
        List<Finding> told = reviewed.findings().stream().filter(ReviewDocument::needsWords).toList();
        if (!told.isEmpty()) {
            blocks.add(new Heading(2, "Findings"));
            told.forEach(finding -> blocks.addAll(FindingBlocks.of(finding, text)));
        }
    }

    /** All but those of which the table says everything. */
    private static boolean needsWords(Finding finding) {
        boolean isPlainlyRight = finding.verdict() == Verdict.EXACT || finding.verdict() == Verdict.ROUNDED;
        return !isPlainlyRight || !finding.judgement().remarks().isEmpty();
    }

    private void notStated() {
        if (!reviewed.notStated().isEmpty()) {
            blocks.add(new Heading(2, "Not checked"));
            blocks.add(new Paragraph("What the file doesn't state, and what was therefore not checked:"));
            blocks.add(new Items(reviewed.notStated().stream().map(Prose::of).toList()));
        }
    }

    private void signature() {
        blocks.add(new Heading(2, "Reviewed"));
        blocks.add(new Labelled("name", LINE));
        blocks.add(new Labelled("signature", LINE));
        blocks.add(new Labelled("date", LINE));
    }
}
