package org.pofk.transform;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Optional;
import java.util.stream.IntStream;
import org.pofk.chain.Chain;
import org.pofk.chain.Structure;
import org.pofk.chain.Structure.CommunicatingClass;
import org.pofk.exact.Polynomial;
import org.pofk.exact.Rational;
import org.pofk.exact.RationalField;

/**
 * det(zI − A), class by class: with the states in the order of their classes A is block triangular, so it is the
 * product of the classes' own. Exact: modulo primes, joined beyond a bound on the coefficients. It tells which
 * eigenvalues an output or a start leaves out. Cost: for each class of n states and each prime 2n steps of it, or n³
 * where an eigenvalue has several eigenvectors.
 *
 * @param parts one for each class, in the order of the structure
 */
public record CharacteristicPolynomial(List<Part> parts) {
    /** The largest class that is worked out. */
    public static final int LARGEST_CLASS = 400;
    /** The most multiplications that elimination may take for one class. */
    private static final long LARGEST_ELIMINATION = 4_000_000_000L;

    /** A class and the characteristic polynomial of the moves inside it, monic, its degree the number of states. */
    public record Part(CommunicatingClass states, Polynomial<Rational> polynomial) {
    }

    public CharacteristicPolynomial {
        parts = List.copyOf(parts);
    }

    /** Empty where a class is too large for it. */
    public static Optional<CharacteristicPolynomial> of(Chain chain) {
        List<Part> parts = new ArrayList<>();
        LinearSystem whole = new LinearSystem(chain.matrix(), chain.start(), List.of());
        for (CommunicatingClass each : Structure.of(chain).classes()) {
            Optional<Polynomial<Rational>> own = each.states().size() > LARGEST_CLASS
                    ? Optional.empty() : ofClass(whole.restrictedTo(each.states()));
            if (own.isEmpty()) {
                return Optional.empty();
            }
            parts.add(new Part(each, own.get()));
        }
        return Optional.of(new CharacteristicPolynomial(parts));
    }

    /** det(zI − A) multiplied out. */
    public Polynomial<Rational> polynomial() {
        Polynomial<Rational> product = Polynomial.one(RationalField.Q);
        for (Part part : parts) {
            product = product.times(part.polynomial);
        }
        return product;
    }

    private static Optional<Polynomial<Rational>> ofClass(LinearSystem states) {
        ScaledSystem scaled = ScaledSystem.of(new LinearSystem(states.matrix(),
                Collections.nCopies(states.size(), Rational.ZERO), List.of()));
        SystemResidues residues = new SystemResidues(scaled.system());
        BigInteger scale = scaled.bounds().scale();
        BigInteger wanted = scale.multiply(scaled.bounds().denominator()).shiftLeft(1);
        List<PrimeField> fields = new ArrayList<>();
        long below = 1L << 31;
        for (BigInteger product = BigInteger.ONE; product.compareTo(wanted) <= 0; ) {
            PrimeField field = PrimeField.below(below);
            below = field.prime();
            if (residues.isDefinedModulo(field)) {
                fields.add(field);
                product = product.multiply(BigInteger.valueOf(field.prime()));
            }
        }
        long size = states.size();
        boolean eliminate = size * size * size * fields.size() < LARGEST_ELIMINATION;
        List<Optional<long[]>> images = fields.stream().parallel()
                .map(field -> residues.modulo(field).characteristicPolynomial(eliminate)).toList();
        if (images.stream().anyMatch(Optional::isEmpty)) {
            return Optional.empty();
        }
        ChineseRemainders remainders = new ChineseRemainders(fields);
        List<Rational> coefficients = IntStream.rangeClosed(0, states.size()).mapToObj(power -> new Rational(
                remainders.combine(images.stream().mapToLong(image -> image.get()[power]).toArray(), scale), scale))
                .toList();
        return Optional.of(scaled.denominator(Polynomial.ofRationals(coefficients)));
    }
}
