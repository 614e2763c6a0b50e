package org.pofk.meaning;

import java.util.Collection;
import java.util.LinkedHashMap;
import java.util.Map;

/** Decimals replaced by what their digits denote. */
final class FaceValues {
    private FaceValues() {
    }

    static Map<Written, Quantity> of(Collection<Written> decimals) {
        Map<Written, Quantity> values = new LinkedHashMap<>();
        decimals.forEach(decimal -> values.put(decimal, Quantity.of(decimal.value())));
        return values;
    }
}
