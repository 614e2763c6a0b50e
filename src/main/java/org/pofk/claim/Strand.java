package org.pofk.claim;

import java.util.Optional;

/**
 * A wave of a difference of two sequences; with the wave of the other sequence that nearly cancels it, where there is
 * one, so that what is left of both can be bounded closely.
 */
record Strand(Wave wave, Optional<Wave> nearlyOpposite) {
}
