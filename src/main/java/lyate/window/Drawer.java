package lyate.window;

import java.util.List;
import java.util.Optional;
import javax.swing.JTabbedPane;
import lyate.stock.Base;

/** The tables and charts below the pictures. */
final class Drawer extends JTabbedPane implements AutoCloseable {

    private final TransfersTable transfers;
    private final BaseChoicePanel choice;
    private final DosePanel dose;
    private final AmountsPanel amounts;
    private final WorkUpPanel workUp;
    private final SourcesModel sources = new SourcesModel();

    /** What the drawer can ask of the rest of the window. */
    interface Wishes {
        void highlight(List<Integer> atoms);

        void intend(String site);

        void take(Base base);

        /** Puts a base on the ladder beside the one chosen, or takes it away. */
        void toggle(Base base);

        boolean isCompared(Base base);

        void equivalents(double equivalents);
    }

    Drawer(Theme theme, Engine engine, Wishes wishes) {
        transfers = new TransfersTable(theme, wishes::highlight, wishes::intend);
        choice = new BaseChoicePanel(theme, engine, wishes);
        dose = new DosePanel(theme, engine, wishes::equivalents);
        amounts = new AmountsPanel(theme, engine);
        workUp = new WorkUpPanel(theme, engine, amounts::amounts);
        addTab("Transfers", null, transfers, "every donor against the base");
        addTab("Base choice", null, choice, "the whole stockroom ranked for this site in this solvent");
        addTab("Equivalents", null, dose, "what more or less base would do");
        addTab("Amounts", null, amounts, "what to weigh and measure out, gas and heat");
        addTab("Work-up", null, workUp, "acid for the quench, pH for the extraction");
        addTab("Sources", null, new RowsTable(sources, "Sources", theme).scrolled(), "every value used, with its citation");
        addChangeListener(event -> {
            if (getSelectedComponent() instanceof LazyTab tab) {
                tab.lookedAt();
            }
        });
        getAccessibleContext().setAccessibleName("Drawer");
    }

    /** The chart in view, if there is one. */
    Optional<Picture> asPicture() {
        return getSelectedComponent() instanceof LazyTab tab ? tab.asPicture() : Optional.empty();
    }

    TransfersTable transfers() {
        return transfers;
    }

    BaseChoicePanel choice() {
        return choice;
    }

    WorkUpPanel workUp() {
        return workUp;
    }

    DosePanel dose() {
        return dose;
    }

    /** Whether the tab in view has its answer. */
    boolean isSettled() {
        return !(getSelectedComponent() instanceof LazyTab tab) || !tab.isBusy();
    }

    void show(Shown shown) {
        transfers.show(shown);
        choice.show(shown);
        dose.show(shown);
        amounts.show(shown);
        workUp.show(shown);
        sources.show(shown);
    }

    @Override
    public void close() {
        choice.close();
        dose.close();
        workUp.close();
    }
}
