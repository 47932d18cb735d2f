package lyate.window;

import java.awt.datatransfer.StringSelection;
import java.awt.datatransfer.Transferable;
import java.util.function.Supplier;
import javax.swing.JComponent;
import javax.swing.TransferHandler;

/** Lets a base be dragged out of a table, or copied, by its name. */
final class BaseDrag extends TransferHandler {

    private final transient Supplier<String> name;

    BaseDrag(Supplier<String> name) {
        this.name = name;
    }

    @Override
    public int getSourceActions(JComponent component) {
        return COPY;
    }

    @Override
    protected Transferable createTransferable(JComponent component) {
        return new StringSelection(name.get());
    }
}
