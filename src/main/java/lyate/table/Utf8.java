package lyate.table;

import java.nio.ByteBuffer;
import java.nio.charset.CharacterCodingException;
import java.nio.charset.StandardCharsets;
import java.util.List;

/** Strict UTF-8 with an optional byte order mark. */
final class Utf8 {

    private Utf8() {}

    static String decode(String file, byte[] bytes) {
        try {
            String text = StandardCharsets.UTF_8.newDecoder().decode(ByteBuffer.wrap(bytes)).toString();
            return text.startsWith("\uFEFF") ? text.substring(1) : text;
        } catch (CharacterCodingException e) {
            throw new TableException(List.of(new TableProblem(file, 0, "", "bytes that are not UTF-8", "UTF-8 text")));
        }
    }
}
