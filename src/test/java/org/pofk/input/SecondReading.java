package org.pofk.input;

import java.math.BigDecimal;
import java.math.BigInteger;
import java.text.Normalizer;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.pofk.chain.Chain;
import org.pofk.exact.Rational;
import org.snakeyaml.engine.v2.api.Load;
import org.snakeyaml.engine.v2.api.LoadSettings;
import org.snakeyaml.engine.v2.schema.FailsafeSchema;

/**
 * A second, naive reading of model files that shares nothing with the first but the YAML scanner: it compares the
 * moves of a model, entry by entry, with the file. Expressions are left out.
 */
final class SecondReading {
    private final Map<?, ?> file;
    private final Chain chain;
    private int compared;
    private final List<String> differences = new ArrayList<>();

    private SecondReading(String text, Chain chain) {
        LoadSettings settings = LoadSettings.builder().setSchema(new FailsafeSchema()).build();
        this.file = (Map<?, ?>) new Load(settings).loadFromString(text);
        this.chain = chain;
    }

    /** What it found: how many entries it compared, and which differ. */
    record Result(int compared, List<String> differences) {
    }

    static Result compare(String text, Chain chain) {
        SecondReading reading = new SecondReading(text, chain);
        if (reading.file.get("transitions") instanceof Map<?, ?> transitions) {
            transitions.forEach(reading::row);
        } else {
            reading.matrix((Map<?, ?>) reading.file.get("matrix"));
        }
        return new Result(reading.compared, reading.differences);
    }

    private void row(Object from, Object to) {
        if (to instanceof Map<?, ?> moves) {
            moves.forEach((target, value) -> entry(from.toString(), target.toString(), value));
            int written = (int) moves.keySet().stream().filter(key -> chain.states().contains(name(key)))
                    .count();
            int places = chain.matrix().columns().get(place(from.toString())).size();
            check(places <= written, from + " has " + places + " entries for " + written);
        } else if (to.equals("stays")) {
            entry(from.toString(), from.toString(), "1");
        }
    }

    private void matrix(Map<?, ?> matrix) {
        boolean rows = matrix.get("orientation").equals("rows");
        List<?> entries = (List<?>) matrix.get("entries");
        for (int i = 0; i < chain.size(); i++) {
            for (int j = 0; j < chain.size(); j++) {
                Object value = ((List<?>) entries.get(i)).get(j);
                entry(chain.states().get(rows ? i : j), chain.states().get(rows ? j : i), value);
            }
        }
    }

    private void entry(String from, String to, Object written) {
        if (chain.states().contains(name(to))) {
            Rational value = chain.matrix().at(place(to), place(from));
            number(written.toString()).ifPresent(number ->
                    check(number.equals(value), from + " to " + to + ": " + value + " for " + written));
        }
    }

    private int place(String state) {
        return chain.states().indexOf(name(state));
    }

    private static String name(Object written) {
        return Normalizer.normalize(written.toString().strip(), Normalizer.Form.NFC);
    }

    private void check(boolean holds, String difference) {
        compared++;
        if (!holds) {
            differences.add(difference);
        }
    }

    private static Optional<Rational> number(String text) {
        String[] parts = text.strip().split("/");
        try {
            if (parts.length == 2) {
                return Optional.of(new Rational(new BigInteger(parts[0].strip()), new BigInteger(parts[1].strip())));
            }
            boolean percent = text.strip().endsWith("%");
            BigDecimal number = new BigDecimal(percent ? text.strip().replace("%", "").strip() : text.strip());
            return Optional.of(Rational.of(percent ? number.movePointLeft(2) : number));
        } catch (NumberFormatException expression) {
            return Optional.empty();
        }
    }
}
