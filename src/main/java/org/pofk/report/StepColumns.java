package org.pofk.report;

import java.util.List;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import org.pofk.chain.Model;
import org.pofk.exact.Rational;

/** The columns that say which step a row is about: k, and the time passed by its end where a step has a length. */
final class StepColumns {
    private static final Pattern LENGTH = Pattern.compile("([0-9]+(?:\\.[0-9]+)?|[0-9]+/[1-9][0-9]*)\\s*(\\p{L}.*)");
    private static final int DIGITS = 15;

    private final Optional<Length> length;

    private record Length(Rational number, String unit) {
    }

    private StepColumns(Optional<Length> length) {
        this.length = length;
    }

    static StepColumns of(Model model) {
        return new StepColumns(model.step().lasts().map(LENGTH::matcher).filter(Matcher::matches)
                .map(found -> new Length(Rational.parse(found.group(1)), found.group(2))));
    }

    /** {@code k}, {@code time (h)}. */
    List<Prose> header() {
        return Stream.concat(Stream.of(Prose.of("k")),
                length.map(each -> Prose.of("time (").andName(each.unit).and(")")).stream()).toList();
    }

    List<Prose> cells(long k) {
        return Stream.concat(Stream.of(Prose.of(String.valueOf(k))), length.map(each ->
                Prose.of(ValueText.number(each.number.times(Rational.of(k)), DIGITS))).stream()).toList();
    }

    /** As many empty cells, for a row that is about no step. */
    List<Prose> none() {
        return header().stream().map(each -> Prose.EMPTY).toList();
    }
}
