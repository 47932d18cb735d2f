package lyate.window;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import lyate.bench.Amounts;
import lyate.bench.Amounts.Spent;
import lyate.report.Words;
import lyate.review.Step;

/** What to weigh and measure out, a row each. */
final class AmountsModel extends RowsModel<AmountsModel.Line> {

    private static final int BASE_ROW = 2;

    /** A row as written. */
    record Line(String what, String milliMole, String grams, String milliLitre, String remark) {}

    AmountsModel() {
        super(List.of(new Head("What", 32), new Head("mmol", -10), new Head("g", -10), new Head("mL", -10), new Head("Remark", 44)));
    }

    void show(Step step, Amounts amounts) {
        showRows(lines(step, amounts));
    }

    static List<Line> lines(Step step, Amounts amounts) {
        List<Line> lines = new ArrayList<>();
        lines.add(new Line("substrate", Words.number(amounts.batch().milliMole()), Words.number(amounts.batch().grams()), "", "counter-ions included"));
        lines.add(new Line(step.solvent().name(), "", "", Words.number(amounts.solventMilliLitre()), "for " + Words.chosen(step.concentrationMolar()) + " mol/L"));
        lines.add(new Line(step.base().name(), Words.number(amounts.base().milliMole()), number(amounts.base().grams()),
                number(amounts.base().milliLitre()), Words.equivalents(step.equivalents()) + ", " + amounts.base().form()));
        for (Spent spent : amounts.spending()) {
            lines.add(new Line("\u2514 protons of " + spent.what(), Words.number(spent.milliMole()), "", "", "taken before or at the intended site"));
        }
        lines.add(new Line("base that just covers these", Words.number(amounts.baseNeeded().milliMole()), number(amounts.baseNeeded().grams()),
                number(amounts.baseNeeded().milliLitre()), ""));
        lines.add(new Line(amounts.excess() < 0 ? "base missing" : "base left over", Words.number(Math.abs(amounts.excess())), "", "", "counted in protons"));
        return lines;
    }

    private static String number(OptionalDouble value) {
        return value.isPresent() ? Words.number(value.getAsDouble()) : "";
    }

    /** How much base to take is what most people come for. */
    @Override
    boolean isStressed(int row) {
        return row == BASE_ROW;
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
