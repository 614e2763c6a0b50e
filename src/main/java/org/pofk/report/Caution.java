package org.pofk.report;

/** What every answer about failure ends with. */
final class Caution {
    static final String TEXT = "Exact for the model as entered. Whether the model fits the plant, and what may be done"
            + " on the strength of it, is for the governing standard or local code and a competent, where required"
            + " licensed, person.";

    private Caution() {
    }
}
