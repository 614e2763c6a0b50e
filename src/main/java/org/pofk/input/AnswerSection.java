package org.pofk.input;

import java.util.HashSet;
import java.util.Optional;
import java.util.OptionalLong;
import java.util.Set;
import org.pofk.chain.Chain;
import org.pofk.chain.Output;
import org.pofk.claim.AnswerOf;
import org.pofk.claim.AnswerOf.MeanPassage.Beginning;
import org.pofk.claim.Claim.Within;
import org.pofk.claim.FormulaText;
import org.pofk.text.Position;

/** What a claim answers: the question by its keys, the answer being the number that is stated. */
final class AnswerSection {
    private final Fields fields;
    private final ClaimKind kind;
    private final Node.Scalar subject;
    private final ClaimNames names;
    private final Reading reading;

    private enum Given implements Keyword {
        ENTERED;

        @Override
        public String word() {
            return "entered";
        }
    }

    AnswerSection(Fields fields, ClaimKind kind, Node.Scalar subject, ClaimNames names, Reading reading) {
        this.fields = fields;
        this.kind = kind;
        this.subject = subject;
        this.names = names;
        this.reading = reading;
    }

    /** Within what of the long run, from which step on. */
    Optional<AnswerOf> settling(FormulaText is, Optional<Within> within) {
        if (required("within", "how close to the long run is missing", "within: 1%").isEmpty()) {
            return Optional.empty();
        }
        return names.output(subject).flatMap(output ->
                within.map(distance -> new AnswerOf.SettlingStep(output, distance, is)));
    }

    /** Into which set, from where, and whether given that it is entered at all. */
    Optional<AnswerOf> passage(FormulaText is) {
        if (names.chain().filter(chain -> chain.kind() != Chain.Kind.CHAIN).isPresent()) {
            reading.fault(subject.position(), "passage-in-a-recursion", "only in a chain is a set entered, and this"
                    + " model is a recursion; leave this claim out");
            return Optional.empty();
        }
        Optional<Node.Scalar> into = required("into", "the set that is entered is missing", "into: STATE")
                .flatMap(node -> reading.scalar(node, "'into'"));
        Optional<Output> set = into.flatMap(name -> set(name, "into"));
        Optional<Node> from = fields.value("from");
        Optional<Beginning> begun = from.flatMap(node -> reading.scalar(node, "'from'"))
                .flatMap(name -> names.state(name).map(place -> new Beginning(place, name.name())));
        Optional<Given> given = fields.value("given")
                .flatMap(node -> reading.keyword(node, "what is given", Given.values()));
        if (from.isPresent() && begun.isEmpty()) {
            return Optional.empty();
        }
        return set.map(entered -> new AnswerOf.MeanPassage(entered.name(), members(entered), begun,
                given.isPresent() ? AnswerOf.MeanPassage.Cases.ENTERED : AnswerOf.MeanPassage.Cases.ALL, is));
    }

    /** From which step to which, both counted. */
    Optional<AnswerOf> overSteps(FormulaText is) {
        Optional<Node> to = required("to", "the last step is missing", "to: 12");
        Optional<Node> from = kind == ClaimKind.SUM ? fields.value("from")
                : required("from", "the first step is missing", "from: 0");
        OptionalLong last = to.isEmpty() ? OptionalLong.empty() : ClaimedSteps.step(to.get(), "to", reading);
        OptionalLong first = from.isEmpty() ? OptionalLong.of(0) : ClaimedSteps.step(from.get(), "from", reading);
        Optional<Output> output = names.output(subject);
        if (last.isEmpty() || first.isEmpty()) {
            return Optional.empty();
        }
        if (last.getAsLong() < first.getAsLong()) {
            reading.fault(to.orElseThrow().position(), "steps-empty", "there is no step from " + first.getAsLong()
                    + " to " + last.getAsLong());
        }
        return output.map(known -> kind == ClaimKind.SUM
                ? new AnswerOf.Sum(known, first.getAsLong(), last.getAsLong(), is)
                : new AnswerOf.IntervalMean(known, first.getAsLong(), last.getAsLong(), is));
    }

    /** A value given that the chain is then in a set. */
    Optional<AnswerOf> conditional(Node given, Output output, long at, FormulaText is) {
        return reading.scalar(given, "what is given").flatMap(name -> set(name, "given"))
                .map(set -> new AnswerOf.Conditional(output, set, at, is));
    }

    private Optional<Node> required(String key, String missing, String example) {
        if (fields.value(key).isEmpty()) {
            reading.fault(subject.position(), "key-missing", missing + ": write " + example);
        }
        return fields.value(key);
    }

    /** A set or a state, by its name. */
    private Optional<Output> set(Node.Scalar name, String key) {
        Optional<Output> output = names.output(name);
        boolean isSet = output.filter(known -> known.constant().isZero()
                && known.coefficients().stream().allMatch(c -> c.isZero() || c.isOne())).isPresent();
        if (output.isPresent() && !isSet) {
            Position place = name.position();
            reading.fault(place, "not-a-set", "'" + key + "' is a set or a state, and '"
                    + Words.shortened(name.name()) + "' is an output with other coefficients than 0 and 1");
        }
        return isSet ? output : Optional.empty();
    }

    private static Set<Integer> members(Output set) {
        Set<Integer> members = new HashSet<>();
        for (int state = 0; state < set.coefficients().size(); state++) {
            if (!set.coefficients().get(state).isZero()) {
                members.add(state);
            }
        }
        return members;
    }
}
