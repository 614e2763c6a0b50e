package org.pofk.input;

import java.util.ArrayDeque;
import java.util.Deque;
import java.util.Optional;
import org.pofk.text.Faults;
import org.pofk.text.Position;
import org.pofk.text.RefusedException;
import org.snakeyaml.engine.v2.api.LoadSettings;
import org.snakeyaml.engine.v2.common.Anchor;
import org.snakeyaml.engine.v2.events.AliasEvent;
import org.snakeyaml.engine.v2.events.CollectionStartEvent;
import org.snakeyaml.engine.v2.events.Event;
import org.snakeyaml.engine.v2.events.NodeEvent;
import org.snakeyaml.engine.v2.events.ScalarEvent;
import org.snakeyaml.engine.v2.exceptions.Mark;
import org.snakeyaml.engine.v2.exceptions.YamlEngineException;
import org.snakeyaml.engine.v2.parser.ParserImpl;
import org.snakeyaml.engine.v2.scanner.StreamReader;

/**
 * Composes the one document of a YAML 1.2 or JSON text into {@link Node}s. Anchors, aliases, tags, merge keys, keys
 * given twice, more than fifty levels and scalars above 64 KiB are faults. Linear in the length of the text: the
 * scanner is handed the whole text at once, since it copies what it has not consumed each time it refills its buffer.
 */
final class YamlComposer {
    private static final int DEEPEST = 50;
    private static final int LONGEST_SCALAR = 64 << 10;

    private final Source source;
    private final Faults faults;
    private final Deque<OpenNode> open = new ArrayDeque<>();
    private Optional<Node> root = Optional.empty();

    private YamlComposer(Source source, Faults faults) {
        this.source = source;
        this.faults = faults;
    }

    /**
     * The document of {@code source}. Faults after which the rest still makes sense (a tag, a key given twice) are
     * added to {@code faults}; others end the reading.
     */
    static Node compose(Source source, Faults faults) throws RefusedException {
        YamlComposer composer = new YamlComposer(source, faults);
        composer.readEvents();
        if (composer.root.isEmpty()) {
            faults.add(Position.ofWhole(source.name()), "empty-file", "the file holds nothing");
            faults.refuseIfAny();
        }
        return composer.root.orElseThrow();
    }

    private void readEvents() throws RefusedException {
        LoadSettings settings = LoadSettings.builder().setUseMarks(true).setBufferSize(source.text().length() + 1)
                .setCodePointLimit(source.text().length() + 1).build();
        ControlCharacters.refuse(source, faults);
        Optional<Event> last = Optional.empty();
        try {
            ParserImpl parser = new ParserImpl(settings, new StreamReader(settings, source.text()));
            while (parser.hasNext()) {
                last = Optional.of(parser.next());
                take(last.get());
            }
        } catch (YamlEngineException syntax) {
            YamlSyntax.explain(syntax, last, Optional.ofNullable(open.peek()).map(OpenNode::position), source, faults);
            faults.refuseIfAny();
        }
    }

    private void take(Event event) throws RefusedException {
        switch (event.getEventId()) {
            case Scalar -> takeScalar((ScalarEvent) event);
            case SequenceStart -> begin(OpenNode.sequence(place(event)), (CollectionStartEvent) event);
            case MappingStart -> begin(OpenNode.mapping(place(event)), (CollectionStartEvent) event);
            case SequenceEnd, MappingEnd -> add(open.pop().close());
            case Alias -> refuseAlias((AliasEvent) event);
            case DocumentStart -> refuseSecondDocument(event);
            default -> { }
        }
    }

    private void takeScalar(ScalarEvent event) throws RefusedException {
        Position place = place(event);
        if (event.getValue().length() > LONGEST_SCALAR) {
            stop(place, "scalar-too-long", "this value is longer than 64 KiB, the most that is read as one value");
        }
        refuseDecoration(event, event.getTag());
        add(new Node.Scalar(place, event.getValue(), event.isPlain() ? Node.Style.PLAIN : Node.Style.QUOTED,
                isVerbatim(event) ? Optional.empty() : Optional.of(written(event))));
    }

    /** How the value stands in the source. */
    private static String written(ScalarEvent event) {
        Mark start = event.getStartMark().orElseThrow();
        int length = event.getEndMark().orElseThrow().getIndex() - start.getIndex();
        return new String(start.getBuffer(), start.getPointer(), length);
    }

    /** The text stands in the source as it is: on one line, without escapes. */
    private static boolean isVerbatim(ScalarEvent event) {
        Mark start = event.getStartMark().orElseThrow();
        Mark end = event.getEndMark().orElseThrow();
        int length = event.getValue().codePointCount(0, event.getValue().length()) + (event.isPlain() ? 0 : 2);
        return !event.isLiteral() && !event.isFolded() && start.getLine() == end.getLine()
                && end.getColumn() - start.getColumn() == length;
    }

    private void begin(OpenNode node, CollectionStartEvent event) throws RefusedException {
        refuseDecoration(event, event.getTag());
        if (open.size() == DEEPEST) {
            stop(place(event), "too-deep", "values are nested more than 50 levels deep here, the most that is read");
        }
        if (!open.isEmpty() && open.peek().awaitsKey()) {
            stop(place(event), "key-not-text", "a key must be a name, not a list or a mapping");
        }
        open.push(node);
    }

    private void add(Node node) {
        if (open.isEmpty()) {
            root = Optional.of(node);
        } else {
            open.peek().add(node, faults);
        }
    }

    private void refuseDecoration(NodeEvent event, Optional<String> tag) {
        Optional<Anchor> anchor = event.getAnchor();
        if (anchor.isPresent()) {
            faults.add(place(event), "anchor", "the anchor '&" + Words.shortened(anchor.get().getValue())
                    + "' isn't accepted; write the value out wherever it is needed");
        }
        if (tag.isPresent()) {
            faults.add(place(event), "tag", "the tag '" + Words.shortened(tag.get())
                    + "' isn't accepted; write the value without a tag");
        }
    }

    private void refuseAlias(AliasEvent event) throws RefusedException {
        stop(place(event), "alias", "the alias '*" + Words.shortened(event.getAlias().getValue())
                + "' isn't accepted; write the value out");
    }

    private void refuseSecondDocument(Event event) throws RefusedException {
        if (root.isPresent()) {
            stop(place(event), "second-document", "a second document begins here; a file holds one");
        }
    }

    private void stop(Position position, String code, String message) throws RefusedException {
        faults.add(position, code, message);
        faults.refuseIfAny();
    }

    private Position place(Event event) {
        return YamlSyntax.place(source, event.getStartMark().orElseThrow());
    }
}
