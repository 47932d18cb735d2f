package lyate.window;

import java.util.List;
import javax.swing.table.AbstractTableModel;

/** A table of rows under fixed titles; what stands in a cell is left to the table. */
abstract class RowsModel<R> extends AbstractTableModel {

    private final transient List<String> titles;
    private transient List<R> rows = List.of();

    RowsModel(String... titles) {
        this.titles = List.of(titles);
    }

    final void showRows(List<R> others) {
        rows = List.copyOf(others);
        fireTableDataChanged();
    }

    final R row(int row) {
        return rows.get(row);
    }

    @Override
    public final int getRowCount() {
        return rows.size();
    }

    @Override
    public final int getColumnCount() {
        return titles.size();
    }

    @Override
    public final String getColumnName(int column) {
        return titles.get(column);
    }
}
