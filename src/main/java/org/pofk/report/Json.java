package org.pofk.report;

import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonGenerator;
import com.fasterxml.jackson.core.util.DefaultIndenter;
import com.fasterxml.jackson.core.util.DefaultPrettyPrinter;
import com.fasterxml.jackson.core.util.Separators;
import java.io.IOException;
import java.io.StringWriter;
import java.io.UncheckedIOException;
import java.util.List;
import java.util.Optional;
import java.util.function.Consumer;

/** Writes a JSON text in memory, the same characters for the same content on every machine. */
final class Json {
    private static final DefaultIndenter INDENTER = new DefaultIndenter("  ", "\n");

    private final JsonGenerator generator;

    private Json(JsonGenerator generator) {
        this.generator = generator;
    }

    /** A text whose outermost value is an object; ends with a line feed. */
    static String ofObject(Consumer<Json> fields) {
        return written(printer(), fields);
    }

    /** The same with every element of a list on a line of its own. */
    static String ofObjectOverLines(Consumer<Json> fields) {
        return written(printer().withArrayIndenter(INDENTER), fields);
    }

    private static DefaultPrettyPrinter printer() {
        return new DefaultPrettyPrinter(Separators.createDefaultInstance()
                .withObjectFieldValueSpacing(Separators.Spacing.AFTER)).withObjectIndenter(INDENTER);
    }

    private static String written(DefaultPrettyPrinter printer, Consumer<Json> fields) {
        StringWriter text = new StringWriter();
        try (JsonGenerator generator = new JsonFactory().createGenerator(text)) {
            generator.setPrettyPrinter(printer);
            Json json = new Json(generator);
            json.object(() -> fields.accept(json));
        } catch (IOException impossible) {
            throw new UncheckedIOException("memory doesn't fail to be written", impossible);
        }
        return text.append('\n').toString();
    }

    /** One call on the generator; nothing in memory fails. */
    private interface Call {
        void run() throws IOException;
    }

    private static void write(Call call) {
        try {
            call.run();
        } catch (IOException impossible) {
            throw new UncheckedIOException("memory doesn't fail to be written", impossible);
        }
    }

    void name(String field) {
        write(() -> generator.writeFieldName(field));
    }

    void object(Runnable fields) {
        write(generator::writeStartObject);
        fields.run();
        write(generator::writeEndObject);
    }

    void object(String field, Runnable fields) {
        name(field);
        object(fields);
    }

    <T> void list(List<T> elements, Consumer<T> element) {
        write(generator::writeStartArray);
        elements.forEach(element);
        write(generator::writeEndArray);
    }

    <T> void list(String field, List<T> elements, Consumer<T> element) {
        name(field);
        list(elements, element);
    }

    void texts(String field, List<String> texts) {
        list(field, texts, this::text);
    }

    void text(String text) {
        write(() -> generator.writeString(text));
    }

    void text(String field, String text) {
        name(field);
        text(text);
    }

    /** Null where there is none. */
    void text(String field, Optional<String> text) {
        name(field);
        text.ifPresentOrElse(this::text, this::nothing);
    }

    void count(String field, long count) {
        name(field);
        count(count);
    }

    void count(long count) {
        write(() -> generator.writeNumber(count));
    }

    void truth(String field, boolean truth) {
        name(field);
        write(() -> generator.writeBoolean(truth));
    }

    void nothing() {
        write(generator::writeNull);
    }

    /** The value where there is one, null where there isn't. */
    <T> void optional(String field, Optional<T> value, Consumer<T> written) {
        name(field);
        value.ifPresentOrElse(written, this::nothing);
    }
}
