package lyate.command;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Substrates from a .smi or .sdf file against one set of conditions. */
class SubstrateListCommandTest {

    private static final List<String> LDA = List.of("--base", "LDA", "--solvent", "THF", "--temperature", "-78", "--equiv", "1,05");
    /** Propanone and, with a bond to an atom that is not there, nothing. */
    private static final String SDF = """
            first


              4  3  0  0  0  0  0  0  0  0999 V2000
                0.0000    0.0000    0.0000 C   0  0
                1.0000    0.0000    0.0000 C   0  0
                2.0000    0.0000    0.0000 C   0  0
                1.0000    1.0000    0.0000 O   0  0
              1  2  1  0
              2  3  1  0
              2  4  2  0
            M  END
            > <price>
            high

            $$$$
            second


              1  1  0  0  0  0  0  0  0  0999 V2000
                0.0000    0.0000    0.0000 C   0  0
              1  9  1  0
            M  END
            $$$$
            """;

    @TempDir
    private Path folder;

    @Test
    void smilesWithTheirNames() throws IOException {
        CommandRun run = review("list.SMI", "\uFEFFCC(C)=O\tacetone, dried\r\n\r\nC(\r\nCCC(CC)=O\r\n", LDA);
        assertEquals(1, run.code());
        List<String> lines = run.out().lines().toList();
        assertEquals("step,substrate,base,base_equiv,solvent,temperature_C,verdict,probability,log_k,first_site,intended_percent,other_percent,findings",
                lines.get(0));
        assertTrue(lines.get(1).startsWith("\"acetone, dried\",CC(C)=O,LDA,\"1,05\",THF,-78,selective,"), lines.get(1));
        assertEquals("\"\",C(,LDA,\"1,05\",THF,-78,,,,,,,", lines.get(2));
        assertTrue(lines.get(3).contains("CCC(CC)=O,LDA,\"1,05\",THF,-78,selective,"), lines.get(3));
        assertTrue(run.err().startsWith("row 2 (line 3): column substrate: not SMILES"), run.err());
    }

    @Test
    void recordsOfAnSdFile() throws IOException {
        CommandRun run = review("list.sdf", SDF, LDA);
        assertEquals(1, run.code());
        List<String> lines = run.out().lines().toList();
        assertTrue(lines.get(1).startsWith("first,O=C(C)C,LDA,") || lines.get(1).startsWith("first,CC(=O)C,LDA,")
                || lines.get(1).startsWith("first,CC(C)=O,LDA,"), lines.get(1));
        assertTrue(lines.get(2).startsWith("second,,LDA,"), lines.get(2));
        assertTrue(run.err().startsWith("row 2 (second): "), run.err());
    }

    @Test
    void theResultIsASheetThatGivesTheSameVerdicts() throws IOException {
        CommandRun first = review("list.smi", "CC(C)=O\nCOC(=O)Cc1ccccc1 ester\n", LDA);
        CommandRun again = CommandRun.of(first.out(), "review", "-");
        assertEquals(first, again);
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', value = {
        "list.smi|--base LDA|a .smi or .sdf file needs --base and --solvent",
        "list.smi|--solvent THF|a .smi or .sdf file needs --base and --solvent",
        "list.csv|--solvent THF|conditions as options go with .smi, .sdf, .rxn and .rdf files; a sheet has them in its cells",
        "list.csv|--resume|--resume: expected -o with a name that ends in .csv",
        "list.csv|--resume -o x.json|--resume: expected -o with a name that ends in .csv",
        "list.csv|--resume -o x.csv --report x.html|--resume: a report needs every step; make it in a run of its own",
        "list.csv|-o x.html --report x.html|-o and --report: found the same file twice",
    })
    void optionsThatDoNotGoTogether(String name, String options, String problem) throws IOException {
        CommandRun run = review(name, "substrate\n", List.of(options.split(" ")));
        assertEquals(2, run.code());
        assertTrue(run.err().startsWith("lyate review: " + problem), run.err());
    }

    @Test
    void aResultNeverTakesThePlaceOfItsSheet() throws IOException {
        Path sheet = Files.writeString(folder.resolve("sheet.csv"), "substrate,base,solvent\nCCO,NaH,THF\n");
        CommandRun run = CommandRun.of("", "review", sheet.toString(), "-o", folder.resolve(".").resolve("sheet.csv").toString());
        assertEquals(2, run.code());
        assertTrue(run.err().contains("the result would take the place of the sheet"), run.err());
        assertEquals("substrate,base,solvent\nCCO,NaH,THF\n", Files.readString(sheet));
    }

    private CommandRun review(String name, String content, List<String> options) throws IOException {
        Path list = Files.writeString(folder.resolve(name), content);
        String[] arguments = new String[2 + options.size()];
        arguments[0] = "review";
        arguments[1] = list.toString();
        for (int i = 0; i < options.size(); i++) {
            arguments[2 + i] = options.get(i);
        }
        return CommandRun.of("", arguments);
    }
}
