package org.pofk.claim;

import java.util.ArrayList;
import java.util.List;
import org.pofk.exact.Decimal;
import org.pofk.exact.Decimals;
import org.pofk.exact.Rational;
import org.pofk.formula.FormulaParser;
import org.pofk.formula.ParsedFormula;
import org.pofk.meaning.Decision;
import org.pofk.meaning.Quantity;
import org.pofk.text.Position;
import org.pofk.text.RefusedException;

/** A true p(k) as an author would write it: every number to so many significant digits, in one of several notations. */
final class WrittenFormulas {

    /** How the modes are written. */
    enum Notation { POLAR, DEGREES, COSINE_AND_SINE, COMPLEX, POWERS_OF_K }

    private final OutputTruth truth;
    private final Notation notation;
    private final int digits;

    private WrittenFormulas(OutputTruth truth, Notation notation, int digits) {
        this.truth = truth;
        this.notation = notation;
        this.digits = digits;
    }

    static String of(OutputTruth truth, Notation notation, int digits) {
        return new WrittenFormulas(truth, notation, digits).text(true);
    }

    static String withoutImpulses(OutputTruth truth, Notation notation, int digits) {
        return new WrittenFormulas(truth, notation, digits).text(false);
    }

    static FormulaText parsed(String text) {
        return new FormulaText(text, FormulaText.Notation.PLAIN, parse(text));
    }

    static ParsedFormula parse(String text) {
        try {
            return FormulaParser.parse(text, new Position("claims.yaml", 1, 1));
        } catch (RefusedException e) {
            throw new AssertionError(text, e);
        }
    }

    private String text(boolean impulses) {
        List<String> terms = new ArrayList<>();
        for (int k = 0; impulses && k < truth.impulses().size(); k++) {
            if (!truth.impulses().get(k).isZero()) {
                terms.add(number(Quantity.of(truth.impulses().get(k))) + "*delta(k" + (k == 0 ? "" : "-" + k) + ")");
            }
        }
        for (TruePole pole : truth.poles()) {
            for (int p = 0; p < pole.multiplicity(); p++) {
                if (notation == Notation.POWERS_OF_K && pole.isReal()) {
                    Quantity coefficient = PowersOfK.of(pole).get(p);
                    if (coefficient.isZero() != Decision.YES) {
                        terms.add(number(coefficient) + (p == 0 ? "" : "*k^" + p) + power(number(pole.value()), 0));
                    }
                } else if (pole.coefficients().get(p).isZero() != Decision.YES) {
                    terms.add(pole.isReal() ? real(pole, p) : pair(pole, p));
                }
            }
        }
        return terms.isEmpty() ? "0" : String.join(" + ", terms);
    }

    private String real(TruePole pole, int p) {
        return number(pole.coefficients().get(p)) + binomial(p) + power(number(pole.value()), p);
    }

    private String pair(TruePole pole, int p) {
        String steps = p == 0 ? "k" : "(k-" + p + ")";
        Quantity doubled = pole.coefficients().get(p).times(Rational.TWO);
        boolean isOnCircle = pole.modulus().minus(Quantity.ONE).isZero() == Decision.YES;
        String size = binomial(p) + power(isOnCircle ? "1" : number(pole.modulus()), p);
        return switch (notation) {
            case POLAR, POWERS_OF_K -> number(pole.amplitude(p)) + size + "*cos(" + number(pole.angle()) + "*" + steps
                    + " + " + number(pole.phase(p)) + ")";
            case DEGREES -> number(pole.amplitude(p)) + size + "*cos(" + degrees(pole.angle()) + "*" + steps
                    + " + " + degrees(pole.phase(p)) + ")";
            case COSINE_AND_SINE -> "1" + size + "*(" + String.join(" + ", List.of(
                    turning(doubled.realPart(), "cos", pole, steps),
                    turning(doubled.imaginaryPart().negate(), "sin", pole, steps)).stream()
                    .filter(part -> !part.isEmpty()).toList()) + ")";
            case COMPLEX -> complex(pole, p, "+") + " + " + complex(pole, p, "-");
        };
    }

    private String turning(Quantity coefficient, String function, TruePole pole, String steps) {
        return coefficient.isZero() == Decision.YES ? ""
                : number(coefficient) + "*" + function + "(" + number(pole.angle()) + "*" + steps + ")";
    }

    private String complex(TruePole pole, int p, String sign) {
        Quantity r = pole.coefficients().get(p);
        return "(" + number(r.realPart()) + " " + sign + " " + number(r.imaginaryPart()) + "*i)" + binomial(p)
                + power("(" + number(pole.value().realPart()) + " " + sign + " "
                + number(pole.value().imaginaryPart()) + "*i)", p);
    }

    private String degrees(Quantity angle) {
        return number(angle.times(Quantity.of(180)).dividedBy(Quantity.pi())) + " deg";
    }

    private static String binomial(int p) {
        return p == 0 ? "" : p == 1 ? "*k" : "*binomial(k," + p + ")";
    }

    private static String power(String base, int p) {
        return base.equals("1") ? "" : "*" + base + "^" + (p == 0 ? "k" : "(k-" + p + ")");
    }

    private String number(Quantity value) {
        return number(value, digits);
    }

    /** To so many significant digits, in parentheses where it is negative. */
    static String number(Quantity value, int digits) {
        Decimal decimal = decimal(value, digits);
        // what has no point is exact: a rounded number gets digits until it has one
        for (int more = 1; !decimal.exact() && decimal.text().chars().noneMatch(c -> c == '.' || c == 'e'); more++) {
            decimal = decimal(value, digits + more);
        }
        return decimal.text().startsWith("-") ? "(" + decimal.text() + ")" : decimal.text();
    }

    private static Decimal decimal(Quantity value, int digits) {
        if (value.rational().isPresent()) {
            return Decimals.of(value.rational().get(), digits);
        }
        return value.isZero() == Decision.YES ? Decimal.ZERO
                : Decimals.of(bits -> value.enclose(bits).real(), digits);
    }
}
