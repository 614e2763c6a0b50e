package org.pofk.input;

import java.nio.ByteBuffer;
import java.nio.CharBuffer;
import java.nio.charset.CharsetDecoder;
import java.nio.charset.CodingErrorAction;
import java.nio.charset.StandardCharsets;
import java.util.List;
import org.pofk.text.Fault;
import org.pofk.text.Position;
import org.pofk.text.RefusedException;

/** Decodes UTF-8 without repairing anything; a byte order mark at the start is dropped. Linear time. */
final class StrictUtf8 {
    private static final char BYTE_ORDER_MARK = '\uFEFF';

    private StrictUtf8() {
    }

    /** The text of {@code bytes}; refused at the first byte that isn't UTF-8, or that is no printable character. */
    static String decode(byte[] bytes, String name) throws RefusedException {
        if (startsAsUtf16(bytes)) {
            throw refusal(new Position(name, 1, 1), "the file is in UTF-16; save it as UTF-8");
        }
        CharsetDecoder decoder = StandardCharsets.UTF_8.newDecoder().onMalformedInput(CodingErrorAction.REPORT)
                .onUnmappableCharacter(CodingErrorAction.REPORT);
        ByteBuffer in = ByteBuffer.wrap(bytes);
        CharBuffer out = CharBuffer.allocate(bytes.length);
        boolean malformed = decoder.decode(in, out, true).isError();
        String text = withoutByteOrderMark(out.flip().toString());
        if (malformed) {
            throw refusal(Lines.after(name, text), String.format(
                    "the byte 0x%02X isn't UTF-8 here; save the file as UTF-8", bytes[in.position()] & 0xFF));
        }
        return text;
    }

    private static boolean startsAsUtf16(byte[] bytes) {
        if (bytes.length < 2) {
            return false;
        }
        int first = (bytes[0] & 0xFF) << 8 | bytes[1] & 0xFF;
        return first == 0xFEFF || first == 0xFFFE;
    }

    private static String withoutByteOrderMark(String text) {
        return !text.isEmpty() && text.charAt(0) == BYTE_ORDER_MARK ? text.substring(1) : text;
    }

    private static RefusedException refusal(Position position, String message) {
        return new RefusedException(List.of(new Fault(position, "wrong-encoding", message)));
    }
}
