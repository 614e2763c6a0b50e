package org.pofk.input;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.pofk.chain.Timetable;

/** Numbers of steps as a schedule writes them: {@code 12 steps}, {@code 12}, or {@code 12 shifts} where a step is one. */
final class StepCounts {
    private static final Pattern FORM = Pattern.compile("(\\d+)(?:\\s+(\\S.*))?");

    private final List<String> words;
    private final Reading reading;

    /** @param step what one step is, as in {@code 1 shift} */
    StepCounts(String step, Reading reading) {
        this.reading = reading;
        this.words = new ArrayList<>(List.of("step", "steps"));
        String unit = step.replaceFirst("^1\\s+", "").strip().toLowerCase(Locale.ROOT);
        if (!unit.isEmpty() && !Character.isDigit(unit.charAt(0))) {
            words.add(unit);
            words.add(unit + "s");
        }
    }

    /** At least one, or a fault and nothing. */
    Optional<Integer> read(Node node, String what) {
        Optional<Node.Scalar> scalar = reading.scalar(node, what);
        if (scalar.isEmpty()) {
            return Optional.empty();
        }
        Matcher form = FORM.matcher(scalar.get().text().strip());
        if (!form.matches()) {
            reading.fault(node.position(), "not-steps", what + " is a whole number of steps, such as 12 steps, not "
                    + node.inWords());
            return Optional.empty();
        }
        String word = Optional.ofNullable(form.group(2)).orElse("steps").strip();
        if (!words.contains(word.toLowerCase(Locale.ROOT))) {
            reading.fault(node.position(), "not-steps", what + " is counted in steps, such as " + form.group(1)
                    + " steps; '" + Words.shortened(word) + "' is no word for one here"
                    + reading.didYouMean(words, word));
            return Optional.empty();
        }
        return inRange(node, what, new BigInteger(form.group(1)));
    }

    private Optional<Integer> inRange(Node node, String what, BigInteger count) {
        if (count.signum() == 0) {
            reading.fault(node.position(), "zero-steps", what + " is at least 1 step, not 0");
            return Optional.empty();
        }
        if (count.compareTo(BigInteger.valueOf(Timetable.STEPS_AT_MOST)) > 0) {
            reading.fault(node.position(), "too-many-steps", what + " is at most " + Timetable.STEPS_AT_MOST
                    + " steps, not " + Words.shortened(count.toString()));
            return Optional.empty();
        }
        return Optional.of(count.intValueExact());
    }
}
