package org.pofk.report;

import java.util.ArrayList;
import java.util.List;
import org.pofk.answer.AbsentEigenvalues;
import org.pofk.answer.AbsentEigenvalues.Absent;
import org.pofk.answer.AbsentEigenvalues.Reason;
import org.pofk.formula.Formulas;
import org.pofk.modes.TablePair;

/** Which eigenvalues of the matrix are no part of an output, and why, in one line. */
final class AbsentProse {
    private AbsentProse() {
    }

    static Prose of(AbsentEigenvalues found) {
        if (found.factors().isEmpty()) {
            return Prose.of("all of the matrix's are in it");
        }
        List<Prose> reasons = new ArrayList<>();
        for (Reason reason : Reason.values()) {
            List<Prose> names = found.factors().stream().filter(absent -> absent.reason() == reason)
                    .map(AbsentProse::name).toList();
            if (!names.isEmpty()) {
                reasons.add(Prose.joined(names, ", ").and(switch (reason) {
                    case NOT_REACHED -> " (not reached)";
                    case NOT_SEEN -> " (not seen)";
                    case CANCELLED -> " (cancelled)";
                }));
            }
        }
        return Prose.of("absent of the matrix's: ").and(Prose.joined(reasons, "; "));
    }

    private static Prose name(Absent absent) {
        return absent.factor().degree() == 1
                ? Prose.of(absent.factor().coefficient(0).negate().toString())
                : Prose.of("the " + absent.factor().degree() + " roots of ")
                        .andFormula(Formulas.polynomial(absent.factor(), TablePair.LAMBDA));
    }
}
