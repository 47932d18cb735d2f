package lyate.report;

import java.util.ArrayList;
import java.util.List;
import lyate.review.Review;
import lyate.review.Step;
import lyate.sheet.SheetColumn;
import lyate.sheet.SheetRow;

/** What was taken for granted where the sheet said nothing. */
final class Assumptions {

    private Assumptions() {}

    static List<String> of(SheetRow row, Review review) {
        Step step = review.step();
        List<String> said = new ArrayList<>();
        if (row.text(SheetColumn.SITE).isEmpty() && step.intendedSite().isPresent()) {
            said.add("No intended site given: " + review.intendedSite() + " was taken from the reaction.");
        } else if (row.text(SheetColumn.SITE).isEmpty()) {
            said.add("No intended site given: " + review.intendedSite() + ", the first to go, was taken.");
        }
        if (row.text(SheetColumn.BASE_EQUIV).isEmpty()) {
            said.add("No equivalents given: " + Words.chosen(step.equivalents()) + " taken.");
        }
        if (row.text(SheetColumn.TEMPERATURE).isEmpty()) {
            said.add("No temperature given: " + Words.minus(Numbers.fixed(step.temperatureCelsius(), 0)) + " \u00b0C taken.");
        }
        if (row.text(SheetColumn.CONCENTRATION).isEmpty()) {
            said.add("No concentration given: " + Words.chosen(step.concentrationMolar()) + " mol/L taken.");
        }
        if (row.text(SheetColumn.WATER).isEmpty()) {
            said.add("No water content given: " + Numbers.fixed(step.waterPpm(), 0) + " ppm by mass taken, as a bottle of "
                    + step.solvent().name() + " handled with care holds.");
        }
        if (step.temperatureCelsius() != 25) {
            said.add("log K at the temperature of the step is log K at 25 \u00b0C times 298.15 K/T (isocoulombic transfer).");
        }
        if (row.text(SheetColumn.AMOUNT_MILLIMOLE).isEmpty() && row.text(SheetColumn.AMOUNT_GRAMS).isEmpty()) {
            said.add("No amount given: " + Words.chosen(ReportContext.MILLIMOLE) + " mmol of substrate taken.");
        }
        if (row.text(SheetColumn.BASE_TITRATED).isEmpty()) {
            said.add("No titrated strength given: the base is as strong as its label says.");
        }
        said.addAll(review.assumptions());
        return said;
    }
}
