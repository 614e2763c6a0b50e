package org.pofk.exact;

import java.math.BigInteger;
import java.util.List;

/**
 * A rational polynomial with its coefficients rounded once to a scale, for evaluation at many points. Certified.
 * Horner's rule in discs: rectangles would grow by up to √2 with every turn, 2^(n/2) times in all.
 */
final class EnclosedPolynomial {
    private final List<Ball> coefficients;
    private final int scale;

    EnclosedPolynomial(Polynomial<Rational> polynomial, int scale) {
        if (scale < 0) {
            throw new IllegalArgumentException("negative scale " + scale);
        }
        this.coefficients = polynomial.coefficients().stream().map(c -> Ball.of(c, scale)).toList();
        this.scale = scale;
    }

    int scale() {
        return scale;
    }

    /** The value at every point of the rectangle; n multiplications of numbers of the scale's length. */
    ComplexBall valueAt(ComplexBall point) {
        ComplexBall z = point.roundedTo(scale);
        BigInteger x = z.real().center();
        BigInteger y = z.imaginary().center();
        BigInteger spread = hypotenuse(z.real().radius(), z.imaginary().radius());
        BigInteger reach = hypotenuse(x, y).add(spread);
        BigInteger real = BigInteger.ZERO;
        BigInteger imaginary = BigInteger.ZERO;
        BigInteger error = BigInteger.ZERO;
        for (int i = coefficients.size() - 1; i >= 0; i--) {
            Ball coefficient = coefficients.get(i);
            // |h z − h̃ z̃| ≤ |h̃| |z − z̃| + |h − h̃| |z|; two units for rounding both parts
            error = Ball.shiftRightUp(real.abs().add(imaginary.abs()).multiply(spread).add(error.multiply(reach)),
                    scale).add(coefficient.radius()).add(BigInteger.TWO);
            BigInteger nextReal = real.multiply(x).subtract(imaginary.multiply(y)).shiftRight(scale);
            imaginary = real.multiply(y).add(imaginary.multiply(x)).shiftRight(scale);
            real = nextReal.add(coefficient.center());
        }
        boolean isReal = y.signum() == 0 && z.imaginary().isExact();
        return new ComplexBall(new Ball(real, error, scale),
                isReal ? Ball.of(0, scale) : new Ball(imaginary, error, scale));
    }

    private static BigInteger hypotenuse(BigInteger a, BigInteger b) {
        return b.signum() == 0 ? a.abs() : IntegerRoots.ceiling(a.multiply(a).add(b.multiply(b)), 2);
    }
}
