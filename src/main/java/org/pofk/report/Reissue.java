package org.pofk.report;

import java.util.List;
import java.util.stream.Stream;
import org.pofk.chain.Model;
import org.pofk.chain.ModelChanges;
import org.pofk.report.Document.Labelled;

/**
 * What a report says and what the same said of an earlier model.
 *
 * @param changes what the later model says otherwise
 * @param outputs those of both, compared
 */
record Reissue(Issue before, Issue after, ModelChanges changes, List<OutputPair> outputs) {

    static Reissue of(Issue before, Issue after) {
        ModelChanges changes = ModelChanges.of(before.model(), after.model());
        return new Reissue(before, after, changes, OutputPair.of(before.outputs(), after.outputs(), changes));
    }

    Model earlier() {
        return before.model();
    }

    Model later() {
        return after.model();
    }

    /** {@code since revision A}; without revisions, since the file. */
    Prose since() {
        return earlier().about().revision().map(revision -> Prose.of("since revision ").andName(revision))
                .orElseGet(() -> Prose.of("since ").andName(earlier().origin().file()));
    }

    /** The names of the outputs that compare in one way. */
    List<String> named(OutputPair.Standing standing) {
        return outputs.stream().filter(pair -> pair.standing() == standing).map(OutputPair::name).toList();
    }

    /** Whether both models were read from the same bytes. */
    boolean isOfTheSameFiles() {
        return files(earlier()).equals(files(later()));
    }

    private static List<String> files(Model model) {
        return Stream.concat(Stream.of(model.origin()), model.tables().stream()).map(Model.Origin::sha256).toList();
    }

    /** What is said of the files of an input without any change. */
    String sameInput() {
        return isOfTheSameFiles() ? "the files are the same" : "the files differ in wording or layout only";
    }

    static List<Labelled> keyFigures(Issue issue) {
        return issue.answers().stream().flatMap(answer -> answer.keyFigures().stream()).toList();
    }

    /** The key figures of answers that the earlier report has word by word. */
    List<Labelled> answersAsBefore() {
        List<Labelled> was = keyFigures(before);
        return keyFigures(after).stream().filter(was::contains).toList();
    }

    /** What the command line puts in place of the words of both files; empty where it does nothing of the kind. */
    Prose settings() {
        List<Prose> set = later().settings().stream().map(SettingProse::of).toList();
        return set.isEmpty() ? Prose.EMPTY : Prose.of("the earlier file with ").and(Prose.joined(set, " and "))
                .and(" as well, which the command line sets for both");
    }
}
