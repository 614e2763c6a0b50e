package org.pofk.claim;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.SortedMap;
import java.util.TreeMap;
import java.util.function.LongPredicate;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.pofk.exact.Ball;
import org.pofk.meaning.Decision;
import org.pofk.meaning.ExponentialSum;
import org.pofk.meaning.Quantity;

/**
 * How far a formula at face value is from p(k), as a function of k: claimed(k) − p(k), or that over p(k). Relative
 * errors are those of both sequences over r^k, r the modulus of the largest pole of p, which changes nothing and keeps
 * what decays in sight. Exact; enclosed with {@link #enclose}.
 *
 * @param difference claimed − p
 * @param impulses   what the difference has besides at single steps
 * @param reference  p where the error is relative
 */
record ErrorCurve(List<TurningStrand> difference, SortedMap<Long, Quantity> impulses, Optional<Reference> reference) {

    /**
     * p(k) with its largest modulus.
     *
     * @param vanishes where p(k) is zero
     * @param agrees   where, that being so, the formula is zero too
     */
    record Reference(List<TurningStrand> truth, SortedMap<Long, Quantity> impulses, Quantity largest,
            LongPredicate vanishes, LongPredicate agrees) {
    }

    static ErrorCurve absolute(ExponentialSum claimed, OutputTruth truth) {
        return of(claimedWaves(claimed), claimed.impulses(), truth);
    }

    /** The error of a sum of waves with these impulses. */
    static ErrorCurve of(List<Wave> claimed, Map<Long, Quantity> claimedImpulses, OutputTruth truth) {
        return new ErrorCurve(turning(Strands.ofDifference(claimed, trueWaves(truth))),
                difference(claimedImpulses, trueImpulses(truth)), Optional.empty());
    }

    static ErrorCurve relative(ExponentialSum claimed, OutputTruth truth) {
        Quantity largest = truth.poles().stream().map(TruePole::modulus)
                .max((a, b) -> a.enclose(64).real().middle().compareTo(b.enclose(64).real().middle()))
                .orElse(Quantity.ONE);
        List<Wave> trueWaves = trueWaves(truth).stream().map(wave -> wave.over(largest)).toList();
        List<Wave> claimedWaves = claimedWaves(claimed).stream().map(wave -> wave.over(largest)).toList();
        return new ErrorCurve(turning(Strands.ofDifference(claimedWaves, trueWaves)),
                difference(claimed.impulses(), trueImpulses(truth)), Optional.of(new Reference(
                        turning(Strands.ofDifference(trueWaves, List.of())), trueImpulses(truth), largest,
                        k -> truth.valueAt(k).isZero(), k -> claimed.valueAt(k).isZero() == Decision.YES)));
    }

    static List<Wave> claimedWaves(ExponentialSum claimed) {
        return claimed.terms().stream().map(Wave::of).toList();
    }

    static List<Wave> trueWaves(OutputTruth truth) {
        return truth.poles().stream().flatMap(pole -> Wave.of(pole).stream()).toList();
    }

    static SortedMap<Long, Quantity> trueImpulses(OutputTruth truth) {
        SortedMap<Long, Quantity> impulses = new TreeMap<>();
        for (int k = 0; k < truth.impulses().size(); k++) {
            impulses.put((long) k, Quantity.of(truth.impulses().get(k)));
        }
        return impulses;
    }

    private static SortedMap<Long, Quantity> difference(Map<Long, Quantity> claimed, Map<Long, Quantity> truth) {
        SortedMap<Long, Quantity> all = new TreeMap<>(claimed);
        truth.forEach((k, value) -> all.merge(k, value.negate(), Quantity::plus));
        return all;
    }

    private static List<TurningStrand> turning(List<Strand> strands) {
        return strands.stream().map(TurningStrand::of).toList();
    }

    /** The last step at which something is added to the waves; −1 for none. */
    long lastImpulse() {
        return Stream.concat(impulses.keySet().stream(), reference.stream().flatMap(p -> p.impulses.keySet().stream()))
                .mapToLong(Long::longValue).max().orElse(-1);
    }

    EnclosedError enclose(int bits) {
        return new EnclosedError(EnclosedWaves.of(difference, bits), balls(impulses, bits),
                reference.map(p -> new EnclosedError.Reference(EnclosedWaves.of(p.truth, bits),
                        balls(p.impulses, bits), p.largest.enclose(bits).real().roundedTo(bits), p.vanishes, p.agrees)), bits);
    }

    private static Map<Long, Ball> balls(Map<Long, Quantity> values, int bits) {
        return values.entrySet().stream().collect(Collectors.toMap(Map.Entry::getKey,
                entry -> entry.getValue().enclose(bits).real().roundedTo(bits)));
    }
}
