package lyate.window;

import java.awt.datatransfer.DataFlavor;
import java.awt.datatransfer.UnsupportedFlavorException;
import java.io.File;
import java.io.IOException;
import java.nio.file.Files;
import java.util.List;
import javax.swing.JComponent;
import javax.swing.JTextField;
import javax.swing.TransferHandler;

/** Takes a dropped or pasted structure file besides text; copying text works as in any field. */
final class StructureDrop extends TransferHandler {

    /** A structure file larger than this is not one molecule. */
    private static final long MOST_BYTES = 1_000_000;

    private final JTextField field;

    StructureDrop(JTextField field) {
        this.field = field;
    }

    @Override
    public boolean canImport(TransferSupport support) {
        return support.isDataFlavorSupported(DataFlavor.javaFileListFlavor) || support.isDataFlavorSupported(DataFlavor.stringFlavor);
    }

    @Override
    public boolean importData(TransferSupport support) {
        try {
            if (support.isDataFlavorSupported(DataFlavor.javaFileListFlavor)) {
                List<?> files = (List<?>) support.getTransferable().getTransferData(DataFlavor.javaFileListFlavor);
                return !files.isEmpty() && files.get(0) instanceof File file && take(file);
            }
            field.replaceSelection((String) support.getTransferable().getTransferData(DataFlavor.stringFlavor));
            return true;
        } catch (UnsupportedFlavorException | IOException e) {
            return false;
        }
    }

    private boolean take(File file) throws IOException {
        if (file.length() > MOST_BYTES) {
            return false;
        }
        field.setText(Files.readString(file.toPath()));
        return true;
    }

    @Override
    public int getSourceActions(JComponent component) {
        return COPY_OR_MOVE;
    }

    @Override
    protected java.awt.datatransfer.Transferable createTransferable(JComponent component) {
        return field.getSelectedText() == null ? null : new java.awt.datatransfer.StringSelection(field.getSelectedText());
    }

    @Override
    protected void exportDone(JComponent source, java.awt.datatransfer.Transferable data, int action) {
        if (action == MOVE) {
            field.replaceSelection("");
        }
    }
}
