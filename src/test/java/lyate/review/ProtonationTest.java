package lyate.review;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Optional;
import lyate.molecule.MoleculeException;
import lyate.molecule.MoleculeReader;
import lyate.stock.Medium;
import lyate.stock.Stockroom;
import lyate.stock.UnknownNameException;
import lyate.table.TableFolders;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Salts: which acid protonates which basic site, and what it costs. */
class ProtonationTest {

    private static final Stockroom STOCK = Stockroom.load(TableFolders.packaged());
    private static final ProtonationReviewer REVIEWER = ProtonationReviewer.load(TableFolders.packaged(), STOCK);
    private static final AcidHazards HAZARDS = AcidHazards.load(TableFolders.packaged(), STOCK);
    private static final String BOC_PIPERAZINE = "CC(C)(C)OC(=O)N1CCNCC1";
    private static final String PYRIDYLETHYLAMINE = "c1ccncc1CCN";

    /** pKa in water: triethylamine 10.75, pyridine 5.2, acetic acid 4.76, HCl -6, diphenylamine 0.8, citric acid 3.1 (CRC Handbook). */
    @ParameterizedTest
    @CsvSource({
        "CCN(CC)CC, acetic acid, selective",
        "CCN(CC)CC, 4 M HCl in dioxane, selective",
        "c1ccncc1, acetic acid, partial",
        "c1ccncc1, methanesulfonic acid, selective",
        "c1ccccc1Nc1ccccc1, citric acid, too-weak",
        "CN1CCC[C@H]1c1cccnc1, L-tartaric acid, selective"})
    void theRuleOfThreeDecidesWhetherASaltForms(String base, String acid, String verdict) throws Exception {
        assertEquals(verdict, review(base, "", acid, 1, "acetone").verdict().code());
    }

    @Test
    void theMoreBasicNitrogenTakesTheFirstProtonAndASecondEquivalentReachesTheOther() throws Exception {
        Protonation one = review(PYRIDYLETHYLAMINE, "N4", "methanesulfonic acid", 1, "ethyl acetate");
        assertEquals(Verdict.WRONG_SITE, one.verdict());
        assertEquals("N9", one.firstSite());
        assertTrue(kinds(one).contains("unintended-protonation"), kinds(one).toString());
        Protonation two = review(PYRIDYLETHYLAMINE, "N4", "methanesulfonic acid", 2, "ethyl acetate");
        assertEquals(Verdict.SELECTIVE, two.verdict());
        assertTrue(two.intendedPercent() > 95, two.intendedPercent() + " %");
    }

    @Test
    void aBasicSolventTakesTheProtonOver() throws Exception {
        Protonation inPyridine = review("Nc1ccccc1", "", "hydrogen chloride in dioxane", 1, "pyridine");
        assertEquals(Verdict.LEVELLED, inPyridine.verdict());
        assertEquals("solvent", inPyridine.firstSite());
        assertEquals(Verdict.SELECTIVE, review("Nc1ccccc1", "", "hydrogen chloride in dioxane", 1, "dioxane").verdict());
    }

    @Test
    void anAminoAcidIsToldToBeASaltOfItsOwn() throws Exception {
        assertTrue(kinds(review("NCCC(=O)O", "N1", "methanesulfonic acid", 1, "water")).contains("internal-salt"));
        assertFalse(kinds(review("CCN(CC)CC", "", "methanesulfonic acid", 1, "water")).contains("internal-salt"));
    }

    @Test
    void halfAnEquivalentOfADiacidIsEnough() throws Exception {
        Protonation fumarate = review("CCN(CC)CC", "", "fumaric acid", 1, "acetone");
        assertEquals(2, fumarate.protonsToGive());
        assertTrue(kinds(fumarate).contains("excess-acid"));
        Protonation half = review("CCN(CC)CC", "", "fumaric acid", 0.5, "acetone");
        assertFalse(kinds(half).contains("excess-acid"));
        assertTrue(half.intendedPercent() > 95, half.intendedPercent() + " %");
    }

    @Test
    void acidsThatWouldTakeBocOffStandBehindThoseThatDoNot() throws Exception {
        List<RankedAcid> ranked = rank(BOC_PIPERAZINE, "ethyl acetate");
        RankedAcid first = ranked.get(0);
        assertTrue(first.suits() && first.acid().pKa(Medium.WATER).orElseThrow().pKa() > 1, first.acid().name());
        int lastGood = (int) ranked.stream().filter(RankedAcid::suits).count() - 1;
        assertTrue(lastGood >= 3, "several suit");
        RankedAcid mesylate = named(ranked, "msoh");
        assertTrue(ranked.indexOf(mesylate) > lastGood);
        assertTrue(mesylate.why().contains("Boc"), mesylate.why());
    }

    @Test
    void amongAcidsThatSuitTheWeakestThatStillDoesItComesBeforeTheStrongest() throws Exception {
        List<RankedAcid> ranked = rank("CCN(CC)CC", "acetone");
        assertTrue(ranked.indexOf(named(ranked, "succinic")) < ranked.indexOf(named(ranked, "h2so4")));
        assertTrue(ranked.indexOf(named(ranked, "h2so4")) < ranked.indexOf(named(ranked, "water")));
    }

    @Test
    void aSubstrateWithoutABasicSiteIsRefusedInWords() {
        ReviewException refused = assertThrows(ReviewException.class, () -> review("CC(C)C", "", "acetic acid", 1, "acetone"));
        assertTrue(refused.getMessage().contains("no basic site"), refused.getMessage());
        ReviewException wrongAtom = assertThrows(ReviewException.class, () -> review(PYRIDYLETHYLAMINE, "C7", "acetic acid", 1, "acetone"));
        assertTrue(wrongAtom.getMessage().contains("N4, ") || wrongAtom.getMessage().contains("N9, "), wrongAtom.getMessage());
    }

    @Test
    void everyHazardDefersToThoseWhoDecide() throws Exception {
        List<Finding> found = HAZARDS.of(STOCK.acid("TFA"), STOCK.solvent("DCM"));
        assertTrue(!found.isEmpty() && found.stream().allMatch(finding -> finding.evidence().contains(BaseHazards.STANDING_LINE)));
    }

    private static List<RankedAcid> rank(String smiles, String solvent) throws Exception {
        return new AcidChoice(REVIEWER, STOCK).rank(step(smiles, "", "acetic acid", 1, solvent));
    }

    private static RankedAcid named(List<RankedAcid> ranked, String id) {
        return ranked.stream().filter(choice -> choice.acid().id().equals(id)).findFirst().orElseThrow();
    }

    private static List<String> kinds(Protonation protonation) {
        return protonation.findings().stream().map(finding -> finding.kind().code()).toList();
    }

    private static Protonation review(String smiles, String site, String acid, double equivalents, String solvent) throws Exception {
        return REVIEWER.review(step(smiles, site, acid, equivalents, solvent));
    }

    private static AcidStep step(String smiles, String site, String acid, double equivalents, String solvent)
            throws MoleculeException, UnknownNameException {
        return new AcidStep("test", new MoleculeReader().read(smiles), site.isEmpty() ? Optional.empty() : Optional.of(site),
                STOCK.acid(acid), equivalents, STOCK.solvent(solvent), 25, 0.2);
    }
}
