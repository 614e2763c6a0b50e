package org.pofk.modes;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.pofk.exact.EnclosedComplex;
import org.pofk.exact.Rational;
import org.pofk.modes.StateModes.VectorMode;

/** The modes of all states together: what one factor, or the pole at zero, contributes to every state. */
final class VectorModes {
    private static final RealValue ZERO = RealValue.of(Rational.ZERO);
    private static final RealValue ONE = RealValue.of(Rational.ONE);

    private VectorModes() {
    }

    static List<VectorMode> impulses(List<Expansion<Rational>> states) {
        int last = states.stream().mapToInt(state -> state.impulses().size()).max().orElse(0);
        List<VectorMode> modes = new ArrayList<>();
        for (int at = 0; at < last; at++) {
            int step = at;
            List<RealValue> vector = states.stream().map(Expansion::impulses)
                    .map(all -> step < all.size() ? RealValue.of(all.get(step)) : ZERO).toList();
            if (vector.stream().anyMatch(value -> value.rational().filter(Rational::isZero).isEmpty())) {
                modes.add(new VectorMode(new Mode.Impulse(at, ONE), vector, List.of(), Largest.of(vector)));
            }
        }
        return modes;
    }

    /** In the order root, power; {@code states} holds the coefficients of each state by power. */
    static List<VectorMode> of(int index, FactorPoles poles, List<List<Expansion.Coefficient<Rational>>> states) {
        List<List<CoefficientValues>> values = states.stream()
                .map(state -> state.stream().map(c -> new CoefficientValues(poles, c)).toList()).toList();
        List<VectorMode> modes = new ArrayList<>();
        for (FactorPoles.Pole pole : poles.poles()) {
            for (int power = 0; power < poles.factor().multiplicity(); power++) {
                int p = power;
                List<CoefficientValues> column = values.stream().map(state -> state.get(p)).toList();
                if (column.stream().anyMatch(value -> value.isPresent(pole.root()))) {
                    modes.add(mode(index, pole, power, column));
                }
            }
        }
        return modes;
    }

    private static VectorMode mode(int factor, FactorPoles.Pole pole, int power, List<CoefficientValues> column) {
        if (pole.angle().isEmpty()) {
            List<RealValue> vector = column.stream().map(values -> real(values, pole)).toList();
            return new VectorMode(new Mode.Geometric(factor, pole.root().index(), power, pole.size(), ONE), vector,
                    List.of(), Largest.of(vector));
        }
        List<Rectangular> parts = column.stream().map(values -> rectangular(values, pole)).toList();
        List<RealValue> amplitudes = column.stream().map(values -> amplitude(values, pole)).toList();
        Mode shape = new Mode.Oscillating(factor, pole.root().index(), power, pole.size(), pole.angle().get(), ONE,
                ZERO);
        return new VectorMode(shape, parts.stream().map(Rectangular::cosine).toList(),
                parts.stream().map(Rectangular::sine).toList(), Largest.of(amplitudes));
    }

    private static RealValue real(CoefficientValues values, FactorPoles.Pole pole) {
        if (!values.isPresent(pole.root())) {
            return ZERO;
        }
        EnclosedComplex value = values.at(pole.root());
        return RealValue.of(values.element(pole.root(), value).flatMap(ElementAtRoot::radical), value.realPart());
    }

    private static Rectangular rectangular(CoefficientValues values, FactorPoles.Pole pole) {
        if (!values.isPresent(pole.root())) {
            return Rectangular.ZERO;
        }
        EnclosedComplex value = values.at(pole.root());
        return Rectangular.of(values.element(pole.root(), value), value, pole.squaredModulus());
    }

    private static RealValue amplitude(CoefficientValues values, FactorPoles.Pole pole) {
        if (!values.isPresent(pole.root())) {
            return ZERO;
        }
        EnclosedComplex value = values.at(pole.root());
        Optional<ElementAtRoot> element = values.element(pole.root(), value);
        return FactorModes.amplitude(element.map(e -> Polar.of(e, pole.squaredModulus())).orElse(Polar.unknown()),
                value);
    }
}
