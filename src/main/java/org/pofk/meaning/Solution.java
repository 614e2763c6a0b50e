package org.pofk.meaning;

import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/**
 * What equations say about the decimals in them.
 *
 * @param numbers the decimals whose right value is determined, in the order in which they were solved for; a decimal
 *                taken at face value to judge others by isn't among them
 * @param holds   whether all equations can hold with every decimal within half a unit of its last place; a decimal cut
 *                off instead of rounded isn't within it, and its fit says so
 * @param failing the places, from 0 and ascending, of equations that can't; one that gives a wrong decimal is among them
 */
public record Solution(Map<Written, WrittenNumber> numbers, Decision holds, List<Integer> failing) {

    public Solution {
        numbers = Collections.unmodifiableMap(new LinkedHashMap<>(numbers));
        failing = List.copyOf(failing);
    }

    /** The value a decimal should have, exactly; empty where it isn't determined. */
    public Optional<Quantity> right(Written written) {
        return Optional.ofNullable(numbers.get(written)).map(WrittenNumber::right);
    }
}
