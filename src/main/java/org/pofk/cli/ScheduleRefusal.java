package org.pofk.cli;

import org.pofk.chain.Model;

/** What a command that knows nothing of inspections and phases says of a model that has some. */
final class ScheduleRefusal {
    private ScheduleRefusal() {
    }

    /** The model, when its chain is all there is to it. */
    static Model unlessScheduled(Model model) throws UsageException {
        if (model.schedule().isPresent()) {
            throw new UsageException("'" + model.origin().file() + "' has " + what(model)
                    + ", which this command would leave out of account; pofk derive, pofk draw, pofk inspect,"
                    + " pofk passage, pofk report, pofk simulate, pofk total and pofk when take them into account");
        }
        return model;
    }

    private static String what(Model model) {
        return model.schedule().filter(each -> each.recurring().isEmpty()).isPresent() ? "phases"
                : model.schedule().filter(each -> each.phases().isPresent()).isPresent()
                        ? "scheduled actions and phases"
                : "scheduled actions";
    }
}
