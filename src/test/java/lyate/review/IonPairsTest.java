package lyate.review;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Optional;
import lyate.molecule.Molecule;
import lyate.molecule.MoleculeException;
import lyate.molecule.MoleculeReader;
import lyate.stock.Stockroom;
import lyate.stock.UnknownNameException;
import lyate.table.TableFolders;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Lithium amides in ethers do what they do in the textbooks, no less and no more. */
class IonPairsTest {

    private static final TableFolders TABLES = TableFolders.packaged();
    private static final Stockroom STOCKROOM = Stockroom.load(TABLES);
    private static final StepReviewer REVIEWER = StepReviewer.load(TABLES, STOCKROOM);

    private static Review review(String substrate, String site, String base, String solvent)
            throws MoleculeException, UnknownNameException, ReviewException {
        Molecule molecule = new MoleculeReader().read(substrate);
        return REVIEWER.review(new Step("1", molecule, Optional.of(site), STOCKROOM.base(base), 1.05, STOCKROOM.solvent(solvent), -78, 0.2,
                30, Optional.empty()));
    }

    /**
     * Rathke, J. Am. Chem. Soc. 1970, 92, 3222 (ethyl acetate); Rathke & Lindert, ibid. 1971, 93, 2318 (esters); Woodbury & Rathke,
     * J. Org. Chem. 1977, 42, 1688 (N,N-dimethylacetamide with a lithium dialkylamide); the others: House, Modern Synthetic Reactions,
     * 2nd ed. (all from memory).
     */
    @ParameterizedTest(name = "{1} and {0}")
    @CsvSource({"CC(=O)N(C)C,C1,LDA", "CCC(=O)N(C)C,C2,LDA", "CC(=O)N1CCOCC1,C1,LDA", "CC(=O)OC(C)(C)C,C1,LDA", "CC(=O)OCC,C1,LDA", "CC(=O)OCC,C1,LiHMDS",
        "CC(=O)OC(C)(C)C,C1,LiHMDS", "CC(C)C(=O)OC,C2,LDA", "CC(=O)c1ccccc1,C1,LiHMDS", "CC(C)C#N,C2,LDA", "CS(C)(=O)=O,C1,LDA"})
    void theAnionIsMadeInFull(String substrate, String site, String base) throws MoleculeException, UnknownNameException, ReviewException {
        assertEquals(Verdict.SELECTIVE, review(substrate, site, base, "THF").verdict());
    }

    /** House, Modern Synthetic Reactions, 2nd ed. (from memory): these need an organolithium, or cannot be made. */
    @ParameterizedTest(name = "{1} and {0}")
    @CsvSource({"Cc1ccccc1,C1,LDA", "c1ccccc1,C1,LDA", "C=CCC,C3,LDA", "C1CCCCC1,C1,LDA", "CCC(=O)N(C)C,C2,LiHMDS", "C1SCCCS1,C1,LiHMDS"})
    void theAnionIsNotMade(String substrate, String site, String base) throws MoleculeException, UnknownNameException, ReviewException {
        assertEquals(Verdict.TOO_WEAK, review(substrate, site, base, "THF").verdict());
    }

    @Test
    void anAlcoholStillGoesBeforeAnEster() throws MoleculeException, UnknownNameException, ReviewException {
        Review review = review("OCCCC(=O)OC", "C4", "LDA", "THF");
        assertEquals("O1", review.firstSite());
    }

    @Test
    void theValueSaysWhatLoweredIt() throws MoleculeException, UnknownNameException, ReviewException {
        String inEther = review("CC(=O)OCC", "C1", "LDA", "THF").transfers().get(0).acidity().source();
        assertTrue(inEther.contains("lowered by 3.0 for the Li ion pair in tetrahydrofuran"), inEther);
        assertTrue(review("CC(=O)OCC", "C1", "KHMDS", "THF").transfers().stream().noneMatch(transfer -> transfer.acidity().source().contains("ion pair in")));
        assertTrue(review("CC(=O)OCC", "C1", "LiHMDS", "DMF").transfers().stream().noneMatch(transfer -> transfer.acidity().source().contains("ion pair in")));
    }
}
