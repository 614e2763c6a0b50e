package org.pofk.report;

import java.util.Locale;
import java.util.Optional;
import java.util.stream.IntStream;
import org.pofk.answer.Known;
import org.pofk.answer.Passage;
import org.pofk.answer.PassageMoments;
import org.pofk.answer.Percentile;
import org.pofk.chain.Chain;
import org.pofk.chain.Model;
import org.pofk.exact.Decimals;
import org.pofk.exact.Rational;
import org.pofk.longrun.Settling;

/** Whether and when a set of states is first entered, as JSON: format {@code pofk-passage}. */
public final class PassageJson {
    private final Json json;
    private final JsonOutput outputs;
    private final int digits;

    private PassageJson(Json json, int digits) {
        this.json = json;
        this.outputs = new JsonOutput(json, digits);
        this.digits = digits;
    }

    /** @param chain with the start that was asked about; {@code digits} are the significant digits of decimals */
    public static String write(Model model, Chain chain, Optional<Known> known, Passage passage,
            int digits) {
        return Json.ofObject(json -> new PassageJson(json, digits).fields(model, chain, known, passage));
    }

    private void fields(Model model, Chain chain, Optional<Known> known, Passage passage) {
        JsonHead.write(json, "pofk-passage", "passage", model);
        new JsonGiven(json).write(known);
        json.texts("into", passage.into().stream().map(chain.states()::get).toList());
        json.texts("avoiding", passage.avoiding().stream().map(chain.states()::get).toList());
        json.object("from", () -> IntStream.range(0, chain.size()).filter(i -> !chain.start().get(i).isZero())
                .forEach(i -> json.text(chain.states().get(i), chain.start().get(i).toString())));
        json.text("word", "exact");
        moments(passage);
        json.optional("return", passage.returns(), back -> json.object(() -> {
            json.text("probability", back.probability().toString());
            json.text("mean", back.mean().map(Rational::toString));
        }));
        json.text("visits", passage.visits().map(Rational::toString));
        json.name("law");
        outputs.write(passage.law());
        json.name("distribution");
        outputs.write(passage.distribution());
        json.name("survival");
        outputs.write(passage.survival());
        json.text("decay", passage.settling().flatMap(Settling::slowest).map(rate -> Decimals.of(rate, digits).text()));
        json.list("percentiles", passage.percentiles(), this::percentile);
        json.list("hazards", passage.hazards(), hazard -> json.object(() -> {
            json.count("k", hazard.k());
            json.text("exact", hazard.value().map(Rational::toString));
        }));
        json.list("fromEach", IntStream.range(0, chain.size()).boxed().toList(), i -> json.object(() -> {
            json.text("state", chain.states().get(i));
            json.text("probability", passage.fromEach().probabilities().get(i).toString());
            json.text("mean", passage.fromEach().means().get(i).map(Rational::toString));
        }));
    }

    /** Mean and variance of T; null where T may be infinite, with those given that it isn't. */
    private void moments(Passage passage) {
        PassageMoments moments = passage.moments();
        Optional<PassageMoments> certain = Optional.of(moments).filter(PassageMoments::isCertain);
        json.text("probability", moments.probability().toString());
        json.text("mean", certain.flatMap(PassageMoments::mean).map(Rational::toString));
        json.text("variance", certain.flatMap(PassageMoments::variance).map(Rational::toString));
        json.text("reason", certain.isPresent() ? Optional.empty()
                : Optional.of(moments.probability().isZero() ? "never" : "infinite"));
        json.object("givenThatItHappens", () -> {
            json.text("mean", moments.mean().map(Rational::toString));
            json.text("variance", moments.variance().map(Rational::toString));
            json.optional("law", passage.happening(), happening -> outputs.write(happening.law()));
            json.optional("distribution", passage.happening(), happening -> outputs.write(happening.distribution()));
        });
    }

    private void percentile(Percentile percentile) {
        json.object(() -> {
            json.text("p", percentile.p().toString());
            json.optional("k", percentile.k().stream().boxed().findFirst(), k -> json.count(k));
            json.text("reason", percentile.reason().map(reason ->
                    reason.name().toLowerCase(Locale.ROOT).replace('_', ' ')));
        });
    }
}
