package org.pofk.exact;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;

/**
 * The rational roots of a square-free integer polynomial, exact and complete: its roots modulo a prime are lifted
 * until the numerators are determined, then tried (Loos 1983, Computing rational zeros of integral polynomials by
 * p-adic expansion; from memory). No integer is factored. Costs a few evaluations per root modulo the prime.
 */
final class RationalRoots {
    private static final int FIRST_PRIME = 101;
    private static final int PRIMES_COMPARED = 3;

    /** The residues among which all rational roots are found, each a simple root modulo the prime. */
    private record SimpleRoots(int prime, List<Long> residues) {
    }

    private RationalRoots() {
    }

    /** The roots of a polynomial that isn't constant, in no particular order. */
    static List<Rational> of(IntegerPolynomial squareFree) {
        if (squareFree.degree() == 1) {
            return List.of(new Rational(squareFree.coefficient(0).negate(), squareFree.leading()));
        }
        SimpleRoots start = fewest(squareFree);
        List<Rational> roots = new ArrayList<>();
        for (long residue : start.residues) {
            Rational candidate = lift(squareFree, BigInteger.valueOf(residue), BigInteger.valueOf(start.prime));
            if (squareFree.quotientBy(linear(candidate)).isPresent()) {
                roots.add(candidate);
            }
        }
        return roots;
    }

    /** denominator · z − numerator: the primitive polynomial with this one root. */
    static IntegerPolynomial linear(Rational root) {
        return new IntegerPolynomial(List.of(root.numerator().negate(), root.denominator()));
    }

    /** A prime that leaves few residues to lift; ends at once when a prime proves that there is no root. */
    private static SimpleRoots fewest(IntegerPolynomial squareFree) {
        List<SimpleRoots> seen = new ArrayList<>();
        SimpleRoots best = null;
        for (int prime = FIRST_PRIME; seen.size() < PRIMES_COMPARED; prime = SmallPrimes.after(prime)) {
            ModularPolynomial image = squareFree.modulo(prime);
            if (image.degree() == squareFree.degree()) {
                List<Long> residues = roots(image, prime);
                ModularPolynomial derivative = image.derivative();
                if (residues.stream().allMatch(residue -> derivative.valueAt(residue) != 0)) {
                    SimpleRoots here = new SimpleRoots(prime, residues);
                    seen.add(here);
                    best = best == null || residues.size() < best.residues.size() ? here : best;
                    if (residues.isEmpty()) {
                        return here;
                    }
                }
            }
        }
        return best;
    }

    private static List<Long> roots(ModularPolynomial image, int prime) {
        List<Long> roots = new ArrayList<>();
        for (long point = 0; point < prime; point++) {
            if (image.valueAt(point) == 0) {
                roots.add(point);
            }
        }
        return roots;
    }

    /**
     * The only rational root that can lie over this residue. Leading coefficient times root is an integer, at most
     * |leading| + max |coefficient| (Cauchy's bound), so a modulus above twice that determines it.
     */
    private static Rational lift(IntegerPolynomial polynomial, BigInteger residue, BigInteger prime) {
        BigInteger leading = polynomial.leading();
        BigInteger enough = largest(polynomial).add(leading.abs()).shiftLeft(1);
        IntegerPolynomial derivative = polynomial.derivative();
        BigInteger modulus = prime;
        BigInteger root = residue;
        while (modulus.compareTo(enough) <= 0) {
            modulus = modulus.multiply(modulus);
            BigInteger slope = valueAt(derivative, root, modulus).modInverse(modulus);
            root = root.subtract(valueAt(polynomial, root, modulus).multiply(slope)).mod(modulus);
        }
        BigInteger numerator = root.multiply(leading).mod(modulus);
        return new Rational(numerator.shiftLeft(1).compareTo(modulus) > 0 ? numerator.subtract(modulus) : numerator,
                leading);
    }

    private static BigInteger largest(IntegerPolynomial polynomial) {
        return polynomial.coefficients().stream().map(BigInteger::abs).reduce(BigInteger.ZERO, BigInteger::max);
    }

    private static BigInteger valueAt(IntegerPolynomial polynomial, BigInteger point, BigInteger modulus) {
        BigInteger value = BigInteger.ZERO;
        for (int i = polynomial.degree(); i >= 0; i--) {
            value = value.multiply(point).add(polynomial.coefficient(i)).mod(modulus);
        }
        return value;
    }
}
