package org.pofk.check;

import java.util.ArrayList;
import java.util.List;

/** Reads the list of poles of a claim: {@code 0.45 (twice)}, {@code 0.4 ± 0.33 i}. */
final class PoleText {
    private PoleText() {
    }

    /** Every pole as often as it is claimed. */
    static List<Near> read(List<String> texts, String units) {
        List<Near> poles = new ArrayList<>();
        for (String text : texts) {
            String value = text.replaceAll(" \\((twice|\\d+ times)\\)", "");
            int times = text.contains("twice") ? 2
                    : text.contains(" times)") ? Integer.parseInt(text.replaceAll(".*\\((\\d+) times\\)", "$1")) : 1;
            for (int i = 0; i < times; i++) {
                if (value.contains("±")) {
                    poles.add(Evaluator.constant(value.replace("±", value.startsWith("±") ? "" : "+"), units));
                    poles.add(Evaluator.constant(value.replace("±", "-"), units));
                } else {
                    poles.add(Evaluator.constant(value, units));
                }
            }
        }
        return poles;
    }
}
