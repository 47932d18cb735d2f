package lyate.acidity.lfer;

import static lyate.table.Column.number;
import static lyate.table.Column.text;
import static lyate.table.Column.word;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import lyate.molecule.AtomPattern;
import lyate.molecule.Molecule;
import lyate.molecule.MoleculeException;
import lyate.site.Role;
import lyate.table.Row;
import lyate.table.Schema;
import lyate.table.Table;
import lyate.table.TableException;
import lyate.table.TableFolders;
import lyate.table.TableProblem;

/**
 * The rows of {@code estimate-series.csv}, general ones first: of all rows of a role that match, the last one decides.
 *
 * @param rows in file order
 */
record SeriesTable(List<Series> rows) {

    static final Schema SCHEMA = Schema.of("estimate-series.csv", text("id"), text("name"), word("role", "acid", "base"),
            text("line"), text("group"), text("smarts"), number("lowest_water").optional(),
            number("highest_water").optional(), text("source"));

    SeriesTable {
        rows = List.copyOf(rows);
    }

    /**
     * Loads the table and compiles its patterns.
     *
     * @throws TableException for a bad cell or a pattern that does not compile
     */
    static SeriesTable load(TableFolders folders) {
        List<TableProblem> problems = new ArrayList<>();
        List<Series> series = new ArrayList<>();
        for (Row row : Table.read(SCHEMA, folders).rows()) {
            try {
                series.add(new Series(row.id(), row.text("name"), row.text("role").equals("acid") ? Role.ACID : Role.BASE,
                        row.text("line"), row.text("group"), AtomPattern.compile(row.text("smarts")),
                        row.number("lowest_water").orElse(Double.NEGATIVE_INFINITY),
                        row.number("highest_water").orElse(Double.POSITIVE_INFINITY)));
            } catch (MoleculeException e) {
                problems.add(row.problem("smarts", "a SMARTS pattern (" + e.getMessage() + ")"));
            }
        }
        if (!problems.isEmpty()) {
            throw new TableException(problems);
        }
        return new SeriesTable(series);
    }

    /** The series of a site, or empty where none matches. */
    Optional<Series> of(Molecule molecule, Role role, int atom) {
        for (int i = rows.size() - 1; i >= 0; i--) {
            Series row = rows.get(i);
            if (row.role() == role && row.pattern().matches(molecule, atom)) {
                return Optional.of(row);
            }
        }
        return Optional.empty();
    }
}
