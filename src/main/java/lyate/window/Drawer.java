package lyate.window;

import java.util.List;
import java.util.function.Consumer;
import java.util.function.DoubleConsumer;
import javax.swing.BorderFactory;
import javax.swing.JScrollPane;
import javax.swing.JTabbedPane;
import javax.swing.JTable;
import lyate.review.Reviewer;

/** The tables and charts below the pictures. */
final class Drawer extends JTabbedPane implements AutoCloseable {

    private final TransfersTable transfers;
    private final DosePanel dose;
    private final SourcesModel sources = new SourcesModel();

    Drawer(Theme theme, Reviewer reviewer, Consumer<List<Integer>> highlight, Consumer<String> onSite, DoubleConsumer onEquivalents) {
        transfers = new TransfersTable(theme, highlight, onSite);
        dose = new DosePanel(theme, reviewer, onEquivalents);
        addTab("Transfers", null, transfers, "every donor against the base");
        addTab("Equivalents", null, dose, "what more or less base would do");
        addTab("Sources", null, table(sources, "Sources"), "every value used, with its citation");
        addChangeListener(event -> {
            if (getSelectedComponent() == dose) {
                dose.lookedAt();
            }
        });
        getAccessibleContext().setAccessibleName("Drawer");
    }

    private static JScrollPane table(SourcesModel model, String name) {
        JTable table = new JTable(model);
        table.setAutoCreateRowSorter(true);
        table.setFillsViewportHeight(true);
        table.getAccessibleContext().setAccessibleName(name);
        int em = table.getFontMetrics(table.getFont()).charWidth('n');
        int[] letters = {36, 26, 90};
        for (int i = 0; i < letters.length; i++) {
            table.getColumnModel().getColumn(i).setPreferredWidth(letters[i] * em);
        }
        JScrollPane scroll = new JScrollPane(table);
        scroll.setBorder(BorderFactory.createEmptyBorder());
        return scroll;
    }

    void show(Shown shown) {
        transfers.show(shown);
        dose.show(shown);
        sources.show(shown);
    }

    @Override
    public void close() {
        dose.close();
    }
}
