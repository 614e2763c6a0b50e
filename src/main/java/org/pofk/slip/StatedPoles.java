package org.pofk.slip;

import java.util.ArrayList;
import java.util.List;
import org.pofk.claim.AuthorText;
import org.pofk.exact.Ball;
import org.pofk.exact.Rational;
import org.pofk.meaning.ExponentialSum;
import org.pofk.meaning.Precision;
import org.pofk.meaning.Quantity;
import org.pofk.meaning.RationalForm;
import org.pofk.modes.Mode;
import org.pofk.text.RefusedException;

/** The real poles that a formula states, with their powers: a term that stands there isn't missing. */
final class StatedPoles {
    private static final int BITS = 64;

    private final List<Stated> all = new ArrayList<>();
    private final Rational relative;

    private record Stated(Rational pole, int power) {
    }

    private StatedPoles(int digits) {
        this.relative = digits == 0 ? Rational.TWO.pow(-BITS / 2) : Rational.of(10).pow(1 - digits);
    }

    /** Those of a formula in k; {@code digits}: as precisely as so many significant ones, 0 where they are exact. */
    static StatedPoles ofSteps(AuthorText text, int digits) {
        StatedPoles stated = new StatedPoles(digits);
        try {
            ExponentialSum.of(text.tree(), Precision.AS_WRITTEN).terms().stream().filter(term -> !term.oscillates())
                    .forEach(term -> stated.add(term.base(), term.power()));
        } catch (RefusedException | ArithmeticException unusable) {
            stated.all.clear();
        }
        return stated;
    }

    /** Those of a transform. */
    static StatedPoles ofTransform(AuthorText text, int digits) {
        StatedPoles stated = new StatedPoles(digits);
        try {
            RationalForm.of(text.tree(), "z", Precision.AS_WRITTEN).summands().stream()
                    .flatMap(summand -> summand.factors().stream())
                    .filter(factor -> factor.exponent() < 0 && factor.degree() == 1)
                    .forEach(factor -> stated.add(factor.coefficients().get(0).negate()
                            .dividedBy(factor.coefficients().get(1)), -factor.exponent() - 1));
        } catch (RefusedException | ArithmeticException unusable) {
            stated.all.clear();
        }
        return stated;
    }

    private void add(Quantity pole, int power) {
        Ball real = pole.enclose(BITS).real();
        if (pole.enclose(BITS).imaginary().containsZero()) {
            all.add(new Stated(real.middle(), power));
        }
    }

    /** Whether a mode's pole is stated with its power. */
    boolean have(Mode mode) {
        if (!(mode instanceof Mode.Geometric geometric)) {
            return false;
        }
        Rational base = geometric.base().enclosure().enclose(BITS).middle();
        return all.stream().anyMatch(each -> each.power() == geometric.power()
                && each.pole().minus(base).abs().compareTo(base.abs().times(relative)) <= 0);
    }
}
