package org.pofk.claim;

import java.util.Optional;
import java.util.OptionalLong;
import org.pofk.exact.Rational;
import org.pofk.meaning.Carried;
import org.pofk.text.Position;

/**
 * One step of a derivation as its author states it.
 *
 * @param number   its place in the file, from 1
 * @param kind     the file's word for it: {@code long run}
 * @param of       what it is about as the file names it: an output, set, state or {@code all}
 * @param where    the author's place for it, {@code eq. (3)}
 * @param steps    the steps it is claimed for
 * @param carried  how precisely its numbers are carried, where the author says so for it or for the whole file
 * @param within   how far off it may be, where it is claimed as an approximation
 */
public record Claim(int number, String kind, String of, Statement statement, Optional<String> where, Steps steps,
        Optional<Carried> carried, Optional<Within> within, Optional<SafeSide> safeSide, Optional<String> note,
        Position position) {

    /** From a first step, to a last one where there is one. */
    public record Steps(long from, OptionalLong to) {
        public static final Steps ALL = new Steps(0, OptionalLong.empty());
    }

    /** An absolute error, or one relative to the true value ({@code 2%}). */
    public record Within(Rational amount, boolean relative) {
    }

    /** On which side of the true value an approximation is safe. */
    public enum SafeSide { ABOVE, BELOW }
}
