package org.pofk.input;

import java.util.List;
import java.util.Locale;
import java.util.regex.Pattern;
import org.pofk.text.Fault;
import org.pofk.text.Position;
import org.pofk.text.RefusedException;

/** What a file is, by its top keys; so that a command can say which other one takes it. */
public enum FileKind {
    MODEL("a model", "'pofk derive' takes it"),
    CLAIMS("a file of claims about a model", "'pofk check' takes it"),
    MATRIX("a table of numbers",
            "'pofk derive' takes it with --orientation columns or rows and --start STATE"),
    RESULT("a result that pofk wrote", "results are not read back; name the model it came from"),
    OTHER("no file of pofk", "a model begins with pofk: 1");

    private static final Pattern CLAIMS_KEY = key("pofk-claims");
    private static final Pattern MODEL_KEY = key("pofk");
    private static final Pattern RESULT_FORMAT =
            Pattern.compile("\\A\\s*\\{[^{}\\[\\]]{0,200}?\"format\"\\s*:\\s*\"pofk-(result|passage|when|verdicts)\"");
    private static final Pattern SECTION = Pattern.compile("(?m)^[\"']?(transitions|matrix|states)[\"']?\\s*:");
    private static final Pattern ANY_KEY = Pattern.compile("(?m)^\\s*[\\w\"'{][^,;]*:(\\s|$)");
    private static final Pattern TABLE_LINE = Pattern.compile("[^:{}\\[\\]]*[,;][^:{}\\[\\]]*");

    private final String inWords;
    private final String wayOut;

    FileKind(String inWords, String wayOut) {
        this.inWords = inWords;
        this.wayOut = wayOut;
    }

    /** A key at the top level: at the beginning of a line, or first in a JSON text. */
    private static Pattern key(String name) {
        return Pattern.compile("(?m)(?:^|\\A\\s*\\{\\s*)[\"']?" + name + "[\"']?\\s*:");
    }

    /** What a source is; a text with faults is judged by what it seems to be. */
    public static FileKind of(Source source) {
        String text = source.text();
        if (RESULT_FORMAT.matcher(text).find()) {
            return RESULT;
        }
        if (CLAIMS_KEY.matcher(text).find()) {
            return CLAIMS;
        }
        if (MODEL_KEY.matcher(text).find() || SECTION.matcher(text).find()) {
            return MODEL;
        }
        return isTable(source) ? MATRIX : OTHER;
    }

    private static boolean isTable(Source source) {
        if (source.name().toLowerCase(Locale.ROOT).endsWith(".csv")) {
            return true;
        }
        return source.text().chars().anyMatch(Character::isDigit) && !ANY_KEY.matcher(source.text()).find() && source.text().lines().filter(line -> !line.isBlank())
                .allMatch(line -> TABLE_LINE.matcher(line).matches());
    }

    /** {@code a file of claims about a model}. */
    public String inWords() {
        return inWords;
    }

    /** Refuses the source unless it is what a command needs. */
    public void require(FileKind wanted, Source source) throws RefusedException {
        if (this != wanted && this != OTHER) {
            throw new RefusedException(List.of(new Fault(Position.ofWhole(source.name()), "wrong-kind-of-file",
                    "this is " + inWords + ", not " + wanted.inWords + "; " + wayOut)));
        }
    }
}
