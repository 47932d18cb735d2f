package lyate.molecule;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.stream.Stream;
import lyate.table.Row;
import lyate.table.Table;
import lyate.table.TableFolders;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** Every row of {@code counter-ions.csv} is set aside beside a substrate. */
class CounterIonsTest {

    static Stream<Row> rows() {
        return Table.read(CounterIons.SCHEMA, TableFolders.packaged()).rows().stream();
    }

    @ParameterizedTest
    @MethodSource("rows")
    void aCounterIonIsSetAside(Row row) throws MoleculeException {
        Molecule molecule = new MoleculeReader().read("c1ccc2ccccc2c1CCCCN." + row.text("smiles"));
        assertEquals(1, molecule.counterIons().size(), row.id());
        assertEquals("C14H17N", molecule.formula(), row.id());
    }
}
