package org.pofk.claim;

import java.util.List;
import java.util.Optional;
import java.util.OptionalLong;
import org.pofk.claim.AnswerOf.MeanPassage;
import org.pofk.claim.Statement.NoNumber.Word;

/** That a question is answered by a word. Exact. */
final class JudgedAbsence {
    private JudgedAbsence() {
    }

    static Judgement of(Statement.NoNumber stated, Truth truth) {
        Answer answer = Answers.of(stated.asked(), truth);
        return switch (answer.standing()) {
            case KNOWN -> judgement(Verdict.WRONG, List.of("there is a number: " + JudgedAnswer.inFull(answer)), "");
            case NONE -> isSo(stated, answer) ? judgement(Verdict.EXACT, List.of(), "")
                    : judgement(Verdict.WRONG, answer.remarks(), answer.word());
            case NOT_DECIDED -> judgement(Verdict.UNDECIDED, answer.remarks(), "");
        };
    }

    /** The time until what never happens is infinite, and so is its mean over all cases. */
    private static boolean isSo(Statement.NoNumber stated, Answer answer) {
        boolean isOverAllCases = stated.asked() instanceof MeanPassage passage
                && passage.cases() == MeanPassage.Cases.ALL;
        return answer.word().equals(stated.word().text())
                || isOverAllCases && stated.word() == Word.INFINITE && answer.word().equals(Word.NEVER.text());
    }

    private static Judgement judgement(Verdict verdict, List<String> remarks, String right) {
        return new Judgement(verdict, Optional.empty(), OptionalLong.empty(), List.of(), remarks, right);
    }
}
