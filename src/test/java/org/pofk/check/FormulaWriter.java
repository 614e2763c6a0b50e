package org.pofk.check;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Optional;
import java.util.Random;
import java.util.function.Consumer;
import org.pofk.check.Modes.Pole;
import org.pofk.check.Real.Radicals;
import org.pofk.check.Token.Role;
import org.pofk.exact.Rational;

/** Writes p(k) as an author would, from exact numbers, in one of many notations; its printing is its own. */
final class FormulaWriter {
    private static final BigDecimal TWO = BigDecimal.valueOf(2);

    private final Modes modes;
    private final Style style;
    private final Notation notation;
    private final Random random;
    private final Rational front;

    private FormulaWriter(Modes modes, Style style, Notation notation, Random random) {
        this.modes = modes;
        this.style = style;
        this.notation = notation;
        this.random = random;
        this.front = notation == Notation.COMMON_FACTOR
                ? Rational.of(1 + random.nextInt(3), List.of(10, 100, 7, 3).get(random.nextInt(4))) : Rational.ONE;
    }

    /** The formula for every k; nothing where the notation is none for these modes. */
    static Optional<List<Token>> write(Modes modes, Style style, Notation notation, Random random) {
        return new FormulaWriter(modes, style, notation, random).written(modes.impulses());
    }

    /** The formula for the k beyond all impulses, which it leaves out. */
    static Optional<List<Token>> writeWithoutImpulses(Modes modes, Style style, Notation notation, Random random) {
        return new FormulaWriter(modes, style, notation, random).written(List.of());
    }

    private Optional<List<Token>> written(List<Rational> impulses) {
        if (!suits()) {
            return Optional.empty();
        }
        List<Consumer<Pieces>> terms = new ArrayList<>();
        for (Pole pole : modes.poles()) {
            terms.addAll(pole.isReal() ? real(pole) : pair(pole));
        }
        for (int at = 0; at < impulses.size(); at++) {
            if (!impulses.get(at).isZero()) {
                terms.add(impulse(at, impulses.get(at)));
            }
        }
        if (terms.isEmpty() || terms.size() < 2 && notation == Notation.SHUFFLED) {
            return Optional.empty();
        }
        if (notation == Notation.SHUFFLED || notation != Notation.PLAIN && random.nextInt(3) == 0) {
            Collections.shuffle(terms, random);
        }
        Pieces pieces = new Pieces(style);
        if (notation == Notation.COMMON_FACTOR) {
            pieces.term(1).number(Role.FRONT, Real.of(Num.of(front), Radicals.APART), Style.EXACT).times()
                    .text(Role.OPEN, "(", "\\left(");
        }
        terms.forEach(term -> term.accept(pieces));
        if (notation == Notation.COMMON_FACTOR) {
            pieces.text(Role.CLOSE, ")", "\\right)");
        }
        return Optional.of(pieces.tokens());
    }

    private boolean suits() {
        boolean hasSurds = style.isExact() && modes.poles().stream()
                .anyMatch(pole -> pole.isReal() && pole.lambda().surd().isPresent());
        boolean hasSimple = modes.poles().stream().anyMatch(pole -> !pole.lambda().isOne());
        boolean hasRepeated = modes.poles().stream().anyMatch(pole -> pole.isReal() && pole.multiplicity() > 1);
        return switch (notation) {
            case PLAIN, SHUFFLED -> true;
            case COMMON_FACTOR, SPLIT_TERM -> hasSimple;
            case SINE_AND_COSINE, OTHER_PHASE, DEGREES, COMPLEX_POWERS -> modes.hasPairs();
            case COMPLEX_EXPONENTIALS -> modes.hasPairs() && !style.isExact();
            case MINUS_ONE_POWER -> modes.poles().stream().anyMatch(pole -> pole.isReal()
                    && pole.lambda().signum() < 0);
            case SHIFTED_DOWN, SHIFTED_UP -> hasSimple && !modes.hasRepeated();
            case RADICALS_OVER_ONE, RADICALS_UNDER_ROOT, RADICALS_BELOW -> hasSurds;
            case POLYNOMIAL_IN_K, POLYNOMIAL_OUTSIDE -> hasRepeated;
            case EXPONENTIAL_BASE -> !style.isExact() && modes.poles().stream().anyMatch(this::hasPositiveBase);
            case RECIPROCAL_BASE -> modes.poles().stream().anyMatch(pole -> pole.isReal() && !pole.lambda().isOne()
                    && pole.multiplicity() == 1);
        };
    }

    private boolean hasPositiveBase(Pole pole) {
        return pole.isReal() && !pole.lambda().isOne() && pole.lambda().signum() > 0 && pole.multiplicity() == 1;
    }

    private Radicals radicals() {
        return switch (notation) {
            case RADICALS_OVER_ONE -> Radicals.OVER_ONE_DENOMINATOR;
            case RADICALS_UNDER_ROOT -> Radicals.UNDER_THE_ROOT;
            case RADICALS_BELOW -> Radicals.IN_THE_DENOMINATOR;
            default -> Radicals.APART;
        };
    }

    private Num scaled(Num coefficient) {
        return coefficient.times(Num.of(front.inverse()));
    }

    private Real printed(Num number) {
        return Real.of(number.abs(), radicals());
    }

    private Consumer<Pieces> impulse(int at, Rational value) {
        return pieces -> pieces.term(value.signum())
                .number(Role.COEFFICIENT, printed(scaled(Num.of(value)))).times()
                .text(Role.IMPULSE, at == 0 ? "delta(k)" : "delta(k-" + at + ")",
                        at == 0 ? "\\delta\\left(k\\right)" : "\\delta\\left(k-" + at + "\\right)");
    }

    // ---- real poles

    private List<Consumer<Pieces>> real(Pole pole) {
        if (notation == Notation.POLYNOMIAL_OUTSIDE && pole.multiplicity() > 1) {
            return List.of(polynomialOutside(pole));
        }
        if (notation == Notation.POLYNOMIAL_IN_K && pole.multiplicity() > 1) {
            return polynomialTerms(pole);
        }
        List<Consumer<Pieces>> terms = new ArrayList<>();
        for (int p = 0; p < pole.multiplicity(); p++) {
            if (!pole.coefficients().get(p).isNothing()) {
                terms.addAll(real(pole.lambda(), scaled(pole.coefficients().get(p)), p));
            }
        }
        return terms;
    }

    private List<Consumer<Pieces>> real(Num lambda, Num c, int p) {
        if (lambda.isOne()) {
            return List.of(pieces -> withFactorInK(pieces.term(c.signum()), c, p));
        }
        if (notation == Notation.SPLIT_TERM && p == 0) {
            Num part = Num.of(Rational.of(1, 7));
            Num rest = c.plus(part.negate());
            return List.of(power(lambda, part, 0, 0), power(lambda, rest, 0, 0));
        }
        return List.of(switch (notation) {
            case SHIFTED_DOWN -> power(lambda, c.times(lambda), 0, 1);
            case SHIFTED_UP -> power(lambda, c.times(lambda.inverse()), 0, -1);
            case EXPONENTIAL_BASE -> lambda.signum() > 0 && p == 0 ? exponential(lambda, c) : power(lambda, c, p, p);
            case RECIPROCAL_BASE -> p == 0 ? reciprocal(lambda, c) : power(lambda, c, p, p);
            default -> power(lambda, c, p, p);
        });
    }

    /** c binomial(k, p) λ^(k − shift). */
    private Consumer<Pieces> power(Num lambda, Num c, int p, int shift) {
        return pieces -> {
            if (!c.isOne() || p > 0) {
                withFactorInK(pieces.term(c.signum()), c, p);
                pieces.times();
            } else {
                pieces.term(1);
            }
            base(pieces, lambda, shift);
        };
    }

    private void withFactorInK(Pieces pieces, Num c, int p) {
        boolean isBare = c.abs().isOne() && p > 0;
        if (!isBare) {
            pieces.number(Role.COEFFICIENT, printed(c));
        }
        if (p > 0) {
            if (!isBare) {
                pieces.times();
            }
            factorInK(pieces, p);
        }
    }

    private void factorInK(Pieces pieces, int p) {
        if (p == 1) {
            pieces.text(Role.K, "k");
        } else if (p == 2 && random.nextBoolean()) {
            pieces.text(Role.BINOMIAL, "k*(k-1)/2", "\\frac{k (k-1)}{2}");
        } else {
            pieces.text(Role.BINOMIAL, "binomial(k, " + p + ")", "\\binom{k}{" + p + "}");
        }
    }

    private void base(Pieces pieces, Num lambda, int shift) {
        boolean isNegative = lambda.signum() < 0;
        if (isNegative && notation == Notation.MINUS_ONE_POWER) {
            pieces.text(Role.OTHER, "(-1)", "\\left(-1\\right)");
            raised(pieces, shift);
            if (!lambda.abs().isOne()) {
                pieces.times().number(Role.BASE, printed(lambda));
                raised(pieces, shift);
            }
            return;
        }
        if (isNegative) {
            pieces.text(Role.OTHER, "(-", "\\left(-");
        }
        pieces.number(Role.BASE, printed(lambda));
        if (isNegative) {
            pieces.text(Role.OTHER, ")", "\\right)");
        }
        raised(pieces, shift);
    }

    private void raised(Pieces pieces, int shift) {
        pieces.text(Role.POWER, "^");
        exponent(pieces, shift);
    }

    private void exponent(Pieces pieces, int shift) {
        String inner = shift == 0 ? "k" : shift > 0 ? "k-" + shift : "k+" + -shift;
        pieces.text(Role.EXPONENT, shift == 0 ? "k" : "(" + inner + ")", "{" + inner + "}");
    }

    private Consumer<Pieces> exponential(Num lambda, Num c) {
        BigDecimal rate = Elementary.logarithm(lambda.real());
        return pieces -> pieces.term(c.signum()).number(Role.COEFFICIENT, printed(c)).times()
                .text(Role.FUNCTION, "exp", "\\exp")
                .text(Role.OPEN, rate.signum() < 0 ? "(-" : "(", rate.signum() < 0 ? "\\left(-" : "\\left(")
                .number(Role.BASE, Real.of(rate.abs())).text(Role.OTHER, "*k", " k")
                .text(Role.CLOSE, ")", "\\right)");
    }

    private Consumer<Pieces> reciprocal(Num lambda, Num c) {
        return pieces -> {
            pieces.term(c.signum()).number(Role.COEFFICIENT, printed(c)).text(Role.OTHER, "/", " / ");
            base(pieces, lambda.inverse(), 0);
        };
    }

    /** a_j of Σ a_j k^j λ^k, from Σ R_p binomial(k, p) λ^(k−p). */
    private List<Num> inPowersOfK(Pole pole) {
        List<Num> a = new ArrayList<>(Collections.nCopies(pole.multiplicity(), Num.of(Rational.ZERO)));
        List<Rational> falling = List.of(Rational.ONE);
        Rational factorial = Rational.ONE;
        for (int p = 0; p < pole.multiplicity(); p++) {
            Num scale = scaled(pole.coefficients().get(p)).times(pole.lambda().pow(-p));
            for (int j = 0; j <= p; j++) {
                a.set(j, a.get(j).plus(scale.times(Num.of(falling.get(j).dividedBy(factorial)))));
            }
            falling = timesLinear(falling, p);
            factorial = factorial.times(Rational.of(p + 1));
        }
        return a;
    }

    /** A polynomial in k times (k − p). */
    private static List<Rational> timesLinear(List<Rational> polynomial, int p) {
        List<Rational> product = new ArrayList<>(Collections.nCopies(polynomial.size() + 1, Rational.ZERO));
        for (int j = 0; j < polynomial.size(); j++) {
            product.set(j, product.get(j).minus(polynomial.get(j).times(Rational.of(p))));
            product.set(j + 1, product.get(j + 1).plus(polynomial.get(j)));
        }
        return product;
    }

    private List<Consumer<Pieces>> polynomialTerms(Pole pole) {
        List<Num> a = inPowersOfK(pole);
        List<Consumer<Pieces>> terms = new ArrayList<>();
        for (int j = 0; j < a.size(); j++) {
            if (!a.get(j).isNothing()) {
                int power = j;
                terms.add(pieces -> {
                    pieces.term(a.get(power).signum()).number(Role.COEFFICIENT, printed(a.get(power)));
                    powerOfK(pieces, power);
                    if (!pole.lambda().isOne()) {
                        pieces.times();
                        base(pieces, pole.lambda(), 0);
                    }
                });
            }
        }
        return terms;
    }

    private static void powerOfK(Pieces pieces, int power) {
        if (power > 0) {
            pieces.times().text(Role.K, power == 1 ? "k" : "k^" + power, power == 1 ? "k" : "k^{" + power + "}");
        }
    }

    private Consumer<Pieces> polynomialOutside(Pole pole) {
        List<Num> a = inPowersOfK(pole);
        return pieces -> {
            pieces.term(1).text(Role.OPEN, "(", "\\left(");
            for (int j = 0; j < a.size(); j++) {
                if (!a.get(j).isNothing()) {
                    pieces.text(Role.SIGN, a.get(j).signum() < 0 ? " - " : " + ")
                            .number(Role.COEFFICIENT, printed(a.get(j)));
                    powerOfK(pieces, j);
                }
            }
            pieces.text(Role.CLOSE, ")", "\\right)");
            if (!pole.lambda().isOne()) {
                pieces.times();
                base(pieces, pole.lambda(), 0);
            }
        };
    }

    // ---- pairs

    private List<Consumer<Pieces>> pair(Pole pole) {
        List<Consumer<Pieces>> terms = new ArrayList<>();
        for (int p = 0; p < pole.multiplicity(); p++) {
            if (!pole.coefficients().get(p).isNothing()) {
                terms.addAll(pair(pole.lambda(), scaled(pole.coefficients().get(p)), p));
            }
        }
        return terms;
    }

    private List<Consumer<Pieces>> pair(Num lambda, Num c, int p) {
        int shift = notation == Notation.SHIFTED_DOWN ? 1 : notation == Notation.SHIFTED_UP ? -1 : p;
        Num moved = c.times(lambda.pow(shift == p ? 0 : shift));
        return switch (notation) {
            case SINE_AND_COSINE -> sineAndCosine(lambda, c, p);
            case COMPLEX_POWERS -> List.of(complexPower(lambda, c, p, 1), complexPower(lambda, c, p, -1));
            case COMPLEX_EXPONENTIALS -> List.of(complexExponential(lambda, c, p, 1),
                    complexExponential(lambda, c, p, -1));
            default -> List.of(pieces -> amplitudeAndPhase(pieces, PolarNumber.of(lambda), PolarNumber.of(moved), p,
                    shift));
        };
    }

    private void amplitudeAndPhase(Pieces pieces, PolarNumber lambda, PolarNumber c, int p, int shift) {
        boolean isSine = notation == Notation.OTHER_PHASE && random.nextBoolean();
        boolean isTurned = !isSine && (notation == Notation.OTHER_PHASE || c.angle().abs().compareTo(
                Elementary.PI.subtract(BigDecimal.ONE.movePointLeft(40))) > 0);
        Optional<PhaseOf> phase = PhaseOf.of(c, isSine ? PhaseOf.Turn.QUARTER
                : isTurned ? PhaseOf.Turn.HALF : PhaseOf.Turn.NONE);
        pieces.term(isTurned ? -1 : 1).number(Role.COEFFICIENT, c.twiceModulus());
        if (p > 0) {
            pieces.times();
            factorInK(pieces, p);
        }
        radius(pieces, lambda, shift);
        pieces.times().text(Role.FUNCTION, isSine ? "sin" : "cos", isSine ? "\\sin" : "\\cos")
                .text(Role.OPEN, "(", "\\left(");
        angle(pieces, lambda, shift);
        phase.ifPresent(known -> {
            pieces.text(Role.PHASE_SIGN, known.sign() < 0 ? " - " : " + ");
            turned(pieces, Role.PHASE, known.size());
        });
        pieces.text(Role.CLOSE, ")", "\\right)");
    }

    private void radius(Pieces pieces, PolarNumber lambda, int shift) {
        if (!lambda.isOnUnitCircle()) {
            pieces.times().number(Role.BASE, lambda.modulus());
            raised(pieces, shift);
        }
    }

    private void angle(Pieces pieces, PolarNumber lambda, int shift) {
        turned(pieces, Role.ANGLE, lambda.positiveAngle());
        String inner = shift == 0 ? "k" : shift > 0 ? "(k-" + shift + ")" : "(k+" + -shift + ")";
        pieces.text(Role.OTHER, "*" + inner, " " + inner);
    }

    private void turned(Pieces pieces, Role role, Real angle) {
        if (notation == Notation.DEGREES) {
            pieces.number(role, PolarNumber.inDegrees(angle)).text(Role.DEGREES, " deg", "^\\circ");
        } else {
            pieces.number(role, angle);
        }
    }

    private List<Consumer<Pieces>> sineAndCosine(Num lambda, Num c, int p) {
        List<Consumer<Pieces>> terms = new ArrayList<>();
        Num cosine = c.realPart().times(Num.of(Rational.TWO));
        Num sine = c.imaginaryPart().times(Num.of(Rational.of(-2)));
        if (!cosine.isNothing()) {
            terms.add(pieces -> oscillation(pieces, lambda, cosine, p, "cos"));
        }
        if (!sine.isNothing()) {
            terms.add(pieces -> oscillation(pieces, lambda, sine, p, "sin"));
        }
        return terms;
    }

    private void oscillation(Pieces pieces, Num lambda, Num amplitude, int p, String function) {
        PolarNumber polar = PolarNumber.of(lambda);
        pieces.term(amplitude.signum()).number(Role.COEFFICIENT, printed(amplitude));
        if (p > 0) {
            pieces.times();
            factorInK(pieces, p);
        }
        radius(pieces, polar, p);
        pieces.times().text(Role.FUNCTION, function, "\\" + function).text(Role.OPEN, "(", "\\left(");
        angle(pieces, polar, p);
        pieces.text(Role.CLOSE, ")", "\\right)");
    }

    private Consumer<Pieces> complexPower(Num lambda, Num c, int p, int side) {
        return pieces -> {
            pieces.term(1);
            complex(pieces, c, side, Role.COEFFICIENT);
            pieces.times();
            if (p > 0) {
                factorInK(pieces, p);
                pieces.times();
            }
            complex(pieces, lambda, side, Role.BASE);
            raised(pieces, p);
        };
    }

    private void complex(Pieces pieces, Num value, int side, Role role) {
        Num x = value.realPart();
        Num y = value.imaginaryPart();
        pieces.text(Role.OPEN, "(", "\\left(");
        if (!x.isNothing()) {
            pieces.text(Role.OTHER, x.signum() < 0 ? "-" : "").number(role, printed(x));
        }
        if (!y.isNothing()) {
            pieces.text(Role.OTHER, y.signum() * side < 0 ? " - " : x.isNothing() ? "" : " + ")
                    .number(role, printed(y)).text(Role.OTHER, "*i", " \\mathrm{i}");
        }
        pieces.text(Role.CLOSE, ")", "\\right)");
    }

    private Consumer<Pieces> complexExponential(Num lambda, Num c, int p, int side) {
        PolarNumber polar = PolarNumber.of(lambda);
        PolarNumber coefficient = PolarNumber.of(c);
        return pieces -> {
            pieces.term(1).number(Role.COEFFICIENT, Real.of(coefficient.modulus().value()));
            if (coefficient.angle().abs().compareTo(BigDecimal.ONE.movePointLeft(40)) > 0) {
                pieces.times();
                exponentialOf(pieces, coefficient.angle().multiply(BigDecimal.valueOf(side)), Role.PHASE, "*i",
                        " \\mathrm{i}");
            }
            if (p > 0) {
                pieces.times();
                factorInK(pieces, p);
            }
            radius(pieces, polar, p);
            pieces.times();
            String inner = p == 0 ? "k" : "(k-" + p + ")";
            exponentialOf(pieces, polar.angle().multiply(BigDecimal.valueOf(side)), Role.ANGLE, "*i*" + inner,
                    " \\mathrm{i} " + inner);
        };
    }

    private static void exponentialOf(Pieces pieces, BigDecimal angle, Role role, String plain, String latex) {
        String sign = angle.signum() < 0 ? "-" : "";
        pieces.text(Role.FUNCTION, "exp", "\\exp").text(Role.OPEN, "(" + sign, "\\left(" + sign)
                .number(role, Real.of(angle.abs())).text(Role.OTHER, plain, latex)
                .text(Role.CLOSE, ")", "\\right)");
    }

    static BigDecimal twice(BigDecimal value) {
        return value.multiply(TWO);
    }
}
