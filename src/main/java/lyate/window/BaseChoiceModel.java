package lyate.window;

import java.util.List;
import javax.swing.table.AbstractTableModel;
import lyate.review.RankedBase;
import lyate.review.Verdict;
import lyate.stock.Base;

/** The stockroom ranked for the step. */
final class BaseChoiceModel extends AbstractTableModel {

    /** Columns, in order. */
    enum Column {
        RANK("Rank", Integer.class, 4), BASE("Base", String.class, 22), VERDICT("Verdict", Verdict.class, 14), PROBABILITY("Probability", Double.class, 10),
        LOG_K("log K", Double.class, 8), AGAINST("Stops / cautions", String.class, 13), WHY("Why", String.class, 90);

        private final String title;
        private final Class<?> kind;
        private final int letters;

        Column(String title, Class<?> kind, int letters) {
            this.title = title;
            this.kind = kind;
            this.letters = letters;
        }

        /** Width in letters. */
        int letters() {
            return letters;
        }
    }

    private List<RankedBase> ranked = List.of();

    void show(List<RankedBase> next) {
        ranked = List.copyOf(next);
        fireTableDataChanged();
    }

    Base base(int row) {
        return ranked.get(row).base();
    }

    /** Row of a base, or -1. */
    int rowOf(Base base) {
        for (int row = 0; row < ranked.size(); row++) {
            if (ranked.get(row).base().id().equals(base.id())) {
                return row;
            }
        }
        return -1;
    }

    @Override
    public int getRowCount() {
        return ranked.size();
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
        RankedBase choice = ranked.get(row);
        return switch (Column.values()[column]) {
            case RANK -> row + 1;
            case BASE -> choice.base().name().length() > Column.BASE.letters ? StockWords.shortName(choice.base()) : choice.base().name();
            case VERDICT -> choice.review().verdict();
            case PROBABILITY -> 100 * choice.review().probability();
            case LOG_K -> choice.review().logK();
            case AGAINST -> choice.stops() + " / " + choice.cautions();
            case WHY -> choice.why();
        };
    }
}
