package lyate.window;

import java.util.Arrays;
import lyate.report.Words;
import lyate.review.Transfer;

/** Every donor against the base, a row each. */
final class TransfersModel extends RowsModel<Transfer> {

    /** Columns of the table, in order. */
    enum Column {
        SITE("Site", String.class, 5), DONOR("Donor", String.class, 18), PKA("pKa", Double.class, -6), SIGMA("\u00b1", Double.class, -5),
        MEDIUM("Scale", String.class, 8), BASIS("Value is", String.class, 13), LOG_K("log K", Double.class, -7), K("K", Double.class, -9),
        DELTA_G("\u0394G / kJ mol\u207b\u00b9", Double.class, -14), TAKEN("Taken", Double.class, -11), DECIDED("Which scale decides, and why", String.class, 60);

        private final Head head;

        Column(String title, Class<?> kind, int letters) {
            this.head = new Head(title, kind, letters);
        }
    }

    private Shown shown;

    TransfersModel() {
        super(Arrays.stream(Column.values()).map(column -> column.head).toList());
    }

    void show(Shown next) {
        shown = next;
        showRows(next.review().transfers());
    }

    @Override
    boolean isStressed(int row) {
        return row(row).donor().equals(shown.review().intendedSite());
    }

    @Override
    public Object getValueAt(int row, int column) {
        Transfer transfer = row(row);
        return switch (Column.values()[column]) {
            case SITE -> shown.tags().letterOf(transfer);
            case DONOR -> transfer.donor() + (isStressed(row) ? " (intended)" : "");
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

    @Override
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
}
