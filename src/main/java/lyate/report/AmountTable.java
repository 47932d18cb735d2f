package lyate.report;

import java.util.List;
import java.util.OptionalDouble;
import lyate.bench.Amounts;
import lyate.bench.Portion;
import lyate.review.Step;

/** What to weigh and measure out, and where the base goes. */
final class AmountTable {

    private AmountTable() {}

    static void write(Html html, Step step, Amounts amounts) {
        html.element("h3", "Amounts");
        HtmlTable table = new HtmlTable(html, "amounts", "For " + Words.chosen(amounts.batch().milliMole()) + " mmol of substrate",
                List.of("What", "mmol", "g", "mL"));
        table.row("substrate, counter-ions included", Words.number(amounts.batch().milliMole()), Words.number(amounts.batch().grams()), "");
        table.row(step.solvent().name() + ", for " + Words.chosen(step.concentrationMolar()) + " mol/L", "", "", Words.number(amounts.solventMilliLitre()));
        portion(table, step.base().name() + ", " + Words.equivalents(step.equivalents()) + ", " + amounts.base().form(), amounts.base());
        amounts.spending().forEach(spent -> table.row("protons of " + spent.what(), Words.number(spent.milliMole()), "", ""));
        portion(table, "base that just covers these", amounts.baseNeeded());
        table.row(amounts.excess() < 0 ? "base missing, in protons" : "base left over, in protons", Words.number(Math.abs(amounts.excess())), "", "");
        table.end();
        html.bullets(amounts.warnings());
    }

    private static void portion(HtmlTable table, String what, Portion portion) {
        table.row(what, Words.number(portion.milliMole()), number(portion.grams()), number(portion.milliLitre()));
    }

    private static String number(OptionalDouble value) {
        return value.isPresent() ? Words.number(value.getAsDouble()) : "";
    }
}
