package org.pofk.slip;

import java.util.Optional;
import org.pofk.claim.FormulaText;
import org.pofk.meaning.ExponentialSum;
import org.pofk.meaning.Precision;
import org.pofk.meaning.Quantity;
import org.pofk.text.RefusedException;

/** What a text without k denotes. */
final class ConstantText {
    private ConstantText() {
    }

    static Optional<Quantity> value(FormulaText text, Precision precision) {
        try {
            return Optional.of(ExponentialSum.of(text.parsed(), precision).valueAt(0));
        } catch (RefusedException | ArithmeticException unusable) {
            return Optional.empty();
        }
    }
}
