package org.pofk.input;

import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;

/** The kinds of step that a claims file knows, what each is about, and what it may say besides. */
enum ClaimKind implements Keyword {
    START("start", Subject.ALL, "within"),
    MATRIX("matrix", Subject.ALL, "within"),
    CHARACTERISTIC_POLYNOMIAL("characteristic polynomial", Subject.ALL),
    MINIMAL_POLYNOMIAL("minimal polynomial", Subject.ALL),
    TRANSFORM("transform", Subject.ONE),
    TRANSFORM_OVER_Z("transform over z", Subject.ONE),
    EXPANSION("expansion", Subject.ONE),
    POLES("poles", Subject.ONE, "within"),
    RESIDUES("residues", Subject.ONE, "within"),
    FORMULA("formula", Subject.ONE_OR_ALL, "for", "within", "safe side"),
    PAIR("pair", Subject.ONE, "radius", "angle", "amplitude", "phase", "within"),
    LONG_RUN("long run", Subject.ONE_OR_ALL, "within", "safe side"),
    EIGENVECTOR("eigenvector", Subject.ALL, "at"),
    VALUE("value", Subject.ONE, "at", "given", "within", "safe side"),
    BOUND("bound", Subject.ONE, "at least", "at most", "for"),
    SETTLING_STEP("settling step", Subject.ONE, "within"),
    MEAN_PASSAGE("mean passage", Subject.ALL, "into", "from", "given", "within", "safe side"),
    SUM("sum", Subject.ONE, "from", "to", "within", "safe side"),
    MEAN("mean", Subject.ONE, "from", "to", "within", "safe side");

    /** What a step can be about. */
    enum Subject { ONE, ALL, ONE_OR_ALL }

    /** What may stand in a step of any kind. */
    private static final List<String> COMMON = List.of("carried", "where", "note");
    static final List<String> CONTENT = List.of("is", "is-latex", "are");

    private final String word;
    private final Subject subject;
    private final List<String> own;

    ClaimKind(String word, Subject subject, String... own) {
        this.word = word;
        this.subject = subject;
        this.own = List.of(own);
    }

    static Optional<ClaimKind> of(String word) {
        return Arrays.stream(values()).filter(kind -> kind.word.equals(word)).findFirst();
    }

    static List<String> words() {
        return Arrays.stream(values()).map(ClaimKind::word).toList();
    }

    /** Every key that may stand in some step. */
    static List<String> keys() {
        return Stream.of(words().stream(), CONTENT.stream(), COMMON.stream(),
                Arrays.stream(values()).flatMap(kind -> kind.own.stream())).flatMap(keys -> keys).distinct().toList();
    }

    /** The kinds that know a key, as a fault names them. */
    static List<String> knowing(String key) {
        return Arrays.stream(values()).filter(kind -> kind.knows(key)).map(kind -> "'" + kind.word + "'").toList();
    }

    @Override
    public String word() {
        return word;
    }

    Subject subject() {
        return subject;
    }

    /** Whether it states what it states under {@code is}, {@code is-latex} or {@code are}. */
    boolean hasContent() {
        return this != PAIR && this != BOUND;
    }

    boolean knows(String key) {
        return key.equals(word) || own.contains(key) || COMMON.contains(key) || hasContent() && CONTENT.contains(key);
    }
}
