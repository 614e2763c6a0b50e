package org.pofk.meaning;

import java.util.List;
import java.util.OptionalLong;
import java.util.SortedMap;
import java.util.SortedSet;
import java.util.TreeMap;
import java.util.TreeSet;
import org.pofk.formula.Formula.Cases;
import org.pofk.meaning.ExponentialSum.Scope;

/**
 * A formula given by branches: the last one for every step, plus at each step of another branch an impulse of the
 * difference. Where the last one has an end too, each step is an impulse. Exact; one value per such step.
 */
final class CasesReading {
    private final Cases cases;
    private final List<PolarSum> branches;
    private final PolarArithmetic arithmetic;
    private final Scalars scalars;

    CasesReading(Cases cases, List<PolarSum> branches, PolarArithmetic arithmetic, Scalars scalars) {
        this.cases = cases;
        this.branches = branches;
        this.arithmetic = arithmetic;
        this.scalars = scalars;
    }

    PolarSum sum() {
        Cases.Branch last = cases.branches().get(cases.branches().size() - 1);
        PolarSum forEver = last.to().isEmpty() ? branches.get(branches.size() - 1) : PolarSum.of(List.of());
        long end = last.to().isEmpty() ? last.from() : last.to().getAsLong() + 1;
        Work.within(end, PolarArithmetic.MOST_IMPULSES);
        SortedMap<Long, Scalar> impulses = new TreeMap<>(forEver.impulses().tailMap(end));
        SortedSet<Long> silent = new TreeSet<>(forEver.scope().silent().tailSet(end));
        for (long k = 0; k < end; k++) {
            int branch = branchAt(k);
            if (branch < 0 || !branches.get(branch).scope().includes(k)) {
                silent.add(k);
            } else {
                impulses.put(k, scalars.minus(arithmetic.valueAt(branches.get(branch), k),
                        arithmetic.valueOfTerms(forEver, k)));
            }
        }
        OptionalLong to = last.to().isPresent() ? last.to() : forEver.scope().last();
        return arithmetic.sum(List.of(new PolarSum(forEver.terms(), impulses, new Scope(silent, to))));
    }

    /** The place of the branch for a step, −1 where there is none. */
    private int branchAt(long k) {
        for (int i = 0; i < cases.branches().size(); i++) {
            if (cases.branches().get(i).holdsAt(k)) {
                return i;
            }
        }
        return -1;
    }
}
