package org.pofk.exact;

/** A root as closely as asked, by Newton's iteration from its isolating disc; keeps the finest disc. Certified. */
final class RefinedRoot implements EnclosedComplex {
    private final BoundedHorner polynomial;
    private volatile Isolated finest;

    RefinedRoot(BoundedHorner polynomial, Isolated first) {
        this.polynomial = polynomial;
        this.finest = first;
    }

    @Override
    public ComplexBall enclose(int bits) {
        int goal = Math.max(0, finest.disc().leastExponent() - 1) - bits - 2;
        Isolated known = finest;
        if (known.disc().radiusExponent() > goal) {
            known = refined(goal);
        }
        ComplexBall rectangle = known.disc().rectangle();
        int enough = 8 - goal;
        // an exact center may come at a coarse scale, on which what is computed from it would stay as coarse
        return rectangle.roundedTo(Math.max(bits, Math.min(rectangle.scale(), enough)));
    }

    private synchronized Isolated refined(int goal) {
        if (finest.disc().radiusExponent() > goal) {
            finest = finest.refine(polynomial, goal);
        }
        return finest;
    }
}
