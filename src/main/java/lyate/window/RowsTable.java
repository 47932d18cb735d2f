package lyate.window;

import java.awt.Component;
import java.awt.Font;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.stream.IntStream;
import javax.swing.BorderFactory;
import javax.swing.JScrollPane;
import javax.swing.JTable;
import javax.swing.SwingConstants;
import javax.swing.table.DefaultTableCellRenderer;
import javax.swing.table.TableColumn;

/** A sortable table of rows: some air beside every text, columns as wide as their heads ask, rows copied as they are written. */
class RowsTable extends JTable {

    private final transient RowsModel<?> rows;

    RowsTable(RowsModel<?> model, String name, Theme theme) {
        super(model);
        this.rows = model;
        setAutoCreateRowSorter(true);
        setFillsViewportHeight(true);
        setDefaultRenderer(Object.class, new Cell());
        for (Class<?> kind : List.of(String.class, Number.class, Double.class)) {
            setDefaultRenderer(kind, new Cell());
        }
        setTransferHandler(new TextCopy(this::selectedText));
        getAccessibleContext().setAccessibleName(name);
        sizeColumns();
        theme.onChange(this::sizeColumns);
    }

    /** The table in a pane that scrolls it. */
    JScrollPane scrolled() {
        JScrollPane scroll = new JScrollPane(this);
        scroll.setBorder(BorderFactory.createEmptyBorder());
        return scroll;
    }

    /** Index of the selected row in the model, or -1. */
    final int selectedModelRow() {
        return getSelectedRow() < 0 ? -1 : convertRowIndexToModel(getSelectedRow());
    }

    /** Widths follow the font in use; the last column takes what is left. */
    final void sizeColumns() {
        int em = getFontMetrics(getFont()).charWidth('n');
        for (int i = 0; i < rows.getColumnCount(); i++) {
            TableColumn column = getColumnModel().getColumn(convertColumnIndexToView(i));
            int width = (Math.abs(rows.head(i).letters()) + 2) * em;
            column.setPreferredWidth(width);
            column.setMaxWidth(i < rows.getColumnCount() - 1 ? 2 * width : Integer.MAX_VALUE);
        }
    }

    /** Heads and selected rows, tab separated, as on screen. */
    String selectedText() {
        int[] columns = IntStream.range(0, getColumnCount()).toArray();
        List<String> lines = new ArrayList<>();
        lines.add(String.join("\t", Arrays.stream(columns).mapToObj(this::getColumnName).toList()));
        for (int row : getSelectedRows()) {
            lines.add(String.join("\t", Arrays.stream(columns).mapToObj(column -> written(row, column)).toList()));
        }
        return String.join("\n", lines) + "\n";
    }

    private String written(int row, int column) {
        return rows.text(convertColumnIndexToModel(column), getValueAt(row, column));
    }

    /** A cell; may be made to show more than text. */
    void decorate(DefaultTableCellRenderer cell, Object value) {
        cell.setIcon(null);
    }

    private final class Cell extends DefaultTableCellRenderer {
        @Override
        public Component getTableCellRendererComponent(JTable table, Object value, boolean selected, boolean focused, int row, int column) {
            super.getTableCellRendererComponent(table, written(row, column), selected, focused, row, column);
            int gap = table.getFont().getSize() / 2;
            setBorder(BorderFactory.createEmptyBorder(0, gap, 0, gap));
            setHorizontalAlignment(rows.head(convertColumnIndexToModel(column)).letters() < 0 ? SwingConstants.TRAILING : SwingConstants.LEADING);
            setFont(table.getFont().deriveFont(rows.isStressed(convertRowIndexToModel(row)) ? Font.BOLD : Font.PLAIN));
            decorate(this, value);
            boolean cut = getPreferredSize().width > getColumnModel().getColumn(column).getWidth();
            setToolTipText(cut ? getText() : null);
            return this;
        }
    }
}
