package lyate.molecule;

import java.util.ArrayList;
import java.util.List;
import lyate.table.Column;
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
     * @param what      the variant, in words
     * @param odd       what its first atom must be, or the row need not be tried
     * @param transform the change, applied everywhere at once
     */
    record Rewrite(String what, Expr odd, Transform transform) {

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
     * Loads the table and compiles its transformations.
     *
     * @throws TableException for a bad cell or a transformation that does not compile
     */
    static Normalisations load(TableFolders folders) {
        List<TableProblem> problems = new ArrayList<>();
        List<Rewrite> rows = new ArrayList<>();
        for (Row row : Table.read(SCHEMA, folders).rows()) {
            Transform transform = new Transform();
            String text = row.text("transformation");
            QueryAtomContainer left = new QueryAtomContainer(SilentChemObjectBuilder.getInstance());
            if (Smirks.parse(transform, text) && Smarts.parse(left, text.substring(0, text.indexOf(">>")))) {
                rows.add(new Rewrite(row.text("what"), ((QueryAtom) left.getAtom(0)).getExpression(), transform));
            } else {
                problems.add(row.problem("transformation", "a SMIRKS (" + transform.message() + ")"));
            }
        }
        if (!problems.isEmpty()) {
            throw new TableException(problems);
        }
        return new Normalisations(rows);
    }

    /** Changes the molecule where a row fits and says so in {@code warnings}. */
    void apply(IAtomContainer molecule, List<IAtom> oddAtoms, List<String> warnings) {
        for (Rewrite row : rows) {
            if (row.worthTrying(oddAtoms) && row.transform().apply(molecule)) {
                warnings.add("redrawn: " + row.what());
            }
        }
    }
}
