package lyate.window;

import java.awt.datatransfer.StringSelection;
import java.awt.datatransfer.Transferable;
import java.util.function.Supplier;
import javax.swing.JComponent;
import javax.swing.TransferHandler;

/** Lets a text be copied or dragged out of a component. */
final class TextCopy extends TransferHandler {

    private final transient Supplier<String> text;

    TextCopy(Supplier<String> text) {
        this.text = text;
    }

    @Override
    public int getSourceActions(JComponent component) {
        return COPY;
    }

    @Override
    protected Transferable createTransferable(JComponent component) {
        return new StringSelection(text.get());
    }
}
