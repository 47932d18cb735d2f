package lyate.window;

import java.awt.BorderLayout;
import java.awt.Component;
import java.awt.Font;
import java.util.List;
import java.util.function.Consumer;
import javax.swing.BorderFactory;
import javax.swing.JPanel;
import javax.swing.JScrollPane;
import javax.swing.JTable;
import javax.swing.SwingConstants;
import javax.swing.table.DefaultTableCellRenderer;
import javax.swing.table.TableColumn;

/** The transfers: sortable, copyable; a selected row marks its atoms, Enter makes its site the intended one. */
final class TransfersTable extends JPanel {

    private final TransfersModel model = new TransfersModel();
    private final JTable table = new JTable(model);

    TransfersTable(Theme theme, Consumer<List<Integer>> highlight, Consumer<String> onSite) {
        super(new BorderLayout());
        table.setAutoCreateRowSorter(true);
        table.setFillsViewportHeight(true);
        table.setDefaultRenderer(Double.class, new Cell(SwingConstants.RIGHT));
        table.setDefaultRenderer(String.class, new Cell(SwingConstants.LEFT));
        table.getAccessibleContext().setAccessibleName("Transfers");
        table.getSelectionModel().addListSelectionListener(event -> highlight.accept(
                table.getSelectedRow() < 0 ? List.of() : model.row(table.convertRowIndexToModel(table.getSelectedRow())).atoms()));
        Keys.bind(table, "ENTER", () -> chooseSelected(onSite));
        JScrollPane scroll = new JScrollPane(table);
        scroll.setBorder(BorderFactory.createEmptyBorder());
        add(scroll);
        sizeColumns();
        theme.onChange(this::sizeColumns);
    }

    void show(Shown shown) {
        model.show(shown);
    }

    private void chooseSelected(Consumer<String> onSite) {
        if (table.getSelectedRow() >= 0) {
            var transfer = model.row(table.convertRowIndexToModel(table.getSelectedRow()));
            if (!transfer.atoms().isEmpty()) {
                onSite.accept(transfer.donor());
            }
        }
    }

    /** Widths in letters of the font in use, so that they follow the scale. */
    private void sizeColumns() {
        int[] letters = {5, 18, 6, 5, 8, 13, 7, 9, 14, 11, 60};
        int em = table.getFontMetrics(table.getFont()).charWidth('n');
        for (int i = 0; i < letters.length; i++) {
            TableColumn column = table.getColumnModel().getColumn(i);
            column.setPreferredWidth((letters[i] + 2) * em);
            if (i < letters.length - 1) {
                column.setMaxWidth((letters[i] + 2) * em * 2);
            }
        }
    }

    private final class Cell extends DefaultTableCellRenderer {
        private final int gap = getFont().getSize() / 2;

        Cell(int alignment) {
            setHorizontalAlignment(alignment);
        }

        @Override
        public Component getTableCellRendererComponent(JTable owner, Object value, boolean selected, boolean focused, int row, int column) {
            int modelColumn = owner.convertColumnIndexToModel(column);
            super.getTableCellRendererComponent(owner, model.text(modelColumn, value), selected, focused, row, column);
            setBorder(BorderFactory.createEmptyBorder(0, gap, 0, gap));
            setFont(owner.getFont().deriveFont(model.isIntended(owner.convertRowIndexToModel(row)) ? Font.BOLD : Font.PLAIN));
            setToolTipText(modelColumn == TransfersModel.Column.DECIDED.ordinal() ? String.valueOf(value) : null);
            return this;
        }
    }
}
