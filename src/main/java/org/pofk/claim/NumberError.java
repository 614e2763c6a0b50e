package org.pofk.claim;

import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.OptionalLong;
import org.pofk.claim.Claim.Within;
import org.pofk.claim.Judgement.Difference;
import org.pofk.exact.Decimal;
import org.pofk.exact.Decimals;
import org.pofk.meaning.Decision;
import org.pofk.meaning.Quantity;

/** How far numbers are from those they should be at most; certified to the digits shown. */
final class NumberError {
    static final int DIGITS = 3;
    private static final int BITS = 128;

    private NumberError() {
    }

    /** Relative to the right number where the claim says by how many per cent it may be off. */
    static Optional<Difference> of(Claim claim, List<Held> held, OptionalLong step) {
        boolean isRelative = claim.within().filter(Within::relative).isPresent()
                && held.stream().allMatch(each -> each.right().isZero() == Decision.NO);
        return held.stream().map(each -> isRelative ? each.error().dividedBy(each.right()) : each.error())
                .max(Comparator.comparingDouble(error -> Math.hypot(Guesses.real(error), Guesses.imaginary(error))))
                .map(error -> new Difference(size(error), isRelative, step));
    }

    /** |error|; an error that can't be told from zero counts as none. */
    private static Decimal size(Quantity error) {
        if (error.enclose(BITS).containsZero() && error.isZero() != Decision.NO) {
            return Decimal.ZERO;
        }
        return error.rational().map(value -> Decimals.of(value.abs(), DIGITS)).orElseGet(() -> Decimals.of(
                bits -> error.enclose(bits).modulus(), DIGITS));
    }
}
