package org.pofk.modes;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.pofk.exact.Enclosed;
import org.pofk.exact.EnclosedComplex;
import org.pofk.exact.Rational;

/**
 * The modes of one factor q^e: one for each real root, and one for each conjugate pair, of each power. Exact where a
 * short exact form was found, certified elsewhere; whether a mode is there at all is decided exactly.
 */
final class FactorModes {
    private FactorModes() {
    }

    /** The modes in the order root, power; {@code index} is the factor's place in the denominator. */
    static List<Mode> of(int index, FactorPoles poles, List<Expansion.Coefficient<Rational>> coefficients) {
        List<CoefficientValues> values = coefficients.stream().map(c -> new CoefficientValues(poles, c)).toList();
        List<Mode> modes = new ArrayList<>();
        for (FactorPoles.Pole pole : poles.poles()) {
            for (int power = 0; power < values.size(); power++) {
                if (values.get(power).isPresent(pole.root())) {
                    modes.add(mode(index, pole, power, values.get(power)));
                }
            }
        }
        return modes;
    }

    private static Mode mode(int factor, FactorPoles.Pole pole, int power, CoefficientValues values) {
        EnclosedComplex value = values.at(pole.root());
        Optional<ElementAtRoot> element = values.element(pole.root(), value);
        if (pole.angle().isEmpty()) {
            RealValue coefficient = RealValue.of(element.flatMap(ElementAtRoot::radical), value.realPart());
            return new Mode.Geometric(factor, pole.root().index(), power, pole.size(), coefficient);
        }
        Polar polar = element.map(e -> Polar.of(e, pole.squaredModulus())).orElse(Polar.unknown());
        return new Mode.Oscillating(factor, pole.root().index(), power, pole.size(), pole.angle().get(),
                amplitude(polar, value), RealValue.ofAngle(polar.angle(), value.argument()));
    }

    /** 2|R|: what the pair R λ^n and its conjugate come to together. */
    static RealValue amplitude(Polar polar, EnclosedComplex value) {
        return RealValue.of(polar.modulus().map(r -> r.times(Rational.TWO)),
                value.modulus().times(Enclosed.of(Rational.TWO)));
    }
}
