package org.pofk.cli;

import org.pofk.chain.Model.Convention;

/** Whether the moves out of a state stand in a column or in a row, as typed. */
enum Orientation {
    COLUMNS(Convention.COLUMNS), ROWS(Convention.ROWS);

    private final Convention convention;

    Orientation(Convention convention) {
        this.convention = convention;
    }

    Convention convention() {
        return convention;
    }

    @Override
    public String toString() {
        return Words.lowerCase(this);
    }
}
