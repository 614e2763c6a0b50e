package org.pofk.report;

import org.pofk.chain.Model;

/** What every result written as JSON begins with. */
final class JsonHead {
    private static final int VERSION = 1;

    private JsonHead() {
    }

    static void write(Json json, String format, String command, Model model) {
        json.text("format", format);
        json.count("version", VERSION);
        json.text("command", command);
        json.object("model", () -> {
            json.text("title", model.title());
            json.text("file", model.origin().file());
            json.text("sha256", model.origin().sha256());
        });
        json.object("step", () -> {
            json.text("is", model.step().is());
            json.text("lasts", model.step().lasts());
            json.text("first", model.step().first());
        });
        json.texts("states", model.chain().states());
    }
}
