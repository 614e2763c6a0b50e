package org.pofk.report;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.Base64;
import java.util.Objects;
import java.util.stream.Collectors;
import java.util.stream.IntStream;

/**
 * The page around what is shown: one file that loads nothing. Style and script stand in it, and the page's own policy
 * lets no others run, by their hashes; the font for mathematics is in the style. Well-formed as XML too.
 */
final class HtmlPage {
    private HtmlPage() {
    }

    /**
     * A whole page.
     *
     * @param title    escaped
     * @param contents HTML
     */
    static String of(String title, String contents) {
        String style = style();
        String script = "//<![CDATA[\n" + text("page.js") + "//]]>\n";
        String policy = "default-src 'none'; style-src '" + hash(style) + "'; script-src '" + hash(script)
                + "'; font-src data:; base-uri 'none'; form-action 'none'";
        return String.join("\n", "<!DOCTYPE html>", "<html lang=\"en\">", "<head>", "<meta charset=\"utf-8\"/>",
                "<meta http-equiv=\"Content-Security-Policy\" content=\"" + policy + "\"/>",
                "<meta name=\"viewport\" content=\"width=device-width, initial-scale=1\"/>",
                "<meta name=\"generator\" content=\"pofk\"/>",
                "<title>" + title + "</title>", "<style>" + style + "</style>", "</head>", "<body>",
                "<a class=\"skip\" href=\"#content\">Skip to the content</a>",
                "<main id=\"content\" tabindex=\"-1\">", contents, "</main>",
                "<script>" + script + "</script>", "</body>", "</html>", "");
    }

    private static String style() {
        return "\n@font-face { font-family: \"page mathematics\"; src: url(data:font/woff2;base64,"
                + Base64.getEncoder().encodeToString(bytes("mathematics.woff2")) + ") format(\"woff2\"); }\n"
                + text("page.css") + IntStream.rangeClosed(1, HtmlTable.MOST_MOVED)
                        .mapToObj(digits -> "tbody .in" + digits + " { padding-left: calc(.3rem + " + digits + "ch); }\n")
                        .collect(Collectors.joining()) + SvgChart.sheet();
    }

    private static String hash(String text) {
        try {
            return "sha256-" + Base64.getEncoder().encodeToString(MessageDigest.getInstance("SHA-256")
                    .digest(text.getBytes(StandardCharsets.UTF_8)));
        } catch (NoSuchAlgorithmException every) {
            throw new AssertionError("every Java has SHA-256", every);
        }
    }

    private static String text(String resource) {
        return new String(bytes(resource), StandardCharsets.UTF_8);
    }

    private static byte[] bytes(String resource) {
        try (InputStream stream = Objects.requireNonNull(HtmlPage.class.getResourceAsStream(resource), resource)) {
            return stream.readAllBytes();
        } catch (IOException unreadable) {
            throw new UncheckedIOException(unreadable);
        }
    }
}
