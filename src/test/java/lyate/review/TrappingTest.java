package lyate.review;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import lyate.molecule.MoleculeReader;
import lyate.stock.Stockroom;
import lyate.table.TableFolders;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;

/** A partial equilibrium that an electrophile draws to its end; carbon dioxide from carbonate. */
class TrappingTest {

    private static final Stockroom STOCK = Stockroom.load(TableFolders.packaged());
    private static final StepReviewer REVIEWER = StepReviewer.load(TableFolders.packaged(), STOCK);

    static Stream<Trapping.Electrophile> electrophiles() {
        return Trapping.load(TableFolders.packaged()).electrophiles().stream();
    }

    @ParameterizedTest
    @MethodSource("electrophiles")
    void aRowFindsItsHitAndIsTheFirstToDoSo(Trapping.Electrophile row) throws Exception {
        var hit = new MoleculeReader().read(row.hit());
        assertEquals(row.id(), electrophiles().filter(other -> other.isIn(hit)).findFirst().orElseThrow().id());
        assertFalse(row.isIn(new MoleculeReader().read(row.miss())), row.id() + " is found in " + row.miss());
    }

    /** Williamson ether synthesis of phenols with potassium carbonate in acetone (common practice): works though K is near 1. */
    @ParameterizedTest
    @CsvSource({"CI, true", "CC(=O)OC(C)=O, true", "C=CC(=O)OC, false", "CC(C)(C)Br, false"})
    void aPartialEquilibriumIsDrawnByWhatReactsForGood(String partner, boolean trapped) throws Exception {
        Review review = review("Oc1ccc(C)cc1", "K2CO3", "acetone", Optional.of(partner));
        assertEquals(Verdict.PARTIAL, review.verdict());
        assertEquals(trapped, kinds(review).contains(FindingKind.TRAPPING), kinds(review).toString());
    }

    /** Phenols are alkylated with potassium carbonate in DMF or acetone (common practice). */
    @Test
    void aWeakBaseIsAChoiceWhereTheElectrophileDrawsTheEquilibrium() throws Exception {
        BaseChoice choice = new BaseChoice(REVIEWER, STOCK);
        Review alone = review("Oc1ccc(CC#N)cc1", "K2CO3", "DMF", Optional.empty());
        Review drawn = review("Oc1ccc(CC#N)cc1", "K2CO3", "DMF", Optional.of("CCCCBr"));
        assertFalse(place(choice.rank(alone.step()), "k2co3").suits());
        RankedBase carbonate = place(choice.rank(drawn.step()), "k2co3");
        assertTrue(carbonate.suits());
        assertTrue(carbonate.why().contains("takes the anion of O1 away for good"), carbonate.why());
        assertTrue(choice.rank(drawn.step()).indexOf(carbonate) < 10);
    }

    private static RankedBase place(List<RankedBase> ranked, String base) {
        return ranked.stream().filter(choice -> choice.base().id().equals(base)).findFirst().orElseThrow();
    }

    @Test
    void aCompleteEquilibriumNeedsNoTrap() throws Exception {
        assertFalse(kinds(review("Oc1ccc(C)cc1", "NaH", "THF", Optional.of("CI"))).contains(FindingKind.TRAPPING));
    }

    /** Acids stronger than carbonic acid, pKa 6.35, set carbon dioxide free; phenol, 9.99, does not. */
    @Test
    void anAcidStrongerThanCarbonicSetsCarbonDioxideFree() throws Exception {
        assertTrue(kinds(review("OC(=O)c1ccccc1", "K2CO3", "DMF", Optional.empty())).contains(FindingKind.GAS_EVOLVED));
        assertFalse(kinds(review("Oc1ccccc1", "K2CO3", "DMF", Optional.empty())).contains(FindingKind.GAS_EVOLVED));
    }

    /** Triethylamine catalyses thiol additions to maleimides (common practice); a primary amine adds itself. */
    @Test
    void aTertiaryAmineIsNoEndOfAMaleimideButAPrimaryOneIs() throws Exception {
        assertFalse(review("O=C1C=CC(=O)N1", "Et3N", "THF", Optional.empty()).verdict() == Verdict.INCOMPATIBLE);
        assertEquals(Verdict.INCOMPATIBLE, review("O=C1C=CC(=O)N1", "butylamine", "THF", Optional.empty()).verdict());
    }

    private static List<FindingKind> kinds(Review review) {
        return review.findings().stream().map(Finding::kind).toList();
    }

    private static Review review(String smiles, String base, String solvent, Optional<String> partner) throws Exception {
        MoleculeReader reader = new MoleculeReader();
        return REVIEWER.review(new Step("trap", reader.read(smiles), Optional.empty(), STOCK.base(base), 1.0, STOCK.solvent(solvent), 25, 0.2, 50,
                partner.isPresent() ? Optional.of(reader.read(partner.get())) : Optional.empty()));
    }
}
