package lyate.window;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import javax.swing.table.AbstractTableModel;
import lyate.acidity.Acidity.Relative;
import lyate.review.Finding;
import lyate.review.Review;
import lyate.review.Transfer;
import lyate.stock.KnownPKa;
import lyate.stock.Medium;

/** Every value the review uses, with where it comes from. */
final class SourcesModel extends AbstractTableModel {

    private static final List<String> TITLES = List.of("Used for", "Value", "Source");

    /** One used value. */
    record Use(String what, String value, String source) {}

    private List<Use> uses = List.of();

    void show(Shown shown) {
        uses = uses(shown);
        fireTableDataChanged();
    }

    static List<Use> uses(Shown shown) {
        Review review = shown.review();
        List<Use> uses = new ArrayList<>();
        for (Transfer transfer : review.transfers()) {
            uses.add(new Use("pKa of " + transfer.donor() + ", " + transfer.acidity().basis().word(),
                    Words.withSigma(transfer.acidity()) + " in " + Words.medium(transfer.acidity().medium()), transfer.acidity().source()));
            for (Relative relative : transfer.acidity().relatives()) {
                uses.add(new Use("measured relative of " + transfer.donor(), relative.smiles() + ", " + relative.site() + ": " + Words.oneDecimal(relative.pKa()), relative.source()));
            }
        }
        Map<String, KnownPKa> bases = new TreeMap<>();
        for (Map.Entry<Medium, KnownPKa> known : review.step().base().pKas().entrySet()) {
            bases.put(Words.medium(known.getKey()), known.getValue());
        }
        bases.forEach((medium, known) -> uses.add(new Use("pKa of the conjugate acid of " + review.step().base().name(),
                Words.withSigma(known.pKa(), known.sigma()) + " in " + medium, known.source())));
        uses.add(new Use("data of " + review.step().solvent().name(), "", review.step().solvent().source()));
        for (Finding finding : review.findings()) {
            uses.add(new Use("finding: " + finding.kind().code().replace('-', ' '), "", finding.source()));
        }
        return uses;
    }

    @Override
    public int getRowCount() {
        return uses.size();
    }

    @Override
    public int getColumnCount() {
        return TITLES.size();
    }

    @Override
    public String getColumnName(int column) {
        return TITLES.get(column);
    }

    @Override
    public Object getValueAt(int row, int column) {
        Use use = uses.get(row);
        return column == 0 ? use.what() : column == 1 ? use.value() : use.source();
    }
}
