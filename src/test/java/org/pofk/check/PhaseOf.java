package org.pofk.check;

import java.math.BigDecimal;
import java.util.Optional;

/** A phase as it is printed behind an angle: its sign and size. */
record PhaseOf(int sign, Real size) {
    /** What is added to the phase: for a sine in place of a cosine, or a minus before the amplitude. */
    enum Turn { NONE, QUARTER, HALF }

    /** Nothing where the phase is zero. */
    static Optional<PhaseOf> of(PolarNumber coefficient, Turn turn) {
        BigDecimal added = switch (turn) {
            case NONE -> BigDecimal.ZERO;
            case QUARTER -> Elementary.PI.divide(BigDecimal.valueOf(2), Near.CENTRE);
            case HALF -> coefficient.angle().signum() > 0 ? Elementary.PI.negate() : Elementary.PI;
        };
        BigDecimal phase = coefficient.angle().add(added).round(Near.CENTRE);
        if (phase.abs().compareTo(BigDecimal.ONE.movePointLeft(40)) < 0) {
            return Optional.empty();
        }
        Optional<Real> exact = turn == Turn.NONE ? coefficient.number().surd().filter(Surd::isImaginary)
                .map(surd -> Real.arccos(surd.u(), surd.squaredModulus(), phase.abs())) : turn == Turn.HALF
                ? coefficient.number().surd().filter(Surd::isImaginary).map(surd -> Real.arccos(surd.u().negate(),
                        surd.squaredModulus(), phase.abs())) : Optional.empty();
        return Optional.of(new PhaseOf(phase.signum(), PolarNumber.exactAngle(phase.abs(), exact)));
    }

}
