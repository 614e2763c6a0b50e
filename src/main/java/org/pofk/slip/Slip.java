package org.pofk.slip;

import org.pofk.text.Span;

/**
 * A mistake that explains a wrong claim: undoing exactly this makes the claim right.
 *
 * @param kind      what kind of mistake
 * @param span      the place in the claims file
 * @param found     what stands there
 * @param right     what should stand there
 * @param corrected the whole statement with this undone, in the author's notation
 */
public record Slip(SlipKind kind, Span span, String found, String right, String corrected) {
}
