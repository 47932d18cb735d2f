package lyate.sheet;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import lyate.bench.Batch;
import lyate.molecule.Molecule;
import lyate.sheet.RowException.Problem;

/**
 * How much of a step is done, as far as its row says.
 *
 * @param batch    the substrate; empty where the row states no amount
 * @param titrated strength of the base found by titration, mol/L; empty to go by the label
 */
public record StepScale(Optional<Batch> batch, OptionalDouble titrated) {

    private static final Quantity MILLIMOLE = new Quantity("mmol", 1e-6, 1e9);
    private static final Quantity GRAMS = new Quantity("g", 1e-6, 1e9);
    private static final Quantity STRENGTH = new Quantity("mol/L", 1e-3, 30);

    /** The scale of a row that {@link StepReader} takes. */
    public static StepScale of(SheetRow row, Molecule substrate) {
        OptionalDouble milliMole = MILLIMOLE.parse(row.text(SheetColumn.AMOUNT_MILLIMOLE));
        OptionalDouble grams = GRAMS.parse(row.text(SheetColumn.AMOUNT_GRAMS));
        Optional<Batch> batch = milliMole.isPresent() ? Optional.of(Batch.ofMilliMole(substrate, milliMole.getAsDouble()))
                : grams.isPresent() ? Optional.of(Batch.ofGrams(substrate, grams.getAsDouble())) : Optional.empty();
        return new StepScale(batch, STRENGTH.parse(row.text(SheetColumn.BASE_TITRATED)));
    }

    /** Adds what is wrong with these cells. */
    static void check(SheetRow row, List<Problem> problems) {
        check(row, SheetColumn.AMOUNT_MILLIMOLE, MILLIMOLE, problems);
        check(row, SheetColumn.AMOUNT_GRAMS, GRAMS, problems);
        check(row, SheetColumn.BASE_TITRATED, STRENGTH, problems);
        if (!row.text(SheetColumn.AMOUNT_MILLIMOLE).isEmpty() && !row.text(SheetColumn.AMOUNT_GRAMS).isEmpty()) {
            problems.add(new Problem(SheetColumn.AMOUNT_GRAMS, "found an amount in mmol as well, expected one of the two"));
        }
    }

    private static void check(SheetRow row, SheetColumn column, Quantity quantity, List<Problem> problems) {
        String text = row.text(column);
        if (!text.isEmpty() && quantity.parse(text).isEmpty()) {
            problems.add(new Problem(column, "found '" + text + "', expected " + quantity.expected()));
        }
    }
}
