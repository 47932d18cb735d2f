package lyate.sheet;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.HashSet;
import java.util.Set;
import lyate.molecule.MoleculeException;
import lyate.molecule.MoleculeReader;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** The sheet that speed is measured with is what it says it is. */
class LongSheetTest {

    @Test
    void everyStructureIsSoundAndHardlyAnyComesTwice() throws MoleculeException {
        MoleculeReader reader = new MoleculeReader();
        Set<String> different = new HashSet<>();
        int looked = 0;
        for (int row = 0; row < 100_000; row += 37) {
            different.add(reader.read(LongSheet.substrate(row)).canonicalKey());
            looked++;
        }
        assertTrue(different.size() >= 0.995 * looked, different.size() + " of " + looked);
    }

    @Test
    void rowsAreSteps(@TempDir Path folder) throws IOException, SheetException {
        Path file = folder.resolve("long.csv");
        LongSheet.write(50, file);
        assertEquals(51, Files.readAllLines(file).size());
        assertEquals("R49", RouteSheet.read(file).rows().get(49).name());
    }
}
