package lyate.window;

import java.util.List;
import javax.swing.table.AbstractTableModel;
import lyate.review.Transfer;

/** Every donor against the base, a row each; cells keep their numbers so that sorting is by value. */
final class TransfersModel extends AbstractTableModel {

    /** Columns of the table, in order. */
    enum Column {
        SITE("Site", String.class), DONOR("Donor", String.class), PKA("pKa", Double.class), SIGMA("\u00b1", Double.class),
        MEDIUM("Scale", String.class), BASIS("Value is", String.class), LOG_K("log K", Double.class), K("K", Double.class),
        DELTA_G("\u0394G / kJ mol\u207b\u00b9", Double.class), TAKEN("Taken", Double.class), DECIDED("Which scale decides, and why", String.class);

        private final String title;
        private final Class<?> kind;

        Column(String title, Class<?> kind) {
            this.title = title;
            this.kind = kind;
        }
    }

    private Shown shown;

    void show(Shown next) {
        shown = next;
        fireTableDataChanged();
    }

    Transfer row(int row) {
        return shown.review().transfers().get(row);
    }

    boolean isIntended(int row) {
        return row(row).donor().equals(shown.review().intendedSite());
    }

    @Override
    public int getRowCount() {
        return shown == null ? 0 : shown.review().transfers().size();
    }

    @Override
    public int getColumnCount() {
        return Column.values().length;
    }

    @Override
    public String getColumnName(int column) {
        return Column.values()[column].title;
    }

    @Override
    public Class<?> getColumnClass(int column) {
        return Column.values()[column].kind;
    }

    @Override
    public Object getValueAt(int row, int column) {
        Transfer transfer = row(row);
        return switch (Column.values()[column]) {
            case SITE -> shown.tags().letterOf(transfer);
            case DONOR -> transfer.donor() + (isIntended(row) ? " (intended)" : "");
            case PKA -> transfer.acidity().pKa();
            case SIGMA -> transfer.acidity().sigma();
            case MEDIUM -> Words.medium(transfer.acidity().medium());
            case BASIS -> transfer.acidity().basis().word();
            case LOG_K -> transfer.logK();
            case K -> transfer.equilibriumConstant();
            case DELTA_G -> transfer.deltaG();
            case TAKEN -> transfer.percentTaken();
            case DECIDED -> transfer.decidedBy();
        };
    }

    /** A cell as it is written. */
    String text(int column, Object value) {
        if (!(value instanceof Double number)) {
            return String.valueOf(value);
        }
        return switch (Column.values()[column]) {
            case LOG_K, DELTA_G -> Words.signed(number);
            case K -> Words.equilibriumConstant(Math.log10(number));
            case TAKEN -> Words.percent(number);
            default -> Words.oneDecimal(number);
        };
    }

    /** Column titles, for tests and copies. */
    static List<String> titles() {
        return List.of(Column.values()).stream().map(column -> column.title).toList();
    }
}
