package lyate.molecule;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import lyate.table.Column;
import lyate.table.Lazy;
import lyate.table.Row;
import lyate.table.Schema;
import lyate.table.Table;
import lyate.table.TableException;
import lyate.table.TableFolders;
import lyate.table.TableProblem;
import org.openscience.cdk.interfaces.IAtomContainer;

/**
 * The rows of {@code counter-ions.csv}: components that are rarely what is meant.
 *
 * @param keys canonical SMILES of their constitutions, worked out for the first molecule of several components
 */
record CounterIons(Lazy<Set<String>> keys) {

    /** What {@code counter-ions.csv} looks like. */
    static final Schema SCHEMA = Schema.of("counter-ions.csv", Column.text("id"), Column.text("name"), Column.text("smiles"),
            Column.text("source"));

    /** @throws TableException for a bad cell; the structures of packaged rows are held by tests */
    static CounterIons load(TableFolders folders) {
        List<Row> rows = Table.read(SCHEMA, folders).rows();
        CounterIons ions = new CounterIons(Lazy.of(() -> keys(rows)));
        if (!rows.stream().allMatch(row -> row.file().equals(SCHEMA.fileName()))) {
            ions.keys().get();
        }
        return ions;
    }

    private static Set<String> keys(List<Row> rows) {
        List<TableProblem> problems = new ArrayList<>();
        Set<String> keys = new HashSet<>();
        for (Row row : rows) {
            try {
                keys.add(SmilesWriter.constitution(new SmilesText(row.text("smiles")).parse()));
            } catch (MoleculeException e) {
                problems.add(row.problem("smiles", "SMILES (" + e.getMessage() + ")"));
            }
        }
        if (!problems.isEmpty()) {
            throw new TableException(problems);
        }
        return Set.copyOf(keys);
    }

    boolean contains(IAtomContainer component) {
        return keys.get().contains(SmilesWriter.constitution(component));
    }
}
