package lyate.command;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.nio.charset.StandardCharsets;
import org.junit.jupiter.api.Test;

/** Acids on the command line: ranked for a salt, and in place of a base in a check. */
class AcidsCommandTest {

    private static final String PYRIDYLETHYLAMINE = "c1ccncc1CCN";

    private final ByteArrayOutputStream out = new ByteArrayOutputStream();
    private final ByteArrayOutputStream err = new ByteArrayOutputStream();

    @Test
    void acidsAreRankedWithTheReason() {
        assertEquals(0, run("acids", "--substrate", "CC(C)(C)OC(=O)N1CCNCC1", "--solvent", "ethyl acetate", "--format", "csv", "--top", "0"));
        String[] lines = text().split("\n");
        assertEquals("rank,acid,verdict,probability,log_k,first_site,intended_percent,other_percent,findings,why", lines[0]);
        assertTrue(lines.length > 40, "every acid of the shelf");
        assertTrue(place(lines, "benzoic acid") < place(lines, "methanesulfonic acid"), text());
        assertTrue(lines[place(lines, "methanesulfonic acid")].contains("Boc"), text());
    }

    @Test
    void anAcidNamedAsTheBaseIsReviewedAsAProtonation() {
        assertEquals(0, run("check", "--substrate", PYRIDYLETHYLAMINE, "--base", "TFA", "--solvent", "acetone"));
        assertTrue(text().startsWith("selective") && text().contains("intended site  N9 takes a proton"), text());
    }

    @Test
    void aSiteThatTakesNoProtonIsRefusedInWords() {
        assertEquals(1, run("acids", "--substrate", PYRIDYLETHYLAMINE, "--site", "C7", "--solvent", "acetone"));
        assertTrue(err.toString(StandardCharsets.UTF_8).contains("the basic sites are N9, N4"), err.toString(StandardCharsets.UTF_8));
    }

    @Test
    void aProtonationAsCsvHasTheColumnsOfAReviewedSheet() {
        assertEquals(0, run("check", "--substrate", PYRIDYLETHYLAMINE, "--acid", "MsOH", "--equiv", "2", "--site", "N4", "--solvent", "acetone",
                "--format", "csv"));
        assertTrue(text().contains("verdict,probability,log_k") && text().contains(",selective,"), text());
    }

    private int run(String... arguments) {
        return Lyate.run(Terminal.of(new ByteArrayInputStream(new byte[0]), out, err, false), arguments);
    }

    private String text() {
        return out.toString(StandardCharsets.UTF_8);
    }

    private static int place(String[] lines, String acid) {
        for (int i = 0; i < lines.length; i++) {
            if (lines[i].contains("," + acid + ",")) {
                return i;
            }
        }
        throw new AssertionError(acid + " is not ranked");
    }
}
