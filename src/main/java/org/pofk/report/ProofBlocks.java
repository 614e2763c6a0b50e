package org.pofk.report;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import org.pofk.answer.ProofWindow;
import org.pofk.chain.Model.Convention;
import org.pofk.exact.Rational;
import org.pofk.formula.Formulas;
import org.pofk.report.Document.Block;
import org.pofk.report.Document.Display;
import org.pofk.report.Document.Heading;
import org.pofk.report.Document.Labelled;
import org.pofk.report.Document.Paragraph;
import org.pofk.report.Document.Relation;
import org.pofk.report.Document.Table;
import org.pofk.transform.RecurrenceProof;
import org.pofk.transform.RecurrenceProof.Method;
import org.pofk.transform.Transform;

/**
 * Why a formula holds for every k: the theorem, what was compared for each output, and one window of the comparison
 * written out so that it can be repeated by hand.
 */
final class ProofBlocks {
    private static final int RECURRENCE_SHOWN_UP_TO = 12;
    private static final int NUMBER_SHOWN_UP_TO = 40;
    /** What the paper says of shift registers is this for any field. */
    private static final String SOURCE = "J. L. Massey, Shift-register synthesis and BCH decoding, IEEE Transactions on"
            + " Information Theory IT-15, 1969, 122–127";

    /** D of the matrix at the start, and the powers of the matrix, in the reader's convention. */
    private final String atStart;
    private final String powers;
    private final List<Block> blocks = new ArrayList<>();

    private ProofBlocks(Convention convention) {
        this.atStart = convention == Convention.COLUMNS ? "D(A) x(0)" : "p(0) D(P)";
        this.powers = convention == Convention.COLUMNS ? "A^k" : "P^k";
    }

    /** Of every formula a report shows, those of its sections behind those that are derived. */
    static List<Block> of(Report report, Convention convention) {
        ProofBlocks proof = new ProofBlocks(convention);
        proof.write(Stream.concat(Proved.of(report.derived()),
                report.answers().stream().flatMap(section -> section.proofs().stream())).toList());
        return proof.blocks;
    }

    private void write(List<Proved> formulas) {
        if (formulas.isEmpty()) {
            return;
        }
        blocks.add(new Heading(2, "Why it holds for every k"));
        theorem(formulas.stream().map(each -> each.transform().proof().method()).collect(Collectors.toSet()));
        formulas.forEach(each -> {
            blocks.add(new Heading(3, each.left()));
            formula(each);
        });
    }

    private void theorem(Set<Method> methods) {
        blocks.add(new Paragraph("What is proved is a recurrence: a polynomial D(z) of degree d with y(k+i) in place of"
                + " z^i is zero at every k."));
        if (methods.contains(Method.WINDOWS)) {
            blocks.add(new Paragraph("The matrix of the n states that take part satisfies its own characteristic"
                    + " polynomial (Cayley–Hamilton), so y(k) obeys a recurrence of order n at every k, and so does what"
                    + " the recurrence claims to be zero. Zero at n steps in a row, it is therefore zero for ever:"
                    + " comparing n windows, which hold the terms y(0) … y(n+d−1), proves every k. In other words: two linear recurrences"
                    + " of orders n and d whose sequences agree in n + d terms agree in all of them (" + SOURCE
                    + ")."));
        }
        if (methods.contains(Method.CHARACTERISTIC)) {
            blocks.add(new Paragraph("Where a sequence needs a recurrence of as high an order as there are states that"
                    + " take part, D is their characteristic polynomial, and the matrix satisfies it"
                    + " (Cayley–Hamilton): that alone proves every k."));
        }
        if (methods.contains(Method.VECTOR)) {
            blocks.add(new Paragraph("Where " + atStart + " = 0 holds as a vector, multiplying it by " + powers + " and reading an"
                    + " output off it gives the recurrence of every output at every k."));
        }
        blocks.add(new Paragraph("Y(z) is what the recurrence and its first d terms add up to; the expansion of Y(z) is"
                + " an identity of fractions in z, and the table of pairs turns each part of it into a term in k. So the"
                + " formula is y(k) for every k that is named with it."));
    }

    private void formula(Proved formula) {
        Transform transform = formula.transform();
        RecurrenceProof proof = transform.proof();
        int order = transform.recurrence().degree();
        label("order", "d = " + order + ", the shortest there is; n = " + proof.order());
        label("compared", compared(formula, order));
        label("how", proof.primes() == 0 ? "in exact fractions" : "modulo " + (proof.primes() == 1 ? "1 prime"
                : proof.primes() + " primes") + " of 31 bits, whose product has more than " + proof.bits()
                + " bits: more than twice what could differ");
        boolean isShown = order <= RECURRENCE_SHOWN_UP_TO && longest(transform) <= NUMBER_SHOWN_UP_TO;
        if (isShown) {
            blocks.add(new Display(Prose.of("D(z)"), Relation.EQUAL, RationalFunction.inZ(transform.recurrence())));
        }
        window(formula, isShown);
    }

    private String compared(Proved formula, int order) {
        RecurrenceProof proof = formula.transform().proof();
        return switch (proof.method()) {
            case WINDOWS -> (proof.order() == 1 ? "the window at k = 0" : "the windows at k = 0 … " + (proof.order() - 1))
                    + ", with the terms y(0)" + (proof.comparedSteps() > 1 ? " … y(" + (proof.comparedSteps() - 1) + ")"
                            : "") + " as the " + formula.stepped() + " steps them";
            case CHARACTERISTIC -> "order " + order + " is needed and " + (order == 1 ? "one state takes part"
                    : order + " states take part") + "; the terms y(0) … y(" + (proof.comparedSteps() - 1)
                    + ") were compared";
            case VECTOR -> atStart + " = 0, in every state that takes part";
        };
    }

    private static int longest(Transform transform) {
        return IntStream.rangeClosed(0, transform.recurrence().degree())
                .map(i -> transform.recurrence().coefficient(i).toString().length()).max().orElse(0);
    }

    private void window(Proved formula, boolean isShown) {
        Optional<ProofWindow> window = isShown ? ProofWindow.of(formula.chain(), formula.transform()) : Optional.empty();
        if (window.isEmpty()) {
            blocks.add(new Paragraph("A window of this order has numbers too many or too long to be repeated by hand"
                    + elsewhere(formula)));
        } else if (window.get().longestNumber() > NUMBER_SHOWN_UP_TO) {
            blocks.add(new Paragraph("The shortest window begins at k = " + window.get().from() + " and has numbers of "
                    + window.get().longestNumber() + " characters, too long to be repeated by hand"
                    + elsewhere(formula)));
        } else {
            blocks.add(table(formula, window.get()));
        }
    }

    private static String elsewhere(Proved formula) {
        return switch (formula.repeated()) {
            case IN_NOTEBOOK -> "; the notebook (--as notebook) repeats all of them.";
            case NOWHERE -> ".";
        };
    }

    private static Table table(Proved formula, ProofWindow window) {
        List<List<Prose>> rows = new ArrayList<>();
        List<Rational> products = window.products();
        for (int i = 0; i < products.size(); i++) {
            rows.add(List.of(Prose.of(String.valueOf(i)), number(window.coefficients().get(i)),
                    number(window.terms().get(i)), number(products.get(i))));
        }
        rows.add(List.of(Prose.of("sum"), Prose.EMPTY, Prose.EMPTY, number(window.sum())));
        String at = window.from() == 0 ? "i" : window.from() + "+i";
        return new Table(Prose.of("The window at k = " + window.from() + ", to be repeated by hand; "
                + "y is what the " + formula.stepped() + " gives, step by step"),
                List.of(Prose.of("i"), Prose.of("of z^i in D(z)"), Prose.of("y(" + at + ")"), Prose.of("product")), rows);
    }

    private static Prose number(Rational value) {
        return Prose.formula(Formulas.number(value));
    }

    private void label(String label, String text) {
        blocks.add(new Labelled(label, text));
    }
}
