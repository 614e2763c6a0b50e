package org.pofk.report;

import org.pofk.modes.Mode;
import org.pofk.modes.StateModes.VectorMode;

/** Modes as the fields of JSON objects. */
record JsonModes(Json json, JsonNumbers numbers) implements Mode.Visitor<Runnable> {

    void write(Mode mode) {
        json.object(mode.accept(this));
    }

    /** A mode of the whole state, with its vector over all states. */
    void write(VectorMode mode) {
        json.object(() -> {
            mode.shape().accept(this).run();
            json.list("vector", mode.vector(), numbers::number);
            if (!mode.sine().isEmpty()) {
                json.list("sine", mode.sine(), numbers::number);
            }
            numbers.number("excitation", mode.excitation());
        });
    }

    @Override
    public Runnable impulse(Mode.Impulse impulse) {
        return () -> {
            json.text("kind", "impulse");
            json.count("at", impulse.at());
            numbers.number("value", impulse.value());
        };
    }

    @Override
    public Runnable geometric(Mode.Geometric mode) {
        return () -> {
            json.text("kind", "geometric");
            json.count("factor", mode.factor());
            json.count("root", mode.root());
            numbers.number("base", mode.base());
            json.count("power", mode.power());
            numbers.number("coefficient", mode.coefficient());
        };
    }

    @Override
    public Runnable oscillating(Mode.Oscillating mode) {
        return () -> {
            json.text("kind", "oscillating");
            json.count("factor", mode.factor());
            json.count("root", mode.root());
            numbers.number("modulus", mode.modulus());
            numbers.number("angle", mode.angle());
            json.count("power", mode.power());
            numbers.number("amplitude", mode.amplitude());
            numbers.number("phase", mode.phase());
        };
    }
}
