package lyate.window;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.OptionalDouble;
import lyate.bench.Amounts;
import lyate.bench.Amounts.Spent;
import lyate.review.Step;

/** What to weigh and measure out, a row each. */
final class AmountsModel extends RowsModel<AmountsModel.Line> {

    /** A row as written. */
    record Line(String what, String milliMole, String grams, String milliLitre, String remark) {}

    AmountsModel() {
        super("What", "mmol", "g", "mL", "Remark");
    }

    void show(Step step, Amounts amounts) {
        showRows(lines(step, amounts));
    }

    static List<Line> lines(Step step, Amounts amounts) {
        List<Line> lines = new ArrayList<>();
        lines.add(new Line("substrate", number(amounts.batch().milliMole()), number(amounts.batch().grams()), "", "counter-ions included"));
        lines.add(new Line(step.solvent().name(), "", "", number(amounts.solventMilliLitre()), "for " + number(step.concentrationMolar()) + " mol/L"));
        lines.add(new Line(step.base().name(), number(amounts.base().milliMole()), number(amounts.base().grams()),
                number(amounts.base().milliLitre()), number(step.equivalents()) + " eq., " + amounts.base().form()));
        for (Spent spent : amounts.spending()) {
            lines.add(new Line("\u2514 protons of " + spent.what(), number(spent.milliMole()), "", "", "taken before or at the intended site"));
        }
        lines.add(new Line("base that just covers these", number(amounts.baseNeeded().milliMole()), number(amounts.baseNeeded().grams()),
                number(amounts.baseNeeded().milliLitre()), ""));
        lines.add(new Line(amounts.excess() < 0 ? "base missing" : "base left over", number(Math.abs(amounts.excess())), "", "", "counted in protons"));
        return lines;
    }

    private static String number(OptionalDouble value) {
        return value.isPresent() ? number(value.getAsDouble()) : "";
    }

    /** Three significant digits, without an exponent where that is readable. */
    static String number(double value) {
        if (value == 0) {
            return "0";
        }
        if (Math.abs(value) < 1e-4 || Math.abs(value) >= 1e6) {
            return String.format(Locale.ROOT, "%.2e", value);
        }
        int decimals = Math.max(0, 2 - (int) Math.floor(Math.log10(Math.abs(value))));
        return String.format(Locale.ROOT, "%." + decimals + "f", value);
    }

    @Override
    public Object getValueAt(int row, int column) {
        Line line = row(row);
        return switch (column) {
            case 0 -> line.what();
            case 1 -> line.milliMole();
            case 2 -> line.grams();
            case 3 -> line.milliLitre();
            default -> line.remark();
        };
    }
}
