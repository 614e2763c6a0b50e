package org.pofk.report;

import java.util.ArrayList;
import java.util.List;
import org.pofk.claim.AnswerOf;
import org.pofk.claim.Claim;
import org.pofk.claim.FormulaText;
import org.pofk.claim.FoundAndRight;
import org.pofk.claim.Judgement;
import org.pofk.claim.Judgement.JudgedNumber;
import org.pofk.claim.Statement;
import org.pofk.claim.Verdict;
import org.pofk.meaning.Fit;
import org.pofk.report.Document.Block;
import org.pofk.report.Document.Heading;
import org.pofk.report.Document.Labelled;
import org.pofk.report.Document.Paragraph;
import org.pofk.report.Document.Table;
import org.pofk.slip.Finding;
import org.pofk.slip.Slip;
import org.pofk.slip.SlipKind;
import org.pofk.text.Span;

/** What is said of one claim that isn't plainly exact. */
final class FindingBlocks {
    private static final int MARKED_AT_MOST = 3;

    private final Finding finding;
    private final ClaimsText text;
    private final List<Block> blocks = new ArrayList<>();

    private FindingBlocks(Finding finding, ClaimsText text) {
        this.finding = finding;
        this.text = text;
    }

    static List<Block> of(Finding finding, ClaimsText text) {
        FindingBlocks findings = new FindingBlocks(finding, text);
        findings.write();
        return findings.blocks;
    }

    private void write() {
        Claim claim = finding.claim();
        Judgement judgement = finding.judgement();
        blocks.add(new Heading(3, Prose.of("Claim " + claim.number()).and(ClaimProse.place(claim)).and(": ")
                .and(ClaimProse.of(claim))));
        blocks.add(new Labelled("verdict", VerdictProse.explained(finding)));
        claim.within().ifPresent(within -> blocks.add(new Labelled("claimed", VerdictProse.claimed(within, claim))));
        if (!slipSaysAll()) {
            judgement.remarks().forEach(remark -> blocks.add(new Labelled("remark", remark)));
        }
        claim.note().ifPresent(note -> blocks.add(new Labelled("note", ClaimProse.text(note))));
        finding.rest().ifPresent(rest -> blocks.add(new Labelled("unexplained", rest)));
        slips();
        if (finding.verdict() == Verdict.WRONG && finding.slips().isEmpty()) {
            wrongNumbers();
        }
        right();
    }

    /** What is said entry by entry of a matrix says nothing more where it is turned. */
    private boolean slipSaysAll() {
        return finding.claim().statement() instanceof Statement.Matrix && !finding.slips().isEmpty()
                && finding.slips().get(0).kind() == SlipKind.MATRIX_TRANSPOSED;
    }

    private void slips() {
        List<Slip> slips = finding.slips();
        if (slips.size() > 1) {
            blocks.add(new Paragraph(finding.together()
                    ? "These " + slips.size() + " slips together explain it; with all of them undone the claim is right."
                    : "Each of these " + slips.size() + " slips alone would explain it, the simplest first."));
        }
        for (int i = 0; i < slips.size(); i++) {
            slip(slips.get(i), slips.size() > 1 ? "Slip " + (i + 1) + ": " : "Slip: ");
        }
    }

    private void slip(Slip slip, String label) {
        blocks.add(new Paragraph(label + words(slip.kind()) + ", " + place(slip.span())));
        blocks.add(text.excerpt(slip.span(), finding.claim()));
        if (!slip.found().isBlank()) {
            blocks.add(new Labelled("found", ClaimProse.text(slip.found())));
        }
        if (!slip.right().isBlank()) {
            blocks.add(new Labelled(slip.found().isBlank() ? "add" : "right", ClaimProse.text(slip.right())));
        }
        if (!finding.together()) {
            blocks.add(new Labelled("corrected", ClaimProse.text(slip.corrected())));
        }
    }

    /** A number that stands alone is no coefficient. */
    private String words(SlipKind kind) {
        Statement statement = finding.claim().statement();
        boolean isAlone = statement instanceof Statement.Value || statement instanceof Statement.Bound
                || statement instanceof AnswerOf;
        return isAlone && kind == SlipKind.WRONG_COEFFICIENT ? "the number is wrong" : kind.inWords();
    }

    /** Where no slip says which number is wrong: in their line while they are few, in a table otherwise. */
    private void wrongNumbers() {
        List<JudgedNumber> wrong = finding.judgement().numbers().stream()
                .filter(number -> number.fit() == Fit.WRONG).toList();
        if (wrong.size() > MARKED_AT_MOST) {
            blocks.add(new Table(Prose.EMPTY, List.of(Prose.of("found"), Prose.of("right"), Prose.of("place")),
                    wrong.stream().map(number -> List.of(Prose.name(shown(number).found()),
                            Prose.name(shown(number).right()),
                            Prose.of(place(number.written().span())))).toList()));
            return;
        }
        for (JudgedNumber number : wrong) {
            blocks.add(new Paragraph("A number is wrong, " + place(number.written().span())));
            blocks.add(text.excerpt(number.written().span(), finding.claim()));
            blocks.add(new Labelled("found", Prose.name(shown(number).found())));
            blocks.add(new Labelled("right", Prose.name(shown(number).right())));
        }
    }

    private FoundAndRight shown(JudgedNumber number) {
        return FoundAndRight.of(number, StatedFormulas.of(finding.claim().statement()));
    }

    private static String place(Span span) {
        return "line " + span.start().line() + ", column " + span.start().column();
    }

    private boolean isWrong() {
        return finding.verdict() == Verdict.WRONG || finding.verdict() == Verdict.CARRIED;
    }

    /** The right statement, unless a slip or its one number has shown it. */
    private void right() {
        String right = finding.judgement().right();
        Statement statement = finding.claim().statement();
        boolean isOneNumber = (statement instanceof Statement.Value || statement instanceof AnswerOf)
                && finding.verdict() == Verdict.WRONG
                && finding.judgement().numbers().stream().anyMatch(number -> number.fit() == Fit.WRONG);
        boolean isShown = !finding.slips().isEmpty() && !finding.together();
        if (right.isBlank() || isShown || isOneNumber) {
            return;
        }
        if (finding.verdict() == Verdict.APPROXIMATE) {
            blocks.add(new Labelled("true value", ClaimProse.text(right)));
        } else if (isWrong()) {
            List<FormulaText> stated = StatedFormulas.of(finding.claim().statement());
            if (finding.slips().isEmpty() && stated.size() == 1) {
                blocks.add(new Labelled("stated", ClaimProse.text(stated.get(0).text())));
            }
            blocks.add(new Labelled(finding.slips().isEmpty() ? "should read" : "corrected", ClaimProse.text(right)));
        }
    }
}
