package org.pofk.input;

import java.util.Optional;
import org.pofk.chain.Model.Written;
import org.pofk.chain.Model.Written.Form;
import org.pofk.exact.Rational;
import org.pofk.text.Position;

/**
 * One written part of what is shared out: the probability of one move, or of starting in a state.
 *
 * @param state   place of the state that receives it
 * @param value   nothing for {@code rest}
 * @param written as in the file
 */
record Share(int state, Optional<Rational> value, Position position, String written, Form form) {

    boolean isRest() {
        return value.isEmpty();
    }

    /** Kept as it is written, as a move out of a state. */
    Written from(int origin) {
        return new Written(origin, state, written, form);
    }

    /** The value, zero for {@code rest}. */
    Rational amount() {
        return value.orElse(Rational.ZERO);
    }

    /** As written, with the number it comes to where that isn't plain. */
    String inWords() {
        String exact = Numbers.shown(amount());
        String text = Words.shortened(written);
        return text.equals(exact) || Numerals.isNumeral(written) ? text : text + " = " + exact;
    }
}
