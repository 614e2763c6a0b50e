package org.pofk.input;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.pofk.chain.Chain;
import org.pofk.chain.Costs;
import org.pofk.chain.Model;
import org.pofk.chain.Structure;
import org.pofk.exact.Rational;

/** A start in the long run is the one that a step leaves as it is; costs are what their section says. */
class StartInLongRunTest {

    /** Every closed class of every pattern, periodic or not: A x = x, on the class alone. */
    @Test
    void aStepLeavesAStartInTheLongRunAsItIs() throws Exception {
        int parts = 0;
        for (Path file : PatternModelsTest.models()) {
            Chain chain = ModelReader.read(file, Overrides.NONE).chain();
            List<Structure.CommunicatingClass> closed = Structure.of(chain).closedClasses();
            for (Structure.CommunicatingClass part : closed) {
                if (chain.kind() == Chain.Kind.CHAIN && chain.size() <= 20) {
                    String name = chain.states().get(part.states().get(0));
                    List<Rational> start = started(file, "long run of " + name);
                    assertEquals(start, chain.matrix().times(start), file + ": " + name);
                    assertEquals(Rational.ONE, part.states().stream().map(start::get).reduce(Rational.ZERO, Rational::plus));
                    if (closed.size() == 1) {
                        assertEquals(start, started(file, "long run"));
                    }
                    parts++;
                }
            }
        }
        assertTrue(parts == 14, parts + " closed classes");
    }

    private static List<Rational> started(Path file, String start) throws Exception {
        return ModelReader.read(file, new Overrides(Map.of(), Optional.of(start))).chain().start();
    }

    @Test
    void aStateOfThatNameGoesBeforeTheWord() throws Exception {
        Model model = read("start: long run", "'long run': {b: 1/2, 'long run': rest}", "b: stays");
        assertEquals(List.of(Rational.ONE, Rational.ZERO), model.chain().start());
    }

    @Test
    void aNamedPartMayBeASet() throws Exception {
        Model model = read("start: {long run of: turning, note: after years}\nsets: {turning: [b, c]}",
                "a: {b: 1/2, d: 1/2}", "b: {c: 1}", "c: {b: 1/3, c: rest}", "d: stays");
        assertEquals(List.of("0", "1/4", "3/4", "0"), model.chain().start().stream().map(Rational::toString).toList());
    }

    @Test
    void costsAreWhatTheirSectionSays() throws Exception {
        Costs costs = read("start: a\nparameters: {visit: 8, f: 0}\nsets: {bad: [b, c]}\ncosts:\n  unit: kEUR\n"
                + "  each step in: {bad: visit/4, a: {value: 1/2, note: energy}}\n"
                + "  each move: {a: {bad: 3*visit}, b: {a: 1e3}}\n  at start: -2\n  discount: 3.5%",
                "a: {b: f, c: 1/5, a: rest}", "b: {a: 1}", "c: {a: 1/3, c: rest}").costs().orElseThrow();
        assertEquals("kEUR", costs.unit());
        assertEquals(List.of("1/2", "2", "2"), costs.eachStep().stream().map(Rational::toString).toList());
        // the move from a to b is written, though its probability is zero for this value of f
        assertEquals(List.of(new Costs.Move(0, 1, Rational.of(24)), new Costs.Move(0, 2, Rational.of(24)),
                new Costs.Move(1, 0, Rational.of(1000))), costs.moves());
        assertEquals(Rational.of(-2), costs.atStart());
        assertEquals(Optional.of(Rational.of(7, 200)), costs.discount());
    }

    private static Model read(String before, String... transitions) throws Exception {
        String text = "pofk: 1\n" + before + "\ntransitions:\n  " + String.join("\n  ", transitions) + "\n";
        return ModelReader.read(Source.ofText("invented.yaml", text), Optional.empty(),
                Overrides.NONE);
    }
}
