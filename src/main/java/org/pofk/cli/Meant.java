package org.pofk.cli;

import java.util.Collection;
import java.util.List;
import java.util.Locale;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.pofk.text.Suggestion;

/** What may have been meant by a word that isn't known: a part of a longer one, or one typed with a slip. */
final class Meant {
    private static final int MOST = 4;
    /** A shorter word is a part of too many. */
    private static final int SHORTEST_PART = 3;

    private Meant() {
    }

    /** Candidates that hold the word first, those that begin with it before others; else the nearest one. */
    static List<String> by(Collection<String> candidates, String word) {
        String sought = word.toLowerCase(Locale.ROOT).strip();
        if (sought.length() >= SHORTEST_PART) {
            List<String> holding = Stream.concat(candidates.stream().filter(each -> each.startsWith(sought)),
                    candidates.stream().filter(each -> each.contains(sought))).distinct().limit(MOST).toList();
            if (!holding.isEmpty()) {
                return holding;
            }
        }
        return Suggestion.among(candidates, word).stream().toList();
    }

    /** {@code "; did you mean 'pump-pair' or 'pump-trio'?"}, or nothing where nothing is near. */
    static String didYouMean(Collection<String> candidates, String word) {
        List<String> meant = by(candidates, word);
        return meant.isEmpty() ? "" : "; did you mean "
                + meant.stream().map(each -> "'" + each + "'").collect(Collectors.joining(" or ")) + "?";
    }
}
