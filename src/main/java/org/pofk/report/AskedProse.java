package org.pofk.report;

import org.pofk.claim.AnswerOf;
import org.pofk.claim.AnswerOf.MeanPassage;
import org.pofk.claim.Claim;

/** What a claim answers, as it follows the word for its kind: {@code  of lost, k = 0 to 12}. */
record AskedProse(Claim claim) implements AnswerOf.Question<Prose> {

    private Prose of() {
        return Prose.of(" of ").andName(claim.of());
    }

    @Override
    public Prose settling(AnswerOf.SettlingStep settling) {
        return of().and(", " + VerdictProse.amount(settling.distance()));
    }

    @Override
    public Prose passage(MeanPassage passage) {
        Prose into = Prose.of(" into ").andName(passage.set());
        Prose begun = passage.from().map(from -> into.and(" from ").andName(from.name())).orElse(into);
        return passage.cases() == MeanPassage.Cases.ENTERED ? begun.and(", given that it is entered") : begun;
    }

    @Override
    public Prose sum(AnswerOf.Sum sum) {
        return of().and(", k = " + sum.first() + " to " + sum.last());
    }

    @Override
    public Prose mean(AnswerOf.IntervalMean mean) {
        return of().and(", k = " + mean.first() + " to " + mean.last());
    }

    @Override
    public Prose conditional(AnswerOf.Conditional conditional) {
        return of().and(" given ").andName(conditional.given().name()).and(" at k = " + conditional.at());
    }
}
