package org.pofk.report;

import java.util.regex.Pattern;

/** Names in YAML. */
final class Yaml {
    private static final Pattern PLAIN = Pattern.compile("[\\p{L}_][\\p{L}\\p{M}\\p{Nd}_./-]*(?: [\\p{L}\\p{Nd}_]+)*");

    private Yaml() {
    }

    /** The name, in single quotes unless it is plainly a name. */
    static String name(String name) {
        return PLAIN.matcher(name).matches() ? name : "'" + name.replace("'", "''") + "'";
    }
}
