package lyate.stock;

import java.util.List;
import java.util.Locale;
import java.util.Optional;
import lyate.molecule.Molecule;
import lyate.molecule.MoleculeException;
import lyate.molecule.MoleculeReader;
import lyate.table.Row;
import lyate.table.TableProblem;

/**
 * Reads the structures of a row that somebody added and compares its molar mass. The packaged rows are held by tests, and
 * reading a thousand structures at every start would cost more than it is worth.
 */
final class StructureCheck {

    private static final double MASS_TOLERANCE = 0.05;

    /** Bare ions and H2 have no structure that could be misdrawn, and the reader wants a substrate. */
    private static final String BARE_IONS = "(\\[[A-Za-z]+\\d?[+-]?\\d?\\]\\.?)+";

    private final Row row;
    private final List<TableProblem> problems;

    private StructureCheck(Row row, List<TableProblem> problems) {
        this.row = row;
        this.problems = problems;
    }

    /** Checks the {@code smiles} and {@code molar_mass} of a row that is not a packaged one, and further structures named. */
    static void of(Row row, String packagedName, List<TableProblem> problems, String... furtherColumns) {
        if (row.file().equals(packagedName)) {
            return;
        }
        StructureCheck check = new StructureCheck(row, problems);
        check.read("smiles").ifPresent(check::compareMass);
        for (String column : furtherColumns) {
            check.read(column);
        }
    }

    private Optional<Molecule> read(String column) {
        if (row.text(column).matches(BARE_IONS)) {
            return Optional.empty();
        }
        try {
            return Optional.of(new MoleculeReader().read(row.text(column)));
        } catch (MoleculeException e) {
            problems.add(row.problem(column, "a structure that can be read (" + e.getMessage() + ")"));
            return Optional.empty();
        }
    }

    private void compareMass(Molecule molecule) {
        double mass = molecule.molarMassWithCounterIons();
        if (Math.abs(mass - row.number("molar_mass").orElse(mass)) > MASS_TOLERANCE) {
            problems.add(row.problem("molar_mass", String.format(Locale.ROOT, "%.2f, the molar mass of the structure", mass)));
        }
    }
}
