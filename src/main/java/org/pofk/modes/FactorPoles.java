package org.pofk.modes;

import java.util.List;
import java.util.Optional;
import org.pofk.exact.Cyclotomic;
import org.pofk.exact.EnclosedComplex;
import org.pofk.exact.Factorization.Factor;
import org.pofk.exact.Polynomial;
import org.pofk.exact.Rational;
import org.pofk.exact.Root;
import org.pofk.exact.Roots;

/**
 * The poles that one factor q of a denominator stands for, each in short exact form where one was found.
 * Exact; what has no short form is enclosed.
 */
final class FactorPoles {
    private final Factor<Rational> factor;
    private final NumberField field;
    private final boolean searched;
    private final Optional<Rational> squaredModulus;
    private final Optional<CosineForm> cosines;

    /** A pole: base for a real one, modulus and angle for one of the upper half-plane. */
    record Pole(Root root, RealValue size, Optional<RealValue> angle, Optional<Rational> squaredModulus) {
        boolean isReal() {
            return angle.isEmpty();
        }
    }

    private List<Pole> poles = List.of();

    FactorPoles(Factor<Rational> factor, Roots roots) {
        this.factor = factor;
        this.field = new NumberField(factor.polynomial(), roots);
        this.searched = isSearched(field);
        this.squaredModulus = field.squaredModulusCandidate();
        this.cosines = CosineForm.of(factor.polynomial());
    }

    /** Every element is searched for short forms up to some degree and length; above, in fields where they are to be expected. */
    private static boolean isSearched(NumberField field) {
        return field.degree() <= NumberField.SEARCHED_UP_TO && !PartialFractions.isLong(field.modulus())
                || field.step() == field.degree()
                || !Cyclotomic.ordersDividing(field.modulus()).isEmpty();
    }

    Factor<Rational> factor() {
        return factor;
    }

    NumberField field() {
        return field;
    }

    boolean isSearched() {
        return searched;
    }

    /** Real ones and one of each conjugate pair, in the order of the roots; found once. */
    synchronized List<Pole> poles() {
        if (poles.isEmpty()) {
            poles = field.roots().all().stream().filter(root -> root.index() <= root.conjugateIndex())
                    .map(root -> root.isReal() ? real(root) : pair(root)).toList();
        }
        return poles;
    }

    Roots roots() {
        return field.roots();
    }

    private Pole real(Root root) {
        Optional<Radical> radical = searched ? lambda(root).radical() : Optional.empty();
        RealValue base = radical.isPresent()
                ? RealValue.of(radical, root.realPart())
                : new RealValue(cosines.map(form -> form.formula(root)), root.realPart());
        return new Pole(root, base, Optional.empty(), Optional.empty());
    }

    private Pole pair(Root root) {
        Optional<Rational> square = squaredModulus.filter(s -> isSquaredModulus(s, root));
        Polar polar = searched ? Polar.of(lambda(root), square) : Polar.ofStepPower(lambda(root));
        return new Pole(root, RealValue.of(polar.modulus(), root.modulus()),
                Optional.of(RealValue.ofAngle(polar.angle(), root.argument())), square);
    }

    private ElementAtRoot lambda(Root root) {
        return new ElementAtRoot(field, field.root(), root, root);
    }

    /** s/λ is a root of q; whether it is the conjugate of λ tells which root it is. */
    private boolean isSquaredModulus(Rational s, Root root) {
        EnclosedComplex other = EnclosedComplex.combine(EnclosedComplex.of(s), root, (a, b) -> a.dividedBy(b));
        return NumberField.located(field.roots(), other::enclose).index() == root.conjugateIndex();
    }

    Polynomial<Rational> polynomial() {
        return factor.polynomial();
    }
}
