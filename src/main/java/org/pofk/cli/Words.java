package org.pofk.cli;

import java.util.Locale;

/** How the values of an option are typed. */
final class Words {
    private Words() {
    }

    /** {@code RADIANS} is typed {@code radians}. */
    static String lowerCase(Enum<?> value) {
        return value.name().toLowerCase(Locale.ROOT);
    }
}
