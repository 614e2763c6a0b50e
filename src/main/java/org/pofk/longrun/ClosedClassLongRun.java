package org.pofk.longrun;

import java.util.ArrayList;
import java.util.Collections;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.pofk.chain.Chain;
import org.pofk.chain.Output;
import org.pofk.chain.SparseMatrix;
import org.pofk.chain.Structure;
import org.pofk.chain.Structure.CommunicatingClass;
import org.pofk.exact.Rational;

/**
 * Where a chain ends up, from its closed classes alone: how likely each is to be the last (apart by phase where it is
 * periodic), and how its states share the long run. Uses no transform, so it is a second way to the same values.
 * Exact; the linear systems have at most {@link #UNKNOWNS_AT_MOST} unknowns.
 *
 * @param endings the reached closed classes, in the order of the structure
 */
public record ClosedClassLongRun(List<Ending> endings) {

    /** Larger systems are not solved. */
    public static final int UNKNOWNS_AT_MOST = 400;

    /**
     * A closed class as an ending.
     *
     * @param weights    in place f, how likely the chain is to end in the class with phase f: in cyclic class
     *                   (k + f) modulo the period at every late k; one weight for an aperiodic class
     * @param stationary the null vector of A − I on the class, summing to one, in the order of its states
     */
    public record Ending(CommunicatingClass closedClass, List<Rational> weights, List<Rational> stationary) {
        public Ending {
            weights = List.copyOf(weights);
            stationary = List.copyOf(stationary);
        }

        /** How likely the chain is to end in the class. */
        public Rational weight() {
            return weights.stream().reduce(Rational.ZERO, Rational::plus);
        }

        /** What the output reads on each cyclic class once the chain moves round in it. */
        private List<Rational> readings(Output output) {
            Map<Integer, Integer> place = StationaryDistribution.placeOf(closedClass.states());
            List<Rational> readings = new ArrayList<>();
            for (List<Integer> cyclicClass : closedClass.cyclicClasses()) {
                Rational sum = Rational.ZERO;
                for (int state : cyclicClass) {
                    Rational weight = output.coefficients().get(state);
                    if (!weight.isZero()) {
                        sum = sum.plus(weight.times(stationary.get(place.get(state))));
                    }
                }
                readings.add(sum.times(Rational.of(closedClass.period())));
            }
            return readings;
        }

        /** The part of the output's long run, in place j at k ≡ j modulo the period. */
        private List<Rational> values(Output output) {
            List<Rational> readings = readings(output);
            int period = closedClass.period();
            List<Rational> values = new ArrayList<>();
            for (int j = 0; j < period; j++) {
                Rational sum = Rational.ZERO;
                for (int phase = 0; phase < period; phase++) {
                    sum = sum.plus(weights.get(phase).times(readings.get((j + phase) % period)));
                }
                values.add(sum);
            }
            return values;
        }
    }

    public ClosedClassLongRun {
        endings = List.copyOf(endings);
    }

    /** Empty for a recursion, and for a chain whose linear systems are too large. */
    public static Optional<ClosedClassLongRun> of(Chain chain, Structure structure) {
        List<Integer> left = structure.transientClasses().stream().filter(CommunicatingClass::reached)
                .flatMap(each -> each.states().stream()).sorted().toList();
        List<CommunicatingClass> closed = structure.closedClasses().stream().filter(CommunicatingClass::reached)
                .toList();
        boolean small = closed.stream().allMatch(each -> each.states().size() <= UNKNOWNS_AT_MOST
                && (long) left.size() * each.period() <= UNKNOWNS_AT_MOST);
        if (chain.kind() != Chain.Kind.CHAIN || !small) {
            return Optional.empty();
        }
        Map<Integer, TransientVisits> visits = new HashMap<>();
        List<Ending> endings = new ArrayList<>();
        for (CommunicatingClass each : closed) {
            TransientVisits before = visits.computeIfAbsent(each.period(),
                    period -> TransientVisits.of(chain, left, period));
            endings.add(new Ending(each, weights(chain, each, left, before),
                    StationaryDistribution.of(chain.matrix(), each.states())));
        }
        return Optional.of(new ClosedClassLongRun(endings));
    }

    /** What the output does in the long run. */
    public LongRun of(Output output) {
        List<List<Rational>> parts = endings.stream().map(each -> each.values(output)).toList();
        return PeriodicValues.sum(parts).plus(output.constant()).longRun();
    }

    private static List<Rational> weights(Chain chain, CommunicatingClass closed, List<Integer> left,
            TransientVisits before) {
        int period = closed.period();
        Map<Integer, Integer> cyclicPlace = new HashMap<>();
        for (int j = 0; j < period; j++) {
            for (int state : closed.cyclicClasses().get(j)) {
                cyclicPlace.put(state, j);
            }
        }
        List<Rational> weights = new ArrayList<>(Collections.nCopies(period, Rational.ZERO));
        for (int state : closed.states()) {
            add(weights, cyclicPlace.get(state), chain.start().get(state));
        }
        for (int residue = 0; residue < period; residue++) {
            for (int t = 0; t < left.size(); t++) {
                Rational visits = before.byResidue().get(residue).get(t);
                for (SparseMatrix.Entry entry : chain.matrix().columns().get(left.get(t))) {
                    Integer entered = cyclicPlace.get(entry.row());
                    if (entered != null) {
                        // entered at a step ≡ residue + 1, when phase f stands in cyclic class residue + 1 + f
                        add(weights, Math.floorMod(entered - residue - 1, period), entry.value().times(visits));
                    }
                }
            }
        }
        return weights;
    }

    private static void add(List<Rational> weights, int place, Rational more) {
        weights.set(place, weights.get(place).plus(more));
    }
}
