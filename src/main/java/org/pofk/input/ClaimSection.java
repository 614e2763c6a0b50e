package org.pofk.input;

import java.util.List;
import java.util.Locale;
import java.util.Optional;
import org.pofk.chain.Model.Convention;
import org.pofk.claim.Claim;
import org.pofk.claim.Claim.SafeSide;
import org.pofk.claim.Claim.Steps;
import org.pofk.claim.Claim.Within;
import org.pofk.claim.Claims.Review;
import org.pofk.exact.Rational;
import org.pofk.meaning.Carried;

/** One step of a claims file. */
final class ClaimSection {
    private final ClaimNames names;
    private final Review review;
    private final Convention convention;
    private final Reading reading;

    private enum Side implements Keyword {
        ABOVE(SafeSide.ABOVE), BELOW(SafeSide.BELOW);

        private final SafeSide side;

        Side(SafeSide side) {
            this.side = side;
        }

        @Override
        public String word() {
            return name().toLowerCase(Locale.ROOT);
        }
    }

    /** What all steps of a file share; {@code convention} is how its author writes matrices. */
    ClaimSection(ClaimNames names, Review review, Convention convention, Reading reading) {
        this.names = names;
        this.review = review;
        this.convention = convention;
        this.reading = reading;
    }

    /** The step, or faults and nothing. */
    Optional<Claim> read(Node node, int number) {
        return reading.mapping(node, "a claim", "{value: OUTPUT, at: 5, is: 0.008}")
                .flatMap(mapping -> read(mapping, number));
    }

    private Optional<Claim> read(Node.Mapping mapping, int number) {
        int before = reading.count();
        Fields fields = Fields.of(withoutCutFormulas(mapping), "claim " + number, ClaimKind.keys(), reading);
        boolean hasUnknown = reading.count() > before;
        List<ClaimKind> kinds = ClaimKind.words().stream().filter(word -> fields.value(word).isPresent())
                .flatMap(word -> ClaimKind.of(word).stream()).toList();
        if (kinds.size() > 1) {
            reading.fault(fields.position(kinds.get(1).word()).orElseThrow(), "two-kinds", "a claim is of one kind, and"
                    + " this is '" + kinds.get(0).word() + "' and '" + kinds.get(1).word() + "'; make two claims of it");
        } else if (kinds.isEmpty() && !hasUnknown) {
            reading.fault(mapping.position(), "no-kind", "what is claimed? A claim has one of the keys "
                    + Words.choice(ClaimKind.words()));
        }
        return kinds.size() == 1 ? read(mapping, fields, kinds.get(0), number) : Optional.empty();
    }

    private Optional<Claim> read(Node.Mapping mapping, Fields fields, ClaimKind kind, int number) {
        refuseKeysOfOthers(fields, kind);
        Optional<Steps> steps = fields.value("for").flatMap(node -> ClaimedSteps.read(node, reading));
        Optional<Carried> carried = fields.value("carried").flatMap(node -> ReviewSection.carried(node, reading));
        Optional<Within> close = fields.value("within").flatMap(this::within);
        // how close something settles isn't how far off the claim may be
        Optional<Within> within = kind == ClaimKind.SETTLING_STEP ? Optional.empty() : close;
        Optional<SafeSide> side = fields.value("safe side")
                .flatMap(node -> reading.keyword(node, "the safe side", Side.values())).map(word -> word.side);
        Optional<String> where = text(fields, "where");
        Optional<String> note = text(fields, "note");
        return subject(fields, kind).flatMap(subject ->
                StatementSection.read(fields, kind, subject, close, names, convention, reading)
                        .map(statement -> new Claim(number, kind.word(), subject.name(), statement, where,
                                steps.orElse(Steps.ALL), carried.or(review::carried), within, side, note,
                                mapping.position())));
    }

    /** In {@code {formula: lost, is: binomial(k, 2)}} YAML sees a key {@code 2)} without a value. */
    private Node.Mapping withoutCutFormulas(Node.Mapping mapping) {
        List<Node.Entry> cut = mapping.entries().stream().filter(entry -> entry.name().contains(")")
                && entry.value().asScalar().filter(Node.Scalar::isAbsent).isPresent()).toList();
        cut.forEach(entry -> reading.fault(entry.key().position(), "comma-outside-quotes", "the comma before this ends"
                + " the value; a formula with a comma goes in single quotes"));
        return new Node.Mapping(mapping.position(),
                mapping.entries().stream().filter(entry -> !cut.contains(entry)).toList());
    }

    private Optional<String> text(Fields fields, String key) {
        return fields.value(key).flatMap(node -> reading.text(node, "'" + key + "'"));
    }

    private void refuseKeysOfOthers(Fields fields, ClaimKind kind) {
        for (String key : ClaimKind.keys()) {
            if (fields.value(key).isPresent() && !kind.knows(key)) {
                boolean isContent = ClaimKind.CONTENT.contains(key);
                reading.fault(fields.position(key).orElseThrow(), "key-of-another-kind", "'" + key
                        + "' has no meaning in a claim of the kind '" + kind.word() + "'; "
                        + (isContent ? "write " + ClaimExamples.of(kind)
                                : "it belongs to " + Words.list(ClaimKind.knowing(key))));
            }
        }
    }

    /** What the step is about, as the file names it. */
    private Optional<Node.Scalar> subject(Fields fields, ClaimKind kind) {
        Optional<Node.Scalar> subject = fields.value(kind.word())
                .flatMap(node -> reading.scalar(node, "what the " + kind.word() + " is about"));
        if (subject.isEmpty()) {
            return Optional.empty();
        }
        boolean isAll = names.meansAll(subject.get().name());
        if (kind.subject() == ClaimKind.Subject.ALL && !subject.get().name().equals(ClaimNames.ALL)) {
            reading.fault(subject.get().position(), "subject", "'" + kind.word() + "' is about the whole chain;"
                    + " write " + kind.word() + ": all");
        } else if (kind.subject() == ClaimKind.Subject.ONE && isAll) {
            reading.fault(subject.get().position(), "subject", "'all' isn't possible here: '" + kind.word()
                    + "' is about one output, set or state; make a claim for each");
        } else {
            return subject;
        }
        return Optional.empty();
    }

    private Optional<Within> within(Node node) {
        Optional<Node.Scalar> scalar = reading.scalar(node, "'within'");
        Optional<Rational> amount = scalar
                .flatMap(written -> Numerals.read(written.text(), written.position(), reading.faults()));
        if (amount.filter(value -> value.signum() <= 0).isPresent()) {
            reading.fault(node.position(), "within-not-positive", "'within' says how far off the claim may be, as 2% or"
                    + " 0.001; it must be above 0");
            return Optional.empty();
        }
        return amount.map(value -> new Within(value, scalar.get().text().contains("%")));
    }
}
