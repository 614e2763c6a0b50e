package org.pofk.report;

import java.nio.charset.Charset;
import java.nio.charset.CharsetEncoder;
import java.util.stream.Collectors;
import org.pofk.formula.Formula;
import org.pofk.formula.PlainText;
import org.pofk.text.Alphabet;

/**
 * Prose as characters of a screen. Our words and formulas are written in the alphabet; names stay as they are. What a
 * screen can't show, or would obey (control characters, changes of direction), is written {@code \\u{1b}}. Blanks
 * where no line may break are no-break spaces: inside names, in formulas all but those before a sign, before
 * a percent sign, inside {@code k = 50}.
 */
final class Spelling {
    static final char NO_BREAK = '\u00a0';

    private final Alphabet alphabet;
    private final CharsetEncoder encoder;

    Spelling(Alphabet alphabet, Charset charset) {
        this.alphabet = alphabet;
        this.encoder = charset.newEncoder();
    }

    String of(Prose prose) {
        return prose.parts().stream().map(part -> part.accept(new Parts())).collect(Collectors.joining());
    }

    String of(String words) {
        return shown(alphabet.write(words));
    }

    String of(Formula formula) {
        return shown(PlainText.in(alphabet).write(formula));
    }

    /** Every character that isn't fit for the screen replaced. */
    String shown(String text) {
        return text.codePoints().mapToObj(this::shown).collect(Collectors.joining());
    }

    private String shown(int c) {
        String character = Character.toString(c);
        boolean isObeyed = Character.isISOControl(c) || c >= 0x202a && c <= 0x202e || c >= 0x2066 && c <= 0x2069
                || c == 0x2028 || c == 0x2029;
        return c == '\n' ? " " : isObeyed || c != NO_BREAK && !encoder.canEncode(character)
                ? String.format("\\u{%x}", c) : character;
    }

    private final class Parts implements Prose.Visitor<String> {
        @Override
        public String words(Prose.Words words) {
            return of(Typography.of(words.text())).replace(" %", NO_BREAK + "%");
        }

        @Override
        public String name(Prose.Name name) {
            return shown(name.text()).replace(' ', NO_BREAK);
        }

        @Override
        public String mathematics(Prose.Mathematics mathematics) {
            return of(mathematics.formula()).replace(' ', NO_BREAK)
                    .replaceAll(NO_BREAK + "(?=[+−-]" + NO_BREAK + ")", " ");
        }
    }
}
