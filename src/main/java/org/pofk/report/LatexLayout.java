package org.pofk.report;

import java.text.Normalizer;
import java.util.Locale;

/**
 * What of a document in LaTeX depends on where it goes.
 *
 * @param name    what labels and files of figures begin with; letters, digits and hyphens
 * @param figures where they are
 */
public record LatexLayout(String name, Figures figures) {

    /** Where figures are. */
    public enum Figures {
        /** In the text, as pictures of TikZ; equations are numbered by LaTeX. */
        INSIDE,
        /** In files beside it, as PNG and, where that can be made, PDF; equations carry their numbers with them. */
        IN_FILES
    }

    public LatexLayout {
        name = slug(name);
    }

    private static String slug(String name) {
        String slug = Normalizer.normalize(name, Normalizer.Form.NFKD).toLowerCase(Locale.ROOT)
                .replaceAll("\\p{M}", "").replaceAll("[^a-z0-9]+", "-").replaceAll("^-|-$", "");
        return slug.isEmpty() ? "document" : slug;
    }

    /** {@code eq:pumps-derive:3}. */
    String equation(int number) {
        return "eq:" + name + ":" + number;
    }

    /** {@code fig:pumps-derive:1}. */
    String figure(int number) {
        return "fig:" + name + ":" + number;
    }

    /** The name of a figure's file without its ending. */
    public String file(int number) {
        return name + "-figure-" + number;
    }
}
