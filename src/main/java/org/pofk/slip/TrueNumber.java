package org.pofk.slip;

import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.math.BigDecimal;
import org.pofk.exact.Ball;
import org.pofk.exact.Decimals;
import org.pofk.exact.Enclosed;
import org.pofk.exact.Rational;
import org.pofk.formula.Formula;
import org.pofk.formula.Formulas;
import org.pofk.meaning.Quantity;

/** A number that is right somewhere: its short exact form where there is one, and its decimals. */
record TrueNumber(Optional<Formula> exact, Enclosed enclosure) {
    private static final int SIGN_BITS = 256;
    private static final int MOST_PLACES = 60;

    static TrueNumber of(Rational value) {
        return new TrueNumber(Optional.of(Formulas.number(value)), Enclosed.of(value));
    }

    /** The real part of a number. */
    static TrueNumber realPart(Quantity number) {
        return new TrueNumber(Optional.empty(), bits -> number.enclose(bits).real());
    }

    static TrueNumber imaginaryPart(Quantity number) {
        return new TrueNumber(Optional.empty(), bits -> number.enclose(bits).imaginary());
    }

    Optional<Rational> rational() {
        return exact.filter(Formula.Number.class::isInstance).map(number -> ((Formula.Number) number).value());
    }

    /** Its size without its sign. */
    TrueNumber absolute() {
        Ball ball = enclosure.enclose(SIGN_BITS);
        return ball.isNegative() ? negative() : this;
    }

    private TrueNumber negative() {
        return new TrueNumber(exact.map(Formulas::opposite), enclosure.negate());
    }

    boolean isNegative() {
        return enclosure.enclose(SIGN_BITS).isNegative();
    }

    /** As one would write it in the place of a text: with as many places or digits, or as exactly as it stands there. */
    List<String> inPlaceOf(String found, Precisions digits, AuthorNotation notation) {
        Set<String> texts = new LinkedHashSet<>();
        if (Digits.isNumber(found) && !found.chars().allMatch(Character::isDigit)) {
            BigDecimal written = new BigDecimal(found);
            places(written.scale()).ifPresent(texts::add);
            significant(written.precision()).ifPresent(texts::add);
            significant(digits.significant()).ifPresent(texts::add);
            places(digits.places()).ifPresent(texts::add);
        } else {
            exact.ifPresent(formula -> texts.add(notation.write(formula)));
        }
        return new ArrayList<>(texts);
    }

    private Optional<String> places(int places) {
        if (places < 0 || places > MOST_PLACES) {
            return Optional.empty();
        }
        String text = rational().map(value -> Decimals.fixed(value, places))
                .orElseGet(() -> Decimals.fixed(enclosure, places)).text();
        return Optional.of(text).filter(each -> new BigDecimal(each).signum() != 0)
                .map(each -> new BigDecimal(each).setScale(places).toPlainString());
    }

    /** A decimal with zeros at its end, for as many significant digits. */
    static String padded(String decimal, int digits) {
        BigDecimal value = new BigDecimal(decimal);
        return decimal.contains("e") || value.signum() == 0 || value.precision() >= digits ? decimal
                : value.setScale(value.scale() + digits - value.precision()).toPlainString();
    }

    private Optional<String> significant(int digits) {
        if (digits < 1 || enclosure.enclose(SIGN_BITS).containsZero()) {
            return Optional.empty();
        }
        return Optional.of(rational().map(value -> Decimals.of(value, digits))
                .orElseGet(() -> Decimals.of(enclosure, digits)).text()).map(text -> padded(text, digits));
    }

    /** The most digits and places that an author writes in one claim. */
    record Precisions(int significant, int places) {
    }
}
