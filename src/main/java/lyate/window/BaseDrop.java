package lyate.window;

import java.awt.datatransfer.DataFlavor;
import java.awt.datatransfer.UnsupportedFlavorException;
import java.io.IOException;
import java.util.function.Consumer;
import javax.swing.TransferHandler;
import lyate.stock.Base;
import lyate.stock.UnknownNameException;

/** Takes a base dropped by its name. */
final class BaseDrop extends TransferHandler {

    private final transient Engine engine;
    private final transient Consumer<Base> onBase;

    BaseDrop(Engine engine, Consumer<Base> onBase) {
        this.engine = engine;
        this.onBase = onBase;
    }

    @Override
    public boolean canImport(TransferSupport support) {
        return support.isDataFlavorSupported(DataFlavor.stringFlavor);
    }

    @Override
    public boolean importData(TransferSupport support) {
        try {
            onBase.accept(engine.stockroom().base((String) support.getTransferable().getTransferData(DataFlavor.stringFlavor)));
            return true;
        } catch (UnsupportedFlavorException | IOException | UnknownNameException e) {
            return false;
        }
    }
}
