package org.pofk.schedule;

import java.util.ArrayList;
import java.util.List;
import java.util.function.Consumer;
import org.pofk.chain.Model;
import org.pofk.chain.Timetable;

/**
 * The totals asked for of a model with a schedule, in the order in which they were asked for.
 *
 * @param wanted how many were asked for, found by now or not
 */
public record ScheduledTotalModel(Model model, Timetable timetable, List<ScheduledTotal> totals, int wanted) {
    public ScheduledTotalModel {
        totals = List.copyOf(totals);
    }

    /** One after the other, published after each; steps ascending. */
    public static ScheduledTotalModel of(Model model, List<ScheduledTotal.Asked> asked, List<Integer> steps,
            Consumer<ScheduledTotalModel> published) {
        Timetable timetable = Timetable.of(model.chain(), model.schedule().orElseThrow());
        List<ScheduledTotal> totals = new ArrayList<>();
        for (ScheduledTotal.Asked each : asked) {
            totals.add(ScheduledTotal.of(model, timetable, each, steps, partly -> {
                List<ScheduledTotal> soFar = new ArrayList<>(totals);
                soFar.add(partly);
                published.accept(new ScheduledTotalModel(model, timetable, soFar, asked.size()));
            }));
            published.accept(new ScheduledTotalModel(model, timetable, totals, asked.size()));
        }
        return new ScheduledTotalModel(model, timetable, totals, asked.size());
    }

    public boolean isDecided() {
        return totals.size() == wanted && totals.stream().allMatch(ScheduledTotal::isDecided);
    }
}
