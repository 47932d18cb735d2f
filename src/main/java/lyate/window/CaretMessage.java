package lyate.window;

import java.util.List;
import java.util.OptionalInt;

/**
 * An error message split into what it says and where the caret under the quoted text points.
 *
 * @param sentence the message without quoted text and caret
 * @param offset   0-based column the caret points at
 */
record CaretMessage(String sentence, OptionalInt offset) {

    static CaretMessage of(String message) {
        List<String> lines = message.lines().toList();
        for (int i = 1; i < lines.size(); i++) {
            if (lines.get(i).matches("\\s*\\^+\\s*")) {
                String before = String.join(" ", lines.subList(0, i - 1)).strip();
                String after = String.join(" ", lines.subList(i + 1, lines.size())).strip();
                return new CaretMessage((before + " " + after).strip(), OptionalInt.of(lines.get(i).indexOf('^')));
            }
        }
        return new CaretMessage(String.join(" ", lines), OptionalInt.empty());
    }
}
