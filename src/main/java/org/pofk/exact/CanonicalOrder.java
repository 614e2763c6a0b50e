package org.pofk.exact;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.function.Function;

/**
 * The order of roots. Real numbers: descending, decided by refinement, which ends because they differ. Numbers of the
 * upper half-plane: ascending angle, then descending modulus.
 *
 * <p>Equal angles (or moduli) can't be told by refinement from nearly equal ones, so refinement stops: directions whose
 * angles differ by less than about 2^−{@value #TIE_BITS}, as enclosed to {@value #BITS} bits, count as equal, and so do
 * moduli within that of each other. What is equal in both is ordered by descending real part, then by descending
 * imaginary part, of the enclosures at a precision where the rectangles are disjoint. So the order always ends, and
 * follows angle and modulus wherever these differ by more than that.
 */
final class CanonicalOrder {
    private static final int COARSE_BITS = 48;
    private static final int BITS = 96;
    private static final int TIE_BITS = 64;

    private CanonicalOrder() {
    }

    static List<EnclosedComplex> descending(List<EnclosedComplex> real) {
        return real.stream().sorted((a, b) -> compare(b, a)).toList();
    }

    private static int compare(EnclosedComplex a, EnclosedComplex b) {
        for (int bits = 32; ; bits *= 2) {
            Ball left = a.enclose(bits).real();
            Ball right = b.enclose(bits).real();
            if (!left.overlaps(right)) {
                return left.middle().compareTo(right.middle());
            }
            if (bits > Raising.MOST_BITS) {
                throw new AssertionError("two roots that don't differ at " + left);
            }
        }
    }

    static List<EnclosedComplex> byAngle(List<EnclosedComplex> above) {
        List<EnclosedComplex> guess = above.stream().sorted(Comparator.comparingDouble(z -> {
            ComplexBall coarse = z.enclose(COARSE_BITS);
            return Math.atan2(coarse.imaginary().middle().approximate(), coarse.real().middle().approximate());
        })).toList();
        return areFarApart(guess) ? guess : byAngleWithTies(above);
    }

    /** Proved: each angle is above the one before by 2^−TIE_BITS at least. Cheaper than angles; most often enough. */
    private static boolean areFarApart(List<EnclosedComplex> ordered) {
        Rational tolerance = Rational.TWO.pow(-TIE_BITS / 2);
        for (int i = 1; i < ordered.size(); i++) {
            ComplexBall before = ordered.get(i - 1).enclose(COARSE_BITS);
            ComplexBall next = ordered.get(i).enclose(COARSE_BITS);
            // |z| |w| sin of the difference, which is above its sine
            Ball cross = before.real().times(next.imaginary()).minus(before.imaginary().times(next.real()));
            Rational least = before.modulus().upper().times(next.modulus().upper()).times(tolerance);
            if (cross.lower().compareTo(least) <= 0) {
                return false;
            }
        }
        return true;
    }

    private static List<EnclosedComplex> byAngleWithTies(List<EnclosedComplex> above) {
        List<EnclosedComplex> ordered = new ArrayList<>();
        for (List<Keyed> sameAngle : groups(keyed(above, EnclosedComplex::argument), Comparator.naturalOrder())) {
            List<EnclosedComplex> group = sameAngle.stream().map(Keyed::number).toList();
            for (List<Keyed> same : groups(keyed(group, EnclosedComplex::modulus), Comparator.reverseOrder())) {
                ordered.addAll(byParts(same.stream().map(Keyed::number).toList()));
            }
        }
        return ordered;
    }

    private record Keyed(EnclosedComplex number, Rational key) {
    }

    private static List<Keyed> keyed(List<EnclosedComplex> numbers,
            Function<EnclosedComplex, Enclosed> key) {
        if (numbers.size() < 2) {
            return numbers.stream().map(z -> new Keyed(z, Rational.ZERO)).toList();
        }
        return numbers.stream().map(z -> new Keyed(z, key.apply(z).enclose(BITS).middle())).toList();
    }

    /** Sorted by key; neighbours closer than 2^−64 (relative above one) are in one group. */
    private static List<List<Keyed>> groups(List<Keyed> all, Comparator<Rational> order) {
        List<List<Keyed>> groups = new ArrayList<>();
        Rational last = Rational.ZERO;
        for (Keyed next : all.stream().sorted(Comparator.comparing(Keyed::key, order)).toList()) {
            Rational tolerance = Rational.max(Rational.ONE, next.key).times(Rational.TWO.pow(-TIE_BITS));
            if (groups.isEmpty() || next.key.minus(last).abs().compareTo(tolerance) >= 0) {
                groups.add(new ArrayList<>());
            }
            groups.get(groups.size() - 1).add(next);
            last = next.key;
        }
        return groups;
    }

    private static List<EnclosedComplex> byParts(List<EnclosedComplex> numbers) {
        int bits = BITS;
        while (anyOverlap(numbers, bits)) {
            bits *= 2;
        }
        int separated = bits;
        Comparator<EnclosedComplex> byReal = Comparator.comparing(z -> z.enclose(separated).real().middle());
        Comparator<EnclosedComplex> byImaginary = Comparator.comparing(z -> z.enclose(separated).imaginary().middle());
        return numbers.stream().sorted(byReal.thenComparing(byImaginary).reversed()).toList();
    }

    private static boolean anyOverlap(List<EnclosedComplex> numbers, int bits) {
        for (int i = 0; i < numbers.size(); i++) {
            for (int j = 0; j < i; j++) {
                if (numbers.get(i).enclose(bits).overlaps(numbers.get(j).enclose(bits))) {
                    return true;
                }
            }
        }
        return false;
    }
}
