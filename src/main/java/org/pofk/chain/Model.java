package org.pofk.chain;

import java.util.List;
import java.util.Optional;

/**
 * A chain with what its author says about it: all that a model file holds.
 *
 * @param schedule   actions and phases, which the chain alone knows nothing of
 * @param costs      what states and moves cost, which the chain alone knows nothing of
 * @param parameters parameters in the order of the file
 * @param notes      notes and sources on entries, in the order of the file
 * @param changes    what was worked out and what was changed on entry
 * @param written    the entries of the chain's matrix as the file writes them, in its order; none for what stays
 * @param tables     the tables that the file names
 * @param settings   what a command line puts in place of the file's words
 */
public record Model(String title, Step step, Convention convention, About about, Chain chain,
        Optional<Schedule> schedule, Optional<Costs> costs, List<Parameter> parameters, List<Remark> notes,
        List<Adjustment> changes, List<Written> written, Origin origin, List<Origin> tables, List<Setting> settings) {

    /** How the author writes a matrix: moves out of a state stand in a column or in a row. */
    public enum Convention { COLUMNS, ROWS }

    /** What one step is: {@code 1 shift}; how long it lasts and what the first is called, where given. */
    public record Step(String is, Optional<String> lasts, Optional<String> first) {
        /** Where the author doesn't say what a step is. */
        public static final Step UNNAMED = new Step("1 step", Optional.empty(), Optional.empty());

        /** What one step is, where that says more than that it is one. */
        public Optional<String> named() {
            return Optional.of(is).filter(word -> !word.equals(UNNAMED.is));
        }
    }

    /** What stands or falls with what is modelled, where a caution more is due. */
    public enum Concern { PROTECTIVE_FUNCTION, STRUCTURE }

    /** Where the model comes from and what it concerns, carried into reports; never invented. */
    public record About(Optional<String> document, Optional<String> revision, Optional<String> preparedBy,
            List<String> assumptions, Optional<Concern> concerns) {
        public static final About NOTHING =
                new About(Optional.empty(), Optional.empty(), Optional.empty(), List.of(), Optional.empty());
    }

    /** A named value; {@code value} is its exact number as text. One that a command line sets has no source in the file. */
    public record Parameter(String name, String value, Optional<String> definition, Optional<String> from,
            Optional<String> to, Optional<String> meaning, Optional<String> source) {
    }

    /** An entry of the matrix as the file writes it, between two states by their places: {@code rest}, {@code 0.095}. */
    public record Written(int from, int to, String text, Form form) {

        /** How a number is written; an expression is one in parameters. */
        public enum Form { REST, NUMBER, EXPRESSION }
    }

    /** A number that isn't as the file writes it, in a line. */
    public record Adjustment(Reason reason, String text) {

        /** What a {@code rest} came to, or what {@code sums: rescale} and {@code give to diagonal} made of a number. */
        public enum Reason { REST_OF_MOVES, REST_OF_START, SUM }

        /** Whether the author didn't write what stands there now: what a rest comes to was meant. */
        public boolean isChange() {
            return reason == Reason.SUM;
        }
    }

    /** A note or source on an entry of the file. */
    public record Remark(Place on, Kind kind, String text) {

        /** By the key it stands under. */
        public enum Kind {
            NOTE("note"), SOURCE("source");

            private final String word;

            Kind(String word) {
                this.word = word;
            }

            public String word() {
                return word;
            }
        }
    }

    /**
     * A value from a command line in place of the file's.
     *
     * @param parameter which one; none where it is the start
     * @param value     as typed
     * @param inFile    what the file writes there, if anything
     */
    public record Setting(Optional<String> parameter, String value, Optional<String> inFile) {
    }

    /** The file a model was read from: its name as given and the SHA-256 of its bytes, in hexadecimal. */
    public record Origin(String file, String sha256) {
    }

    /** The same model, as if it had been read from another file. */
    public Model readFrom(Origin other) {
        return new Model(title, step, convention, about, chain, schedule, costs, parameters, notes, changes, written,
                other, tables, settings);
    }

    public Model {
        parameters = List.copyOf(parameters);
        notes = List.copyOf(notes);
        changes = List.copyOf(changes);
        written = List.copyOf(written);
        tables = List.copyOf(tables);
        settings = List.copyOf(settings);
    }

    /** As the file alone says it. */
    public Model(String title, Step step, Convention convention, About about, Chain chain, Optional<Schedule> schedule,
            Optional<Costs> costs, List<Parameter> parameters, List<Remark> notes, List<Adjustment> changes,
            List<Written> written, Origin origin, List<Origin> tables) {
        this(title, step, convention, about, chain, schedule, costs, parameters, notes, changes, written, origin, tables,
                List.of());
    }

    /** What a command line puts in place of a parameter's value. */
    public Optional<Setting> setting(Parameter parameter) {
        return settings.stream().filter(each -> each.parameter().equals(Optional.of(parameter.name()))).findFirst();
    }

    /** The same model; one without a schedule with one in which nothing is done, a cycle being one step. */
    public Model scheduled() {
        return new Model(title, step, convention, about, chain,
                Optional.of(schedule.orElse(new Schedule(List.of(), Optional.empty()))), costs, parameters, notes, changes,
                written, origin, tables, settings);
    }

    /** The same model with another chain. */
    public Model with(Chain other) {
        return new Model(title, step, convention, about, other, schedule, costs, parameters, notes, changes, written,
                origin, tables, settings);
    }

    /** The same model with another schedule. */
    public Model with(Schedule other) {
        return new Model(title, step, convention, about, chain, Optional.of(other), costs, parameters, notes, changes,
                written, origin, tables, settings);
    }
}
