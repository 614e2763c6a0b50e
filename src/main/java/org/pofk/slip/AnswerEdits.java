package org.pofk.slip;

import java.math.BigDecimal;
import java.util.List;
import java.util.stream.Stream;
import org.pofk.claim.AnswerOf;
import org.pofk.claim.AuthorText;
import org.pofk.claim.AuthorText.Replacement;

/** A number that counts steps with one of them more or less, and a probability with its complement. */
final class AnswerEdits implements AnswerOf.Question<List<Edit>> {
    private final AuthorText text;

    AnswerEdits(AuthorText text) {
        this.text = text;
    }

    List<Edit> of(AnswerOf asked) {
        return asked.asked(this);
    }

    @Override
    public List<Edit> settling(AnswerOf.SettlingStep settling) {
        return stepsAway(SlipKind.INDEX_SHIFTED);
    }

    @Override
    public List<Edit> passage(AnswerOf.MeanPassage passage) {
        return stepsAway(SlipKind.MEAN_OFF_BY_A_STEP);
    }

    @Override
    public List<Edit> sum(AnswerOf.Sum sum) {
        return List.of();
    }

    @Override
    public List<Edit> mean(AnswerOf.IntervalMean mean) {
        return List.of(Changes.complement(text));
    }

    @Override
    public List<Edit> conditional(AnswerOf.Conditional conditional) {
        return List.of(Changes.complement(text));
    }

    private List<Edit> stepsAway(SlipKind kind) {
        String found = text.text();
        return Stream.of(1, -1).map(steps -> Digits.isNumber(found)
                ? new BigDecimal(found).add(BigDecimal.valueOf(steps)).toPlainString()
                : AuthorNotation.of(text.notation()).enclosed(found) + (steps > 0 ? " + 1" : " - 1"))
                .map(right -> new Edit(kind, List.of(new Replacement(0, found.length(), right)), text.place(), found,
                        right)).toList();
    }
}
