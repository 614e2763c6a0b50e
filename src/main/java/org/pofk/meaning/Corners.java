package org.pofk.meaning;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** Decimals at the ends of what they stand for. */
final class Corners {
    private Corners() {
    }

    /** Each at its upper end where its bit is set, else at its lower one. */
    static Map<Written, Quantity> of(List<Written> decimals, int bits) {
        Map<Written, Quantity> ends = new LinkedHashMap<>();
        for (int i = 0; i < decimals.size(); i++) {
            Written decimal = decimals.get(i);
            ends.put(decimal, Quantity.of((bits >> i & 1) == 1
                    ? decimal.value().plus(decimal.halfUnit())
                    : decimal.value().minus(decimal.halfUnit())));
        }
        return ends;
    }
}
