package lyate.bench;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.IntStream;
import lyate.molecule.Molecule;
import lyate.molecule.MoleculeException;
import lyate.molecule.MoleculeReader;
import lyate.review.Finding.Severity;
import lyate.table.TableException;
import lyate.table.TableFolders;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class QuenchHazardsTest {

    private final QuenchHazards hazards = QuenchHazards.load(TableFolders.packaged(), Reviews.STOCK);

    @Test
    void everyRowFindsItsExampleAndLeavesItsCounterExample() throws MoleculeException {
        for (QuenchHazards.Rule rule : hazards.rules()) {
            assertTrue(matches(rule, rule.hit()), rule.id() + " should find " + rule.hit());
            assertTrue(!matches(rule, rule.miss()), rule.id() + " should leave " + rule.miss());
        }
    }

    /** A molecule with a trityl ether and a phenyl ester: each suffers on its own side of neutral. */
    @Test
    void onlyThePHThatIsReachedCounts() throws MoleculeException {
        Molecule molecule = read("CC(=O)Oc1ccc(COC(c2ccccc2)(c2ccccc2)c2ccccc2)cc1");
        assertEquals(List.of("trityl"), groups(molecule, 1, 9));
        assertEquals(List.of("aryl ester"), groups(molecule, 6, 13));
        assertEquals(List.of(), groups(molecule, 6, 9));
        assertEquals(List.of("trityl", "aryl ester"), groups(molecule, 1, 13));
    }

    @Test
    void acidOnCyanideIsAStop() throws MoleculeException {
        GroupHazard found = hazards.of(read("[C-]#N"), 7, 9).get(0);
        assertEquals(Severity.STOP, found.severity());
        assertTrue(found.acid() && found.sentence().contains("hydrogen cyanide"));
    }

    @Test
    void aRowWithoutALimitOrWithABrokenPatternIsRefused(@TempDir Path folder) throws IOException {
        assertRefused(folder, "[OX2]C,", "above_ph");
        assertRefused(folder, "[OX2,9", "a SMARTS pattern");
    }

    private static void assertRefused(Path folder, String cells, String part) throws IOException {
        Files.writeString(folder.resolve("quench-hazards.csv"), "# version: 1\n"
                + "id,group,smarts,above_ph,severity,sentence,source,hit,miss\n"
                + "own,own," + cells + ",note,says something,common practice,CO,CC\n");
        String message = assertThrows(TableException.class, () -> QuenchHazards.load(TableFolders.overlaidBy(folder), Reviews.STOCK)).getMessage();
        assertTrue(message.contains(part), message);
    }

    /** The group a sentence is about. */
    private List<String> groups(Molecule molecule, double lowest, double highest) {
        return hazards.of(molecule, lowest, highest).stream()
                .map(hazard -> hazard.sentence().replaceAll("^The (trityl|aryl ester) .*", "$1")).toList();
    }

    private static boolean matches(QuenchHazards.Rule rule, String smiles) throws MoleculeException {
        Molecule molecule = read(smiles);
        return IntStream.range(0, molecule.atomCount()).anyMatch(atom -> rule.pattern().matches(molecule, atom));
    }

    private static Molecule read(String smiles) throws MoleculeException {
        return new MoleculeReader().read(smiles);
    }
}
