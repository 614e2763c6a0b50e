package org.pofk.claim;

import java.util.List;
import java.util.Optional;
import java.util.OptionalLong;
import java.util.stream.Stream;
import org.pofk.exact.Decimal;
import org.pofk.meaning.Fit;
import org.pofk.meaning.Written;

/**
 * What one claim is worth when held against what is true.
 *
 * @param verdict        never {@link Verdict#CARRIED}: one claim alone doesn't tell
 * @param difference     how far the claim, taken as printed, is from the truth at most, where that is a number
 * @param firstWrongStep the first k at which it isn't what it claims to be, for what depends on k
 * @param numbers        the decimals in it whose right value is known, right ones and wrong ones
 * @param remarks        what a reviewer should know besides, one sentence each
 * @param right          the right statement, in the author's notation and to his digits
 */
public record Judgement(Verdict verdict, Optional<Difference> difference, OptionalLong firstWrongStep,
        List<JudgedNumber> numbers, List<String> remarks, String right) {

    /** The largest error. {@code at}: the step where it is reached; empty where it is only approached as k grows. */
    public record Difference(Decimal size, boolean relative, OptionalLong at) {
    }

    /**
     * One decimal of the claim with the value it should have.
     *
     * @param right as many digits as written, and as many more as it takes to see the difference
     */
    public record JudgedNumber(Written written, String right, Fit fit) {
    }

    public Judgement {
        numbers = List.copyOf(numbers);
        remarks = List.copyOf(remarks);
    }

    /** The same where how far the numbers are off says nothing of how far the claim is. */
    Judgement withoutDifference() {
        return new Judgement(verdict, Optional.empty(), firstWrongStep, numbers, remarks, right);
    }

    /** The same with one more sentence. */
    Judgement remarking(String sentence) {
        return new Judgement(verdict, difference, firstWrongStep, numbers,
                Stream.concat(remarks.stream(), Stream.of(sentence)).toList(), right);
    }

    public boolean isRight() {
        return verdict == Verdict.EXACT || verdict == Verdict.ROUNDED || verdict == Verdict.APPROXIMATE;
    }
}
