package org.pofk.input;

import java.util.List;
import java.util.Locale;
import java.util.Optional;
import org.pofk.chain.Chain;
import org.pofk.chain.Model.About;
import org.pofk.chain.Model.Concern;
import org.pofk.chain.Model.Convention;
import org.pofk.chain.Model.Step;

/**
 * What a model file says about itself: version, title, step, kind and where it comes from.
 *
 * @param convention as given, for the reader; the orientation of a matrix counts where it is missing
 */
record Head(String title, Step step, Chain.Kind kind, Optional<Convention> convention, Sums sums, About about) {

    /** The same with the rule for sums that a matrix has of its own. */
    Head with(Optional<Sums> own) {
        return new Head(title, step, kind, convention, own.orElse(sums), about);
    }

    private enum Kind implements Keyword {
        CHAIN, RECURSION;

        @Override
        public String word() {
            return name().toLowerCase(Locale.ROOT);
        }
    }

    private enum Concerned implements Keyword {
        PROTECTIVE_FUNCTION(Concern.PROTECTIVE_FUNCTION), STRUCTURE(Concern.STRUCTURE);

        private final Concern concern;

        Concerned(Concern concern) {
            this.concern = concern;
        }

        @Override
        public String word() {
            return name().toLowerCase(Locale.ROOT).replace('_', ' ');
        }

        Concern concern() {
            return concern;
        }
    }

    /** How a matrix is written: which of the two sums to one. */
    enum Orientation implements Keyword {
        COLUMNS, ROWS;

        @Override
        public String word() {
            return name().toLowerCase(Locale.ROOT);
        }

        Convention convention() {
            return this == COLUMNS ? Convention.COLUMNS : Convention.ROWS;
        }

        Orientation other() {
            return this == COLUMNS ? ROWS : COLUMNS;
        }
    }

    /** For a table alone, which says nothing about itself. */
    static Head ofTable(String file) {
        return new Head(file, Step.UNNAMED, Chain.Kind.CHAIN, Optional.empty(), Sums.EXACT, About.NOTHING);
    }

    static Head read(Fields fields, Node.Mapping root, String file, Reading reading) {
        checkVersion(fields, root, reading);
        String title = fields.value("title").flatMap(node -> reading.text(node, "the title")).orElse(file);
        Kind kind = fields.value("kind").flatMap(node -> reading.keyword(node, "the kind", Kind.values()))
                .orElse(Kind.CHAIN);
        Optional<Convention> convention = fields.value("convention")
                .flatMap(node -> reading.keyword(node, "the convention", Orientation.values()))
                .map(Orientation::convention);
        Sums sums = fields.value("sums").flatMap(node -> reading.keyword(node, "'sums'", Sums.values()))
                .orElse(Sums.EXACT);
        if (kind == Kind.RECURSION && fields.value("sums").isPresent()) {
            reading.fault(fields.value("sums").get().position(), "sums-not-here",
                    "in a recursion nothing must add up to 1; leave 'sums' out");
        }
        Step step = fields.value("step").flatMap(node -> step(node, reading))
                .orElse(Step.UNNAMED);
        About about = fields.value("about").map(node -> about(node, reading)).orElse(About.NOTHING);
        return new Head(title, step, kind == Kind.CHAIN ? Chain.Kind.CHAIN : Chain.Kind.RECURSION, convention, sums,
                about);
    }

    private static void checkVersion(Fields fields, Node.Mapping root, Reading reading) {
        Optional<Node> version = fields.value("pofk");
        if (version.isEmpty()) {
            reading.fault(root.position(), "version-missing", "the key 'pofk' is missing; begin the file with pofk: 1");
        } else if (version.get().asScalar().filter(value -> value.text().strip().equals("1")).isEmpty()) {
            reading.fault(version.get().position(), "version-unknown",
                    "this format is pofk: 1, not " + version.get().inWords());
        }
    }

    private static Optional<Step> step(Node node, Reading reading) {
        if (node.asMapping().isEmpty()) {
            return reading.text(node, "the step").map(is -> new Step(is, Optional.empty(), Optional.empty()));
        }
        Fields parts = Fields.of(node.asMapping().get(), "step", List.of("is", "lasts", "first"), reading);
        Optional<String> lasts = parts.value("lasts").flatMap(value -> reading.text(value, "'lasts'"));
        Optional<String> first = parts.value("first").flatMap(value -> reading.text(value, "'first'"));
        Optional<String> is = parts.value("is").flatMap(value -> reading.text(value, "'is'"));
        if (parts.value("is").isEmpty()) {
            reading.fault(node.position(), "key-missing", "the step lacks 'is'; write for example is: shift");
        }
        return is.map(word -> new Step(word, lasts, first));
    }

    private static About about(Node node, Reading reading) {
        Optional<Node.Mapping> mapping = reading.mapping(node, "'about'", "{document: PN-12, revision: B}");
        if (mapping.isEmpty()) {
            return About.NOTHING;
        }
        Fields parts = Fields.of(mapping.get(), "about",
                List.of("document", "revision", "prepared by", "assumptions", "concerns"), reading);
        return new About(text(parts, "document", reading), text(parts, "revision", reading),
                text(parts, "prepared by", reading), assumptions(parts, reading),
                parts.value("concerns").flatMap(subject -> reading.keyword(subject, "what the model concerns",
                        Concerned.values())).map(Concerned::concern));
    }

    private static Optional<String> text(Fields parts, String key, Reading reading) {
        return parts.value(key).flatMap(node -> reading.text(node, "'" + key + "'"));
    }

    private static List<String> assumptions(Fields parts, Reading reading) {
        return parts.value("assumptions")
                .flatMap(node -> reading.sequence(node, "'assumptions'", "[repairs start at once, …]"))
                .map(list -> list.items().stream()
                        .flatMap(item -> reading.text(item, "an assumption").stream()).toList())
                .orElse(List.of());
    }
}
