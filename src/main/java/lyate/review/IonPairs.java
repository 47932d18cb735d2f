package lyate.review;

import static lyate.table.Column.list;
import static lyate.table.Column.number;
import static lyate.table.Column.text;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import lyate.acidity.Acidity;
import lyate.molecule.AtomPattern;
import lyate.molecule.Molecule;
import lyate.molecule.MoleculeException;
import lyate.stock.Base;
import lyate.stock.Medium;
import lyate.stock.Solvent;
import lyate.table.Row;
import lyate.table.Schema;
import lyate.table.Table;
import lyate.table.TableException;
import lyate.table.TableFolders;
import lyate.table.TableProblem;

/**
 * What ion pairing in solvents of low polarity adds to the DMSO scale that stands for them: the rows of {@code ion-pairs.csv}.
 * Immutable; safe to share between threads.
 */
final class IonPairs {

    static final Schema SCHEMA = Schema.of("ion-pairs.csv", text("id"), text("counter_ion"), list("families"), text("smarts"),
            number("lowering"), number("sigma"), text("source"));

    private final List<Pair> pairs;

    /** A row. */
    private record Pair(String counterIon, List<String> families, AtomPattern pattern, double lowering, double sigma, String source) {

        boolean forms(Base base) {
            return counterIon.equals(base.counterIon()) && families.contains(base.family().id());
        }
    }

    private IonPairs(List<Pair> pairs) {
        this.pairs = List.copyOf(pairs);
    }

    /**
     * Loads the table.
     *
     * @throws TableException for a bad cell or pattern
     */
    static IonPairs load(TableFolders folders) {
        List<TableProblem> problems = new ArrayList<>();
        List<Pair> pairs = new ArrayList<>();
        for (Row row : Table.read(SCHEMA, folders).rows()) {
            try {
                pairs.add(new Pair(row.text("counter_ion"), row.list("families"), AtomPattern.compile(row.text("smarts")),
                        row.number("lowering").orElseThrow(), row.number("sigma").orElseThrow(), row.text("source")));
            } catch (MoleculeException e) {
                problems.add(row.problem("smarts", "a SMARTS pattern (" + e.getMessage() + ")"));
            }
        }
        if (!problems.isEmpty()) {
            throw new TableException(problems);
        }
        return new IonPairs(pairs);
    }

    /** The acidity of a site towards a base: a DMSO value that stands for a solvent of low polarity is lowered where ions pair. */
    Acidity paired(Acidity acidity, Molecule molecule, int atom, WorkingBase base, Solvent solvent) {
        if (solvent.kind() != Solvent.Kind.LOW_POLARITY || !acidity.medium().equals(Medium.DMSO)) {
            return acidity;
        }
        Optional<Pair> pair = base.shelfBase().flatMap(shelf -> pairs.stream().filter(row -> row.forms(shelf))
                .filter(row -> row.pattern().matches(molecule, atom)).reduce((first, later) -> later));
        return pair.map(row -> acidity.lowered(row.lowering(), row.sigma(), row.counterIon() + " ion pair in " + solvent.name(), row.source()))
                .orElse(acidity);
    }
}
