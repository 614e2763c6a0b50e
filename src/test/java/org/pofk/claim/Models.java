package org.pofk.claim;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import org.pofk.chain.Chain;
import org.pofk.chain.SparseMatrix;
import org.pofk.exact.Rational;
import org.pofk.input.ModelReader;
import org.pofk.input.Overrides;
import org.pofk.text.RefusedException;

/** Chains that claims are held against. */
final class Models {
    private static final int MOST_STATES = 12;

    private Models() {
    }

    /** Every chain under test-data of at most a dozen states: the patterns and the published cases, at their values. */
    static List<Chain> all() {
        List<Chain> chains = new ArrayList<>();
        for (String folder : List.of("models", "published")) {
            try (Stream<Path> files = Files.list(Path.of("test-data", folder))) {
                files.filter(file -> file.toString().endsWith(".yaml")).sorted().map(Models::read)
                        .filter(chain -> chain.size() <= MOST_STATES).forEach(chains::add);
            } catch (IOException e) {
                throw new UncheckedIOException(e);
            }
        }
        return chains;
    }

    /** A model that comes with the program. */
    static Chain pattern(String name) {
        return read(Path.of("test-data", "models", name + ".yaml"));
    }

    private static Chain read(Path file) {
        try {
            return ModelReader.read(file, Overrides.NONE).chain();
        } catch (RefusedException e) {
            throw new AssertionError(file.toString(), e);
        }
    }

    /** Start and rows as text, entry in row i and column j the move from j to i. */
    static Chain recursion(String start, String... rows) {
        List<Rational> first = numbers(start);
        return new Chain(Chain.Kind.RECURSION, IntStream.range(0, first.size()).mapToObj(i -> "s" + i).toList(),
                SparseMatrix.ofRows(Stream.of(rows).map(Models::numbers).toList()), first, Map.of(), List.of());
    }

    static List<Rational> numbers(String text) {
        return Stream.of(text.strip().split("\\s+")).map(Rational::parse).toList();
    }
}
