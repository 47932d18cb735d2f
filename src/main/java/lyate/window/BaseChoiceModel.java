package lyate.window;

import java.util.Arrays;
import java.util.List;
import java.util.function.Consumer;
import java.util.function.Predicate;
import lyate.report.Words;
import lyate.review.RankedBase;
import lyate.review.Verdict;
import lyate.stock.Base;

/** The stockroom ranked for the step, a base a row. */
final class BaseChoiceModel extends RowsModel<RankedBase> {

    /** Columns, in order. */
    enum Column {
        RANK("Rank", Integer.class, -4), BASE("Base", String.class, 24), VERDICT("Verdict", Verdict.class, 14), PROBABILITY("Probability", Double.class, -10),
        LOG_K("log K", Double.class, -8), AGAINST("Stops / cautions", String.class, 17), LADDER("Ladder", Boolean.class, 6), WHY("Why", String.class, 90);

        private final Head head;

        Column(String title, Class<?> kind, int letters) {
            this.head = new Head(title, kind, letters);
        }
    }

    private final transient Predicate<Base> onLadder;
    private final transient Consumer<Base> toggle;
    private String chosen = "";

    /**
     * @param onLadder whether a base is compared on the ladder
     * @param toggle   puts it there, or takes it away
     */
    BaseChoiceModel(Predicate<Base> onLadder, Consumer<Base> toggle) {
        super(Arrays.stream(Column.values()).map(column -> column.head).toList());
        this.onLadder = onLadder;
        this.toggle = toggle;
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
    public boolean isCellEditable(int row, int column) {
        return column == Column.LADDER.ordinal() && !isStressed(row);
    }

    @Override
    public void setValueAt(Object value, int row, int column) {
        if (!value.equals(getValueAt(row, column))) {
            toggle.accept(row(row).base());
        }
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
            case LADDER -> isStressed(row) || onLadder.test(choice.base());
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
