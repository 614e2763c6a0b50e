package org.pofk.cli;

import java.util.List;
import java.util.function.UnaryOperator;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.pofk.exact.Rational;

/** One number changed in the code of a notebook, always in its first output. */
enum Tampering {
    MATRIX_ENTRY("[AP] = \\[  #.*\\n +numbers\\(\"(?<number>[^ \"]+)"),
    START("\\nstart = numbers\\(\"(?<number>[^ \"]+)"),
    READING("\\nc, constant = numbers\\(\"(?:[^ \"]+ ){START}(?<number>[^ \"]+)"),
    FACTOR("\\nfactors = \\[.*\\n +\\(numbers\\(\"(?<number>[^ \"]+)"),
    NUMERATOR("\\nnumerator = numbers\\(\"(?:[^\"]* )?(?<number>[^ \"]+)\""),
    IMPULSE("impulses = numbers\\(\"(?<number>[^ \"]*)"),
    COEFFICIENT("\\nparts = \\[.*\\n.*?numbers\\(\"(?<number>[^ \"]+)"),
    LONG_RUN("settled = numbers\\(\"(?<number>[^ \"]+)");

    private static final Rational CHANGE = Rational.of(1, 997);

    private static final Pattern STARTS = Pattern.compile("\\nstart = numbers\\(\"((?:0 )*)");
    private static final Pattern COLUMNS = Pattern.compile("A = \\[  #.*\\n((?: +numbers\\(.*\\n)+)");

    private final String place;

    Tampering(String place) {
        this.place = place;
    }

    /** The program with the number changed, or with one more where there is none; none where there is no place. */
    List<String> of(String program) {
        return replaced(program, place.replace("START", String.valueOf(firstStart(program))), Tampering::changed);
    }

    /** A part of a move out of a state that is started in given to another move out of it, all sums kept. */
    static List<String> ofSumsKept(String program) {
        String ofState = "numbers\\(\"(?:[^ \"]+ ){" + firstStart(program) + "}(?<number>(?!0[ \"])[^ \"]+)";
        Matcher columns = COLUMNS.matcher(program);
        if (!columns.find()) {
            return List.of();
        }
        String rows = columns.group(1);
        return replaced(rows, ofState, Tampering::changed).stream()
                .flatMap(once -> replaced(once, "(?s)^.*" + ofState, Tampering::changedBack).stream())
                .filter(twice -> !twice.equals(rows)).map(twice -> program.replace(rows, twice)).toList();
    }

    /** The place of the first state that is started in. */
    private static int firstStart(String program) {
        Matcher starts = STARTS.matcher(program);
        return starts.find() ? starts.group(1).length() / 2 : 0;
    }

    private static String changed(String number) {
        return (number.isEmpty() ? CHANGE : Rational.parse(number).plus(CHANGE)).toString();
    }

    private static String changedBack(String number) {
        return Rational.parse(number).minus(CHANGE).toString();
    }

    private static List<String> replaced(String text, String place, UnaryOperator<String> change) {
        Matcher found = Pattern.compile(place).matcher(text);
        return found.find() ? List.of(text.substring(0, found.start("number")) + change.apply(found.group("number"))
                + text.substring(found.end("number"))) : List.of();
    }
}
