package org.pofk.claim;

import java.util.List;
import java.util.Optional;
import java.util.stream.IntStream;
import org.pofk.exact.ComplexBall;
import org.pofk.exact.Rational;
import org.pofk.meaning.Decision;
import org.pofk.meaning.ExponentialSum;
import org.pofk.meaning.PolarForm;
import org.pofk.meaning.Quantity;

/**
 * The real part of coefficient · k^power · base^k, a part of a real sequence; a conjugate pair is one wave with twice
 * the coefficient of the upper one. Exact.
 *
 * @param radius a real number with the modulus of the base, where one is written
 */
record Wave(Quantity coefficient, int power, Quantity base, Optional<Quantity> radius) {
    private static final int TOLD_APART_BITS = 96;

    /** What a term of a formula means. */
    static Wave of(ExponentialSum.Term term) {
        return new Wave(turned(term.coefficient(), term.phase()), term.power(), turned(term.base(), term.angle()),
                PolarForm.of(term.base()).map(PolarForm::modulus));
    }

    /** number · e^(i angle). */
    private static Quantity turned(Quantity number, Quantity angle) {
        return angle.rational().filter(Rational::isZero).isPresent()
                ? number
                : number.times(Quantity.i().times(angle).exponential());
    }

    /** What a pole adds to p(k), powers of k by powers of k. */
    static List<Wave> of(TruePole pole) {
        List<Quantity> coefficients = PowersOfK.of(pole);
        Rational doubled = pole.isReal() ? Rational.ONE : Rational.TWO;
        return IntStream.range(0, coefficients.size())
                .mapToObj(power -> new Wave(coefficients.get(power).times(doubled), power, pole.value(),
                        Optional.empty())).toList();
    }

    Wave negate() {
        return withCoefficient(coefficient.negate());
    }

    Wave withCoefficient(Quantity other) {
        return new Wave(other, power, base, radius);
    }

    /** The same real part from the other half-plane. */
    Wave conjugate() {
        return new Wave(coefficient.conjugate(), power, base.conjugate(), radius);
    }

    Wave over(Quantity divisor) {
        return new Wave(coefficient, power, base.dividedBy(divisor), radius.map(size -> size.dividedBy(divisor)));
    }

    /** Whether the two numbers are the same, where that can be proved. */
    static Decision areEqual(Quantity a, Quantity b) {
        ComplexBall first = a.enclose(TOLD_APART_BITS);
        return first.overlaps(b.enclose(TOLD_APART_BITS)) ? a.minus(b).isZero() : Decision.NO;
    }
}
