package org.pofk.meaning;

import java.util.ArrayList;
import java.util.Collection;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.SortedMap;
import java.util.TreeMap;

/**
 * Whether equations can hold with every decimal within half a unit, once what can be solved is. An equation whose
 * decimals are in no other is decided by itself: it can hold where it takes both signs over all that they stand for.
 * Conditions without free decimals stand for themselves; those that share a free decimal can hold when some value of it, within half a unit,
 * suits them all: that at face value, or one found by halving its interval, pieces that suit one condition nowhere
 * being left out.
 */
final class Holding {
    private static final int MOST_PIECES = 200;

    private final Propagation propagation;
    private final SortedMap<Integer, Decision> decisions = new TreeMap<>();

    private Holding(Propagation propagation) {
        this.propagation = propagation;
    }

    /** For every equation. */
    static SortedMap<Integer, Decision> of(Propagation propagation) {
        Holding holding = new Holding(propagation);
        List<Condition> shared = new ArrayList<>();
        for (Condition condition : holding.conditions()) {
            if (propagation.standsAlone(condition.equation())) {
                holding.note(condition, holding.ofSpread(condition));
            } else if (condition.off().decimals().stream().anyMatch(propagation.free()::contains)) {
                shared.add(condition);
            } else {
                holding.note(condition, condition.holds());
            }
        }
        for (Written free : propagation.free()) {
            holding.together(free, shared);
        }
        holding.leftOver();
        return holding.decisions;
    }

    private List<Condition> conditions() {
        List<Condition> conditions = new ArrayList<>();
        propagation.right().forEach((decimal, value) ->
                conditions.add(Condition.within(propagation.solvedBy(decimal), decimal, value)));
        for (int equation : propagation.open()) {
            if (propagation.unknowns(equation).isEmpty()) {
                conditions.add(Condition.zero(equation, propagation.difference(equation)));
            }
        }
        return conditions;
    }

    /** A decision once taken as "no" stays. */
    private void note(Condition condition, Decision decision) {
        decisions.merge(condition.equation(), decision, Holding::both);
    }

    private static Decision both(Decision a, Decision b) {
        if (a == Decision.NO || b == Decision.NO) {
            return Decision.NO;
        }
        return a == Decision.YES ? b : a;
    }

    /** The conditions whose first free decimal is this one. */
    private void together(Written free, List<Condition> shared) {
        List<Condition> group = shared.stream()
                .filter(condition -> firstFree(condition).filter(free::equals).isPresent()).toList();
        List<Decision> atFaceValue = group.stream().map(Condition::holds).toList();
        boolean holds = atFaceValue.stream().allMatch(decision -> decision == Decision.YES);
        Decision decision = holds ? Decision.YES : somewhere(free, group);
        for (int i = 0; i < group.size(); i++) {
            note(group.get(i), atFaceValue.get(i) == Decision.YES ? Decision.YES : decision);
        }
    }

    /** That of an equation whose decimals are its own: at face value, or for some of the values they all stand for. */
    private Decision ofSpread(Condition condition) {
        if (condition.holds() == Decision.YES) {
            return Decision.YES;
        }
        Condition asWritten = Condition.zero(condition.equation(),
                propagation.differenceAsWritten(condition.equation()));
        return asWritten.everywhere(Map.of()) == Decision.NO ? Decision.NO : changesSign(asWritten);
    }

    private Optional<Written> firstFree(Condition condition) {
        List<Written> within = condition.off().decimals();
        return propagation.free().stream().filter(within::contains).findFirst();
    }

    private Decision somewhere(Written free, Collection<Condition> group) {
        List<Written> pieces = new ArrayList<>(List.of(free));
        for (int i = 0; i < pieces.size() && i < MOST_PIECES; i++) {
            Written piece = pieces.get(i);
            if (allEverywhere(group, Map.of(free, Quantity.of(piece.value())))) {
                return Decision.YES;
            }
            boolean excluded = group.stream().anyMatch(condition ->
                    condition.everywhere(Map.of(free, Quantity.of(piece))) == Decision.NO);
            if (!excluded) {
                pieces.addAll(halves(piece));
            }
        }
        return pieces.size() <= MOST_PIECES ? Decision.NO : Decision.UNDECIDED;
    }

    private static boolean allEverywhere(Collection<Condition> group, Map<Written, Quantity> replacements) {
        return group.stream().allMatch(condition -> condition.everywhere(replacements) == Decision.YES);
    }

    private static List<Written> halves(Written piece) {
        return List.of(piece.part(-1), piece.part(1));
    }

    /** Equations with an unknown that can't be isolated. */
    private void leftOver() {
        for (int equation : propagation.open()) {
            if (!propagation.unknowns(equation).isEmpty()) {
                Condition condition = Condition.zero(equation, propagation.difference(equation));
                note(condition, condition.everywhere(Map.of()) == Decision.NO ? Decision.NO : changesSign(condition));
            }
        }
    }

    /** A real number that hangs on decimals continuously and takes both signs at the ends of them is zero between. */
    private static Decision changesSign(Condition condition) {
        if (!condition.isDefinedEverywhere()) {
            return Decision.UNDECIDED;
        }
        List<Written> decimals = condition.off().decimals();
        boolean negative = false;
        boolean positive = false;
        for (int corner = 0; corner < 1 << Math.min(decimals.size(), 6); corner++) {
            Optional<Integer> sign = condition.off().with(Corners.of(decimals, corner)).sign();
            negative |= sign.filter(s -> s <= 0).isPresent();
            positive |= sign.filter(s -> s >= 0).isPresent();
        }
        return negative && positive ? Decision.YES : Decision.UNDECIDED;
    }
}
