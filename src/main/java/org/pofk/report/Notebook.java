package org.pofk.report;

import java.nio.charset.StandardCharsets;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.HexFormat;
import java.util.List;
import java.util.Map;
import java.util.stream.IntStream;

/**
 * A notebook as nbformat 4.5 describes it, its code in Python and not yet run. Written, it is the same bytes every
 * time: a cell's id is taken from its content and from how many before it have the same.
 */
record Notebook(List<Cell> cells) {
    private static final int MAJOR = 4;
    private static final int MINOR = 5;
    private static final int ID_DIGITS = 16;

    /** What a cell holds. */
    enum Kind {
        MARKDOWN, CODE
    }

    /** One cell; no line feed at its end. */
    record Cell(Kind kind, String source) {
        Cell {
            source = source.strip();
        }

        private String id(int before) {
            return sha256(kind + "\n" + before + "\n" + source).substring(0, ID_DIGITS);
        }

        private List<String> lines() {
            List<String> lines = source.lines().toList();
            return IntStream.range(0, lines.size())
                    .mapToObj(i -> lines.get(i) + (i + 1 < lines.size() ? "\n" : "")).toList();
        }
    }

    Notebook {
        cells = List.copyOf(cells);
    }

    String write() {
        Map<Cell, Integer> seen = new HashMap<>();
        List<String> ids = new ArrayList<>();
        cells.forEach(cell -> ids.add(cell.id(seen.merge(cell, 1, Integer::sum) - 1)));
        return Json.ofObjectOverLines(json -> {
            json.list("cells", IntStream.range(0, cells.size()).boxed().toList(),
                    i -> json.object(() -> cell(json, ids.get(i), cells.get(i))));
            json.object("metadata", () -> {
                json.object("kernelspec", () -> {
                    json.text("display_name", "Python 3");
                    json.text("language", "python");
                    json.text("name", "python3");
                });
                json.object("language_info", () -> json.text("name", "python"));
            });
            json.count("nbformat", MAJOR);
            json.count("nbformat_minor", MINOR);
        });
    }

    private static void cell(Json json, String id, Cell cell) {
        json.text("cell_type", cell.kind == Kind.CODE ? "code" : "markdown");
        if (cell.kind == Kind.CODE) {
            json.name("execution_count");
            json.nothing();
        }
        json.text("id", id);
        json.object("metadata", () -> { });
        if (cell.kind == Kind.CODE) {
            json.texts("outputs", List.of());
        }
        json.texts("source", cell.lines());
    }

    private static String sha256(String text) {
        try {
            return HexFormat.of().formatHex(MessageDigest.getInstance("SHA-256")
                    .digest(text.getBytes(StandardCharsets.UTF_8)));
        } catch (NoSuchAlgorithmException impossible) {
            throw new AssertionError("every Java platform has SHA-256", impossible);
        }
    }
}
