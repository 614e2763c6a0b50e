package org.pofk.input;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.pofk.text.Faults;
import org.pofk.text.Position;
import org.pofk.text.RefusedException;

class YamlComposerTest {

    private static Node.Mapping compose(String text) throws RefusedException {
        Faults faults = new Faults();
        Node node = YamlComposer.compose(Source.ofText("m", text), faults);
        faults.refuseIfAny();
        return node.asMapping().orElseThrow();
    }

    private static Node.Scalar scalar(Node.Mapping mapping, int entry) {
        return mapping.entries().get(entry).value().asScalar().orElseThrow();
    }

    @Test
    void columnsCountCodePointsFromOne() throws RefusedException {
        Node.Mapping root = compose("a: 1\n😀é: {b: x}\n");
        Node.Entry second = root.entries().get(1);
        assertEquals(new Position("m", 2, 1), second.key().position());
        assertEquals(new Position("m", 2, 5), second.value().position());
        assertEquals(new Position("m", 2, 9), scalar(second.value().asMapping().orElseThrow(), 0).position());
    }

    @Test
    void scalarsStayTheTextTheyAre() throws RefusedException {
        Node.Mapping root = compose("a: 0.70\nb: 010\nc: no\nd: ~\ne: 1e3\nf: 2026-01-01\n");
        List<String> texts = root.entries().stream().map(entry -> entry.value().asScalar().orElseThrow().text()).toList();
        assertEquals(List.of("0.70", "010", "no", "~", "1e3", "2026-01-01"), texts);
    }

    @Test
    void quotedAndPlainDiffer() throws RefusedException {
        Node.Mapping root = compose("a: '2'\nb: 2\nc: \"2\"\nd: |\n  2\ne:\nf: ''\n");
        assertFalse(scalar(root, 0).isPlain());
        assertTrue(scalar(root, 1).isPlain());
        assertFalse(scalar(root, 2).isPlain());
        assertFalse(scalar(root, 3).isPlain());
        assertTrue(scalar(root, 4).isAbsent());
        assertFalse(scalar(root, 5).isAbsent());
    }

    @Test
    void charactersOfAQuotedTextHavePlacesUnlessItIsRewritten() throws RefusedException {
        Node.Mapping root = compose("a: 'x + y'\nb: x + y\nc: \"x\\u0020+ y\"\n");
        assertEquals(new Position("m", 1, 9), scalar(root, 0).places().at(4));
        assertEquals(new Position("m", 2, 8), scalar(root, 1).places().at(4));
        assertEquals(new Position("m", 3, 4), scalar(root, 2).places().at(4));
    }

    @Test
    void aByteOrderMarkIsNoPartOfTheText() throws RefusedException {
        assertEquals("pofk: 1", StrictUtf8.decode("\uFEFFpofk: 1".getBytes(java.nio.charset.StandardCharsets.UTF_8), "m"));
    }

    @Test
    void jsonMayBeIndentedByTabs() throws RefusedException {
        Node.Mapping root = compose("{\n\t\"a\":\t[1,2],\n\t\"b\": \"x\"\n}\n");
        assertEquals(new Position("m", 2, 2), root.entries().get(0).key().position());
        assertEquals(2, root.entries().get(0).value().asSequence().orElseThrow().items().size());
    }

    @Test
    void linesEndInThreeWays() {
        assertEquals(new Position("m", 4, 2), Lines.after("m", "a\nb\r\nc\rd"));
    }
}
