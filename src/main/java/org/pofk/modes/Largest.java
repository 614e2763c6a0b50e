package org.pofk.modes;

import java.util.List;
import java.util.Optional;
import org.pofk.exact.Ball;
import org.pofk.exact.Enclosed;
import org.pofk.exact.Rational;
import org.pofk.formula.Formulas;

/** The largest absolute value of several numbers. Certified. */
final class Largest {
    private static final int TOLD_APART_BITS = 128;

    private Largest() {
    }

    /**
     * One of the values without its sign, exact form and all, where it is told apart from those that differ from it.
     * Nothing is enclosed before it is asked for where no value but zero has an exact form.
     */
    static RealValue of(List<RealValue> values) {
        boolean hasExact = values.stream().anyMatch(value -> value.exact().isPresent()
                && value.rational().filter(Rational::isZero).isEmpty());
        return hasExact ? toldApart(values) : new RealValue(Optional.empty(), values.stream()
                .map(value -> value.enclosure().map(Ball::abs))
                .reduce((a, b) -> Enclosed.combine(a, b, Largest::larger)).orElseThrow());
    }

    private static RealValue toldApart(List<RealValue> values) {
        List<RealValue> sizes = values.stream().map(Largest::withoutSign).toList();
        Rational least = sizes.stream().map(size -> ball(size).lower()).max(Rational::compareTo).orElseThrow();
        List<RealValue> candidates = sizes.stream().filter(size -> ball(size).upper().compareTo(least) >= 0).toList();
        RealValue first = candidates.get(0);
        boolean isTold = candidates.size() == 1 || first.exact().isPresent()
                && candidates.stream().allMatch(other -> other.exact().equals(first.exact()));
        return isTold ? first : new RealValue(Optional.empty(), candidates.stream().map(RealValue::enclosure)
                .reduce((a, b) -> Enclosed.combine(a, b, Largest::larger)).orElseThrow());
    }

    private static Ball ball(RealValue value) {
        return value.enclosure().enclose(TOLD_APART_BITS);
    }

    private static RealValue withoutSign(RealValue value) {
        if (value.rational().isPresent()) {
            return RealValue.of(value.rational().get().abs());
        }
        return ball(value).isPositive()
                ? value
                : new RealValue(value.exact().map(Formulas::opposite), value.enclosure().map(Ball::abs));
    }

    private static Ball larger(Ball a, Ball b) {
        int scale = Math.max(a.scale(), b.scale());
        Ball x = a.roundedTo(scale);
        Ball y = b.roundedTo(scale);
        return Ball.between(x.center().subtract(x.radius()).max(y.center().subtract(y.radius())),
                x.center().add(x.radius()).max(y.center().add(y.radius())), scale);
    }
}
