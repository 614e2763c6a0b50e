package org.pofk.report;

import java.util.ArrayList;
import java.util.List;
import org.pofk.answer.InspectedModel;
import org.pofk.answer.InspectedModel.InspectedOutput;
import org.pofk.answer.Question;
import org.pofk.chain.Structure;
import org.pofk.chain.Structure.CommunicatingClass;
import org.pofk.longrun.HighPowers;
import org.pofk.longrun.LongRunChecks;

/** What {@code inspect} found, or {@code derive} without knowing which formula is wanted: {@code pofk-structure}. */
public final class StructureJson {
    private final Json json;
    private final String command;
    private final InspectedModel inspected;
    private final int digits;

    private StructureJson(Json json, String command, InspectedModel inspected, int digits) {
        this.json = json;
        this.command = command;
        this.inspected = inspected;
        this.digits = digits;
    }

    /** The answer to the command of this name. */
    public static String write(String command, InspectedModel inspected, int digits) {
        return Json.ofObject(json -> new StructureJson(json, command, inspected, digits).fields());
    }

    private void fields() {
        JsonHead.write(json, "pofk-structure", command, inspected.model());
        Structure structure = inspected.inspection().structure();
        json.list("classes", structure.classes(), this::communicating);
        json.texts("absorbing", names(structure.absorbing()));
        json.texts("unreached", names(structure.unreached()));
        json.list("stateLongRuns", inspected.states(), new JsonLongRun(json)::write);
        json.list("outputs", inspected.outputs(), this::output);
        json.texts("questions", inspected.inspection().questions().stream().map(Question::text).toList());
    }

    private List<String> names(List<Integer> states) {
        return states.stream().map(inspected.model().chain().states()::get).toList();
    }

    private void communicating(CommunicatingClass each) {
        json.object(() -> {
            json.texts("states", names(each.states()));
            json.truth("closed", each.closed());
            json.count("period", each.period());
            json.truth("reached", each.reached());
        });
    }

    private void output(InspectedOutput output) {
        json.object(() -> {
            json.text("name", output.output().name());
            json.text("word", "exact");
            json.name("longRun");
            new JsonLongRun(json).write(output.longRun().byPoles());
            json.optional("settledFrom", output.settling(),
                    settling -> json.text(settling.from().toString()));
            json.texts("agreeing", agreeing(output.longRun()));
            json.texts("warnings", output.longRun().highPowers().stream()
                    .flatMap(verdict -> verdict.habits().stream())
                    .filter(stop -> stop.outcome() != HighPowers.Outcome.RIGHT)
                    .map(stop -> LongRunWarning.of(stop, digits)).toList());
        });
    }

    private static List<String> agreeing(LongRunChecks checks) {
        List<String> ways = new ArrayList<>(List.of("poles"));
        checks.byClasses().ifPresent(found -> ways.add("null space"));
        checks.highPowers().ifPresent(found -> ways.add("high powers"));
        return ways;
    }
}
