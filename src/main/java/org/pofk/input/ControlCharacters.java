package org.pofk.input;

import org.pofk.text.Faults;
import org.pofk.text.RefusedException;
import org.snakeyaml.engine.v2.scanner.StreamReader;

/** Characters that no text holds. */
final class ControlCharacters {
    private ControlCharacters() {
    }

    /** Refuses a text that holds one, at the first. */
    static void refuse(Source source, Faults faults) throws RefusedException {
        String text = source.text();
        int c;
        for (int i = 0; i < text.length(); i += Character.charCount(c)) {
            c = text.codePointAt(i);
            if (!StreamReader.isPrintable(c)) {
                faults.add(Lines.at(source.name(), text, i), "control-character",
                        String.format("the character U+%04X can't stand in a text; remove it", c));
                faults.refuseIfAny();
            }
        }
    }
}
