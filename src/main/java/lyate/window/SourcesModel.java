package lyate.window;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import lyate.acidity.Acidity.Relative;
import lyate.report.Words;
import lyate.review.Finding;
import lyate.review.Review;
import lyate.review.Transfer;
import lyate.stock.KnownPKa;
import lyate.stock.Medium;

/** Every value the review uses, with where it comes from. */
final class SourcesModel extends RowsModel<SourcesModel.Use> {

    /** One used value. */
    record Use(String what, String value, String source) {}

    SourcesModel() {
        super(List.of(new Head("Used for", 36), new Head("Value", 28), new Head("Source", 90)));
    }

    void show(Shown shown) {
        showRows(uses(shown));
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
    public Object getValueAt(int row, int column) {
        Use use = row(row);
        return column == 0 ? use.what() : column == 1 ? use.value() : use.source();
    }
}
