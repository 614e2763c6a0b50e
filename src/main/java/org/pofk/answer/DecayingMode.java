package org.pofk.answer;

import java.util.List;
import java.util.Optional;
import org.pofk.exact.Ball;
import org.pofk.exact.Cyclotomic;
import org.pofk.exact.Enclosed;
import org.pofk.exact.Factorization;
import org.pofk.exact.Rational;
import org.pofk.modes.ClosedForm;
import org.pofk.modes.Mode;

/** A mode that dies out: |its value at k| ≤ amplitude · binomial(k, power) · modulus^(k−power), modulus below one. */
record DecayingMode(Enclosed amplitude, Enclosed modulus, int power) {

    /** The modes of a closed form with a long run, besides impulses and those of cyclotomic factors, which stay. */
    static List<DecayingMode> of(ClosedForm closedForm) {
        List<Boolean> stays = closedForm.transform().factors().factors().stream().map(DecayingMode::stays).toList();
        return closedForm.modes().stream().map(mode -> mode.accept(new Decay(stays))).flatMap(Optional::stream)
                .toList();
    }

    /** The modes themselves. */
    static List<Mode> decaying(ClosedForm closedForm) {
        List<Boolean> stays = closedForm.transform().factors().factors().stream().map(DecayingMode::stays).toList();
        return closedForm.modes().stream().filter(mode -> mode.accept(new Decay(stays)).isPresent()).toList();
    }

    /** One that does decay. */
    static DecayingMode of(ClosedForm closedForm, Mode mode) {
        List<Boolean> stays = closedForm.transform().factors().factors().stream().map(each -> false).toList();
        return mode.accept(new Decay(stays)).orElseThrow();
    }

    /** Whether all roots of a factor are roots of unity. */
    private static boolean stays(Factorization.Factor<Rational> factor) {
        return Cyclotomic.ordersDividing(factor.polynomial()).stream().mapToInt(Cyclotomic::totient).sum()
                == factor.polynomial().degree();
    }

    /** By enclosures; 0 when they overlap. */
    int compareModulus(DecayingMode other, int bits) {
        Ball own = modulus.enclose(bits);
        Ball others = other.modulus.enclose(bits);
        return own.overlaps(others) ? 0 : own.middle().compareTo(others.middle());
    }

    /** Values of impulses, and modes that stay, are left out. */
    private record Decay(List<Boolean> stays) implements Mode.Visitor<Optional<DecayingMode>> {

        @Override
        public Optional<DecayingMode> impulse(Mode.Impulse impulse) {
            return Optional.empty();
        }

        @Override
        public Optional<DecayingMode> geometric(Mode.Geometric geometric) {
            return stays.get(geometric.factor()) ? Optional.empty() : Optional.of(new DecayingMode(
                    bits -> geometric.coefficient().enclosure().enclose(bits).abs(),
                    bits -> geometric.base().enclosure().enclose(bits).abs(), geometric.power()));
        }

        @Override
        public Optional<DecayingMode> oscillating(Mode.Oscillating oscillating) {
            return stays.get(oscillating.factor()) ? Optional.empty() : Optional.of(new DecayingMode(
                    oscillating.amplitude().enclosure(), oscillating.modulus().enclosure(), oscillating.power()));
        }
    }
}
