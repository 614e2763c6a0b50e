package org.pofk.claim;

import java.util.HashMap;
import java.util.Map;
import org.pofk.meaning.Quantity;
import org.pofk.meaning.Written;

/** Numbers with what their decimals denote in the decimals' places. */
final class AtFaceValue {
    private AtFaceValue() {
    }

    static Quantity of(Quantity number) {
        Map<Written, Quantity> values = new HashMap<>();
        number.decimals().forEach(written -> values.put(written, Quantity.of(written.value())));
        return number.with(values);
    }
}
