/**
 * From Y(z) to the closed form as a sum of modes. Knows nothing of reports.
 *
 * <p>Partial fractions without radicals ({@link org.pofk.modes.PartialFractions}, over any coefficient field) say which
 * modes there are. Each factor's poles and coefficients are then looked at in Q[λ]/(q): a real number is shown exactly
 * where it is a surd, a root of one, or a cosine of a multiple of π; a pair where its modulus is, and where its angle
 * is a multiple of π or an arc cosine of such a number. What has no short form stays an enclosure, named by its
 * factor. {@link org.pofk.modes.ClosedForm#decimalForm} writes decimals that hold for every step as printed.
 */
package org.pofk.modes;
