package org.pofk.check;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.pofk.claim.Claims;
import org.pofk.slip.Finding;
import org.pofk.text.Fault;
import org.pofk.text.RefusedException;

/** Claims files whose text was damaged: refused, each fault at its place, or judged; never anything else. */
class MutatedClaimsTest {
    private static final long SEED = 20_261_202L;
    private static final int TEXTS = 3_000;
    private static final int MODELS = 12;
    /** Pieces that are likely to mean something where they are put. */
    private static final List<String> PIECES = List.of("k", "z", "i", "^", "^k", "(", ")", "*", "/", "-", "+", ".", "0",
            "9", "1e", "e-3", "sqrt(", "cos(", "exp(k", "delta(k", "binomial(k, 2)", "±", " (twice)", "pi", "deg", "%",
            "'", "\"", ":", ", ", "[", "]", "{", "}", "\\frac", "\\left(", "\\cdot", "^{", "_", "#", "&", "\t",
            "k >= 1", "none", "all", "999999999", "0.0", "10^30", "1/0", "0^k", "λ", "²", "√", "/k", "k^k", "z^-1",
            "within: 1%", "carried: 4 significant");

    private int refused;
    private int judged;

    @Test
    @Tag("soak")
    void damagedClaimsAreRefusedAtAPlaceOrJudged() {
        Random random = new Random(SEED);
        List<String> escaped = new ArrayList<>();
        List<List<Claimed>> sources = sources(random);
        for (int i = 0; i < TEXTS; i++) {
            List<Claimed> claims = sources.get(i % sources.size());
            Path model = claims.get(0).subject().file();
            Claimed claim = claims.get(random.nextInt(claims.size()));
            String text = damaged(Claimed.file(List.of(claim), model.getFileName().toString()), random);
            try {
                judge(text, model);
            } catch (RuntimeException | AssertionError | StackOverflowError e) {
                StackTraceElement[] trace = e.getStackTrace();
                escaped.add(model.getFileName() + "\n" + text + "    " + e + " at "
                        + (trace.length == 0 ? "" : trace[0].toString()));
            }
        }
        assertEquals(0, escaped.size(), () -> escaped.size() + " escaped, of them\n"
                + String.join("\n", escaped.subList(0, Math.min(12, escaped.size()))));
        assertEquals(TEXTS, refused + judged);
        assertTrue(refused > TEXTS / 10 && judged > TEXTS / 10, () -> refused + " refused, " + judged + " judged");
    }

    /** Claims about the smallest models there are, so that many can be judged. */
    private static List<List<Claimed>> sources(Random random) {
        return Subject.all().stream().filter(subject -> subject.chain().size() <= 3).limit(MODELS)
                .map(subject -> RightClaims.of(subject, 4, random)).toList();
    }

    private void judge(String text, Path model) {
        try {
            Claims claims = Reviewed.read(text, model.getParent());
            List<Finding> findings = Reviewed.findings(claims);
            assertEquals(claims.claims().size(), findings.size(), text);
            judged++;
        } catch (RefusedException e) {
            for (Fault fault : e.faults()) {
                assertTrue(fault.position().line() >= 1 && fault.position().column() >= 1, () -> fault + "\n" + text);
            }
            assertTrue(!e.faults().isEmpty(), text);
            refused++;
        }
    }

    /** One to three edits behind the head of the file. */
    private static String damaged(String text, Random random) {
        StringBuilder damaged = new StringBuilder(text);
        int head = text.indexOf("claims:\n", text.indexOf("model:")) + 8;
        for (int edit = random.nextInt(3); edit >= 0; edit--) {
            int at = head + random.nextInt(Math.max(1, damaged.length() - head));
            switch (random.nextInt(7)) {
                case 0 -> damaged.deleteCharAt(Math.min(at, damaged.length() - 1));
                case 1 -> damaged.insert(at, PIECES.get(random.nextInt(PIECES.size())));
                case 2 -> damaged.replace(at, Math.min(at + 1, damaged.length()),
                        PIECES.get(random.nextInt(PIECES.size())));
                case 3 -> damaged.insert(at, damaged.substring(at, Math.min(damaged.length(), at + random.nextInt(9))));
                case 4, 5 -> {
                    if (Character.isDigit(damaged.charAt(Math.min(at, damaged.length() - 1)))) {
                        damaged.setCharAt(at, (char) ('0' + random.nextInt(10)));
                    }
                }
                default -> damaged.delete(at, Math.min(damaged.length(), at + random.nextInt(6)));
            }
        }
        return damaged.toString();
    }

}
