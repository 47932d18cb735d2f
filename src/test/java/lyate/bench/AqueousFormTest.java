package lyate.bench;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import lyate.acidity.AcidityEstimator;
import lyate.molecule.MoleculeException;
import lyate.molecule.MoleculeReader;
import lyate.site.SiteClasses;
import lyate.site.SiteFinder;
import lyate.table.TableFolders;
import org.junit.jupiter.api.Test;

/** pKa values in water: CRC Handbook, 95th ed., section 5 (from memory); half the substance is charged there. */
class AqueousFormTest {

    private static final double ESTIMATE = 0.8;
    private final SiteFinder finder = new SiteFinder(SiteClasses.load(TableFolders.packaged()));
    private final AcidityEstimator acidity = AcidityEstimator.load(TableFolders.packaged());

    @Test
    void anAcidIsUnchargedBelowItsPKaAndABaseAbove() throws MoleculeException {
        AqueousForm benzoic = form("OC(=O)c1ccccc1");
        assertTrue(benzoic.unchargedFraction(4.20 - ESTIMATE) > 0.5 && benzoic.unchargedFraction(4.20 + ESTIMATE) < 0.5);
        AqueousForm triethylamine = form("CCN(CC)CC");
        assertTrue(triethylamine.unchargedFraction(10.75 - ESTIMATE) < 0.5 && triethylamine.unchargedFraction(10.75 + ESTIMATE) > 0.5);
    }

    /** Drawn as a salt or as the acid: water cannot tell. */
    @Test
    void theFormDrawnDoesNotMatter() throws MoleculeException {
        AqueousForm acid = form("OC(=O)c1ccccc1");
        AqueousForm anion = form("[O-]C(=O)c1ccccc1");
        for (double pH = 2; pH < 7; pH += 0.5) {
            assertEquals(acid.unchargedFraction(pH), anion.unchargedFraction(pH), 0.05, "pH " + pH);
        }
    }

    @Test
    void aQuaternaryAmmoniumIonIsAlwaysChargedAndAHydrocarbonNever() throws MoleculeException {
        assertEquals(0, form("C[N+](C)(C)CCO").unchargedFraction(7));
        assertEquals(1, form("c1ccc2ccccc2c1").unchargedFraction(7));
    }

    @Test
    void anAminoAcidIsNeverUncharged() throws MoleculeException {
        AqueousForm phenylalanine = form("NC(Cc1ccccc1)C(O)=O");
        for (double pH = 0; pH <= 14; pH++) {
            assertTrue(phenylalanine.unchargedFraction(pH) < 0.01, "pH " + pH);
        }
    }

    private AqueousForm form(String smiles) throws MoleculeException {
        return AqueousForm.of(smiles, new MoleculeReader().read(smiles), finder, acidity);
    }
}
