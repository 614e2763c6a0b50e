package org.pofk.report;

import java.util.List;
import org.pofk.chain.Entry;

/** What an entry of a model is called. */
final class EntryProse {
    private EntryProse() {
    }

    static Prose of(Entry entry) {
        List<String> of = entry.of();
        return switch (entry.subject()) {
            case TITLE -> Prose.of("title");
            case DOCUMENT -> Prose.of("document");
            case REVISION -> Prose.of("revision");
            case PREPARED_BY -> Prose.of("prepared by");
            case ASSUMPTION -> Prose.of("assumption");
            case CONCERNS -> Prose.of("concerns");
            case KIND -> Prose.of("kind");
            case CONVENTION -> Prose.of("convention");
            case STEP -> Prose.of("one step is");
            case STEP_LASTS -> Prose.of("a step lasts");
            case FIRST_STEP -> Prose.of("first step");
            case STATE -> Prose.of("state");
            case START -> named("start in ", of);
            case START_IN_FILE -> Prose.of("start in the file, not used here");
            case PARAMETER -> named("parameter ", of);
            case PARAMETER_IN_FILE -> named("parameter ", of).and(" in the file, not used here");
            case DEFINITION -> named("definition of ", of);
            case RANGE -> named("range of ", of);
            case MEANING -> named("meaning of ", of);
            case MOVE -> move(of);
            case ACTION -> named("action ", of);
            case ACTION_MOVE, PHASE_MOVE -> Prose.name(of.get(0)).and(": ").and(move(of.subList(1, of.size())));
            case PHASE -> named("phase ", of);
            case AFTER_PHASES -> Prose.of("after the last phase");
            case COST_UNIT -> Prose.of("costs in");
            case COST_OF_STATE -> named("cost of a step in ", of);
            case COST_OF_MOVE -> Prose.of("cost of the move ").and(move(of));
            case COST_OF_ACTION -> named("cost of ", of.subList(0, 1)).and(named(" in ", of.subList(1, 2)));
            case COST_AT_START -> Prose.of("cost at the start");
            case DISCOUNT -> Prose.of("discount a step");
            case SET -> named("set ", of);
            case OUTPUT -> named("output ", of);
            case ADJUSTED -> Prose.of("changed on entry");
            case ORDER -> Prose.of("order of the " + of.get(0));
            case NOTE -> Prose.of(of.get(0) + " on ").andName(of.get(1));
        };
    }

    private static Prose named(String words, List<String> of) {
        return Prose.of(words).andName(of.get(0));
    }

    private static Prose move(List<String> of) {
        return Prose.of("from ").andName(of.get(0)).and(" to ").andName(of.get(1));
    }
}
