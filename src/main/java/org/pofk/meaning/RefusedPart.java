package org.pofk.meaning;

import java.util.List;
import java.util.stream.Collectors;
import org.pofk.formula.ParsedFormula;
import org.pofk.formula.PlainText;
import org.pofk.text.Fault;

/**
 * A part of a formula that can't be accepted, with its faults: ends the reading of that part. {@link Reading} collects
 * those of the parts beside it. No stack trace.
 */
final class RefusedPart extends RuntimeException {
    private static final long serialVersionUID = 1L;
    private static final int LONGEST_SHOWN = 40;

    private final transient List<Fault> faults;

    RefusedPart(List<Fault> faults) {
        super(faults.stream().map(Fault::toString).collect(Collectors.joining("\n")), null, false, false);
        this.faults = List.copyOf(faults);
    }

    /** A fault at the beginning of a part; the message begins with the part in quotes. */
    static RefusedPart at(ParsedFormula part, String code, String message) {
        return new RefusedPart(List.of(new Fault(part.position(), code, "'" + shown(part) + "' " + message)));
    }

    private static String shown(ParsedFormula part) {
        String text = PlainText.UNICODE.write(part.formula());
        return text.codePointCount(0, text.length()) <= LONGEST_SHOWN
                ? text : text.substring(0, text.offsetByCodePoints(0, LONGEST_SHOWN - 1)) + "…";
    }

    List<Fault> faults() {
        return faults;
    }
}
