package org.pofk.cli;

import java.util.EnumSet;
import java.util.List;
import java.util.Optional;
import org.pofk.answer.DerivedModel;
import org.pofk.answer.Deriving;
import org.pofk.chain.Model;
import org.pofk.chain.Outputs;
import org.pofk.input.ModelReader;
import org.pofk.input.Overrides;
import org.pofk.input.Source;
import org.pofk.report.DerivationDocument;
import org.pofk.report.Style;
import org.pofk.report.TextWriter;
import org.pofk.text.Alphabet;
import org.pofk.text.RefusedException;

/**
 * Loads what a derivation needs while the options are still being parsed, by deriving a chain of three states in a
 * thread of its own. Most of the time of a small model is loading; a second processor halves it.
 */
final class WarmUp {
    private static final String MODEL = """
            pofk: 1
            title: warm-up
            step: 1 step
            start: a
            transitions:
              a: {b: 0.1, c: 1/5, a: rest}
              b: {a: 30%, b: rest}
              c: {c: 1}
            outputs: {y: 1 - c, w: {a: 1/2}}
            """;

    private WarmUp() {
    }

    /** Begins where a model is to be read and there is a second processor; what fails will fail again, and be told. */
    static void beginFor(String[] arguments) {
        boolean readsModel = arguments.length > 1 || arguments.length == 1 && CommandName.of(arguments[0]).isEmpty();
        boolean startsModel = arguments.length > 0 && arguments[0].equals(CommandName.NEW.word());
        if (readsModel && !startsModel && Runtime.getRuntime().availableProcessors() > 1) {
            Thread thread = new Thread(WarmUp::derive, "warm-up");
            thread.setDaemon(true);
            thread.start();
        }
    }

    private static void derive() {
        try {
            Model model = ModelReader.read(Source.ofText("warm-up", MODEL), Optional.empty(), Overrides.NONE);
            DerivedModel derived = Deriving.of(model, Outputs.byDefault(model.chain()), List.of(),
                    EnumSet.of(Deriving.Extra.COMPARISON), ignored -> { });
            TextWriter.of(Alphabet.UNICODE, java.nio.charset.StandardCharsets.UTF_8).write(
                    DerivationDocument.result(derived, new Style(6, Style.Angles.RADIANS)));
        } catch (RefusedException | RuntimeException | Error told) {
            return;
        }
    }
}
