package org.pofk.input;

import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Stream;
import org.pofk.chain.Chain;
import org.pofk.chain.ChainCheck;
import org.pofk.chain.Costs;
import org.pofk.chain.Model;
import org.pofk.chain.Model.Convention;
import org.pofk.chain.Model.Origin;
import org.pofk.chain.Model.Parameter;
import org.pofk.chain.Output;
import org.pofk.chain.Place;
import org.pofk.chain.Place.Part;
import org.pofk.chain.Schedule;
import org.pofk.chain.SparseMatrix;
import org.pofk.exact.Rational;
import org.pofk.text.Faults;
import org.pofk.text.RefusedException;

/**
 * Reads model files: YAML 1.2 or JSON. Numbers are exact as written; a file that can't be accepted is refused with
 * all its faults at their places. Linear in the length of the file but for the arithmetic.
 */
public final class ModelReader {
    private static final List<String> KEYS = List.of("pofk", "title", "kind", "step", "convention", "states", "start",
            "transitions", "matrix", "sums", "sets", "outputs", "parameters", "about", "actions", "schedule", "moves",
            "phases", "repeat", "costs");

    private final Source source;
    private final Optional<Path> folder;
    private final Reading reading;

    private ModelReader(Source source, Optional<Path> folder, Reading reading) {
        this.source = source;
        this.folder = folder;
        this.reading = reading;
    }

    /** The model in a file; tables that it names lie beside it. */
    public static Model read(Path file, Overrides overrides) throws RefusedException {
        Path folder = Optional.ofNullable(file.getParent()).orElse(Path.of(""));
        return read(Source.read(file), Optional.of(folder), overrides);
    }

    /** The model in a text; tables that it names lie in {@code folder}. */
    public static Model read(Source source, Optional<Path> folder, Overrides overrides) throws RefusedException {
        FileKind.of(source).require(FileKind.MODEL, source);
        Faults faults = new Faults();
        ModelReader reader = new ModelReader(source, folder, new Reading(faults, overrides));
        Node root = YamlComposer.compose(source, faults);
        Optional<Model> model = reader.reading
                .mapping(root, "a model", "{pofk: 1, states: […], transitions: {…}}").flatMap(reader::model);
        faults.refuseIfAny();
        return sound(model.orElseThrow());
    }

    private static Model sound(Model model) {
        List<String> wrong = ChainCheck.violations(model.chain());
        if (!wrong.isEmpty()) {
            throw new AssertionError("accepted, but not a chain: " + model.origin() + ": " + wrong);
        }
        return model;
    }

    /** The model, when there are no faults; nothing when not even its states could be read. */
    private Optional<Model> model(Node.Mapping root) {
        Fields fields = Fields.of(root, Place.of(Part.MODEL), KEYS, reading);
        Head head = Head.read(fields, root, source.fileName(), reading);
        ParametersSection section = new ParametersSection(reading);
        List<Parameter> parameters = section.read(fields.value("parameters"));
        Moves moves = Moves.read(fields, root, folder, reading);
        if (moves.states().size() == 0) {
            refuseWithoutStates(root);
            return Optional.empty();
        }
        Chain chain = chain(fields, root, head, section.values(), moves);
        List<Model.Written> written = List.copyOf(reading.written());
        Optional<Schedule> schedule = ScheduleSections.read(fields, moves.states(), head,
                new Amounts(section.values(), reading), chain.matrix(), reading);
        Optional<Costs> costs = fields.value("costs").flatMap(node -> new CostsSection(moves.states(), chain.sets(),
                CostsSection.MoveFinder.of(matrices(chain, schedule), written), actions(fields),
                new Amounts(section.values(), reading), reading).read(node, head));
        if (schedule.isPresent()) {
            new StartSection(moves.states(), chain.sets(), chain.matrix(), head, new Amounts(section.values(), reading),
                    reading).refuseLongRun(fields.value("start"));
        }
        NameClashes.check(root, moves.states(), reading);
        Convention convention = head.convention()
                .or(() -> moves.orientation().map(Head.Orientation::convention)).orElse(Convention.COLUMNS);
        return Optional.of(new Model(head.title(), head.step(), convention, head.about(), chain, schedule, costs,
                parameters, reading.remarks(), reading.changes(), written,
                new Origin(source.name(), source.sha256()), reading.tables(), reading.settings()));
    }

    /** The matrices the chain moves by, in one phase or another. */
    private static List<SparseMatrix> matrices(Chain chain, Optional<Schedule> schedule) {
        return Stream.concat(Stream.of(chain.matrix()), schedule.flatMap(Schedule::phases).stream()
                .flatMap(phases -> phases.list().stream()).map(Schedule.Phase::matrix)).toList();
    }

    private static List<String> actions(Fields fields) {
        return fields.value("actions").flatMap(Node::asMapping).stream().flatMap(each -> each.entries().stream())
                .map(Node.Entry::name).toList();
    }

    private void refuseWithoutStates(Node.Mapping root) {
        if (reading.faults().isEmpty()) {
            reading.fault(root.position(), "no-states", "the model has no states; name at least one");
        }
    }

    private Chain chain(Fields fields, Node.Mapping root, Head head, ParameterValues parameters, Moves moves) {
        States states = moves.states();
        Amounts amounts = new Amounts(parameters, reading);
        SparseMatrix matrix = moves.matrix(head, amounts);
        Map<String, List<Integer>> sets = fields.value("sets")
                .map(node -> new SetsSection(states, reading).read(node)).orElse(Map.of());
        List<Rational> start = new StartSection(states, sets, matrix, head, amounts, reading)
                .vector(fields.value("start"), root.position());
        List<Output> outputs = fields.value("outputs")
                .map(node -> new OutputsSection(states, head.kind(), sets, parameters, reading).read(node))
                .orElse(List.of());
        return new Chain(head.kind(), states.names(), matrix, start, sets, outputs);
    }
}
