package lyate.window;

import java.awt.datatransfer.DataFlavor;
import java.awt.datatransfer.StringSelection;
import java.awt.datatransfer.Transferable;
import java.awt.datatransfer.UnsupportedFlavorException;
import java.io.File;
import java.io.IOException;
import java.nio.file.Path;
import java.util.List;
import java.util.function.Consumer;
import javax.swing.JComponent;
import javax.swing.TransferHandler;
import javax.swing.text.JTextComponent;

/** Takes a dropped or pasted file; in a text field, text works as in any other. */
final class StructureDrop extends TransferHandler {

    private final transient Consumer<Path> onFile;

    StructureDrop(Consumer<Path> onFile) {
        this.onFile = onFile;
    }

    @Override
    public boolean canImport(TransferSupport support) {
        return support.isDataFlavorSupported(DataFlavor.javaFileListFlavor)
                || support.getComponent() instanceof JTextComponent && support.isDataFlavorSupported(DataFlavor.stringFlavor);
    }

    @Override
    public boolean importData(TransferSupport support) {
        try {
            if (support.isDataFlavorSupported(DataFlavor.javaFileListFlavor)) {
                List<?> files = (List<?>) support.getTransferable().getTransferData(DataFlavor.javaFileListFlavor);
                if (files.isEmpty() || !(files.get(0) instanceof File file)) {
                    return false;
                }
                onFile.accept(file.toPath());
                return true;
            }
            if (support.getComponent() instanceof JTextComponent field) {
                field.replaceSelection((String) support.getTransferable().getTransferData(DataFlavor.stringFlavor));
                return true;
            }
            return false;
        } catch (UnsupportedFlavorException | IOException e) {
            return false;
        }
    }

    @Override
    public int getSourceActions(JComponent component) {
        return COPY_OR_MOVE;
    }

    @Override
    protected Transferable createTransferable(JComponent component) {
        boolean selection = component instanceof JTextComponent field && field.getSelectedText() != null;
        return selection ? new StringSelection(((JTextComponent) component).getSelectedText()) : null;
    }

    @Override
    protected void exportDone(JComponent source, Transferable data, int action) {
        if (action == MOVE && source instanceof JTextComponent field) {
            field.replaceSelection("");
        }
    }
}
