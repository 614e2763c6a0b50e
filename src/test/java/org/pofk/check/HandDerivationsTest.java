package org.pofk.check;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.io.IOException;
import java.util.ArrayList;
import java.util.EnumMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.IntStream;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.pofk.check.ExpectedReview.Line;
import org.pofk.claim.Claims;
import org.pofk.claim.Verdict;
import org.pofk.input.ClaimsReader;
import org.pofk.input.ModelVariants;
import org.pofk.input.Overrides;
import org.pofk.input.Source;
import org.pofk.slip.Finding;
import org.pofk.slip.Reviewing;
import org.pofk.slip.Slip;
import org.pofk.slip.SlipKind;
import org.pofk.text.RefusedException;

/**
 * Whole derivations as people write them, with up to three slips each. What was put in was written down before any of
 * it was reviewed, and every verdict and every slip must come out as it went in.
 */
class HandDerivationsTest {
    private static final int DERIVATIONS = 40;
    private static final int SLIPS = 53;
    /** A value worked out with a calculator in radians from a formula that is wrong besides: two slips, one a line away. */
    private static final List<String> WRONGLY_NAMED = List.of("sorter-b17.yaml 8 DEGREES_AS_RADIANS");

    private static final Map<ExpectedReview, List<Finding>> REVIEWED = new LinkedHashMap<>();

    /** What became of a slip that was put in. */
    private enum Fate { NAMED_FIRST, NAMED_LATER, MISSED, WRONGLY_NAMED }

    @BeforeAll
    static void review() throws IOException {
        for (ExpectedReview expected : ExpectedReview.all()) {
            REVIEWED.put(expected, findings(expected));
        }
    }

    private static List<Finding> findings(ExpectedReview expected) {
        try {
            Claims claims = ClaimsReader.read(Source.read(expected.claims()), Optional.of(ExpectedReview.FOLDER),
                    Overrides.NONE);
            return Reviewing.of(claims, ModelVariants.of(claims, Overrides.NONE)).findings();
        } catch (RefusedException refused) {
            throw new AssertionError(expected + ": " + refused.faults(), refused);
        }
    }

    static List<ExpectedReview> derivations() throws IOException {
        return ExpectedReview.all();
    }

    @ParameterizedTest
    @MethodSource("derivations")
    void everyStepGetsItsVerdict(ExpectedReview expected) {
        assertEquals(expected.lines().stream().map(line -> verdict(line.number(), line.verdict(),
                        line.carriedFrom().orElse(0))).toList(),
                REVIEWED.get(expected).stream().map(finding -> verdict(finding.claim().number(), finding.verdict(),
                        finding.carriedFrom().orElse(0))).toList(), expected.toString());
    }

    private static String verdict(int number, Verdict verdict, int carriedFrom) {
        return number + " " + verdict + (carriedFrom > 0 ? " " + carriedFrom : "");
    }

    @ParameterizedTest
    @MethodSource("derivations")
    void everySlipPutInIsNamed(ExpectedReview expected) {
        List<String> unnamed = new ArrayList<>();
        forEachSlip(expected, (line, kind, finding) -> {
            boolean isKnown = WRONGLY_NAMED.contains(expected + " " + line.number() + " " + kind);
            if (!kinds(finding).contains(kind) && !isKnown) {
                unnamed.add(line.number() + " " + kind + ", named: " + kinds(finding));
            }
        });
        assertEquals(List.of(), unnamed, expected.toString());
    }

    @Test
    void slipsAreFoundAndNamedAsCounted() {
        Map<Fate, Integer> fates = new EnumMap<>(Fate.class);
        List<String> notFound = new ArrayList<>();
        REVIEWED.keySet().forEach(expected -> forEachSlip(expected, (line, kind, finding) -> {
            Fate fate = fate(line, kind, finding);
            fates.merge(fate, 1, Integer::sum);
            if (fate == Fate.MISSED || fate == Fate.WRONGLY_NAMED) {
                notFound.add(expected + " " + line.number() + " " + kind);
            }
        }));
        int first = fates.getOrDefault(Fate.NAMED_FIRST, 0);
        int found = first + fates.getOrDefault(Fate.NAMED_LATER, 0);
        String counts = REVIEWED.size() + " derivations, " + found + " slips found (" + first + " named first), "
                + fates.getOrDefault(Fate.MISSED, 0) + " missed, " + fates.getOrDefault(Fate.WRONGLY_NAMED, 0)
                + " wrongly named " + notFound;
        assertEquals(DERIVATIONS, REVIEWED.size(), counts);
        assertEquals(SLIPS, found, counts);
        assertEquals(0, fates.getOrDefault(Fate.MISSED, 0), counts);
        assertEquals(WRONGLY_NAMED, notFound, counts);
    }

    /** Slips put into one line together are all named first when they are the first that are named. */
    private static Fate fate(Line line, SlipKind kind, Finding finding) {
        List<SlipKind> named = kinds(finding);
        if (finding.verdict() != Verdict.WRONG || named.isEmpty()) {
            return Fate.MISSED;
        }
        int place = named.indexOf(kind);
        return place < 0 ? Fate.WRONGLY_NAMED : place < line.slips().size() ? Fate.NAMED_FIRST : Fate.NAMED_LATER;
    }

    private static List<SlipKind> kinds(Finding finding) {
        return finding.slips().stream().map(Slip::kind).toList();
    }

    @FunctionalInterface
    private interface OfSlip {
        void accept(Line line, SlipKind kind, Finding finding);
    }

    private static void forEachSlip(ExpectedReview expected, OfSlip action) {
        List<Finding> findings = REVIEWED.get(expected);
        IntStream.range(0, Math.min(findings.size(), expected.lines().size())).forEach(i -> {
            Line line = expected.lines().get(i);
            line.slips().forEach(kind -> action.accept(line, kind, findings.get(i)));
        });
    }
}
