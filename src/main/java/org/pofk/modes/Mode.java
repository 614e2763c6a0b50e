package org.pofk.modes;

import java.util.List;
import java.util.stream.Stream;

/**
 * One term of a closed form. Power p stands for binomial(k, p) · base^(k−p), zero for k < p; an oscillating term is
 * amplitude · binomial(k, p) · modulus^(k−p) · cos(angle (k−p) + phase), once per conjugate pair.
 * {@code factor} and {@code root} say which factor of the denominator and which of its roots (canonical order).
 */
public sealed interface Mode {

    <R> R accept(Visitor<R> visitor);

    /** True when every constant of this mode has a short exact form. */
    boolean isExact();

    /** Which pole it belongs to: the places of the factor and of the root; empty for an impulse. */
    List<Integer> pole();

    /** One method per variant. */
    interface Visitor<R> {
        R impulse(Impulse impulse);

        R geometric(Geometric geometric);

        R oscillating(Oscillating oscillating);
    }

    /** value at k = at, zero elsewhere. */
    record Impulse(int at, RealValue value) implements Mode {
        @Override
        public boolean isExact() {
            return value.exact().isPresent();
        }

        @Override
        public List<Integer> pole() {
            return List.of();
        }


        @Override
        public <R> R accept(Visitor<R> visitor) {
            return visitor.impulse(this);
        }
    }

    /** A real pole, its sign kept in the base. */
    record Geometric(int factor, int root, int power, RealValue base, RealValue coefficient) implements Mode {
        @Override
        public boolean isExact() {
            return base.exact().isPresent() && coefficient.exact().isPresent();
        }

        @Override
        public List<Integer> pole() {
            return List.of(factor, root);
        }


        @Override
        public <R> R accept(Visitor<R> visitor) {
            return visitor.geometric(this);
        }
    }

    /** A conjugate pair; angle in (0, π), amplitude above 0, phase in (−π, π]. */
    record Oscillating(int factor, int root, int power, RealValue modulus, RealValue angle, RealValue amplitude,
            RealValue phase) implements Mode {
        @Override
        public boolean isExact() {
            return Stream.of(modulus, angle, amplitude, phase).allMatch(value -> value.exact().isPresent());
        }

        @Override
        public List<Integer> pole() {
            return List.of(factor, root);
        }


        @Override
        public <R> R accept(Visitor<R> visitor) {
            return visitor.oscillating(this);
        }
    }
}
