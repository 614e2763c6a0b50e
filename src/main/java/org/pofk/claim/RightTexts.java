package org.pofk.claim;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.pofk.meaning.Decision;
import org.pofk.meaning.Fit;
import org.pofk.meaning.Quantity;
import org.pofk.meaning.Written;

/**
 * The numbers of a claim as they should be, in their author's notation and to his digits; what is right stands as he
 * wrote it.
 *
 * @param exact whether each number held is exactly right
 */
record RightTexts(Claim claim, List<Held> held, List<Decision> exact, RightDecimals decimals) {

    /** Whether every decimal is right to its digits. */
    boolean areRight() {
        return decimals.areRight() == Decision.YES;
    }

    /** One text for each number, in the order held. */
    List<String> all() {
        List<String> texts = new ArrayList<>();
        for (int i = 0; i < held.size(); i++) {
            texts.add(exact.get(i) == Decision.YES || standsAsWritten(held.get(i))
                    ? held.get(i).stated().text().text() : text(held.get(i)));
        }
        return texts;
    }

    /** A text with its decimals put right; empty where something else than a decimal has to change. */
    Optional<String> mended(FormulaText text, List<Written> written) {
        Map<Written, String> replaced = new LinkedHashMap<>();
        for (Written each : written) {
            Optional<Quantity> right = decimals.right(each);
            replaced.put(each, right.isEmpty() || decimals.fits(each, Fit.RIGHT)
                    ? each.text() : AuthorDigits.like(each, right.get()));
        }
        return decimals.mend() ? RightText.with(text, replaced) : Optional.empty();
    }

    /** Right to its digits, and none of them cut off. */
    private boolean standsAsWritten(Held number) {
        List<Written> written = number.stated().value().decimals();
        return !written.isEmpty() && !isUnsafe(number) && number.isRight() == Decision.YES
                && written.stream().noneMatch(each -> decimals.fits(each, Fit.CUT_OFF));
    }

    private boolean isUnsafe(Held number) {
        return claim.safeSide().filter(side -> Closeness.isSafe(number, side) == Decision.NO).isPresent();
    }

    private String text(Held number) {
        FormulaText text = number.stated().text();
        List<Written> written = number.stated().value().decimals();
        if (written.size() == 1 && RightText.isSignedDecimal(text.parsed().formula())
                && RightNumber.isReal(number.right())) {
            return isUnsafe(number) ? SafeDigits.of(claim, written.get(0), number)
                    : AuthorDigits.like(written.get(0), number.right());
        }
        boolean isSolved = !written.isEmpty() && written.stream().allMatch(each -> decimals.right(each).isPresent());
        return Optional.of(text).filter(each -> isSolved).flatMap(each -> mended(each, written))
                .orElseGet(() -> RightNumber.isInDegrees(text) ? RightNumber.inDegrees(number.right(), text, writtenAnywhere())
                        : RightNumber.of(number.right(), writtenAnywhere()));
    }

    private List<Written> writtenAnywhere() {
        return held.stream().flatMap(each -> each.stated().value().decimals().stream()).toList();
    }
}
