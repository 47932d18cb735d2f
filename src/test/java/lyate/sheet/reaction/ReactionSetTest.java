package lyate.sheet.reaction;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import lyate.molecule.MoleculeException;
import lyate.molecule.MoleculeReader;
import lyate.sheet.reaction.ReactionSet.Row;
import lyate.stock.Stockroom;
import lyate.table.TableFolders;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** The proton meant in a set of reactions from general chemistry that was written down before the inference was. */
class ReactionSetTest {

    private static final ReactionReader READER = new ReactionReader(new MoleculeReader(), Stockroom.load(TableFolders.packaged()));

    static List<Row> rows() {
        return ReactionSet.rows();
    }

    /** The bar of the design is 95 %; every row that is right today stays so. */
    @ParameterizedTest
    @MethodSource("rows")
    void theProtonThatAChemistMeans(Row row) throws MoleculeException {
        Reaction read = READER.read(row.reaction());
        assertTrue(row.accepts(read), "reactant " + read.reactant() + ", " + read.origin());
    }

    @Test
    void nearlyAllAreSure() throws MoleculeException {
        List<String> unsure = new ArrayList<>();
        for (Row row : rows()) {
            if (!READER.read(row.reaction()).origin().sure()) {
                unsure.add(row.id());
            }
        }
        assertEquals(List.of("u44", "uh18", "mh40", "l12", "l24"), unsure, "each of these takes two protons");
    }

    @ParameterizedTest
    @MethodSource("rows")
    void aMapIsSaidToBeTheReason(Row row) throws MoleculeException {
        assertEquals(row.map().equals("mapped"), READER.read(row.reaction()).origin().basis().equals("mapped"));
    }

    /** A deprotonation is told from a protonation by what happens to the proton. */
    @ParameterizedTest
    @MethodSource("rows")
    void protonsArriveInProtonationsAlone(Row row) throws MoleculeException {
        boolean arrives = READER.read(row.reaction()).origin().arrives();
        assertTrue(row.kind().equals("salt") || arrives == row.kind().equals("protonation"));
    }
}
