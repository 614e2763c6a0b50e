package org.pofk.text;

/** A stretch of a source text: from {@code start} up to, not including, {@code end}. */
public record Span(Position start, Position end) {

    /** From the start of this to the end of a later span of the same source. */
    public Span to(Span later) {
        return new Span(start, later.end);
    }
}
