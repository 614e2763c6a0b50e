package org.pofk.claim;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Collectors;
import java.util.stream.Stream;

/** Lists in which what stands several times is written once. */
final class Counted {
    private Counted() {
    }

    /** {@code 1, 0.45 (twice), 0.3 (3 times)}: two lists as one. */
    static String of(List<String> first, List<String> others) {
        Map<String, Integer> counts = new LinkedHashMap<>();
        Stream.concat(first.stream(), others.stream()).forEach(text -> counts.merge(text, 1, Integer::sum));
        return counts.entrySet().stream().map(entry -> entry.getKey() + times(entry.getValue()))
                .collect(Collectors.joining(", "));
    }

    private static String times(int count) {
        return switch (count) {
            case 1 -> "";
            case 2 -> " (twice)";
            default -> " (" + count + " times)";
        };
    }
}
