package lyate.command;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** What a user reads when a step, a reaction, a comparison or an option cannot be used: where, what was found, what was expected. */
class RefusalWordingTest {

    private record Run(int code, String said) {}

    private static Run run(String... arguments) {
        ByteArrayOutputStream err = new ByteArrayOutputStream();
        int code = Lyate.run(Terminal.of(new ByteArrayInputStream(new byte[0]), new ByteArrayOutputStream(), err, false), arguments);
        return new Run(code, err.toString(StandardCharsets.UTF_8));
    }

    private static void assertRefused(String expected, String... arguments) {
        Run run = run(arguments);
        assertNotEquals(0, run.code());
        assertTrue(run.said().contains(expected), () -> "expected \"" + expected + "\", said: " + run.said());
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', value = {
        "CC(C)=O|C9|--base|--site: there is no atom 'C9' in the substrate; its protons are on C1",
        "CC(C)=O|C2|--base|atom C2 carries no hydrogen; the proton sites are C1",
        "ClC(Cl)(Cl)Cl|C2|--base|the substrate has no proton whose pKa can be set against",
        "CCCC|C1|--acid|the substrate has no basic site whose pKa in water is known",
        "CCN|C1|--acid|atom C1 takes no proton; the basic sites are N3",
    })
    void sitesThatAreNone(String substrate, String site, String option, String expected) {
        assertRefused(expected, "check", "--substrate", substrate, "--site", site, option, option.equals("--acid") ? "HCl" : "LDA", "--solvent", "THF");
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', value = {
        "CCO..CI>>CCOC|reactant 2: there is nothing between two dots",
        ">CCO>CCOC|the reaction has no reactant",
        "[Na+].[H-]>>CC|the reaction has no reactant besides base, solvent and ions",
        "CCO>nobody-knows>CC|agent 1: 'nobody-knows' is neither SMILES nor the name of a base, solvent, acid or electrophile in the tables",
        "CC(>>CC|reactant 1: not SMILES: unclosed branch detected",
    })
    void reactionsThatAreNone(String reaction, String expected, @TempDir Path folder) throws IOException {
        Path sheet = folder.resolve("sheet.csv");
        Files.writeString(sheet, "step,reaction,base,solvent\nA," + reaction + ",NaH,THF\n");
        Run run = run("review", sheet.toString());
        assertEquals(1, run.code());
        assertTrue(run.said().contains(expected), run.said());
        assertTrue(run.said().contains("A"), run.said());
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', value = {
        "CCO,water,soon,|column pka: found 'soon', expected a number",
        "CCO,treacle,16,|column solvent: found 'treacle', expected a known solvent",
        "CCO,water,16,both|column role: found 'both', expected acid or base",
        "CCO,water|found 2 cells, expected as many as the header has",
        "ClC(Cl)(Cl)Cl,water,16,base|no pKa is stated for any site as base in water",
    })
    void rowsThatCannotBeCompared(String row, String expected, @TempDir Path folder) throws IOException {
        Path file = folder.resolve("mine.csv");
        Files.writeString(file, "smiles,solvent,pka,role\n" + row + "\n");
        assertRefused("line 2: " + expected, "accuracy", file.toString());
    }

    @Test
    void optionsThatDoNotFit(@TempDir Path folder) throws IOException {
        Path sheet = folder.resolve("sheet.csv");
        Files.writeString(sheet, "step,substrate,base,solvent\nA,CCO,NaH,THF\n");
        assertRefused("nothing to compare with: expected a second sheet or --against", "compare", sheet.toString());
        assertRefused("--format: found 'json', expected text or csv", "compare", sheet.toString(), sheet.toString(), "--format", "json");
        assertRefused("--format: a protonation can be written as text, csv or json", "check", "--substrate", "CCN", "--acid", "HCl",
                "--solvent", "water", "--format", "html");
    }
}
