package org.pofk.claim;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalLong;
import java.util.Set;
import java.util.function.Function;
import java.util.stream.Collectors;
import org.pofk.claim.Judgement.JudgedNumber;
import org.pofk.meaning.Decision;
import org.pofk.meaning.Equation;
import org.pofk.meaning.Fit;
import org.pofk.meaning.Quantity;
import org.pofk.meaning.Written;
import org.pofk.text.RefusedException;

/** Holds the numbers of one claim against those they should be, and says what comes of it. */
final class Holding {
    private final Claim claim;
    private final List<Held> held = new ArrayList<>();
    private final List<String> remarks = new ArrayList<>();
    private final Extent extent;
    private Decision besides = Decision.YES;

    /** How much is asked: all of a judgement, or its verdict alone, which costs less. */
    enum Extent { WHOLE, VERDICT }

    Holding(Claim claim) {
        this(claim, Extent.WHOLE);
    }

    Holding(Claim claim, Extent extent) {
        this.claim = claim;
        this.extent = extent;
    }

    /** What a number of the claim means. */
    StatedNumber number(FormulaText text) throws RefusedException {
        return StatedNumber.of(text, claim);
    }

    void hold(Held number) {
        held.add(number);
    }

    void hold(StatedNumber stated, Quantity right) {
        hold(new Held(stated, right));
    }

    void hold(FormulaText text, Quantity right) throws RefusedException {
        hold(number(text), right);
    }

    void remark(String sentence) {
        remarks.add(sentence);
    }

    /** Something else than a number is wrong. */
    void wrong(String sentence) {
        besides = Decision.NO;
        remark(sentence);
    }

    /** Something else than a number isn't decided. */
    void undecided(String sentence) {
        besides = besides == Decision.YES ? Decision.UNDECIDED : besides;
        remark(sentence);
    }

    /** The judgement; {@code right} makes the right statement of the right numbers. */
    Judgement judgement(Function<RightTexts, String> right) {
        return judgement(right, OptionalLong.empty());
    }

    /** The judgement of what is claimed for one step. */
    Judgement judgement(Function<RightTexts, String> right, OptionalLong step) {
        List<Decision> exact = held.stream().map(Held::isExact).toList();
        List<Equation> equations = new ArrayList<>();
        for (int i = 0; i < held.size(); i++) {
            if (exact.get(i) != Decision.YES) {
                equations.addAll(held.get(i).equations());
            }
        }
        RightDecimals decimals = RightDecimals.of(equations);
        boolean isExact = equations.isEmpty();
        Verdict byNumbers = isExact ? Verdict.EXACT : Closeness.verdict(claim, held, decimals.areRight());
        Verdict verdict = besides == Decision.NO ? Verdict.WRONG
                : besides == Decision.UNDECIDED && byNumbers != Verdict.WRONG ? Verdict.UNDECIDED : byNumbers;
        if (extent == Extent.VERDICT) {
            return new Judgement(verdict, Optional.empty(), OptionalLong.empty(), List.of(), List.of(), "");
        }
        if (!isExact) {
            Closeness.remarks(claim, held).forEach(this::remark);
        }
        List<JudgedNumber> numbers = judged(exact, decimals);
        numbers.stream().filter(number -> number.fit() == Fit.CUT_OFF).forEach(number -> remark(
                number.written().text() + " is cut off, not rounded: " + number.right()));
        return new Judgement(verdict, NumberError.of(claim, held, step),
                verdict == Verdict.WRONG ? step : OptionalLong.empty(), numbers, remarks,
                right.apply(new RightTexts(claim, held, exact, decimals)));
    }

    /** Real where a number that isn't belongs: its decimals have no right values of their own. */
    private static boolean lacksAPart(Held number) {
        return RightNumber.isReal(number.stated().value()) && !RightNumber.isReal(number.right());
    }

    /** The decimals of exact numbers are right as they stand. */
    private List<JudgedNumber> judged(List<Decision> exact, RightDecimals decimals) {
        Map<Written, JudgedNumber> numbers = new LinkedHashMap<>();
        Set<Written> halves = held.stream().filter(Holding::lacksAPart)
                .flatMap(each -> each.stated().value().decimals().stream()).collect(Collectors.toSet());
        decimals.judged().stream().filter(number -> !halves.contains(number.written()))
                .forEach(number -> numbers.put(number.written(), number));
        for (int i = 0; i < held.size(); i++) {
            if (exact.get(i) == Decision.YES) {
                held.get(i).stated().value().decimals().forEach(written ->
                        numbers.putIfAbsent(written, new JudgedNumber(written, written.text(), Fit.RIGHT)));
            }
        }
        return numbers.values().stream()
                .sorted((a, b) -> a.written().span().start().compareTo(b.written().span().start())).toList();
    }
}
