package org.pofk.report;

import java.util.Optional;
import org.pofk.answer.Given;
import org.pofk.answer.Known;
import org.pofk.exact.Rational;

/** What is known of a state, as the field {@code given}. */
record JsonGiven(Json json) {

    /** @param at and the probability of what is known there; both empty where it is known at k itself */
    void write(Given given, Optional<Integer> at, Optional<Rational> probability) {
        json.object("given", () -> {
            json.texts("in", given.names());
            json.texts("never", given.neverNames());
            json.optional("at", at, json::count);
            json.text("probability", probability.map(Rational::toString));
        });
    }

    /** Nothing where nothing is known. */
    void write(Optional<Known> known) {
        known.ifPresent(each -> write(each.given(), Optional.of(each.at()), Optional.of(each.probability())));
    }
}
