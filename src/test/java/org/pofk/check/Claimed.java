package org.pofk.check;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.function.Function;
import java.util.stream.Collectors;
import org.pofk.slip.SlipKind;

/**
 * One claim of a claims file: its text, what was done to it, and whether arithmetic of these tests' own proves it wrong.
 *
 * @param shape      what it is written as, for counts
 * @param injected   the slips put in; none for a right claim
 * @param provenWrong whether it can't be right with every decimal within so many units of its last place
 */
record Claimed(Subject subject, String shape, String yaml, List<SlipKind> injected, Truly truly,
        Function<String, Boolean> provenWrong) {

    /** What the claim is by how it was made. */
    enum Truly { RIGHT, WRONG }


    /** Text of a claim as one line of YAML: the keys in order, values that are texts in single quotes. */
    static String line(String... keysAndValues) {
        List<String> entries = new ArrayList<>();
        for (int i = 0; i < keysAndValues.length; i += 2) {
            entries.add(keysAndValues[i] + ": " + keysAndValues[i + 1]);
        }
        return "{" + String.join(", ", entries) + "}";
    }

    static String quoted(String text) {
        return "'" + text.replace("'", "''") + "'";
    }

    static String mapping(Map<String, String> values) {
        return values.entrySet().stream().map(entry -> quoted(entry.getKey()) + ": " + entry.getValue())
                .collect(Collectors.joining(", ", "{", "}"));
    }

    /** The same, wrong by these slips. */
    Claimed wrongBy(SlipKind... kinds) {
        return new Claimed(subject, shape, yaml, List.of(kinds), Truly.WRONG, provenWrong);
    }

    boolean isRight() {
        return truly == Truly.RIGHT;
    }

    /** A whole claims file with claims about one model. */
    static String file(List<Claimed> claims, String modelName) {
        StringBuilder text = new StringBuilder("pofk-claims: 1\nmodel: " + modelName + "\nclaims:\n");
        claims.forEach(claim -> text.append("  - ").append(claim.yaml()).append('\n'));
        return text.toString();
    }
}
