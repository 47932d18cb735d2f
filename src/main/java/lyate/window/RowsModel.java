package lyate.window;

import java.util.List;
import javax.swing.table.AbstractTableModel;

/** A table of rows under fixed heads. Cells keep their values, so that sorting is by value; {@link #text} writes them. */
abstract class RowsModel<R> extends AbstractTableModel {

    /**
     * Head of a column.
     *
     * @param title   what stands above it
     * @param kind    of its values
     * @param letters width in letters of the font in use; negative for a column whose text ends at the right
     */
    record Head(String title, Class<?> kind, int letters) {

        Head(String title, int letters) {
            this(title, String.class, letters);
        }
    }

    private final transient List<Head> heads;
    private transient List<R> rows = List.of();

    RowsModel(List<Head> heads) {
        this.heads = List.copyOf(heads);
    }

    final void showRows(List<R> others) {
        rows = List.copyOf(others);
        fireTableDataChanged();
    }

    final R row(int row) {
        return rows.get(row);
    }

    final Head head(int column) {
        return heads.get(column);
    }

    /** A value as it is written. */
    String text(int column, Object value) {
        return String.valueOf(value);
    }

    /** Whether a row is the one that matters most. */
    boolean isStressed(int row) {
        return false;
    }

    @Override
    public final int getRowCount() {
        return rows.size();
    }

    @Override
    public final int getColumnCount() {
        return heads.size();
    }

    @Override
    public final String getColumnName(int column) {
        return head(column).title();
    }

    @Override
    public final Class<?> getColumnClass(int column) {
        return head(column).kind();
    }
}
