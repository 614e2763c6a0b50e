package org.pofk.claim;

import java.util.ArrayList;
import java.util.List;
import org.pofk.exact.Polynomial;
import org.pofk.exact.Rational;
import org.pofk.meaning.Decision;
import org.pofk.meaning.Quantity;
import org.pofk.transform.TransferFunction;

/** A true Y(z) or Y(z)/z as an author would write it: every number to so many significant digits, in several shapes. */
final class WrittenTransforms {

    /** How the fraction is written. */
    enum Shape { EXPANDED, FACTORED, PARTIAL_FRACTIONS }

    private final int digits;

    private WrittenTransforms(int digits) {
        this.digits = digits;
    }

    static String of(OutputTruth truth, Statement.TransformOf.Form form, Shape shape, int digits) {
        WrittenTransforms written = new WrittenTransforms(digits);
        boolean overZ = form == Statement.TransformOf.Form.TRANSFORM_OVER_Z;
        TransferFunction<Rational> y = overZ ? TransformTarget.overZ(truth).fraction() : truth.y();
        return switch (shape) {
            case EXPANDED -> "(" + written.expanded(y.numerator()) + ")/(" + written.expanded(y.denominator()) + ")";
            case FACTORED -> written.number(y.numerator().leading()) + written.factors(y.numerator())
                    + "/(1" + written.factors(y.denominator()) + ")";
            case PARTIAL_FRACTIONS -> written.parts(truth, overZ ? "" : "z*");
        };
    }

    private String number(Rational value) {
        return number(Quantity.of(value));
    }

    private String number(Quantity value) {
        return WrittenFormulas.number(value, digits);
    }

    private String expanded(Polynomial<Rational> polynomial) {
        List<String> terms = new ArrayList<>();
        for (int power = polynomial.degree(); power >= 0; power--) {
            if (!polynomial.coefficient(power).isZero()) {
                terms.add(number(polynomial.coefficient(power)) + (power == 0 ? "" : "*z^" + power));
            }
        }
        return String.join(" + ", terms);
    }

    private String factors(Polynomial<Rational> polynomial) {
        StringBuilder text = new StringBuilder();
        for (FormPole root : FormPole.allOf(polynomial)) {
            if (root.root().index() <= root.root().conjugateIndex()) {
                text.append("*").append(factor(root.value(), root.root().isReal()))
                        .append(root.multiplicity() == 1 ? "" : "^" + root.multiplicity());
            }
        }
        return text.toString();
    }

    private String factor(Quantity root, boolean isReal) {
        if (root.rational().filter(Rational::isZero).isPresent()) {
            return "z";
        }
        return isReal ? "(z - " + number(root) + ")" : "(z^2 - " + number(root.realPart().times(Rational.TWO))
                + "*z + " + number(root.times(root.conjugate()).realPart()) + ")";
    }

    /** Of Y(z)/z, each multiplied by what is given. */
    private String parts(OutputTruth truth, String z) {
        List<String> parts = new ArrayList<>();
        for (int k = 0; k < truth.impulses().size(); k++) {
            if (!truth.impulses().get(k).isZero()) {
                parts.add(z + number(truth.impulses().get(k)) + "/z^" + (k + 1));
            }
        }
        for (TruePole pole : truth.poles()) {
            for (int p = 0; p < pole.multiplicity(); p++) {
                Quantity r = pole.coefficients().get(p);
                if (pole.isReal() || pole.multiplicity() == 1) {
                    if (r.isZero() != Decision.YES) {
                        parts.add(z + (pole.isReal() ? number(r) : "(" + number(r.realPart().times(Rational.TWO))
                                + "*z + " + number(r.times(pole.value().conjugate()).realPart().times(Rational.of(-2)))
                                + ")") + "/" + factor(pole.value(), pole.isReal()) + (p == 0 ? "" : "^" + (p + 1)));
                    }
                } else {
                    parts.add(z + "(" + complex(r, "+") + ")/(z - (" + complex(pole.value(), "+") + "))^" + (p + 1));
                    parts.add(z + "(" + complex(r, "-") + ")/(z - (" + complex(pole.value(), "-") + "))^" + (p + 1));
                }
            }
        }
        return parts.isEmpty() ? "0" : String.join(" + ", parts);
    }

    private String complex(Quantity value, String sign) {
        return number(value.realPart()) + " " + sign + " " + number(value.imaginaryPart()) + "*i";
    }
}
