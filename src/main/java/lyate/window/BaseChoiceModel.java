package lyate.window;

import java.util.Arrays;
import java.util.List;
import lyate.report.Words;
import lyate.review.RankedBase;
import lyate.review.Verdict;
import lyate.stock.Base;

/** The stockroom ranked for the step, a base a row. */
final class BaseChoiceModel extends RowsModel<RankedBase> {

    /** Columns, in order. */
    enum Column {
        RANK("Rank", Integer.class, -4), BASE("Base", String.class, 24), VERDICT("Verdict", Verdict.class, 14), PROBABILITY("Probability", Double.class, -10),
        LOG_K("log K", Double.class, -8), AGAINST("Stops / cautions", String.class, 17), WHY("Why", String.class, 90);

        private final Head head;

        Column(String title, Class<?> kind, int letters) {
            this.head = new Head(title, kind, letters);
        }
    }

    private String chosen = "";

    BaseChoiceModel() {
        super(Arrays.stream(Column.values()).map(column -> column.head).toList());
    }

    void show(List<RankedBase> ranked) {
        showRows(ranked);
    }

    /** Marks the base of the step; returns its row, or -1. */
    int choose(Base base) {
        chosen = base.id();
        for (int row = 0; row < getRowCount(); row++) {
            if (isStressed(row)) {
                return row;
            }
        }
        return -1;
    }

    @Override
    boolean isStressed(int row) {
        return row(row).base().id().equals(chosen);
    }

    @Override
    public Object getValueAt(int row, int column) {
        RankedBase choice = row(row);
        return switch (Column.values()[column]) {
            case RANK -> row + 1;
            case BASE -> choice.base().name().length() > Column.BASE.head.letters() ? choice.base().shortName() : choice.base().name();
            case VERDICT -> choice.review().verdict();
            case PROBABILITY -> choice.review().probability();
            case LOG_K -> choice.review().logK();
            case AGAINST -> choice.stops() + " / " + choice.cautions();
            case WHY -> choice.why();
        };
    }

    @Override
    String text(int column, Object value) {
        return switch (Column.values()[column]) {
            case VERDICT -> Words.verdict((Verdict) value);
            case PROBABILITY -> Words.probability((Double) value);
            case LOG_K -> Words.signed((Double) value);
            default -> String.valueOf(value);
        };
    }
}
