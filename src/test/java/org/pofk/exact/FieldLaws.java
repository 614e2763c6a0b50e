package org.pofk.exact;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.util.List;
import net.jqwik.api.Arbitrary;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.Provide;

/** What a field is; a new one is held to it by a subclass of one line in {@link FieldsTest}. */
abstract class FieldLaws<E> {
    private static final String SEED = "20261201";
    private static final int TRIES = 60;

    private final Field<E> field;
    private final Arbitrary<E> elements;

    FieldLaws(Field<E> field, Arbitrary<E> elements) {
        this.field = field;
        this.elements = elements;
    }

    @Provide
    Arbitrary<E> element() {
        return elements;
    }

    @Property(seed = SEED, tries = TRIES)
    void sumsAndProductsCommute(@ForAll("element") E a, @ForAll("element") E b) {
        assertEquals(field.add(a, b), field.add(b, a));
        assertEquals(field.multiply(a, b), field.multiply(b, a));
    }

    @Property(seed = SEED, tries = TRIES)
    void sumsAndProductsAssociate(@ForAll("element") E a, @ForAll("element") E b, @ForAll("element") E c) {
        assertEquals(field.add(field.add(a, b), c), field.add(a, field.add(b, c)));
        assertEquals(field.multiply(field.multiply(a, b), c), field.multiply(a, field.multiply(b, c)));
    }

    @Property(seed = SEED, tries = TRIES)
    void productsDistributeOverSums(@ForAll("element") E a, @ForAll("element") E b, @ForAll("element") E c) {
        assertEquals(field.multiply(a, field.add(b, c)), field.add(field.multiply(a, b), field.multiply(a, c)));
    }

    @Property(seed = SEED, tries = TRIES)
    void zeroAndOneAreNeutral(@ForAll("element") E a) {
        assertEquals(a, field.add(a, field.zero()));
        assertEquals(a, field.multiply(a, field.one()));
        assertEquals(field.zero(), field.multiply(a, field.zero()));
        assertEquals(field.isZero(a), a.equals(field.zero()));
    }

    @Property(seed = SEED, tries = TRIES)
    void subtractionAndDivisionUndo(@ForAll("element") E a, @ForAll("element") E b) {
        assertEquals(field.zero(), field.add(a, field.negate(a)));
        assertEquals(a, field.add(field.subtract(a, b), b));
        if (field.isZero(b)) {
            assertThrows(ArithmeticException.class, () -> field.inverse(b));
        } else {
            assertEquals(field.one(), field.multiply(b, field.inverse(b)));
            assertEquals(a, field.multiply(field.divide(a, b), b));
        }
    }

    @Property(seed = SEED, tries = TRIES)
    void rationalsAreMappedWithTheirArithmetic(@ForAll short p, @ForAll short q) {
        Rational a = Rational.of(p, 7);
        Rational b = Rational.of(q, 12);
        assertEquals(field.of(a.plus(b)), field.add(field.of(a), field.of(b)));
        assertEquals(field.of(a.times(b)), field.multiply(field.of(a), field.of(b)));
        assertEquals(field.zero(), field.of(0));
        assertEquals(field.one(), field.of(1));
        assertFalse(field.isZero(field.of(2)));
    }

    @Property(seed = SEED, tries = TRIES)
    void polynomialProductsAreTheSchoolbooks(@ForAll("element") E a, @ForAll("element") E b, @ForAll("element") E c) {
        Polynomial<E> first = new Polynomial<>(field, List.of(a, b, c, field.one(), b));
        Polynomial<E> second = new Polynomial<>(field, List.of(c, field.one(), a));
        assertEquals(Polynomial.schoolbookProduct(field, first, second), first.times(second));
        assertEquals(first.times(second), second.times(first));
        assertEquals(first.times(second.plus(first)), first.times(second).plus(first.times(first)));
        assertEquals(field.multiply(first.valueAt(b), second.valueAt(b)), first.times(second).valueAt(b));
    }

    @Property(seed = SEED, tries = TRIES)
    void polynomialDivisionIsTheLongDivision(@ForAll("element") E a, @ForAll("element") E b, @ForAll("element") E c) {
        Polynomial<E> dividend = new Polynomial<>(field, List.of(a, b, c, field.one(), b));
        Polynomial<E> divisor = new Polynomial<>(field, List.of(c, a, field.one()));
        Polynomial.Division<E> division = dividend.dividedBy(divisor);
        assertEquals(Polynomial.longDivision(field, dividend, divisor), division);
        assertEquals(dividend, division.quotient().times(divisor).plus(division.remainder()));
        assertEquals(Polynomial.euclid(field, dividend, divisor), dividend.greatestCommonDivisor(divisor));
        assertEquals(divisor, dividend.times(divisor).greatestCommonDivisor(divisor));
        assertThrows(ArithmeticException.class, () -> dividend.dividedBy(Polynomial.zero(field)));
    }
}
