package lyate.window;

import java.awt.BorderLayout;
import java.util.List;
import java.util.function.Consumer;
import javax.swing.JPanel;
import lyate.review.Transfer;

/** The transfers: sortable, copyable; a selected row marks its atoms, Enter makes its site the intended one. */
final class TransfersTable extends JPanel {

    private final TransfersModel model = new TransfersModel();
    private final RowsTable table;

    TransfersTable(Theme theme, Consumer<List<Integer>> highlight, Consumer<String> onSite) {
        super(new BorderLayout());
        table = new RowsTable(model, "Transfers", theme);
        table.getSelectionModel().addListSelectionListener(event -> highlight.accept(
                table.selectedModelRow() < 0 ? List.of() : model.row(table.selectedModelRow()).atoms()));
        Keys.bind(table, "ENTER", () -> chooseSelected(onSite));
        add(table.scrolled());
    }

    void show(Shown shown) {
        model.show(shown);
    }

    /** The rows. */
    RowsTable table() {
        return table;
    }

    private void chooseSelected(Consumer<String> onSite) {
        if (table.selectedModelRow() >= 0) {
            Transfer transfer = model.row(table.selectedModelRow());
            if (!transfer.atoms().isEmpty()) {
                onSite.accept(transfer.donor());
            }
        }
    }
}
