package org.pofk.exact;

import java.math.BigInteger;

/**
 * A quick proof that an element of Q[λ]/(q) is no root of a quadratic over Q: an identity g² = s g + t with rational
 * s and t would also hold modulo a prime at which h and q are whole, for s is the quotient of two coefficients of g²
 * and g, the lower one prime to it. One prime, degree² operations a product.
 */
public final class QuadraticScreen {
    private static final int PRIME = 2_147_483_629;

    private QuadraticScreen() {
    }

    /** Whether g = h^exponent modulo q is proved to have a degree above two over Q; false says nothing. */
    public static boolean provesHigherDegree(Polynomial<Rational> q, Polynomial<Rational> h, int exponent) {
        BigInteger prime = BigInteger.valueOf(PRIME);
        if (!ModularPolynomial.isDefined(q, prime) || !ModularPolynomial.isDefined(h, prime)) {
            return false;
        }
        ModularPolynomial modulus = ModularPolynomial.image(q, PRIME);
        ModularPolynomial power = ModularPolynomial.image(h, PRIME).powerModulo(exponent, modulus);
        ModularPolynomial square = power.timesModulo(power, modulus);
        int top = power.degree();
        if (top < 1) {
            return false;
        }
        for (int i = 1; i < modulus.degree(); i++) {
            long left = square.coefficient(i) * power.coefficient(top) % PRIME;
            long right = square.coefficient(top) * power.coefficient(i) % PRIME;
            if (left != right) {
                return true;
            }
        }
        return false;
    }
}
