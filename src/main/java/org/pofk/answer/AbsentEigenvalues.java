package org.pofk.answer;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.TreeMap;
import java.util.stream.IntStream;
import org.pofk.chain.Chain;
import org.pofk.chain.Output;
import org.pofk.chain.Reach;
import org.pofk.chain.Structure;
import org.pofk.chain.Structure.CommunicatingClass;
import org.pofk.exact.Factoring;
import org.pofk.exact.Factorization;
import org.pofk.exact.Polynomial;
import org.pofk.exact.Rational;
import org.pofk.transform.CharacteristicPolynomial;
import org.pofk.transform.Transform;

/**
 * Which eigenvalues of A don't show in an output, and why. The eigenvalues of A are those of its communicating classes;
 * one is absent when it is no root of the output's recurrence. Exact.
 *
 * @param factors the minimal polynomials of the absent eigenvalues, by degree and then by coefficients; a factor not
 *                proved irreducible stands for those of its roots that are absent
 */
public record AbsentEigenvalues(List<Absent> factors) {
    /** Why an eigenvalue is absent; the last reason that holds for one of the classes it belongs to. */
    public enum Reason {
        /** Only classes have it that the start never reaches. */
        NOT_REACHED,
        /** Only classes have it that the start never reaches or that reach no state the output reads. */
        NOT_SEEN,
        /** A class has it that is reached and seen, but the start or the output has no part in it. */
        CANCELLED
    }

    /** One factor of det(zI − A). */
    public record Absent(Polynomial<Rational> factor, Reason reason) {
    }

    public AbsentEigenvalues {
        factors = List.copyOf(factors);
    }

    /** Empty when a class is too large for its characteristic polynomial. */
    public static Optional<AbsentEigenvalues> of(Chain chain, Structure structure, Transform transform) {
        Set<Integer> seeing = new HashSet<>(Reach.into(chain.matrix(), read(transform.output())));
        Map<CommunicatingClass, Reason> reasonOfClass = new LinkedHashMap<>();
        for (CommunicatingClass each : structure.classes()) {
            reasonOfClass.put(each, !each.reached() ? Reason.NOT_REACHED
                    : !seeing.contains(each.states().get(0)) ? Reason.NOT_SEEN : Reason.CANCELLED);
        }
        if (transform.output().constant().isZero() && takesPart(reasonOfClass) == transform.recurrence().degree()) {
            // without a constant the recurrence divides the product of these classes' polynomials, so it is that product
            reasonOfClass.values().removeIf(reason -> reason == Reason.CANCELLED);
        }
        return reasonOfClass.isEmpty()
                ? Optional.of(new AbsentEigenvalues(List.of()))
                : CharacteristicPolynomial.of(chain).map(whole -> of(whole, reasonOfClass, transform.recurrence()));
    }

    private static AbsentEigenvalues of(CharacteristicPolynomial whole, Map<CommunicatingClass, Reason> reasonOfClass,
            Polynomial<Rational> recurrence) {
        Map<Polynomial<Rational>, Reason> reasons = new TreeMap<>(Factoring.CANONICAL_ORDER);
        for (CharacteristicPolynomial.Part part : whole.parts()) {
            if (reasonOfClass.containsKey(part.states())) {
                missing(part.polynomial(), recurrence).forEach(factor -> reasons.merge(factor,
                        reasonOfClass.get(part.states()), (a, b) -> a.compareTo(b) >= 0 ? a : b));
            }
        }
        List<Absent> absent = new ArrayList<>();
        reasons.forEach((factor, reason) -> absent.add(new Absent(factor, reason)));
        return new AbsentEigenvalues(absent);
    }

    /** How many states are in classes that are reached and seen. */
    private static int takesPart(Map<CommunicatingClass, Reason> reasonOfClass) {
        return reasonOfClass.entrySet().stream().filter(each -> each.getValue() == Reason.CANCELLED)
                .mapToInt(each -> each.getKey().states().size()).sum();
    }

    private static List<Integer> read(Output output) {
        return IntStream.range(0, output.coefficients().size())
                .filter(state -> !output.coefficients().get(state).isZero()).boxed().toList();
    }

    /** The factors of a class's polynomial without those of the recurrence. */
    private static List<Polynomial<Rational>> missing(Polynomial<Rational> ofClass, Polynomial<Rational> recurrence) {
        Polynomial<Rational> left = ofClass;
        Polynomial<Rational> common = left.greatestCommonDivisor(recurrence);
        while (!common.isConstant()) {
            left = left.dividedExactlyBy(common);
            common = left.greatestCommonDivisor(recurrence);
        }
        return left.isConstant()
                ? List.of()
                : Factoring.of(left).factors().stream().map(Factorization.Factor::polynomial).toList();
    }
}
