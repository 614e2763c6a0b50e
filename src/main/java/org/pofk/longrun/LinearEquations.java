package org.pofk.longrun;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import org.pofk.chain.SparseMatrix;
import org.pofk.exact.Rational;

/**
 * M x = b with an invertible n × n matrix, solved exactly: one elimination modulo a prime, the solution lifted to
 * powers of that prime until it reads as fractions, and these put into the equations (Dixon 1982, Numerische
 * Mathematik 40; from memory). Nothing is returned that does not satisfy M x = b exactly. n³/3 operations modulo the
 * prime, then n² per 31 bits of the solution.
 */
public final class LinearEquations {
    private static final int FIRST_ATTEMPT = 4;
    private static final int PRIMES_TRIED = 20;

    private final IntegerRows rows;
    private final ModularElimination elimination;
    private final BigInteger prime;

    private LinearEquations(IntegerRows rows, ModularElimination elimination) {
        this.rows = rows;
        this.elimination = elimination;
        this.prime = BigInteger.valueOf(elimination.prime());
    }

    /** The only solution; an {@link ArithmeticException} when M is singular modulo each of twenty primes. */
    public static List<Rational> solve(SparseMatrix matrix, List<Rational> right) {
        if (matrix.size() == 0) {
            return List.of();
        }
        IntegerRows rows = IntegerRows.of(matrix, right);
        BigInteger prime = BigInteger.ONE.shiftLeft(31).subtract(BigInteger.valueOf(20_000));
        for (int i = 0; i < PRIMES_TRIED; i++) {
            prime = prime.nextProbablePrime();
            Optional<ModularElimination> elimination = ModularElimination.of(rows, prime.longValueExact());
            if (elimination.isPresent()) {
                return new LinearEquations(rows, elimination.get()).lift();
            }
        }
        throw new ArithmeticException("the matrix is singular modulo " + PRIMES_TRIED + " primes");
    }

    private List<Rational> lift() {
        BigInteger[] solution = new BigInteger[rows.size()];
        Arrays.fill(solution, BigInteger.ZERO);
        BigInteger[] rest = rows.right().clone();
        BigInteger modulus = BigInteger.ONE;
        int attempt = FIRST_ATTEMPT;
        for (int digits = 1; ; digits++) {
            long[] digit = elimination.solve(rest);
            for (int i = 0; i < solution.length; i++) {
                solution[i] = solution[i].add(modulus.multiply(BigInteger.valueOf(digit[i])));
            }
            rows.reduce(rest, digit, prime);
            modulus = modulus.multiply(prime);
            if (digits == attempt) {
                Optional<List<Rational>> fractions = fractions(solution, modulus);
                if (fractions.isPresent()) {
                    return fractions.get();
                }
                attempt *= 2;
            }
        }
    }

    /** The fractions these residues stand for, when they solve the system. */
    private Optional<List<Rational>> fractions(BigInteger[] residues, BigInteger modulus) {
        BigInteger limit = modulus.shiftRight(1).sqrt();
        BigInteger common = BigInteger.ONE;
        BigInteger[] numerators = new BigInteger[residues.length];
        for (int i = 0; i < residues.length; i++) {
            BigInteger residue = residues[i].multiply(common).mod(modulus);
            Optional<Rational> fraction = RationalReconstruction.of(residue, modulus, limit);
            if (fraction.isEmpty()) {
                return Optional.empty();
            }
            BigInteger further = fraction.get().denominator();
            for (int j = 0; j < i && !further.equals(BigInteger.ONE); j++) {
                numerators[j] = numerators[j].multiply(further);
            }
            common = common.multiply(further);
            numerators[i] = fraction.get().numerator();
        }
        return rows.isSolvedBy(numerators, common) ? Optional.of(over(numerators, common)) : Optional.empty();
    }

    private static List<Rational> over(BigInteger[] numerators, BigInteger denominator) {
        List<Rational> fractions = new ArrayList<>(numerators.length);
        for (BigInteger numerator : numerators) {
            fractions.add(new Rational(numerator, denominator));
        }
        return List.copyOf(fractions);
    }
}
