package org.pofk.meaning;

import java.util.ArrayList;
import java.util.List;
import org.pofk.text.Span;

/**
 * front · Π polynomial^exponent while it is read. Canonical form: front isn't zero as written; powers of the variable
 * itself are one factor, where the first of them stands.
 */
record FormSummand(Scalar front, List<FormFactor> factors, Span span) {

    FormSummand {
        factors = tidy(factors);
    }

    private static List<FormFactor> tidy(List<FormFactor> factors) {
        List<FormFactor> kept = new ArrayList<>(factors);
        int exponent = factors.stream().filter(FormFactor::isVariable).mapToInt(FormFactor::exponent).sum();
        for (int i = 0; i < kept.size(); i++) {
            if (kept.get(i).isVariable()) {
                kept.set(i, kept.get(i).to(exponent));
                exponent = 0;
            }
        }
        kept.removeIf(factor -> factor.exponent() == 0);
        return List.copyOf(kept);
    }

    boolean isPolynomial() {
        return factors.stream().noneMatch(FormFactor::isBelow);
    }

    /** True when nothing but powers of the variable stands below the line. */
    boolean isPolynomialInInverses() {
        return factors.stream().allMatch(factor -> factor.isVariable() || !factor.isBelow());
    }

    List<FormFactor> below() {
        return factors.stream().filter(FormFactor::isBelow).toList();
    }

    FormSummand with(Scalar newFront) {
        return new FormSummand(newFront, factors, span);
    }

    FormSummand at(Span newSpan) {
        return new FormSummand(front, factors, newSpan);
    }
}
