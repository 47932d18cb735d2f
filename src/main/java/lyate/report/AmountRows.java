package lyate.report;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import lyate.bench.Amounts;
import lyate.review.Step;

/** What to weigh and measure out, a row each, as tables for reading have it. */
public final class AmountRows {

    private AmountRows() {}

    /** A row as written; empty where a figure does not apply or is not known. */
    public record Line(String what, String milliMole, String grams, String milliLitre, String remark) {}

    /** Substrate, solvent, base, then where the base goes. */
    public static List<Line> of(Step step, Amounts amounts) {
        List<Line> lines = new ArrayList<>();
        lines.add(new Line("substrate", Words.number(amounts.batch().milliMole()), Words.number(amounts.batch().grams()), "", "counter-ions included"));
        lines.add(new Line(step.solvent().name(), "", "", Words.number(amounts.solventMilliLitre()), "for " + Words.chosen(step.concentrationMolar()) + " mol/L"));
        lines.add(new Line(step.base().name(), Words.number(amounts.base().milliMole()), number(amounts.base().grams()),
                number(amounts.base().milliLitre()), Words.chosen(step.equivalents()) + (step.equivalents() == 1 ? " equivalent; " : " equivalents; ") + amounts.base().form()));
        amounts.spending().forEach(spent -> lines.add(new Line("protons of " + spent.what(), Words.number(spent.milliMole()), "", "",
                "met before or at the intended site")));
        lines.add(new Line("base that just covers these", Words.number(amounts.baseNeeded().milliMole()), number(amounts.baseNeeded().grams()),
                number(amounts.baseNeeded().milliLitre()), ""));
        lines.add(new Line(amounts.excess() < 0 ? "base missing" : "base left over", Words.number(Math.abs(amounts.excess())), "", "", "counted in protons"));
        return lines;
    }

    private static String number(OptionalDouble value) {
        return value.isPresent() ? Words.number(value.getAsDouble()) : "";
    }
}
