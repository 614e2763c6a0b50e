package org.pofk.report;

import org.pofk.chain.Model.Setting;
import org.pofk.report.Document.Labelled;

/** What a command line puts in place of a model file's words. */
final class SettingProse {
    private SettingProse() {
    }

    /** {@code f = 1/10}, {@code the start one up}. */
    static Prose of(Setting setting) {
        return setting.parameter().map(name -> Prose.name(name).and(" = ")).orElse(Prose.of("the start "))
                .andName(setting.value());
    }

    /** {@code set for this report; the file says 0.035}. */
    static Prose inPlaceOf(Setting setting) {
        return Prose.of("set for this report; the file says ")
                .and(setting.inFile().map(ModelHead::words).orElse(Prose.of("nothing of it")));
    }

    /** The same behind what is set. */
    static Labelled line(Setting setting) {
        return new Labelled(setting.parameter().map(name -> Prose.of("parameter ").andName(name)).orElse(Prose.of("start")),
                Prose.name(setting.value()).and(", ").and(inPlaceOf(setting)));
    }
}
