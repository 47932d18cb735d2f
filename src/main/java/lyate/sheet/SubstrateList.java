package lyate.sheet;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.Reader;
import java.util.Iterator;
import java.util.stream.Stream;
import lyate.molecule.Molecule;
import lyate.molecule.MoleculeReader;
import lyate.molecule.SdfRecord;

/**
 * A file of substrates, all set against the same conditions, as the rows of a sheet; keeps none of them. The rows are
 * drawn one by one.
 */
public final class SubstrateList implements RowSource {

    private final SheetHeader header;
    private final Iterator<SheetRow> rows;

    private SubstrateList(SheetHeader header, Stream<SheetRow> rows) {
        this.header = header;
        this.rows = rows.iterator();
    }

    /**
     * A .smi file: a SMILES a line, then its name after a blank; a substrate without a name goes by its number. Empty
     * lines are passed over.
     */
    public static SubstrateList ofSmiles(Reader smi, Conditions conditions) throws IOException {
        SheetHeader header = conditions.header();
        BufferedReader lines = new BufferedReader(smi);
        lines.mark(1);
        if (lines.read() != '\uFEFF') {
            lines.reset();
        }
        int[] count = new int[2];
        return new SubstrateList(header, lines.lines().peek(line -> count[0]++).filter(line -> !line.isBlank()).map(line -> {
            String[] parts = line.strip().split("\\s+", 2);
            return conditions.row(header, ++count[1], count[0], parts.length > 1 ? parts[1] : "", parts[0], "");
        }));
    }

    /**
     * A .sdf file: its records as SMILES, so that a site is named by its place in that SMILES; data items are left out. A
     * record without a title goes by its number.
     */
    public static SubstrateList ofSdf(Reader sdf, MoleculeReader molecules, Conditions conditions) {
        SheetHeader header = conditions.header();
        return new SubstrateList(header, molecules.readSdf(sdf).map(entry -> row(entry, header, conditions)));
    }

    private static SheetRow row(SdfRecord entry, SheetHeader header, Conditions conditions) {
        return conditions.row(header, entry.number(), 0, entry.name(), entry.molecule().map(Molecule::smiles).orElse(""),
                entry.problem());
    }

    @Override
    public SheetHeader header() {
        return header;
    }

    @Override
    public boolean hasNext() {
        return rows.hasNext();
    }

    @Override
    public SheetRow next() {
        return rows.next();
    }
}
