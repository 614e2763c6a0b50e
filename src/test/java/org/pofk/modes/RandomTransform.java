package org.pofk.modes;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Random;
import org.pofk.exact.Factorization;
import org.pofk.exact.Polynomial;
import org.pofk.exact.Rational;
import org.pofk.exact.RationalField;
import org.pofk.transform.TransferFunction;

/** A transform made from known factors: its denominator's factorization needs no factoring. */
record RandomTransform(TransferFunction<Rational> y, Factorization<Rational> factors) {

    /** Up to four irreducible factors of degrees 1 to 3, multiplicities 1 to 3, z among them now and then. */
    static RandomTransform of(Random random) {
        Map<Polynomial<Rational>, Integer> multiplicities = new LinkedHashMap<>();
        if (random.nextInt(3) == 0) {
            multiplicities.put(Polynomial.ofIntegers(0, 1), 1 + random.nextInt(3));
        }
        for (int i = 1 + random.nextInt(3); i > 0; i--) {
            multiplicities.put(irreducible(random), 1 + random.nextInt(3));
        }
        List<Factorization.Factor<Rational>> factors = new ArrayList<>();
        multiplicities.forEach((q, e) ->
                factors.add(new Factorization.Factor<>(q, e, Factorization.Irreducible.PROVED)));
        Polynomial<Rational> denominator = new Factorization<>(Rational.ONE, factors).expand(RationalField.Q);
        return reduced(numerator(random, denominator.degree()), denominator, multiplicities);
    }

    /** Lowest terms: each factor's multiplicity drops by what the numerator holds of it. */
    private static RandomTransform reduced(Polynomial<Rational> numerator, Polynomial<Rational> denominator,
            Map<Polynomial<Rational>, Integer> multiplicities) {
        TransferFunction<Rational> y = new TransferFunction<>(numerator, denominator);
        List<Factorization.Factor<Rational>> left = new ArrayList<>();
        multiplicities.forEach((q, e) -> {
            int multiplicity = 0;
            Polynomial<Rational> rest = y.denominator();
            while (rest.remainder(q).isZero()) {
                rest = rest.dividedExactlyBy(q);
                multiplicity++;
            }
            if (multiplicity > 0) {
                left.add(new Factorization.Factor<>(q, multiplicity, Factorization.Irreducible.PROVED));
            }
        });
        return new RandomTransform(y, new Factorization<>(Rational.ONE, left));
    }

    private static Polynomial<Rational> numerator(Random random, int degree) {
        List<Rational> coefficients = new ArrayList<>();
        for (int i = 0; i <= degree; i++) {
            coefficients.add(Rational.of(random.nextInt(9) - 4L, 1 + random.nextInt(3)));
        }
        coefficients.set(degree, Rational.ONE);
        return Polynomial.ofRationals(coefficients);
    }

    /** Linear; or z² + bz + c, z³ + bz + c without a rational root, which for these degrees is irreducible. */
    private static Polynomial<Rational> irreducible(Random random) {
        while (true) {
            Rational b = Rational.of(random.nextInt(7) - 3L, 2);
            Rational c = Rational.of(1 + random.nextInt(7), 8).times(Rational.of(random.nextBoolean() ? 1 : -1));
            switch (random.nextInt(4)) {
                case 0:
                    return Polynomial.linear(RationalField.Q, c);
                case 1:
                case 2:
                    Polynomial<Rational> quadratic = Polynomial.ofRationals(List.of(c, b, Rational.ONE));
                    if (!hasRationalRoot(quadratic)) {
                        return quadratic;
                    }
                    break;
                default:
                    Polynomial<Rational> cubic =
                            Polynomial.ofRationals(List.of(c, b, Rational.ZERO, Rational.ONE));
                    if (!hasRationalRoot(cubic)) {
                        return cubic;
                    }
                    break;
            }
        }
    }

    /** Monic with denominators dividing 8: with z = x/8 the roots x are integers dividing the constant term. */
    private static boolean hasRationalRoot(Polynomial<Rational> q) {
        for (int x = -64; x <= 64; x++) {
            if (q.valueAt(Rational.of(x, 8)).isZero()) {
                return true;
            }
        }
        return false;
    }

    boolean hasRepeatedQuadratic() {
        return factors.factors().stream().anyMatch(f -> f.polynomial().degree() == 2 && f.multiplicity() > 1);
    }

    static Polynomial<Rational> parse(String ascending) {
        return Polynomial.ofRationals(Arrays.stream(ascending.split(" ")).map(Rational::parse).toList());
    }
}
