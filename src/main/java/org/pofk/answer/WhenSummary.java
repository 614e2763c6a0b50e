package org.pofk.answer;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.pofk.answer.When.End;
import org.pofk.answer.When.Reason;
import org.pofk.answer.When.ResidueClass;

/** Puts the answers of the residue classes together. */
public final class WhenSummary {
    private WhenSummary() {
    }

    public static When of(When.Condition condition, List<ResidueClass> found) {
        List<ResidueClass> classes = fewest(found);
        Optional<Long> first = classes.stream().flatMap(each -> each.first().stream()).min(Long::compare);
        boolean decided = classes.stream().allMatch(each -> each.end().isDecided());
        Optional<Long> forEver = classes.stream().allMatch(each -> each.end() == End.MET)
                ? Optional.of(forEverFrom(classes)) : Optional.empty();
        return new When(condition, first, forEver, classes, decided, reason(classes, first.isPresent(), decided));
    }

    /** One more than the last step that fails. */
    private static long forEverFrom(List<ResidueClass> classes) {
        long lastFailed = classes.stream().mapToLong(each ->
                each.forEverFrom().orElseThrow() - each.modulus()).max().orElseThrow();
        return Math.max(0, lastFailed + 1);
    }

    /** The classes taken together to a smaller modulus where they end alike. */
    private static List<ResidueClass> fewest(List<ResidueClass> classes) {
        int count = classes.size();
        for (int modulus = 1; modulus < count; modulus++) {
            if (count % modulus == 0 && endAlike(classes, modulus)) {
                List<ResidueClass> joined = new ArrayList<>();
                for (int residue = 0; residue < modulus; residue++) {
                    joined.add(joined(classes, residue, modulus));
                }
                return joined;
            }
        }
        return classes;
    }

    private static boolean endAlike(List<ResidueClass> classes, int modulus) {
        for (int i = modulus; i < classes.size(); i++) {
            if (classes.get(i).end() != classes.get(i - modulus).end()) {
                return false;
            }
        }
        return true;
    }

    private static ResidueClass joined(List<ResidueClass> classes, int residue, int modulus) {
        List<ResidueClass> members = new ArrayList<>();
        for (int i = residue; i < classes.size(); i += modulus) {
            members.add(classes.get(i));
        }
        Optional<Long> first = members.stream().flatMap(each -> each.first().stream()).min(Long::compare);
        Optional<Long> forEver = members.get(0).end() != End.MET ? Optional.empty()
                : Optional.of(members.stream().mapToLong(each -> each.forEverFrom().orElseThrow() - each.modulus())
                        .max().orElseThrow());
        return new ResidueClass(residue, modulus, members.get(0).end(), first,
                forEver.map(lastFailed -> lastFailed < residue ? (long) residue : next(lastFailed, residue, modulus)));
    }

    /** The least step of the class above k. */
    private static long next(long k, long residue, long modulus) {
        return k + 1 + Math.floorMod(residue - k - 1, modulus);
    }

    private static Reason reason(List<ResidueClass> classes, boolean ever, boolean decided) {
        if (!decided) {
            return classes.stream().anyMatch(each -> each.end() == End.TOO_MANY_STEPS)
                    ? Reason.TOO_MANY_STEPS : Reason.APPROACH_NOT_DECIDED;
        }
        if (classes.stream().allMatch(each -> each.end() == End.MET)) {
            return Reason.FOR_EVER;
        }
        if (classes.stream().anyMatch(each -> each.end() == End.MET)) {
            return Reason.ONLY_IN_SOME_CLASSES;
        }
        if (classes.stream().anyMatch(each -> each.end() == End.BOTH_FOR_EVER)) {
            return Reason.AGAIN_AND_AGAIN;
        }
        return ever ? Reason.ONLY_FOR_A_WHILE : Reason.NEVER;
    }
}
