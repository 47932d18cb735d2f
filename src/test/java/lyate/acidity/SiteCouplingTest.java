package lyate.acidity;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import lyate.acidity.SiteCoupling.Shift;
import lyate.molecule.Molecule;
import lyate.molecule.MoleculeException;
import lyate.molecule.Renumbering;
import lyate.site.ProtonSite;
import lyate.site.Role;
import lyate.site.SiteClasses;
import lyate.site.SiteFinder;
import lyate.stock.Medium;
import lyate.table.TableFolders;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;

/** What one proton gone does to the next. */
class SiteCouplingTest {

    private static final SiteCoupling COUPLING = SiteCoupling.load(TableFolders.packaged());
    private static final SiteFinder FINDER = new SiteFinder(SiteClasses.load(TableFolders.packaged()));
    private static final double LOG_FOUR = Math.log10(4);
    private static final Medium DMA = new Medium("dmac");

    private static Shift between(Molecule molecule, String first, String second, Medium medium) {
        return COUPLING.between(molecule, site(molecule, first), site(molecule, second), medium);
    }

    /** The acid site at an atom, else the base site; {@code base:N1} asks for the base site. */
    private static ProtonSite site(Molecule molecule, String label) {
        boolean base = label.startsWith("base:");
        int atom = molecule.atomLabelled(label.replace("base:", "")).orElseThrow();
        return FINDER.sites(molecule, base ? Role.BASE : Role.ACID).stream()
                .filter(site -> site.equivalent().contains(atom)).findFirst().orElseThrow();
    }

    /** pK1 and pK2: CRC Handbook of Chemistry and Physics (from memory). Of two like places log10 4 is statistics. */
    @ParameterizedTest(name = "{0}: {3} and {4}")
    @CsvSource({
        "OC(=O)C(=O)O,          O1, O6, 1.25, 4.27",
        "OC(=O)CC(=O)O,         O1, O7, 2.85, 5.70",
        "OC(=O)CCC(=O)O,        O1, O8, 4.21, 5.64",
        "OC(=O)CCCC(=O)O,       O1, O9, 4.34, 5.42",
        "OC(=O)CCCCC(=O)O,      O1, O10, 4.43, 5.42",
        "OC(=O)C(CC)(CC)C(=O)O, O1, O11, 2.21, 7.29",
        "OC(=O)CC(C)(C)CC(=O)O, O1, O11, 3.70, 6.34",
        "OC(=O)c1ccccc1C(=O)O,  O1, O12, 2.95, 5.41",
        "OC(=O)c1cccc(C(=O)O)c1, O1, O11, 3.62, 4.60",
        "OC(=O)c1ccc(C(=O)O)cc1, O1, O10, 3.54, 4.46",
        "Oc1ccccc1O,            O1, O8, 9.34, 12.6",
        "Oc1cccc(O)c1,          O1, O7, 9.32, 11.1",
        "Oc1ccc(O)cc1,          O1, O6, 9.85, 11.4",
        "NCCN,                  base:N1, base:N4, 6.85, 9.93",
        "NCCCN,                 base:N1, base:N5, 8.88, 10.55",
        "NCCCCN,                base:N1, base:N6, 9.63, 10.80",
        "NCCCCCCN,              base:N1, base:N8, 9.83, 10.93",
        "C1CNCCN1,              base:N3, base:N6, 5.33, 9.73",
        "C1CN2CCN1CC2,          base:N3, base:N6, 3.0, 8.8"})
    void stepsOfAcidsAndDiaminesInWater(String smiles, String first, String second, double pK1, double pK2) {
        Shift shift = between(Sites.molecule(smiles), first, second, Medium.WATER);
        assertEquals(pK2 - pK1 - LOG_FOUR, shift.pKa(), 2 * shift.sigma(), smiles);
    }

    /** pKa of the amine of the amino acid's anion and of its ester, CRC Handbook of Biochemistry (from memory). */
    @ParameterizedTest(name = "{0}")
    @CsvSource({
        "NCC(=O)O,           O5, base:N1, 7.66, 9.78",
        "NCCC(=O)O,          O6, base:N1, 9.13, 10.24",
        "NCCCC(=O)O,         O7, base:N1, 9.71, 10.56",
        "Nc1ccccc1C(=O)O,    O10, base:N1, 2.3, 4.95",
        "Nc1ccc(C(=O)O)cc1,  O8, base:N1, 2.5, 4.87",
        "OC(=O)c1cccnc1,     O1, base:N8, 3.13, 4.81"})
    void carboxylateRaisesTheAmine(String smiles, String acid, String base, double ester, double anion) {
        Shift shift = between(Sites.molecule(smiles), acid, base, Medium.WATER);
        assertEquals(anion - ester, shift.pKa(), 2 * shift.sigma(), smiles);
    }

    /** Izutsu, Acid-Base Dissociation Constants in Dipolar Aprotic Solvents, 1990: N,N-dimethylacetamide. */
    @ParameterizedTest(name = "{0}")
    @CsvSource({
        "OC(=O)CCC(=O)O,          O1, O8, 9.0, 14.3",
        "OC(=O)C=CC(=O)O,         O1, O8, 6.65, 11.6",
        "OC(=O)CCCCC(=O)O,        O1, O10, 11.2, 12.4",
        "OC(=O)c1ccc(C(=O)O)cc1,  O1, O10, 8.88, 10.48"})
    void aSecondAnionCostsMoreWhereNoProtonHoldsIt(String smiles, String first, String second, double pK1, double pK2) {
        Molecule molecule = Sites.molecule(smiles);
        Shift shift = between(molecule, first, second, DMA);
        assertEquals(pK2 - pK1 - LOG_FOUR, shift.pKa(), 2 * shift.sigma(), smiles);
    }

    /** Richard, Williams, O'Donoghue & Amyes, J. Am. Chem. Soc. 2002, 124, 2957: acetate ion 33.5 (from memory). */
    @Test
    void carboxylateRaisesItsAlphaHydrogenToTheMeasuredValue() {
        Molecule acid = Sites.molecule("CC(=O)O");
        double uncharged = site(acid, "C1").siteClass().water().orElseThrow().pKa();
        Shift shift = between(acid, "O4", "C1", Medium.WATER);
        assertEquals(33.5, uncharged + shift.pKa(), 2.5);
    }

    /** Common practice: lithium diisopropylamide (36) makes these dianions, sodium hydride or alkoxide (30) does not. */
    @ParameterizedTest(name = "{0}")
    @CsvSource({
        "CC(=O)CC(=O)OC,            C4, C1",
        "CC(=O)CC(C)=O,             C4, C1",
        "COC(=O)CNC(=O)OC(C)(C)C,   N6, C5",
        "OCC#C,                     O1, C4",
        "OC(=O)Cc1ccccc1,           O1, C4"})
    void theSecondProtonOfADianionIsClearlyHarder(String smiles, String first, String second) {
        Molecule molecule = Sites.molecule(smiles);
        double raise = between(molecule, first, second, Medium.DMSO).pKa();
        assertTrue(raise > 1.5 && raise < 12, smiles + " " + raise);
    }

    @Test
    void couplingFallsWithEveryCarbonBetweenTwoAmines() {
        double before = Double.MAX_VALUE;
        for (int carbons = 1; carbons <= 9; carbons++) {
            Molecule diamine = Sites.molecule("N" + "C".repeat(carbons) + "N");
            double raise = between(diamine, "base:N1", "base:N" + (carbons + 2), Medium.WATER).pKa();
            assertTrue(raise < before, carbons + " carbons: " + raise);
            before = raise;
        }
        assertTrue(before < 0.3);
    }

    @ParameterizedTest
    @MethodSource("lyate.site.BroadMolecules#smiles")
    void couplingIsSymmetricAndNeverNegative(String smiles) {
        Molecule molecule = Sites.molecule(smiles);
        List<ProtonSite> sites = FINDER.sites(molecule);
        for (ProtonSite one : sites) {
            for (ProtonSite other : sites) {
                for (Medium medium : List.of(Medium.WATER, Medium.DMSO)) {
                    Shift there = COUPLING.between(molecule, one, other, medium);
                    Shift back = COUPLING.between(molecule, other, one, medium);
                    String where = smiles + " " + molecule.label(one.atom()) + " " + molecule.label(other.atom());
                    assertEquals(there, back, where);
                    assertTrue(there.pKa() >= 0 && there.sigma() > 0, where + " " + there);
                }
            }
        }
    }

    @Test
    void theOrderOfAtomsChangesNothing() throws MoleculeException {
        Molecule one = Sites.molecule("OC(=O)c1cc(O)c(CNCCC(=O)CC(C)=O)cc1N");
        List<ProtonSite> sites = FINDER.sites(one);
        for (int seed = 0; seed < 10; seed++) {
            Renumbering other = Renumbering.of(one, seed);
            for (ProtonSite first : sites) {
                for (ProtonSite second : sites) {
                    assertEquals(COUPLING.shift(one, first, second, Medium.WATER),
                            COUPLING.shift(other.molecule(), then(other, first), then(other, second), Medium.WATER), 1e-12);
                }
            }
        }
    }

    private static ProtonSite then(Renumbering renumbering, ProtonSite site) {
        int atom = renumbering.placeThen()[site.atom()];
        return FINDER.sites(renumbering.molecule(), site.role()).stream()
                .filter(candidate -> candidate.equivalent().contains(atom)).findFirst().orElseThrow();
    }
}
