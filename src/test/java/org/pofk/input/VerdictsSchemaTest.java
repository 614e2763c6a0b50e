package org.pofk.input;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.junit.jupiter.api.Test;
import org.pofk.slip.SlipKind;

/** The schema of verdicts lists every kind of claim and of slip there is, in the tool's order. */
class VerdictsSchemaTest {
    private static final Path SCHEMA = Path.of("src/main/resources/org/pofk/schema/verdicts.schema.json");

    /** The words of the enumeration that begins with one. */
    private static List<String> beginningWith(String first) throws IOException {
        Matcher words = Pattern.compile("\"enum\": \\[\\s*(\"" + first + "\"[^\\]]*)]")
                .matcher(Files.readString(SCHEMA));
        assertEquals(true, words.find(), first);
        return Arrays.stream(words.group(1).split(",")).map(word -> word.strip().replace("\"", "")).toList();
    }

    @Test
    void everyKindOfClaim() throws IOException {
        assertEquals(ClaimKind.words(), beginningWith("start"));
    }

    @Test
    void everyKindOfSlip() throws IOException {
        assertEquals(Arrays.stream(SlipKind.values()).map(kind -> kind.name().toLowerCase(Locale.ROOT).replace('_', ' '))
                .toList(), beginningWith("sign of a term"));
    }
}
