package org.pofk.report;

import java.util.Optional;
import org.pofk.answer.DerivedModel;
import org.pofk.answer.Known;

/** What {@code derive} found, as JSON: format {@code pofk-result}. */
public final class DerivationJson {
    private final Json json;
    private final int digits;

    private DerivationJson(Json json, int digits) {
        this.json = json;
        this.digits = digits;
    }

    /** The text; {@code digits} are the significant digits of decimals. */
    public static String write(DerivedModel derived, int digits) {
        return write(derived, Optional.empty(), digits);
    }

    /** The same, with what is known of the start. */
    public static String write(DerivedModel derived, Optional<Known> known, int digits) {
        return Json.ofObject(json -> new DerivationJson(json, digits).fields(derived, known));
    }

    private void fields(DerivedModel derived, Optional<Known> known) {
        JsonHead.write(json, "pofk-result", "derive", derived.model());
        new JsonGiven(json).write(known);
        json.list("outputs", derived.outputs(), new JsonOutput(json, digits)::write);
        JsonModes modes = new JsonModes(json, new JsonNumbers(json, digits));
        json.optional("state", derived.state(), state ->
                json.object(() -> json.list("modes", state.modes(), modes::write)));
    }
}
