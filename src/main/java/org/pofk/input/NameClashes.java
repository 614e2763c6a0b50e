package org.pofk.input;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** One name for two things: a state, a set, an output or a parameter. */
final class NameClashes {
    private static final Map<String, String> SECTIONS = sections();

    private NameClashes() {
    }

    private static Map<String, String> sections() {
        Map<String, String> sections = new LinkedHashMap<>();
        sections.put("parameters", "a parameter");
        sections.put("sets", "a set");
        sections.put("outputs", "an output");
        return sections;
    }

    static void check(Node.Mapping root, States states, Reading reading) {
        Map<String, String> taken = new LinkedHashMap<>();
        states.names().forEach(state -> taken.put(state, "a state"));
        SECTIONS.forEach((section, word) -> entries(root, section).forEach(entry -> {
            String before = taken.putIfAbsent(entry.name(), word);
            if (before != null) {
                reading.fault(entry.key().position(), "name-for-two", "'" + Words.shortened(entry.name())
                        + "' names " + before + " and " + word + "; give one of them another name");
            }
        }));
    }

    private static List<Node.Entry> entries(Node.Mapping root, String section) {
        return root.entries().stream().filter(entry -> entry.name().equals(section))
                .flatMap(entry -> entry.value().asMapping().stream())
                .flatMap(mapping -> mapping.entries().stream()).toList();
    }
}
