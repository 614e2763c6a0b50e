package org.pofk.slip;

import java.util.List;
import org.pofk.claim.AuthorText.Replacement;
import org.pofk.text.Span;

/**
 * A possible slip undone in the author's text.
 *
 * @param span  the place in the file
 * @param found what stands there
 * @param right what would stand there
 */
record Edit(SlipKind kind, List<Replacement> replacements, Span span, String found, String right) {
    Edit {
        replacements = List.copyOf(replacements);
    }
}
