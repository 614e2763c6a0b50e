package org.pofk.claim;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Random;
import java.util.regex.MatchResult;
import java.util.regex.Pattern;

/** A text with one digit of one of its decimals changed, by more than rounding or cutting off could. */
final class AlteredDigits {
    private static final Pattern DECIMAL = Pattern.compile("\\d+\\.\\d+");

    private AlteredDigits() {
    }

    /** Empty where there is no decimal. */
    static Optional<String> of(String text, Random random) {
        List<MatchResult> decimals = DECIMAL.matcher(text).results().toList();
        if (decimals.isEmpty()) {
            return Optional.empty();
        }
        MatchResult decimal = decimals.get(random.nextInt(decimals.size()));
        List<Integer> places = new ArrayList<>();
        for (int i = decimal.start(); i < decimal.end(); i++) {
            if (text.charAt(i) != '.') {
                places.add(i);
            }
        }
        int place = places.get(random.nextInt(places.size()));
        int digit = text.charAt(place) - '0';
        int other = digit >= 5 ? digit - 2 - random.nextInt(3) : digit + 2 + random.nextInt(3);
        return Optional.of(text.substring(0, place) + (char) ('0' + other) + text.substring(place + 1));
    }

    /** Whether some decimal doesn't end within thirty places: it is rounded. */
    static boolean hasLongDecimal(String text) {
        return DECIMAL.matcher(text).results().anyMatch(match -> match.group().length() > 32);
    }
}
