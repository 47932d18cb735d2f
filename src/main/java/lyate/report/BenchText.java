package lyate.report;

import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import lyate.bench.Amounts;
import lyate.bench.AqueousForm;
import lyate.bench.GasAndHeat;
import lyate.bench.WorkUpKit;
import lyate.review.Step;

/** What to weigh out, what is given off and how to work up, for reading. */
public final class BenchText {

    private final FindingText out;

    public BenchText(Appendable out) {
        this.out = new FindingText(out);
    }

    /** Amounts, gas and heat of a batch. */
    public void write(Step step, Amounts amounts, GasAndHeat gasAndHeat) throws IOException {
        out.line("");
        out.line("  Amounts for %s mmol of substrate", Words.chosen(amounts.batch().milliMole()));
        out.line("    %-36s %9s %9s %9s  %s", "", "mmol", "g", "mL", "");
        for (AmountRows.Line line : AmountRows.of(step, amounts)) {
            out.line("    %-36s %9s %9s %9s  %s", line.what(), line.milliMole(), line.grams(), line.milliLitre(), line.remark());
        }
        for (String warning : amounts.warnings()) {
            out.line("    %s", warning);
        }
        List<String> lines = new ArrayList<>();
        gasAndHeat.heatSentence().ifPresent(lines::add);
        lines.addAll(gasAndHeat.cautions());
        out.list("Gas and heat", lines);
    }

    /** Where everything goes in water, and the quench. */
    public void write(WorkUpKit.Answer answer) throws IOException {
        out.list("Work-up", WorkUpWords.lines(answer));
        List<AqueousForm> forms = new ArrayList<>(List.of(answer.workUp().product()));
        forms.addAll(answer.others());
        out.line("");
        StringBuilder head = new StringBuilder(String.format(Locale.ROOT, "    %-36s", "% uncharged at pH"));
        for (int pH = 0; pH <= 14; pH += 2) {
            head.append(String.format(Locale.ROOT, "%6d", pH));
        }
        out.line("%s", head);
        for (AqueousForm form : forms) {
            StringBuilder line = new StringBuilder(String.format(Locale.ROOT, "    %-36s", form.name()));
            for (int pH = 0; pH <= 14; pH += 2) {
                line.append(String.format(Locale.ROOT, "%6s", Numbers.fixed(100 * form.unchargedFraction(pH), 0)));
            }
            out.line("%s", line);
        }
    }
}
