package org.pofk.report;

import java.util.ArrayList;
import java.util.List;
import org.pofk.chain.Timetable;
import org.pofk.report.Document.Block;
import org.pofk.report.Document.Labelled;
import org.pofk.report.Document.Paragraph;
import org.pofk.report.Document.Table;
import org.pofk.schedule.CycleFormula;
import org.pofk.transform.RecurrenceProof;
import org.pofk.transform.RecurrenceProof.Method;
import org.pofk.transform.Transform;

/** Why formulas over the cycles of a schedule hold for every cycle. */
final class CycleProof {
    private CycleProof() {
    }

    /** In a line, behind the formulas; one at least. */
    static Labelled holds(Timetable timetable, List<CycleFormula> formulas) {
        List<Transform> transforms = formulas.stream().map(formula -> formula.closedForm().transform()).toList();
        String because = transforms.stream().map(CycleProof::because).distinct().count() == 1
                ? because(transforms.get(0)) : becauseOfEach(transforms);
        return new Labelled("holds", "for every cycle: with S, the matrix of a whole cycle, x("
                + ScheduleProse.step(timetable, timetable.period() == 1 ? "m+1" : "(m+1)", "") + ") = S x("
                + ScheduleProse.step(timetable, "m", "") + "), " + because);
    }

    private static String becauseOfEach(List<Transform> transforms) {
        int order = transforms.stream().mapToInt(each -> each.recurrence().degree()).max().orElseThrow();
        int states = transforms.stream().mapToInt(each -> each.proof().order()).max().orElseThrow();
        return "the exact terms compared of each satisfy a recurrence of order " + order + " at most, and "
                + (states == 1 ? "one state takes part" : "up to " + states + " states take part")
                        + " (Cayley–Hamilton)";
    }

    private static String because(Transform transform) {
        RecurrenceProof proof = transform.proof();
        int order = transform.recurrence().degree();
        if (proof.order() == 0) {
            return "nothing that the start reaches takes part";
        }
        String states = proof.order() == 1 ? "one state takes part" : proof.order() + " states take part";
        return switch (proof.method()) {
            case CHARACTERISTIC -> "the sequence in m needs a recurrence of order " + order + ", and " + states
                    + ", so it is their characteristic polynomial (Cayley–Hamilton)";
            case WINDOWS -> terms(proof.comparedSteps(), order) + ", and " + states + " (Cayley–Hamilton)";
            case VECTOR -> "a recurrence of order " + order + " annihilates the state where cycles begin, and"
                    + " so every output at every step of the cycle";
        };
    }

    private static String terms(int count, int order) {
        String terms = count == 1 ? "the one exact term compared " : "the " + count + " exact terms compared ";
        return terms + RecurrenceProse.satisfied(count, order);
    }

    /** Why a comparison of finitely many terms proves a formula for every cycle. */
    static List<Block> theorem(List<Proved> formulas) {
        List<Block> blocks = new ArrayList<>();
        if (formulas.stream().anyMatch(each -> each.transform().proof().method() != Method.VECTOR)) {
            blocks.add(new Paragraph("On the n states that take part in a sequence over the cycles, S satisfies its own"
                    + " characteristic polynomial (Cayley–Hamilton). So a recurrence of order d that holds at"
                    + " m = 0 … n − 1, which the terms m = 0 … n + d − 1 decide, holds for every cycle; and a formula"
                    + " that obeys the recurrence and has the first d terms is the sequence itself."));
        }
        if (formulas.stream().anyMatch(each -> each.transform().proof().method() == Method.VECTOR)) {
            blocks.add(new Paragraph("Where a polynomial D of S takes the state in which cycles begin to zero, in every"
                    + " component, the recurrence with its coefficients holds for every output at every step of the"
                    + " cycle, for every cycle."));
        }
        return blocks;
    }

    /** What was compared for each formula; nothing where there is none. */
    static List<Block> compared(List<Proved> formulas) {
        return formulas.isEmpty() ? List.of() : List.of(new Table(Prose.of("What was compared for each formula: a"
                + " recurrence of order d, the shortest there is, where n states take part"),
                List.of(Prose.of("formula"), Prose.of("d"), Prose.of("n"), Prose.of("compared"), Prose.of("how")),
                formulas.stream().map(CycleProof::row).toList()));
    }

    private static List<Prose> row(Proved formula) {
        RecurrenceProof proof = formula.transform().proof();
        return List.of(formula.left(), Prose.of(String.valueOf(formula.transform().recurrence().degree())),
                Prose.of(String.valueOf(proof.order())), Prose.of(switch (proof.method()) {
                    case WINDOWS -> proof.order() == 0 ? "nothing to compare"
                            : "terms m = 0" + (proof.comparedSteps() == 1 ? "" : " … " + (proof.comparedSteps() - 1));
                    case CHARACTERISTIC -> "d is n";
                    case VECTOR -> "every state";
                }), Prose.of(proof.primes() == 0 ? "in fractions" : "modulo " + proof.primes()
                        + (proof.primes() == 1 ? " prime" : " primes")));
    }
}
