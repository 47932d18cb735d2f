package lyate.window;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import lyate.molecule.MoleculeReader;
import lyate.molecule.MoleculeText;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class StructureFileTest {

    @TempDir
    private Path folder;

    private final MoleculeReader molecules = new MoleculeReader();

    @Test
    void aMolfileIsOneStructure() throws Exception {
        List<String> structures = StructureFile.read(file("one.mol", molfile("CC(=O)CC(C)=O")));
        assertEquals(1, structures.size());
        assertEquals(7, molecules.read(structures.get(0)).atomCount());
    }

    @Test
    void everyRecordOfAnSdFileIsAStructureAndItsDataAreLeftOut() throws Exception {
        String sdf = molfile("CCO") + ">  <price>\n12\n\n$$$$\n" + molfile("CCN") + "$$$$\n";
        List<String> structures = StructureFile.read(file("two.sdf", sdf));
        assertEquals(2, structures.size());
        assertEquals("N3", molecules.read(structures.get(1)).label(2));
        assertTrue(structures.stream().noneMatch(text -> text.contains("price")));
    }

    @Test
    void aLineOfASmilesFileIsAStructureUpToItsName() throws Exception {
        assertEquals(List.of("CCO", "c1ccccc1O"), StructureFile.read(file("some.smi", "# from the shelf\nCCO ethanol\r\n\nc1ccccc1O\tphenol\n")));
    }

    @Test
    void aNameOfSeveralWordsInATextIsKeptWhole() throws Exception {
        assertEquals(List.of("ethyl acetoacetate"), StructureFile.read(file("name.txt", "ethyl acetoacetate\n")));
    }

    @Test
    void aReactionFileBecomesReactionSmiles() throws Exception {
        String rxn = "$RXN\n\n\n\n  1  1\n$MOL\n" + molfile("CCO") + "$MOL\n" + molfile("CC=O");
        List<String> structures = StructureFile.read(file("step.rxn", rxn));
        assertEquals(1, structures.size());
        assertTrue(StepCells.isReaction(structures.get(0)));
        assertTrue(StepCells.isReaction(rxn), "and is one when pasted whole");
        StepReading reading = new FieldReader(Panels.engine()::steps).read(StepText.demo().withSite("").with(StepField.SUBSTRATE, structures.get(0)));
        assertEquals("C2H6O", reading.step().orElseThrow().substrate().formula());
    }

    @Test
    void whatHoldsNoStructureIsRefusedByItsName() throws Exception {
        Path blank = file("blank.smi", "\n# nothing\n");
        assertTrue(assertThrows(IOException.class, () -> StructureFile.read(blank)).getMessage().contains("blank.smi"));
        Path binary = folder.resolve("photo.mol");
        Files.write(binary, new byte[] {(byte) 0xff, (byte) 0xd8, 0, 1});
        assertTrue(assertThrows(IOException.class, () -> StructureFile.read(binary)).getMessage().contains("not text"));
        Path many = file("many.smi", "C\n".repeat(501));
        assertTrue(assertThrows(IOException.class, () -> StructureFile.read(many)).getMessage().contains("501"));
    }

    private Path file(String name, String text) throws IOException {
        return Files.writeString(folder.resolve(name), text);
    }

    private String molfile(String smiles) throws Exception {
        return MoleculeText.molfile(molecules.read(smiles));
    }
}
