package org.pofk.meaning;

import java.util.Optional;

/** slope · k + offset. */
record Affine(Scalar slope, Scalar offset) {

    /** The same in whole numbers, where both are at face value. */
    Optional<Whole> whole() {
        return slope.whole().flatMap(a -> offset.whole().map(b -> new Whole(a, b)));
    }

    /** slope · k + offset in whole numbers. */
    record Whole(int slope, int offset) {

        long valueAt(long k) {
            return slope * k + offset;
        }
    }
}
