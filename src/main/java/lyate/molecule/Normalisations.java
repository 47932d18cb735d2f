package lyate.molecule;

import java.util.ArrayList;
import java.util.List;
import lyate.table.Column;
import lyate.table.Lazy;
import lyate.table.Row;
import lyate.table.Schema;
import lyate.table.Table;
import lyate.table.TableException;
import lyate.table.TableFolders;
import lyate.table.TableProblem;
import org.openscience.cdk.interfaces.IAtom;
import org.openscience.cdk.interfaces.IAtomContainer;
import org.openscience.cdk.isomorphism.Transform;
import org.openscience.cdk.isomorphism.matchers.Expr;
import org.openscience.cdk.isomorphism.matchers.QueryAtom;
import org.openscience.cdk.isomorphism.matchers.QueryAtomContainer;
import org.openscience.cdk.silent.SilentChemObjectBuilder;
import org.openscience.cdk.smarts.Smarts;
import org.openscience.cdk.smirks.Smirks;

/**
 * The rows of {@code normalisations.csv}: variants of drawing, and the one form that stands for them.
 *
 * @param rows in file order
 */
record Normalisations(List<Rewrite> rows) {

    /** What {@code normalisations.csv} looks like. */
    static final Schema SCHEMA = Schema.of("normalisations.csv", Column.text("id"), Column.text("what"),
            Column.text("transformation"), Column.text("before"), Column.text("after"), Column.text("source"));

    Normalisations {
        rows = List.copyOf(rows);
    }

    /**
     * One row.
     *
     * @param what   the variant, in words
     * @param change compiled when first needed: most molecules have nothing to redraw
     */
    record Rewrite(String what, Lazy<Change> change) {}

    /**
     * A compiled transformation.
     *
     * @param odd       what its first atom must be, or it need not be tried
     * @param transform the change, applied everywhere at once
     */
    record Change(Expr odd, Transform transform) {

        /** @throws MoleculeException for text that is no SMIRKS */
        static Change compile(String smirks) throws MoleculeException {
            Transform transform = new Transform();
            QueryAtomContainer left = new QueryAtomContainer(SilentChemObjectBuilder.getInstance());
            if (!Smirks.parse(transform, smirks) || !Smarts.parse(left, smirks.substring(0, smirks.indexOf(">>")))) {
                throw new MoleculeException("a SMIRKS (" + transform.message() + ")");
            }
            return new Change(((QueryAtom) left.getAtom(0)).getExpression(), transform);
        }

        boolean worthTrying(List<IAtom> oddAtoms) {
            for (IAtom atom : oddAtoms) {
                if (odd.matches(atom)) {
                    return true;
                }
            }
            return false;
        }
    }

    /**
     * Loads the table and compiles the transformations somebody added; the packaged ones are held by tests.
     *
     * @throws TableException for a bad cell or a transformation that does not compile
     */
    static Normalisations load(TableFolders folders) {
        List<TableProblem> problems = new ArrayList<>();
        List<Rewrite> rows = new ArrayList<>();
        for (Row row : Table.read(SCHEMA, folders).rows()) {
            Rewrite rewrite = new Rewrite(row.text("what"), Lazy.of(() -> compile(row)));
            try {
                if (!row.file().equals(SCHEMA.fileName())) {
                    rewrite.change().get();
                }
                rows.add(rewrite);
            } catch (TableException e) {
                problems.addAll(e.problems());
            }
        }
        if (!problems.isEmpty()) {
            throw new TableException(problems);
        }
        return new Normalisations(rows);
    }

    private static Change compile(Row row) {
        try {
            return Change.compile(row.text("transformation"));
        } catch (MoleculeException e) {
            throw new TableException(List.of(row.problem("transformation", e.getMessage())));
        }
    }

    /** Changes the molecule where a row fits and says so in {@code warnings}. */
    void apply(IAtomContainer molecule, List<IAtom> oddAtoms, List<String> warnings) {
        if (oddAtoms.isEmpty()) {
            return;
        }
        for (Rewrite row : rows) {
            Change change = row.change().get();
            if (change.worthTrying(oddAtoms) && change.transform().apply(molecule)) {
                warnings.add("redrawn: " + row.what());
            }
        }
    }
}
