package org.pofk.report;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import org.pofk.exact.Rational;
import org.pofk.steps.KnownValue;
import org.pofk.steps.StepValue;

/** A table for programs, built row by row: every number plain, exact ones as fractions. */
final class Rows {
    private final List<Prose> header;
    private final int digits;
    private final List<List<Prose>> rows = new ArrayList<>();

    /** @param digits significant digits of decimals */
    @SafeVarargs
    Rows(int digits, List<Prose>... header) {
        this.header = Stream.of(header).flatMap(List::stream).toList();
        this.digits = digits;
    }

    /** Headings that are words of ours. */
    static List<Prose> words(String... words) {
        return Stream.of(words).map(Prose::of).toList();
    }

    @SafeVarargs
    final void add(List<Prose>... cells) {
        rows.add(Stream.of(cells).flatMap(List::stream).toList());
    }

    Document.Table table() {
        return new Document.Table(Prose.EMPTY, header, rows);
    }

    /** The cells below {@code exact} and {@code decimal}. */
    List<Prose> value(Rational value) {
        return List.of(Prose.of(value.toString()), Prose.of(ValueText.number(value, digits)));
    }

    /** The same for what there may be none of. */
    List<Prose> value(Optional<Rational> value) {
        return value.map(this::value).orElse(List.of(Prose.EMPTY, Prose.EMPTY));
    }

    /** The same of a number with its word; both cells are empty where no digit is certain. */
    List<Prose> value(KnownValue value) {
        return List.of(Prose.of(value.exact().map(Rational::toString).orElse("")),
                Prose.of(KnownText.number(value, digits).orElse("")));
    }

    /** The same; {@code exact} stays empty where only certified decimals are known. */
    List<Prose> value(StepValue value) {
        return List.of(Prose.of(value.exact().map(Rational::toString).orElse("")),
                Prose.of(ValueText.number(value, digits)));
    }
}
