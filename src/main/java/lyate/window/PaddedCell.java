package lyate.window;

import java.awt.Component;
import javax.swing.BorderFactory;
import javax.swing.JTable;
import javax.swing.table.DefaultTableCellRenderer;

/** A table cell with some air beside its text; what does not fit is shown as a tooltip. */
final class PaddedCell extends DefaultTableCellRenderer {

    PaddedCell(int alignment) {
        setHorizontalAlignment(alignment);
    }

    /** Uses it for every column of a table; widths in letters, negative for columns of numbers. */
    static void dress(JTable table, int... letters) {
        int em = table.getFontMetrics(table.getFont()).charWidth('n');
        for (int i = 0; i < letters.length; i++) {
            table.getColumnModel().getColumn(i).setPreferredWidth(Math.abs(letters[i]) * em);
            table.getColumnModel().getColumn(i).setCellRenderer(new PaddedCell(letters[i] < 0 ? TRAILING : LEADING));
        }
    }

    @Override
    public Component getTableCellRendererComponent(JTable table, Object value, boolean selected, boolean focused, int row, int column) {
        super.getTableCellRendererComponent(table, value, selected, focused, row, column);
        int gap = getFont().getSize() / 2;
        setBorder(BorderFactory.createEmptyBorder(0, gap, 0, gap));
        boolean cut = getPreferredSize().width > table.getColumnModel().getColumn(column).getWidth();
        setToolTipText(cut ? String.valueOf(value) : null);
        return this;
    }
}
