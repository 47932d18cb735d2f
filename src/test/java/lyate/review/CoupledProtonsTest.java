package lyate.review;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Optional;
import lyate.molecule.MoleculeReader;
import lyate.stock.Stockroom;
import lyate.table.TableFolders;
import org.junit.jupiter.api.Test;

/** Second protons of one molecule, and second stages of one base, at real amounts. */
class CoupledProtonsTest {

    private static final Stockroom STOCKROOM = Stockroom.load(TableFolders.packaged());
    private static final Reviewer REVIEWER = StepReviewer.load(TableFolders.packaged());

    /** Huckin & Weiler, J. Am. Chem. Soc. 1974, 96, 1082 (from memory). */
    @Test
    void twoEquivalentsOfLithiumAmideMakeTheDianionOfAcetoacetateAndOneDoesNot() throws Exception {
        assertEquals(Verdict.SELECTIVE, review("CC(=O)CC(=O)OCC", "C1", "LDA", 2.2, "THF", -78).verdict());
        assertEquals(Verdict.WRONG_SITE, review("CC(=O)CC(=O)OCC", "C1", "LDA", 1.05, "THF", -78).verdict());
    }

    /** Stoichiometry: the first equivalent goes to the N-H, the second to the C-H, and nothing speaks against that. */
    @Test
    void aFirstProtonThatIsPaidForIsANoteAndOneThatIsNotAStop() throws Exception {
        String carbamate = "CC(C)(C)OC(=O)NCC(=O)OC";
        assertEquals(Finding.Severity.NOTE, severity(review(carbamate, "C9", "LDA", 2.2, "THF", -78), FindingKind.KINETIC_SITE));
        assertEquals(Finding.Severity.NOTE, severity(review(carbamate, "C9", "LDA", 2.2, "THF", -78), FindingKind.SECOND_EQUIVALENT_NEEDED));
        assertEquals(Finding.Severity.STOP, severity(review(carbamate, "C9", "LDA", 1.05, "THF", -78), FindingKind.KINETIC_SITE));
    }

    /** Stoichiometry: what is left after the N-H goes to the C-H. */
    @Test
    void aBaseThatGoesOnIsNotSaidToTakeTheIntendedProtonAlone() throws Exception {
        String carbamate = "CC(C)(C)OC(=O)NCC(=O)OC";
        assertTrue(review(carbamate, "N8", "LDA", 2.2, "THF", -78).meaning().endsWith("not it alone"));
        assertTrue(review(carbamate, "N8", "LDA", 1.0, "THF", -78).meaning().endsWith("no other without need"));
    }

    /** Common practice: two equivalents of butyllithium for propargyl alcohol. */
    @Test
    void theAcetylideOfPropargylAlcoholNeedsTwoEquivalents() throws Exception {
        assertEquals(Verdict.SELECTIVE, review("C#CCO", "C1", "n-BuLi", 2.1, "THF", -78).verdict());
        assertEquals("O4", review("C#CCO", "C1", "n-BuLi", 1.0, "THF", -78).firstSite());
    }

    /** Stoichiometry: two carboxylic acids of one molecule share two equivalents of base. */
    @Test
    void oneEquivalentTakesOneProtonOfEachDicarboxylicAcid() throws Exception {
        assertEquals(100, review("OC(=O)CCCCC(=O)O", "O1", "KOH", 1.0, "water", 25).intendedPercent(), 2);
        assertEquals(50, review("OC(=O)CCCCC(=O)O", "O1", "KOH", 0.5, "water", 25).intendedPercent(), 2);
    }

    /** Carbonic acid 6.35 and 10.33, CRC Handbook of Chemistry and Physics (from memory): carbonate takes two protons of a strong acid. */
    @Test
    void halfAnEquivalentOfCarbonateTakesAStrongAcidInFull() throws Exception {
        double taken = review("OC(=O)C(F)(F)F", "O1", "K2CO3", 0.5, "water", 25).intendedPercent();
        assertTrue(taken > 99, "taken " + taken + " %");
    }

    /** Hydrogen does not come back (common practice): what the hydride takes, it takes mole for mole. */
    @Test
    void aHydrideTakesItsProtonsMoleForMole() throws Exception {
        assertEquals(70, review("O=C1CCCCC1", "C3", "NaH", 0.7, "THF", 25).intendedPercent(), 1);
        assertEquals(100, review("Oc1ccccc1", "O1", "NaH", 1.0, "THF", 25).intendedPercent(), 1);
    }

    private static Finding.Severity severity(Review review, FindingKind kind) {
        return review.findings().stream().filter(finding -> finding.kind() == kind).findFirst().orElseThrow().severity();
    }

    private static Review review(String substrate, String site, String base, double equivalents, String solvent, double celsius) throws Exception {
        return REVIEWER.review(new Step("1", new MoleculeReader().read(substrate), Optional.of(site), STOCKROOM.base(base),
                equivalents, STOCKROOM.solvent(solvent), celsius, 0.2, 20, Optional.empty()));
    }
}
