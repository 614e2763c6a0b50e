package org.pofk.input;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.pofk.claim.FormulaText;
import org.pofk.claim.Statement.Poles.Pole;

/** The poles of a claim: numbers, each with its multiplicity, {@code ±} for both of a pair. */
final class PolesSection {
    private static final Pattern MULTIPLE = Pattern.compile("(?s)(.*)\\(\\s*(?:(once|twice)|(\\d{1,9}) times)\\s*\\)\\s*");
    private static final Pattern BOTH_SIGNS = Pattern.compile("±|\\+/-|\\+-|\\\\pm(?![a-zA-Z])");
    private static final int MOST_TIMES = 1_000;

    private final ClaimFormulas formulas;
    private final Reading reading;

    PolesSection(ClaimFormulas formulas, Reading reading) {
        this.formulas = formulas;
        this.reading = reading;
    }

    /** All poles of a list, or of one text with commas; faults for those that can't be read. */
    List<Pole> read(Content content) {
        List<Node> written = content.node().asSequence().map(Node.Sequence::items)
                .orElse(List.of(content.node()));
        List<Pole> poles = new ArrayList<>();
        if (content.node().asScalar().isPresent()) {
            formulas.text(content, "a pole").ifPresent(text -> LatexGrid.list(text.text()).forEach(entry -> poles.addAll(
                    poles(new Content.Text(entry, text.places(), text.notation()), content.node()))));
            return poles;
        }
        for (Node node : written) {
            formulas.text(content.part(node), "a pole").ifPresent(text -> poles.addAll(poles(text, node)));
        }
        return poles;
    }

    private List<Pole> poles(Content.Text source, Node node) {
        Matcher multiple = MULTIPLE.matcher(source.text());
        boolean isMultiple = multiple.matches();
        int times = isMultiple ? times(multiple) : 1;
        if (times < 1 || times > MOST_TIMES) {
            reading.fault(node.position(), "multiplicity", "a pole stands there 1 to " + MOST_TIMES + " times, not "
                    + times);
            return List.of();
        }
        String value = isMultiple ? multiple.group(1) : source.text();
        return values(value, source).stream().map(formula -> new Pole(formula, times)).toList();
    }

    private static int times(Matcher multiple) {
        return multiple.group(2) == null ? Integer.parseInt(multiple.group(3)) : multiple.group(2).equals("once") ? 1 : 2;
    }

    /** One number, or two that differ in a sign; each character stays at its place. */
    private List<FormulaText> values(String text, Content.Text source) {
        Matcher signs = BOTH_SIGNS.matcher(text);
        if (!signs.find()) {
            return formulas.numberIn(text, source).stream().toList();
        }
        String padding = " ".repeat(signs.end() - signs.start() - 1);
        List<FormulaText> both = new ArrayList<>();
        for (String sign : List.of("+", "-")) {
            String one = text.substring(0, signs.start()) + sign + padding + text.substring(signs.end());
            Optional<FormulaText> value = formulas.numberIn(one, source);
            if (value.isEmpty()) {
                return List.of();
            }
            both.add(value.get());
        }
        return both;
    }
}
