package org.pofk.input;

import java.util.Locale;

/** What is done when probabilities, rounded by their author, don't add up to one. */
enum Sums implements Keyword {
    /** They must add up. */
    EXACT,
    /** Each is divided by their sum. */
    RESCALE,
    /** What is missing or too much goes to staying. */
    GIVE_TO_DIAGONAL;

    @Override
    public String word() {
        return name().toLowerCase(Locale.ROOT).replace('_', ' ');
    }
}
