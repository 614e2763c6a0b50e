package org.pofk.text;

import java.util.Collection;
import java.util.List;
import java.util.Locale;
import java.util.Optional;

/**
 * What was probably meant by a word that isn't known: the nearest candidate by the number of letters put in, left
 * out, changed or swapped with their neighbour (optimal string alignment; Damerau 1964, from memory), when that
 * number is small against the length of the word. Cost: length of the word times length of all candidates.
 */
public final class Suggestion {
    private static final int LONGEST_WORD = 100;
    private static final int MOST_EDITS = 3;
    private static final int MOST_LISTED = 12;

    private Suggestion() {
    }

    /** The nearest candidate that is near enough, the first of equals; a difference in case counts for nothing. */
    public static Optional<String> among(Collection<String> candidates, String word) {
        String sought = word.toLowerCase(Locale.ROOT);
        int nearest = Math.min(MOST_EDITS, (sought.codePointCount(0, sought.length()) + 1) / 3) + 1;
        Optional<String> best = Optional.empty();
        if (sought.length() > LONGEST_WORD) {
            return best;
        }
        for (String candidate : candidates) {
            int distance = distance(sought, candidate.toLowerCase(Locale.ROOT), nearest);
            if (distance < nearest) {
                nearest = distance;
                best = Optional.of(candidate);
            }
        }
        return best;
    }

    /** {@code "; did you mean 'both'?"} to end a fault's message with, or nothing when no candidate is near. */
    public static String didYouMean(Collection<String> candidates, String word) {
        return among(candidates, word).map(near -> "; did you mean '" + near + "'?").orElse("");
    }

    /** The same, or all candidates when none is near and they are few: {@code "; there are 'both' and 'one'"}. */
    public static String didYouMeanOrAll(Collection<String> candidates, String word) {
        String meant = didYouMean(candidates, word);
        if (!meant.isEmpty() || candidates.size() < 2 || candidates.size() > MOST_LISTED) {
            return meant;
        }
        List<String> quoted = candidates.stream().map(each -> "'" + each + "'").toList();
        return "; there are " + String.join(", ", quoted.subList(0, quoted.size() - 1)) + " and "
                + quoted.get(quoted.size() - 1);
    }

    /** The number of edits between two words, or {@code bound} when it isn't below that. */
    static int distance(String from, String to, int bound) {
        int[] a = from.codePoints().limit(LONGEST_WORD + 1L).toArray();
        int[] b = to.codePoints().limit(LONGEST_WORD + 1L).toArray();
        if (Math.abs(a.length - b.length) >= bound) {
            return bound;
        }
        int[] beforeLast = new int[b.length + 1];
        int[] last = new int[b.length + 1];
        int[] row = new int[b.length + 1];
        for (int j = 0; j <= b.length; j++) {
            row[j] = j;
        }
        for (int i = 1; i <= a.length; i++) {
            int[] free = beforeLast;
            beforeLast = last;
            last = row;
            row = free;
            row[0] = i;
            for (int j = 1; j <= b.length; j++) {
                int changed = last[j - 1] + (a[i - 1] == b[j - 1] ? 0 : 1);
                row[j] = Math.min(changed, 1 + Math.min(last[j], row[j - 1]));
                if (i > 1 && j > 1 && a[i - 1] == b[j - 2] && a[i - 2] == b[j - 1]) {
                    row[j] = Math.min(row[j], beforeLast[j - 2] + 1);
                }
            }
        }
        return Math.min(row[b.length], bound);
    }
}
