package org.pofk.cli;

import java.util.ArrayList;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.IntStream;
import picocli.CommandLine.ITypeConverter;
import picocli.CommandLine.TypeConversionException;

/** Steps as typed: {@code 0..20,100}. Canonical form: ascending, none twice. */
record StepList(List<Integer> steps) {
    /** Steps listed at once at most; a longer table is no answer to anybody. */
    static final int MOST_STEPS = 10_000;
    /** The last step that can be asked for. */
    static final int LAST_STEP = 1_000_000_000;

    private static final Pattern RANGE = Pattern.compile("(\\d{1,10})(?:\\.\\.(\\d{1,10}))?");

    StepList {
        steps = steps.stream().sorted().distinct().toList();
    }

    static StepList parse(String text) {
        List<Integer> steps = new ArrayList<>();
        for (String part : text.split(",", -1)) {
            Matcher range = RANGE.matcher(part.strip());
            if (!range.matches()) {
                throw new IllegalArgumentException("'" + part.strip() + "' is no step and no range of steps;"
                        + " write whole numbers, like 0..20,100");
            }
            int from = step(range.group(1));
            int to = range.group(2) == null ? from : step(range.group(2));
            if (to < from) {
                throw new IllegalArgumentException("'" + part.strip() + "' runs backwards; write " + to + ".." + from);
            }
            if (steps.size() + (long) to - from >= MOST_STEPS) {
                throw new IllegalArgumentException("these are more than " + MOST_STEPS + " steps");
            }
            IntStream.rangeClosed(from, to).forEach(steps::add);
        }
        return new StepList(steps);
    }

    private static int step(String digits) {
        long step = Long.parseLong(digits);
        if (step > LAST_STEP) {
            throw new IllegalArgumentException("step " + digits + " is beyond the last one, " + LAST_STEP);
        }
        return (int) step;
    }

    /** For the option parser. */
    static final class Converter implements ITypeConverter<StepList> {
        @Override
        public StepList convert(String text) {
            try {
                return parse(text);
            } catch (IllegalArgumentException wrong) {
                throw new TypeConversionException(wrong.getMessage());
            }
        }
    }
}
