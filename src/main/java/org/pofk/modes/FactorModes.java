package org.pofk.modes;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.pofk.exact.Cyclotomic;
import org.pofk.exact.Enclosed;
import org.pofk.exact.EnclosedComplex;
import org.pofk.exact.Factorization.Irreducible;
import org.pofk.exact.Polynomial;
import org.pofk.exact.PolynomialQuotient;
import org.pofk.exact.Rational;
import org.pofk.exact.Root;
import org.pofk.exact.Roots;

/**
 * The modes of one factor q^e: one for each real root, and one for each conjugate pair, of each power. Exact where a
 * short exact form was found, certified elsewhere; whether a mode is there at all is decided exactly.
 */
final class FactorModes {
    /** Bits of all coefficients of q times its degree up to which a quotient is reduced to look for short forms. */
    private static final int REDUCED_BITS = 60_000;

    private final int index;
    private final Expansion.Part<Rational> part;
    private final Roots roots;
    private final NumberField field;
    private final boolean searched;
    private final List<PolynomialQuotient> coefficients;
    private final List<Optional<Polynomial<Rational>>> reduced;
    private final Optional<Rational> squaredModulus;

    private FactorModes(int index, Expansion.Part<Rational> part, Roots roots) {
        this.index = index;
        this.part = part;
        this.roots = roots;
        this.field = new NumberField(part.factor().polynomial(), roots);
        this.searched = isSearched();
        this.squaredModulus = field.squaredModulusCandidate();
        this.reduced = part.coefficients().stream().map(this::reduced).toList();
        this.coefficients = part.coefficients().stream()
                .map(c -> PolynomialQuotient.of(c.numerator(), c.denominator())).toList();
    }

    /** The modes in the order root, power; {@code index} is the factor's place in the denominator. */
    static List<Mode> of(int index, Expansion.Part<Rational> part, Roots roots) {
        return new FactorModes(index, part, roots).modes();
    }

    private List<Mode> modes() {
        List<Mode> modes = new ArrayList<>();
        for (Root root : roots.all()) {
            if (root.isReal()) {
                modes.addAll(geometric(root));
            } else if (root.index() < root.conjugateIndex()) {
                modes.addAll(oscillating(root));
            }
        }
        return modes;
    }

    private boolean isSearched() {
        Polynomial<Rational> q = field.modulus();
        return q.degree() <= NumberField.SEARCHED_UP_TO || field.step() == q.degree()
                || !Cyclotomic.ordersDividing(q).isEmpty();
    }

    private Optional<Polynomial<Rational>> reduced(Expansion.Coefficient<Rational> coefficient) {
        if (coefficient.isReduced()) {
            return Optional.of(coefficient.numerator());
        }
        int bits = field.modulus().coefficients().stream()
                .mapToInt(c -> c.numerator().bitLength() + c.denominator().bitLength()).sum();
        return searched && (long) bits * field.degree() <= REDUCED_BITS
                ? Optional.of(Traces.of(field.modulus()).reduced(coefficient))
                : Optional.empty();
    }

    private List<Mode> geometric(Root root) {
        RealValue base = RealValue.of(searched ? lambda(root).radical() : Optional.empty(), root.realPart());
        List<Mode> modes = new ArrayList<>();
        for (int power = 0; power < coefficients.size(); power++) {
            if (isPresent(power, root)) {
                EnclosedComplex value = coefficients.get(power).at(root);
                Optional<Radical> exact = element(power, root, value).flatMap(ElementAtRoot::radical);
                modes.add(new Mode.Geometric(index, root.index(), power, base,
                        RealValue.of(exact, value.realPart())));
            }
        }
        return modes;
    }

    private List<Mode> oscillating(Root root) {
        Optional<Rational> square = squaredModulus.filter(s -> isSquaredModulus(s, root));
        Polar pole = searched ? Polar.of(lambda(root), square) : Polar.unknown();
        RealValue modulus = RealValue.of(pole.modulus(), root.modulus());
        RealValue angle = RealValue.ofAngle(pole.angle(), root.argument());
        List<Mode> modes = new ArrayList<>();
        for (int power = 0; power < coefficients.size(); power++) {
            if (isPresent(power, root)) {
                EnclosedComplex value = coefficients.get(power).at(root);
                Polar coefficient = element(power, root, value).map(e -> Polar.of(e, square)).orElse(Polar.unknown());
                Enclosed twice = value.modulus().times(Enclosed.of(Rational.TWO));
                modes.add(new Mode.Oscillating(index, root.index(), power, modulus, angle,
                        RealValue.of(coefficient.modulus().map(r -> r.times(Rational.TWO)), twice),
                        RealValue.ofAngle(coefficient.angle(), value.argument())));
            }
        }
        return modes;
    }

    private ElementAtRoot lambda(Root root) {
        return new ElementAtRoot(field, field.root(), root, root);
    }

    private Optional<ElementAtRoot> element(int power, Root root, EnclosedComplex value) {
        return searched
                ? reduced.get(power).map(element -> new ElementAtRoot(field, element, root, value))
                : Optional.empty();
    }

    /** s/λ is a root of q; whether it is the conjugate of λ tells which root it is. */
    private boolean isSquaredModulus(Rational s, Root root) {
        EnclosedComplex other = EnclosedComplex.combine(EnclosedComplex.of(s), root, (a, b) -> a.dividedBy(b));
        return NumberField.located(roots, other::enclose).index() == root.conjugateIndex();
    }

    /**
     * Decides whether R_p(λ) differs from zero. A coefficient that isn't zero shares no root with an irreducible q, nor
     * with a simple factor; otherwise their common divisor tells.
     */
    private boolean isPresent(int power, Root root) {
        Expansion.Coefficient<Rational> coefficient = part.coefficients().get(power);
        if (coefficient.isZero() || part.factor().multiplicity() == 1
                || part.factor().irreducible() == Irreducible.PROVED) {
            return !coefficient.isZero();
        }
        Polynomial<Rational> common = field.modulus().greatestCommonDivisor(coefficient.numerator());
        if (common.isConstant()) {
            return true;
        }
        EnclosedComplex atCommon = PolynomialQuotient.of(common).at(root);
        EnclosedComplex atOthers = PolynomialQuotient.of(field.modulus().dividedExactlyBy(common)).at(root);
        for (int bits = 32; true; bits *= 2) {
            if (!atCommon.enclose(bits).containsZero()) {
                return true;
            }
            if (!atOthers.enclose(bits).containsZero()) {
                return false;
            }
        }
    }
}
