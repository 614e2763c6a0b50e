package org.pofk.formula;

/** What the text of a formula is written in. */
enum Notation {
    PLAIN, LATEX
}
