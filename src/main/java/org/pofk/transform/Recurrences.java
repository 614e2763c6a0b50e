package org.pofk.transform;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;
import java.util.stream.IntStream;
import org.pofk.exact.CommonDenominator;
import org.pofk.exact.Polynomial;
import org.pofk.exact.Rational;
import org.pofk.transform.RecurrenceProof.Method;

/**
 * The shortest recurrences of a system: modulo primes of 31 bits, joined by Chinese remainders, and proved. Primes
 * whose order is below the largest seen are left out: they are the ones that can mislead.
 *
 * <p>Proof that the joined D, P are right over the rationals. Let χ be the characteristic polynomial and N the
 * numerator over it. E = N·D − P·χ vanishes modulo every prime taken, and E·Δ·δ, δ the common denominator of D and P,
 * is integral; so E = 0 once the product of the primes exceeds twice a bound on it. When d = n, D is χ itself and
 * bounds on its and N's own coefficients are enough. D is shortest because it is shortest modulo a prime.
 *
 * <p>Exact. Cost: for each prime (n + d) steps of the system, fewer when a vector proves it.
 */
final class Recurrences {
    private static final long BELOW = 1L << 31;
    /** Pieces of work smaller than this take less than handing them to another thread. */
    private static final int PARALLEL_FROM = 40;

    /** Up to this size the proof is made in rational numbers as well, as long as they stay short. */
    private static final int REPEATABLE_UP_TO = 16;
    private static final int REPEATABLE_BITS = 2048;
    private static final int SHORT_BITS = 128;

    /** What one prime says. */
    private record Modular(PrimeField field, List<ModularRecurrence> recurrences) {
    }

    private final LinearSystem system;
    private final Function<ModularSystem, List<ModularRecurrence>> method;
    private final ScaledSystem scaled;
    private final SystemResidues residues;
    private final CoefficientBounds bounds;
    private Optional<ExactWindows> exact = Optional.empty();
    private final List<Modular> known = new ArrayList<>();
    private long nextBelow = BELOW;

    private Recurrences(LinearSystem original, Function<ModularSystem, List<ModularRecurrence>> method) {
        this.method = method;
        scaled = ScaledSystem.of(original);
        system = scaled.system();
        residues = new SystemResidues(system);
        bounds = scaled.bounds();
    }

    /** One recurrence for each reading, in their order. */
    static List<Recurrence> ofReadings(LinearSystem system) {
        Recurrences search = new Recurrences(system, ModularSystem::recurrences);
        List<Recurrence> found = new ArrayList<>();
        for (int reading = 0; reading < system.readings().size(); reading++) {
            found.add(search.proved(reading));
        }
        return found;
    }

    /** The recurrence that the state as a whole shares, with one numerator for each state; readings play no part. */
    static Recurrence ofState(LinearSystem system) {
        LinearSystem unread = new LinearSystem(system.matrix(), system.start(), List.of());
        return new Recurrences(unread, modular -> List.of(modular.ofState())).proved(0);
    }

    private Recurrence proved(int place) {
        BigInteger wanted = bounds.wanted();
        while (true) {
            List<Modular> taken = ofLargestOrder(place);
            ChineseRemainders remainders = new ChineseRemainders(taken.stream().map(Modular::field).toList());
            if (remainders.product().compareTo(wanted) <= 0) {
                // The first prime alone tells how the others are best taken.
                addPrimes(known.isEmpty() ? 1 : wanted.bitLength() - remainders.product().bitLength());
                continue;
            }
            Recurrence joined = joined(remainders, taken.stream().map(one -> one.recurrences.get(place)).toList());
            if (joined.denominator().degree() < system.size()) {
                wanted = wanted.max(differenceBound(joined).shiftLeft(1));
            }
            if (remainders.product().compareTo(wanted) > 0) {
                return original(repeatable(joined, place));
            }
        }
    }

    /**
     * The same with the proof in rational numbers where they stay short: all windows of a reading, or D(A) x0 = 0.
     * It stands by itself, so a failure would be a fault of the proof modulo primes: an {@link AssertionError}.
     */
    private Recurrence repeatable(Recurrence joined, int place) {
        int order = joined.denominator().degree();
        long bits = (long) growth() * (system.size() + order);
        if (system.size() > REPEATABLE_UP_TO || bits > REPEATABLE_BITS) {
            return joined;
        }
        boolean whole = system.readings().isEmpty();
        int windows = whole ? 1 : system.size();
        ExactWindows terms = exact.orElseGet(() -> ExactWindows.of(system));
        exact = Optional.of(terms);
        for (int sequence = 0; sequence < joined.numerators().size(); sequence++) {
            if (!terms.hold(joined.denominator(), joined.numerators().get(sequence),
                    whole ? unit(sequence) : system.readings().get(place), windows)) {
                throw new AssertionError("a recurrence doesn't hold: " + joined + " for " + system);
            }
        }
        return new Recurrence(joined.denominator(), joined.numerators(), whole
                ? new RecurrenceProof(Method.VECTOR, order, 2 * order, 0, 0)
                : new RecurrenceProof(Method.WINDOWS, system.size(), system.size() + order, 0, 0));
    }

    /** By how many bits terms grow in a step; short denominators of an unscaled matrix count as nothing. */
    private int growth() {
        int bits = system.matrix().commonDenominator().bitLength();
        return bits > SHORT_BITS ? bits : scaled.unit().bitLength();
    }

    private List<Rational> unit(int place) {
        List<Rational> unit = new ArrayList<>(Collections.nCopies(system.size(), Rational.ZERO));
        unit.set(place, Rational.ONE);
        return unit;
    }

    private Recurrence original(Recurrence joined) {
        int degree = joined.denominator().degree();
        return new Recurrence(scaled.denominator(joined.denominator()),
                joined.numerators().stream().map(numerator -> scaled.numerator(numerator, degree)).toList(),
                joined.proof());
    }

    private List<Modular> ofLargestOrder(int place) {
        int largest = known.stream().mapToInt(one -> one.recurrences.get(place).order()).max().orElse(0);
        return known.stream().filter(one -> one.recurrences.get(place).order() == largest).toList();
    }

    /** More primes, together of at least that many bits. */
    private void addPrimes(int bits) {
        List<PrimeField> fields = new ArrayList<>();
        while (fields.size() <= bits * 100L / 3099) {
            PrimeField field = PrimeField.below(nextBelow);
            nextBelow = field.prime();
            if (residues.isDefinedModulo(field)) {
                fields.add(field);
            }
        }
        List<List<PrimeField>> groups = new ArrayList<>();
        for (int from = 0; from < fields.size(); from += ModularLanes.WIDTH) {
            groups.add(fields.subList(from, Math.min(fields.size(), from + ModularLanes.WIDTH)));
        }
        int order = orderForLanes();
        known.addAll(places(groups.size(), system.size())
                .mapToObj(i -> modulo(groups.get(i), order)).flatMap(List::stream).toList());
    }

    /** The largest order that windows showed, with which four primes go together; −1 where a vector proves it sooner. */
    private int orderForLanes() {
        int order = known.stream().flatMap(one -> one.recurrences.stream())
                .mapToInt(recurrence -> recurrence.method() == Method.WINDOWS ? recurrence.order() : -1)
                .max().orElse(-1);
        return system.readings().isEmpty() ? -1 : order;
    }

    private List<Modular> modulo(List<PrimeField> group, int order) {
        List<ModularSystem> systems = group.stream().map(residues::modulo).toList();
        Optional<ModularLanes> lanes = order < 0 ? Optional.empty() : ModularLanes.of(systems);
        List<List<ModularRecurrence>> found = lanes.map(four -> four.recurrences(order))
                .orElseGet(() -> systems.stream().map(method).toList());
        return IntStream.range(0, group.size()).mapToObj(i -> new Modular(group.get(i), found.get(i))).toList();
    }

    private static IntStream places(int count, int work) {
        IntStream places = IntStream.range(0, count);
        return work < PARALLEL_FROM ? places : places.parallel();
    }

    private Recurrence joined(ChineseRemainders remainders, List<ModularRecurrence> parts) {
        int order = parts.get(0).order();
        Polynomial<Rational> denominator = polynomial(remainders, parts, order + 1, ModularRecurrence::denominator);
        List<Polynomial<Rational>> numerators = IntStream.range(0, parts.get(0).sequences())
                .mapToObj(sequence -> polynomial(remainders, parts, order,
                        (part, power) -> part.numerator(sequence, power))).toList();
        return new Recurrence(denominator, numerators, proof(remainders, parts));
    }

    /** The residue of one coefficient. */
    private interface Residue {
        long at(ModularRecurrence part, int power);
    }

    private Polynomial<Rational> polynomial(ChineseRemainders remainders, List<ModularRecurrence> parts, int length,
            Residue residue) {
        List<Rational> coefficients = places(length, parts.size()).mapToObj(power -> {
            long[] ofPower = parts.stream().mapToLong(part -> residue.at(part, power)).toArray();
            return new Rational(remainders.combine(ofPower, bounds.scale()), bounds.scale());
        }).toList();
        return Polynomial.ofRationals(coefficients);
    }

    private RecurrenceProof proof(ChineseRemainders remainders, List<ModularRecurrence> parts) {
        int order = parts.get(0).order();
        int bits = remainders.product().bitLength() - 1;
        if (order == system.size()) {
            return new RecurrenceProof(Method.CHARACTERISTIC, order, 2 * order, parts.size(), bits);
        }
        boolean vectors = parts.stream().allMatch(part -> part.method() == Method.VECTOR);
        int proved = vectors ? parts.stream().mapToInt(ModularRecurrence::provedOrder).max().orElse(0) : system.size();
        return new RecurrenceProof(vectors ? Method.VECTOR : Method.WINDOWS, proved, proved + order, parts.size(),
                bits);
    }

    /** A bound on E·Δ·δ, for every sequence. */
    private BigInteger differenceBound(Recurrence recurrence) {
        List<Rational> all = new ArrayList<>(recurrence.denominator().coefficients());
        recurrence.numerators().forEach(numerator -> all.addAll(numerator.coefficients()));
        Rational sum = recurrence.denominator().coefficients().stream().map(Rational::abs)
                .reduce(Rational.ZERO, Rational::plus);
        Rational largest = recurrence.numerators().stream().flatMap(numerator -> numerator.coefficients().stream())
                .map(Rational::abs).reduce(Rational.ZERO, Rational::max);
        Rational bound = sum.times(Rational.of(bounds.numerator()))
                .plus(largest.times(Rational.of(bounds.denominator())))
                .times(Rational.of(bounds.scale().multiply(CommonDenominator.of(all))));
        return bound.floor().add(BigInteger.ONE);
    }
}
