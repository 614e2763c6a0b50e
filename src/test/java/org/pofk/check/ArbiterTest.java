package org.pofk.check;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.EnumSet;
import java.util.List;
import java.util.Optional;
import java.util.Random;
import java.util.Set;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.pofk.chain.Output;

/** The claims that the check is measured by are what they are said to be, by arithmetic that shares nothing with it. */
class ArbiterTest {
    private static final long SEED = 20_261_203L;
    private static final int EVERY = 5;

    private static List<Subject> some() {
        List<Subject> all = Subject.all();
        return IntStream.range(0, all.size()).filter(i -> i % EVERY == 0).mapToObj(all::get).toList();
    }

    @Test
    void formulasInEveryNotationGiveEveryStep() {
        Random random = new Random(SEED);
        Set<Notation> used = EnumSet.noneOf(Notation.class);
        int compared = 0;
        for (Subject subject : some()) {
            for (Output output : subject.outputs().stream().limit(1).toList()) {
                for (Notation notation : Notation.values()) {
                    Modes modes = subject.modes(output);
                    Optional<List<Token>> tokens =
                            FormulaWriter.write(modes, RightClaims.style(modes, random), notation, random);
                    if (tokens.isPresent()) {
                        String text = Pieces.plain(tokens.get());
                        assertFalse(Arbiter.differsSomewhere(text, subject.values(output), 0, "0.5"),
                                () -> subject + " " + output.name() + ": " + text);
                        used.add(notation);
                        compared++;
                    }
                }
            }
        }
        assertTrue(compared >= 100, compared + " compared");
        assertEquals(EnumSet.allOf(Notation.class), used);
    }

    @Test
    void rightClaimsAreRight() {
        Random random = new Random(SEED);
        int claims = 0;
        for (Subject subject : some()) {
            for (Claimed claim : RightClaims.of(subject, 3, random)) {
                assertTrue(claim.isRight());
                assertFalse(claim.provenWrong().apply("0.5"), () -> subject + " " + claim.yaml());
                claims++;
            }
        }
        assertTrue(claims >= 500, claims + " claims");
    }

    @Test
    void mostEditsAreProvenWrong() {
        Random random = new Random(SEED);
        int edits = 0;
        int proven = 0;
        for (Subject subject : some()) {
            for (Claimed claim : WrongClaims.of(subject, random)) {
                edits++;
                proven += claim.provenWrong().apply("1") ? 1 : 0;
            }
        }
        assertTrue(edits >= 500 && proven >= edits * 9 / 10, proven + " of " + edits + " edits");
    }

    /** A decimal off by one in its last place is told wrong with half a unit, and isn't with one and a half. */
    @Test
    void aLastPlaceIsWhatTellsRoundedFromWrong() {
        Near third = Near.of(org.pofk.exact.Rational.of(1, 3));
        assertFalse(Arbiter.number("0.3333", third).apply("0.5"));
        assertTrue(Arbiter.number("0.3334", third).apply("0.5"));
        assertFalse(Arbiter.number("0.3334", third).apply("1.5"));
        assertTrue(Arbiter.number("1/4", third).apply("1.5"));
    }
}
