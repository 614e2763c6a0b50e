package org.pofk.meaning;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import org.pofk.text.Span;

/**
 * Sums of products of polynomials, exact: factors stay as they are until polynomials are added or fractions must be
 * brought over one line. The list of summands is empty for zero. Multiplying out costs the product of the degrees.
 */
final class FormArithmetic {
    static final int MOST_SUMMANDS = 1_000;
    static final int LARGEST_DEGREE = 400;

    private final Scalars scalars;

    FormArithmetic(Scalars scalars) {
        this.scalars = scalars;
    }

    /** The sum: what is polynomial becomes one polynomial, where the first of it stands; fractions stay apart. */
    List<FormSummand> sum(List<FormSummand> summands, Span span) {
        List<FormSummand> polynomials = summands.stream().filter(FormSummand::isPolynomial).toList();
        if (polynomials.size() <= 1) {
            return summands;
        }
        List<FormSummand> sum = new ArrayList<>(summands);
        int place = sum.indexOf(polynomials.get(0));
        sum.removeIf(FormSummand::isPolynomial);
        Optional<Span> alone = sum.isEmpty() ? Optional.of(span) : Optional.empty();
        Span its = alone.orElse(polynomials.get(0).span().to(polynomials.get(polynomials.size() - 1).span()));
        sum.addAll(place, whole(total(polynomials.stream().map(this::multipliedOut).toList()), its));
        Work.within(sum.size(), MOST_SUMMANDS);
        return sum;
    }

    private List<Scalar> total(List<List<Scalar>> polynomials) {
        return polynomials.stream().reduce(List.of(), this::plus);
    }

    private List<Scalar> plus(List<Scalar> a, List<Scalar> b) {
        List<Scalar> sum = new ArrayList<>();
        for (int i = 0; i < Math.max(a.size(), b.size()); i++) {
            sum.add(i >= a.size() ? b.get(i) : i >= b.size() ? a.get(i) : scalars.plus(a.get(i), b.get(i)));
        }
        return sum;
    }

    private List<Scalar> times(List<Scalar> a, List<Scalar> b) {
        int size = a.isEmpty() || b.isEmpty() ? 0 : Work.within((long) a.size() + b.size() - 1, LARGEST_DEGREE + 1);
        List<Scalar> product = new ArrayList<>(Collections.nCopies(size, Scalars.of(0)));
        for (int i = 0; i < a.size(); i++) {
            for (int j = 0; j < b.size(); j++) {
                product.set(i + j, scalars.plus(product.get(i + j), scalars.times(a.get(i), b.get(j))));
            }
        }
        return product;
    }

    /** A polynomial as a summand, none for zero. */
    private List<FormSummand> whole(List<Scalar> coefficients, Span span) {
        List<Scalar> trimmed = trimmed(coefficients);
        return switch (trimmed.size()) {
            case 0 -> List.of();
            case 1 -> List.of(new FormSummand(trimmed.get(0), List.of(), span));
            default -> List.of(new FormSummand(Scalars.of(1), List.of(new FormFactor(trimmed, 1, span)), span));
        };
    }

    /** Without leading coefficients that are zero at face value. */
    private List<Scalar> trimmed(List<Scalar> coefficients) {
        int size = coefficients.size();
        while (size > 0 && scalars.isZero(coefficients.get(size - 1)) == Decision.YES) {
            size--;
        }
        return coefficients.subList(0, size);
    }

    /** The coefficients of a summand without anything below the line. */
    List<Scalar> multipliedOut(FormSummand summand) {
        List<Scalar> product = List.of(summand.front());
        for (FormFactor factor : summand.factors()) {
            if (factor.isVariable()) {
                product = shifted(product, factor.exponent());
                continue;
            }
            Work.within((long) factor.degree() * factor.exponent(), LARGEST_DEGREE);
            for (int i = 0; i < factor.exponent(); i++) {
                product = times(product, factor.coefficients());
            }
        }
        return product;
    }

    private static List<Scalar> shifted(List<Scalar> coefficients, int power) {
        Work.within((long) coefficients.size() + power, LARGEST_DEGREE + 1);
        return Stream.concat(Collections.nCopies(power, Scalars.of(0)).stream(), coefficients.stream())
                .toList();
    }

    List<FormSummand> negate(List<FormSummand> form) {
        return form.stream().map(summand -> summand.with(scalars.negate(summand.front()))).toList();
    }

    /** The product, fractions multiplied out summand by summand; sums over powers of the variable stay one factor. */
    List<FormSummand> times(List<FormSummand> a, List<FormSummand> b, Span span) {
        List<FormSummand> product = new ArrayList<>();
        for (FormSummand left : joined(a, span)) {
            for (FormSummand right : joined(b, span)) {
                product.add(new FormSummand(scalars.times(left.front(), right.front()),
                        Stream.concat(left.factors().stream(), right.factors().stream()).toList(),
                        a.size() == 1 ? right.span() : left.span()));
                Work.within(product.size(), MOST_SUMMANDS);
            }
        }
        return product;
    }

    private List<FormSummand> joined(List<FormSummand> form, Span span) {
        return form.size() > 1 && form.stream().allMatch(FormSummand::isPolynomialInInverses)
                ? overOneLine(form, span) : form;
    }

    /** The same as one summand, none for zero: over the product of what stands below, alike factors taken once. */
    List<FormSummand> overOneLine(List<FormSummand> form, Span span) {
        if (form.size() <= 1) {
            return form;
        }
        List<FormFactor> line = commonLine(form);
        List<FormSummand> above = whole(total(form.stream()
                .map(summand -> multipliedOut(above(summand, line))).toList()), span);
        return above.stream().map(summand -> new FormSummand(summand.front(),
                Stream.concat(summand.factors().stream(), line.stream()).toList(), span)).toList();
    }

    /** The factors below, each with the lowest exponent that a summand has it with. */
    private List<FormFactor> commonLine(List<FormSummand> form) {
        List<FormFactor> line = new ArrayList<>();
        for (FormSummand summand : form) {
            for (FormFactor factor : gathered(summand.below())) {
                int known = indexOf(line, factor);
                if (known < 0) {
                    line.add(factor);
                } else {
                    line.set(known, line.get(known).to(Math.min(line.get(known).exponent(), factor.exponent())));
                }
                Work.within(line.size(), LARGEST_DEGREE);
            }
        }
        return line;
    }

    /** Alike factors as one. */
    private List<FormFactor> gathered(List<FormFactor> factors) {
        List<FormFactor> gathered = new ArrayList<>();
        for (FormFactor factor : factors) {
            int known = indexOf(gathered, factor);
            if (known < 0) {
                gathered.add(factor);
            } else {
                gathered.set(known, factor.to(gathered.get(known).exponent() + factor.exponent()));
            }
        }
        return gathered;
    }

    private int indexOf(List<FormFactor> factors, FormFactor sought) {
        for (int i = 0; i < factors.size(); i++) {
            scalars.step();
            if (factors.get(i).isAlike(sought)) {
                return i;
            }
        }
        return -1;
    }

    /** The summand times the line: what is left above it. */
    private FormSummand above(FormSummand summand, List<FormFactor> line) {
        List<FormFactor> left = new ArrayList<>(summand.factors());
        left.removeIf(FormFactor::isBelow);
        List<FormFactor> own = gathered(summand.below());
        for (FormFactor factor : line) {
            int place = indexOf(own, factor);
            int missing = (place < 0 ? 0 : own.get(place).exponent()) - factor.exponent();
            if (missing > 0) {
                left.add(factor.to(missing));
            }
        }
        return new FormSummand(summand.front(), left, summand.span());
    }

    /** A single summand to a whole power of any sign; its front isn't zero where that is negative. */
    FormSummand pow(FormSummand summand, int exponent, Span span) {
        return new FormSummand(scalars.pow(summand.front(), exponent), exponent == 0 ? List.of()
                : summand.factors().stream().map(factor -> factor.to(bounded((long) factor.exponent() * exponent)))
                        .toList(), span);
    }

    private static int bounded(long exponent) {
        Work.within(Math.abs(exponent), LARGEST_DEGREE);
        return (int) exponent;
    }
}
