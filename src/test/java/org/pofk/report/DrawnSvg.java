package org.pofk.report;

import java.io.StringReader;
import java.util.ArrayList;
import java.util.List;
import javax.xml.parsers.DocumentBuilderFactory;
import org.w3c.dom.Element;
import org.w3c.dom.Node;
import org.xml.sax.InputSource;

/** An SVG read again by a parser of XML, for what tests ask of it. */
record DrawnSvg(Element root) {

    /** A place with what is told of it. */
    record Told(double x, double y, String tip) {
    }

    /** A line of text with the box it may take. */
    record Text(String words, Box box, double x, double y, String fill) {
    }

    static DrawnSvg of(String svg) {
        try {
            DocumentBuilderFactory factory = DocumentBuilderFactory.newInstance();
            factory.setFeature("http://apache.org/xml/features/disallow-doctype-decl", true);
            return new DrawnSvg(factory.newDocumentBuilder().parse(new InputSource(new StringReader(svg)))
                    .getDocumentElement());
        } catch (Exception broken) {
            throw new AssertionError(svg, broken);
        }
    }

    List<Element> elements(String name) {
        List<Element> elements = new ArrayList<>();
        for (int i = 0; i < root.getElementsByTagName(name).getLength(); i++) {
            elements.add((Element) root.getElementsByTagName(name).item(i));
        }
        return elements;
    }

    List<Element> all() {
        return elements("*");
    }

    static double number(Element element, String attribute) {
        return Double.parseDouble(element.getAttribute(attribute));
    }

    /** The element of this name directly inside another. */
    static String inside(Element element, String name) {
        for (Node node = element.getFirstChild(); node != null; node = node.getNextSibling()) {
            if (node.getNodeName().equals(name)) {
                return node.getTextContent();
            }
        }
        return "";
    }

    /** Marks at data. */
    List<Told> marks() {
        return all().stream().filter(element -> element.hasAttribute("data-x")).map(element ->
                new Told(number(element, "data-x"), number(element, "data-y"), inside(element, "title"))).toList();
    }

    List<Text> texts() {
        return elements("text").stream().map(DrawnSvg::text).toList();
    }

    private static Text text(Element element) {
        String words = element.getTextContent();
        int size = Integer.parseInt(element.getAttribute("font-size"));
        double width = TextWidth.of(words, size)
                * (element.getAttribute("font-weight").equals("bold") ? TextWidth.BOLD : 1);
        double x = number(element, "x");
        double y = number(element, "y");
        double left = switch (element.getAttribute("text-anchor")) {
            case "middle" -> x - width / 2;
            case "end" -> x - width;
            default -> x;
        };
        return new Text(words, new Box(left, y - 0.78 * size, width, size), x, y, element.getAttribute("fill"));
    }

    Box viewBox() {
        String[] parts = root.getAttribute("viewBox").split(" ");
        return new Box(Double.parseDouble(parts[0]), Double.parseDouble(parts[1]), Double.parseDouble(parts[2]),
                Double.parseDouble(parts[3]));
    }
}
