package org.pofk.transform;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.Collections;
import java.util.EnumSet;
import java.util.List;
import java.util.Set;
import org.apache.commons.math3.complex.Complex;
import org.apache.commons.math3.linear.Array2DRowRealMatrix;
import org.apache.commons.math3.linear.EigenDecomposition;
import org.junit.jupiter.api.Test;
import org.pofk.chain.Chain;
import org.pofk.exact.Polynomial;
import org.pofk.exact.Rational;
import org.pofk.transform.RandomSystems.Shape;

class CharacteristicPolynomialTest {

    @Test
    void matrixSatisfiesItsOwnCharacteristicEquation() {
        RandomSystems systems = new RandomSystems(81);
        Set<Shape> seen = EnumSet.noneOf(Shape.class);
        for (int i = 0; i < 400; i++) {
            Shape shape = Shape.values()[i % Shape.values().length];
            Chain chain = systems.next(shape);
            Polynomial<Rational> polynomial = CharacteristicPolynomial.of(chain).orElseThrow().polynomial();
            assertEquals(chain.size(), polynomial.degree());
            for (int start = 0; start < chain.size(); start++) {
                List<Rational> unit = new ArrayList<>(Collections.nCopies(chain.size(), Rational.ZERO));
                unit.set(start, Rational.ONE);
                List<Rational> value = Collections.nCopies(chain.size(), Rational.ZERO);
                for (int power = polynomial.degree(); power >= 0; power--) {
                    List<Rational> product = chain.matrix().times(value);
                    List<Rational> sum = new ArrayList<>();
                    for (int j = 0; j < chain.size(); j++) {
                        sum.add(product.get(j).plus(unit.get(j).times(polynomial.coefficient(power))));
                    }
                    value = sum;
                }
                assertTrue(value.stream().allMatch(Rational::isZero), chain::toString);
            }
            seen.add(shape);
        }
        assertEquals(EnumSet.allOf(Shape.class), seen);
    }

    // The trace and det are sums and products of eigenvalues, multiplicities included, which Cayley–Hamilton alone
    // doesn't say: compared with Commons Math's eigenvalues, at points well away from them.
    @Test
    void valueAtAPointIsTheProductOverTheEigenvaluesOfAnotherLibrary() {
        RandomSystems systems = new RandomSystems(82);
        int compared = 0;
        for (int i = 0; i < 300; i++) {
            Chain chain = systems.next(Shape.values()[i % Shape.values().length]);
            Polynomial<Rational> polynomial = CharacteristicPolynomial.of(chain).orElseThrow().polynomial();
            double[][] rows = new double[chain.size()][chain.size()];
            for (int row = 0; row < chain.size(); row++) {
                for (int column = 0; column < chain.size(); column++) {
                    rows[row][column] = chain.matrix().at(row, column).approximate();
                }
            }
            EigenDecomposition eigen = new EigenDecomposition(new Array2DRowRealMatrix(rows));
            for (long z : new long[] {-40, 30, 70}) {
                Complex product = Complex.ONE;
                for (int j = 0; j < chain.size(); j++) {
                    product = product.multiply(new Complex(z - eigen.getRealEigenvalues()[j],
                            -eigen.getImagEigenvalues()[j]));
                }
                double value = polynomial.valueAt(Rational.of(z)).approximate();
                assertEquals(value, product.getReal(), 1e-9 * Math.abs(value), chain::toString);
                compared++;
            }
        }
        assertEquals(900, compared);
    }

    @Test
    void outputsRecurrenceDividesIt() {
        RandomSystems systems = new RandomSystems(83);
        int proper = 0;
        for (int i = 0; i < 300; i++) {
            Chain chain = systems.next(Shape.values()[i % (Shape.values().length - 1)]);
            Polynomial<Rational> polynomial = CharacteristicPolynomial.of(chain).orElseThrow().polynomial();
            for (Transform transform : Transforms.of(chain, chain.outputs())) {
                assertTrue(polynomial.remainder(transform.recurrence()).isZero());
                proper += transform.recurrence().degree() < chain.size() ? 1 : 0;
            }
        }
        assertTrue(proper > 100, "proper divisors: " + proper);
    }

    @Test
    void eliminationAndKrylovAgreeWhereBothAnswer() {
        Chain chain = RandomSystems.sparseChain(9, 60, 5);
        PrimeField field = PrimeField.of(2147483647L);
        LinearSystem system = new LinearSystem(chain.matrix(), chain.start(), List.of());
        long[][] dense = new long[60][60];
        for (int i = 0; i < 60; i++) {
            for (int j = 0; j < 60; j++) {
                dense[i][j] = field.of(chain.matrix().at(i, j));
            }
        }
        long[] byKrylov = new SystemResidues(system).modulo(field).characteristicPolynomial(false).orElseThrow();
        org.junit.jupiter.api.Assertions.assertArrayEquals(byKrylov, HessenbergForm.characteristicPolynomial(field, dense));
    }
}
