package org.pofk.claim;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import org.pofk.exact.ComplexBall;
import org.pofk.meaning.Decision;
import org.pofk.meaning.Quantity;

/**
 * The difference of two real sequences as strands: waves whose bases are proved equal are one, those that vanish are
 * gone, and of the others each is put beside its nearest of the other sequence. Exact; which are nearest is guessed,
 * which only makes bounds wider.
 */
final class Strands {
    private static final int BITS = 96;

    private Strands() {
    }

    /** first − second. */
    static List<Strand> ofDifference(List<Wave> first, List<Wave> second) {
        List<Wave> ours = new ArrayList<>();
        List<Wave> theirs = new ArrayList<>();
        first.forEach(wave -> {
            if (!isAdded(normal(wave), ours)) {
                ours.add(normal(wave));
            }
        });
        second.stream().map(Wave::negate).map(Strands::normal).forEach(wave -> {
            if (!isAdded(wave, ours) && !isAdded(wave, theirs)) {
                theirs.add(wave);
            }
        });
        ours.removeIf(wave -> vanishes(wave.coefficient()));
        theirs.removeIf(wave -> vanishes(wave.coefficient()));
        return paired(ours, theirs);
    }

    /** Whether one of the waves has the same base, to which this then is added. */
    private static boolean isAdded(Wave wave, List<Wave> waves) {
        for (int i = 0; i < waves.size(); i++) {
            Wave other = waves.get(i);
            if (other.power() == wave.power() && Wave.areEqual(other.base(), wave.base()) == Decision.YES) {
                waves.set(i, other.withCoefficient(other.coefficient().plus(wave.coefficient())));
                return true;
            }
        }
        return false;
    }

    /** The same real part, from the upper half-plane. */
    private static Wave normal(Wave wave) {
        return wave.base().enclose(BITS).imaginary().isNegative() ? wave.conjugate() : wave;
    }

    private static boolean vanishes(Quantity number) {
        return number.enclose(BITS).containsZero() && number.isZero() == Decision.YES;
    }

    private record Pairing(Wave ours, Wave theirs, double distance) {
    }

    private static List<Strand> paired(List<Wave> ours, List<Wave> theirs) {
        List<Pairing> pairings = new ArrayList<>();
        for (Wave a : ours) {
            theirs.stream().filter(b -> b.power() == a.power())
                    .forEach(b -> pairings.add(new Pairing(a, b, distance(a.base(), b.base()))));
        }
        pairings.sort(Comparator.comparingDouble(Pairing::distance));
        List<Strand> strands = new ArrayList<>();
        List<Wave> left = new ArrayList<>(Stream.concat(ours.stream(), theirs.stream()).toList());
        for (Pairing pairing : pairings) {
            if (left.contains(pairing.ours) && left.contains(pairing.theirs)) {
                left.remove(pairing.ours);
                left.remove(pairing.theirs);
                strands.add(new Strand(pairing.ours, Optional.of(pairing.theirs)));
            }
        }
        left.forEach(wave -> strands.add(new Strand(wave, Optional.empty())));
        return strands;
    }

    private static double distance(Quantity a, Quantity b) {
        ComplexBall difference = a.enclose(BITS).minus(b.enclose(BITS));
        return Math.hypot(difference.real().middle().approximate(), difference.imaginary().middle().approximate());
    }
}
