package org.pofk.input;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalLong;
import java.util.function.BiFunction;
import java.util.function.Function;
import java.util.regex.Pattern;
import java.util.stream.IntStream;
import org.pofk.chain.Model.Convention;
import org.pofk.chain.Output;
import org.pofk.claim.AnswerOf;
import org.pofk.claim.Claim.Within;
import org.pofk.claim.FormulaText;
import org.pofk.claim.FormulaText.Notation;
import org.pofk.claim.Statement;
import org.pofk.claim.Statement.Component;
import org.pofk.claim.Statement.NoNumber.Word;
import org.pofk.exact.Rational;
import org.pofk.formula.FormulaReading.Subject;

/** What one claim states, by its kind. Nothing comes back where there are faults, or no model to hold it against. */
final class StatementSection {
    /** Stands where no output could be found, so that the rest of a claim is read for the sake of its faults. */
    private static final Output UNKNOWN = new Output("", List.of(), Rational.ZERO, "");

    private static final Pattern LETTERS = Pattern.compile("[a-z]{3,}");

    private final Fields fields;
    private final ClaimKind kind;
    private final Node.Scalar subject;
    private final ClaimNames names;
    private final Convention convention;
    private final Reading reading;
    private final ClaimFormulas formulas;
    private final Optional<Within> within;
    private final AnswerSection answers;

    private StatementSection(Fields fields, ClaimKind kind, Node.Scalar subject, Optional<Within> within,
            ClaimNames names, Convention convention, Reading reading) {
        this.fields = fields;
        this.kind = kind;
        this.subject = subject;
        this.names = names;
        this.convention = convention;
        this.reading = reading;
        this.formulas = new ClaimFormulas(names.known(), reading);
        this.within = within;
        this.answers = new AnswerSection(fields, kind, subject, names, reading);
    }

    /**
     * Reads the statement.
     *
     * @param subject    what it is about, as the file names it
     * @param within     what the file says under that key
     * @param convention how the author writes matrices
     */
    static Optional<Statement> read(Fields fields, ClaimKind kind, Node.Scalar subject, Optional<Within> within,
            ClaimNames names, Convention convention, Reading reading) {
        StatementSection section = new StatementSection(fields, kind, subject, within, names, convention, reading);
        int before = reading.faults().count();
        Optional<Statement> statement = section.statement();
        return reading.faults().count() == before ? statement : Optional.empty();
    }

    private Optional<Statement> statement() {
        return switch (kind) {
            case PAIR -> pair();
            case BOUND -> bound();
            default -> content().flatMap(this::stated);
        };
    }

    private Optional<Statement> stated(Content content) {
        return switch (kind) {
            case START -> Optional.of(new Statement.Start(components(content)));
            case MATRIX -> Optional.of(new Statement.Matrix(convention, MatrixContent.read(content, names, formulas,
                    reading)));
            case CHARACTERISTIC_POLYNOMIAL -> polynomial(content, Statement.MatrixPolynomial.Which.CHARACTERISTIC);
            case MINIMAL_POLYNOMIAL -> polynomial(content, Statement.MatrixPolynomial.Which.MINIMAL);
            case TRANSFORM -> transform(content, Statement.TransformOf.Form.TRANSFORM);
            case TRANSFORM_OVER_Z -> transform(content, Statement.TransformOf.Form.TRANSFORM_OVER_Z);
            case EXPANSION -> transform(content, Statement.TransformOf.Form.EXPANSION);
            case POLES -> poles(content);
            case RESIDUES -> residues(content);
            case FORMULA -> Optional.of(new Statement.PofK(ofOutputs(content, this::formula)));
            case LONG_RUN -> Optional.of(new Statement.LongRunOf(ofOutputs(content, this::longRun)));
            case EIGENVECTOR -> eigenvector(content);
            case VALUE -> value(content);
            case SETTLING_STEP -> answerOr(List.of(Word.NEVER), content, is -> answers.settling(is, within));
            case MEAN_PASSAGE -> answerOr(List.of(Word.values()), content, answers::passage);
            case SUM, MEAN -> answer(content, answers::overSteps);
            case PAIR, BOUND -> throw new AssertionError(kind + " has no content");
        };
    }

    /** What stands under {@code is}, {@code is-latex} or {@code are}; a fault unless exactly one does. */
    private Optional<Content> content() {
        List<String> given = ClaimKind.CONTENT.stream().filter(key -> fields.value(key).isPresent()).toList();
        if (given.size() > 1) {
            reading.fault(fields.position(given.get(1)).orElseThrow(), "stated-twice", "'" + given.get(0) + "' and '"
                    + given.get(1) + "' both say what is claimed; leave one of them out");
            return Optional.empty();
        }
        if (given.isEmpty()) {
            nothingStated(ClaimKind.CONTENT);
            return Optional.empty();
        }
        String key = given.get(0);
        return fields.value(key)
                .map(node -> new Content(node, key.equals("is-latex") ? Notation.LATEX : Notation.PLAIN));
    }

    /** One fault for what isn't there: none where a misspelt key is the cause. */
    private void nothingStated(List<String> keys) {
        if (!fields.misspell(keys)) {
            reading.fault(subject.position(), "nothing-stated", "nothing is stated here; write "
                    + ClaimExamples.of(kind));
        }
    }

    private Optional<Output> output() {
        return names.output(subject);
    }

    /** A number for each state: by name, or all in order. */
    private List<Component> components(Content content) {
        List<Component> components = new ArrayList<>();
        if (content.node().asMapping().isPresent()) {
            for (Node.Entry entry : content.node().asMapping().get().entries()) {
                Optional<Integer> state = names.state(entry.key());
                Optional<FormulaText> value = formulas.number(content.part(entry.value()), "a component");
                state.ifPresent(place -> value.ifPresent(is -> components.add(new Component(place, is))));
            }
            return components;
        }
        List<FormulaText> numbers = numbers(content, "the " + kind.word());
        IntStream.range(0, numbers.size()).forEach(i -> components.add(new Component(i, numbers.get(i))));
        return components;
    }

    /** A list with one number for each state. */
    private List<FormulaText> numbers(Content content, String what) {
        if (content.isLatexText()) {
            return formulas.text(content, what).map(text -> inLatex(text, content)).orElse(List.of());
        }
        Optional<Node.Sequence> list = reading.sequence(content.node(), what,
                "[0.9, 0.1, 0] or a mapping such as {STATE: 0.9, OTHER: 0.1}");
        List<Node> items = list.map(Node.Sequence::items).orElse(List.of());
        if (list.isPresent()) {
            requireOneForEachState(content, items.size());
        }
        return items.stream().flatMap(item -> formulas.number(content.part(item), "a number").stream()).toList();
    }

    private List<FormulaText> inLatex(Content.Text text, Content content) {
        List<String> entries = LatexGrid.list(text.text());
        requireOneForEachState(content, entries.size());
        return entries.stream().flatMap(entry -> formulas.numberIn(entry, text).stream()).toList();
    }

    private Optional<Statement> polynomial(Content content, Statement.MatrixPolynomial.Which which) {
        return formulas.polynomial(content, "a polynomial").map(is -> new Statement.MatrixPolynomial(which, is));
    }

    private Optional<Statement> transform(Content content, Statement.TransformOf.Form form) {
        Optional<FormulaText> formula = formulas.inZ(content,
                form == Statement.TransformOf.Form.TRANSFORM_OVER_Z ? Subject.OF_Z_OVER_Z : Subject.OF_Z, "a transform");
        return output().flatMap(output -> formula.map(is -> new Statement.TransformOf(output, form, is)));
    }

    private Optional<Statement> poles(Content content) {
        List<Statement.Poles.Pole> poles = new PolesSection(formulas, reading).read(content);
        return output().map(output -> new Statement.Poles(output, poles));
    }

    private Optional<Statement> residues(Content content) {
        List<Statement.Residues.AtPole> coefficients = new ArrayList<>();
        reading.mapping(content.node(), "residues", "{1: 0.0082, 0.45: -0.017}").ifPresent(mapping -> {
            for (Node.Entry entry : mapping.entries()) {
                Optional<FormulaText> pole = formulas.number(content.part(entry.key()), "a pole");
                List<FormulaText> values = list(content.part(entry.value()));
                pole.ifPresent(at -> coefficients.add(new Statement.Residues.AtPole(at, values)));
            }
        });
        return output().map(output -> new Statement.Residues(output, coefficients));
    }

    /** One number, or a list of them that holds at least one. */
    private List<FormulaText> list(Content content) {
        Optional<Node.Sequence> list = content.node().asSequence();
        if (list.isPresent() && list.get().items().isEmpty()) {
            reading.fault(content.node().position(), "list-empty", "the list is empty; write at least one number");
        }
        return list.map(Node.Sequence::items).orElse(List.of(content.node())).stream()
                .flatMap(item -> formulas.number(content.part(item), "a number").stream()).toList();
    }

    /** One part for the output that is named, or one for each name of a mapping where the claim is about all. */
    private <T> List<T> ofOutputs(Content content, BiFunction<Output, Content, Optional<T>> part) {
        if (!names.meansAll(subject.name())) {
            return single(content, part);
        }
        List<T> parts = new ArrayList<>();
        if (content.node().asSequence().isPresent()) {
            return ofStatesInOrder(content, content.node().asSequence().get().items(), part);
        }
        Optional<Node.Mapping> mapping = reading.mapping(content.node(), "the " + kind.word() + " of all",
                "{STATE: …, OTHER: …}");
        for (Node.Entry entry : mapping.map(Node.Mapping::entries).orElse(List.of())) {
            Optional<Output> output = names.output(entry.key());
            Optional<T> read = part.apply(output.orElse(UNKNOWN), content.part(entry.value()));
            output.flatMap(known -> read).ifPresent(parts::add);
        }
        return parts;
    }

    private <T> List<T> ofStatesInOrder(Content content, List<Node> items,
            BiFunction<Output, Content, Optional<T>> part) {
        requireOneForEachState(content, items.size());
        List<Output> states = names.everyState();
        List<T> parts = new ArrayList<>();
        for (int i = 0; i < items.size(); i++) {
            part.apply(i < states.size() ? states.get(i) : UNKNOWN, content.part(items.get(i))).ifPresent(parts::add);
        }
        return parts;
    }

    private void requireOneForEachState(Content content, int size) {
        if (names.states().filter(n -> n != size).isPresent()) {
            reading.fault(content.node().position(), "size-differs", "this list has "
                    + Words.count(size, "entry", "entries") + ", but the model has "
                    + Words.count(names.states().get(), "state", "states"));
        }
    }

    private <T> List<T> single(Content content, BiFunction<Output, Content, Optional<T>> part) {
        Optional<Output> output = output();
        Optional<T> read = part.apply(output.orElse(UNKNOWN), content);
        return output.flatMap(known -> read).stream().toList();
    }

    private Optional<Statement.PofK.Part> formula(Output output, Content content) {
        return formulas.inK(content, "a formula").map(is -> new Statement.PofK.Part(output, is));
    }

    private Optional<Statement.LongRunOf.Part> longRun(Output output, Content content) {
        boolean isNone = content.node().asScalar().filter(value -> value.text().strip().equals("none")).isPresent();
        return Optional.of(new Statement.LongRunOf.Part(output, isNone ? List.of() : list(content)));
    }

    private Optional<Statement> eigenvector(Content content) {
        Optional<FormulaText> eigenvalue = named("at", "the eigenvalue");
        if (fields.value("at").isEmpty()) {
            reading.fault(subject.position(), "key-missing", "the eigenvector's eigenvalue is missing: write at: 1");
        }
        List<Component> components = components(content);
        return eigenvalue.map(at -> new Statement.Eigenvector(at, components));
    }

    private Optional<Statement> value(Content content) {
        if (fields.value("at").isEmpty()) {
            reading.fault(subject.position(), "key-missing", "the step of the value is missing: write at: 5");
            return Optional.empty();
        }
        OptionalLong at = ClaimedSteps.step(fields.value("at").get(), "at", reading);
        Optional<FormulaText> formula = formulas.number(content, "a value");
        Optional<Output> output = output();
        if (at.isEmpty() || formula.isEmpty() || output.isEmpty()) {
            return Optional.empty();
        }
        Optional<Node> given = fields.value("given");
        return given.isEmpty() ? Optional.of(new Statement.Value(output.get(), at.getAsLong(), formula.get()))
                : answers.conditional(given.get(), output.get(), at.getAsLong(), formula.get())
                        .map(Function.identity());
    }

    private Optional<Statement> answer(Content content,
            Function<FormulaText, Optional<? extends Statement>> statement) {
        return formulas.number(content, "a number").flatMap(statement);
    }

    /** One of some words may stand in the place of the number. */
    private Optional<Statement> answerOr(List<Word> words, Content content,
            Function<FormulaText, Optional<AnswerOf>> question) {
        String written = content.node().asScalar().map(value -> value.text().strip()).orElse("");
        Optional<Word> word = words.stream().filter(each -> each.text().equals(written)).findFirst();
        if (word.isPresent()) {
            return formulas.word(content, "a number").flatMap(question)
                    .map(asked -> new Statement.NoNumber(asked, word.get()));
        }
        if (LETTERS.matcher(written).matches()) {
            reading.fault(content.node().position(), "not-a-number", "a number or "
                    + String.join(" or ", words.stream().map(Word::text).toList()) + " belongs here, not '"
                    + Words.shortened(written) + "'");
            return Optional.empty();
        }
        return answer(content, question::apply);
    }

    /** The number under a key of its own, in ordinary notation. */
    private Optional<FormulaText> named(String key, String what) {
        return fields.value(key).flatMap(node -> formulas.number(new Content(node, Notation.PLAIN), what));
    }

    private Optional<Statement> pair() {
        Optional<FormulaText> radius = named("radius", "the radius");
        Optional<FormulaText> angle = named("angle", "the angle");
        Optional<FormulaText> amplitude = named("amplitude", "the amplitude");
        Optional<FormulaText> phase = named("phase", "the phase");
        List<String> keys = List.of("radius", "angle", "amplitude", "phase");
        if (keys.stream().noneMatch(key -> fields.value(key).isPresent())) {
            nothingStated(keys);
        }
        return output().map(output -> new Statement.Pair(output, radius, angle, amplitude, phase));
    }

    private Optional<Statement> bound() {
        boolean isLeast = fields.value("at least").isPresent();
        boolean isMost = fields.value("at most").isPresent();
        if (isLeast && isMost) {
            reading.fault(subject.position(), "bound-unclear",
                    "a bound is either 'at least' or 'at most'; make two claims of it");
        } else if (!isLeast && !isMost) {
            nothingStated(List.of("at least", "at most"));
        }
        Optional<FormulaText> formula = named(isLeast ? "at least" : "at most", "a bound");
        Statement.Bound.Direction direction =
                isLeast ? Statement.Bound.Direction.AT_LEAST : Statement.Bound.Direction.AT_MOST;
        return output().flatMap(output -> formula.map(is -> new Statement.Bound(output, direction, is)));
    }
}
