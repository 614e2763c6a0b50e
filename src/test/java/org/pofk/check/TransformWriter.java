package org.pofk.check;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Optional;
import java.util.Random;
import java.util.function.Consumer;
import org.pofk.check.Modes.Pole;
import org.pofk.check.Real.Radicals;
import org.pofk.check.Token.Role;
import org.pofk.exact.Factorization.Factor;
import org.pofk.exact.Polynomial;
import org.pofk.exact.Rational;

/** Writes Y(z), or Y(z)/z, as an author would, from exact numbers, in one of several shapes. */
final class TransformWriter {
    /** Shapes of a transform. */
    enum Shape {
        /** One polynomial over another, both multiplied out. */
        EXPANDED,
        /** Below the line the factors with rational coefficients. */
        FACTORED,
        /** Below the line z − λ for real poles, and a quadratic for each pair. */
        BY_POLES,
        /** Partial fractions, pairs over a quadratic. */
        FRACTIONS,
        /** Partial fractions with complex numbers. */
        COMPLEX_FRACTIONS
    }

    private final Modes modes;
    private final Style style;
    private final Shape shape;
    /** 1 for Y(z)/z, 0 for Y(z). */
    private final int dividedBy;
    private final Random random;
    private final Pieces pieces;

    private TransformWriter(Modes modes, Style style, Shape shape, int dividedBy, Random random) {
        this.modes = modes;
        this.style = style;
        this.shape = shape;
        this.dividedBy = dividedBy;
        this.random = random;
        this.pieces = new Pieces(style);
    }

    static Optional<List<Token>> write(Modes modes, Style style, Shape shape, Random random) {
        return new TransformWriter(modes, style, shape, 0, random).written();
    }

    static Optional<List<Token>> writeOverZ(Modes modes, Style style, Shape shape, Random random) {
        return new TransformWriter(modes, style, shape, 1, random).written();
    }

    private Optional<List<Token>> written() {
        boolean suits = switch (shape) {
            case EXPANDED, FACTORED -> modes.form().transform().y().denominator().degree() <= 8;
            case BY_POLES -> modes.poles().stream().allMatch(pole -> pole.isReal() || pole.multiplicity() == 1);
            case FRACTIONS -> modes.poles().stream().allMatch(pole -> pole.isReal() || pole.multiplicity() == 1);
            case COMPLEX_FRACTIONS -> modes.hasPairs();
        };
        if (!suits) {
            return Optional.empty();
        }
        switch (shape) {
            case EXPANDED, FACTORED, BY_POLES -> quotient();
            case FRACTIONS, COMPLEX_FRACTIONS -> fractions();
        }
        return Optional.of(pieces.tokens());
    }

    private void quotient() {
        Polynomial<Rational> numerator = modes.form().transform().y().numerator();
        Polynomial<Rational> denominator = modes.form().transform().y().denominator();
        int zeros = numerator.lowestPower();
        int fore = Math.max(0, zeros - dividedBy);
        int below = Math.max(0, dividedBy - zeros);
        pieces.term(1);
        if (fore > 0) {
            pieces.text(Role.Z, fore == 1 ? "z" : "z^" + fore, fore == 1 ? "z" : "z^{" + fore + "}").times();
        }
        polynomial(numerator.shiftedDown(zeros), Role.COEFFICIENT);
        pieces.text(Role.OTHER, "/(", " / \\left(");
        if (below > 0) {
            pieces.text(Role.Z, "z").times();
        }
        switch (shape) {
            case EXPANDED -> polynomial(denominator, Role.POLE);
            case FACTORED -> factors();
            default -> poles();
        }
        pieces.text(Role.OTHER, ")", "\\right)");
    }

    private void polynomial(Polynomial<Rational> polynomial, Role role) {
        pieces.text(Role.OPEN, "(", "\\left(");
        for (int n = polynomial.degree(); n >= 0; n--) {
            Rational c = polynomial.coefficient(n);
            if (!c.isZero()) {
                pieces.text(Role.SIGN, c.signum() < 0 ? " - " : " + ");
                if (!c.abs().isOne() || n == 0) {
                    pieces.number(role, Real.of(Num.of(c.abs()), Radicals.APART));
                    pieces.text(Role.TIMES, n == 0 ? "" : "*", n == 0 ? "" : " ");
                }
                powerOfZ(n);
            }
        }
        pieces.text(Role.CLOSE, ")", "\\right)");
    }

    private void powerOfZ(int n) {
        if (n > 0) {
            pieces.text(Role.OTHER, n == 1 ? "z" : "z^" + n, n == 1 ? "z" : "z^{" + n + "}");
        }
    }

    private void factors() {
        List<Factor<Rational>> factors = modes.form().transform().factors().factors();
        for (int i = 0; i < factors.size(); i++) {
            if (i > 0) {
                pieces.times();
            }
            polynomial(factors.get(i).polynomial(), Role.POLE);
            repeated(factors.get(i).multiplicity());
        }
    }

    private void repeated(int times) {
        if (times > 1) {
            pieces.text(Role.MULTIPLICITY, "^" + times, "^{" + times + "}");
        }
    }

    private void poles() {
        int atZero = modes.form().transform().y().denominator().lowestPower();
        boolean isFirst = true;
        if (atZero > 0) {
            pieces.text(Role.OTHER, atZero == 1 ? "z" : "z^" + atZero, atZero == 1 ? "z" : "z^{" + atZero + "}");
            isFirst = false;
        }
        for (Pole pole : modes.poles()) {
            if (!isFirst) {
                pieces.times();
            }
            isFirst = false;
            if (pole.isReal()) {
                linear(pole.lambda());
            } else {
                quadratic(pole.lambda());
            }
            repeated(pole.multiplicity());
        }
    }

    /** z − λ. */
    private void linear(Num lambda) {
        pieces.text(Role.OPEN, "(", "\\left(").text(Role.OTHER, "z")
                .text(Role.POLE_SIGN, lambda.signum() < 0 ? " + " : " - ")
                .number(Role.POLE, Real.of(lambda.abs(), Radicals.APART)).text(Role.CLOSE, ")", "\\right)");
    }

    /** z² − 2 Re λ z + |λ|². */
    private void quadratic(Num lambda) {
        Num middle = lambda.realPart().times(Num.of(Rational.of(-2)));
        pieces.text(Role.OPEN, "(", "\\left(").text(Role.OTHER, "z^2", "z^{2}");
        if (!middle.isNothing()) {
            pieces.text(Role.SIGN, middle.signum() < 0 ? " - " : " + ")
                    .number(Role.POLE, Real.of(middle.abs(), Radicals.APART)).text(Role.OTHER, "*z", " z");
        }
        pieces.text(Role.SIGN, " + ").number(Role.POLE, square(lambda)).text(Role.CLOSE, ")", "\\right)");
    }

    private static Real square(Num lambda) {
        Near product = lambda.value().times(lambda.value().conjugate());
        return lambda.surd().map(surd -> Real.of(Num.of(surd.squaredModulus()), Radicals.APART))
                .orElseGet(() -> Real.of(product.real()));
    }

    private void fractions() {
        List<Consumer<Pieces>> terms = new ArrayList<>();
        for (Pole pole : modes.poles()) {
            for (int p = 0; p < pole.multiplicity(); p++) {
                if (!pole.coefficients().get(p).isNothing()) {
                    addFraction(terms, pole.lambda(), pole.coefficients().get(p), p);
                }
            }
        }
        for (int at = 0; at < modes.impulses().size(); at++) {
            if (!modes.impulses().get(at).isZero()) {
                impulse(terms, at, modes.impulses().get(at));
            }
        }
        if (random.nextBoolean()) {
            Collections.shuffle(terms, random);
        }
        terms.forEach(term -> term.accept(pieces));
    }

    private void addFraction(List<Consumer<Pieces>> terms, Num lambda, Num c, int p) {
        if (lambda.isReal()) {
            terms.add(ignored -> fraction(lambda, c, p));
        } else if (shape == Shape.FRACTIONS) {
            terms.add(ignored -> overQuadratic(lambda, c));
        } else {
            terms.add(ignored -> complexFraction(lambda, c, p, 1));
            terms.add(ignored -> complexFraction(lambda, c, p, -1));
        }
    }

    private void zOnTop() {
        if (dividedBy == 0) {
            pieces.times().text(Role.Z, "z");
        }
    }

    private void fraction(Num lambda, Num c, int p) {
        pieces.term(c.signum()).number(Role.COEFFICIENT, Real.of(c.abs(), Radicals.APART));
        zOnTop();
        pieces.text(Role.OTHER, "/", " / ");
        linear(lambda);
        repeated(p + 1);
    }

    /** (2 Re c z − 2 Re(c λ̄)) over the quadratic, times z. */
    private void overQuadratic(Num lambda, Num c) {
        Num top = c.realPart().times(Num.of(Rational.TWO));
        Num conjugate = new Num(lambda.value().conjugate(), lambda.rational(),
                lambda.surd().map(surd -> new Surd(surd.u(), surd.v().negate(), surd.d(), surd.isImaginary())));
        Num end = c.times(conjugate).realPart().times(Num.of(Rational.of(-2)));
        pieces.term(1).text(Role.OPEN, "(", "\\left(");
        if (!top.isNothing()) {
            pieces.text(Role.SIGN, top.signum() < 0 ? " - " : " + ")
                    .number(Role.COEFFICIENT, Real.of(top.abs(), Radicals.APART)).text(Role.OTHER, "*z", " z");
        }
        if (!end.isNothing()) {
            pieces.text(Role.SIGN, end.signum() < 0 ? " - " : " + ")
                    .number(Role.COEFFICIENT, Real.of(end.abs(), Radicals.APART));
        }
        pieces.text(Role.CLOSE, ")", "\\right)");
        zOnTop();
        pieces.text(Role.OTHER, "/", " / ");
        quadratic(lambda);
    }

    private void complexFraction(Num lambda, Num c, int p, int side) {
        pieces.term(1);
        complex(c, side, Role.COEFFICIENT);
        zOnTop();
        pieces.text(Role.OTHER, "/(z - ", " / \\left(z - ");
        complex(lambda, side, Role.POLE);
        pieces.text(Role.OTHER, ")", "\\right)");
        repeated(p + 1);
    }

    private void complex(Num value, int side, Role role) {
        Num x = value.realPart();
        Num y = value.imaginaryPart();
        pieces.text(Role.OPEN, "(", "\\left(");
        if (!x.isNothing()) {
            pieces.text(Role.OTHER, x.signum() < 0 ? "-" : "").number(role, Real.of(x.abs(), Radicals.APART));
        }
        if (!y.isNothing()) {
            pieces.text(Role.OTHER, y.signum() * side < 0 ? " - " : x.isNothing() ? "" : " + ")
                    .number(role, Real.of(y.abs(), Radicals.APART)).text(Role.OTHER, "*i", " \\mathrm{i}");
        }
        pieces.text(Role.CLOSE, ")", "\\right)");
    }

    private void impulse(List<Consumer<Pieces>> terms, int at, Rational value) {
        int below = at + dividedBy;
        terms.add(ignored -> {
            pieces.term(value.signum()).number(Role.COEFFICIENT, Real.of(Num.of(value.abs()), Radicals.APART));
            if (below > 0) {
                pieces.text(Role.IMPULSE, below == 1 ? "/z" : "/z^" + below, " / z^{" + below + "}");
            }
        });
    }
}
