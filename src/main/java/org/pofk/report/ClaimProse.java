package org.pofk.report;

import java.util.Arrays;
import org.pofk.claim.AnswerOf;
import org.pofk.claim.Claim;
import org.pofk.claim.Statement;

/** What a claim is, in a few words. */
final class ClaimProse {
    private ClaimProse() {
    }

    /** {@code formula of lost}, {@code value of lost at k = 5}, {@code matrix}. */
    static Prose of(Claim claim) {
        Prose kind = Prose.of(claim.kind());
        if (claim.statement() instanceof Statement.Value value) {
            return kind.and(" of ").andName(claim.of()).and(" at k = " + value.at());
        }
        if (claim.statement() instanceof AnswerOf asked) {
            return kind.and(asked.asked(new AskedProse(claim)));
        }
        if (claim.statement() instanceof Statement.NoNumber noNumber) {
            return kind.and(noNumber.asked().asked(new AskedProse(claim)));
        }
        if (claim.statement() instanceof Statement.Eigenvector eigenvector) {
            return kind.and(" for ").andName(eigenvector.eigenvalue().text());
        }
        return isOfTheChain(claim.statement()) ? kind : kind.and(" of ").andName(claim.of());
    }

    /** {@code claim 3, eq. (5)}. */
    static Prose number(Claim claim) {
        return Prose.of("claim " + claim.number()).and(place(claim));
    }

    /** {@code , eq. (5)}; {@code , at 6} where a number alone would read as a claim's. */
    static Prose place(Claim claim) {
        return claim.where().map(where -> Prose.of(where.strip().matches("[0-9.]+[a-z]?") ? ", at " : ", ")
                .and(text(where))).orElse(Prose.EMPTY);
    }

    /** What an author wrote, broken into lines at its blanks only. */
    static Prose text(String written) {
        return Prose.joined(Arrays.stream(written.strip().split("\\s+")).map(Prose::name).toList(), " ");
    }

    private static boolean isOfTheChain(Statement statement) {
        return statement instanceof Statement.Start || statement instanceof Statement.Matrix
                || statement instanceof Statement.MatrixPolynomial;
    }
}
