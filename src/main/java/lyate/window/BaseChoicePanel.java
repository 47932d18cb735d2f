package lyate.window;

import java.awt.Component;
import java.awt.Font;
import java.awt.event.MouseAdapter;
import java.awt.event.MouseEvent;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.CancellationException;
import java.util.concurrent.atomic.AtomicInteger;
import java.util.function.BooleanSupplier;
import java.util.function.Consumer;
import javax.swing.BorderFactory;
import javax.swing.JScrollPane;
import javax.swing.JTable;
import javax.swing.SwingConstants;
import javax.swing.SwingUtilities;
import javax.swing.table.DefaultTableCellRenderer;
import lyate.review.BaseChoice;
import lyate.review.RankedBase;
import lyate.review.ReviewException;
import lyate.review.Reviewer;
import lyate.review.Step;
import lyate.review.Verdict;
import lyate.stock.Base;
import lyate.stock.Solvent;

/** The stockroom ranked for the step: Enter or a double click takes a base, L or dragging puts it on the ladder. */
final class BaseChoicePanel extends LazyTab {

    private final Theme theme;
    private final transient Engine engine;
    private final transient Consumer<Base> onBase;
    private final BaseChoiceModel model = new BaseChoiceModel();
    private final JTable table = new JTable(model);

    BaseChoicePanel(Theme theme, Engine engine, Consumer<Base> onBase, Consumer<Base> onCompare) {
        super("base choice");
        this.theme = theme;
        this.engine = engine;
        this.onBase = onBase;
        table.setAutoCreateRowSorter(true);
        table.setFillsViewportHeight(true);
        table.setDragEnabled(true);
        table.setTransferHandler(new BaseDrag(() -> selected().name()));
        table.setDefaultRenderer(Object.class, new Cell());
        table.setDefaultRenderer(String.class, new Cell());
        table.setDefaultRenderer(Double.class, new Cell());
        table.setDefaultRenderer(Integer.class, new Cell());
        table.setDefaultRenderer(Verdict.class, new Cell());
        table.getAccessibleContext().setAccessibleName("Base choice");
        Keys.bind(table, "ENTER", this::take);
        Keys.bind(table, "L", () -> {
            if (table.getSelectedRow() >= 0) {
                onCompare.accept(selected());
            }
        });
        table.addMouseListener(new MouseAdapter() {
            @Override
            public void mouseClicked(MouseEvent event) {
                if (event.getClickCount() == 2) {
                    take();
                }
            }
        });
        JScrollPane scroll = new JScrollPane(table);
        scroll.setBorder(BorderFactory.createEmptyBorder());
        add(scroll);
        sizeColumns();
        theme.onChange(this::sizeColumns);
    }

    @Override
    Object key(Shown next) {
        StepKey key = StepKey.of(next.review().step());
        // Whether another solvent would serve better depends on the base too.
        return next.review().verdict() == Verdict.LEVELLED ? key : key.withoutBase();
    }

    @Override
    void work(Shown wanted) {
        start("judging every base of the stockroom \u2026", goOn -> rank(wanted.review().step(), goOn), ranking -> {
            model.show(ranking.bases());
            refresh();
            ranking.solvent().ifPresent(solvent -> say("The solvent is the problem: in " + solvent.name() + " "
                    + wanted.review().step().base().name() + " would do."));
        });
    }

    private Ranking rank(Step step, BooleanSupplier goOn) throws ReviewException {
        AtomicInteger done = new AtomicInteger();
        int all = engine.stockroom().bases().size();
        Reviewer watched = asked -> {
            if (!goOn.getAsBoolean()) {
                throw new CancellationException();
            }
            int count = done.incrementAndGet();
            if (count % 10 == 0) {
                SwingUtilities.invokeLater(() -> progress(goOn, count, all));
            }
            return engine.reviewer().review(asked);
        };
        BaseChoice choice = new BaseChoice(watched, engine.stockroom());
        return new Ranking(choice.rank(step), choice.betterSolvent(step));
    }

    /** The stockroom in order, and a solvent that would serve better where the solvent is the problem. */
    private record Ranking(List<RankedBase> bases, Optional<Solvent> solvent) {}

    private void progress(BooleanSupplier goOn, int count, int all) {
        if (goOn.getAsBoolean() && count < all - all % 10) {
            say("judging every base of the stockroom: " + count + " of " + all);
        }
    }

    /** Selects the base of the step. */
    @Override
    void refresh() {
        int row = model.rowOf(shown().review().step().base());
        if (row >= 0) {
            int viewRow = table.convertRowIndexToView(row);
            table.setRowSelectionInterval(viewRow, viewRow);
        }
        table.repaint();
    }

    private Base selected() {
        return model.base(table.convertRowIndexToModel(table.getSelectedRow()));
    }

    private void take() {
        if (table.getSelectedRow() >= 0) {
            onBase.accept(selected());
        }
    }

    private void sizeColumns() {
        int em = table.getFontMetrics(table.getFont()).charWidth('n');
        for (BaseChoiceModel.Column column : BaseChoiceModel.Column.values()) {
            table.getColumnModel().getColumn(column.ordinal()).setPreferredWidth((column.letters() + 2) * em);
            if (column != BaseChoiceModel.Column.WHY) {
                table.getColumnModel().getColumn(column.ordinal()).setMaxWidth((column.letters() + 2) * em * 2);
            }
        }
    }

    private final class Cell extends DefaultTableCellRenderer {
        private final int gap = getFont().getSize() / 2;

        @Override
        public Component getTableCellRendererComponent(JTable owner, Object value, boolean selected, boolean focused, int row, int column) {
            BaseChoiceModel.Column kind = BaseChoiceModel.Column.values()[owner.convertColumnIndexToModel(column)];
            super.getTableCellRendererComponent(owner, text(kind, value), selected, focused, row, column);
            setBorder(BorderFactory.createEmptyBorder(0, gap, 0, gap));
            setHorizontalAlignment(value instanceof Number ? SwingConstants.RIGHT : SwingConstants.LEFT);
            boolean chosen = model.base(owner.convertRowIndexToModel(row)).id().equals(shown().review().step().base().id());
            setFont(owner.getFont().deriveFont(chosen ? Font.BOLD : Font.PLAIN));
            setIcon(value instanceof Verdict verdict ? new VerdictIcon(verdict, theme.palette(), owner.getFont().getSize()) : null);
            setToolTipText(kind == BaseChoiceModel.Column.WHY ? String.valueOf(value) : null);
            return this;
        }
    }

    private static String text(BaseChoiceModel.Column column, Object value) {
        return switch (column) {
            case VERDICT -> VerdictHeader.name((Verdict) value);
            case PROBABILITY -> Words.percent((Double) value);
            case LOG_K -> Words.signed((Double) value);
            default -> String.valueOf(value);
        };
    }
}
