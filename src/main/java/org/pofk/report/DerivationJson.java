package org.pofk.report;

import org.pofk.answer.DerivedModel;

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
        return Json.ofObject(json -> new DerivationJson(json, digits).fields(derived));
    }

    private void fields(DerivedModel derived) {
        JsonHead.write(json, "pofk-result", "derive", derived.model());
        json.list("outputs", derived.outputs(), new JsonOutput(json, digits)::write);
        JsonModes modes = new JsonModes(json, new JsonNumbers(json, digits));
        json.optional("state", derived.state(), state ->
                json.object(() -> json.list("modes", state.modes(), modes::write)));
    }
}
