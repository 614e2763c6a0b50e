package org.pofk.input;

import java.util.Optional;
import java.util.OptionalLong;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.pofk.claim.Claim.Steps;

/** The steps a claim is for: {@code k >= 1}, {@code k > 0}, {@code k = 1..20}, {@code 1 <= k <= 20}. */
final class ClaimedSteps {
    /** The last step a claim can be about. */
    static final long LAST = 1_000_000_000;

    private static final String LEAST = "(?:>=|≥|\\\\geq?)";
    private static final String MOST = "(?:<=|≤|\\\\leq?)";
    private static final Pattern FROM = Pattern.compile("k\\s*(" + LEAST + "|>)\\s*(\\d{1,10})");
    private static final Pattern UP_TO = Pattern.compile("k\\s*(" + MOST + "|<)\\s*(\\d{1,10})");
    private static final Pattern BETWEEN =
            Pattern.compile("(\\d{1,10})\\s*(" + MOST + "|<)\\s*k\\s*(" + MOST + "|<)\\s*(\\d{1,10})");
    private static final Pattern AT = Pattern.compile("k\\s*=\\s*(\\d{1,10})(?:\\s*(?:\\.\\.|…)\\s*(\\d{1,10}))?");

    private ClaimedSteps() {
    }

    /** A single step under a key, or a fault. */
    static OptionalLong step(Node node, String key, Reading reading) {
        Optional<String> text = reading.text(node, "'" + key + "'");
        if (text.isPresent() && (!text.get().matches("\\d{1,10}") || Long.parseLong(text.get()) > LAST)) {
            reading.fault(node.position(), "step-unreadable", "'" + key + "' is a step, a whole number from 0 to " + LAST
                    + ", not " + node.inWords());
            return OptionalLong.empty();
        }
        return text.stream().mapToLong(Long::parseLong).findFirst();
    }

    /** The steps, or a fault. */
    static Optional<Steps> read(Node node, Reading reading) {
        Optional<String> text = reading.text(node, "'for'");
        if (text.isEmpty()) {
            return Optional.empty();
        }
        Optional<Steps> steps = steps(text.get()).filter(found -> found.from() <= LAST);
        if (steps.isEmpty()) {
            reading.fault(node.position(), "steps-unreadable", "'for' says for which steps, for example k >= 1,"
                    + " k = 1..20 or k = 3, up to k = " + LAST + ", not " + node.inWords());
        } else if (steps.get().to().isPresent() && steps.get().to().getAsLong() < steps.get().from()) {
            reading.fault(node.position(), "steps-empty", "there is no step in " + node.inWords());
            return Optional.empty();
        }
        return steps;
    }

    private static Optional<Steps> steps(String text) {
        Matcher from = FROM.matcher(text);
        if (from.matches()) {
            return Optional.of(new Steps(above(from.group(1), from.group(2)), OptionalLong.empty()));
        }
        Matcher upTo = UP_TO.matcher(text);
        if (upTo.matches()) {
            return upTo(0, upTo.group(1), upTo.group(2));
        }
        Matcher between = BETWEEN.matcher(text);
        if (between.matches()) {
            return upTo(above(between.group(2), between.group(1)), between.group(3), between.group(4));
        }
        Matcher at = AT.matcher(text);
        if (at.matches()) {
            String last = Optional.ofNullable(at.group(2)).orElse(at.group(1));
            return upTo(Long.parseLong(at.group(1)), "=", last);
        }
        return text.equals("all k") ? Optional.of(Steps.ALL) : Optional.empty();
    }

    private static long above(String sign, String number) {
        return Long.parseLong(number) + (sign.equals(">") || sign.equals("<") ? 1 : 0);
    }

    private static Optional<Steps> upTo(long from, String sign, String number) {
        long last = Long.parseLong(number) - (sign.equals("<") ? 1 : 0);
        return last > LAST ? Optional.empty() : Optional.of(new Steps(from, OptionalLong.of(last)));
    }
}
