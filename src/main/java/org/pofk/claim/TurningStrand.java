package org.pofk.claim;

/** A strand with what is decided of how its bases turn; the turn of its wave twice where it has no other. */
record TurningStrand(Strand strand, Turn turn, Turn turnOfOpposite) {

    static TurningStrand of(Strand strand) {
        Turn turn = Turn.of(strand.wave());
        return new TurningStrand(strand, turn, strand.nearlyOpposite().map(Turn::of).orElse(turn));
    }
}
