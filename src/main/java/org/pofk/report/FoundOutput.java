package org.pofk.report;

import java.util.List;
import java.util.Optional;
import org.pofk.report.Document.Labelled;
import org.pofk.steps.StepValue;

/** What a report found of an output, as far as it compares with the same in another issue. */
interface FoundOutput {
    String name();

    /** Of its formula, without numbers; empty where there is none. */
    Optional<Prose> shape();

    /** What is said where there is none. */
    String withoutShape();

    /** As on the first page. */
    List<Labelled> facts(Style style);

    /** Short enough for a table. */
    Prose longRun(Style style);

    /** How the values listed are read, where that isn't plain. */
    Prose reading();

    List<StepValue> values();

    /** What decides all that is said of it, to be equal to another's; empty where it isn't found. */
    Optional<Object> identity();
}
