package org.pofk.slip;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import org.pofk.text.Span;

/**
 * Which of the explanations found are told, simplest first: a number that is merely wrong isn't told where something
 * more telling explains the same place, and nothing twice for a part and for what it stands in.
 */
final class Told {
    private Told() {
    }

    static List<Candidate> of(List<Candidate> found, List<StatementPart> parts) {
        List<Candidate> told = new ArrayList<>();
        for (Candidate each : found.stream().sorted(Comparator.comparing(Candidate::kind)).toList()) {
            // that a total is wrong doesn't say by which number it comes right
            boolean known = told.stream().filter(other -> other.kind() != SlipKind.NOT_SUMMING_TO_ONE)
                    .anyMatch(other -> (isMerelyWrong(each) || each.kind() == other.kind())
                            && isAtOnePlace(each, other, parts));
            if (!known) {
                told.add(each);
            }
        }
        return told;
    }

    static boolean isMerelyWrong(Candidate candidate) {
        return candidate.kind() == SlipKind.WRONG_POLE || candidate.kind() == SlipKind.WRONG_COEFFICIENT;
    }

    /** One place within the other, unless the other is all of the statement. */
    private static boolean isAtOnePlace(Candidate each, Candidate other, List<StatementPart> parts) {
        Span all = parts.get(0).text().parsed().span().to(parts.get(parts.size() - 1).text().parsed().span());
        boolean whole = !each.span().equals(other.span()) && other.span().equals(all);
        return !whole && (contains(each.span(), other.span()) || contains(other.span(), each.span()));
    }

    private static boolean contains(Span outer, Span inner) {
        return outer.start().compareTo(inner.start()) <= 0 && inner.end().compareTo(outer.end()) <= 0;
    }
}
