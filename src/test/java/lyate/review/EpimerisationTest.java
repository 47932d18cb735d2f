package lyate.review;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Collectors;
import lyate.molecule.Molecule;
import lyate.molecule.MoleculeReader;
import lyate.review.Epimerisation.Extent;
import lyate.site.ProtonSite;
import lyate.site.SiteClasses;
import lyate.site.SiteFinder;
import lyate.table.TableFolders;
import org.junit.jupiter.api.Test;

class EpimerisationTest {

    private static final SiteFinder FINDER = new SiteFinder(SiteClasses.load(TableFolders.packaged()));

    @Test
    void aStereocentreWhoseEnolateIsMadeInFullIsLost() throws Exception {
        assertEquals(Map.of("C2", Extent.FULL), risks("C[C@H](C(=O)OC)c1ccccc1", Map.of("C2", 12.0)));
    }

    @Test
    void aTraceOfEnolateIsEnoughGivenTime() throws Exception {
        assertEquals(Map.of("C2", Extent.PARTIAL), risks("C[C@H](C(=O)OC)c1ccccc1", Map.of("C2", -7.0)));
    }

    @Test
    void aProtonFarBeyondTheBaseStays() throws Exception {
        assertEquals(Map.of(), risks("C[C@H](C(=O)OC)c1ccccc1", Map.of("C2", -16.0)));
    }

    @Test
    void aCentreOfUnstatedConfigurationHasNothingToLose() throws Exception {
        assertEquals(Map.of(), risks("CC(C(=O)OC)c1ccccc1", Map.of("C2", 12.0)));
    }

    @Test
    void aQuaternaryCentreIsSafeBesideAReachedProton() throws Exception {
        assertEquals(Map.of(), risks("CC[C@]1(C)CCCC1=O", Map.of("C6", 0.0, "C7", 9.0)));
    }

    /** Menthone: the centre beside the carbonyl epimerises to isomenthone, the one bearing the methyl group stays. */
    @Test
    void theCentreBesideTheCarbonylOfMenthoneIsAtRiskAndNoOther() throws Exception {
        assertEquals(Map.of("C8", Extent.PARTIAL), risks("O=C1C[C@H](C)CC[C@H]1C(C)C", Map.of("C3", 1.0, "C8", 0.5)));
    }

    @Test
    void aLocalisedCarbanionKeepsItsConfiguration() throws Exception {
        assertEquals(Map.of(), risks("C[C@@H]1CCCN1C(=O)OC(C)(C)C", Map.of("C2", 5.0)));
    }

    @Test
    void theMostAcidicCentreComesFirst() throws Exception {
        Molecule molecule = new MoleculeReader().read("C[C@H](C(=O)OC)C[C@H](C)C(=O)c1ccccc1");
        List<String> labels = Epimerisation.of(molecule, logK(molecule, Map.of("C2", 3.0, "C8", 8.0))).stream()
                .map(found -> molecule.label(found.atom())).toList();
        assertEquals(List.of("C8", "C2"), labels);
    }

    private static Map<String, Extent> risks(String smiles, Map<String, Double> logKByLabel) throws Exception {
        Molecule molecule = new MoleculeReader().read(smiles);
        return Epimerisation.of(molecule, logK(molecule, logKByLabel)).stream()
                .collect(Collectors.toMap(found -> molecule.label(found.atom()), Epimerisation::extent));
    }

    /** The given log K for the named atoms, out of reach for every other. */
    private static Map<ProtonSite, Double> logK(Molecule molecule, Map<String, Double> byLabel) {
        Map<ProtonSite, Double> logK = new HashMap<>();
        for (ProtonSite site : FINDER.sites(molecule)) {
            logK.put(site, site.equivalent().stream().map(molecule::label).filter(byLabel::containsKey).map(byLabel::get)
                    .findFirst().orElse(-30.0));
        }
        return logK;
    }
}
