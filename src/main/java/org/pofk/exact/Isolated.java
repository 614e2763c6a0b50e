package org.pofk.exact;

import java.math.BigInteger;

/**
 * A disc that holds exactly one root ξ, and room around it: every other root is at least 2^gapExponent from ξ, and
 * radius · n ≤ 2^−8 · 2^gapExponent, so that Newton's iteration from the center converges. Certified.
 *
 * @param loss as in {@link Evaluation#loss}
 */
record Isolated(Disc disc, int gapExponent, int loss) {
    private static final int LEAST_PRECISION = 32;

    /**
     * The same root in a disc of radius at most 2^goal, by Newton's iteration. With e = z − ξ and S = Σ 1/(z − ξ_j) over
     * the other roots, p′/p = 1/e + S, so the exact step leaves e² S / (1 + eS), where |eS| ≤ 1/4 and
     * |S| ≤ n · 2^(1 − gap); what rounding adds is bounded beside it.
     */
    Isolated refine(BoundedHorner polynomial, int goal) {
        Isolated best = this;
        int extra = 0;
        while (best.disc.radiusExponent() > goal) {
            Isolated next = best.step(polynomial, goal, extra);
            extra = next.disc.radiusExponent() < best.disc.radiusExponent() ? 0 : 2 * extra + 32;
            if (extra == 0) {
                best = next;
            }
        }
        return best;
    }

    private Isolated step(BoundedHorner polynomial, int goal, int extraPrecision) {
        int wanted = Math.max(exactStep(polynomial.degree()), goal - 3);
        int precision = Math.max(LEAST_PRECISION, precisionFor(wanted, polynomial.degree()) + extraPrecision);
        Evaluation value = polynomial.at(disc.x(), disc.y(), disc.scale(), precision);
        return value.slopeExponent().isPresent() ? after(value, wanted) : this;
    }

    private int precisionFor(int wanted, int degree) {
        return loss + Evaluation.ceilingLog(degree) + 6 - wanted;
    }

    /** What the exact step leaves is at most 2^this. */
    private int exactStep(int degree) {
        return 2 * disc.radiusExponent() + Evaluation.ceilingLog(degree) - gapExponent + 2;
    }

    /** As close as one step from the center gets; p and p′ there are known, p′ not zero. */
    Isolated after(Evaluation value) {
        Isolated next = after(value, exactStep(value.degree()));
        return next.disc.radiusExponent() < disc.radiusExponent() ? next : this;
    }

    private Isolated after(Evaluation value, int wanted) {
        int slope = value.slopeExponent().orElseThrow();
        int scale = Math.max(1, 3 - wanted);
        Evaluation.Correction correction = value.correction(scale);
        int correctionExponent = correction.x().abs().add(correction.y().abs()).bitLength() + 1 - scale;
        int rounding = Math.max(value.errorExponent(), correctionExponent + value.slopeErrorExponent()) + 1 - slope;
        int radius = Math.max(Math.max(exactStep(value.degree()), rounding), 2 - scale) + 2;
        return new Isolated(moved(correction, scale, radius), gapExponent, value.loss());
    }

    private Disc moved(Evaluation.Correction correction, int scale, int radiusExponent) {
        BigInteger x = onScale(disc.x(), scale).subtract(correction.x());
        BigInteger y = disc.isOnAxis() ? BigInteger.ZERO : onScale(disc.y(), scale).subtract(correction.y());
        return new Disc(x, y, scale, radiusExponent);
    }

    private BigInteger onScale(BigInteger units, int scale) {
        int shift = scale - disc.scale();
        return shift >= 0 ? units.shiftLeft(shift) : units.shiftRight(-shift);
    }
}
