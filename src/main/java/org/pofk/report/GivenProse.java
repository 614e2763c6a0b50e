package org.pofk.report;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.pofk.answer.Given;
import org.pofk.answer.Known;
import org.pofk.report.Document.Block;
import org.pofk.report.Document.Paragraph;
import org.pofk.steps.PossibleSteps;

/** What is known of a state, in words. */
public final class GivenProse {
    static final String NEVER = "at no step k: what is given has probability zero at every one, proved, so nothing is"
            + " defined given it";
    private static final int SHOWN = 8;
    /** Behind the title and the facts of the model. */
    private static final int PLACE = 2;

    private GivenProse() {
    }

    /** {@code running at k, failed never entered up to k}; the step as it is to be called. */
    static Prose of(Given given, String step) {
        List<Prose> parts = new ArrayList<>();
        if (!given.names().isEmpty()) {
            parts.add(joinedBy(given.names(), " and ").and(" at " + step));
        }
        if (!given.neverNames().isEmpty()) {
            parts.add(joinedBy(given.neverNames(), " and ").and(" never entered up to " + step));
        }
        return Prose.joined(parts, ", ");
    }

    private static Prose joinedBy(List<String> names, String between) {
        return Prose.joined(names.stream().map(Prose::name).toList(), between);
    }

    /** The document about a model as seen from a step, with what is known said behind its head. */
    public static Document in(Document document, Optional<Known> known, Style style) {
        List<Block> blocks = new ArrayList<>(document.blocks());
        known.ifPresent(each -> blocks.add(PLACE, new Paragraph(Prose.of("Given ")
                .and(of(each.given(), "step " + each.at())).and(", which has probability "
                + new LongRunProse(style.digits()).number(each.probability())
                + ": the start above is the state then, and k counts the steps from there"
                + (each.model().schedule().isPresent() ? ", in the schedule too." : ".")))));
        return new Document(blocks, document.sequences());
    }

    /** At which steps what is known is impossible. */
    static String impossible(PossibleSteps possible) {
        if (possible.always()) {
            return "at every step k";
        }
        if (possible.isNever()) {
            return NEVER;
        }
        List<String> parts = new ArrayList<>();
        if (!possible.impossibleBefore().isEmpty()) {
            parts.add("at k = " + list(possible.impossibleBefore()));
        }
        if (possible.endsForEver()) {
            parts.add("from k = " + possible.from() + " on");
        } else if (!possible.impossibleResidues().isEmpty()) {
            parts.add((possible.from() == 0 ? "" : "from k = " + possible.from() + " on ") + "at k ≡ "
                    + list(possible.impossibleResidues()) + " (mod " + possible.period() + ")");
        }
        return "not " + String.join(" and ", parts) + ", where what is given has probability zero; at all other steps";
    }

    private static String list(List<Integer> steps) {
        List<String> shown = steps.stream().limit(SHOWN).map(String::valueOf).toList();
        return String.join(", ", shown) + (steps.size() > SHOWN ? ", … (" + steps.size() + " in all)" : "");
    }
}
