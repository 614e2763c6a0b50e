package org.pofk.longrun;

import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.stream.Collectors;
import org.pofk.exact.Ball;
import org.pofk.exact.Cyclotomic;
import org.pofk.exact.Enclosed;
import org.pofk.exact.Factorization;
import org.pofk.exact.Polynomial;
import org.pofk.exact.Rational;
import org.pofk.modes.ClosedForm;
import org.pofk.modes.Mode;

/**
 * A mode that dies out: |its value at k| ≤ amplitude · binomial(k, power) · modulus^(k−power), modulus below one.
 *
 * @param factor of the denominator, which the mode's pole is a root of; none of its roots lies on the unit circle
 */
public record DecayingMode(Enclosed amplitude, Enclosed modulus, int power, Polynomial<Rational> factor) {

    /** The modes of a closed form with a long run, besides impulses and those of cyclotomic factors, which stay. */
    public static List<DecayingMode> of(ClosedForm closedForm) {
        Decay decay = Decay.ofThoseThatDecay(closedForm);
        return closedForm.modes().stream().map(mode -> mode.accept(decay)).flatMap(Optional::stream)
                .toList();
    }

    /** The modes themselves. */
    static List<Mode> decaying(ClosedForm closedForm) {
        Decay decay = Decay.ofThoseThatDecay(closedForm);
        return closedForm.modes().stream().filter(mode -> mode.accept(decay).isPresent()).toList();
    }

    /** One that does decay. */
    public static DecayingMode of(ClosedForm closedForm, Mode mode) {
        return mode.accept(new Decay(polynomials(closedForm), Set.of())).orElseThrow();
    }

    private static List<Polynomial<Rational>> polynomials(ClosedForm closedForm) {
        return closedForm.transform().factors().factors().stream().map(Factorization.Factor::polynomial).toList();
    }

    /** Whether all roots of a factor are roots of unity. */
    private static boolean stays(Polynomial<Rational> factor) {
        return Cyclotomic.ordersDividing(factor).stream().mapToInt(Cyclotomic::totient).sum() == factor.degree();
    }

    /** By enclosures; 0 when they overlap. */
    int compareModulus(DecayingMode other, int bits) {
        Ball own = modulus.enclose(bits);
        Ball others = other.modulus.enclose(bits);
        return own.overlaps(others) ? 0 : own.middle().compareTo(others.middle());
    }

    /** Values of impulses, and modes that stay, are left out. */
    private record Decay(List<Polynomial<Rational>> factors, Set<Polynomial<Rational>> staying)
            implements Mode.Visitor<Optional<DecayingMode>> {

        static Decay ofThoseThatDecay(ClosedForm closedForm) {
            List<Polynomial<Rational>> factors = polynomials(closedForm);
            return new Decay(factors, factors.stream().filter(DecayingMode::stays).collect(Collectors.toSet()));
        }

        @Override
        public Optional<DecayingMode> impulse(Mode.Impulse impulse) {
            return Optional.empty();
        }

        @Override
        public Optional<DecayingMode> geometric(Mode.Geometric geometric) {
            return decaying(bits -> geometric.coefficient().enclosure().enclose(bits).abs(),
                    bits -> geometric.base().enclosure().enclose(bits).abs(), geometric.power(), geometric.factor());
        }

        @Override
        public Optional<DecayingMode> oscillating(Mode.Oscillating oscillating) {
            return decaying(oscillating.amplitude().enclosure(), oscillating.modulus().enclosure(),
                    oscillating.power(), oscillating.factor());
        }

        private Optional<DecayingMode> decaying(Enclosed amplitude, Enclosed modulus, int power, int place) {
            Polynomial<Rational> factor = factors.get(place);
            return staying.contains(factor) ? Optional.empty()
                    : Optional.of(new DecayingMode(amplitude, modulus, power, factor));
        }
    }
}
