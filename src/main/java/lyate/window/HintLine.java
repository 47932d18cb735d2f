package lyate.window;

import java.util.OptionalInt;
import javax.swing.text.JTextComponent;

/** What is said below a field: how it was understood, or what is wrong and at which letter. */
final class HintLine {

    private final JTextComponent field;
    private String text = "";
    private boolean problem;
    private OptionalInt offset = OptionalInt.empty();

    HintLine(JTextComponent field) {
        this.field = field;
    }

    void hint(String words) {
        say(words, false, OptionalInt.empty());
    }

    void problem(String message) {
        CaretMessage caret = CaretMessage.of(message);
        say(caret.sentence(), true, caret.offset());
    }

    private void say(String words, boolean wrong, OptionalInt at) {
        text = words;
        problem = wrong;
        offset = at;
        field.putClientProperty("JComponent.outline", wrong ? "error" : null);
        field.getAccessibleContext().setAccessibleDescription(wrong ? "Problem: " + words : words);
    }

    String text() {
        return text;
    }

    boolean isProblem() {
        return problem;
    }

    /** Letter the problem is at, where it is known. */
    OptionalInt offset() {
        return offset;
    }
}
