package lyate.molecule;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import lyate.table.Row;
import lyate.table.Table;
import lyate.table.TableException;
import lyate.table.TableFolders;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;

/** Variants of drawing end in one form. */
class NormalisationsTest {

    private final MoleculeReader reader = new MoleculeReader();

    static Stream<Row> rows() {
        return Table.read(Normalisations.SCHEMA, TableFolders.packaged()).rows().stream();
    }

    @ParameterizedTest
    @MethodSource("rows")
    void exampleOfTheRowEndsInItsForm(Row row) throws MoleculeException {
        Molecule before = reader.read(row.text("before"));
        Molecule after = reader.read(row.text("after"));
        assertEquals(after.canonicalKey(), before.canonicalKey());
        assertEquals(List.of("redrawn: " + row.text("what")), before.warnings());
        assertEquals(List.of(), after.warnings());
    }

    @ParameterizedTest
    @CsvSource({
        "O=N(=O)c1ccc(cc1)N(=O)=O, [O-][N+](=O)c1ccc(cc1)[N+](=O)[O-]",
        "O=n1ccccc1, [O-][n+]1ccccc1",
        "C[N+](C)(C)[O-], CN(C)(C)=O",
        "CC#N=O, CC#[N+][O-]",
        "O=N(O)=O, O[N+](=O)[O-]",
        "CCOC(=O)C=N#N, CCOC(=O)[CH-][N+]#N",
        "c1ccccc1S(=O)C, c1ccccc1[S+]([O-])C",
        "C[S+](C)[CH2-], CS(C)=C",
    })
    void twoDrawingsAreOneStructure(String one, String other) throws MoleculeException {
        assertEquals(reader.read(one).canonicalKey(), reader.read(other).canonicalKey());
    }

    @ParameterizedTest
    @CsvSource({"C[N+](C)(C)C", "CC(=O)[O-]", "C[S+](C)C", "[O-]C=C[P+](C)(C)C", "C[N+]#[C-]"})
    void otherChargesStay(String smiles) throws MoleculeException {
        assertTrue(reader.read(smiles).warnings().isEmpty());
    }

    @Test
    void transformationThatDoesNotCompileIsReportedWithItsLine(@TempDir Path folder) throws IOException {
        Files.writeString(folder.resolve("normalisations.csv"), "# version: 1\n"
                + "id,what,transformation,before,after,source\nmine,x,[N:1>>[O:1],N,O,nobody\n");
        TableException refused = assertThrows(TableException.class, () -> MoleculeReader.load(TableFolders.overlaidBy(folder)));
        assertTrue(refused.getMessage().contains("normalisations.csv:3: column transformation: found '[N:1>>[O:1]', expected a SMIRKS"),
                refused.getMessage());
    }

    @Test
    void rowOfTheUserIsApplied(@TempDir Path folder) throws IOException, MoleculeException {
        Files.writeString(folder.resolve("normalisations.csv"), "# version: 1\n"
                + "id,what,transformation,before,after,source\n"
                + "enolate,enolate as carbanion,[O-1:1]-[#6:2]=[#6:3]>>[O+0:1]=[#6:2]-[#6-1:3],[O-]C=C,O=C[CH2-],test\n");
        Molecule enolate = MoleculeReader.load(TableFolders.overlaidBy(folder)).read("[O-]C=C");
        assertEquals(reader.read("O=C[CH2-]").canonicalKey(), enolate.canonicalKey());
    }
}
