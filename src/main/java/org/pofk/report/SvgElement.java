package org.pofk.report;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Collectors;

/** An element of SVG: a name, attributes in their order, and either text or elements inside. */
record SvgElement(String name, Map<String, String> attributes, String text, List<SvgElement> inside) {
    SvgElement {
        attributes = Collections.unmodifiableMap(new LinkedHashMap<>(attributes));
        inside = List.copyOf(inside);
    }

    static SvgElement of(String name) {
        return new SvgElement(name, Map.of(), "", List.of());
    }

    SvgElement with(String attribute, String value) {
        Map<String, String> more = new LinkedHashMap<>(attributes);
        more.put(attribute, value);
        return new SvgElement(name, more, text, inside);
    }

    SvgElement with(String attribute, double value) {
        return with(attribute, number(value));
    }

    SvgElement saying(String words) {
        return new SvgElement(name, attributes, words, inside);
    }

    SvgElement holding(List<SvgElement> more) {
        List<SvgElement> all = new ArrayList<>(inside);
        all.addAll(more);
        return new SvgElement(name, attributes, text, all);
    }

    /** With what is shown when it is pointed at. */
    SvgElement tip(String words) {
        return holding(List.of(of("title").saying(words)));
    }

    /** To hundredths, as short as can be: {@code 12.5}. */
    static String number(double value) {
        BigDecimal rounded = BigDecimal.valueOf(Math.round(value * 100), 2).stripTrailingZeros();
        return rounded.signum() == 0 ? "0" : rounded.toPlainString();
    }

    /** As text, one element a line. */
    String write() {
        StringBuilder all = new StringBuilder();
        append(all);
        return all.toString();
    }

    private void append(StringBuilder all) {
        all.append('<').append(name);
        attributes.forEach((attribute, value) ->
                all.append(' ').append(attribute).append("=\"").append(escaped(value)).append('"'));
        if (text.isEmpty() && inside.isEmpty()) {
            all.append("/>\n");
            return;
        }
        all.append('>').append(escaped(text));
        if (!inside.isEmpty()) {
            all.append('\n');
            inside.forEach(each -> each.append(all));
        }
        all.append("</").append(name).append(">\n");
    }

    /** What XML would obey is escaped; what it may not hold is left out. */
    private static String escaped(String text) {
        return text.codePoints().filter(SvgElement::isAllowed).mapToObj(c -> switch (c) {
            case '&' -> "&amp;";
            case '<' -> "&lt;";
            case '>' -> "&gt;";
            case '"' -> "&quot;";
            default -> Character.toString(c);
        }).collect(Collectors.joining());
    }

    private static boolean isAllowed(int c) {
        return c >= 0x20 && c < 0xd800 || c >= 0xe000 && c < 0xfffe || c >= 0x10000 || c == '\t' || c == '\n';
    }
}
