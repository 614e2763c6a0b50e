package org.pofk.claim;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.pofk.meaning.Equation;
import org.pofk.meaning.ExponentialSum;
import org.pofk.meaning.ExponentialSum.Term;
import org.pofk.meaning.Precision;
import org.pofk.meaning.Quantity;
import org.pofk.text.RefusedException;

/**
 * Where a formula for one p(k) differs from the true modes: for each pole and power of k, and for each impulse, what is
 * written beside what should be. What is said to differ is proved to, whatever numbers the decimals stand for; which
 * terms stand for which pole is a guess.
 *
 * @param entries poles in their order, then terms that stand for none, then impulses
 */
public record ModeDifferences(List<Entry> entries) {

    /** In what a mode differs. */
    public enum Difference {
        NONE,
        /** The pole or its angle, as far as the coefficient can be told. */
        BASE,
        /** The coefficient, amplitude or phase. */
        COEFFICIENT,
        BASE_AND_COEFFICIENT,
        /** No term stands for it. */
        MISSING,
        /** A term that stands for no mode. */
        EXTRA,
        /** An impulse at one step. */
        IMPULSE
    }

    /**
     * One mode.
     *
     * @param pole      the true pole; none for an impulse or an extra term
     * @param power     the power of k; the step of an impulse
     * @param terms     what is written for it
     * @param equations what should hold: expressions in written decimals and their right values
     */
    public record Entry(Difference difference, Optional<TruePole> pole, long power, List<Term> terms,
            List<Equation> equations) {
        public Entry {
            terms = List.copyOf(terms);
            equations = List.copyOf(equations);
        }

        /** What λ^k k^power is multiplied by in p(k); for a pair, by half: the conjugate adds as much. */
        public Optional<Quantity> rightCoefficient() {
            return pole.map(each -> power < each.multiplicity()
                    ? PowersOfK.of(each).get((int) power) : Quantity.ZERO);
        }
    }

    public ModeDifferences {
        entries = List.copyOf(entries);
    }

    /** Those of one part of a claim. */
    public static ModeDifferences of(Claim claim, Statement.PofK.Part part, Truth truth) throws RefusedException {
        ExponentialSum claimed = ExponentialSum.of(part.is().parsed(), new Precision(claim.carried()));
        ModeEquations modes = ModeEquations.of(claimed, truth.about(part.output()),
                ClaimedSteps.of(claim.steps(), claimed.scope()));
        Map<Key, List<ModeEquation>> groups = new LinkedHashMap<>();
        modes.equations().forEach(each ->
                groups.computeIfAbsent(Key.of(each), key -> new ArrayList<>()).add(each));
        return new ModeDifferences(groups.values().stream().map(ModeDifferences::entry).toList());
    }

    /** What differs, in the order of the entries. */
    public List<Entry> different() {
        return entries.stream().filter(entry -> entry.difference != Difference.NONE).toList();
    }

    private record Key(Optional<TruePole> pole, long power, List<Term> extra) {
        static Key of(ModeEquation equation) {
            return new Key(equation.pole(), equation.power(),
                    equation.about() == ModeEquation.About.NOTHING ? equation.terms() : List.of());
        }
    }

    private static Entry entry(List<ModeEquation> equations) {
        ModeEquation first = equations.get(0);
        List<Term> terms = equations.stream().flatMap(each -> each.terms().stream()).distinct().toList();
        return new Entry(difference(equations, terms), first.pole(), first.power(), terms,
                equations.stream().map(ModeEquation::equation).toList());
    }

    private static Difference difference(List<ModeEquation> equations, List<Term> terms) {
        boolean isRefuted = equations.stream().anyMatch(ModeEquation::isRefuted);
        return switch (equations.get(0).about()) {
            case IMPULSE -> isRefuted ? Difference.IMPULSE : Difference.NONE;
            case NOTHING -> Difference.EXTRA;
            default -> terms.isEmpty() ? Difference.MISSING : ofMode(equations);
        };
    }

    private static Difference ofMode(List<ModeEquation> equations) {
        boolean base = equations.stream().anyMatch(each -> each.isRefuted() && isOfBase(each));
        boolean coefficient = equations.stream().anyMatch(each -> each.isRefuted() && !isOfBase(each));
        return base ? coefficient ? Difference.BASE_AND_COEFFICIENT : Difference.BASE
                : coefficient ? Difference.COEFFICIENT : Difference.NONE;
    }

    private static boolean isOfBase(ModeEquation equation) {
        return equation.about() == ModeEquation.About.BASE || equation.about() == ModeEquation.About.ANGLE;
    }
}
