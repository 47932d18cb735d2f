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
import org.junit.jupiter.params.provider.ValueSource;

/** Reactions on the command line: one with check, many with review, as text, in a sheet and as files. */
class ReactionCommandTest {

    private static final String FILES = "src/test/resources/lyate/sheet/reactions/";
    private static final String ALKYLATION = "O=C1CCCCC1.CI>CC(C)[N-]C(C)C.[Li+].C1CCOC1>CC1CCCCC1=O";

    @TempDir
    private Path folder;

    @Test
    void theInferredSiteAndItsConfidenceAsText() {
        CommandRun run = CommandRun.of("", "check", "--reaction", ALKYLATION, "--temperature", "-78");
        assertEquals(0, run.code(), run.err());
        assertTrue(run.out().contains("  intended site  C3 (reaction: C3, sure: one assignment)\n"), run.out());
    }

    @Test
    void asJsonAndHtml() {
        String json = CommandRun.of("", "check", "--reaction", ALKYLATION, "--format", "json").out();
        assertTrue(json.replaceAll("\\s", "").contains("\"reaction_site\":{\"site\":\"C3\",\"sure\":true,\"confidence\":\"sure:oneassignment\","
                + "\"alternatives\":[],\"remarks\":[]}"), json);
        String html = CommandRun.of("", "check", "--reaction", ALKYLATION, "--format", "html").out();
        assertTrue(html.contains("C3 (reaction: C3, sure: one assignment)"));
        assertTrue(html.contains("No intended site given: C3 was taken from the reaction."));
    }

    @ParameterizedTest
    @ValueSource(strings = {"methylation-v2000.rxn", "methylation-v3000.rxn", "four-records.rdf"})
    void filesOfEveryFormat(String file) {
        CommandRun run = CommandRun.of("", "check", "--reaction", FILES + file);
        assertEquals(0, run.code(), run.err());
        assertTrue(run.out().contains("intended site  O1 (reaction: O1, sure: mapped)"), run.out());
        assertTrue(run.out().contains("base           potassium carbonate"), run.out());
    }

    @Test
    void aProtonationIsJudgedAsOne() {
        CommandRun run = CommandRun.of("", "check", "--reaction", "CNCc1ccccc1.Cl>CCOCC>C[NH2+]Cc1ccccc1.[Cl-]");
        assertEquals(0, run.code(), run.err());
        assertTrue(run.out().contains("  intended site  N2 takes a proton"), run.out());
        assertTrue(run.out().contains("concentrated hydrochloric acid"), run.out());
    }

    @Test
    void aDisagreementIsAFinding() {
        CommandRun run = CommandRun.of("", "check", "--reaction", "NCCO.CC(Cl)=O>Et3N.DCM>CC(=O)NCCO", "--site", "O4");
        assertTrue(run.out().contains("caution  site-disagrees: The step names O4 as intended site, but in the reaction the proton leaves from N1."), run.out());
    }

    @Test
    void whatARXNFileLacksIsAskedFor() throws IOException {
        Path broken = Files.writeString(folder.resolve("empty.rxn"), "$RXN\n");
        CommandRun run = CommandRun.of("", "check", "--reaction", broken.toString());
        assertEquals(1, run.code());
        assertEquals("--reaction: line 5: the file breaks off, expected the numbers of reactants and products, three places each\n", run.err());
        assertEquals("lyate check: there is no file nowhere.rxn\n", CommandRun.of("", "check", "--reaction", "nowhere.rxn").err());
    }

    @Test
    void aColumnReactionAddsSiteAndConfidence() throws IOException {
        Path sheet = Files.writeString(folder.resolve("sheet.csv"), "step,reaction,base,solvent\nA," + ALKYLATION + ",,\n"
                + "B,Oc1ccc(O)cc1C.CI.CI>>COc1ccc(OC)cc1C,K2CO3,DMF\nC,CC(C)=O>>,LDA,THF\n");
        List<String> lines = CommandRun.of("", "review", sheet.toString()).out().lines().toList();
        assertTrue(lines.get(0).endsWith(",findings,reaction_site,reaction_confidence"), lines.get(0));
        assertTrue(lines.get(1).endsWith(",C3,sure: one assignment"), lines.get(1));
        assertTrue(lines.get(2).contains("site-unsure") && lines.get(2).endsWith(",O6,unsure: 2 sites lose a proton"), lines.get(2));
        assertTrue(lines.get(3).contains("site-unsure") && lines.get(3).endsWith(",,unsure: no product is drawn"), lines.get(3));
    }

    @Test
    void anRdFileIsReviewedRecordByRecord() {
        CommandRun run = CommandRun.of("", "review", FILES + "four-records.rdf", "--temperature", "20");
        assertEquals(1, run.code());
        assertTrue(run.err().startsWith("row 2 (methylation of phenol, line 112): reactant 1 (from line 119): line 5 of the molfile"), run.err());
        assertTrue(run.err().contains("row 3 (line 214): line 214: the record holds no reaction"), run.err());
        assertTrue(run.out().contains("\nsound,,,1.5,,40,"), "its own temperature, not the one asked for");
        assertTrue(run.out().contains("\nnamed,,NaH,,DMF,20,"), run.out());
        assertTrue(run.out().contains("\"yield: 91 %\nremark: kept over\nnight\""), "what is for no column is kept in the notes");
    }

    @Test
    void aFileWithoutReactionsIsRefused() {
        assertEquals("lyate review: there is no reaction in the file: no line begins with $RXN\n",
                CommandRun.of("", "review", FILES + "no-reaction.rdf").err());
    }
}
