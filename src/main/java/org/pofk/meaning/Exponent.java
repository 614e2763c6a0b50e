package org.pofk.meaning;

import java.util.Optional;

/** e to a whole multiple of a logarithm is a power. Exact. */
final class Exponent {
    private Exponent() {
    }

    /** xⁿ for n log x; empty for anything else. */
    static Optional<Quantity> wholeTimesLogarithm(Quantity exponent) {
        if (exponent.node() instanceof Node.Logarithm logarithm) {
            return Optional.of(logarithm.of());
        }
        if (exponent.node() instanceof Node.Product product && product.second().node() instanceof Node.Logarithm log) {
            return product.first().rational().filter(n -> n.isInteger() && n.numerator().bitLength() < 31)
                    .map(n -> log.of().pow(n.numerator().intValueExact()));
        }
        return Optional.empty();
    }
}
