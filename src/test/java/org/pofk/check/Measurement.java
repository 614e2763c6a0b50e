package org.pofk.check;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.EnumMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.TreeMap;
import org.pofk.claim.Verdict;
import org.pofk.slip.Finding;
import org.pofk.slip.SlipKind;

/** Counts what the tool says of claims whose worth is known: what it passes, what it refuses, what it names. */
final class Measurement {
    private static final int BATCH = 20;
    private static final int SHOWN = 40;

    /** What became of the slips of one kind. */
    private static final class Score {
        private int claims;
        private int named;
        private int first;

        private void add(Score other) {
            claims += other.claims;
            named += other.named;
            first += other.first;
        }
    }

    private final Map<String, Integer> rightByShape = new TreeMap<>();
    private final Map<SlipKind, Score> bySlip = new EnumMap<>(SlipKind.class);
    private final List<String> falseAlarms = new ArrayList<>();
    private final List<String> passed = new ArrayList<>();
    private final List<String> faults = new ArrayList<>();
    private final List<String> misnamed = new ArrayList<>();
    private int right;
    private int wrong;
    private int edits;
    private int uncounted;
    private int pairs;
    private int pairsNamed;

    /** What another one has counted. */
    void add(Measurement other) {
        other.rightByShape.forEach((shape, count) -> rightByShape.merge(shape, count, Integer::sum));
        other.bySlip.forEach((kind, score) -> bySlip.computeIfAbsent(kind, none -> new Score()).add(score));
        falseAlarms.addAll(other.falseAlarms);
        passed.addAll(other.passed);
        faults.addAll(other.faults);
        misnamed.addAll(other.misnamed);
        right += other.right;
        wrong += other.wrong;
        edits += other.edits;
        uncounted += other.uncounted;
        pairs += other.pairs;
        pairsNamed += other.pairsNamed;
    }

    /** Claims that are right; all about one model. */
    void addRight(List<Claimed> claims) {
        for (int from = 0; from < claims.size(); from += BATCH) {
            List<Claimed> batch = claims.subList(from, Math.min(claims.size(), from + BATCH));
            try {
                List<Finding> findings = Reviewed.findings(batch);
                for (int i = 0; i < batch.size(); i++) {
                    addRight(batch.get(i), findings.get(i));
                }
            } catch (RuntimeException | AssertionError e) {
                batch.forEach(this::addRightAlone);
            }
        }
    }

    private void addRightAlone(Claimed claim) {
        try {
            addRight(claim, Reviewed.findings(List.of(claim)).get(0));
        } catch (RuntimeException | AssertionError e) {
            fault(claim, e);
        }
    }

    private void fault(Claimed claim, Throwable e) {
        faults.add(claim.subject() + " " + claim.yaml() + "\n      " + e + " at " + place(e));
    }

    private static String place(Throwable e) {
        StackTraceElement[] trace = (e.getCause() == null ? e : e.getCause()).getStackTrace();
        return trace.length == 0 ? "" : trace[0].toString();
    }

    private void addRight(Claimed claim, Finding finding) {
        right++;
        rightByShape.merge(claim.shape(), 1, Integer::sum);
        if (!finding.judgement().isRight() || finding.verdict() == Verdict.CARRIED) {
            falseAlarms.add(finding.verdict() + " " + claim.shape() + ": " + claim.subject() + " " + claim.yaml()
                    + "\n      right: " + finding.judgement().right());
        }
    }

    /** A claim that is wrong, where arithmetic of these tests' own proves that it is. */
    void addWrong(Claimed claim) {
        edits++;
        if (!claim.provenWrong().apply("1")) {
            uncounted++;
            return;
        }
        try {
            addWrong(claim, Reviewed.findings(List.of(claim)).get(0));
        } catch (RuntimeException | AssertionError e) {
            fault(claim, e);
        }
    }

    private void addWrong(Claimed claim, Finding finding) {
        wrong++;
        if (finding.verdict() != Verdict.WRONG) {
            passed.add(finding.verdict() + " " + claim.injected() + " " + claim.shape() + ": " + claim.subject() + " "
                    + claim.yaml());
            return;
        }
        List<SlipKind> named = finding.slips().stream().map(slip -> slip.kind()).toList();
        if (claim.injected().size() == 1) {
            addNamed(claim, named, finding);
        } else if (claim.injected().size() == 2) {
            pairs++;
            pairsNamed += named.containsAll(claim.injected()) ? 1 : 0;
            if (!named.containsAll(claim.injected())) {
                misnamed.add("TWO: " + claim.injected() + ", but " + named + " " + claim.subject() + " " + claim.yaml()
                        + finding.rest().map(" rest: "::concat).orElse(""));
            }
        }
    }

    private void addNamed(Claimed claim, List<SlipKind> named, Finding finding) {
        SlipKind injected = claim.injected().get(0);
        Score score = bySlip.computeIfAbsent(injected, none -> new Score());
        score.claims++;
        boolean isFirst = !named.isEmpty() && named.get(0) == injected;
        score.first += isFirst ? 1 : 0;
        score.named += named.contains(injected) ? 1 : 0;
        if (!isFirst) {
            misnamed.add((named.contains(injected) ? "later: " : "NOT NAMED: ") + injected + ", but " + named + " "
                    + claim.shape() + ": " + claim.subject() + " " + claim.yaml() + finding.rest().map(" rest: "::concat)
                    .orElse(""));
        }
    }

    int claims() {
        return right + wrong + faults.size();
    }

    int right() {
        return right;
    }

    int wrong() {
        return wrong;
    }

    int faults() {
        return faults.size();
    }

    int falseAlarms() {
        return falseAlarms.size();
    }

    int passed() {
        return passed.size();
    }

    /** Edits that can't be told from a rounding, in a hundred. */
    double uncountedShare() {
        return 100.0 * uncounted / Math.max(1, edits);
    }

    double namedFirstShare() {
        return share(bySlip.values().stream().mapToInt(score -> score.first).sum());
    }

    double namedShare() {
        return share(bySlip.values().stream().mapToInt(score -> score.named).sum());
    }

    private double share(int count) {
        return 100.0 * count / Math.max(1, bySlip.values().stream().mapToInt(score -> score.claims).sum());
    }

    double pairsNamedShare() {
        return 100.0 * pairsNamed / Math.max(1, pairs);
    }

    int kinds() {
        return bySlip.size();
    }

    /** The figures, with some of what they count. */
    String summary() {
        StringBuilder text = new StringBuilder();
        text.append(right).append(" right claims, ").append(falseAlarms.size()).append(" false alarms; ").append(wrong)
                .append(" wrong claims, ").append(passed.size()).append(" passed; ").append(faults.size())
                .append(" faults; ").append(uncounted).append(" of ").append(edits)
                .append(" edits not counted, for they can't be told from a rounding\n")
                .append(String.format(Locale.ROOT, "named first %.2f %%, named %.2f %%, both of two %d of %d%n",
                        namedFirstShare(), namedShare(), pairsNamed, pairs));
        bySlip.forEach((kind, score) -> text.append(String.format(Locale.ROOT, "  %-26s %5d  first %5d  named %5d%n",
                kind, score.claims, score.first, score.named)));
        list(text, "faults", faults, SHOWN);
        list(text, "false alarms", falseAlarms, SHOWN);
        list(text, "wrong claims passed", passed, SHOWN);
        list(text, "not named first", misnamed, SHOWN);
        return text.toString();
    }

    private static void list(StringBuilder text, String title, List<String> entries, int most) {
        text.append(title).append(": ").append(entries.size()).append('\n');
        entries.stream().limit(most).forEach(entry -> text.append("    ").append(entry).append('\n'));
    }

    /** Everything counted, for whoever looks into it. */
    void write(Path file) {
        StringBuilder text = new StringBuilder(summary());
        text.append("\n\nshapes of right claims\n");
        rightByShape.forEach((shape, count) -> text.append("  ").append(count).append("  ").append(shape).append('\n'));
        list(text, "all faults", faults, Integer.MAX_VALUE);
        list(text, "all false alarms", falseAlarms, Integer.MAX_VALUE);
        list(text, "all wrong claims passed", passed, Integer.MAX_VALUE);
        list(text, "all not named first", misnamed, Integer.MAX_VALUE);
        try {
            Files.createDirectories(file.getParent());
            Files.writeString(file, text, StandardCharsets.UTF_8);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }
}
