package org.pofk.meaning;

/**
 * Real and imaginary parts taken through sums and through products with what is plainly real or i, so that each keeps
 * only the decimals it depends on: those of 0.4 + 0.33 i are 0.4 and 0.33. Exact.
 */
final class ComplexParts {
    private ComplexParts() {
    }

    static Quantity real(Quantity number) {
        if (isReal(number)) {
            return number;
        }
        if (isUnit(number)) {
            return Quantity.ZERO;
        }
        if (number.node() instanceof Node.Sum sum) {
            return Quantity.sum(sum.terms().stream().map(ComplexParts::real).toList());
        }
        if (number.node() instanceof Node.Product product) {
            Quantity first = product.first();
            Quantity second = product.second();
            if (isReal(first) || isReal(second)) {
                return isReal(first) ? first.times(real(second)) : real(first).times(second);
            }
            if (isUnit(first) || isUnit(second)) {
                return imaginary(isUnit(first) ? second : first).negate();
            }
        }
        return Quantity.of(new Node.RealPart(number));
    }

    static Quantity imaginary(Quantity number) {
        if (isReal(number)) {
            return Quantity.ZERO;
        }
        if (isUnit(number)) {
            return Quantity.ONE;
        }
        if (number.node() instanceof Node.Sum sum) {
            return Quantity.sum(sum.terms().stream().map(ComplexParts::imaginary).toList());
        }
        if (number.node() instanceof Node.Product product) {
            Quantity first = product.first();
            Quantity second = product.second();
            if (isReal(first) || isReal(second)) {
                return isReal(first) ? first.times(imaginary(second)) : imaginary(first).times(second);
            }
            if (isUnit(first) || isUnit(second)) {
                return real(isUnit(first) ? second : first);
            }
        }
        return Quantity.of(new Node.RealPart(Quantity.i().negate().times(number)));
    }

    private static boolean isReal(Quantity number) {
        return number.conjugate() == number;
    }

    private static boolean isUnit(Quantity number) {
        return number.node() == Node.Constant.I;
    }
}
