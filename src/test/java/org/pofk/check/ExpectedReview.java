package org.pofk.check;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import java.util.OptionalInt;
import java.util.stream.Stream;
import org.pofk.claim.Verdict;
import org.pofk.slip.SlipKind;

/**
 * What a derivation should be said to be, written down with the derivation: NAME.expected beside NAME.yaml, one line a
 * claim: its number, its verdict (with the earlier step after {@code carried}), and for a wrong one the kinds of the
 * slips put in and, after a colon, what was put in in words. A slip that no kind names is told in words alone.
 */
record ExpectedReview(Path claims, List<Line> lines) {
    static final Path FOLDER = Path.of("test-data/claims");
    private static final String ENDING = ".expected";

    /** One claim: {@code 7 wrong SIGN_OF_THE_PHASE: + for -}. */
    record Line(int number, Verdict verdict, OptionalInt carriedFrom, List<SlipKind> slips, String inWords) {
        Line {
            slips = List.copyOf(slips);
            boolean isTold = !slips.isEmpty() || !inWords.isEmpty();
            if ((verdict == Verdict.CARRIED) != carriedFrom.isPresent() || (verdict == Verdict.WRONG) != isTold) {
                throw new IllegalArgumentException("claim " + number + ": carried needs its step, wrong its slips");
            }
        }

        private static Line parse(String text) {
            String[] parts = text.split(":", 2);
            List<String> words = Arrays.asList(parts[0].strip().split("\\s+"));
            Verdict verdict = Verdict.valueOf(words.get(1).toUpperCase(Locale.ROOT));
            List<String> rest = words.subList(2, words.size());
            boolean isCarried = verdict == Verdict.CARRIED;
            return new Line(Integer.parseInt(words.get(0)), verdict,
                    isCarried ? OptionalInt.of(Integer.parseInt(rest.get(0))) : OptionalInt.empty(),
                    isCarried ? List.of() : rest.stream().map(SlipKind::valueOf).toList(),
                    parts.length > 1 ? parts[1].strip() : "");
        }
    }

    /** Every derivation of the folder that has its expectation, by name. */
    static List<ExpectedReview> all() throws IOException {
        try (Stream<Path> files = Files.list(FOLDER)) {
            List<Path> expected = files.filter(file -> file.toString().endsWith(ENDING)).sorted().toList();
            return expected.stream().map(ExpectedReview::read).toList();
        }
    }

    private static ExpectedReview read(Path expected) {
        try {
            List<Line> lines = Files.readAllLines(expected).stream().map(line -> line.replaceFirst("#.*", "").strip())
                    .filter(line -> !line.isEmpty()).map(Line::parse).toList();
            String name = expected.getFileName().toString();
            return new ExpectedReview(FOLDER.resolve(name.substring(0, name.length() - ENDING.length()) + ".yaml"),
                    lines);
        } catch (IOException | RuntimeException broken) {
            throw new AssertionError(expected + ": " + broken.getMessage(), broken);
        }
    }

    @Override
    public String toString() {
        return claims.getFileName().toString();
    }
}
