package org.pofk.modes;

import java.util.Optional;
import java.util.OptionalInt;
import org.pofk.exact.Ball;
import org.pofk.exact.Enclosed;
import org.pofk.exact.Root;

/**
 * The pole of greatest modulus of a sequence that is never negative, the real positive one where several share it: by
 * Pringsheim's theorem (Titchmarsh 1939, section 7.21, from memory) there is one, so that it is found among the real
 * roots and no moduli are compared. Exact.
 *
 * @param factor the place of its factor in the denominator
 */
public record OutermostPole(int factor, Root root) {

    /** Empty for a sequence that is zero from some step on. */
    public static Optional<OutermostPole> of(ClosedForm neverNegative) {
        Optional<OutermostPole> outermost = Optional.empty();
        for (int i = 0; i < neverNegative.roots().size(); i++) {
            for (Root root : neverNegative.roots().get(i).all()) {
                if (root.isReal() && isPositive(root)
                        && outermost.stream().allMatch(most -> isAbove(root, most.root))) {
                    outermost = Optional.of(new OutermostPole(i, root));
                }
            }
        }
        return outermost;
    }

    public Enclosed value() {
        return bits -> root.enclose(bits).real();
    }

    /** Looked at more closely until it is told; zero is enclosed exactly. */
    private static boolean isPositive(Root root) {
        for (int bits = 64; true; bits *= 2) {
            OptionalInt sign = root.enclose(bits).real().sign();
            if (sign.isPresent()) {
                return sign.getAsInt() > 0;
            }
        }
    }

    /** Of two different numbers: roots of one polynomial, or of two that have none in common. */
    private static boolean isAbove(Root one, Root other) {
        for (int bits = 64; true; bits *= 2) {
            Ball difference = one.enclose(bits).real().minus(other.enclose(bits).real());
            if (!difference.containsZero()) {
                return difference.isPositive();
            }
        }
    }
}
