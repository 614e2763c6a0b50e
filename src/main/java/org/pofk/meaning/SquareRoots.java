package org.pofk.meaning;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import org.pofk.exact.Rational;

/**
 * Square roots of positive whole numbers in a {@link Tower}: products of those of a basis, and a new member of the basis
 * only where no product with members of it is a square. So the members' roots are independent: they generate a field
 * of degree 2^m. Exact; 2^m products and whole square roots.
 */
final class SquareRoots {
    private static final List<BigInteger> SMALL_SQUARES =
            List.of(BigInteger.valueOf(4), BigInteger.valueOf(9), BigInteger.valueOf(25), BigInteger.valueOf(49));

    private final Tower tower;
    private final List<Member> basis = new ArrayList<>();

    private record Member(BigInteger number, Element root) {
    }

    SquareRoots(Tower tower) {
        this.tower = tower;
    }

    /** A number whose square root is in the tower already. */
    void know(BigInteger number, Element root) {
        basis.add(new Member(number, root));
    }

    /** √number, number > 0. */
    Element of(BigInteger number) {
        BigInteger rest = number;
        BigInteger front = BigInteger.ONE;
        for (BigInteger square : SMALL_SQUARES) {
            BigInteger[] parts = rest.divideAndRemainder(square);
            while (parts[1].signum() == 0) {
                front = front.multiply(square.sqrt());
                rest = parts[0];
                parts = rest.divideAndRemainder(square);
            }
        }
        return reduced(rest).times(Rational.of(front));
    }

    private Element reduced(BigInteger number) {
        for (int subset = 0; subset < 1 << basis.size(); subset++) {
            BigInteger product = number;
            for (int i = 0; i < basis.size(); i++) {
                product = (subset >> i & 1) == 1 ? product.multiply(basis.get(i).number()) : product;
            }
            BigInteger root = product.sqrt();
            if (root.multiply(root).equals(product)) {
                return over(root, subset);
            }
        }
        int index = tower.add(new Tower.Generator(2, Element.of(Rational.of(number)),
                Quantity.of(Rational.of(number)).squareRoot(),
                Logarithm.divideUp(Logarithm.ofMagnitude(number), 2)));
        basis.add(new Member(number, Element.power(index, 1)));
        return Element.power(index, 1);
    }

    /** √n with n Π bᵢ = root² is root · Π √bᵢ/bᵢ. */
    private Element over(BigInteger root, int subset) {
        Element result = Element.of(Rational.of(root));
        for (int i = 0; i < basis.size(); i++) {
            if ((subset >> i & 1) == 1) {
                Member member = basis.get(i);
                result = tower.times(result, member.root())
                        .times(new Rational(BigInteger.ONE, member.number()));
            }
        }
        return result;
    }
}
