package lyate.review;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.Optional;
import lyate.molecule.MoleculeReader;
import lyate.stock.Stockroom;
import lyate.table.TableFolders;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/**
 * Whole reviews of one-proton acids with one-proton bases against the sum anybody does by hand: log K is the difference of the
 * handbook's pKa values, and with n equivalents x²(1 − K) + K(1 + n)x − Kn = 0. The solvents have no proton that counts.
 */
class WorkedReviewsTest {

    private static final Stockroom STOCKROOM = Stockroom.load(TableFolders.packaged());
    private static final StepReviewer REVIEWER = StepReviewer.load(TableFolders.packaged());

    /** Aqueous values: CRC Handbook; DMSO: Bordwell, Acc. Chem. Res. 1988, 21, 456 (from memory). */
    @ParameterizedTest(name = "{0} with {3} eq of {2} in {4}")
    @CsvSource({
        "Oc1ccccc1, O1, triethylamine, 1, dichloromethane, 0.76",
        "Oc1ccccc1, O1, triethylamine, 3, toluene, 0.76",
        "Oc1ccc([N+](=O)[O-])cc1, O1, triethylamine, 1, dichloromethane, 3.60",
        "Oc1ccc(C#N)cc1, O1, triethylamine, 1, dichloromethane, 2.78",
        "CC(=O)O, O4, pyridine, 1, dichloromethane, 0.47",
        "CC(=O)O, O4, pyridine, 5, toluene, 0.47",
        "OC(=O)c1ccccc1, O1, N-methylmorpholine, 1, dichloromethane, 3.18",
        "Oc1ccccc1, O1, DMAP, 1, dichloromethane, -0.39",
        "c1ccccc1C(c1ccccc1)c1ccccc1, C7, potassium tert-butoxide, 1, THF, 1.6",
        "c1ccccc1C(c1ccccc1)c1ccccc1, C7, potassium tert-butoxide, 3, THF, 1.6",
        "c1ccccc1Cc1ccccc1, C7, potassium tert-butoxide, 1, THF, 0.0",
        "c1ccccc1C#C, C8, potassium tert-butoxide, 1, THF, 3.4",
    })
    void aReviewIsTheSumDoneByHand(String substrate, String site, String base, double equivalents, String solvent, double deltaPKa)
            throws Exception {
        Review review = REVIEWER.review(new Step("worked", new MoleculeReader().read(substrate), Optional.of(site),
                STOCKROOM.base(base), equivalents, STOCKROOM.solvent(solvent), 25, 0.2, 0, Optional.empty()));
        assertEquals(deltaPKa, review.logK(), 0.15);
        assertEquals(100 * taken(Math.pow(10, review.logK()), equivalents), review.intendedPercent(), 0.05);
    }

    private static double taken(double k, double n) {
        double a = 1 - k;
        double b = k * (1 + n);
        return Math.abs(a) < 1e-9 ? n / (1 + n) : (-b + Math.sqrt(b * b + 4 * a * k * n)) / (2 * a);
    }
}
