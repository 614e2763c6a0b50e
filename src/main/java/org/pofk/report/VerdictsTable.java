package org.pofk.report;

import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.OptionalLong;
import java.util.stream.Collectors;
import org.pofk.claim.Judgement.Difference;
import org.pofk.slip.Finding;
import org.pofk.slip.ReviewedClaims;

/** What is true of the steps of a derivation made by hand, a row for each. */
public final class VerdictsTable {
    private VerdictsTable() {
    }

    public static Document.Table of(ReviewedClaims reviewed) {
        Rows rows = new Rows(0, Rows.words("number", "where", "kind", "of", "verdict", "carried from",
                "largest difference", "difference is", "first wrong step", "slips", "right"));
        reviewed.findings().forEach(finding -> rows.add(claim(finding), judgement(finding)));
        return rows.table();
    }

    private static List<Prose> claim(Finding finding) {
        return List.of(Prose.of(String.valueOf(finding.claim().number())),
                finding.claim().where().map(Prose::name).orElse(Prose.EMPTY), Prose.of(finding.claim().kind()),
                Prose.name(finding.claim().of()), Prose.of(word(finding.verdict())),
                Prose.of(finding.carriedFrom().isPresent() ? String.valueOf(finding.carriedFrom().getAsInt()) : ""));
    }

    private static List<Prose> judgement(Finding finding) {
        Optional<Difference> difference = finding.judgement().difference();
        OptionalLong wrong = finding.judgement().firstWrongStep();
        return List.of(Prose.of(difference.map(found -> found.size().text()).orElse("")),
                Prose.of(difference.map(found -> found.relative() ? "relative" : "absolute").orElse("")),
                Prose.of(wrong.isPresent() ? String.valueOf(wrong.getAsLong()) : ""),
                Prose.name(finding.slips().stream().map(slip -> word(slip.kind()) + ": " + slip.found() + " for "
                        + slip.right()).collect(Collectors.joining("; "))),
                Prose.name(finding.judgement().right()));
    }

    private static String word(Enum<?> constant) {
        return constant.name().toLowerCase(Locale.ROOT).replace('_', ' ');
    }
}
