package org.pofk.transform;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.IntStream;
import org.pofk.exact.Polynomial;
import org.pofk.exact.Rational;
import org.pofk.transform.RecurrenceProof.Method;

/**
 * The shortest recurrence of every reading of a system: modulo primes of 31 bits, joined by Chinese remainders, and
 * proved. Modulo one prime the recurrence of order d is found from n + d terms and holds there for every k.
 * Primes whose order is below the largest seen are left out: they are the ones that can be misleading.
 *
 * <p>Proof that the joined D, P are right over the rationals. Let χ be the characteristic polynomial and N = P_χ its
 * numerator. E = N·D − P·χ vanishes modulo every prime taken, and E times (Δ·l)·δ, δ the common denominator of D and P,
 * is integral; so E = 0 once the product of the primes exceeds twice a bound on it. When d = n, D is χ itself and a
 * bound on its own coefficients is enough. D is shortest because it is shortest modulo a prime.
 *
 * <p>Exact. Cost: for each prime (n + d) steps of the system and O((n + d)·d) for each reading.
 */
final class Recurrences {
    private static final long BELOW = 1L << 31;
    private static final int PARALLEL_FROM = 48;

    /** What one prime says of every reading. */
    private record Modular(PrimeField field, List<long[]> denominators, List<long[]> numerators) {
        int order(int reading) {
            return numerators.get(reading).length;
        }
    }

    private final LinearSystem system;
    private final KrylovTerms terms;
    private final SystemBounds bounds;
    private final List<Modular> known = new ArrayList<>();
    private long nextBelow = BELOW;

    private Recurrences(LinearSystem system) {
        this.system = system;
        terms = new KrylovTerms(system);
        bounds = SystemBounds.of(system);
    }

    /** One recurrence for each reading, in their order. */
    static List<Recurrence> of(LinearSystem system) {
        Recurrences search = new Recurrences(system);
        List<Recurrence> found = new ArrayList<>();
        for (int reading = 0; reading < system.readings().size(); reading++) {
            found.add(search.of(reading));
        }
        return found;
    }

    private Recurrence of(int reading) {
        BigInteger wanted = bounds.scale().multiply(bounds.coefficient()).multiply(bounds.term()).shiftLeft(1);
        while (true) {
            List<Modular> taken = ofLargestOrder(reading);
            ChineseRemainders remainders = new ChineseRemainders(taken.stream().map(Modular::field).toList());
            if (remainders.product().compareTo(wanted) <= 0) {
                addPrimes(wanted.bitLength() - remainders.product().bitLength());
                continue;
            }
            Polynomial<Rational> denominator =
                    joined(remainders, taken.stream().map(one -> one.denominators.get(reading)).toList());
            Polynomial<Rational> numerator =
                    joined(remainders, taken.stream().map(one -> one.numerators.get(reading)).toList());
            int order = denominator.degree();
            if (order == system.size()) {
                return new Recurrence(numerator, denominator,
                        proof(Method.CHARACTERISTIC, order, taken.size(), remainders));
            }
            wanted = wanted.max(differenceBound(numerator, denominator).shiftLeft(1));
            if (remainders.product().compareTo(wanted) > 0) {
                return new Recurrence(numerator, denominator,
                        proof(Method.WINDOWS, order, taken.size(), remainders));
            }
        }
    }

    private RecurrenceProof proof(Method method, int order, int primes, ChineseRemainders remainders) {
        return new RecurrenceProof(method, system.size(), system.size() + order, primes,
                remainders.product().bitLength() - 1);
    }

    private List<Modular> ofLargestOrder(int reading) {
        int largest = known.stream().mapToInt(one -> one.order(reading)).max().orElse(0);
        return known.stream().filter(one -> one.order(reading) == largest).toList();
    }

    /** More primes, together of at least that many bits. */
    private void addPrimes(int bits) {
        List<PrimeField> fields = new ArrayList<>();
        while (fields.size() <= bits / 30) {
            PrimeField field = PrimeField.of(PrimeField.primesBelow(nextBelow, 1).get(0));
            nextBelow = field.prime();
            if (terms.isDefinedModulo(field)) {
                fields.add(field);
            }
        }
        IntStream places = IntStream.range(0, fields.size());
        known.addAll((system.size() < PARALLEL_FROM ? places : places.parallel())
                .mapToObj(i -> modulo(fields.get(i))).toList());
    }

    private Modular modulo(PrimeField field) {
        List<BerlekampMassey> found = terms.recurrencesModulo(field);
        return new Modular(field, found.stream().map(BerlekampMassey::recurrence).toList(),
                found.stream().map(BerlekampMassey::numerator).toList());
    }

    private Polynomial<Rational> joined(ChineseRemainders remainders, List<long[]> residues) {
        List<Rational> coefficients = new ArrayList<>();
        for (int power = 0; power < residues.get(0).length; power++) {
            int at = power;
            long[] ofPower = residues.stream().mapToLong(one -> one[at]).toArray();
            coefficients.add(new Rational(remainders.combine(ofPower, bounds.scale()), bounds.scale()));
        }
        return Polynomial.ofRationals(coefficients);
    }

    /** A bound on (Δ·l)·δ·E. */
    private BigInteger differenceBound(Polynomial<Rational> numerator, Polynomial<Rational> denominator) {
        List<Rational> all = new ArrayList<>(numerator.coefficients());
        all.addAll(denominator.coefficients());
        Rational sum = denominator.coefficients().stream().map(Rational::abs).reduce(Rational.ZERO, Rational::plus);
        Rational largest = numerator.coefficients().stream().map(Rational::abs)
                .reduce(Rational.ZERO, Rational::max);
        Rational bound = sum.times(Rational.of(bounds.term())).plus(largest)
                .times(Rational.of(bounds.coefficient().multiply(bounds.scale())))
                .times(Rational.of(SystemBounds.commonDenominator(all)));
        return bound.floor().add(BigInteger.ONE);
    }
}
