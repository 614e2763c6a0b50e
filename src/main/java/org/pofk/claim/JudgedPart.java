package org.pofk.claim;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalLong;
import org.pofk.claim.Judgement.JudgedNumber;
import org.pofk.meaning.Decision;
import org.pofk.meaning.ExponentialSum;
import org.pofk.meaning.Fit;
import org.pofk.meaning.Quantity;

/**
 * A formula for one p(k) held against what is true: refuted at a few steps where that can be, else exact by finitely
 * many values, else rounded by the equations between its terms and the true modes.
 */
final class JudgedPart {
    private static final int FIRST_STEPS = 12;
    private static final int MORE_STEPS = 160;

    private final ExponentialSum claimed;
    private final FormulaText text;
    private final Claim claim;
    private final OutputTruth truth;
    private final ClaimedSteps steps;

    private JudgedPart(ExponentialSum claimed, FormulaText text, Claim claim, OutputTruth truth) {
        this.claimed = claimed;
        this.text = text;
        this.claim = claim;
        this.truth = truth;
        this.steps = ClaimedSteps.of(claim.steps(), claimed.scope());
    }

    static Judgement of(ExponentialSum claimed, FormulaText text, Claim claim, OutputTruth truth) {
        return new JudgedPart(claimed, text, claim, truth).judgement();
    }

    static boolean isRight(ExponentialSum claimed, Claim claim, OutputTruth truth) {
        ClaimedSteps steps = ClaimedSteps.of(claim.steps(), claimed.scope());
        if (claim.within().isPresent()) {
            return steps.areExact(claimed, truth) == Decision.YES
                    || Approximation.of(claimed, truth, steps, claim).holds() == Decision.YES;
        }
        if (Refutation.of(Loosened.of(claimed), truth, steps, FIRST_STEPS).isPresent()) {
            return false;
        }
        ModeEquations modes = ModeEquations.of(claimed, truth, steps);
        return modes.areExact() == Decision.YES || steps.areExact(claimed, truth) == Decision.YES
                || isRounded(modes) && claim.safeSide().filter(side ->
                SafeSide.of(claimed, truth, steps.range(), side).holds() != Decision.YES).isEmpty();
    }

    private static boolean isRounded(ModeEquations modes) {
        return modes.fits() && RightNumbers.of(modes.plain()).rounded() == Decision.YES;
    }

    private Judgement judgement() {
        if (claim.within().isPresent()) {
            return approximate();
        }
        OptionalLong refuted = Refutation.of(Loosened.of(claimed), truth, steps, FIRST_STEPS);
        ModeEquations modes = ModeEquations.of(claimed, truth, steps);
        if (refuted.isEmpty()
                && (modes.areExact() == Decision.YES || steps.areExact(claimed, truth) == Decision.YES)) {
            return exact();
        }
        RightNumbers numbers = RightNumbers.of(modes.plain());
        if (refuted.isEmpty() && modes.fits() && numbers.rounded() != Decision.NO) {
            return rounded(modes, numbers, numbers.rounded() == Decision.YES ? Verdict.ROUNDED : Verdict.UNDECIDED);
        }
        return wrong(modes, numbers);
    }

    private Judgement exact() {
        List<JudgedNumber> numbers = decimals().stream()
                .map(written -> new JudgedNumber(written, written.text(), Fit.RIGHT)).toList();
        return new Judgement(Verdict.EXACT, Optional.empty(), OptionalLong.empty(), numbers, List.of(), text.text());
    }

    private List<org.pofk.meaning.Written> decimals() {
        return claimed.terms().stream().flatMap(term -> Quantity.sum(List.of(term.coefficient(), term.base(),
                term.angle(), term.phase())).decimals().stream()).distinct().toList();
    }

    private Judgement rounded(ModeEquations modes, RightNumbers numbers, Verdict verdict) {
        List<JudgedNumber> judged = numbers.judged();
        List<String> remarks = new ArrayList<>();
        judged.stream().filter(number -> number.fit() == Fit.CUT_OFF).forEach(number ->
                remarks.add(number.written().text() + " is cut off, not rounded: " + number.right()));
        LargestError largest = LargestError.of(claimed, truth, steps.range());
        largest.remark().ifPresent(remarks::add);
        RoundedPoles.remark(claimed, modes, truth, steps).ifPresent(remarks::add);
        Optional<SafeSide> unsafe = safeSide().filter(side -> side.holds() == Decision.NO);
        unsafe.ifPresent(side -> remarks.add(side.told(claim.safeSide().orElseThrow())));
        return new Judgement(unsafe.isPresent() ? Verdict.WRONG : verdict, largest.difference(Measure.ABSOLUTE),
                unsafe.map(SafeSide::step).orElse(OptionalLong.empty()), judged, remarks,
                RightText.of(text, judged).orElse(text.text()));
    }

    private Optional<SafeSide> safeSide() {
        return claim.safeSide().map(side -> SafeSide.of(claimed, truth, steps.range(), side));
    }

    private Judgement wrong(ModeEquations modes, RightNumbers numbers) {
        OptionalLong first = Refutation.of(claimed, truth, steps, MORE_STEPS);
        LargestError largest = LargestError.of(claimed, truth, steps.range());
        List<String> remarks = new ArrayList<>();
        largest.remark().ifPresent(remarks::add);
        modes.unlike().stream().filter(pole -> !pole.isReal()).forEach(pole -> remarks.add("the pole "
                + RightNumber.of(pole.value(), List.of()) + " and its conjugate turn; a term without cosine or sine can't stand for them"));
        return new Judgement(Verdict.WRONG, largest.difference(Measure.ABSOLUTE), first, numbers.judged(), remarks,
                RightFormula.of(text, truth, modes, numbers));
    }

    private Judgement approximate() {
        if (steps.areExact(claimed, truth) == Decision.YES) {
            return exact();
        }
        Approximation approximation = Approximation.of(claimed, truth, steps, claim);
        Verdict verdict = switch (approximation.holds()) {
            case YES -> Verdict.APPROXIMATE;
            case NO -> Verdict.WRONG;
            case UNDECIDED -> Verdict.UNDECIDED;
        };
        String right = verdict == Verdict.APPROXIMATE ? text.text() : RightFormula.ofTruth(text, truth);
        return new Judgement(verdict, approximation.difference(), approximation.firstWrongStep(), List.of(),
                approximation.remarks(), right);
    }
}
