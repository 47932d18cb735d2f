package lyate.review;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Optional;
import lyate.molecule.MoleculeException;
import lyate.molecule.MoleculeReader;
import lyate.stock.Stockroom;
import lyate.stock.UnknownNameException;
import lyate.table.TableFolders;
import org.junit.jupiter.api.Test;

/** What the temperature of a step does to log K, and what is said about it. */
class TemperatureTest {

    private static final Stockroom STOCK = Stockroom.load(TableFolders.packaged());
    private static final StepReviewer REVIEWER = StepReviewer.load(TableFolders.packaged());

    @Test
    void lithiumAmidesAreSharperInTheColdAndTheAssumptionIsStated() throws Exception {
        Review warm = review("O=C1CCCCC1", "LDA", "THF", 25);
        Review cold = review("O=C1CCCCC1", "LDA", "THF", -78);
        assertEquals(warm.logK() * 298.15 / 195.15, cold.logK(), 1e-9);
        assertTrue(warm.assumptions().stream().noneMatch(line -> line.contains("isocoulombic")), warm.assumptions().toString());
        assertTrue(cold.assumptions().get(0).contains("isocoulombic"), cold.assumptions().toString());
    }

    /**
     * Benzoic acid (ionisation enthalpy about 0 kJ/mol) and triethylamine (about 43 kJ/mol) in water: the transfer gives off heat
     * and so weakens by about 1.2 log units from 25 to 80 degrees C (van 't Hoff: 43000/19.14 × (1/298.15 − 1/353.15) = 1.17).
     */
    @Test
    void aminesLoseStrengthInTheHeatAsTheirIonisationEnthalpySays() throws Exception {
        Review cool = review("OC(=O)c1ccccc1", "Et3N", "water", 25);
        Review hot = review("OC(=O)c1ccccc1", "Et3N", "water", 80);
        assertEquals(1.17, cool.logK() - hot.logK(), 0.25);
        assertTrue(hot.assumptions().get(0).contains("van 't Hoff"), hot.assumptions().toString());
    }

    private static Review review(String smiles, String base, String solvent, double celsius)
            throws MoleculeException, UnknownNameException, ReviewException {
        return REVIEWER.review(new Step("test", new MoleculeReader().read(smiles), Optional.empty(), STOCK.base(base), 1.05,
                STOCK.solvent(solvent), celsius, 0.2, 0, Optional.empty()));
    }
}
