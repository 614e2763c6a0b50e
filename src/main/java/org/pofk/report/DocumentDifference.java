package org.pofk.report;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.TreeSet;
import org.pofk.report.Document.Block;
import org.pofk.report.Document.Figure;
import org.pofk.report.Document.Heading;

/**
 * Which blocks of a document differ from an earlier one: those outside a longest common subsequence (Wagner and Fischer,
 * 1974) of the blocks below the same headings, or below one that stands where another is gone. A title, the heading of
 * level 1, is no such heading, and no heading is said to differ. Figures are the same where the same is drawn and said.
 * Time is the product of the lengths of the sections compared.
 */
final class DocumentDifference {
    private DocumentDifference() {
    }

    /** The later document, what differs in it marked. */
    static Document marked(Document before, Document after) {
        Map<List<Object>, List<Integer>> earlier = sections(before.blocks());
        Map<List<Object>, List<Integer>> later = sections(after.blocks());
        Map<List<Object>, List<Integer>> gone = new LinkedHashMap<>(earlier);
        gone.keySet().removeAll(later.keySet());
        List<Object> was = before.blocks().stream().map(DocumentDifference::shown).toList();
        List<Object> is = after.blocks().stream().map(DocumentDifference::shown).toList();
        Set<Integer> changed = new TreeSet<>();
        later.forEach((headings, places) -> changed.addAll(differing(was, earlier.containsKey(headings)
                ? earlier.get(headings) : taken(gone, headings), is, places)));
        return after.withChanged(changed);
    }

    /** Under a new heading the first of the sections that are gone from the same place, for it may bear another name now. */
    private static List<Integer> taken(Map<List<Object>, List<Integer>> gone, List<Object> headings) {
        int above = Math.max(0, headings.size() - 2);
        Optional<List<Object>> other = gone.keySet().stream().filter(each -> each.size() == headings.size()
                && each.subList(0, above).equals(headings.subList(0, above))).findFirst();
        return other.map(gone::remove).orElse(List.of());
    }

    /** What is equal for blocks that show the same: a figure's certified numbers aren't, but what they look like is. */
    private static Object shown(Block block) {
        return block instanceof Figure figure ? List.of(figure.caption(), SvgChart.part(figure.chart())) : block;
    }

    /** Places of blocks by the headings they stand below; headings that are there again are counted. */
    private static Map<List<Object>, List<Integer>> sections(List<Block> blocks) {
        Map<List<Object>, List<Integer>> sections = new LinkedHashMap<>();
        Map<List<Object>, Integer> again = new HashMap<>();
        List<Object> path = List.of();
        List<Heading> headings = new ArrayList<>();
        for (int i = 0; i < blocks.size(); i++) {
            if (blocks.get(i) instanceof Heading heading) {
                headings.removeIf(above -> above.level() >= heading.level());
                if (heading.level() > 1) {
                    headings.add(heading);
                }
                path = List.copyOf(headings);
                List<Object> counted = new ArrayList<>(path);
                counted.add(again.merge(path, 1, Integer::sum));
                path = counted;
            } else {
                sections.computeIfAbsent(path, some -> new ArrayList<>()).add(i);
            }
        }
        return sections;
    }

    private static List<Integer> differing(List<Object> before, List<Integer> from, List<Object> after,
            List<Integer> to) {
        int[][] common = new int[from.size() + 1][to.size() + 1];
        for (int i = from.size() - 1; i >= 0; i--) {
            for (int j = to.size() - 1; j >= 0; j--) {
                common[i][j] = before.get(from.get(i)).equals(after.get(to.get(j))) ? common[i + 1][j + 1] + 1
                        : Math.max(common[i + 1][j], common[i][j + 1]);
            }
        }
        List<Integer> differing = new ArrayList<>();
        int i = 0;
        for (int j = 0; j < to.size(); j++) {
            while (i < from.size() && common[i][j] == common[i + 1][j]) {
                i++;
            }
            boolean isCommon = i < from.size() && before.get(from.get(i)).equals(after.get(to.get(j)));
            if (isCommon) {
                i++;
            } else {
                differing.add(to.get(j));
            }
        }
        return differing;
    }
}
