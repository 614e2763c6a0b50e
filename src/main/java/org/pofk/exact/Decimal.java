package org.pofk.exact;

/**
 * A number written in decimals.
 *
 * @param text  {@code 0.25}, {@code -7.281e-4}
 * @param value exactly what the text denotes, so that the error of a formula as printed can be bounded
 * @param exact whether that is the number itself; otherwise it is within 0.51 units of the text's last place
 */
public record Decimal(String text, Rational value, boolean exact) {
    public static final Decimal ZERO = new Decimal("0", Rational.ZERO, true);

    @Override
    public String toString() {
        return text;
    }
}
