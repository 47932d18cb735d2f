package lyate.window;

import java.util.List;
import java.util.function.Consumer;
import javax.swing.JTabbedPane;

/** The tables and charts below the pictures. */
final class Drawer extends JTabbedPane {

    private final TransfersTable transfers;

    Drawer(Theme theme, Consumer<List<Integer>> highlight, Consumer<String> onSite) {
        transfers = new TransfersTable(theme, highlight, onSite);
        addTab("Transfers", null, transfers, "every donor against the base");
        getAccessibleContext().setAccessibleName("Drawer");
    }

    void show(Shown shown) {
        transfers.show(shown);
    }
}
