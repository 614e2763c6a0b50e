package org.pofk.answer;

import java.math.BigInteger;
import java.util.List;
import java.util.SortedSet;
import java.util.TreeSet;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import org.pofk.longrun.Settling;
import org.pofk.steps.StepValue;
import org.pofk.steps.StepValues;

/**
 * Steps at which something is to be seen of outputs that settle long after those listed: where each is highest, and
 * some on the way to where the last of them has settled. Values there are exact or certified, as all others.
 */
public final class LaterSteps {
    private static final BigInteger LAST = BigInteger.valueOf(1_000_000_000);
    /** An eighth of the way, a quarter, half of it, all. */
    private static final List<Integer> PARTS = List.of(8, 4, 2, 1);

    private LaterSteps() {
    }

    /** With values there too; the same where nothing is left to be seen. */
    public static DerivedModel added(DerivedModel derived, List<KeyFigures> figures) {
        int last = derived.wanted().at().stream().reduce(0, Math::max);
        List<Integer> later = steps(figures).tailSet(last + 1).stream().toList();
        if (later.isEmpty()) {
            return derived;
        }
        List<List<StepValue>> values = StepValues.of(derived.model().chain(),
                derived.outputs().stream().map(each -> each.closedForm().orElseThrow()).toList(), later);
        List<DerivedOutput> outputs = IntStream.range(0, values.size()).mapToObj(i -> derived.outputs().get(i)
                .with(joined(derived.outputs().get(i).values(), values.get(i)))).toList();
        return new DerivedModel(derived.model(), derived.structure(), outputs, derived.state(),
                new Wanted(joined(derived.wanted().at(), later), derived.wanted().extras()));
    }

    private static SortedSet<Integer> steps(List<KeyFigures> figures) {
        SortedSet<Integer> steps = new TreeSet<>();
        figures.stream().flatMap(each -> each.settling().stream()).map(Settling::from)
                .filter(from -> from.compareTo(LAST) <= 0).max(BigInteger::compareTo).ifPresent(settled ->
                        PARTS.forEach(part -> steps.add(settled.intValueExact() / part)));
        figures.stream().flatMap(each -> each.highest().stream()).flatMap(peak -> peak.at().stream())
                .filter(k -> k <= LAST.longValueExact()).forEach(k -> steps.add(Math.toIntExact(k)));
        return steps;
    }

    private static <T> List<T> joined(List<T> first, List<T> then) {
        return Stream.concat(first.stream(), then.stream()).toList();
    }
}
