package org.pofk.input;

/** One of a few words that a key may have as its value. */
public interface Keyword {
    String word();
}
