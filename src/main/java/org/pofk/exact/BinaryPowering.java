package org.pofk.exact;

import java.util.function.BinaryOperator;

/** Powers by squaring: as many squares as the exponent has binary places, and a product for each that is one. */
public final class BinaryPowering {
    private BinaryPowering() {
    }

    /** base^exponent, exponent ≥ 0; the product may round. */
    public static <T> T of(T one, T base, long exponent, BinaryOperator<T> product) {
        T result = one;
        T square = base;
        for (long left = exponent; left > 0; left >>= 1) {
            if ((left & 1) == 1) {
                result = product.apply(result, square);
            }
            if (left > 1) {
                square = product.apply(square, square);
            }
        }
        return result;
    }
}
