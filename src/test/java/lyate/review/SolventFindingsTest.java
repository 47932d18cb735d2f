package lyate.review;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.Optional;
import lyate.molecule.MoleculeReader;
import lyate.stock.Stockroom;
import lyate.table.TableFolders;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class SolventFindingsTest {

    private static final Stockroom STOCKROOM = Stockroom.load(TableFolders.packaged());
    private static final StepReviewer REVIEWER = StepReviewer.load(TableFolders.packaged());

    /** Melting and boiling points: CRC Handbook of Chemistry and Physics, 90th ed., section 15. */
    @ParameterizedTest
    @CsvSource({"DMSO, 0, 1", "DMSO, 25, 0", "dioxane, -20, 1", "benzene, -78, 1", "THF, -78, 0", "THF, 100, 1", "THF, 60, 0",
        "cyclohexane, 5, 0"})
    void aSolventThatIsNoLiquidAtTheTemperatureIsNamed(String solvent, double celsius, long findings) throws Exception {
        assertEquals(findings, review("KOtBu", solvent, celsius).findings().stream()
                .filter(finding -> finding.kind() == FindingKind.SOLVENT_STATE).count());
    }

    @ParameterizedTest
    @CsvSource({"LiHMDS, THF, 65, 1", "LiHMDS, THF, 0, 0"})
    void aBaseWarmerThanItIsUsuallyKeptIsNamed(String base, String solvent, double celsius, long findings) throws Exception {
        assertEquals(findings, review(base, solvent, celsius).findings().stream()
                .filter(finding -> finding.sentence().contains("usually kept")).count());
    }

    @ParameterizedTest
    @CsvSource({"TFA, 1", "acetic acid, 0", "THF, 0"})
    void aGroupThatAnAcidSolventTakesOffIsNamed(String solvent, long findings) throws Exception {
        Review review = REVIEWER.review(new Step("acid", new MoleculeReader().read("CC(C)(C)OC(=O)NCc1ccccc1"), Optional.of("N8"),
                STOCKROOM.base("Et3N"), 1, STOCKROOM.solvent(solvent), 25, 0.2, 0, Optional.empty()));
        assertEquals(findings, review.findings().stream()
                .filter(finding -> finding.kind() == FindingKind.PROTECTING_GROUP_LOSS).count());
    }

    private static Review review(String base, String solvent, double celsius) throws Exception {
        return REVIEWER.review(new Step("state", new MoleculeReader().read("Oc1ccccc1"), Optional.of("O1"), STOCKROOM.base(base), 1,
                STOCKROOM.solvent(solvent), celsius, 0.2, 0, Optional.empty()));
    }
}
