package org.pofk.claim;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;
import org.pofk.claim.Claim.SafeSide;
import org.pofk.claim.Claim.Within;
import org.pofk.exact.Rational;
import org.pofk.meaning.Decision;
import org.pofk.meaning.Quantity;

/** What numbers that aren't exactly right are worth: rounded, near enough where that is claimed, or wrong. */
final class Closeness {
    private Closeness() {
    }

    /** @param areRight whether every decimal is right to its digits */
    static Verdict verdict(Claim claim, List<Held> held, Decision areRight) {
        Decision isNear = claim.within().map(within -> all(held, each -> isNear(each, within))).orElse(Decision.YES);
        Decision isSafe = claim.safeSide().map(side -> all(held, each -> isSafe(each, side))).orElse(Decision.YES);
        if (isNear == Decision.NO || isSafe == Decision.NO) {
            return Verdict.WRONG;
        }
        boolean isClaim = isNear == Decision.YES && isSafe == Decision.YES;
        if (areRight == Decision.YES && isClaim) {
            return Verdict.ROUNDED;
        }
        if (claim.within().isPresent()) {
            return isClaim ? Verdict.APPROXIMATE : Verdict.UNDECIDED;
        }
        return areRight == Decision.NO ? Verdict.WRONG : Verdict.UNDECIDED;
    }

    /** What keeps numbers that are claimed as approximations from being that. */
    static List<String> remarks(Claim claim, List<Held> held) {
        List<String> remarks = new ArrayList<>();
        for (Held each : held) {
            String text = each.stated().text().text();
            if (claim.within().filter(within -> isNear(each, within) == Decision.NO).isPresent()) {
                remarks.add(text + " is farther from the true value than is claimed");
            }
            if (claim.safeSide().filter(side -> isSafe(each, side) == Decision.NO).isPresent()) {
                remarks.add(text + (claim.safeSide().get() == SafeSide.ABOVE
                        ? " lies below the true value, which isn't the safe side"
                        : " lies above the true value, which isn't the safe side"));
            }
        }
        return remarks;
    }

    private static Decision all(List<Held> held, Function<Held, Decision> test) {
        Decision all = Decision.YES;
        for (Held each : held) {
            Decision one = test.apply(each);
            if (one == Decision.NO) {
                return one;
            }
            all = one == Decision.UNDECIDED ? one : all;
        }
        return all;
    }

    /** |stated − right| ≤ amount, or amount · |right|. */
    private static Decision isNear(Held held, Within within) {
        Quantity room = within.relative() ? square(held.right()).times(within.amount().times(within.amount()))
                : Quantity.of(within.amount().times(within.amount()));
        return isNotNegative(room.minus(square(held.error())));
    }

    /** |number|². */
    private static Quantity square(Quantity number) {
        return number.times(number.conjugate());
    }

    static Decision isSafe(Held held, SafeSide side) {
        Quantity error = held.error().realPart();
        return isNotNegative(side == SafeSide.ABOVE ? error : error.times(Rational.of(-1)));
    }

    private static Decision isNotNegative(Quantity real) {
        Optional<Integer> sign = real.sign();
        return sign.isEmpty() ? Decision.UNDECIDED : sign.get() >= 0 ? Decision.YES : Decision.NO;
    }
}
