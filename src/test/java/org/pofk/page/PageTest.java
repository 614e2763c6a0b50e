package org.pofk.page;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.StringReader;
import java.nio.charset.StandardCharsets;
import java.security.MessageDigest;
import java.util.Base64;
import java.util.HashSet;
import java.util.List;
import java.util.regex.MatchResult;
import java.util.regex.Pattern;
import javax.xml.parsers.DocumentBuilderFactory;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.pofk.report.Document;
import org.pofk.report.Document.Excerpt;
import org.pofk.report.Document.Heading;
import org.pofk.report.Document.Table;
import org.pofk.report.HtmlWriter;
import org.pofk.report.Prose;
import org.w3c.dom.Element;
import org.xml.sax.InputSource;

/** What a page is, without a browser. */
class PageTest {
    private static final Pattern ID = Pattern.compile("\\sid=\"([^\"]*)\"");
    private static final Pattern NAMESPACE = Pattern.compile("xmlns(:[a-z]+)?=\\\\?\"http://www.w3.org/[^\"]*\"");

    static List<String> patterns() {
        return Pages.patterns();
    }

    private static Element parsed(String page) {
        try {
            return DocumentBuilderFactory.newInstance().newDocumentBuilder()
                    .parse(new InputSource(new StringReader(page))).getDocumentElement();
        } catch (Exception notWellFormed) {
            throw new AssertionError(page, notWellFormed);
        }
    }

    @ParameterizedTest
    @MethodSource("patterns")
    void aPageIsWellFormedAndLoadsNothing(String pattern) throws Exception {
        String page = HtmlWriter.write(Pages.document(Pages.derived(pattern)));
        assertEquals("html", parsed(page).getNodeName());
        String alone = NAMESPACE.matcher(page).replaceAll("");
        assertFalse(alone.contains("://"), "an address in the page");
        assertFalse(Pattern.compile("\\s(style|on[a-z]+|src)=\"").matcher(alone).find(), "what the policy forbids");
        List<String> ids = ID.matcher(page).results().map(found -> found.group(1)).toList();
        assertEquals(ids.size(), new HashSet<>(ids).size(), ids.toString());
        hasTheHashesOfItsStyleAndScript(page);
        assertEquals(page, HtmlWriter.write(Pages.document(Pages.derived(pattern))), "not the same twice");
    }

    private static void hasTheHashesOfItsStyleAndScript(String page) throws Exception {
        for (String kind : List.of("style", "script")) {
            List<String> texts = Pattern.compile("<" + kind + ">(.*?)</" + kind + ">", Pattern.DOTALL).matcher(page)
                    .results().map(found -> found.group(1)).toList();
            assertEquals(1, texts.size());
            String hash = Base64.getEncoder().encodeToString(MessageDigest.getInstance("SHA-256")
                    .digest(texts.get(0).getBytes(StandardCharsets.UTF_8)));
            assertTrue(page.contains(kind + "-src 'sha256-" + hash + "'"), kind);
        }
    }

    @Test
    void headingsAreEnteredOneByOneAndTablesHaveHeaders() throws Exception {
        String page = HtmlWriter.write(Pages.document(Pages.derived("pump-pair")));
        int before = 0;
        for (MatchResult heading : Pattern.compile("<h([1-6])[ >]").matcher(page).results().toList()) {
            int level = Integer.parseInt(heading.group(1));
            assertTrue(level <= before + 1, "a level left out");
            before = level;
        }
        assertTrue(page.contains("<th scope=\"col\">") && page.contains("<th scope=\"row\""));
        assertTrue(page.contains("<html lang=\"en\">") && page.contains("class=\"skip\""));
    }

    @Test
    void namesAreTextWhateverTheyHold() {
        String hard = "</script><b onload=\"x\">&amp; ' ]]> \u0001 \ufffe \u202e שלום 泵";
        String page = HtmlWriter.write(new Document(List.of(new Heading(1, Prose.name(hard)),
                new Table(Prose.name(hard), List.of(Prose.name(hard)), List.of(List.of(Prose.name(hard)))),
                new Excerpt(hard, 3, 3), new Excerpt(hard, 0, hard.length()))));
        String shown = hard.replace("\u0001", "\\u{1}").replace("\ufffe", "\\u{fffe}").replace("\u202e", "\\u{202e}");
        assertEquals(shown, parsed(page).getElementsByTagName("h1").item(0).getTextContent());
        assertEquals(shown, parsed(page).getElementsByTagName("td").getLength() == 0
                ? parsed(page).getElementsByTagName("th").item(1).getTextContent() : "");
    }
}
