package org.pofk.input;

import java.util.List;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.pofk.claim.Claims.Review;
import org.pofk.meaning.Carried;

/** The section {@code review} of a claims file: who reviews what, and how its author writes. */
final class ReviewSection {
    private static final List<String> KEYS =
            List.of("document", "revision", "author", "reviewer", "date", "convention", "carried");
    private static final Pattern CARRIED =
            Pattern.compile("(\\d{1,2})\\s+(significant(?: digits| figures)?|decimals?|decimal places)");
    private static final int MOST_DIGITS = 50;

    private ReviewSection() {
    }

    static Review read(Node node, Reading reading) {
        return reading.mapping(node, "'review'", "{document: PN-12, revision: B}")
                .map(mapping -> review(Fields.of(mapping, "review", KEYS, reading), reading)).orElse(Review.NOTHING);
    }

    private static Review review(Fields fields, Reading reading) {
        return new Review(text(fields, "document", reading), text(fields, "revision", reading),
                text(fields, "author", reading), text(fields, "reviewer", reading), text(fields, "date", reading),
                fields.value("convention")
                        .flatMap(node -> reading.keyword(node, "the convention", Head.Orientation.values()))
                        .map(Head.Orientation::convention),
                fields.value("carried").flatMap(node -> carried(node, reading)));
    }

    private static Optional<String> text(Fields fields, String key, Reading reading) {
        return fields.value(key).flatMap(node -> reading.text(node, "'" + key + "'"));
    }

    /** {@code 4 significant} or {@code 4 decimals}. */
    static Optional<Carried> carried(Node node, Reading reading) {
        Optional<String> text = reading.text(node, "'carried'");
        Optional<Matcher> matcher = text.map(CARRIED::matcher).filter(Matcher::matches);
        int count = matcher.map(match -> Integer.parseInt(match.group(1))).orElse(0);
        boolean isSignificant = matcher.filter(match -> match.group(2).startsWith("significant")).isPresent();
        if (text.isPresent() && (matcher.isEmpty() || count > MOST_DIGITS || count == 0 && isSignificant)) {
            reading.fault(node.position(), "carried-unreadable", "'carried' says how many digits the author carries,"
                    + " '4 significant' or '4 decimals', at most " + MOST_DIGITS + ", not " + node.inWords());
            return Optional.empty();
        }
        return matcher.map(match -> new Carried(count,
                isSignificant ? Carried.Unit.SIGNIFICANT : Carried.Unit.DECIMALS));
    }
}
