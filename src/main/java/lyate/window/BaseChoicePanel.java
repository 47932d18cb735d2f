package lyate.window;

import java.awt.event.MouseAdapter;
import java.awt.event.MouseEvent;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.CancellationException;
import java.util.concurrent.atomic.AtomicInteger;
import java.util.function.BooleanSupplier;
import java.util.function.Consumer;
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

/** The stockroom ranked for the step: Enter or a double click takes a base, L, a tick or dragging puts it on the ladder. */
final class BaseChoicePanel extends LazyTab {

    private final transient Engine engine;
    private final transient Consumer<Base> onBase;
    private final BaseChoiceModel model;
    private final RowsTable table;

    BaseChoicePanel(Theme theme, Engine engine, Drawer.Wishes wishes) {
        super("base choice");
        this.engine = engine;
        this.onBase = wishes::take;
        this.model = new BaseChoiceModel(wishes::isCompared, wishes::toggle);
        this.table = new RowsTable(model, "Base choice", theme) {
            @Override
            void decorate(DefaultTableCellRenderer cell, Object value) {
                cell.setIcon(value instanceof Verdict verdict ? new VerdictIcon(verdict, theme.palette(), getFont().getSize()) : null);
            }
        };
        table.setDragEnabled(true);
        table.setTransferHandler(new TextCopy(() -> selected().name()));
        Keys.bind(table, "ENTER", this::take);
        Keys.bind(table, "L", () -> {
            if (table.getSelectedRow() >= 0) {
                wishes.toggle(selected());
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
        add(table.scrolled());
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
        int row = model.choose(shown().review().step().base());
        if (row >= 0) {
            int viewRow = table.convertRowIndexToView(row);
            table.setRowSelectionInterval(viewRow, viewRow);
        }
        table.repaint();
    }

    /** The bases in order. */
    RowsTable table() {
        return table;
    }

    private Base selected() {
        return model.row(table.selectedModelRow()).base();
    }

    private void take() {
        if (table.getSelectedRow() >= 0) {
            onBase.accept(selected());
        }
    }
}
