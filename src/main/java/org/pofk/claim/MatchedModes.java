package org.pofk.claim;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.pofk.claim.ClaimedMode.ClaimedTerm;
import org.pofk.exact.ComplexBall;
import org.pofk.meaning.ExponentialSum;
import org.pofk.meaning.Quantity;

/**
 * The terms of a formula in k beside the true poles they stand for. A guess, by distance as far as the decimals allow
 * and then by coefficient; what follows from it is proved by the equations it gives.
 *
 * @param byPole the terms for each true pole, none where it is missing
 * @param extra  what stands for no pole
 */
record MatchedModes(Map<TruePole, List<ClaimedTerm>> byPole, List<ClaimedTerm> extra) {
    private static final int BITS = 64;
    private static final double SAME = 1e-13;

    private record Pairing(ClaimedMode mode, TruePole pole, double beyond, double coefficient, double distance) {
    }

    static MatchedModes of(ExponentialSum claimed, List<TruePole> poles) {
        List<ClaimedMode> modes = modes(claimed);
        List<Pairing> pairings = new ArrayList<>();
        for (TruePole pole : poles) {
            ComplexBall at = pole.value().enclose(BITS);
            for (ClaimedMode mode : modes) {
                pairings.add(new Pairing(mode, pole, mode.distance(at), coefficientDistance(mode, pole),
                        mode.distanceAtFaceValue(at)));
            }
        }
        pairings.sort(Comparator.comparingDouble(Pairing::beyond).thenComparingDouble(Pairing::coefficient)
                .thenComparingDouble(Pairing::distance));
        return assigned(poles, modes, pairings);
    }

    private static MatchedModes assigned(List<TruePole> poles, List<ClaimedMode> modes, List<Pairing> pairings) {
        Map<TruePole, List<ClaimedTerm>> byPole = new LinkedHashMap<>();
        poles.forEach(pole -> byPole.put(pole, new ArrayList<>()));
        List<ClaimedMode> left = new ArrayList<>(modes);
        for (Pairing pairing : pairings) {
            if (left.contains(pairing.mode) && byPole.get(pairing.pole).isEmpty()) {
                byPole.get(pairing.pole).addAll(pairing.mode.terms());
                left.remove(pairing.mode);
            }
        }
        for (Pairing pairing : pairings) {
            if (pairing.beyond == 0 && left.remove(pairing.mode)) {
                byPole.get(pairing.pole).addAll(pairing.mode.terms());
            }
        }
        return new MatchedModes(byPole, left.stream().flatMap(mode -> mode.terms().stream()).toList());
    }

    private static List<ClaimedMode> modes(ExponentialSum claimed) {
        List<List<ClaimedTerm>> groups = new ArrayList<>();
        for (ExponentialSum.Term term : claimed.terms()) {
            ClaimedTerm each = ClaimedTerm.of(term);
            ComplexBall upper = each.isBelow() ? each.atFaceValue().conjugate() : each.atFaceValue();
            groups.stream().filter(group -> group.get(0).distanceAtFaceValue(upper) < SAME)
                    .filter(group -> group.stream().noneMatch(each::isRival)).findFirst()
                    .orElseGet(() -> {
                        groups.add(new ArrayList<>());
                        return groups.get(groups.size() - 1);
                    }).add(each);
        }
        return groups.stream().map(ClaimedMode::new).toList();
    }

    /** How far the sizes of both coefficients are apart. */
    private static double coefficientDistance(ClaimedMode mode, TruePole pole) {
        return Math.abs(size(mode.terms().get(0).term().coefficient())
                - size(pole.coefficients().get(0)) * (pole.isReal() ? 1 : 2));
    }

    private static double size(Quantity number) {
        return number.enclose(BITS).modulus().middle().approximate();
    }
}
