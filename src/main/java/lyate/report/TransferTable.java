package lyate.report;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import lyate.review.Transfer;

/** Every donor against the working base; sites of which everything is the same share a line. */
final class TransferTable {

    private final StepFacts facts;
    private final List<Transfer> transfers;
    private final List<String> reasons;

    TransferTable(StepFacts facts) {
        this.facts = facts;
        this.transfers = facts.review().transfers();
        this.reasons = transfers.stream().map(Transfer::decidedBy).distinct().toList();
    }

    void write(Html html) {
        html.element("h3", "Transfers");
        List<String> columns = new ArrayList<>(List.of("Site", "Donor", "pKa", "In", "Value is", "log K", "\u0394G, kJ/mol", "Taken"));
        if (reasons.size() > 1) {
            columns.add("Why");
        }
        HtmlTable table = new HtmlTable(html, "transfers", "Every donor against " + facts.review().workingBase(), columns);
        lines().values().forEach(same -> table.row(cells(same)));
        table.end();
        for (int i = 0; i < reasons.size(); i++) {
            html.element("p", (reasons.size() > 1 ? i + 1 + ": " : "Which scale decides, and why: ") + reasons.get(i) + ".", "class", "source");
        }
    }

    private Map<List<String>, List<Transfer>> lines() {
        Map<List<String>, List<Transfer>> lines = new LinkedHashMap<>();
        for (Transfer transfer : transfers) {
            List<String> values = new ArrayList<>(values(transfer));
            values.add(transfer.donor().equals(facts.review().intendedSite()) ? "intended" : "");
            lines.computeIfAbsent(values, key -> new ArrayList<>()).add(transfer);
        }
        return lines;
    }

    private String[] cells(List<Transfer> same) {
        List<String> cells = new ArrayList<>();
        cells.add(String.join(", ", same.stream().map(this::letter).filter(letter -> !letter.isEmpty()).toList()));
        boolean intended = same.get(0).donor().equals(facts.review().intendedSite());
        cells.add(String.join(", ", same.stream().map(Transfer::donor).toList()) + (intended ? ", intended" : ""));
        cells.addAll(values(same.get(0)));
        return cells.toArray(String[]::new);
    }

    private String letter(Transfer transfer) {
        return facts.sites().stream().filter(site -> site.transfer().equals(transfer)).map(LetteredSite::letter).findFirst().orElse("");
    }

    private List<String> values(Transfer transfer) {
        List<String> values = new ArrayList<>(List.of(Words.withSigma(transfer.acidity()), Words.medium(transfer.acidity().medium()),
                transfer.acidity().basis().word(), Words.withSigma(transfer.logK(), transfer.sigmaLogK()),
                Words.minus(Numbers.fixed(transfer.deltaG(), 0)), Words.percent(transfer.percentTaken())));
        if (reasons.size() > 1) {
            values.add(Integer.toString(reasons.indexOf(transfer.decidedBy()) + 1));
        }
        return values;
    }
}
